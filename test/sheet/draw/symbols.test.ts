import { describe, expect, test } from "vitest";
import { SHAPES, SPAN, type SymbolName, symbolPath } from "../../../src/sheet/draw/symbols.ts";

const NAMES = Object.keys(SHAPES) as SymbolName[];
const numbersOf = (path: string): readonly (readonly number[])[] =>
  [...path.matchAll(/[MLA]([^MLAZ]+)/g)].map(([, tail]) => tail!.trim().split(/\s+/).map(Number).slice(-2));

describe("symbolPath(name, stand)", () => {
  test.each(NAMES)("%s: starts at its place, keeps its size whichever way it is turned", (name) => {
    const boxes = (["right", "down", "left", "up"] as const).map((way) => {
      const points = numbersOf(symbolPath(name, { x: 100, y: 50, way }));
      const [xs, ys] = [points.map(([x]) => x!), points.map(([, y]) => y!)];
      return [Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys)].map((n) => n.toFixed(1));
    });
    expect(boxes[2]).toEqual(boxes[0]);
    expect(boxes[3]).toEqual(boxes[1]);
    expect(boxes[1]).toEqual(boxes[0]!.toReversed());
  });

  test.each(NAMES.filter((name) => name !== "earth" && name !== "plus"))("%s: begins and ends on its axis", (name) => {
    const points = numbersOf(symbolPath(name, { x: 0, y: 0, way: "down" }));
    expect(points).toContainEqual([0, 0]);
    expect(points).toContainEqual([0, SPAN]);
  });

  test("a capacitor is two plates across the wire; a diode that goes up has its bar at the top", () => {
    expect(symbolPath("capacitor", { x: 10, y: 0, way: "down" })).toBe(
      "M10 0L10 6.8M10 9.2L10 16M15.5 6.8L4.5 6.8M15.5 9.2L4.5 9.2",
    );
    expect(symbolPath("diode", { x: 0, y: 16, way: "up" })).toContain("M-4 4.5L4 4.5");
  });
});
