import { describe, expect, test } from "vitest";
import { readLot } from "../../src/cli/measuredLot.ts";
import { fakePorts } from "../support/fakePorts.ts";

const read = (rows: readonly string[], heading = "serial,capacitance [uF],part") =>
  readLot("m.csv", "u", fakePorts({ "m.csv": [heading, ...rows].join("\n") }).files);

describe("readLot(path, part, files)", () => {
  test("five units are a distribution, four are refused with words", () => {
    const rows = ["a,1000,u", "b,1010,", "c,990,u", "d,1005,u", "e,995,u"];
    const lot = read(rows);
    expect(lot.ok && lot.value.values.map((value) => Math.round(value * 1e6))).toEqual([1000, 1010, 990, 1005, 995]);
    const few = read(rows.slice(1));
    expect(!few.ok && few.refusals).toEqual([
      expect.objectContaining({ code: "small-lot", read: "4 units", want: expect.stringMatching(/at least 5/) }),
    ]);
  });

  test("units of another part are left out; a bad row is told and costs only itself", () => {
    const rows = ["a,1,u", "b,1,u", "c,1,u", "d,1,u", "e,1,other", "f,x,u", "g,1,u"];
    const lot = read(rows);
    expect(lot.ok && lot.value.values).toHaveLength(5);
    expect(lot.ok && lot.value.faults).toHaveLength(1);
    expect(read(rows.slice(0, 6)).ok).toBe(false);
  });

  test("no such file", () => expect(readLot("/nowhere.csv", "u", fakePorts().files).ok).toBe(false));
});
