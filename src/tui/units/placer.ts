// Runs a placing in slices between the keys: tells how it stands, and stops with the best so far when asked.
import type { Placing, SearchStep } from "../../place/index.ts";
import type { Read } from "../../quantity/index.ts";
import type { Running } from "./state.ts";

/** A slice ends after this; keys wait no longer than it and one step. */
const SLICE_MS = 12;
/** How often the screen is told. */
const TELL_MS = 60;

export interface Search {
  readonly steps: Generator<SearchStep<string>, Read<Placing>>;
  /** Elementary trials that it may spend. */
  readonly moves: number;
}

export interface PlacerOptions {
  /** Milliseconds from any beginning. */
  readonly now: () => number;
  readonly progress: (running: Running) => void;
  readonly done: (read: Read<Placing>, stopped: boolean) => void;
}

export interface Placer {
  /** Begins anew; a search under way is dropped. `goOn` is for the search to ask. */
  readonly begin: (search: (goOn: () => boolean) => Search) => void;
  /** Ends it with the best so far. */
  readonly stop: () => void;
  /** Drops it, and tells nothing more. */
  readonly drop: () => void;
}

export function makePlacer({ now, progress, done }: PlacerOptions): Placer {
  let timer: ReturnType<typeof setTimeout> | undefined;
  let wanted = true;
  const drop = (): void => {
    clearTimeout(timer);
    timer = undefined;
  };
  const run = ({ steps, moves }: Search): void => {
    let told = Number.NEGATIVE_INFINITY;
    const slice = (): void => {
      const until = now() + SLICE_MS;
      for (;;) {
        const step = steps.next();
        if (step.done) {
          timer = undefined;
          done(step.value, !wanted);
          return;
        }
        const { phase, gap, moves: spent, standing } = step.value;
        if (now() - told >= TELL_MS) {
          told = now();
          progress({ phase, gap, part: Math.min(1, spent / moves), groups: standing() });
        }
        if (now() >= until) break;
      }
      // A timer, not an immediate: bytes that wait on the keyboard are read before it.
      timer = setTimeout(slice, 0);
    };
    timer = setTimeout(slice, 0);
  };
  return {
    begin: (search) => {
      drop();
      wanted = true;
      run(search(() => wanted));
    },
    stop: () => {
      wanted = false;
    },
    drop,
  };
}
