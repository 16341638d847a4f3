// Fronts and ladder as text: figures rounded to the safe side, bars to scale, what is not proven said.
import { expect, test } from "vitest";
import { frontText, ladderText } from "../../src/cli/blendFrontText.ts";

const point = (amount: number, cost: number, proven = true) => ({
  amount,
  cost,
  lowerBound: cost,
  id: "a 4s1p strings",
  proven,
});

test("frontText(front, currency, width): amount, cost, blend; what is not proven is counted", () => {
  const text = frontText({ against: "volume", points: [point(0.01234567, 20), point(0.01, 30, false)] }, "EUR", 80);
  expect(text).toContain("12.35 L");
  expect(text).toContain("30.00 EUR");
  expect(text).toContain("1 of them is not proven");
  expect(frontText({ against: "mass", points: [point(2, 5)] }, "EUR", 80)).toContain("Each is proven");
  expect(frontText({ against: "stress", points: [] }, "EUR", 80)).toContain("no blend fits");
});

test("ladderText(ladder, currency, width): the dearest step has the longest bar, the asked one its mark, the end is told", () => {
  const step = (to: number, cost: number, asked = false) => ({
    from: 0,
    to,
    energy: { from: 50, to },
    cost,
    id: "a 4s1p strings",
    units: 4,
    proven: true,
    asked,
  });
  const text = ladderText({ end: "out of reach", steps: [step(100, 10), step(200, 40, true)] }, "EUR", 100);
  const bars = text.split("\n").flatMap((line) => /=+/.exec(line)?.[0].length ?? []);
  expect(bars).toEqual([3, 12]);
  expect(text.split("\n").find((line) => line.includes("> "))).toContain("200 J");
  expect(text).toContain("No blend gives more");
  expect(ladderText({ end: "cut", steps: [] }, "EUR", 100)).toContain("no blend fits");
});
