// A general mixed-integer solver as a rival of placing: the least stage sum made as large as it gets, given a hundred times the time.
import { place } from "../../src/place/place.ts";
import { solveWithHighs } from "../../src/search/highs.ts";
import { stagesGap } from "../place/brute.ts";
import { capacitances, KINDS } from "../place/lots.ts";
import { atMost, type BenchRow } from "./row.ts";

type Programme = Parameters<typeof solveWithHighs>[0];

const TIMES = 100;
/** What ours stops at in the race on large lots. */
const PPM = 1e-6;

/** Unit i in stage j is column i * stages + j; the last column is the least stage sum. Values over their mean, so that tolerances fit. */
export function stagesProgramme(values: readonly number[], stages: number): Programme {
  const mean = values.reduce((sum, v) => sum + v, 0) / values.length;
  const size = Math.floor(values.length / stages);
  const least = values.length * stages;
  const column = (i: number, j: number): number => i * stages + j;
  const units = values.map((_, i) => i);
  const all = Array.from({ length: stages }, (_, j) => j);
  return {
    columns: [
      ...units.flatMap(() => all.map(() => ({ cost: 0, most: 1, whole: true }))),
      { cost: -1, most: 2 * size, whole: false },
    ],
    rows: [
      ...units.map((i) => ({ terms: all.map((j) => [column(i, j), 1] as const), least: 0, most: 1 })),
      ...all.map((j) => ({ terms: units.map((i) => [column(i, j), 1] as const), least: size, most: size })),
      ...all.map((j) => ({
        terms: [...units.map((i) => [column(i, j), values[i]! / mean] as const), [least, -1] as const],
        least: 0,
        most: Number.POSITIVE_INFINITY,
      })),
    ],
  };
}

/** The rival's gap after at most `seconds`; null when it found no placing. */
async function rivalGap(values: readonly number[], stages: number, seconds: number): Promise<number | null> {
  const answer = await solveWithHighs(stagesProgramme(values, stages), { seconds, gap: 1e-9 });
  if (answer.status === "infeasible" || answer.values === null) return null;
  const found = answer.values;
  const groups = Array.from({ length: stages }, (_, j) =>
    values.flatMap((_, i) => (found[i * stages + j]! > 0.5 ? [i] : [])),
  );
  return stagesGap(values, groups);
}

const median = (list: readonly number[]): number => [...list].sort((a, b) => a - b)[list.length >> 1] ?? Number.NaN;

/** One lot of each kind for each shape: ours timed, then the rival with a hundred times that. */
export async function benchPlaceRival(seed = 901): Promise<BenchRow[]> {
  const shapes = [
    [4, 4, 16],
    [6, 10, 60],
    [8, 12, 100],
    [10, 40, 420],
  ] as const;
  // Loading the engine is not counted against it, nor warming up against ours.
  await solveWithHighs(stagesProgramme([1, 2, 3, 4], 2), { seconds: 5, gap: 1e-9 });
  const rows: BenchRow[] = [];
  for (const [series, parallel, count] of shapes) {
    const race = { ours: [] as number[], rival: [] as number[], none: 0, beaten: 0 };
    for (const kind of KINDS) {
      const lot = capacitances(kind, count, seed);
      const units = lot.map((capacitance, i) => ({ serial: String(i), capacitance }));
      const request = { series, parallel, ties: "cross-tied", ...(count > 24 ? { stopAt: PPM } : {}) } as const;
      place(units, request);
      const start = performance.now();
      const read = place(units, request);
      const ms = performance.now() - start;
      if (!read.ok) throw new Error(read.refusals[0]!.code);
      const rival = await rivalGap(lot, series, (TIMES * ms) / 1000);
      race.ours.push(read.value.charging.gap);
      if (rival === null) race.none++;
      else race.rival.push(rival);
      if (rival !== null && rival < read.value.charging.gap - 1e-12) race.beaten++;
    }
    const what = `${count} units, mixed-integer solver given ${TIMES} times the time`;
    rows.push({
      what: `${what}: placings better than ours, of ${KINDS.length}`,
      value: race.beaten,
      promise: atMost(0),
    });
    rows.push({ what: `${what}: placings that it found none for`, value: race.none, promise: null });
    const best = race.rival.length === 0 ? Number.NaN : median(race.rival) * 1e6;
    rows.push({ what: `${what}: its gap, median`, value: best, unit: "ppm", promise: null });
    rows.push({ what: `${count} units: our gap, median`, value: median(race.ours) * 1e6, unit: "ppm", promise: null });
  }
  return rows;
}
