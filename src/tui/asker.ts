// Decides when and where the engine is asked: at once where it is quick, after the frame where it is not, in a thread where it
// would hold up the keys, and in full when the keys rest.
import { briefInput } from "./briefInput.ts";
import { answerFor, questionOf } from "./engine.ts";
import type { LongWork } from "./longWork.ts";
import type { EnginePort } from "./ports.ts";
import type { Message, State } from "./state.ts";

/** An answer within this is awaited before the frame is drawn, so that the list follows in the same frame. */
const WITHIN_A_FRAME_MS = 16;
/** How long the keys must rest before long work begins: the search for least changes, or anything in a thread. */
const REST_MS = 150;
/** Plans slower than this make the search for least changes take minutes; it is left to the command. */
const TOO_SLOW_MS = 60;
/** Plans slower than this go into the thread. */
const LONG_MS = 120;
/** A plan of so many parts is taken for long before one was seen. */
const MANY_PARTS = 20_000;

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
  readonly longWork: LongWork;
}

const basisOf = ({ values }: State): string => values.basis ?? "";

export function makeAsker({ engine, state, send, now, longWork }: AskerOptions): Asker {
  let wanted = false;
  /** How long the last plan took, by the kind of plan that it was. */
  const took = new Map<string, number>();
  let soon: ReturnType<typeof setImmediate> | undefined;
  let rest: ReturnType<typeof setTimeout> | undefined;

  const lastTook = (): number => took.get(basisOf(state())) ?? Number.POSITIVE_INFINITY;
  /** Before one was seen, chances and very many parts are taken for long. */
  const isLong = (): boolean => {
    const known = took.get(basisOf(state()));
    const guess = basisOf(state()) === "statistical" || state().stock.parts >= MANY_PARTS;
    return longWork.isThere() && (known === undefined ? guess : known > LONG_MS);
  };
  const here = (quick: boolean): void => {
    const at = engine();
    wanted = false;
    if (at === null) return;
    const asked = state().asked;
    const begun = now();
    const found = answerFor(questionOf(state()), at, quick);
    if (quick && found.kind === "planned") took.set(basisOf(state()), now() - begun);
    const slow = lastTook() > TOO_SLOW_MS;
    send({ type: "answered", asked, answer: found, slow });
    if (found.kind !== "planned" || found.changesSought || slow) return;
    rest = setTimeout(() => {
      if (state().asked === asked) here(false);
    }, REST_MS);
  };
  const inThread = (): void => {
    const { asked } = state();
    const basis = basisOf(state());
    const begun = now();
    longWork.plan(
      questionOf(state()),
      (answer) => {
        if (answer.kind === "planned") took.set(basis, now() - begun);
        send({ type: "answered", asked, answer, slow: true });
      },
      () => here(true),
    );
  };
  const later = (): void => {
    clearImmediate(soon);
    soon = setImmediate(() => {
      if (wanted) here(true);
    });
  };

  return {
    ask: () => {
      wanted = true;
      clearTimeout(rest);
      longWork.stop();
    },
    beforeFrame: () => {
      if (!wanted) return;
      // A brief that cannot be read is told at once, whatever its plan would take.
      if (isLong() && engine()?.readBrief(briefInput(state())).ok) {
        wanted = false;
        rest = setTimeout(inThread, REST_MS);
      } else if (lastTook() <= WITHIN_A_FRAME_MS) here(true);
      else later();
    },
    stop: () => {
      wanted = false;
      clearImmediate(soon);
      clearTimeout(rest);
      longWork.stop();
    },
  };
}
