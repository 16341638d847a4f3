// A thread of its own: counts drawn banks or solves one programme for the commands, or plans and works out pieces for the screens.

import { parentPort } from "node:worker_threads";
import { monteCarloChunk } from "./bank/index.ts";
import type { SolveAsk } from "./cli/engineThread.ts";
import type { ChunkAsk } from "./cli/jobs.ts";
import type { ThreadAsk } from "./tui/thread.ts";

/** Loaded at the screens' first word, so that the counting of a command does not wait for it. */
let screens: Promise<(ask: ThreadAsk) => void> | null = null;

parentPort?.on("message", (message: ChunkAsk | SolveAsk | ThreadAsk) => {
  if ("program" in message) {
    void import("./search/index.ts")
      .then(({ solveWholeHere }) => solveWholeHere(message.program))
      .then((answer) => parentPort?.postMessage(answer));
    return;
  }
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
