// A thread that is sent messages and answers them, for work that must not hold up the keys. Small, so that it can be at hand from the start.

import { Worker } from "node:worker_threads";

export interface Thread {
  readonly post: (ask: object) => void;
  readonly onReply: (take: (reply: unknown) => void) => void;
  /** It could not start, or an error ended it. */
  readonly onFail: (failed: () => void) => void;
  /** Ends it at once, whatever it does. */
  readonly end: () => void;
}

/** Starts the worker at `entry`. It keeps no process alive that wants to end. */
export function openThread(entry: URL): Thread {
  const worker = new Worker(entry);
  worker.unref();
  return {
    post: (ask) => worker.postMessage(ask),
    onReply: (take) => void worker.on("message", take),
    onFail: (failed) => void worker.on("error", failed),
    end: () => void worker.terminate(),
  };
}
