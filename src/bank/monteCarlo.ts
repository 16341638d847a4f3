// The seeded witness of the tail: banks drawn at random and counted, in chunks that add up the same in any order.
import { FIT } from "./energy.ts";
import { type Drawn, drawStrings, drawTied } from "./monteCarloDraw.ts";
import { lawRange, type TailCase } from "./tailLaw.ts";

export const BINS = 512;

export interface Counts {
  readonly banks: number;
  /** Banks in which some unit is above its limit. */
  readonly exceed: number;
  /** Banks by their highest share, in `BINS` even bins from 1/n to the greatest that any bank can have. */
  readonly bins: Float64Array;
}

/** Banks in one chunk: large against its start-up, small against a progress bar. */
export const CHUNK = 16384;

const NONE: Counts = { banks: 0, exceed: 0, bins: new Float64Array(BINS) };

/** Share of the bank's voltage at the lower edge of the bins, and their width. */
export function binEdges(given: TailCase): { readonly first: number; readonly width: number } {
  const { low, high } = lawRange(given.law);
  const first = 1 / given.n;
  const worst = high / (high + (given.n - 1) * low);
  return { first, width: (worst - first) / BINS };
}

/** Counts of chunk `chunk` of `seed`: depends on nothing else, so chunks may run anywhere. */
export function monteCarloChunk(given: TailCase, at: Drawn): Counts {
  const { first, width } = binEdges(given);
  const perBin = width > 0 ? 1 / width : 0;
  const bins = new Float64Array(BINS);
  let exceed = 0;
  // One unit in series, or units all alike, may stand just at the limit: rounding must not count that as above it.
  const limit = given.share * (1 + FIT);
  const count = (highest: number): void => {
    if (highest > limit) exceed++;
    bins[Math.min(Math.max(((highest - first) * perBin) | 0, 0), BINS - 1)]!++;
  };
  // With one unit a stage the two ties are the same bank.
  if (given.ties === "strings" || given.p === 1) drawStrings(given, at, count);
  else drawTied(given, at, count);
  return { banks: at.banks, exceed, bins };
}

/** Sum of two counts; the order never matters, for all are whole numbers. */
export const mergedCounts = (a: Counts, b: Counts): Counts => ({
  banks: a.banks + b.banks,
  exceed: a.exceed + b.exceed,
  bins: a.bins.map((count, i) => count + b.bins[i]!),
});

/** Runs `banks` banks chunk by chunk, yielding the counts so far after each; stop asking to cancel. Returns the last. */
export function* monteCarlo(
  given: TailCase,
  at: { readonly seed: number; readonly banks: number },
): Generator<Counts, Counts> {
  let counts = NONE;
  for (let chunk = 0; counts.banks < at.banks; chunk++) {
    const banks = Math.min(CHUNK, at.banks - counts.banks);
    counts = mergedCounts(counts, monteCarloChunk(given, { seed: at.seed, chunk, banks }));
    yield counts;
  }
  return counts;
}

/** Chance of an excess and its standard error; with nothing seen, the error is that of three in as many (95 %). */
export function countedRisk(counts: Counts): { readonly exceed: number; readonly error: number } {
  const exceed = counts.exceed / counts.banks;
  const error = counts.exceed === 0 ? 3 / counts.banks : Math.sqrt((exceed * (1 - exceed)) / counts.banks);
  return { exceed, error };
}
