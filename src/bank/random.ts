/*
 * Seeded random numbers: sfc32, one stream for each chunk of work, so that a result is the same bits at any number of workers.
 *
 * State a, b, c, counter: 32-bit words. t = a + b + counter; counter += 1; a = b ^ b >>> 9; b = c + (c << 3); c = (c <<< 21) + t; out t.
 * Source: [PractRand] sfc32, from memory; the words of a state are spread from seed and stream by [SplitMix] finalisers
 */

export interface RandomState {
  a: number;
  b: number;
  c: number;
  counter: number;
}

/** The state at the start of stream `stream` (0 .. 2^32 - 1) of `seed` (any integer to 2^53). */
export function streamState(seed: number, stream: number): RandomState {
  const low = seed | 0;
  const high = Math.floor(seed / 0x100000000) | 0;
  const state: RandomState = {
    a: mixed(low ^ mixed(stream + 0x9e3779b9)),
    b: mixed(high ^ mixed(stream + 0x3c6ef372)),
    c: mixed(low + mixed(high ^ stream)),
    counter: 1,
  };
  for (let i = 0; i < 15; i++) nextWord(state);
  return state;
}

function mixed(word: number): number {
  let x = word | 0;
  x = Math.imul(x ^ (x >>> 16), 0x21f0aaad);
  x = Math.imul(x ^ (x >>> 15), 0x735a2d97);
  return x ^ (x >>> 15);
}

/** Advances the state; an unsigned 32-bit word. Loops that need speed hold a, b, c, counter in locals and repeat these lines. */
export function nextWord(state: RandomState): number {
  const t = (((state.a + state.b) | 0) + state.counter) | 0;
  state.counter = (state.counter + 1) | 0;
  state.a = state.b ^ (state.b >>> 9);
  state.b = (state.c + (state.c << 3)) | 0;
  state.c = (((state.c << 21) | (state.c >>> 11)) + t) | 0;
  return t >>> 0;
}

/** Numbers in [0, 1) in steps of 2^-32. */
export const uniformFrom =
  (state: RandomState): (() => number) =>
  () =>
    nextWord(state) * 2 ** -32;
