import { describe, expect, test } from "vitest";
import type { Alternatives, FindingLine } from "../../../src/sheet/index.ts";
import { layoutSection } from "../../../src/sheet/sections/layout.ts";
import { BARE, sheetInput, tableOf, WORDS, wordsIn } from "../../support/sheet.ts";

const input = sheetInput();
const other = { ...input.layout, id: "other 9s2p cross-tied", units: 18 };
const among = (over: Partial<Alternatives>): Alternatives => ({
  layouts: [input.layout, other],
  count: 40,
  rank: "cost",
  front: [input.layout.id],
  ...over,
});
const words = (alternatives: Alternatives | null) => wordsIn(layoutSection({ ...input, alternatives }));

describe("layoutSection(input)", () => {
  test("why it won: first, behind others, or not among them, each with who must give the reason", () => {
    expect(words(among({}))).toMatch(/It is the first of 40 layouts .* by cost\. No other layout beats it/);
    expect(words(among({ layouts: [other, input.layout], front: [] }))).toMatch(
      /It is number 2 of 40 .*reasons.*Some other layout beats it/,
    );
    expect(words(among({ layouts: [other] }))).toMatch(/not among the first 1 of 40/);
    expect(words(null)).toMatch(/No alternatives are shown: none were searched/);
  });

  test("this layout stands in the table of alternatives even where it is not among the first", () => {
    const section = layoutSection({ ...input, alternatives: among({ layouts: [other], front: [other.id] }) });
    const { rows } = tableOf({ sections: [section] }, "alternatives");
    expect(rows.map((row) => [row[0], row[6]])).toEqual([
      [`${input.layout.id} (this one)`, "no"],
      [other.id, "yes"],
    ]);
  });

  test("a check that fails is said first; what is not assessed is not called passed", () => {
    const line = (verdict: FindingLine["verdict"]): FindingLine => ({
      ...WORDS.findings[0]!,
      verdict,
      title: `a ${verdict}`,
    });
    const failing = layoutSection({
      ...input,
      words: { ...WORDS, findings: [line("pass"), line("fail"), line("not assessed")] },
    });
    expect(failing.blocks[0]).toMatchObject({
      text: expect.stringMatching(
        /^DO NOT BUILD: 1 checks fail \(a fail\)\. Not assessed, which is not a pass: a not assessed\./,
      ),
    });
    expect(layoutSection({ ...input, faults: [] }).blocks[0]).toMatchObject({
      text: "No check failed. Every check was assessed.",
    });
  });

  test("faults that fail are counted beside the checks", () => {
    const fault = { ...input.faults[0]!, verdict: "fail" as const, id: "unit-short" as const };
    const text = (faults: typeof input.faults) => layoutSection({ ...input, faults }).blocks[0];
    expect(text([fault])).toMatchObject({
      text: expect.stringMatching(/^No check failed.*OF THE FAULTS 1 FAIL \(unit short\)/),
    });
    expect(text([{ ...fault, verdict: "warn" }])).not.toMatchObject({ text: expect.stringMatching(/FAULTS/) });
  });

  test("figures as assessed; unknown ones are blanks or said to be unknown", () => {
    const of = (given = input) =>
      new Map(tableOf({ sections: [layoutSection(given)] }, "figures").rows.map((row) => [row[0], row[1]]));
    expect(of().get("even share of a stage")).toBe("250 V");
    expect(of().get("purchase cost of units and resistors")).toMatch(/^\d+\.\d\d EUR$/);
    const bare = of(sheetInput({ unit: BARE }));
    expect(bare.get("worst unit while charging")).toBeNull();
    expect(bare.get("capacitance: low, nominal, high")).toBe("not known, 250 µF, not known");
  });
});
