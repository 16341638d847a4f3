// The worst corner of a hold in words.
import { describe, expect, test } from "vitest";
import { type HoldCase, worstAtHold } from "../../src/bank/cornersHold.ts";
import { holdCornerWords } from "../../src/bank/cornersHoldWords.ts";

const BASE: HoldCase = {
  n: 4,
  m: 1,
  C: 3300e-6,
  tLow: 0.2,
  tHigh: 0.2,
  leakage: 1e-3,
  insulation: Number.POSITIVE_INFINITY,
  R: 24e3,
  q: 0.05,
  V: 1600,
  hold: Number.POSITIVE_INFINITY,
};

describe("holdCornerWords(case, worst)", () => {
  test("names what counts and no more", () => {
    expect(holdCornerWords(BASE, worstAtHold({ ...BASE, hold: 0 }))).toBe("one stage at -20 %; the rest at +20 %");
    const drift = { ...BASE, R: null, hold: 30 };
    expect(holdCornerWords(drift, worstAtHold(drift))).toBe(
      "one stage at -20 %, with no leakage; the rest at +20 %, with the greatest leakage",
    );
    const mixed = { voltage: 1, seconds: 5, lowOthers: 1 };
    expect(holdCornerWords(BASE, mixed)).toBe(
      "one stage at -20 %, with no leakage, resistor at +5 %; 2 of the rest at +20 % and 1 at -20 %, with the greatest leakage, resistors at -5 %",
    );
  });
});
