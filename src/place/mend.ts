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
import { accepted, type Read, refused } from "../quantity/index.ts";
import { gapFloor } from "./floor.ts";
import { type Bank, type Candidate, MOST_MOVES, mendSearch } from "./mendSearch.ts";
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

const FLOOR_PART = 0.3;

/** How to mend `placing` after `out` is taken out of it. `units` holds every serial of the placing; refused when `out` is not fitted. */
export function mend(
  units: readonly MeasuredUnit[],
  request: PlaceRequest,
  placing: Placing,
  out: string,
): Read<Mending> {
  const bySerial = new Map(units.map((unit) => [unit.serial, unit]));
  const before: Bank = placing.groups.flat();
  const hole = before.indexOf(out);
  if (hole < 0) {
    return refused({
      code: "place.not-fitted",
      place: { field: "serial" },
      read: out,
      want: "the serial of a fitted unit",
    });
  }
  const mayReplace = (stands: string, serial: string): boolean => {
    const [x, y] = [bySerial.get(stands)!, bySerial.get(serial)!];
    return (x.group ?? "") === (y.group ?? "") && (request.lots === undefined || x.lot === y.lot);
  };
  const uncertainty = request.uncertainty ?? lotUncertainty(units) ?? DEFAULTS.uncertainty;
  const floor = gapFloor({ series: request.series, parallel: request.parallel, ties: request.ties, uncertainty });
  const goal = Math.max(placing.charging.gap, FLOOR_PART * floor);
  const shape = { before, size: placing.groups[0]!.length, count: placing.groups.length };
  const found = mendSearch({
    ...shape,
    ties: request.ties,
    hole,
    spares: placing.spares,
    pinned: new Set((request.pins ?? []).map((pin) => pin.serial)),
    capacitance: (serial) => bySerial.get(serial)!.capacitance,
    mayReplace,
    goal,
  });
  const rows: Mend[] = [];
  for (let moves = placing.spares.length > 0 ? 1 : 0; moves <= MOST_MOVES; moves++) {
    const best = found.get(moves);
    if (!best || best.charging >= (rows.at(-1)?.charging ?? Number.POSITIVE_INFINITY)) continue;
    rows.push(rowOf(best, { ...shape, moves }));
  }
  return accepted({ rows, enough: rows.find((row) => row.charging <= goal) ?? null, goal });
}

function rowOf(
  { bank, charging }: Candidate,
  { before, size, moves, count }: { before: Bank; size: number; moves: number; count: number },
): Mend {
  return {
    moves,
    charging,
    groups: Array.from({ length: count }, (_, g) =>
      bank.slice(g * size, (g + 1) * size).flatMap((serial) => (serial === null ? [] : [serial])),
    ),
    steps: bank.flatMap((serial, p) =>
      serial === before[p] ? [] : [{ group: Math.floor(p / size), at: p % size, out: before[p] ?? null, in: serial }],
    ),
  };
}
