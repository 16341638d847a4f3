// The sieve: with it a plan counts, lists and fronts exactly what it does when every layout is kept.
import { describe, expect, test } from "vitest";
import { readCapacitors } from "../../src/catalog/index.ts";
import { plan, readBrief } from "../../src/search/index.ts";
import { mayMatter, remember, sieveOf } from "../../src/search/sieve.ts";
import { strongOf } from "../../src/search/strong.ts";
import { newTable, pushRow } from "../../src/search/table.ts";
import { bigCatalogue } from "../support/bigCatalogue.ts";
import { must } from "../support/labParts.ts";

const parts = must(readCapacitors(bigCatalogue(4000, 11), "big.csv")).parts;
const briefOf = (over: object) => must(readBrief({ energy: "2.4 kJ", voltage: "2.2 kV", ripple: "100 %", ...over }));

describe("plan with a limit against plan that keeps all, 4,000 parts", () => {
  const asks = [
    { maxSeries: 9 },
    { ripple: "20 %", spares: 3, maxSeries: 12 },
    { voltage: "900 V", maxUnits: 300, maxSeries: 8 },
  ];
  test.each(asks)(
    "%j: the same count, front, refusals and first layouts, and by two rankings for one",
    (ask) => {
      const brief = briefOf(ask);
      for (const rank of ask === asks[0] ? (["cost", "stress"] as const) : (["cost"] as const)) {
        const all = must(plan({ brief, parts, limit: 0, rank, quick: true }));
        const some = must(plan({ brief, parts, limit: 20, rank, quick: true }));
        expect(all.searched.layouts).toBeGreaterThan(1000);
        expect(some.searched).toEqual(all.searched);
        expect([...some.front].sort()).toEqual([...all.front].sort());
        expect(some.refused).toEqual(all.refused);
        expect(some.layouts.map((l) => l.id)).toEqual(all.layouts.slice(0, 20).map((l) => l.id));
      }
    },
    60_000,
  );
});

describe("mayMatter(sieve, figures)", () => {
  const row = { part: 0, series: 1, parallel: 1, tied: false, family: -1 };
  const good = { cost: 10, volume: 1, mass: 1, units: 4, stress: 0.5 };
  const table = newTable();
  pushRow(table, { ...row, ...good, series: 2, parallel: 2 });
  pushRow(table, { ...row, ...good, series: 2, parallel: 4, cost: 20, stress: 0.9 });
  const sieve = () => sieveOf(table, strongOf(table, [0], [1]), { limit: 1, rank: "cost" });
  test("beaten in everything and dearer than the first: it may be forgotten", () =>
    expect(mayMatter(sieve(), { cost: 11, volume: 2, mass: 2, units: 8, stress: 0.6 })).toBe(false));
  test("better in one thing: it may be on the front", () =>
    expect(mayMatter(sieve(), { cost: 11, volume: 2, mass: 2, units: 8, stress: 0.4 })).toBe(true));
  test("an equal is kept, and so is a cheaper one", () => {
    expect(mayMatter(sieve(), good)).toBe(true);
    expect(mayMatter(sieve(), { ...good, cost: 9, volume: 5 })).toBe(true);
  });
  test("what is remembered raises the bar of the order", () => {
    const one = sieve();
    remember(one, { ...good, cost: 5 });
    expect(mayMatter(one, { cost: 10, volume: 9, mass: 9, units: 9, stress: 0.9 })).toBe(false);
  });
});
