// Has blends found in a thread of their own, so that a plan meanwhile does not end them; tells the seconds, and stops with the best so far.
import type { Capacitor, ResistorFamily } from "../../catalog/index.ts";
import type { ThreadPort } from "../ports.ts";
import type { Message } from "../state.ts";
import type { ThreadAsk, ThreadReply } from "../thread.ts";
import type { BlendEffect, BlendMessage, Ended } from "./state.ts";

/** A search told to stop answers within this, or it is ended with nothing in hand. */
const GRACE_MS = 3000;
const TICK_MS = 1000;

export interface BlendRunner {
  readonly run: (effect: BlendEffect) => void;
  readonly stop: () => void;
}

export interface BlendRunnerOptions {
  /** Opens a thread; null where none can be had. */
  readonly open: (() => ThreadPort) | null;
  readonly stock: () => { readonly parts: readonly Capacitor[]; readonly families: readonly ResistorFamily[] } | null;
  readonly send: (message: Message) => void;
  readonly now: () => number;
}

interface Search {
  readonly key: string;
  readonly begun: number;
  readonly thread: ThreadPort;
  /** Shared with the thread, which looks at it on the way: not 0 is stop. */
  readonly flag: Int32Array<SharedArrayBuffer>;
  readonly tick: ReturnType<typeof setInterval>;
}

export function makeBlendRunner({ open, stock, send, now }: BlendRunnerOptions): BlendRunner {
  let search: Search | null = null;
  let grace: ReturnType<typeof setTimeout> | undefined;

  const tell = (message: BlendMessage): void => send({ type: "blend", message });
  const drop = (): void => {
    clearTimeout(grace);
    clearInterval(search?.tick);
    search?.thread.end();
    search = null;
  };
  const end = (why: Ended["why"], key: string): void => {
    drop();
    tell({ type: "ended", key, why });
  };
  const secondsSince = (begun: number): number => (now() - begun) / 1000;
  const take = (reply: ThreadReply, begun: number): void => {
    if (reply.kind === "stage") tell({ type: "stage", stage: reply.stage });
    if (reply.kind !== "blended") return;
    drop();
    tell({ type: "found", answer: reply.answer, seconds: secondsSince(begun) });
  };
  const find = ({ brief, key }: Extract<BlendEffect, { readonly what: "find" }>): void => {
    drop();
    const own = stock();
    if (open === null || own === null) {
      end("failed", key);
      return;
    }
    const begun = now();
    const thread = open();
    const flag = new Int32Array(new SharedArrayBuffer(Int32Array.BYTES_PER_ELEMENT));
    const tick = setInterval(() => tell({ type: "tick", seconds: secondsSince(begun) }), TICK_MS);
    search = { key, begun, thread, flag, tick };
    thread.onReply((reply) => {
      if (search?.thread === thread) take(reply as ThreadReply, begun);
    });
    thread.onFail(() => {
      if (search?.thread === thread) end("failed", key);
    });
    tell({ type: "begun", key });
    thread.post({ kind: "stock", ...own } satisfies ThreadAsk);
    thread.post({ kind: "blend", id: 1, brief, stop: flag } satisfies ThreadAsk);
  };
  const stop = (): void => {
    if (search === null) return;
    const { key, flag } = search;
    const cancel = (): void => end("cancelled", key);
    // Told twice: now at once.
    if (Atomics.exchange(flag, 0, 1) !== 0) cancel();
    else grace = setTimeout(cancel, GRACE_MS);
  };
  return { run: (effect) => (effect.what === "find" ? find(effect) : stop()), stop: drop };
}
