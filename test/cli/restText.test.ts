import { describe, expect, test } from "vitest";
import { clampWords, riskWords, spreadWords, withoutBalanceWords } from "../../src/cli/restText.ts";
import { type BankClamp, clampOf, shareSpread } from "../../src/search/index.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

describe("clampWords(clamp)", () => {
  const of = (more: Record<string, unknown> = {}, unit = UNIT): string => {
    const brief = briefOf(more);
    const result = bankOf({ unit, brief });
    return clampWords(clampOf({ result, unit, brief, share: result.share }) as BankClamp);
  };
  test("figures where known, unknown where not", () => {
    expect(of({ dumpResistance: "100 ohm" })).toMatch(
      /^8 clamp diodes: at least [\d.]+ V reverse, surge [\d.]+ A, action [\d.]+ .*through the dump resistor of 100 ohm$/,
    );
    expect(of()).toMatch(/surge and action integral unknown: state the dump resistance/);
    expect(of({}, { ...UNIT, esr: 0.1 })).toMatch(/own ESR.*a lower ESR/);
    const { polarised: _p, ...maybe } = UNIT;
    expect(of({}, maybe)).toMatch(/if the units are polarised/);
  });
});

describe("withoutBalanceWords(layout)", () => {
  test("safe says that nothing bleeds, unsafe by how much, unknown is not assessed, none for one in series", () => {
    const short = bankOf({ brief: briefOf({ hold: "1 s" }), unit: { ...UNIT, leakage: 1e-6 } });
    expect(withoutBalanceWords(short)).toMatch(/safe over the whole hold.*needs a bleed resistor of its own/);
    expect(withoutBalanceWords(bankOf())).toMatch(/^not safe: up to 2 kV of 360 V/);
    const { leakage: _l, ...dark } = UNIT;
    expect(withoutBalanceWords({ ...bankOf(), withoutBalance: bankOf({ unit: dark }).withoutBalance })).toMatch(
      /not assessed/,
    );
    expect(withoutBalanceWords(bankOf({ layout: { part: "x", series: 1, parallel: 2, ties: "strings" } }))).toBe("");
  });
});

describe("riskWords(layout, witness)", () => {
  const risk = { exceed: 1.2345e-5, error: 1e-7, law: "uniform over its tolerance" };
  test("the chance with its error; the witness with its count, none seen is a bound", () => {
    expect(riskWords({ risk }, null)).toMatch(/^1\.24e-5 \(\+- 1e-7\), each unit uniform/);
    const witness = { banks: 1e6, seed: 7, counted: 13, exceed: 1.3e-5, error: 3.6e-6, agrees: true };
    expect(riskWords({ risk }, witness)).toMatch(/of 1000000 banks drawn with seed 7 13, that is 1\.3e-5 .*: agrees$/);
    expect(riskWords({ risk }, { ...witness, counted: 0, exceed: 0, error: 3e-6, agrees: false })).toMatch(
      /none, so less than 3e-6: DOES NOT AGREE/,
    );
    expect(riskWords({ risk: null }, null)).toMatch(/not assessed/);
    expect(riskWords({}, null)).toBe("");
  });
});

test("spreadWords(spread): the middle, how many banks, and the seed that draws them again", () => {
  const brief = briefOf({ basis: "statistical" });
  const spread = shareSpread({ result: bankOf({ brief }), unit: UNIT, brief }, { banks: 1000, seed: 7 });
  expect(spread === null ? "" : spreadWords(spread)).toMatch(
    /^2\d\d(\.\d)? V: the worst unit of half of 1000 banks, drawn with seed 7,/,
  );
});
