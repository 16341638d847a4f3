import { describe, expect, test } from "vitest";
import { RULES } from "../../../src/hazard/index.ts";
import { factsOf } from "../../../src/sheet/facts.ts";
import { hazardSection } from "../../../src/sheet/sections/hazard.ts";
import { pathCount } from "../../../src/sheet/ways.ts";
import { BARE, sheetInput, tableOf, wordsIn } from "../../support/sheet.ts";

const section = (wishes: Parameters<typeof sheetInput>[0] = {}) => hazardSection(sheetInput(wishes));
const rules = (wishes: Parameters<typeof sheetInput>[0] = {}) => tableOf({ sections: [section(wishes)] }, "rules").rows;
const classes = (wishes: Parameters<typeof sheetInput>[0] = {}) =>
  tableOf({ sections: [section(wishes)] }, "classes").rows;

describe("hazardSection(input)", () => {
  test("every rule is a row with body, how it was read and our words; memory is never printed as a requirement", () => {
    expect(rules()).toHaveLength(RULES.length);
    for (const [i, rule] of RULES.entries()) {
      const row = rules()[i]!;
      expect(row[0]).toContain(rule.body);
      expect(row[2]).toBe(rule.words);
      expect(row[1]).toBe(rule.tag === "memory" ? "memory: confirm against the text" : rule.tag);
    }
    const memory = RULES.filter(({ tag }) => tag === "memory").length;
    expect(rules().filter((row) => /confirm against the text/.test(row[1] ?? ""))).toHaveLength(memory);
    expect(memory).toBeGreaterThan(2);
  });

  test("the rule that governs is marked and named, and only that one", () => {
    const marked = (id: "nec-460-6") => rules({ rule: id }).filter((row) => row[0]?.includes("GOVERNS HERE"));
    expect(marked("nec-460-6")).toHaveLength(1);
    expect(rules().some((row) => row[0]?.includes("GOVERNS"))).toBe(false);
    expect(wordsIn(section())).toMatch(
      /No rule was chosen: the times on this sheet go down to 60 V \(the brief's touch-safe voltage\)/,
    );
    expect(wordsIn(section({ rule: "nec-460-28" }))).toMatch(/460\.28 governs .*confirm against the text/);
  });

  // A5 of the worked examples: the stricter tier holds, arc blast is a flag apart.
  test("classes: hazardous from 0.25 J at 400 V and more; 10 kJ flags an arc blast and changes no tier", () => {
    const of = (wishes: object) => new Map(classes(wishes).map((row) => [row[0], row]));
    expect(of({}).get("stored energy, highest voltage")?.slice(1)).toEqual([
      "600 J",
      expect.stringMatching(/^250 mJ from 400 V \(NFPA 70E/),
      "HAZARDOUS by stored energy",
    ]);
    expect(of({}).get("arc blast, a flag apart")?.[3]).toBe("no flag");
    const big = of({ shape: { parallel: 60 } });
    expect(big.get("arc blast, a flag apart")?.[3]).toMatch(/^ARC BLAST/);
    expect(big.get("stored energy, highest voltage")?.[2]).toMatch(/^250 mJ/);
    expect(
      of({ brief: { charger: { current: "1 mA", highest: "3 kV" } } }).get("stored energy, charger run on")?.[1],
    ).toBe("1.35 kJ");
  });

  test("the time until a rule is cleared for good: 45 uC of 300 uF at 150 mV, by hand", () => {
    const row = rules({ brief: { dumpResistance: "1 kohm" } }).find(
      (one) => one[2]?.includes("45 uC") && one[0]?.includes("61010"),
    )!;
    expect(row[3]).toBe("150 mV");
    expect(Number.parseFloat(row[6]!)).toBeCloseTo(0.3 * Math.log(2000 / 0.15), 2);
  });

  test("pathCount(facts): chains are one way however many, the dump another", () => {
    const count = (wishes: Parameters<typeof sheetInput>[0]) => pathCount(factsOf(sheetInput(wishes))).count;
    expect(count({})).toBe(1);
    expect(count({ brief: { dumpResistance: "1 kohm" }, shape: { ties: "strings" } })).toBe(2);
    expect(count({ shape: { series: 1, ties: "strings" }, brief: { voltage: "300 V", energy: "10 J" } })).toBe(0);
  });

  test("the dump by joules, amperes and volts; blank, its most resistance for the rule's time", () => {
    expect(wordsIn(section({ brief: { dumpResistance: "1 kohm" } }))).toMatch(
      /600 J in one go, 2 A and 2 kV at its first moment/,
    );
    // 5 s / (300 uF ln(2000/60)) = 4752.9 ohm.
    expect(wordsIn(section({ rule: "iec-60204-residual" }))).toMatch(/within 5 s it is at most 4\.75[23] kohm/);
    expect(wordsIn(section())).toMatch(/gives no time to size it by/);
    expect(wordsIn(section({ unit: BARE }))).toMatch(/not sized, because the tolerance/);
  });

  test("clearances are advice with the factor for altitude: x1.48 at 5000 m, beyond the scope over 1500 V", () => {
    const { rows } = tableOf({ sections: [section()] }, "clearances");
    expect(rows.map((row) => [row[0], row[1]])).toEqual([
      ["up to 2 000 m", "1"],
      ["3000 m", "1.14"],
      ["4000 m", "1.29"],
      ["5000 m", "1.48"],
    ]);
    expect(rows.every((row) => row[5] === "beyond the table's scope")).toBe(true);
    expect(wordsIn(section())).toMatch(/advice only; the standard decides\. The table is from memory: confirm/);
    expect(wordsIn(section({ brief: { voltage: "200 kV" }, shape: { series: 800, parallel: 1 } }))).toMatch(
      /no advice/,
    );
  });

  test("recovery: 10 % to 15 % of 2 kV for a wet electrolytic, from no known least for others", () => {
    expect(wordsIn(section())).toMatch(/200 V to 300 V, 13\.5 J at the most, HAZARDOUS/);
    expect(wordsIn(section({ unit: { ...sheetInput().unit, polarised: false } }))).toMatch(
      /Recovery voltage after a short: up to 200 V/,
    );
  });
});
