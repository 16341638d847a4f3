// A thread of its own: counts chunks of drawn banks, or solves one programme; asked by a message, answered by a message, nothing else.

import { parentPort } from "node:worker_threads";
import { monteCarloChunk } from "./bank/index.ts";
import type { SolveAsk } from "./cli/engineThread.ts";
import type { ChunkAsk } from "./cli/jobs.ts";

parentPort?.on("message", async (asked: ChunkAsk | SolveAsk) => {
  if ("program" in asked) {
    const { solveWholeHere } = await import("./search/index.ts");
    parentPort?.postMessage(await solveWholeHere(asked.program));
    return;
  }
  const { given, seed, chunk, banks } = asked;
  parentPort?.postMessage(monteCarloChunk(given, { seed, chunk, banks }));
});
