// When the engine is asked: within the frame when quick, after it when slow, in full when the keys rest.
import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { makeAsker } from "../../src/tui/asker.ts";
import type { EnginePort } from "../../src/tui/ports.ts";
import type { Message, State } from "../../src/tui/state.ts";
import { engine, stateWith } from "../support/stock.ts";
import { NO_THREAD } from "../support/threads.ts";

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

function open(took: number, values?: State["values"]) {
  let state = stateWith({ asked: 1, ...(values ? { values } : {}) });
  let clock = 0;
  const quick: boolean[] = [];
  const answers: Message[] = [];
  const counted: EnginePort = {
    ...engine,
    plan: (brief, request) => {
      quick.push(request.quick);
      clock += took;
      return engine.plan(brief, request);
    },
  };
  const asker = makeAsker({
    engine: () => counted,
    longWork: NO_THREAD,
    state: () => state,
    send: (message) => answers.push(message),
    now: () => clock,
  });
  const change = () => {
    state = { ...state, asked: state.asked + 1 };
    asker.ask();
  };
  return { asker, quick, answers, change };
}

test("the first question comes after the first frame, later quick ones before theirs", () => {
  const { asker, answers, change } = open(5);
  asker.ask();
  asker.beforeFrame();
  expect(answers).toHaveLength(0);
  vi.advanceTimersByTime(1);
  expect(answers).toHaveLength(1);
  change();
  asker.beforeFrame();
  expect(answers).toHaveLength(2);
});

test("slow answers are always awaited after the frame, and many changes make one question", () => {
  const { asker, answers, quick, change } = open(40);
  asker.ask();
  asker.beforeFrame();
  vi.advanceTimersByTime(1);
  for (let i = 0; i < 5; i += 1) change();
  asker.beforeFrame();
  expect(answers).toHaveLength(1);
  vi.advanceTimersByTime(1);
  expect(answers).toHaveLength(2);
  expect(quick).toEqual([true, true]);
});

test("nothing fits: the whole search follows when the keys rest, not before", () => {
  const { asker, quick } = open(5, { energy: "1 GJ", voltage: "2.2 kV", ripple: "100 %" });
  asker.ask();
  asker.beforeFrame();
  vi.advanceTimersByTime(100);
  expect(quick).toEqual([true]);
  vi.advanceTimersByTime(100);
  expect(quick).toEqual([true, false]);
});

test("a key pressed meanwhile puts the whole search off", () => {
  const { asker, quick, change } = open(5, { energy: "1 GJ", voltage: "2.2 kV", ripple: "100 %" });
  asker.ask();
  asker.beforeFrame();
  vi.advanceTimersByTime(100);
  change();
  vi.advanceTimersByTime(100);
  expect(quick).toEqual([true]);
});

test("a large catalogue is never searched for changes while one types, and says so", () => {
  const { asker, quick, answers } = open(61, { energy: "1 GJ", voltage: "2.2 kV", ripple: "100 %" });
  asker.ask();
  asker.beforeFrame();
  vi.advanceTimersByTime(5000);
  expect(quick).toEqual([true]);
  expect(answers[0]).toMatchObject({ type: "answered", asked: 1, slow: true });
});

test("stop() asks nothing any more", () => {
  const { asker, answers } = open(5);
  asker.ask();
  asker.beforeFrame();
  asker.stop();
  vi.advanceTimersByTime(5000);
  expect(answers).toEqual([]);
});
