// A search in a thread of its own: seconds told, stopped with what is in hand, given up, failed; the last test in a real worker.
import { rmSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { afterAll, afterEach, beforeAll, describe, expect, test, vi } from "vitest";
import { DEFAULT_FAMILY } from "../../../src/catalog/index.ts";
import { openThread } from "../../../src/cli/thread.ts";
import { makeBlendRunner } from "../../../src/tui/blend/runner.ts";
import type { BlendMessage } from "../../../src/tui/blend/state.ts";
import type { ThreadPort } from "../../../src/tui/ports.ts";
import { bundle } from "../../support/bundle.ts";
import { briefOf } from "../../support/labParts.ts";
import { parts } from "../../support/stock.ts";
import { type FakeThread, fakeThread } from "../../support/threads.ts";

const find = { what: "find", brief: briefOf({ energy: 2400, voltage: 2200, ripple: 1 }), key: "k" } as const;
const stop = { what: "stop" } as const;

function rig(open: (() => ThreadPort) | null | undefined = undefined, has = true) {
  const threads: FakeThread[] = [];
  const told: BlendMessage[] = [];
  const runner = makeBlendRunner({
    open:
      open === undefined
        ? () => {
            const thread = fakeThread();
            threads.push(thread);
            return thread;
          }
        : open,
    stock: () => (has ? { parts: parts(), families: [DEFAULT_FAMILY] } : null),
    send: (message) => {
      if (message.type === "blend") told.push(message.message);
    },
    now: () => performance.now(),
  });
  return { threads, told, runner };
}

afterEach(() => void vi.useRealTimers());

describe("makeBlendRunner(options)", () => {
  test("begun, each stage, then the answer; the thread is ended", async () => {
    const { threads, told, runner } = rig();
    runner.run(find);
    expect(told).toEqual([{ type: "begun", key: "k" }]);
    threads[0]?.work();
    await vi.waitFor(() => expect(told.at(-1)?.type).toBe("found"), { timeout: 10_000 });
    expect(told.at(-1)).toMatchObject({ answer: { plan: { ok: true, value: { status: "optimal" } } } });
    expect(told.filter(({ type }) => type === "stage")).toHaveLength(4);
    expect(threads[0]?.hasEnded()).toBe(true);
  });

  test("seconds are told while it lasts, and no longer", () => {
    vi.useFakeTimers();
    const { told, runner } = rig();
    runner.run(find);
    vi.advanceTimersByTime(2500);
    expect(told.filter(({ type }) => type === "tick")).toHaveLength(2);
    runner.stop();
    vi.advanceTimersByTime(5000);
    expect(told).toHaveLength(3);
  });

  test("told to stop, it answers with what it has and claims no more", async () => {
    const { threads, told, runner } = rig();
    runner.run(find);
    runner.run(stop);
    threads[0]?.work();
    await vi.waitFor(() => expect(told.at(-1)?.type).toBe("found"), { timeout: 10_000 });
    expect(told.at(-1)).toMatchObject({ answer: { plan: { value: { status: "stopped" } } } });
  });

  test("one that does not stop is ended after a while; told twice, at once", () => {
    vi.useFakeTimers();
    const { threads, told, runner } = rig();
    runner.run(find);
    runner.run(stop);
    vi.advanceTimersByTime(2900);
    expect(threads[0]?.hasEnded()).toBe(false);
    vi.advanceTimersByTime(200);
    expect(threads[0]?.hasEnded()).toBe(true);
    expect(told.at(-1)).toEqual({ type: "ended", key: "k", why: "cancelled" });
    runner.run(find);
    runner.run(stop);
    runner.run(stop);
    expect(threads[1]?.hasEnded()).toBe(true);
    const count = told.length;
    runner.run(stop);
    vi.advanceTimersByTime(9000);
    expect(told).toHaveLength(count);
  });

  test("no thread, no stock, or a thread that fails: said; found anew, the one before is dropped", () => {
    for (const { told, runner } of [rig(null), rig(undefined, false)]) {
      runner.run(find);
      expect(told).toEqual([{ type: "ended", key: "k", why: "failed" }]);
    }
    const { threads, told, runner } = rig();
    runner.run(find);
    runner.run({ ...find, key: "other" });
    expect(threads.map((one) => one.hasEnded())).toEqual([true, false]);
    threads[0]?.fail();
    expect(told.at(-1)).toEqual({ type: "begun", key: "other" });
    threads[1]?.fail();
    expect(told.at(-1)).toEqual({ type: "ended", key: "other", why: "failed" });
  });
});

describe("the worker of the bundle", () => {
  let folder = "";
  beforeAll(async () => {
    folder = await bundle({ main: "src/main.ts", worker: "src/worker.ts" });
  }, 60_000);
  afterAll(() => rmSync(folder, { recursive: true, force: true }));
  const real = (): ThreadPort => openThread(pathToFileURL(join(folder, "dist/worker.js")));

  test("finds the blend, and hears through shared memory that it is to stop", async () => {
    const whole = rig(real);
    whole.runner.run(find);
    await vi.waitFor(() => expect(whole.told.at(-1)?.type).toBe("found"), { timeout: 20_000 });
    expect(whole.told.at(-1)).toMatchObject({ answer: { plan: { value: { status: "optimal" } } } });
    const short = rig(real);
    short.runner.run(find);
    short.runner.run(stop);
    await vi.waitFor(() => expect(short.told.at(-1)?.type).toMatch(/found|ended/), { timeout: 20_000 });
    expect(short.told.at(-1)).toMatchObject({ type: "found", answer: { plan: { value: { status: "stopped" } } } });
  }, 60_000);
});
