/*
 * A unit has to come out: the fewest units to solder anew that bring the gap back.
 *
 *   moves  positions whose unit changes: a spare put in counts 1, two fitted units exchanged count 2
 *   goal   the charging gap that counts as brought back: what it was, or 0.3 of the floor, whichever is greater
 *
 * One move: each spare into the hole, all tried. More moves go on from the best placings of fewer moves (a beam), exchanging with the
 * lowest and highest group or with the hole: exact for one and two moves, the best found beyond. With no spare the hole stays, and
 * exchanges make up for what they can.
 */
import { gapOfGroups } from "./bankGaps.ts";
import { gapFloor } from "./floor.ts";
import { stageGap, stringGap } from "./gap.ts";
import type { Placing } from "./placing.ts";
import { DEFAULTS, type PlaceRequest } from "./request.ts";
import { lotUncertainty, type MeasuredUnit } from "./unit.ts";

export interface Mend {
  readonly moves: number;
  readonly charging: number;
  /** Group by group as it would stand. */
  readonly groups: readonly (readonly string[])[];
  /** What to do, in order: position (group, place in it, from 0), unit out and unit in (null: none). */
  readonly steps: readonly {
    readonly group: number;
    readonly at: number;
    readonly out: string | null;
    readonly in: string | null;
  }[];
}

export interface Mending {
  /** The best found for each number of moves, each better than those of fewer moves. */
  readonly rows: readonly Mend[];
  /** The first row that brings the gap back, or null. */
  readonly enough: Mend | null;
  readonly goal: number;
}

const MOST_MOVES = 20;
/** Placings kept for each number of moves; fewer once there are many moves. */
const BEAM = 12;
const NARROW = 3;
const WIDE_MOVES = 4;
const FLOOR_PART = 0.3;

/** Sum of squared deviations from the mean. */
function spreadOf(sums: readonly number[]): number {
  const mean = sums.reduce((total, s) => total + s, 0) / sums.length;
  return sums.reduce((total, s) => total + (s - mean) ** 2, 0);
}

/** Serial in each position; null is the hole. */
type Bank = readonly (string | null)[];

interface Candidate {
  readonly bank: Bank;
  readonly charging: number;
  /** What the beam keeps by: the spread of all groups, since the gap only sees the worst. */
  readonly spread: number;
}

/** How to mend `placing` after `out` is taken out of it. `units` holds every serial of the placing. */
export function mend(units: readonly MeasuredUnit[], request: PlaceRequest, placing: Placing, out: string): Mending {
  const bySerial = new Map(units.map((unit) => [unit.serial, unit]));
  const size = placing.groups[0]!.length;
  const before: Bank = placing.groups.flat();
  const pinned = new Set((request.pins ?? []).map((pin) => pin.serial));
  const count = placing.groups.length;
  const capacitance = (serial: string | null): number => (serial === null ? 0 : bySerial.get(serial)!.capacitance);
  const valuesOf = (bank: Bank, g: number): number[] =>
    bank.slice(g * size, (g + 1) * size).flatMap((s) => (s === null ? [] : [capacitance(s)]));
  const gapOf = (bank: Bank): number =>
    gapOfGroups(
      request.ties,
      Array.from({ length: count }, (_, g) => valuesOf(bank, g)),
    );
  const mayShare = (a: string | null, b: string | null): boolean => {
    if (a === null || b === null) return true;
    const [x, y] = [bySerial.get(a)!, bySerial.get(b)!];
    return (x.group ?? "") === (y.group ?? "") && (request.lots === undefined || x.lot === y.lot);
  };
  const uncertainty = request.uncertainty ?? lotUncertainty(units) ?? DEFAULTS.uncertainty;
  const floor = gapFloor({ series: request.series, parallel: request.parallel, ties: request.ties, uncertainty });
  const goal = Math.max(placing.charging.gap, FLOOR_PART * floor);
  const hole = before.indexOf(out);
  const bare = before.with(hole, null);
  const changed = (bank: Bank): number => bank.filter((serial, p) => serial !== before[p] && serial !== null).length;
  const outUnit = out;

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
    const free = placing.spares.filter((serial) => !fitted.has(serial));
    const groups = telling(bank);
    for (let p = 0; p < bank.length; p++) {
      if (bank[p] !== null && pinned.has(bank[p]!)) continue;
      const stands = bank[p] ?? outUnit;
      for (const serial of free) if (mayShare(stands, serial)) offer(p, serial, -1, null);
      if (p !== hole && !groups.has(Math.floor(p / size))) continue;
      for (let q = 0; q < bank.length; q++) {
        if (Math.floor(p / size) === Math.floor(q / size)) continue;
        if (bank[q] !== null && pinned.has(bank[q]!)) continue;
        if (mayShare(stands, bank[q] ?? outUnit)) offer(p, bank[q]!, q, bank[p]!);
      }
    }
  };

  const first: Candidate = { bank: bare, charging: gapOf(bare), spread: Number.POSITIVE_INFINITY };
  const levels = new Map<number, Candidate[]>([[0, [first]]]);
  const bestGap = new Map<number, Candidate>([[0, first]]);
  const offerFrom = (from: Candidate, moves: number): void => {
    const groupValues = Array.from({ length: count }, (_, g) => valuesOf(from.bank, g));
    const sums = groupValues.map((values) => values.reduce((sum, c) => sum + c, 0));
    const stringGaps = request.ties === "strings" ? groupValues.map(stringGap) : [];
    const differs = (p: number, serial: string | null): number => (serial !== before[p] && serial !== null ? 1 : 0);
    const here = changed(from.bank);
    const holed = from.bank.includes(null);
    const gapAfter = (p: number, inP: string | null, q: number, inQ: string | null): readonly [number, number] => {
      const [g, h] = [Math.floor(p / size), q < 0 ? -1 : Math.floor(q / size)];
      if (request.ties === "strings") {
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
      if (placing.spares.length > 0 && holed && !(q < 0 && from.bank[p] === null)) return;
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
    if (moves > 0 && (bestGap.get(moves)?.charging ?? Number.POSITIVE_INFINITY) <= goal) break;
    for (const from of here) offerFrom(from, moves);
  }
  const rows: Mend[] = [];
  for (let moves = placing.spares.length > 0 ? 1 : 0; moves <= MOST_MOVES; moves++) {
    const best = bestGap.get(moves);
    if (!best || best.charging >= (rows[rows.length - 1]?.charging ?? Number.POSITIVE_INFINITY)) continue;
    rows.push(rowOf(best, { before, size, moves, groups: placing.groups.length }));
  }
  return { rows, enough: rows.find((row) => row.charging <= goal) ?? null, goal };
}

function rowOf(
  { bank, charging }: Candidate,
  { before, size, moves, groups }: { before: Bank; size: number; moves: number; groups: number },
): Mend {
  return {
    moves,
    charging,
    groups: Array.from({ length: groups }, (_, g) =>
      bank.slice(g * size, (g + 1) * size).flatMap((serial) => (serial === null ? [] : [serial])),
    ),
    steps: bank.flatMap((serial, p) =>
      serial === before[p] ? [] : [{ group: Math.floor(p / size), at: p % size, out: before[p] ?? null, in: serial }],
    ),
  };
}
