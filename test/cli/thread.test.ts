// A real thread from a file: it answers, it can be ended while it is busy, and one that cannot start says so.
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { afterAll, expect, test } from "vitest";
import { openThread } from "../../src/cli/thread.ts";

const folder = mkdtempSync(join(tmpdir(), "thread-"));
afterAll(() => rmSync(folder, { recursive: true }));
const file = join(folder, "echo.mjs");
writeFileSync(
  file,
  `import { parentPort } from "node:worker_threads";
parentPort.on("message", (ask) => { parentPort.postMessage({ got: ask }); if (ask.busy) for (;;); });`,
);

test("openThread(entry): answers, and ends at once in the middle of a busy loop", async () => {
  const thread = openThread(pathToFileURL(file));
  const reply = await new Promise((done) => {
    thread.onReply(done);
    thread.post({ busy: true });
  });
  expect(reply).toEqual({ got: { busy: true } });
  thread.end();
});

test("a thread that cannot start fails in words of its own, not with an exception here", async () => {
  const thread = openThread(pathToFileURL(join(folder, "none.mjs")));
  await new Promise<void>((done) => thread.onFail(done));
  thread.end();
});
