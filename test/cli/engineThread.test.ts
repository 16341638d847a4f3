// The second engine in a thread of its own: an answer, an end when its time is up, and none where the worker fails.
import { rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { afterAll, beforeAll, expect, test } from "vitest";
import { engineApart } from "../../src/cli/engineThread.ts";
import { allPairs, optionForm } from "../../src/search/blend/blendPrograms.ts";
import { findBlend } from "../../src/search/blend/findBlend.ts";
import { plainModel } from "../support/blendModels.ts";
import { bundle } from "../support/bundle.ts";

let folder = "";
beforeAll(async () => {
  folder = await bundle({ worker: "src/worker.ts" });
}, 60_000);
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const model = plainModel(10, [
  { capacity: 3, most: 4, price: 10 },
  { capacity: 4, most: 4, price: 13 },
]);
const { program } = optionForm(model, allPairs(model));

test("engineApart(entry): the engine's claim, checked in the worker, comes back", async () => {
  const answer = await engineApart(pathToFileURL(join(folder, "dist/worker.js")))(program, 20_000);
  expect(answer).toMatchObject({ status: "claimed", cost: findBlend(model).best!.cost });
}, 30_000);

test("engineApart(entry): a worker that never answers is ended in time; one that fails has no answer", async () => {
  const silent = join(folder, "silent.mjs");
  writeFileSync(
    silent,
    "import { parentPort } from 'node:worker_threads'; parentPort.on('message', () => { for (;;); });",
  );
  const start = performance.now();
  expect(await engineApart(pathToFileURL(silent))(program, 300)).toEqual({ status: "unknown", why: "time" });
  expect(performance.now() - start).toBeLessThan(5000);
  const broken = join(folder, "broken.mjs");
  writeFileSync(broken, "throw new Error('no');");
  expect(await engineApart(pathToFileURL(broken))(program, 20_000)).toMatchObject({ status: "unknown" });
  expect(await engineApart(pathToFileURL(join(folder, "none.mjs")))(program, 20_000)).toMatchObject({
    status: "unknown",
  });
}, 30_000);
