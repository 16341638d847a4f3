import { describe, expect, test } from "vitest";
import { SHAPES, SPAN, type SymbolName, symbolPath } from "../../../src/sheet/draw/symbols.ts";

const NAMES = Object.keys(SHAPES) as SymbolName[];
/** The points of a path, followed step by step. */
function pointsOf(path: string): readonly (readonly number[])[] {
  let [x, y, openX, openY] = [0, 0, 0, 0];
  return [...path.matchAll(/([Mmlhvaz])([^Mmlhvaz]*)/g)].map(([, command, tail]) => {
    const numbers = (tail!.match(/-?[\d.]+/g) ?? []).map(Number);
    const [dx = 0, dy = 0] = command === "a" ? numbers.slice(-2) : numbers;
    if (command === "M") [x, y] = [dx, dy];
    else if (command === "z") [x, y] = [openX, openY];
    else if (command === "h") x += dx;
    else if (command === "v") y += dx;
    else [x, y] = [x + dx, y + dy];
    if (command === "M" || command === "m") [openX, openY] = [x, y];
    return [x, y].map((value) => Math.round(value * 10) / 10 + 0);
  });
}

describe("symbolPath(name, stand)", () => {
  test.each(NAMES)("%s: starts at its place, keeps its size whichever way it is turned", (name) => {
    const boxes = (["right", "down", "left", "up"] as const).map((way) => {
      const points = pointsOf(symbolPath(name, { x: 100, y: 50, way }));
      const [xs, ys] = [points.map(([x]) => x!), points.map(([, y]) => y!)];
      return [Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys)].map((n) => n.toFixed(1));
    });
    expect(boxes[2]).toEqual(boxes[0]);
    expect(boxes[3]).toEqual(boxes[1]);
    expect(boxes[1]).toEqual(boxes[0]!.toReversed());
  });

  test.each(NAMES.filter((name) => name !== "earth" && name !== "plus"))("%s: begins and ends on its axis", (name) => {
    const points = pointsOf(symbolPath(name, { x: 0, y: 0, way: "down" }));
    expect(points).toContainEqual([0, 0]);
    expect(points).toContainEqual([0, SPAN]);
  });

  test("a capacitor is two plates across the wire; a diode that goes up has its bar at the top", () => {
    const plates = "M10 0v6.8m0 2.4v6.8m5.5-9.2h-11m11 2.4h-11";
    expect(symbolPath("capacitor", { x: 10, y: 0, way: "down" })).toBe(plates);
    const points = pointsOf(symbolPath("diode", { x: 0, y: 16, way: "up" }));
    expect(points.slice(-2)).toEqual([
      [-4, 4.5],
      [4, 4.5],
    ]);
  });
});
