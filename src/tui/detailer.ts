// Works out the pieces of the screens that look closer, one a turn and after the frame; what was worked out before comes at once.
import { detailKey, detailsOf, wantedPiece, withPiece } from "./detail.ts";
import { questionOf } from "./engine.ts";
import type { LongWork } from "./longWork.ts";
import type { Details, EnginePort, Piece } from "./ports.ts";
import type { Message, State } from "./state.ts";

/** Banks and briefs whose pieces are kept. */
const KEPT = 16;

export interface Detailer {
  /** Called before a frame is drawn: pieces that are known are put into it. */
  readonly beforeFrame: () => void;
  /** Called after a frame is drawn: the next missing piece is worked out once what was typed meanwhile has been taken. */
  readonly afterFrame: () => void;
  /** What the thread was working out was stopped. */
  readonly stopped: () => void;
  readonly stop: () => void;
}

export interface DetailerOptions {
  /** Null while the catalogues are read. */
  readonly engine: () => EnginePort | null;
  readonly state: () => State;
  readonly send: (message: Message) => void;
  readonly longWork: LongWork;
}

export function makeDetailer({ engine, state, send, longWork }: DetailerOptions): Detailer {
  const known = new Map<string, Details>();
  /** What the thread is working out. */
  let asked: string | null = null;
  let next: ReturnType<typeof setTimeout> | undefined;

  const keep = (details: Details): void => {
    // Deleted first, so that the least lately used is the first in the map.
    known.delete(details.key);
    known.set(details.key, details);
    const [oldest] = known.keys();
    if (known.size > KEPT && oldest !== undefined) known.delete(oldest);
  };
  const take = (details: Details | null): void => {
    if (details === null) return;
    keep(details);
    send({ type: "detailed", details });
  };
  const here = (piece: Piece, at: EnginePort): void => take(withPiece(state(), piece, at));
  /** Drawing banks takes long, and on the statistical basis so does each new search of what eats the margin. */
  const isLong = (piece: Piece): boolean =>
    piece === "spread" || (piece === "margin" && state().values.basis === "statistical");
  const inThread = (piece: Piece): void => {
    const key = detailKey(state());
    const name = `${piece}\n${key}`;
    if (key === null || asked === name) return;
    asked = name;
    longWork.piece(
      questionOf(state()),
      piece,
      (value) => {
        asked = null;
        // Worked out for a bank that may not be shown any more: then it is dropped.
        if (detailKey(state()) === key) take({ ...detailsOf(state()), key, [piece]: value });
      },
      () => {
        asked = null;
        const at = engine();
        if (at !== null && detailKey(state()) === key) here(piece, at);
      },
    );
  };
  const work = (): void => {
    next = undefined;
    const piece = wantedPiece(state());
    const at = engine();
    if (piece === null || at === null) return;
    if (isLong(piece) && longWork.isThere()) inThread(piece);
    else here(piece, at);
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
    stopped: () => {
      asked = null;
    },
    stop: () => {
      clearTimeout(next);
      next = undefined;
    },
  };
}
