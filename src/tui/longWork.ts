// Work that would hold up the keys, done in a thread: one at a time, its remaining time told, stopped at once when it is not wanted any more.
import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import type { Question } from "./engine.ts";
import type { Details, Piece, ThreadPort } from "./ports.ts";
import type { Answer, Message } from "./state.ts";
import type { ThreadAsk, ThreadReply } from "./thread.ts";

export interface LongWork {
  /** Whether there is a thread to be had. */
  readonly isThere: () => boolean;
  readonly plan: (question: Question, done: (answer: Answer) => void, failed: () => void) => void;
  readonly piece: (question: Question, piece: Piece, done: (value: Details[Piece]) => void, failed: () => void) => void;
  /** Stops what is being done; nothing of it is answered. */
  readonly stop: () => void;
}

export interface LongWorkOptions {
  /** Opens a thread; null where none can be had. */
  readonly open: (() => ThreadPort) | null;
  readonly stock: () => { readonly parts: readonly Capacitor[]; readonly families: readonly ResistorFamily[] } | null;
  readonly send: (message: Message) => void;
  readonly now: () => number;
}

interface Job {
  readonly id: number;
  readonly begun: number;
  readonly words: string;
  readonly take: (reply: ThreadReply) => void;
  readonly failed: () => void;
}

const PIECE_WORDS: Readonly<Record<Piece, string>> = {
  rest: "the states at rest",
  margin: "what eats the margin",
  spread: "drawing banks",
  shot: "the shot",
};

/** Seconds left at the pace so far; null before there is a pace. */
export function secondsLeft(elapsed: number, done: number, total: number): number | null {
  return done > 0 && total > 0 ? ((elapsed / done) * (total - done)) / 1000 : null;
}

export function makeLongWork({ open, stock, send, now }: LongWorkOptions): LongWork {
  let thread: ThreadPort | null = null;
  let threadStock: ReturnType<LongWorkOptions["stock"]> = null;
  let job: Job | null = null;
  let broken = false;
  let last = 0;

  const end = (): void => {
    thread?.end();
    thread = null;
  };
  const finish = (): void => {
    job = null;
    send({ type: "work", work: null });
  };
  const onReply = (reply: ThreadReply): void => {
    // A reply to what was stopped is no answer to what is asked now.
    if (job === null || reply.id !== job.id) return;
    const { begun, words, take } = job;
    if (reply.kind === "progress") {
      const { done, total } = reply;
      send({ type: "work", work: { words, done: done / total, secondsLeft: secondsLeft(now() - begun, done, total) } });
      return;
    }
    finish();
    take(reply);
  };
  const onFail = (): void => {
    broken = true;
    end();
    const failed = job?.failed;
    if (job !== null) finish();
    failed?.();
  };
  const ready = (): ThreadPort | null => {
    const own = stock();
    if (open === null || own === null || broken) return null;
    if (thread !== null && threadStock === own) return thread;
    end();
    threadStock = own;
    const fresh = open();
    thread = fresh;
    fresh.onReply((reply) => {
      if (thread === fresh) onReply(reply as ThreadReply);
    });
    fresh.onFail(() => {
      if (thread === fresh) onFail();
    });
    fresh.post({ kind: "stock", ...own });
    return fresh;
  };
  const stop = (): void => {
    if (job === null) return;
    // A busy thread hears nothing: it is ended, and the next work gets a new one.
    end();
    finish();
  };
  const begin = (words: string, ask: (id: number) => ThreadAsk, take: Job["take"], failed: () => void): void => {
    stop();
    const port = ready();
    if (port === null) {
      failed();
      return;
    }
    last += 1;
    job = { id: last, begun: now(), words, take, failed };
    send({ type: "work", work: { words, done: null, secondsLeft: null } });
    port.post(ask(last));
  };

  return {
    isThere: () => open !== null && !broken && stock() !== null,
    plan: (question, done, failed) =>
      begin(
        "planning",
        (id) => ({ kind: "plan", id, question }),
        (reply) => {
          if (reply.kind === "planned") done(reply.answer);
        },
        failed,
      ),
    piece: (question, piece, done, failed) =>
      begin(
        PIECE_WORDS[piece],
        (id) => ({ kind: "piece", id, question, piece }),
        (reply) => {
          if (reply.kind === "worked") done(reply.value);
        },
        failed,
      ),
    stop: () => {
      stop();
      end();
    },
  };
}
