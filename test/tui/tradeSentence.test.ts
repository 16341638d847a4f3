// One sentence about two layouts: what each has over the other, nothing that is unknown, nothing that prints alike.
import { expect, test } from "vitest";
import type { LayoutResult } from "../../src/search/index.ts";
import { tradeSentence } from "../../src/tui/tradeSentence.ts";
import { BRIEF, engine } from "../support/stock.ts";

const read = engine.readBrief(BRIEF);
if (!read.ok) throw new Error("brief");
const base = engine.check(read.value, { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" }) as LayoutResult;
const made = (changes: Partial<LayoutResult>): LayoutResult => ({ ...base, ...changes });
const priced = (total: number) =>
  made({ cost: { capacitors: total, resistors: 0, total, currency: "EUR", unpriced: [] } });
const names = ["A", "B"] as const;

test("two alike, and two that differ only in what is unknown", () => {
  const alike = "A and B come out alike in all that is known of both.";
  expect(tradeSentence(base, base, names)).toBe(alike);
  expect(tradeSentence(base, made({ mass: null, volume: null }), names)).toBe(alike);
});

test("money against mass: each side's gain with amount and percent of the other", () => {
  const cheap = { ...priced(60), mass: 10 };
  const light = { ...priced(80), mass: 7.5 };
  expect(tradeSentence(cheap, light, names)).toBe("A costs 20.00 EUR (25 %) less; B weighs 2.5 kg (25 %) less.");
});

test("gains on one side only are said to be so, whichever side it is", () => {
  expect(tradeSentence(priced(60), priced(80), names)).toBe(
    "A costs 20.00 EUR (25 %) less; B is better in nothing compared here.",
  );
  expect(tradeSentence(priced(80), priced(60), names)).toBe(
    "B costs 20.00 EUR (25 %) less; A is better in nothing compared here.",
  );
});

test("a worse check comes first, and at most four gains of a side are told, the largest first", () => {
  const checked = (verdict: "pass" | "fail") =>
    made({ findings: [{ ...base.findings[0], verdict } as LayoutResult["findings"][number]] });
  expect(tradeSentence(checked("pass"), checked("fail"), names)).toMatch(/^Checks: B has 1 fail, A pass\. /);
  expect(tradeSentence(checked("fail"), checked("pass"), names)).toMatch(/^Checks: A has 1 fail, B pass\. /);
  const better = made({
    units: 1,
    mass: 0.1,
    volume: 1e-5,
    bleed: { ...base.bleed, seconds: 1 },
    energy: { low: 9e5, nominal: 1e6, high: 2e6 },
  });
  const sentence = tradeSentence(better, base, names);
  expect(sentence.split(";")[0]?.split(/, | and /)).toHaveLength(4);
  expect(sentence).toMatch(/^A gives at least /);
});
