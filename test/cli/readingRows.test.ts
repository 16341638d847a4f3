import { describe, expect, test } from "vitest";
import { readRows } from "../../src/cli/readingRows.ts";
import { fakePorts } from "../support/fakePorts.ts";

const cross = {
  ties: "cross-tied",
  series: 2,
  parallel: 2,
  groups: [
    ["a", "b"],
    ["c", "d"],
  ],
} as const;
const strings = { ...cross, ties: "strings" } as const;
const HEAD = "time [s],charge voltage [V],string,stage,serial,voltage [V],total [V]\n";
const read = (rows: string, sheet: typeof cross | typeof strings = cross) =>
  readRows("r.csv", sheet, fakePorts({ "r.csv": HEAD + rows }).files);

describe("readRows(path, sheet, files)", () => {
  test("readings of one time and voltage are one row; a serial stands for its place; what was not read is null", () => {
    expect(read("0,100,,1,,50,\n0,100,,,,,99\n60,100,,,d,49,\n")).toMatchObject({
      value: {
        count: 3,
        chains: [
          [
            { seconds: 0, bank: 100, volts: [50, null], total: 99 },
            { seconds: 60, bank: 100, volts: [null, 49] },
          ],
        ],
      },
    });
    expect(read("0,100,2,1,,50,\n0,100,,,b,51,\n", strings)).toMatchObject({
      value: { chains: [[{ volts: [null, 51] }], [{ volts: [50, null] }]] },
    });
  });

  test("a place that the bank has not, or a second reading of one, refuses with its line", () => {
    const refusal = (rows: string, sheet: typeof cross | typeof strings = cross) => {
      const found = read(rows, sheet);
      return found.ok ? null : [found.refusals[0]?.code, found.refusals[0]?.place.line, found.refusals[0]?.place.field];
    };
    expect(refusal("0,100,,3,,50,\n")).toEqual(["bad-position", 2, "stage"]);
    expect(refusal("0,100,,,,50,\n")).toEqual(["bad-position", 2, "stage"]);
    expect(refusal("0,100,,,x,50,\n")).toEqual(["bad-position", 2, "serial"]);
    expect(refusal("0,100,,1,,50,\n", strings)).toEqual(["bad-position", 2, "string"]);
    expect(refusal("0,100,,1,,50,\n0,100,,1,,51,\n")).toEqual(["contradiction", 3, "stage"]);
    expect(refusal("0,100,,1,,fifty,\n")?.[1]).toBe(2);
    expect(readRows(undefined, cross, fakePorts().files)).toMatchObject({ refusals: [{ code: "missing-option" }] });
  });
});
