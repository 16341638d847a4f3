// The sweep against a slow brute force written from the rules alone, on small random catalogues.
import { describe, expect, test } from "vitest";
import { requiredCapacitance } from "../../src/bank/index.ts";
import { type Capacitor, DEFAULT_FAMILY, readCapacitors, readResistors } from "../../src/catalog/index.ts";
import { frontRows } from "../../src/search/front.ts";
import { type Brief, plan, readBrief } from "../../src/search/index.ts";
import { comparison, firstRows, idOf, RANKINGS } from "../../src/search/rank.ts";
import { sweep } from "../../src/search/sweep.ts";
import type { LayoutTable } from "../../src/search/table.ts";
import { bigCatalogue } from "../support/bigCatalogue.ts";
import { labResistors } from "../support/labParts.ts";
import { chance } from "../support/random.ts";
import { slowPlan } from "../support/slowPlan.ts";
import { smallBrief, smallCatalogue, smallResistors } from "../support/smallCatalogue.ts";

function must<T>(read: { readonly ok: boolean; readonly value?: T }): T {
  if (!read.ok) throw new Error(JSON.stringify(read));
  return read.value as T;
}

interface Seen {
  layouts: number;
  refused: number;
  empty: number;
  unassessed: number;
  tied: number;
  balanced: number;
}
const nothing = (): Seen => ({ layouts: 0, refused: 0, empty: 0, unassessed: 0, tied: 0, balanced: 0 });

interface Draw {
  readonly seed: number;
  readonly holds: readonly string[];
  readonly wide?: boolean;
  readonly spreads?: readonly string[];
  readonly keep?: (unit: Capacitor, brief: Brief) => boolean;
}

/** One random catalogue planned both ways; every layout, the order, the front, the refusals and the figures must agree. */
function compare({ seed, holds, wide = false, spreads, keep = () => true }: Draw, seen: Seen): void {
  const c = chance(seed);
  const read = must(readCapacitors(smallCatalogue(c, wide), `case-${seed}.csv`));
  expect(read.faults).toEqual([]);
  const { families } = must(readResistors(smallResistors(c, spreads), `r-${seed}.csv`));
  const brief = must(readBrief(smallBrief(c, holds)));
  const parts = read.parts.filter((unit) => keep(unit, brief));
  const slow = slowPlan(brief, parts, families);
  const quick = must(plan({ brief, parts, families, limit: 0, quick: true }));
  const at = `case ${seed}`;
  // Both are closed forms in doubles; 1e-9 is the slack of the rules themselves.
  const close = (a: number | null, b: number | null, what: string): void => {
    if (a === null || b === null) expect(a, `${at} ${what}`).toBe(b);
    else expect(Math.abs(a - b), `${at} ${what}`).toBeLessThanOrEqual(1e-9 * Math.abs(b));
  };
  const known = (x: number): number | null => (Number.isFinite(x) ? x : null);
  close(quick.required.capacitance, slow.required, "required");
  expect(
    quick.layouts.map((l) => l.id),
    at,
  ).toEqual(slow.layouts.map((l) => l.id));
  expect(quick.searched, at).toEqual({ parts: parts.length, layouts: slow.layouts.length, proof: "exhaustive" });
  quick.layouts.forEach((l, k) => {
    const s = slow.layouts[k]!;
    expect(l.units, `${at} ${l.id}`).toBe(s.units);
    close(l.share.charging, s.charging, `${l.id} charging`);
    close(l.balance?.resistance ?? null, s.choice?.resistance ?? null, `${l.id} resistance`);
    expect(l.balance?.elements, `${at} ${l.id}`).toBe(s.choice?.elements);
    if (s.choice !== null) close(l.share.holding, s.choice.worst, `${l.id} holding`);
    close(l.stress, known(s.stress), `${l.id} stress`);
    close(l.volume, known(s.volume), `${l.id} volume`);
    close(l.mass, known(s.mass), `${l.id} mass`);
    if (Number.isFinite(s.cost) && l.cost !== null)
      expect(Math.round(l.cost.total * 100), `${at} ${l.id}`).toBe(s.cost);
  });
  expect([...quick.front].sort(), at).toEqual([...slow.front].sort());
  expect(quick.refused.map((r) => r.part).sort(), at).toEqual([...slow.refused].sort());
  seen.layouts += slow.layouts.length;
  seen.refused += slow.refused.length;
  seen.empty += slow.layouts.length === 0 ? 1 : 0;
  seen.unassessed += slow.layouts.filter((l) => !Number.isFinite(l.stress)).length;
  seen.tied += slow.layouts.filter((l) => l.ties === "cross-tied").length;
  seen.balanced += slow.layouts.filter((l) => l.choice !== null).length;
}

