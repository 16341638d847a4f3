// The drawing loops against plain ones that share nothing with them but the stream's words.
import { describe, expect, test } from "vitest";
import { drawStrings, drawTied } from "../../src/bank/monteCarloDraw.ts";
import { nextWord, streamState } from "../../src/bank/random.ts";
import { lawSteps, type UnitLaw } from "../../src/bank/tailLaw.ts";

const LAWS: readonly UnitLaw[] = [
  { kind: "uniform", low: 0.8, high: 1.2 },
  { kind: "normal", nominal: 1, tLow: 0.1, tHigh: 0.4 },
  { kind: "lot", values: [1.1, 0.9, 1, 0.95, 1.05] },
];
const AT = { seed: 4, chunk: 2, banks: 500 };

/** A unit from the stream: its place in the law by the upper 31 bits of a word. */
function units(law: UnitLaw): () => number {
  const { bases, slopes } = lawSteps(law);
  const state = streamState(AT.seed, AT.chunk);
  return () => {
    const place = (nextWord(state) >>> 1) * 2 ** -31 * bases.length;
    const step = Math.floor(place);
    return bases[step]! + slopes[step]! * (place - step);
  };
}

const highest = (capacitances: readonly number[]): number => {
  const inverse = capacitances.map((c) => 1 / c);
  return Math.max(...inverse) / inverse.reduce((sum, x) => sum + x, 0);
};

describe("drawStrings(case, at, count), drawTied(case, at, count)", () => {
  for (const law of LAWS)
    test(`${law.kind}: every bank's highest share, 3s4p, both ties`, () => {
      const given = { law, n: 3, p: 4, share: 1 };
      const seen: number[] = [];
      drawStrings({ ...given, ties: "strings" }, AT, (share) => seen.push(share));
      const unit = units(law);
      expect(seen).toHaveLength(500);
      for (const share of seen) {
        const strings = [0, 1, 2, 3].map(() => highest([unit(), unit(), unit()]));
        expect(share).toBeCloseTo(Math.max(...strings), 13);
      }
      const tied: number[] = [];
      drawTied({ ...given, ties: "cross-tied" }, AT, (share) => tied.push(share));
      const next = units(law);
      for (const share of tied) {
        const stages = [0, 1, 2].map(() => next() + next() + next() + next());
        expect(share).toBeCloseTo(highest(stages), 13);
      }
    });
});
