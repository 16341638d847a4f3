// Counts drawn banks in worker threads, chunk by chunk; the same counts at any number of workers, and in this thread when none will start.

import { Worker } from "node:worker_threads";
import { CHUNK, type Counts, mergedCounts, monteCarlo, monteCarloChunk, type TailCase } from "../bank/index.ts";

/** A worker; whoever starts it ends it. */
export const startThread = (entry: URL): Worker => new Worker(entry);

export interface CountAsk {
  readonly given: TailCase;
  readonly seed: number;
  readonly banks: number;
  /** Threads, at least 1. */
  readonly workers: number;
  /** The worker's file; null counts in this thread. */
  readonly entry: URL | null;
  readonly onProgress?: (banks: number) => void;
  readonly signal?: AbortSignal;
}

/** What a worker is asked. */
export interface ChunkAsk {
  readonly given: TailCase;
  readonly seed: number;
  readonly chunk: number;
  readonly banks: number;
}

/** All counts; null when it was aborted. Needs at least one bank. */
export async function countBanks(ask: CountAsk): Promise<Counts | null> {
  const { given, seed, banks, entry, workers, onProgress, signal } = ask;
  const chunks = Math.ceil(banks / CHUNK);
  // No banks at all yields counts of nothing, in which every chunk is added.
  let counts = startOf(ask);
  let next = 0;
  const take = (): ChunkAsk | null => {
    if (signal?.aborted || next >= chunks) return null;
    const chunk = next++;
    return { given, seed, chunk, banks: Math.min(CHUNK, banks - chunk * CHUNK) };
  };
  const add = (found: Counts): void => {
    counts = mergedCounts(counts, found);
    onProgress?.(counts.banks);
  };
  const here = async (first: ChunkAsk | null = take()): Promise<void> => {
    for (let asked = first; asked !== null; asked = take()) {
      add(monteCarloChunk(given, asked));
      // Lets a signal of the user in.
      await new Promise<void>((resolve) => setImmediate(resolve));
    }
  };
  const threads = Math.min(workers, chunks);
  if (entry === null) await here();
  else await Promise.all(Array.from({ length: threads }, () => inThread({ entry, take, add, here, signal })));
  return signal?.aborted ? null : counts;
}

function startOf({ given, seed }: CountAsk): Counts {
  const none = monteCarlo(given, { seed, banks: 0 }).next();
  return none.value;
}

interface Counting {
  readonly entry: URL;
  readonly take: () => ChunkAsk | null;
  readonly add: (found: Counts) => void;
  /** Counts in this thread, beginning with a chunk that was already taken. */
  readonly here: (first: ChunkAsk | null) => Promise<void>;
  readonly signal: AbortSignal | undefined;
}

/** One worker, fed until nothing is left. A worker that fails leaves its chunk, and what follows, to this thread. */
async function inThread({ entry, take, add, here, signal }: Counting): Promise<void> {
  let asked = take();
  if (asked === null) return;
  const worker = startThread(entry);
  const failed = await new Promise<boolean>((resolve) => {
    worker.on("message", (found: Counts) => {
      add(found);
      asked = take();
      if (asked === null) resolve(false);
      else worker.postMessage(asked);
    });
    worker.on("error", () => resolve(true));
    worker.on("exit", () => resolve(true));
    signal?.addEventListener("abort", () => resolve(false));
    worker.postMessage(asked);
  });
  await worker.terminate();
  if (failed && !signal?.aborted) await here(asked);
}
