import { describe, expect, test } from "vitest";
import { countOf } from "../../../src/sheet/draw/ink.ts";
import type { Label } from "../../../src/sheet/draw/label.ts";
import { labelInk, labelTitle, ratingWords, WARNING } from "../../../src/sheet/draw/labelInk.ts";

const UNIT: Label = {
  kind: "unit",
  position: "3.7",
  serial: "A1007",
  part: "DEMO 470/450",
  polarised: true,
  voltage: 450,
  capacitance: 470e-6,
  toEarth: 1833,
};
const texts = (change: Partial<Label>): readonly string[] =>
  labelInk({ ...UNIT, ...change }, { x: 0, y: 0 }).words!.map(({ text }) => text);

describe("labelInk(label, spot)", () => {
  test("tells position, serial, rating, polarity, potential and the warning", () => {
    const said = ["Unit 3.7", "No. A1007", "470 µF, 450 V", "DEMO 470/450", "to earth 1.84 kV", "+", "−", ...WARNING];
    expect([...texts({})].sort()).toEqual(said.sort());
  });

  test("what is not known is a blank or a line to write on", () => {
    const ink = labelInk({ ...UNIT, serial: null, toEarth: null, polarised: null, position: null }, { x: 0, y: 0 });
    expect(ink.wires).toHaveLength(1);
    const said = ink.words!.map(({ text }) => text);
    expect(said).toEqual(expect.arrayContaining(["Unit ____", "No.", "to earth ________ V"]));
    expect(said).not.toContain("+");
    expect(said.some((text) => text.includes("polarity ________"))).toBe(true);
  });

  test("a stage has no serial, a spare no potential, a unit without polarity no signs", () => {
    const { serial: _, ...stage } = { ...UNIT, kind: "stage" as const, position: "3" };
    expect(labelInk(stage, { x: 0, y: 0 }).words!.some(({ text }) => text.startsWith("No."))).toBe(false);
    const { toEarth: __, ...spare } = { ...UNIT, kind: "spare" as const, position: "1" };
    expect(labelInk(spare, { x: 0, y: 0 }).words!.some(({ text }) => text.startsWith("to earth"))).toBe(false);
    expect(texts({ polarised: false })).not.toContain("+");
  });

  test("each has the warning sign, whatever it is of", () => {
    for (const kind of ["unit", "stage", "string", "spare"] as const) {
      const ink = labelInk({ ...UNIT, kind }, { x: 0, y: 0 });
      expect([countOf(ink, "label"), countOf(ink, "warning"), countOf(ink, "flash")]).toEqual([1, 1, 1]);
    }
  });
});

test("ratingWords, labelTitle: a rating is not overstated, a potential not understated, below earth by its size", () => {
  expect(ratingWords({ capacitance: 1e-6, voltage: 449.99, polarised: true })).toBe("1 µF, 449.9 V");
  expect(ratingWords({ capacitance: null, voltage: null, polarised: false })).toBe("________ F, ________ V");
  expect(texts({ toEarth: -1833 })).toContain("to earth 1.84 kV");
  expect(labelTitle({ kind: "string", position: "12" })).toBe("String 12");
});
