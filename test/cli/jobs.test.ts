// Counting in this thread, which is what is left when no worker starts; the built worker is tested with the bundle.
import { pathToFileURL } from "node:url";
import { describe, expect, test } from "vitest";
import { CHUNK, type TailCase } from "../../src/bank/index.ts";
import { monteCarlo } from "../../src/bank/monteCarlo.ts";
import { countBanks } from "../../src/cli/jobs.ts";

const given: TailCase = { law: { kind: "uniform", low: 0.8, high: 1.2 }, ties: "cross-tied", n: 4, p: 2, share: 0.29 };
const ask = { given, seed: 5, workers: 3, entry: null };

describe("countBanks(ask)", () => {
  test("the same counts as the generator in one thread, the last chunk short, progress rising to the end", async () => {
    const told: number[] = [];
    const banks = 3 * CHUNK + 7;
    const counts = await countBanks({ ...ask, banks, onProgress: (done) => told.push(done) });
    let last = monteCarlo(given, { seed: 5, banks }).next();
    const runs = monteCarlo(given, { seed: 5, banks });
    for (let step = runs.next(); !step.done; step = runs.next()) last = step;
    expect(counts).toEqual(last.value);
    expect(counts?.exceed).toBeGreaterThan(0);
    expect(told).toEqual([CHUNK, 2 * CHUNK, 3 * CHUNK, banks]);
  });

  test("aborted: nothing, and it stops soon", async () => {
    const abort = new AbortController();
    let chunks = 0;
    const onProgress = (): void => {
      chunks++;
      if (chunks === 2) abort.abort();
    };
    expect(await countBanks({ ...ask, banks: 1e9, onProgress, signal: abort.signal })).toBeNull();
    expect(chunks).toBe(2);
  });

  test("workers that cannot start leave the work to this thread, with the same counts", async () => {
    const banks = 4 * CHUNK;
    const nowhere = pathToFileURL("/nowhere/worker.js");
    expect(await countBanks({ ...ask, banks, entry: nowhere })).toEqual(await countBanks({ ...ask, banks }));
  });
});
