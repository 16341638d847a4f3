// A small seeded source of even numbers in [0, 1): the only chance that placing knows.

/** Next number, 0 <= x < 1. */
export type Random = () => number;

/**
 * 32-bit counter generator with an avalanche step (the mulberry32 construction, in the public domain, from memory).
 * The same seed gives the same sequence on every machine: only 32-bit integer arithmetic is used.
 */
export function seeded(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}
