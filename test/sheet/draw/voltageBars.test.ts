import { describe, expect, test } from "vitest";
import { countOf, together } from "../../../src/sheet/draw/ink.ts";
import { hatch, limitWords, nominalWords, voltagePlot, worstWords } from "../../../src/sheet/draw/voltageBars.ts";

const LIMITS = [
  { words: "limit", value: 405 },
  { words: "rating", value: 450 },
];
const plot = (worst: number | null, nominal: number | null = 366.7) =>
  together(voltagePlot([{ words: "charging", nominal, worst }], LIMITS).inks);

describe("voltagePlot(bars, limits)", () => {
  test("a bar for what is known; lengths in proportion to the voltages", () => {
    const ink = plot(401.2);
    const [nominal, worst] = ["nominal", "worst"].map((role) => ink.boxes.find((box) => box.role === role)!);
    expect(worst!.width / nominal!.width).toBeCloseTo(401.2 / 366.7, 6);
    expect(countOf(plot(null), "worst")).toBe(0);
    expect(plot(null).words.map(({ text }) => text)).toContain("worst: ________ V");
  });

  test("over a limit is said in words, and the highest one that is passed", () => {
    const said = (worst: number) =>
      plot(worst)
        .words.map(({ text }) => text)
        .filter((text) => text.startsWith("over"));
    expect(said(405)).toEqual([]);
    expect(said(405.1)).toEqual(["over limit"]);
    expect(said(451)).toEqual(["over rating"]);
  });

  test("a reverse voltage goes the other way from zero; a state without an even share tells none", () => {
    const ink = together(voltagePlot([{ words: "dumped", worst: -40 }], LIMITS).inks);
    const bar = ink.boxes[0]!;
    // The scale runs from -50 V to 450 V over the 266 points from 122 on.
    expect(bar.x + bar.width).toBeCloseTo(122 + (266 * 50) / 500, 6);
    expect(bar.x).toBeCloseTo(122 + (266 * 10) / 500, 6);
    expect(ink.words.some(({ text }) => text.startsWith("even"))).toBe(false);
  });

  test("each limit is a line at its value, the higher one's words above", () => {
    const ink = plot(401.2);
    expect(ink.rails).toHaveLength(2);
    const [limit, rating] = ["limit 405 V", "rating 450 V"].map(
      (text) => ink.words.find((said) => said.text === text)!,
    );
    expect(rating!.y).toBeLessThan(limit!.y);
  });
});

test("worstWords, nominalWords, limitWords: a worst is not understated, a limit not overstated, the unknown is a blank", () => {
  expect(worstWords(401.21)).toBe("worst 401.3 V");
  expect(worstWords(null)).toBe("worst: ________ V");
  expect(nominalWords(null)).toBe("even: ________ V");
  expect(nominalWords(undefined)).toBe("");
  expect(limitWords({ words: "limit", value: 404.99 })).toBe("limit 404.9 V");
});

test("hatch(x, y, width, height): every line inside the rectangle", () => {
  expect(hatch(0, 0, 0, 8)).toBe("");
  const numbers = [...hatch(10, 20, 30, 8).matchAll(/[ML]([\d.]+) ([\d.]+)/g)].map(([, x, y]) => [
    Number(x),
    Number(y),
  ]);
  expect(numbers.length).toBeGreaterThan(10);
  for (const [x, y] of numbers) {
    expect(x).toBeGreaterThanOrEqual(10);
    expect(x).toBeLessThanOrEqual(40);
    expect(y).toBeGreaterThanOrEqual(20);
    expect(y).toBeLessThanOrEqual(28);
  }
});
