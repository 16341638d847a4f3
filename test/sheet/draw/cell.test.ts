import { describe, expect, test } from "vitest";
import { cellHeight, cellShape } from "../../../src/sheet/draw/blockPlan.ts";
import { axisOf, between, cellInk, unitTop } from "../../../src/sheet/draw/cell.ts";
import { countOf } from "../../../src/sheet/draw/ink.ts";
import { SPAN } from "../../../src/sheet/draw/symbols.ts";
import { schematicOf } from "../../support/drawn.ts";

describe("cellInk(place, name)", () => {
  const shape = cellShape(
    schematicOf({ fuse: { at: "unit", words: null }, isolating: { resistance: null, words: null } }),
  );
  const place = { shape, x: 10, y: 20, height: cellHeight(shape) };
  const ink = cellInk(place, "C1.2");

  test("fuse, isolating resistor and unit, one of each, one below the other without a gap", () => {
    for (const role of ["fuse", "isolating", "unit", "plus"]) expect(countOf(ink, role), role).toBe(1);
    const tops = ["fuse", "isolating", "unit"].map((role) => ink.marks!.find((mark) => mark.role === role)!.y);
    expect(tops).toEqual([unitTop(place) - 2 * SPAN, unitTop(place) - SPAN, unitTop(place)]);
  });

  test("the wires reach from node to node on one axis", () => {
    const axis = axisOf(shape, 10);
    expect(ink.wires!.every(({ x, toX }) => x === axis && toX === axis)).toBe(true);
    expect(ink.wires![0]!.y).toBe(20);
    expect(ink.wires![1]!.toY).toBe(20 + place.height);
    expect(ink.words!.map(({ text }) => text)).toEqual(["C1.2"]);
  });

  test("a unit without polarity has no plus", () => {
    const unit = { ...schematicOf().unit, polarised: false };
    const plain = cellShape(schematicOf({ unit }));
    expect(countOf(cellInk({ ...place, shape: plain }, "C1.1"), "plus")).toBe(0);
  });
});

test("between(given): the symbol in the middle; a diode's cathode is at the top", () => {
  const given = { role: "r", x: 5, top: 0, bottom: 40 } as const;
  expect(between({ ...given, name: "resistor" }).marks).toEqual([
    { role: "r", name: "resistor", x: 5, y: 12, way: "down" },
  ]);
  expect(between({ ...given, name: "diode" }).marks).toEqual([{ role: "r", name: "diode", x: 5, y: 28, way: "up" }]);
});
