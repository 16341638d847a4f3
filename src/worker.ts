// A thread of its own that counts chunks of drawn banks: asked by a message, answered by a message, nothing else.

import { parentPort } from "node:worker_threads";
import { monteCarloChunk } from "./bank/index.ts";
import type { ChunkAsk } from "./cli/jobs.ts";

parentPort?.on("message", ({ given, seed, chunk, banks }: ChunkAsk) => {
  parentPort?.postMessage(monteCarloChunk(given, { seed, chunk, banks }));
});
