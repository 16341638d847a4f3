// How much work a search may do: a count of elementary trials, and the caller's own time check.

export interface Effort {
  /** Elementary trials allowed. One trial is one pointer step, one proposed swap or one search node. */
  readonly moves: number;
  /** Trials spent so far. */
  spent: number;
  /** True once the caller's time check said no. */
  late: boolean;
  readonly within: (() => boolean) | undefined;
  asked: number;
}

/** The time check is asked about once in so many trials: some tens of microseconds. */
const BETWEEN_CHECKS = 10_000;

export const effort = (moves: number, within?: () => boolean): Effort => ({
  moves,
  spent: 0,
  late: false,
  within,
  asked: 0,
});

/** Counts `trials` and says whether work may go on. */
export function mayGoOn(work: Effort, trials: number): boolean {
  work.spent += trials;
  if (work.late || work.spent >= work.moves) return false;
  if (work.within && work.spent >= work.asked) {
    work.asked = work.spent + BETWEEN_CHECKS;
    work.late = !work.within();
  }
  return !work.late;
}

/** An effort that may spend at most `moves` of what is left of another; give it back with `settle`. */
export const share = (work: Effort, moves: number): Effort =>
  effort(Math.min(moves, work.moves - work.spent), work.within);

export function settle(work: Effort, part: Effort): void {
  work.spent += part.spent;
  work.late ||= part.late;
}
