import { expect, test } from "vitest";
import { together } from "../../../src/sheet/draw/ink.ts";
import { timeScale } from "../../../src/sheet/draw/scales.ts";
import { HEIGHT, LEFT, panelInk, RIGHT } from "../../../src/sheet/draw/shotPanel.ts";

const time = timeScale(1e-3, LEFT, RIGHT);
const points = [
  { time: 0, value: 0 },
  { time: 2e-4, value: 1000 },
  { time: 1e-3, value: -200 },
];
const panel = (mark: { time: number; value: number; words: string } | null, under = false) =>
  together(panelInk({ top: 20, time, dimension: "current", title: "Current", points, mark, under }));

test("panelInk(panel): the line, its zero, and the mark where it is, with its words beside it", () => {
  const ink = panel({ time: 2e-4, value: 1000, words: "peak 1 kA at 200 µs" });
  const line = ink.curves.find(({ role }) => role === "current")!;
  expect(line.d.split("L")).toHaveLength(3);
  const [spot] = ink.points;
  expect(spot!.x).toBeCloseTo(LEFT + (RIGHT - LEFT) / 5);
  expect(line.d).toContain(`L${spot!.x},${Math.round(spot!.y * 10) / 10}`);
  const said = ink.words.find(({ text }) => text.startsWith("peak"))!;
  expect(said.y).toBeLessThan(spot!.y);
  const zero = ink.wires.find(({ x, toX, y, toY }) => x === LEFT && toX === RIGHT && y === toY && y < 20 + HEIGHT);
  expect(zero).toBeDefined();
});

test("panelInk(panel): words of a mark at either end stay inside; under it when asked; no mark, no words", () => {
  const words = "reversed to -200 V at 1 ms, 9.1 % of the start";
  for (const at of [0, 1e-3]) {
    const ink = panel({ time: at, value: -200, words }, true);
    const said = ink.words.find(({ text }) => text === words)!;
    expect(said.x).toBeGreaterThan(LEFT + 80);
    expect(said.x).toBeLessThan(RIGHT - 80);
    expect(said.y).toBeGreaterThan(ink.points[0]!.y);
    expect(said.y).toBeLessThanOrEqual(20 + HEIGHT);
  }
  expect(panel(null).points).toEqual([]);
});
