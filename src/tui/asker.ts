// Decides when the engine is asked: at once where it is quick, after the frame where it is not, and in full when the keys rest.
import { answerFor } from "./engine.ts";
import type { EnginePort } from "./ports.ts";
import type { Message, State } from "./state.ts";

/** An answer within this is awaited before the frame is drawn, so that the list follows in the same frame. */
const WITHIN_A_FRAME_MS = 16;
/** How long the keys must rest before the long search for least changes begins. */
const REST_MS = 150;
/** Plans slower than this make that search take minutes; it is left to the command. */
const TOO_SLOW_MS = 60;

export interface Asker {
  /** Something changed that the engine must be asked about. */
  readonly ask: () => void;
  /** Called before a frame is drawn. */
  readonly beforeFrame: () => void;
  readonly stop: () => void;
}

export interface AskerOptions {
  /** Null while the catalogues are read: what is asked then is asked again by the state once they are. */
  readonly engine: () => EnginePort | null;
  readonly state: () => State;
  readonly send: (message: Message) => void;
  /** Milliseconds from any beginning. */
  readonly now: () => number;
}

export function makeAsker({ engine, state, send, now }: AskerOptions): Asker {
  let wanted = false;
  let lastTook = Number.POSITIVE_INFINITY;
  let soon: ReturnType<typeof setImmediate> | undefined;
  let rest: ReturnType<typeof setTimeout> | undefined;

  const answer = (quick: boolean): void => {
    const at = engine();
    wanted = false;
    if (at === null) return;
    const asked = state().asked;
    const begun = now();
    const found = answerFor(state(), at, quick);
    if (quick) lastTook = now() - begun;
    const slow = lastTook > TOO_SLOW_MS;
    send({ type: "answered", asked, answer: found, slow });
    if (found.kind !== "planned" || found.changesSought || slow) return;
    rest = setTimeout(() => {
      if (state().asked === asked) answer(false);
    }, REST_MS);
  };
  const later = (): void => {
    clearImmediate(soon);
    soon = setImmediate(() => {
      if (wanted) answer(true);
    });
  };

  return {
    ask: () => {
      wanted = true;
      clearTimeout(rest);
    },
    beforeFrame: () => {
      if (!wanted) return;
      if (lastTook <= WITHIN_A_FRAME_MS) answer(true);
      else later();
    },
    stop: () => {
      wanted = false;
      clearImmediate(soon);
      clearTimeout(rest);
    },
  };
}
