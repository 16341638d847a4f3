import { describe, expect, test } from "vitest";
import { type Mending, mend } from "../../src/place/mend.ts";
import { place } from "../../src/place/place.ts";
import type { Placing } from "../../src/place/placing.ts";
import { stagesGap } from "./brute.ts";
import { units } from "./lots.ts";

const request = { series: 3, parallel: 3, ties: "cross-tied" } as const;
const placedOf = (lot: ReturnType<typeof units>): Placing => {
  const read = place(lot, request);
  if (!read.ok) throw new Error("refused");
  return read.value;
};

const mended = (...args: Parameters<typeof mend>): Mending => {
  const read = mend(...args);
  if (!read.ok) throw new Error(read.refusals[0]!.code);
  return read.value;
};

describe("mend(units, request, placing, out)", () => {
  test("one and two moves are the best of all of them, by trying every spare and every second change, 15 lots", () => {
    for (let seed = 1; seed <= 15; seed++) {
      const lot = units("uniform", 12, seed);
      const placing = placedOf(lot);
      const out = placing.groups[1]![0]!;
      const capacitance = new Map(lot.map((unit) => [unit.serial, unit.capacitance]));
      const gap = (bank: readonly string[]) => {
        const serials = [0, 1, 2].map((g) => bank.slice(g * 3, g * 3 + 3));
        return stagesGap(
          bank.map((s) => capacitance.get(s)!),
          serials.map((_, g) => [g * 3, g * 3 + 1, g * 3 + 2]),
        );
      };
      const before = placing.groups.flat();
      const hole = before.indexOf(out);
      const best = [0, Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY];
      const pool = [...before.filter((s) => s !== out), ...placing.spares];
      for (const a of pool) {
        for (let p = 0; p < 9; p++) {
          for (const b of pool) {
            const bank = before.with(hole, a).with(p, p === hole ? a : b);
            if (new Set(bank).size < 9) continue;
            const moves = bank.filter((s, k) => s !== before[k]).length;
            if (moves <= 2) best[moves] = Math.min(best[moves]!, gap(bank));
          }
        }
      }
      const { rows } = mended(lot, request, placing, out);
      expect(rows[0]!.moves).toBe(1);
      expect(rows[0]!.charging).toBeCloseTo(best[1]!, 12);
      const goal = mended(lot, request, placing, out).goal;
      if (rows[0]!.charging > goal && best[2]! < best[1]!) expect(rows[1]!.charging).toBeCloseTo(best[2]!, 12);
    }
  });

  test("rows get better with more moves; steps tell the change; the removed unit never comes back", () => {
    const lot = units("uniform", 12, 3);
    const placing = placedOf(lot);
    const out = placing.groups[0]![0]!;
    const { rows, enough, goal } = mended(lot, request, placing, out);
    for (const [k, row] of rows.entries()) {
      if (k > 0) expect(row.charging).toBeLessThan(rows[k - 1]!.charging);
      expect(row.groups.flat()).not.toContain(out);
      expect(row.steps.filter((step) => step.in !== null).length).toBe(row.moves);
      for (const step of row.steps) expect(placing.groups[step.group]![step.at]).toBe(step.out);
    }
    if (enough) expect(enough.charging).toBeLessThanOrEqual(goal);
  });

  test("no spare: the hole stays, exchanges make up for part of it", () => {
    const lot = units("uniform", 9, 5);
    const placing = placedOf(lot);
    const { rows } = mended(lot, request, placing, placing.groups[2]![1]!);
    expect(rows[0]!.moves).toBe(0);
    expect(rows.at(-1)!.charging).toBeLessThan(rows[0]!.charging);
    expect(rows.at(-1)!.groups.flat().length).toBe(8);
  });

  test("a serial that is not fitted is refused", () => {
    const lot = units("uniform", 12, 7);
    const placing = placedOf(lot);
    expect(mend(lot, request, placing, placing.spares[0]!).ok).toBe(false);
  });

  test("a pinned unit is not moved", () => {
    const lot = units("uniform", 12, 7);
    const placing = placedOf(lot);
    const pinned = placing.groups[0]![1]!;
    const pins = [{ serial: pinned, group: 0 }];
    const { rows } = mended(lot, { ...request, pins }, placing, placing.groups[1]![0]!);
    for (const row of rows) expect(row.groups[0]).toContain(pinned);
  });
});
