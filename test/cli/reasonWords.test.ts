import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { REASONS, reasonWords } from "../../src/cli/reasonWords.ts";
import { LIMIT_NAMES } from "../../src/search/limits.ts";
import { at } from "../support/fakePorts.ts";

const sweep = ["sweep", "limitedSweep", "limits", "blendString", "blendOptions"]
  .map((name) => readFileSync(at(`src/search/${name}.ts`), "utf8"))
  .join("");
const limits = Object.values(LIMIT_NAMES).flatMap((name) =>
  ["limit", "unproven", "unknown"].map((end) => `${name}-${end}`),
);

describe("reasonWords(reason, currency)", () => {
  test("every reason of the search has words, and no other", () => {
    const found = sweep.matchAll(/"([a-z]+(?:-(?:limit|unknown|missing))|stock|balance|risk|no-shot|no-fuse)"/g);
    const used = new Set([...[...found].map((match) => match[1] as string), ...limits]);
    expect(used.size).toBeGreaterThan(7);
    expect([...used].sort()).toEqual(Object.keys(REASONS).sort());
  });

  test("with value and limit", () => {
    expect(reasonWords({ reason: "series-limit", value: 41, limit: 40 }, null)).toBe(
      "needs 41 in series to share safely, limit 40",
    );
    expect(reasonWords({ reason: "unit-limit", value: 123456, limit: 2000 }, null)).toMatch(/needs 123456 units/);
    expect(reasonWords({ reason: "cost-limit", value: 12.5, limit: 5 }, "EUR")).toBe(
      "costs 12.50 EUR at least, limit 5.00 EUR",
    );
    expect(reasonWords({ reason: "mass-limit", value: 5.63, limit: 0.5 }, null)).toBe(
      "weighs 5.63 kg at least, limit 500 g",
    );
  });

  test("stock: what must be bought, which is less than the bank needs when some is on hand", () => {
    expect(reasonWords({ reason: "stock", value: 79, limit: 0 }, null)).toBe(
      "79 units must be bought, 0 can be had, packs and minimum order counted",
    );
  });

  test("what is unknown is said to be, never nought", () => {
    for (const reason of Object.keys(REASONS)) {
      const words = reasonWords({ reason, value: null, limit: null }, null);
      expect(words, reason).not.toMatch(/\b0\b|NaN|null|\{/);
      expect(words.length).toBeGreaterThan(10);
    }
  });
});
