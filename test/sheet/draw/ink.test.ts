import { expect, test } from "vitest";
import { across, countOf, down, together } from "../../../src/sheet/draw/ink.ts";

test("together(inks): every kind in its order, nothing lost", () => {
  const mark = { role: "unit", name: "capacitor", x: 0, y: 0, way: "down" } as const;
  const ink = together([{ wires: [across(0, 5, 1)] }, {}, { wires: [down(2, 0, 9)], marks: [mark, mark] }]);
  expect(ink.wires).toEqual([
    { x: 0, y: 1, toX: 5, toY: 1 },
    { x: 2, y: 0, toX: 2, toY: 9 },
  ]);
  expect(ink.points).toEqual([]);
  expect(countOf(ink, "unit")).toBe(2);
  expect(countOf({}, "unit")).toBe(0);
});
