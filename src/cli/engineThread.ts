// Runs the second engine of a blend in a thread of its own and ends it when its time is up.

import type { SolveApart } from "../search/index.ts";
import { startThread } from "./jobs.ts";

type Program = Parameters<SolveApart>[0];
type Answer = Awaited<ReturnType<SolveApart>>;

/** What the worker is asked. */
export interface SolveAsk {
  readonly program: Program;
}

const UNKNOWN: Answer = { status: "unknown", why: "time" };

/** An engine behind the worker at `entry`. A worker that fails or takes too long has no answer that counts. */
export const engineApart =
  (entry: URL): SolveApart =>
  async (program, milliseconds) => {
    const worker = startThread(entry);
    try {
      return await new Promise<Answer>((resolve) => {
        const timer = setTimeout(() => resolve(UNKNOWN), milliseconds);
        const end = (answer: Answer): void => {
          clearTimeout(timer);
          resolve(answer);
        };
        worker.once("message", (answer: Answer) => end(answer));
        worker.once("error", () => end(UNKNOWN));
        worker.once("exit", () => end(UNKNOWN));
        worker.postMessage({ program } satisfies SolveAsk);
      });
    } finally {
      await worker.terminate();
    }
  };
