// A blend beside the cheapest layout of one part.
import { expect, test } from "vitest";
import { besideWords } from "../../src/cli/blendBeside.ts";

const cost = (total: number, unpriced: readonly string[] = [], currency = "EUR") =>
  ({ total, currency, unpriced, capacitors: total, resistors: null, lines: 0, shipments: 0 }) as never;
const single = (total: number, unpriced: readonly string[] = []) => ({
  id: "a 1s9p strings",
  cost: cost(total, unpriced),
});

test("besideWords(best, single): more, the same, less; open lines said", () => {
  const best = { cost: cost(20) };
  expect(besideWords(best, single(25))).toBe("The cheapest layout of one part, a 1s9p strings, costs 5.00 EUR more.");
  expect(besideWords(best, single(20))).toMatch(/costs the same\.$/);
  expect(besideWords(best, single(18))).toMatch(/costs 2\.00 EUR less: it has more in series/);
  expect(besideWords(best, single(25, ["x"]))).toMatch(/more\. Not all of their lines have a price\.$/);
});

test("null without a layout, without a price, or in another currency", () => {
  expect(besideWords({ cost: cost(20) }, undefined)).toBeNull();
  expect(besideWords({ cost: null }, single(1))).toBeNull();
  expect(besideWords({ cost: cost(20, [], "USD") }, single(1))).toBeNull();
});
