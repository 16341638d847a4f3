import { describe, expect, test } from "vitest";
import { labelsOf } from "../../src/sheet/index.ts";
import { BARE, placedIn, sheetInput } from "../support/sheet.ts";

const of = (input: ReturnType<typeof sheetInput>) => labelsOf(input).labels;
const find = (input: ReturnType<typeof sheetInput>, kind: string, position: string) =>
  of(input).find((label) => label.kind === kind && label.position === position);

describe("labelsOf(input)", () => {
  test("one for every unit, stage and spare; serials are lines to fill in where none were measured", () => {
    const labels = of(sheetInput({ brief: { spares: 2 } }));
    const count = (kind: string) => labels.filter((label) => label.kind === kind).length;
    expect([count("unit"), count("stage"), count("string"), count("spare")]).toEqual([16, 8, 0, 2]);
    expect(labels.filter(({ serial }) => serial === null)).toHaveLength(18);
    expect(labels.filter((label) => label.kind === "stage").every((label) => label.serial === undefined)).toBe(true);
  });

  test("measured: the serial and the capacitance of the unit that stands there", () => {
    const bare = sheetInput();
    const placed = placedIn(bare);
    const unit = placed.positions.find(({ group, place }) => group === 3 && place === 2)!;
    expect(find({ ...bare, placed }, "unit", "3.2")).toMatchObject({
      serial: unit.serial,
      capacitance: unit.capacitance,
      voltage: 400,
    });
    expect(
      of({ ...bare, placed })
        .filter(({ kind }) => kind === "spare")
        .map(({ serial }) => serial),
    ).toEqual(placed.spares);
  });

  test("measured: a stage is the sum of its units", () => {
    const bare = sheetInput();
    const placed = placedIn(bare);
    const sum = placed.positions.filter(({ group }) => group === 2).reduce((all, p) => all + p.capacitance, 0);
    expect(sum).not.toBeCloseTo(2e-3, 6);
    expect(find({ ...bare, placed }, "stage", "2")?.capacitance).toBeCloseTo(sum, 12);
  });

  test("a stage is rated as its unit, a string as all of its units together", () => {
    expect(find(sheetInput(), "stage", "2")).toMatchObject({ voltage: 400, capacitance: 2e-3 });
    expect(find(sheetInput({ shape: { ties: "strings" } }), "string", "2")).toMatchObject({
      voltage: 3200,
      capacitance: 125e-6,
    });
  });

  test("potential to earth of the further terminal, by the end that is earthed; blank where none is", () => {
    expect(find(sheetInput(), "unit", "3.1")?.toEarth).toBeCloseTo(750, 9);
    expect(find(sheetInput({ earth: "positive" }), "unit", "3.1")?.toEarth).toBeCloseTo(-1500, 9);
    expect(find(sheetInput({ earth: "none" }), "unit", "3.1")?.toEarth).toBeNull();
    expect(find(sheetInput({ shape: { ties: "strings" } }), "unit", "1.3")?.toEarth).toBeCloseTo(750, 9);
    expect(find(sheetInput({ unit: BARE }), "unit", "1.1")?.polarised).toBeNull();
  });
});
