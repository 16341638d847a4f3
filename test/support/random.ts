// Seeded chance for tests, so that a failure can be seen again: the mulberry32 generator, common practice, no source.

export interface Chance {
  /** From 0 up to, not including, 1. */
  readonly next: () => number;
  readonly between: (low: number, high: number) => number;
  readonly whole: (low: number, high: number) => number;
  readonly pick: <T>(among: readonly T[]) => T;
  readonly maybe: (share: number) => boolean;
}

export function chance(seed: number): Chance {
  let state = seed >>> 0;
  const next = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
  const whole = (low: number, high: number): number => low + Math.floor(next() * (high - low + 1));
  return {
    next,
    between: (low, high) => low + next() * (high - low),
    whole,
    pick: <T>(among: readonly T[]): T => among[whole(0, among.length - 1)] as T,
    maybe: (share) => next() < share,
  };
}
