// The pieces: after the frame, one a turn, never twice for the same brief and bank, none after the end.
import { afterEach, expect, test, vi } from "vitest";
import { wantedPiece } from "../../src/tui/detail.ts";
import { makeDetailer } from "../../src/tui/detailer.ts";
import { answerFor } from "../../src/tui/engine.ts";
import type { EnginePort } from "../../src/tui/ports.ts";
import type { State } from "../../src/tui/state.ts";
import { update } from "../../src/tui/update/update.ts";
import { engine, stateWith } from "../support/stock.ts";
import { NO_THREAD } from "../support/threads.ts";

afterEach(() => void vi.useRealTimers());

const BANK = { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" } as const;
const planned = (changes: Partial<State> = {}): State => {
  const state = stateWith({ chosen: BANK, screen: "sharing", ...changes });
  return { ...state, answer: answerFor(state, engine, true) };
};

function rig(begun: State) {
  vi.useFakeTimers();
  const worked: string[] = [];
  const told =
    <K extends "rest" | "margin" | "spread" | "shot">(name: K): EnginePort[K] =>
    (brief, layout) => {
      worked.push(name);
      return engine[name](brief, layout) as never;
    };
  const counted = { ...engine, rest: told("rest"), margin: told("margin"), spread: told("spread"), shot: told("shot") };
  const at = { state: begun };
  const detailer = makeDetailer({
    engine: () => counted,
    longWork: NO_THREAD,
    state: () => at.state,
    send: (message) => {
      at.state = update(at.state, message).state;
    },
  });
  const frame = (): void => {
    detailer.beforeFrame();
    detailer.afterFrame();
  };
  return { at, worked, detailer, frame };
}

test("makeDetailer(options): nothing before the frame; then one piece a turn until all are there", () => {
  const { at, worked, frame, detailer } = rig(planned());
  detailer.beforeFrame();
  expect(worked).toEqual([]);
  frame();
  expect(worked).toEqual([]);
  vi.runAllTimers();
  expect(worked).toEqual(["rest"]);
  frame();
  vi.runAllTimers();
  expect(worked).toEqual(["rest", "margin"]);
  frame();
  expect(vi.getTimerCount()).toBe(0);
  expect(wantedPiece(at.state)).toBeNull();
});

test("back at a bank seen before, its pieces are there in the same frame, and are not worked out again", () => {
  const { at, worked, frame } = rig(planned());
  for (let turn = 0; turn < 3; turn += 1) {
    frame();
    vi.runAllTimers();
  }
  const first = at.state;
  at.state = planned({ chosen: { ...BANK, parallel: 5 }, details: first.details });
  for (let turn = 0; turn < 3; turn += 1) {
    frame();
    vi.runAllTimers();
  }
  expect(worked).toEqual(["rest", "margin", "rest", "margin"]);
  at.state = { ...first, details: at.state.details };
  frame();
  expect(at.state.details).toBe(first.details);
  expect(worked).toHaveLength(4);
});

test("two frames before the turn ask once; a screen left in the meantime asks nothing; after the end neither", () => {
  const { at, worked, frame, detailer } = rig(planned());
  frame();
  frame();
  expect(vi.getTimerCount()).toBe(1);
  at.state = { ...at.state, screen: "brief" };
  vi.runAllTimers();
  expect(worked).toEqual([]);
  at.state = { ...at.state, screen: "sharing" };
  frame();
  detailer.stop();
  vi.runAllTimers();
  expect(worked).toEqual([]);
});
