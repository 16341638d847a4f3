import { describe, expect, test } from "vitest";
import { assumptionsOf, costWords, findingsText, hanging, layoutText, money } from "../../src/cli/layoutText.ts";
import { widthOf } from "../../src/cli/wrap.ts";
import { bankOf, briefOf, DEFAULT_FAMILY, UNIT } from "../support/bank.ts";

describe("money(amount, currency), costWords(layout)", () => {
  test("no price is said, never nought; lines left out are marked", () => {
    expect(money(null, "EUR")).toBe("no price");
    expect(money(0, "EUR")).toBe("0.00 EUR");
    expect(costWords({ cost: null })).toBe("no price");
    expect(costWords(bankOf({ families: [DEFAULT_FAMILY] }))).toMatch(/EUR \+$/);
    expect(costWords(bankOf())).toMatch(/EUR$/);
  });
});

describe("findingsText(findings, width)", () => {
  test("every finding has its verdict word; what did not pass has its note", () => {
    const { findings } = bankOf();
    const text = findingsText(findings, 80);
    expect(text.split("\n").filter((line) => /^ {2}(pass|WARN|FAIL|not assessed) {2}/.test(line))).toHaveLength(
      findings.length,
    );
    expect(text.replace(/\s+/g, " ")).toMatch(
      /not assessed, reverse voltage left by a dump: The reverse rating is unknown/,
    );
  });
});

describe("layoutText(layout, unit, width)", () => {
  test("fits 80 columns and names what it is", () => {
    const text = layoutText(bankOf(), UNIT, 80);
    for (const line of text.split("\n")) expect(widthOf(line), line).toBeLessThanOrEqual(80);
    expect(text).toMatch(/shape +8 in series, 2 in parallel, cross-tied, 16 units/);
    expect(text).toMatch(/capacitance +200 µF low, 250 µF nominal, 300 µF high/);
  });

  test("too few to be had is said in place of a price", () => {
    const unit = { ...UNIT, available: 10, onHand: 3, pack: 10, minimumOrder: 1 };
    expect(layoutText(bankOf({ unit }), unit, 120).replace(/\s+/g, " ")).toMatch(
      /cost .*price: capacitors, not enough can be had: 20 needed beside 3 on hand, 10 available/,
    );
  });

  test("unknown tolerance, size, price and leakage are said to be unknown", () => {
    const { tolerance: _t, price: _p, diameter: _d, leakage: _l, mass: _m, ...unit } = UNIT;
    const text = layoutText(bankOf({ unit, families: [DEFAULT_FAMILY] }), unit, 80);
    expect(text).toMatch(/tolerance unknown/);
    expect(text).toMatch(/cost +no price/);
    expect(text).toMatch(/volume +unknown/);
    expect(text).toMatch(/mass +unknown/);
    expect(text).toMatch(/not assessed {2}worst unit while charging/);
    expect(text).not.toMatch(/NaN|null|undefined|Infinity/);
  });

  test("one in series needs no balancing, and a chain that is not there drains nothing", () => {
    const unit = { ...UNIT, voltage: 4000 };
    const layout = bankOf({ unit, layout: { part: "x", series: 1, parallel: 3, ties: "strings" } });
    expect(layoutText(layout, unit, 80)).toMatch(/none needed: one in series/);
    expect(layoutText(layout, unit, 80)).toMatch(/no chain drains this bank to 60 V/);
  });

  test("part names cannot reach the terminal raw", () => {
    const unit = { ...UNIT, part: "a\u001b[31m\u202e" };
    const states = { leakage: { state: "assumed", rule: "r\u0007" } } as const;
    expect(layoutText(bankOf({ unit }), { ...unit, states }, 80)).not.toMatch(/[\u001b\u202e\u0007]/);
  });
});

test("assumptionsOf(unit, layout): rules by name, the assumed resistor, unknown polarity", () => {
  const { polarised: _polarised, ...unit } = UNIT;
  const assumed = { ...unit, states: { leakage: { state: "assumed", rule: "the rule" } } } as const;
  expect(assumptionsOf(assumed, bankOf({ unit: assumed, families: [DEFAULT_FAMILY], brief: briefOf() }))).toEqual([
    expect.stringMatching(/leakage of .*: the rule/),
    expect.stringMatching(/assumed 2 W leaded/),
    expect.stringMatching(/polarity/),
  ]);
});

test("hanging(label, text, width): later lines stand under the text", () => {
  const lines = hanging("label", "word ".repeat(20).trim(), 50).split("\n");
  expect(lines.length).toBeGreaterThan(1);
  for (const line of lines.slice(1)) expect(line).toMatch(/^ {21}word/);
});
