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

  const held = (over: Partial<HoldCase>, lowOthers = 0, seconds = 5): string =>
    holdCornerWords({ ...BASE, ...over }, { voltage: 1, seconds, lowOthers });
  test.each([
    ["one in series has no company", held({ n: 1 }), "the only stage"],
    ["all the rest low", held({ R: null, leakage: 0 }, 3), "one stage at -20 %; the rest at -20 % too"],
    ["the start of a hold is charging alone", held({}, 0, 0), "one stage at -20 %; the rest at +20 %"],
    [
      "insulation leaks too",
      held({ leakage: 0, insulation: 1e8, R: null }),
      "one stage at -20 %, with no leakage; the rest at +20 %, with the greatest leakage",
    ],
    ["resistors all alike are not named", held({ leakage: 0, q: 0 }), "one stage at -20 %; the rest at +20 %"],
    ["no resistor is not named", held({ leakage: 0, R: null }), "one stage at -20 %; the rest at +20 %"],
    [
      "resistors alone",
      held({ leakage: 0 }),
      "one stage at -20 %, resistor at +5 %; the rest at +20 %, resistors at -5 %",
    ],
    [
      "thousandths of a per cent, no tolerance",
      held({ leakage: 0, q: 0, tLow: 0.01234, tHigh: 0 }),
      "one stage at -1.234 %; the rest at 0 %",
    ],
  ])("%s", (_, words, wanted) => expect(words).toBe(wanted));
});
