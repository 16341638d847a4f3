// Among families: the cheapest that works, then the fewest elements, those without a price last.
import { describe, expect, test } from "vitest";
import { type Capacitor, type ResistorFamily, readResistors } from "../../src/catalog/index.ts";
import { bestBalance, chainOf, newBalancing, positionsOf, shapedChain, sharingOf } from "../../src/search/balancing.ts";
import { readBrief } from "../../src/search/brief.ts";
import { prepare } from "../../src/search/candidate.ts";

const unit: Capacitor = {
  part: "a",
  capacitance: 3300e-6,
  voltage: 500,
  leakage: 1e-3,
  tolerance: { low: 0.2, high: 0.2 },
  states: {},
  file: "c.csv",
  line: 2,
};
const read = readBrief({ energy: 1, voltage: 1600, ripple: 1, overshoot: 0.05 });
if (!read.ok) throw new Error("brief");
const brief = read.value;
const candidate = prepare(unit, brief);
const families = (rows: readonly string[]): readonly ResistorFamily[] => {
  const made = readResistors(
    `family,series,lowest [ohm],highest [ohm],tolerance [%],power [W],voltage [V],price,currency,pack\n${rows.join("\n")}\n`,
    "r.csv",
  );
  if (!made.ok) throw new Error(JSON.stringify(made));
  return made.value.families;
};
const choose = (rows: readonly string[], positions = 4) => {
  const chain = shapedChain(candidate, brief, { series: 4, parallel: 1, ties: "strings" }, 0)!;
  const best = newBalancing();
  const from = families(rows);
  return bestBalance({ ...chain }, 450, positions, from, best) ? { ...best, name: from[best.family]?.family } : null;
};

describe("positionsOf, sharingOf", () => {
  test("one a stage shared by all its units; one a unit shared by none", () => {
    expect(positionsOf({ series: 6, parallel: 10, ties: "cross-tied" })).toBe(6);
    expect(sharingOf({ series: 6, parallel: 10, ties: "cross-tied" })).toBe(10);
    expect(positionsOf({ series: 6, parallel: 10, ties: "strings" })).toBe(60);
    expect(sharingOf({ series: 6, parallel: 10, ties: "strings" })).toBe(1);
  });
});

describe("chainOf, shapedChain", () => {
  test("an unknown leak gives no chain", () => {
    const { leakage: _known, ...bare } = unit;
    expect(chainOf(prepare(bare, brief), brief)).toBe(null);
  });
  test("the voltage carries the overshoot", () => expect(chainOf(candidate, brief)?.voltage).toBeCloseTo(1680, 9));
  // Unknown is not zero: in a finite hold the start, the charging share, needs the tolerance.
  test("an unknown tolerance in a finite hold gives no chain", () => {
    const { tolerance: _known, ...bare } = unit;
    const short = { ...brief, hold: 30 };
    expect(chainOf(prepare(bare, short), short)).toBe(null);
  });
});

describe("bestBalance(chain, limit, positions, families, best)", () => {
  test("no family works: false", () => expect(choose(["big,E24,100000,1000000,5,10,500,1,EUR,"])).toBe(null));
  test("no families: false", () => expect(choose([])).toBe(null));
  test("the cheapest of all its elements, not of one", () => {
    // 0.10 each but ten a position against 0.80 each and one a position.
    const made = choose(["weak,E24,1,1000000,1,2,200,0.10,EUR,", "strong,E24,1,1000000,1,50,1000,0.80,EUR,"]);
    const weak = choose(["weak,E24,1,1000000,1,2,200,0.10,EUR,"]);
    const strong = choose(["strong,E24,1,1000000,1,50,1000,0.80,EUR,"]);
    expect(made?.cost).toBe(Math.min(weak!.cost, strong!.cost));
  });
  test("packs count: one of a hundred-pack costs the pack", () =>
    expect(choose(["pack,E24,1,1000000,1,50,1000,0.10,EUR,100", "piece,E24,1,1000000,1,50,1000,0.80,EUR,"])?.name).toBe(
      "piece",
    ));
  test("equal cost: the fewest elements; equal in both: the first", () => {
    expect(choose(["two,E24,1,1000000,1,50,250,0,EUR,", "one,E24,1,1000000,1,50,1000,0,EUR,"])?.name).toBe("one");
    expect(choose(["first,E24,1,1000000,1,50,1000,1,EUR,", "second,E24,1,1000000,1,50,1000,1,EUR,"])?.name).toBe(
      "first",
    );
  });
  test("one without a price comes after any with one, and is taken when alone", () => {
    expect(choose(["free,E24,1,1000000,1,50,1000,,,", "dear,E24,1,1000000,1,50,1000,99,EUR,"])?.name).toBe("dear");
    expect(choose(["free,E24,1,1000000,1,50,1000,,,"])).toMatchObject({ name: "free", cost: Number.POSITIVE_INFINITY });
  });
});
