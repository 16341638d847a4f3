// The beam behind mending: from a bank with a hole, the best placings for each number of units soldered anew.
import { gapOfGroups } from "./bankGaps.ts";
import { stageGap, stringGap } from "./gap.ts";
import type { Ties } from "./unit.ts";

/** Serial in each position, group by group; null is the hole. */
export type Bank = readonly (string | null)[];

export interface Candidate {
  readonly bank: Bank;
  readonly charging: number;
  /** What the beam keeps by: the spread of all groups, since the gap only sees the worst. */
  readonly spread: number;
}

export interface MendTask {
  readonly ties: Ties;
  /** The bank before the unit came out. */
  readonly before: Bank;
  /** Position of the unit that came out. */
  readonly hole: number;
  readonly size: number;
  readonly count: number;
  readonly spares: readonly string[];
  readonly pinned: ReadonlySet<string>;
  readonly capacitance: (serial: string) => number;
  readonly mayReplace: (stands: string, serial: string) => boolean;
  /** Stop adding moves once the gap is this or below. */
  readonly goal: number;
}

export const MOST_MOVES = 20;
/** Placings kept for each number of moves; fewer once there are many moves. */
const BEAM = 12;
const NARROW = 3;
const WIDE_MOVES = 4;

/** Sum of squared deviations from the mean. */
function spreadOf(sums: readonly number[]): number {
  const mean = sums.reduce((total, s) => total + s, 0) / sums.length;
  return sums.reduce((total, s) => total + (s - mean) ** 2, 0);
}

/** The best placing found for each number of moves. */
export function mendSearch(task: MendTask): ReadonlyMap<number, Candidate> {
  const { before, hole, size, count, spares, pinned, ties } = task;
  const outUnit = before[hole]!;
  const capacitance = (serial: string | null): number => (serial === null ? 0 : task.capacitance(serial));
  const valuesOf = (bank: Bank, g: number): number[] =>
    bank.slice(g * size, (g + 1) * size).flatMap((s) => (s === null ? [] : [capacitance(s)]));
  const bare = before.with(hole, null);
  const changed = (bank: Bank): number => bank.filter((serial, p) => serial !== before[p] && serial !== null).length;

  /** Groups in which an exchange can matter most: the lowest and the highest. */
  const telling = (bank: Bank): ReadonlySet<number> => {
    const levels = Array.from({ length: count }, (_, g) => valuesOf(bank, g).reduce((sum, c) => sum + c, 0));
    return new Set([levels.indexOf(Math.min(...levels)), levels.indexOf(Math.max(...levels))]);
  };

  /** Calls `offer` with the positions and new serials of every placing one exchange or one spare away. */
  const eachNeighbour = (
    bank: Bank,
    offer: (p: number, inP: string | null, q: number, inQ: string | null) => void,
  ): void => {
    const fitted = new Set(bank);
    const free = spares.filter((serial) => !fitted.has(serial));
    const groups = telling(bank);
    for (let p = 0; p < bank.length; p++) {
      if (bank[p] !== null && pinned.has(bank[p]!)) continue;
      const stands = bank[p] ?? outUnit;
      for (const serial of free) if (task.mayReplace(stands, serial)) offer(p, serial, -1, null);
      if (p !== hole && !groups.has(Math.floor(p / size))) continue;
      for (let q = 0; q < bank.length; q++) {
        if (Math.floor(p / size) === Math.floor(q / size)) continue;
        if (bank[q] !== null && pinned.has(bank[q]!)) continue;
        if (task.mayReplace(stands, bank[q] ?? outUnit)) offer(p, bank[q]!, q, bank[p]!);
      }
    }
  };

  const first: Candidate = {
    bank: bare,
    charging: gapOfGroups(
      ties,
      Array.from({ length: count }, (_, g) => valuesOf(bare, g)),
    ),
    spread: Number.POSITIVE_INFINITY,
  };
  const levels = new Map<number, Candidate[]>([[0, [first]]]);
  const bestGap = new Map<number, Candidate>([[0, first]]);
  const offerFrom = (from: Candidate, moves: number): void => {
    const groupValues = Array.from({ length: count }, (_, g) => valuesOf(from.bank, g));
    const sums = groupValues.map((values) => values.reduce((sum, c) => sum + c, 0));
    const stringGaps = ties === "strings" ? groupValues.map(stringGap) : [];
    const differs = (p: number, serial: string | null): number => (serial !== before[p] && serial !== null ? 1 : 0);
    const here = changed(from.bank);
    const holed = from.bank.includes(null);
    const gapAfter = (p: number, inP: string | null, q: number, inQ: string | null): readonly [number, number] => {
      const [g, h] = [Math.floor(p / size), q < 0 ? -1 : Math.floor(q / size)];
      if (ties === "strings") {
        const bank = q < 0 ? from.bank.with(p, inP) : from.bank.with(p, inP).with(q, inQ);
        const gaps = stringGaps.map((gap, k) => (k === g || k === h ? stringGap(valuesOf(bank, k)) : gap));
        const worst = Math.max(...gaps);
        return [worst, worst];
      }
      const held = [sums[g]!, h < 0 ? 0 : sums[h]!] as const;
      sums[g] = held[0] + capacitance(inP) - capacitance(from.bank[p]!);
      if (h >= 0) sums[h] = held[1] + capacitance(inQ) - capacitance(from.bank[q]!);
      const gap = stageGap(sums, count);
      const spread = spreadOf(sums);
      sums[g] = held[0];
      if (h >= 0) sums[h] = held[1];
      return [gap, spread];
    };
    eachNeighbour(from.bank, (p, inP, q, inQ) => {
      const after =
        here - differs(p, from.bank[p]!) + differs(p, inP) + (q < 0 ? 0 : differs(q, inQ) - differs(q, from.bank[q]!));
      if (after <= moves || after > MOST_MOVES) return;
      // A bank with a hole is only worth keeping when there is no spare to fill it.
      if (spares.length > 0 && holed && !(q < 0 && from.bank[p] === null)) return;
      const list = levels.get(after) ?? [];
      const [charging, spread] = gapAfter(p, inP, q, inQ);
      const made = (): Candidate => ({
        bank: q < 0 ? from.bank.with(p, inP) : from.bank.with(p, inP).with(q, inQ),
        charging,
        spread,
      });
      if (charging < (bestGap.get(after)?.charging ?? Number.POSITIVE_INFINITY)) bestGap.set(after, made());
      const beam = after === 1 ? Number.POSITIVE_INFINITY : after <= WIDE_MOVES ? BEAM : NARROW;
      const full = list.length >= beam;
      if (full && spread >= list[list.length - 1]!.spread) return;
      list.push(made());
      list.sort((a, b) => a.spread - b.spread);
      levels.set(after, list.slice(0, beam));
    });
  };
  for (let moves = 0; moves < MOST_MOVES; moves++) {
    const here = levels.get(moves) ?? [];
    if (moves > 0 && (bestGap.get(moves)?.charging ?? Number.POSITIVE_INFINITY) <= task.goal) break;
    for (const from of here) offerFrom(from, moves);
  }
  return bestGap;
}
