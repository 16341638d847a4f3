// The sieve: nothing that belongs to the first of the order or to the front is ever said not to matter.
import { describe, expect, test } from "vitest";
import { readCapacitors } from "../../src/catalog/index.ts";
import { frontRows } from "../../src/search/front.ts";
import { plan, readBrief } from "../../src/search/index.ts";
import { comparison, firstRows, RANKINGS } from "../../src/search/rank.ts";
import { mayMatter, remember, sieveOf } from "../../src/search/sieve.ts";
import { strongOf } from "../../src/search/strong.ts";
import { figuresAt, type LayoutTable, newTable, noFigures, pushRow } from "../../src/search/table.ts";
import { bigCatalogue } from "../support/bigCatalogue.ts";
import { must } from "../support/labParts.ts";
import { chance } from "../support/random.ts";

const INF = Number.POSITIVE_INFINITY;
type Chance = ReturnType<typeof chance>;

function pushRandom(table: LayoutTable, c: Chance, part: number, steps: number): void {
  const value = (): number => (c.maybe(0.1) ? INF : c.whole(1, steps) / steps);
  const row = { part, series: c.whole(1, steps), parallel: 1, tied: false, family: -1 };
  pushRow(table, { ...row, cost: value() * 1e4, volume: value(), mass: value(), stress: value() });
}

describe("sieveOf(table, strong, wanted), mayMatter(sieve, figures), remember(sieve, figures)", () => {
  test.each(RANKINGS)("ranked by %s, 40 random tables: the first 7 and the front pass, most others do not", (rank) => {
    let [passed, all] = [0, 0];
    for (let seed = 0; seed < 40; seed++) {
      const c = chance(500 + seed);
      const steps = c.pick([4, 50, 5000]);
      const table = newTable(400);
      for (let part = 0; part < 100; part++) pushRandom(table, c, part, steps);
      const known = Array.from({ length: table.count }, (_, i) => i);
      const strong = strongOf(table, { candidates: frontRows(table), tried: known, ahead: 1e6 });
      const sieve = sieveOf(table, strong, { limit: 7, rank });
      const matters: boolean[] = known.map(() => true);
      for (let part = 100; part < 400; part++) {
        pushRandom(table, c, part, steps);
        const figures = figuresAt(table, part, noFigures());
        matters.push(mayMatter(sieve, figures));
        if (matters[part]) remember(sieve, figures);
      }
      const parts = Array.from({ length: 400 }, (_, i) => {
        return { part: String(1000 + i), capacitance: 1, voltage: 1, states: {}, file: "", line: i };
      });
      const first = firstRows(table.count, 7, comparison(table, parts, rank));
      for (const row of [...first, ...frontRows(table)]) expect(matters[row], `case ${seed} row ${row}`).toBe(true);
      passed += matters.slice(100).filter(Boolean).length;
      all += 300;
    }
    expect(passed / all).toBeLessThan(0.7);
  });
  test("fewer rows than wanted: everything may matter, also what is beaten and not assessed", () => {
    const table = newTable(4);
    pushRow(table, {
      part: 0,
      series: 1,
      parallel: 1,
      tied: false,
      family: -1,
      cost: 1,
      volume: 1,
      mass: 1,
      stress: 0.1,
    });
    const strong = strongOf(table, { candidates: [0], tried: [0], ahead: 1e6 });
    const worst = { cost: INF, volume: INF, mass: INF, units: 9, stress: INF };
    expect(mayMatter(sieveOf(table, strong, { limit: 2, rank: "cost" }), worst)).toBe(true);
  });
});

const parts = must(readCapacitors(bigCatalogue(4000, 11), "big.csv")).parts;
const briefOf = (over: object) => must(readBrief({ energy: "2.4 kJ", voltage: "2.2 kV", ripple: "100 %", ...over }));

describe("plan with a limit against plan that keeps all, 4,000 parts", () => {
  const asks = [{ maxSeries: 9 }];
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
