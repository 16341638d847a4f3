// Works out the pieces of the screens that look closer, one a turn and after the frame; what was worked out before comes at once.
import { detailKey, wantedPiece, withPiece } from "./detail.ts";
import type { Details, EnginePort } from "./ports.ts";
import type { Message, State } from "./state.ts";

/** Banks and briefs whose pieces are kept. */
const KEPT = 16;

export interface Detailer {
  /** Called before a frame is drawn: pieces that are known are put into it. */
  readonly beforeFrame: () => void;
  /** Called after a frame is drawn: the next missing piece is worked out once what was typed meanwhile has been taken. */
  readonly afterFrame: () => void;
  readonly stop: () => void;
}

export interface DetailerOptions {
  /** Null while the catalogues are read. */
  readonly engine: () => EnginePort | null;
  readonly state: () => State;
  readonly send: (message: Message) => void;
}

export function makeDetailer({ engine, state, send }: DetailerOptions): Detailer {
  const known = new Map<string, Details>();
  let next: ReturnType<typeof setTimeout> | undefined;

  const keep = (details: Details): void => {
    // Deleted first, so that the least lately used is the first in the map.
    known.delete(details.key);
    known.set(details.key, details);
    const [oldest] = known.keys();
    if (known.size > KEPT && oldest !== undefined) known.delete(oldest);
  };
  const work = (): void => {
    next = undefined;
    const piece = wantedPiece(state());
    const at = engine();
    const details = piece === null || at === null ? null : withPiece(state(), piece, at);
    if (details === null) return;
    keep(details);
    send({ type: "detailed", details });
  };
  return {
    beforeFrame: () => {
      if (wantedPiece(state()) === null) return;
      const key = detailKey(state());
      const before = key === null ? undefined : known.get(key);
      if (before !== undefined && before !== state().details) send({ type: "detailed", details: before });
    },
    afterFrame: () => {
      // A timer, not an immediate: bytes that wait on the keyboard are read before it.
      if (wantedPiece(state()) !== null) next ??= setTimeout(work, 0);
    },
    stop: () => {
      clearTimeout(next);
      next = undefined;
    },
  };
}
