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
  const { first, width } = binEdges(given);
  const perBin = width > 0 ? 1 / width : 0;
  const bins = new Float64Array(BINS);
  let exceed = 0;
  const count = (highest: number): void => {
    if (highest > given.share) exceed++;
    bins[Math.min(Math.max(((highest - first) * perBin) | 0, 0), BINS - 1)]!++;
  };
  // With one unit a stage the two ties are the same bank.
  if (given.ties === "strings" || given.p === 1) drawStrings(given, at, count);
  else drawTied(given, at, count);
  return { banks: at.banks, exceed, bins };
}

interface Drawn {
  readonly seed: number;
  readonly chunk: number;
  readonly banks: number;
}

/*
 * The two loops below hold the generator's words as locals and use the upper 31 bits of each draw: whole numbers that fit the
 * machine's own. Laws rise with the draw, so a string's least capacitance is that of its least draw, found without a branch, for
 * a branch taken one time in three costs more than the rest of the loop.
 */
const UNIT = 2 ** -31;

function drawStrings({ law, n, p }: TailCase, at: Drawn, count: (highest: number) => void): void {
  const { bases, slopes } = lawSteps(law);
  const even = bases.length === 1;
  const base = bases[0]!;
  const slope = slopes[0]! * UNIT;
  const scale = bases.length * UNIT;
  const capacitance = (word: number): number => {
    const step = (word * scale) | 0;
    return bases[step]! + slopes[step]! * (word * scale - step);
  };
  const state = streamState(at.seed, at.chunk);
  let a = state.a | 0;
  let b = state.b | 0;
  let c = state.c | 0;
  let counter = state.counter | 0;
  for (let bank = 0; bank < at.banks; bank++) {
    let lowest = Number.POSITIVE_INFINITY;
    for (let string = 0; string < p; string++) {
      let sum = 0;
      let least = 0x7fffffff;
      for (let stage = 0; stage < n; stage++) {
        const t = (((a + b) | 0) + counter) | 0;
        counter = (counter + 1) | 0;
        a = b ^ (b >>> 9);
        b = (c + (c << 3)) | 0;
        c = (((c << 21) | (c >>> 11)) + t) | 0;
        const word = t >>> 1;
        const less = (word - least) | 0;
        least = (least + (less & (less >> 31))) | 0;
        sum += 1 / (even ? base + slope * word : capacitance(word));
      }
      const inverse = (even ? base + slope * least : capacitance(least)) * sum;
      if (inverse < lowest) lowest = inverse;
    }
    count(1 / lowest);
  }
}

function drawTied({ law, n, p }: TailCase, at: Drawn, count: (highest: number) => void): void {
  const { bases, slopes } = lawSteps(law);
  const even = bases.length === 1;
  const base = p * bases[0]!;
  const slope = slopes[0]! * UNIT;
  const scale = bases.length * UNIT;
  const state = streamState(at.seed, at.chunk);
  let a = state.a | 0;
  let b = state.b | 0;
  let c = state.c | 0;
  let counter = state.counter | 0;
  for (let bank = 0; bank < at.banks; bank++) {
    let sum = 0;
    let least = Number.POSITIVE_INFINITY;
    for (let stage = 0; stage < n; stage++) {
      let words = 0;
      let stepped = 0;
      for (let unit = 0; unit < p; unit++) {
        const t = (((a + b) | 0) + counter) | 0;
        counter = (counter + 1) | 0;
        a = b ^ (b >>> 9);
        b = (c + (c << 3)) | 0;
        c = (((c << 21) | (c >>> 11)) + t) | 0;
        const word = t >>> 1;
        if (even) words += word;
        else {
          const place = word * scale;
          const step = place | 0;
          stepped += bases[step]! + slopes[step]! * (place - step);
        }
      }
      const capacitance = even ? base + slope * words : stepped;
      sum += 1 / capacitance;
      if (capacitance < least) least = capacitance;
    }
    count(1 / (least * sum));
  }
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
