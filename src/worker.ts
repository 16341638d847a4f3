// A thread of its own: counts chunks of drawn banks for the commands, or plans and works out pieces for the screens.

import { parentPort } from "node:worker_threads";
import { monteCarloChunk } from "./bank/index.ts";
import type { ChunkAsk } from "./cli/jobs.ts";
import type { ThreadAsk } from "./tui/thread.ts";

/** Loaded at the screens' first word, so that the counting of a command does not wait for it. */
let screens: Promise<(ask: ThreadAsk) => void> | null = null;

parentPort?.on("message", (message: ChunkAsk | ThreadAsk) => {
  if (!("kind" in message)) {
    const { given, seed, chunk, banks } = message;
    parentPort?.postMessage(monteCarloChunk(given, { seed, chunk, banks }));
    return;
  }
  screens ??= import("./tui/thread.ts").then(({ threadServer }) =>
    threadServer(
      (reply) => parentPort?.postMessage(reply),
      () => performance.now(),
    ),
  );
  void screens.then((take) => take(message));
});
