// Long work in a thread: one at a time, progress on the way, nothing of what was stopped, and this thread when none starts.
import { describe, expect, test } from "vitest";
import { DEFAULT_FAMILY } from "../../src/catalog/index.ts";
import { answerFor, questionOf } from "../../src/tui/engine.ts";
import { makeLongWork, secondsLeft } from "../../src/tui/longWork.ts";
import type { Answer, Message } from "../../src/tui/state.ts";
import { engine, parts, stateWith } from "../support/stock.ts";
import { type FakeThread, fakeThread } from "../support/threads.ts";

const question = questionOf(stateWith({ screen: "layouts" }));

function rig() {
  const threads: FakeThread[] = [];
  const sent: Message[] = [];
  let stock = { parts: parts(), families: [DEFAULT_FAMILY] };
  let clock = 0;
  const work = makeLongWork({
    open: () => {
      const thread = fakeThread();
      threads.push(thread);
      return thread;
    },
    stock: () => stock,
    send: (message) => sent.push(message),
    now: () => {
      clock += 500;
      return clock;
    },
  });
  const answers: (Answer | string)[] = [];
  const plan = () =>
    work.plan(
      question,
      (answer) => answers.push(answer),
      () => answers.push("failed"),
    );
  const restock = () => {
    stock = { ...stock };
  };
  return { work, threads, sent, answers, plan, restock };
}

test("secondsLeft(elapsed, done, total): at the pace so far; unknown before there is one", () => {
  expect([secondsLeft(1000, 25, 100), secondsLeft(1000, 0, 100), secondsLeft(1000, 100, 100)]).toEqual([3, null, 0]);
});

describe("makeLongWork(options)", () => {
  test("the same answer as here, with progress that rises and an end that is said", () => {
    const { threads, sent, answers, plan } = rig();
    plan();
    threads[0]?.work();
    expect(answers).toEqual([answerFor(question, engine, true)]);
    const told = sent.map((message) => (message.type === "work" ? message.work : undefined));
    expect(told[0]).toMatchObject({ words: "planning", done: null });
    expect(told.at(-1)).toBeNull();
    const shares = told.flatMap((one) => (one?.done == null ? [] : [one.done]));
    expect(shares).toEqual([0.25, 0.5, 0.75, 1]);
  });
  test("stopped: the thread is ended, nothing is answered, and the next work gets another one with its own stock", () => {
    const { work, threads, answers, plan } = rig();
    plan();
    work.stop();
    threads[0]?.work();
    expect([answers, threads[0]?.hasEnded()]).toEqual([[], true]);
    plan();
    threads[1]?.work();
    expect(answers).toHaveLength(1);
    expect(threads[1]?.asked.map(({ kind }) => kind)).toEqual(["stock", "plan"]);
  });
  test("a thread is kept while the stock is the same, and stock is sent once", () => {
    const { threads, plan, restock } = rig();
    plan();
    threads[0]?.work();
    plan();
    threads[0]?.work();
    expect(threads[0]?.asked.map(({ kind }) => kind)).toEqual(["stock", "plan", "plan"]);
    restock();
    plan();
    expect([threads.length, threads[0]?.hasEnded()]).toEqual([2, true]);
  });
  test("new work stops the old: only the new is answered", () => {
    const { threads, answers, plan } = rig();
    plan();
    plan();
    for (const thread of threads) thread.work();
    expect(answers).toHaveLength(1);
  });
  test("a thread that fails leaves the work to the caller, and no other is tried", () => {
    const { work, threads, answers, plan } = rig();
    plan();
    threads[0]?.fail();
    expect([answers, work.isThere()]).toEqual([["failed"], false]);
    plan();
    expect(threads).toHaveLength(1);
  });
  test("a piece comes as the engine here works it out", () => {
    const { work, threads } = rig();
    const chosen = { part: "flash-a", series: 8, parallel: 22, ties: "cross-tied" } as const;
    const got: unknown[] = [];
    work.piece(
      { ...question, chosen },
      "margin",
      (value) => got.push(value),
      () => got.push("failed"),
    );
    threads[0]?.work();
    const brief = engine.readBrief(stateWith().values);
    const bank = brief.ok ? engine.check(brief.value, chosen) : null;
    expect(got).toEqual([brief.ok && bank !== null ? engine.margin(brief.value, bank) : "no bank"]);
  });
});
