// The two inner loops that draw banks: strings, and cross-tied stages.
import { streamState } from "./random.ts";
import { lawSteps, type TailCase } from "./tailLaw.ts";

export interface Drawn {
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

/** Calls `count` with each bank's highest share of its voltage. */
export function drawStrings({ law, n, p }: TailCase, at: Drawn, count: (highest: number) => void): void {
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

/** Calls `count` with each bank's highest share of its voltage. */
export function drawTied({ law, n, p }: TailCase, at: Drawn, count: (highest: number) => void): void {
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
