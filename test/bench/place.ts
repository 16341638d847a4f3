// Bench of placing: what the speed targets ask, on seeded lots; a runner prints the rows.
import { place } from "../../src/place/place.ts";
import type { PlaceRequest } from "../../src/place/request.ts";
import type { MeasuredUnit } from "../../src/place/unit.ts";
import { KINDS, units } from "../place/lots.ts";
import { atLeast, atMost, type BenchRow } from "./row.ts";

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
  /** Of the processor, all threads of ours: what the call took itself, whatever else the machine did meanwhile. */
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
/** Times of some runs: the median by the clock; the longest by the processor, and by the clock for scale: one neighbour can double it. */
function timeRows(
  what: string,
  runs: readonly Timed[],
  most: { readonly median?: number; readonly longest?: number },
): readonly BenchRow[] {
  const all = runs.map((run) => run.milliseconds);
  const promised = (limit: number | undefined) => (limit === undefined ? null : atMost(limit));
  return [
    { what: `${what}: time, median`, value: part(all, 0.5), unit: "ms", promise: promised(most.median) },
    {
      what: `${what}: time of the processor, longest`,
      value: Math.max(...runs.map((run) => run.busy)),
      unit: "ms",
      promise: promised(most.longest),
    },
    { what: `${what}: time, longest`, value: part(all, 1), unit: "ms", promise: null },
  ];
}

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
  const shareOf = (list: readonly Timed[], good: (run: Timed) => boolean): number =>
    (100 * list.filter(good).length) / list.length;

  const ppm = runs(LARGE, { stopAt: 1e-6, moves: 50e6 });
  const certified = `60-420 units, certified gap of 1 ppm, ${ppm.length} lots`;
  rows.push({
    what: `${certified}: reached`,
    value: shareOf(ppm, (run) => run.certified <= 1.0001e-6),
    unit: "%",
    promise: atLeast(100),
  });
  rows.push(...timeRows(certified, ppm, { median: 5, longest: 50 }));
  rows.push(...timeRows("60-420 units, stop at the floor", runs(LARGE, { stopAtFloor: true }), { median: 1 }));
  const small = runs(SMALL, { moves: 30e6 });
  const proven = `16-24 units, ${small.length} lots`;
  rows.push({
    what: `${proven}: proven optimal within 100 ms of the processor`,
    value: shareOf(small, (run) => run.optimal && run.busy <= 100),
    unit: "%",
    promise: atLeast(99),
  });
  rows.push(...timeRows(proven, small, {}));
  const held = runs(LARGE, { chargingLimit: 5e-4 }, 0.5);
  const holding = "holding share with charging within 500 ppm, 10 or more in parallel";
  const gaps = held.map((run) => 100 * (run.holding ?? Number.NaN));
  rows.push({ what: `${holding}: median`, value: part(gaps, 0.5), unit: "%", promise: null });
  rows.push({ what: `${holding}: worst`, value: Math.max(...gaps), unit: "%", promise: atMost(0.5) });
  rows.push(...timeRows(holding, held, { longest: 100 }));
  return rows;
}
