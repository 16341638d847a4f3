// The seeded witness of the tail: banks drawn at random and counted, in chunks that add up the same in any order.
import { streamState } from "./random.ts";
import { lawRange, lawSteps, type TailCase } from "./tailLaw.ts";

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
export function monteCarloChunk(
  given: TailCase,
  at: { readonly seed: number; readonly chunk: number; readonly banks: number },
): Counts {
  const { n, share } = given;
  const strings = given.ties === "strings" ? given.p : 1;
  const units = given.ties === "strings" ? 1 : given.p;
  const { first, width } = binEdges(given);
  const perBin = width > 0 ? 1 / width : 0;
  const { bases, slopes } = lawSteps(given.law);
  const scale = bases.length * 2 ** -32;
  const bins = new Float64Array(BINS);
  const start = streamState(at.seed, at.chunk);
  let { a, b, c, counter } = start;
  let exceed = 0;
  for (let bank = 0; bank < at.banks; bank++) {
    let highest = 0;
    for (let string = 0; string < strings; string++) {
      let sum = 0;
      let most = 0;
      for (let stage = 0; stage < n; stage++) {
        let capacitance = 0;
        for (let unit = 0; unit < units; unit++) {
          const t = (((a + b) | 0) + counter) | 0;
          counter = (counter + 1) | 0;
          a = b ^ (b >>> 9);
          b = (c + (c << 3)) | 0;
          c = (((c << 21) | (c >>> 11)) + t) | 0;
          const place = (t >>> 0) * scale;
          const step = place | 0;
          capacitance += bases[step]! + slopes[step]! * (place - step);
        }
        const inverse = 1 / capacitance;
        sum += inverse;
        if (inverse > most) most = inverse;
      }
      if (most > highest * sum) highest = most / sum;
    }
    if (highest > share) exceed++;
    const bin = Math.min(Math.max(((highest - first) * perBin) | 0, 0), BINS - 1);
    bins[bin]!++;
  }
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
