// Every published limit: distinct id, honest tag, values as the methods page lists them, never a rule that was not read at all.
import { describe, expect, test } from "vitest";
import { RULES, ruleOf } from "../../src/hazard/rules.ts";

describe("RULES", () => {
  test("ids are distinct, and each finds its own row", () => {
    expect(new Set(RULES.map((rule) => rule.id)).size).toBe(RULES.length);
    for (const rule of RULES) expect(ruleOf(rule.id)).toBe(rule);
  });

  test("every row has a body, words, a tag and at least one positive limit", () => {
    for (const rule of RULES) {
      expect(rule.body.length, rule.id).toBeGreaterThan(2);
      expect(rule.words.length, rule.id).toBeGreaterThan(20);
      expect(["read", "second hand", "memory"]).toContain(rule.tag);
      expect(rule.limits.length, rule.id).toBeGreaterThan(0);
      for (const limit of rule.limits) expect(limit.value, rule.id).toBeGreaterThan(0);
    }
  });

  test("only the laboratory's own pages count as read; no standard does", () => {
    const read = RULES.filter((rule) => rule.tag === "read").map((rule) => rule.body);
    expect(new Set(read)).toEqual(new Set(["Lawrence Berkeley Lab, electrical safety pages"]));
  });

  test("what comes from memory says so", () => {
    const memory = RULES.filter((rule) => rule.tag === "memory").map((rule) => rule.id);
    expect(memory.sort()).toEqual(["iec-60871-decay", "iec-61010-energy", "iec-61010-inside", "nec-460-28"]);
  });

  test("classes that were only half remembered, and a contested table, are left out", () => {
    const bodies = RULES.map((rule) => `${rule.body} ${rule.words}`).join("\n");
    expect(bodies).not.toMatch(/DOE-HDBK|ES1|ES2/);
  });
});