describe("plan on random small catalogues against the slow brute force", () => {
  test("200 cases held for ever: same layouts, order, front, refusals and figures", () => {
    const seen = nothing();
    for (let i = 0; i < 200; i++) compare({ seed: 7000 + i, holds: ["for ever"] }, seen);
    for (const [what, count] of Object.entries(seen)) expect(count, what).toBeGreaterThan(20);
  });

  test("80 cases held for 30 s or 600 s, units wider than resistors, more volts than one unit bears: the same", () => {
    const seen = nothing();
    const keep = (u: Capacitor, b: Brief): boolean =>
      Math.min(b.derating, u.derating ?? 1) * u.voltage < b.voltage * (1 + b.overshoot);
    for (let i = 0; i < 80; i++)
      compare({ seed: 8000 + i, holds: ["30 s", "600 s"], wide: true, spreads: ["1"], keep }, seen);
    for (const what of ["layouts", "refused", "tied", "balanced"] as const)
      expect(seen[what], what).toBeGreaterThan(20);
  });

  // A small resistor may then divide worse than a large one: the choice must look at what it does, and the search lose nothing by it.
  test("120 cases held for 600 s, resistors wider than units: the same", () => {
    const seen = nothing();
    const keep = (u: Capacitor, b: Brief): boolean =>
      u.tolerance !== undefined && Math.min(b.derating, u.derating ?? 1) * u.voltage < b.voltage * (1 + b.overshoot);
    for (let i = 0; i < 120; i++) compare({ seed: 9000 + i, holds: ["600 s"], spreads: ["10"], keep }, seen);
    expect(seen.balanced).toBeGreaterThan(50);
  });
});

describe("sweep(input, { wanted }), which keeps only what may matter, against the sweep that keeps all", () => {
  const { parts } = must(readCapacitors(bigCatalogue(800, 5), "big.csv"));
  const unsaid = parts.map(({ leakage: _l, insulation: _i, tolerance: _t, ...unit }): Capacitor => unit);
  const base = { energy: 2400, voltage: 2200, ripple: 1 };
  const limit = 7;
  test.each([
    ["as it is", base, parts],
    ["a ceiling of cost", { ...base, maxCost: 900 }, parts],
    ["ceilings of size and series", { ...base, energy: 20000, maxVolume: "200 L", maxSeries: 20 }, parts],
    ["a hold of 30 s", { ...base, voltage: 800, hold: "30 s", maxSeries: 10 }, parts],
    ["statistical", { ...base, voltage: 1500, basis: "statistical", risk: 0.001, maxSeries: 7 }, parts.slice(0, 520)],
    ["spares and small banks", { ...base, energy: 3, voltage: 600, spares: 2 }, parts],
    ["nothing said of leakage and tolerance", base, unsaid],
    ["the other way round", base, [...parts].reverse()],
  ] as const)("%s: same first, front, count and refusals by every ranking", (_what, wish, stock) => {
    const brief = must(readBrief(wish));
    for (const families of brief.basis === "statistical" ? [labResistors] : [[DEFAULT_FAMILY], labResistors]) {
      const work = { brief, parts: stock, families, required: requiredCapacitance(brief), currency: "EUR" };
      const all = sweep(work);
      const ids = (table: LayoutTable, rows: readonly number[]) => rows.map((row) => idOf(table, stock, row));
      expect(all.count).toBe(all.table.count);
      expect(all.count).toBeGreaterThan(100);
      const front = ids(all.table, frontRows(all.table));
      for (const rank of brief.basis === "statistical" ? (["cost"] as const) : RANKINGS) {
        const few = sweep(work, { wanted: { limit, rank } });
        expect(few.table.count).toBeLessThan(all.count);
        expect(few.count).toBe(all.count);
        expect(few.refused).toEqual(all.refused);
        expect(ids(few.table, frontRows(few.table))).toEqual(front);
        const first = (table: LayoutTable) => ids(table, firstRows(table.count, limit, comparison(table, stock, rank)));
        expect(first(few.table)).toEqual(first(all.table));
      }
    }
  });
});
