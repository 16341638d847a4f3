// The seeded witness: same bits in any split, cancellable, right on average.
import { describe, expect, test, vi } from "vitest";
import {
  BINS,
  binEdges,
  CHUNK,
  type Counts,
  countedRisk,
  mergedCounts,
  monteCarlo,
  monteCarloChunk,
} from "../../src/bank/monteCarlo.ts";
import { nextWord, streamState } from "../../src/bank/random.ts";
import type { TailCase } from "../../src/bank/tailLaw.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const GIVEN: TailCase = {
  law: { kind: "uniform", low: 0.8, high: 1.2 },
  ties: "cross-tied",
  n: 4,
  p: 3,
  share: 0.28,
};

const last = (runs: Generator<Counts, Counts>): { counts: Counts; steps: number } => {
  let steps = 0;
  for (;;) {
    const next = runs.next();
    if (next.done) return { counts: next.value, steps };
    steps++;
  }
};

describe("monteCarlo(case, { seed, banks })", () => {
  test("no banks: nothing counted", () => {
    expect(last(monteCarlo(GIVEN, { seed: 1, banks: 0 })).counts.banks).toBe(0);
  });

  test("yields after each chunk, the last one short", () => {
    const { counts, steps } = last(monteCarlo(GIVEN, { seed: 1, banks: 2.5 * CHUNK }));
    expect(steps).toBe(3);
    expect(counts.banks).toBe(2.5 * CHUNK);
    expect(counts.bins.reduce((sum, count) => sum + count, 0)).toBe(counts.banks);
  });

  test("the same bits from 1, 2 or 7 workers in any order", () => {
    const chunks = Array.from({ length: 7 }, (_, chunk) => monteCarloChunk(GIVEN, { seed: 9, chunk, banks: CHUNK }));
    const whole = last(monteCarlo(GIVEN, { seed: 9, banks: 7 * CHUNK })).counts;
    const backwards = chunks.toReversed().reduce(mergedCounts);
    const halves = mergedCounts(chunks.slice(3).reduce(mergedCounts), chunks.slice(0, 3).reduce(mergedCounts));
    for (const merged of [backwards, halves]) expect(merged).toEqual(whole);
  });

  test("stops when no longer asked, and the seed matters", () => {
    const runs = monteCarlo(GIVEN, { seed: 1, banks: 1e12 });
    expect(runs.next().done).toBe(false);
    expect(runs.return(mergedCounts as never).done).toBe(true);
    expect(runs.next().done).toBe(true);
    const other = monteCarloChunk(GIVEN, { seed: 2, chunk: 0, banks: CHUNK });
    expect(other.exceed).not.toBe(monteCarloChunk(GIVEN, { seed: 1, chunk: 0, banks: CHUNK }).exceed);
  });
});

describe("monteCarloChunk(case, at)", () => {
  test("each bank is what the stream's own numbers make of it, both ties", () => {
    for (const ties of ["cross-tied", "strings"] as const) {
      const state = streamState(3, 5);
      const draw = (): number => (nextWord(state) >>> 1) * 2 ** -31;
      let over = 0;
      const { first, width } = binEdges(GIVEN);
      const bins = new Float64Array(BINS);
      for (let bank = 0; bank < 2000; bank++) {
        let highest = 0;
        for (let string = 0; string < (ties === "strings" ? 3 : 1); string++) {
          const inverse = Array.from({ length: 4 }, () => {
            let c = 0;
            for (let unit = 0; unit < (ties === "strings" ? 1 : 3); unit++) c += 0.8 + 0.4 * draw();
            return 1 / c;
          });
          highest = Math.max(highest, Math.max(...inverse) / inverse.reduce((sum, x) => sum + x, 0));
        }
        if (highest > 0.28) over++;
        bins[Math.floor((highest - first) / width)]!++;
      }
      const counts = monteCarloChunk({ ...GIVEN, ties }, { seed: 3, chunk: 5, banks: 2000 });
      expect(counts).toMatchObject({ banks: 2000, exceed: over });
      // A share within rounding of an edge may fall to either side of it.
      const moved = bins.reduce((sum, count, i) => sum + Math.abs(count - counts.bins[i]!), 0);
      expect(moved).toBeLessThanOrEqual(2);
      expect(over).toBeGreaterThan(10);
    }
  });

  test("one unit a stage: both ties are the same bank, drawn alike", () => {
    const at = { seed: 3, chunk: 5, banks: 2000 };
    const strings = monteCarloChunk({ ...GIVEN, p: 1, ties: "strings" }, at);
    expect(monteCarloChunk({ ...GIVEN, p: 1 }, at)).toEqual(strings);
  });

  test("units all alike, or one in series: every bank in the first bin, and a share just reached is not exceeded", () => {
    const alike: TailCase = { ...GIVEN, law: { kind: "uniform", low: 1, high: 1 }, share: 0.25 };
    for (const given of [alike, { ...GIVEN, n: 1, share: 1 }]) {
      const counts = monteCarloChunk(given, { seed: 1, chunk: 0, banks: 100 });
      expect([counts.bins[0], counts.exceed]).toEqual([100, 0]);
    }
  });

  test("n = 2, p = 1: the triangle's area within 4 sigma of 1e6 banks", () => {
    const counts = monteCarloChunk({ ...GIVEN, n: 2, p: 1, share: 0.58 }, { seed: 1, chunk: 0, banks: 1e6 });
    const k = 0.58 / 0.42;
    const exact = (1.2 - k * 0.8) ** 2 / (k * 0.4 ** 2);
    const { exceed, error } = countedRisk(counts);
    expect(Math.abs(exceed - exact)).toBeLessThan(4 * error);
  });

  test("bins: the median of the highest share stands where half of the banks are above it", () => {
    const counts = monteCarloChunk(GIVEN, { seed: 1, chunk: 0, banks: 2e5 });
    const { first, width } = binEdges(GIVEN);
    let sum = 0;
    let bin = 0;
    while (sum + counts.bins[bin]! < 1e5) sum += counts.bins[bin++]!;
    expect(bin).toBeLessThan(BINS);
    const median = first + (bin + 0.5) * width;
    const above = monteCarloChunk({ ...GIVEN, share: median }, { seed: 1, chunk: 1, banks: 2e5 });
    expect(above.exceed / 2e5).toBeCloseTo(0.5, 1);
  });
});

describe("binEdges(case)", () => {
  test("from the even share to the worst corner of methods A1, 0.333333 of the volts, in even bins [methods-derived A1]", () => {
    const { first, width } = binEdges(GIVEN);
    expect(first).toBe(0.25);
    expect(first + BINS * width).toBeCloseTo(1 / 3, 12);
  });
});

describe("countedRisk(counts)", () => {
  test("250 of 1000: a quarter, with the binomial's standard error", () =>
    expect(countedRisk({ banks: 1000, exceed: 250, bins: new Float64Array(BINS) })).toEqual({
      exceed: 0.25,
      error: expect.closeTo(Math.sqrt(0.1875 / 1000), 12),
    }));
  test("nothing seen in N banks is not zero risk: 3/N", () => {
    expect(countedRisk({ banks: 1000, exceed: 0, bins: new Float64Array(BINS) })).toEqual({ exceed: 0, error: 0.003 });
  });
});
