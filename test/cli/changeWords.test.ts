import { expect, test } from "vitest";
import { changeWords } from "../../src/cli/changeWords.ts";

test("changeWords(change, currency): which way, from what to what, and what then fits", () => {
  const base = { layout: "p 2s3p strings", note: "" };
  expect(changeWords({ ...base, field: "energy", from: 2400, to: 1200 }, null)).toBe(
    "lower the energy of a pulse from 2.4 kJ to 1.2 kJ: then p 2s3p strings fits",
  );
  expect(changeWords({ ...base, field: "maxSeries", from: 2, to: 4 }, null)).toMatch(
    /^raise the most in series from 2 to 4:/,
  );
  expect(changeWords({ ...base, field: "maxCost", from: 5, to: 6747 }, "EUR")).toMatch(/from 5 EUR to 6747 EUR/);
  expect(changeWords({ ...base, field: "ripple", from: null, to: 1 }, null)).toMatch(
    /^raise the allowed fall to 100 %/,
  );
  expect(changeWords({ ...base, field: "available", from: 3, to: 9, note: "q\u001b" }, null)).toBe(
    "have 9 of q\\u{1b} to buy instead of 3: then p 2s3p strings fits",
  );
});
