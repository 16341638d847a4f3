// Bench of placing: what the speed targets ask, on seeded lots; a runner prints the rows.
import { place } from "../../src/place/place.ts";
import type { PlaceRequest } from "../../src/place/request.ts";
import type { MeasuredUnit } from "../../src/place/unit.ts";
import { KINDS, units } from "../place/lots.ts";

export interface BenchRow {
  readonly what: string;
  readonly value: string;
  readonly promise: string;
}

interface Shape {
  readonly series: number;
  readonly parallel: number;
  readonly count: number;
}

const LARGE: readonly Shape[] = [
  { series: 6, parallel: 10, count: 60 },
  { series: 8, parallel: 12, count: 100 },
  { series: 10, parallel: 40, count: 420 },
];
const SMALL: readonly Shape[] = [
  { series: 4, parallel: 4, count: 16 },
  { series: 4, parallel: 4, count: 24 },
  { series: 6, parallel: 4, count: 24 },
  { series: 8, parallel: 3, count: 24 },
];

interface Timed {
  readonly milliseconds: number;
  /** Of the processor: what the call took itself, whatever else the machine did meanwhile. */
  readonly busy: number;
  readonly certified: number;
  readonly optimal: boolean;
  readonly charging: number;
  readonly holding: number | null;
}

function timed(lot: readonly MeasuredUnit[], request: PlaceRequest): Timed {
  const start = performance.now();
  const before = process.cpuUsage();
  const read = place(lot, request);
  const milliseconds = performance.now() - start;
  const { user, system } = process.cpuUsage(before);
  if (!read.ok) throw new Error(read.refusals[0]!.code);
  const { charging, holding } = read.value;
  return {
    milliseconds,
    busy: (user + system) / 1000,
    certified: charging.certified,
    optimal: charging.proof === "optimal",
    charging: charging.gap,
    holding: holding?.gap ?? null,
  };
}

const sorted = (list: readonly number[]): number[] => [...list].sort((a, b) => a - b);
const part = (list: readonly number[], q: number): number => sorted(list)[Math.floor(q * (list.length - 1))]!;
const times = (runs: readonly Timed[]): string => {
  const all = runs.map((run) => run.milliseconds);
  const busy = runs.map((run) => run.busy);
  const most = `${part(all, 1).toFixed(1)} ms (of the processor ${part(busy, 1).toFixed(1)})`;
  return `median ${part(all, 0.5).toFixed(2)}, p95 ${part(all, 0.95).toFixed(1)}, most ${most}`;
};

/** `lots` seeded lots for each shape and kind of spread, from `firstSeed` on. */
export function benchPlace({ lots = 34, firstSeed = 101 } = {}): BenchRow[] {
  const runs = (shapes: readonly Shape[], request: Partial<PlaceRequest>, leakage?: number): Timed[] =>
    shapes.flatMap(({ series, parallel, count }) =>
      KINDS.flatMap((kind) =>
        Array.from({ length: lots }, (_, k) =>
          timed(units(kind, count, firstSeed + k, leakage), { series, parallel, ties: "cross-tied", ...request }),
        ),
      ),
    );
  runs(LARGE.slice(0, 1), { stopAt: 1e-6 });
  const rows: BenchRow[] = [];
  const late = (list: readonly Timed[], most: number): string =>
    `${list.filter((run) => run.milliseconds > most).length} of ${list.length} above ${most} ms, ${list.filter((run) => run.busy > most).length} by the processor's time`;

  const ppm = runs(LARGE, { stopAt: 1e-6, moves: 50e6 });
  rows.push({
    what: "60-420 units, certified gap <= 1 ppm",
    value: `${ppm.filter((run) => run.certified <= 1.0001e-6).length} of ${ppm.length}; ${times(ppm)}; ${late(ppm, 50)}`,
    promise: "every one, within 50 ms, median <= 5 ms",
  });
  const floor = runs(LARGE, { stopAtFloor: true });
  rows.push({ what: "60-420 units, stop at the floor", value: times(floor), promise: "median <= 1 ms" });
  const small = runs(SMALL, { moves: 30e6 });
  rows.push({
    what: "16-24 units, proven optimal",
    value: `${small.filter((run) => run.optimal).length} of ${small.length}, ${small.filter((run) => run.optimal && run.busy <= 100).length} of them within 100 ms of the processor; ${times(small)}; ${late(small, 100)}`,
    promise: ">= 99 % within 100 ms",
  });
  const held = runs(LARGE, { chargingLimit: 5e-4 }, 0.5);
  const worst = Math.max(...held.map((run) => run.holding!));
  rows.push({
    what: "holding share with charging <= 500 ppm, 10 or more in parallel",
    value: `median ${(
      100 *
        part(
          held.map((run) => run.holding!),
          0.5,
        )
    ).toFixed(2)} %, most ${(100 * worst).toFixed(2)} %; ${times(held)}; ${late(held, 100)}`,
    promise: "<= 0.5 % within 100 ms",
  });
  return rows;
}
