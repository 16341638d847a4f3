// The sweep against a slow brute force written from the rules alone, on small random catalogues.
import { describe, expect, test } from "vitest";
import { type Capacitor, readCapacitors, readResistors } from "../../src/catalog/index.ts";
import { type Brief, plan, readBrief } from "../../src/search/index.ts";
import { leastSeries } from "../../src/search/sweep.ts";
import { chance } from "../support/random.ts";
import { slowPlan } from "../support/slowPlan.ts";
import { smallBrief, smallCatalogue, smallResistors } from "../support/smallCatalogue.ts";

function must<T>(read: { readonly ok: boolean; readonly value?: T }): T {
  if (!read.ok) throw new Error(JSON.stringify(read));
  return read.value as T;
}

describe("leastSeries(voltage, limit, tolerance)", () => {
  test.each([
    [400, 400, { low: 0.2, high: 0.2 }, 1],
    [400 * (1 + 2e-9), 400, { low: 0, high: 0 }, 2],
    [800, 400, { low: 0, high: 0 }, 2],
    [800, 400, null, 2],
    [800, 400, { low: 0.2, high: 0.2 }, 3],
    [1350, 450, { low: 0.2, high: 0.2 }, 4],
    [1600, 450, { low: 0.2, high: 0.2 }, 5],
    [2200, 0.001, { low: 0, high: 0 }, 2200000],
  ])("%d V on %d V, %o: %d", (voltage, limit, tolerance, n) => expect(leastSeries(voltage, limit, tolerance)).toBe(n));

  test("worked number A1: 1350 V is the most that four of 450 V bear at 20 %, so 1351 V takes five", () => {
    expect(leastSeries(1351, 450, { low: 0.2, high: 0.2 })).toBe(5);
  });

  // Skipped because it never ends: above 2^53 adding one changes nothing, and a brief may ask for such a derating.
  test("a limit of a millionth of a millionth of the volts: some number, and soon", () => {
    expect(leastSeries(1e7, 4.5e-10, { low: 0.2, high: 0.2 })).toBeGreaterThan(1000);
  });

  test("is the least: counting up from one gives the same on 2000 random cases", () => {
    const c = chance(11);
    for (let i = 0; i < 2000; i++) {
      const [voltage, limit] = [c.between(1, 3000), c.between(50, 500)];
      const tolerance = { low: c.between(0, 0.9), high: c.between(0, 1) };
      let n = 1;
      while (
        (voltage * (1 + tolerance.high)) / (1 + tolerance.high + (n - 1) * (1 - tolerance.low)) >
        limit * (1 + 1e-9)
      )
        n++;
      expect(leastSeries(voltage, limit, tolerance), `case ${i}`).toBe(n);
    }
  });
});

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
