import { describe, expect, test } from "vitest";
import { schematicOf } from "../../src/sheet/sections/drawings.ts";
import { wiresOf } from "../../src/sheet/wires.ts";
import { LOAD, sheetInput } from "../support/sheet.ts";

const wires = (wishes: Parameters<typeof sheetInput>[0] = {}, over: object = {}) => {
  const input = sheetInput(wishes);
  return wiresOf({ ...schematicOf(input), ...over }, null);
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

  test("in strings a bleeder stays across its unit when the fuse opens: it goes to the unit's own terminals", () => {
    const string = joints(wires({ shape: { ties: "strings" } }, { fuse: { at: "string", words: null } }));
    expect(string.filter((row) => /RB1\.[78] /.test(row))).toEqual([
      "TP1.6 > RB1.7 a",
      "RB1.7 b > TP1.7",
      "TP1.7 > RB1.8 a",
      "RB1.8 b > C1.8 +",
    ]);
    const each = joints(wires({ shape: { ties: "strings" } }, { isolating: { resistance: 0.1, words: null } }));
    expect(each.filter((row) => row.startsWith("RB2.3 b"))).toEqual(["RB2.3 b > C2.3 +"]);
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

  test("conductors: none without a shot; the whole section for the bank, the worst unit's part of it for a unit", () => {
    expect(wires().every(({ conductor }) => conductor === null)).toBe(true);
    const fired = wiresOf(schematicOf(sheetInput({ brief: LOAD })), { section: 40e-6, unitShare: 0.6 });
    const conductor = (from: string) => fired.find((wire) => wire.from === from)?.conductor;
    expect([conductor("S1 b"), conductor("C1.1 +"), conductor("K1 b")]).toEqual([
      "at least 40 mm2 of copper",
      "at least 24 mm2 of copper",
      null,
    ]);
  });
});
