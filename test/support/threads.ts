// Threads for tests: none at all, and one that is this thread, answering when it is told to.
import type { LongWork } from "../../src/tui/longWork.ts";
import type { ThreadPort } from "../../src/tui/ports.ts";
import { type ThreadAsk, threadServer } from "../../src/tui/thread.ts";

export const NO_THREAD: LongWork = { isThere: () => false, plan: () => {}, piece: () => {}, stop: () => {} };

export interface FakeThread extends ThreadPort {
  /** Does what was asked so far, unless the thread was ended. */
  readonly work: () => void;
  readonly fail: () => void;
  readonly asked: readonly ThreadAsk[];
  readonly hasEnded: () => boolean;
}

export function fakeThread(): FakeThread {
  const asked: ThreadAsk[] = [];
  const waiting: ThreadAsk[] = [];
  let take: (reply: unknown) => void = () => {};
  let failed: () => void = () => {};
  let ended = false;
  let clock = 0;
  // Each look at the clock is a second later, so that all progress is told.
  const server = threadServer(
    (reply) => take(structuredClone(reply)),
    () => {
      clock += 1000;
      return clock;
    },
  );
  return {
    post: (ask) => {
      asked.push(structuredClone(ask) as ThreadAsk);
      waiting.push(structuredClone(ask) as ThreadAsk);
    },
    onReply: (next) => {
      take = next;
    },
    onFail: (next) => {
      failed = next;
    },
    end: () => {
      ended = true;
    },
    work: () => {
      for (let ask = waiting.shift(); ask !== undefined && !ended; ask = waiting.shift()) server(ask);
    },
    fail: () => failed(),
    asked,
    hasEnded: () => ended,
  };
}
