import { expect, test } from "vitest";
import { sweepText } from "../../src/cli/sweepText.ts";
import type { InductanceSweep } from "../../src/search/index.ts";

const sweep: InductanceSweep = {
  here: 2e-5,
  bound: false,
  points: [2e-6, 6e-6, 2e-5, 6e-5, 2e-4, 6e-4, 2e-3].map((inductance) => ({
    inductance,
    peak: 0.1 / inductance,
    lossless: 0.2 / inductance,
  })),
};

test("sweepText(sweep, width): both ends and evenly between, the loop's own named; nothing where there is none", () => {
  const text = sweepText(sweep, 80);
  expect(text).toMatch(/2 .H +50 kA +100 kA/);
  expect(text).toMatch(/2 mH +50 A +100 A/);
  expect(text.match(/ k?A$/gm)).toHaveLength(5);
  expect(text).toMatch(/The loop has 20 .H\.$/);
  expect(sweepText(null, 80)).toBe("");
  expect(sweepText({ ...sweep, points: [] }, 80)).toBe("");
});

test("sweepText(sweep, width): what is unknown is said", () => {
  expect(sweepText({ ...sweep, here: null, bound: true }, 200)).toMatch(
    /own inductance is unknown: usual values are swept\. The peaks are upper bounds/,
  );
});
