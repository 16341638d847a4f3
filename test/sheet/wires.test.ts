import { describe, expect, test } from "vitest";
import { schematicOf } from "../../src/sheet/sections/drawings.ts";
import { wiresOf } from "../../src/sheet/wires.ts";
import { LOAD, sheetInput } from "../support/sheet.ts";

const wires = (wishes: Parameters<typeof sheetInput>[0] = {}, over: object = {}) => {
  const input = sheetInput(wishes);
  return wiresOf({ ...schematicOf(input), ...over }, input.shot);
};
const joints = (list: ReturnType<typeof wires>) => list.map(({ from, to }) => `${from} > ${to}`);

describe("wiresOf(props, shot)", () => {
  test("every unit once between its points, every element of every position, what hangs on the ends", () => {
    const list = joints(wires());
    expect(list.filter((row) => /C\d+\.\d+ [+-]/.test(row))).toHaveLength(2 * 16);
    expect(list).toContain("TP2 > C3.1 -");
    expect(list).toContain("C3.1 + > TP3");
    expect(list).toContain("TP8 > K1 a");
    expect(list).toContain("TP0 > E1");
    expect(list.filter((row) => row.includes("RB3 "))).toEqual(["TP2 > RB3 a", "RB3 b > TP3"]);
  });

  test("a fuse and an isolating resistor stand in series with their unit; a string's fuse at its positive end", () => {
    const isolating = { resistance: 0.1, words: null };
    const each = joints(wires({}, { fuse: { at: "unit", words: null }, isolating }));
    expect(each).toEqual(expect.arrayContaining(["C1.2 + > F1.2 a", "F1.2 b > RI1.2 a", "RI1.2 b > TP1"]));
    const strings = joints(wires({ shape: { ties: "strings" } }, { fuse: { at: "string", words: null } }));
    expect(strings).toEqual(expect.arrayContaining(["C1.7 + > TP1.7", "C1.8 + > F1 a", "F1 b > TP8"]));
  });

  test("the earth goes to the end chosen, or nowhere", () => {
    const earthed = (earth: "positive" | "none" | "unknown") =>
      joints(wires({ earth })).filter((row) => row.includes("E1"));
    expect([earthed("positive"), earthed("none"), earthed("unknown")]).toEqual([
      ["TP8 > E1"],
      [],
      ["the end to be decided > E1"],
    ]);
  });

  test("conductors follow from the shot alone: none without a load, thicker for the bank than for a unit", () => {
    expect(wires().every(({ conductor }) => conductor === null)).toBe(true);
    const fired = wires({ brief: LOAD });
    const area = (from: string): number =>
      Number(/([\d.]+) mm2/.exec(fired.find((wire) => wire.from === from)?.conductor ?? "")?.[1]);
    expect(area("S1 b")).toBeGreaterThan(area("C1.1 +"));
    expect(fired.find((wire) => wire.from === "K1 b")?.conductor).toBeNull();
    // IEC 60949 for copper from 20 to 90 degC: K^2 ln((90 + 234.5)/(20 + 234.5)), K = 226 A s^0.5/mm^2.
    const action = sheetInput({ brief: LOAD }).shot?.discharge.action ?? Number.NaN;
    expect(area("S1 b")).toBeCloseTo(Math.sqrt(action / (226 ** 2 * Math.log(324.5 / 254.5))), 1);
  });
});
