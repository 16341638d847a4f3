// Standard input owned: raw mode, bytes cut inside characters, the wait for Escape, and giving it all back.
import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { ESCAPE_WAIT_MS, openInput, PASTE_WAIT_MS } from "../../src/tui/input.ts";
import type { InputEvent } from "../../src/tui/tokens.ts";
import { FakeKeyboard } from "../support/tty.ts";

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

function open() {
  const stdin = new FakeKeyboard();
  const events: InputEvent[] = [];
  let gone = 0;
  const source = openInput({ stdin, onEvent: (event) => events.push(event), onGone: () => (gone += 1) });
  source.start();
  const keys = () => events.map((e) => (e.kind === "key" ? e.key : e.kind));
  return { stdin, source, keys, gone: () => gone };
}

test("start() sets raw mode and lets the stream flow; stop() undoes both and leaves no listener", () => {
  const { stdin, source } = open();
  expect([stdin.raw, stdin.flowing]).toEqual([true, true]);
  source.stop();
  expect([stdin.raw, stdin.flowing]).toEqual([false, false]);
  expect(stdin.eventNames()).toEqual([]);
});

test("a character cut between its bytes is one key", () => {
  const { stdin, keys } = open();
  const bytes = Buffer.from("Ω");
  stdin.emit("data", bytes.subarray(0, 1));
  expect(keys()).toEqual([]);
  stdin.emit("data", bytes.subarray(1));
  expect(keys()).toEqual(["Ω"]);
});

test("a lone Escape is told after the wait, not before", () => {
  const { stdin, keys } = open();
  stdin.type("\x1b");
  vi.advanceTimersByTime(ESCAPE_WAIT_MS - 1);
  expect(keys()).toEqual([]);
  vi.advanceTimersByTime(1);
  expect(keys()).toEqual(["escape"]);
});

test("Escape and its rest up to the wait apart are one arrow key", () => {
  const { stdin, keys } = open();
  stdin.type("\x1b");
  vi.advanceTimersByTime(ESCAPE_WAIT_MS - 1);
  stdin.type("[A");
  vi.advanceTimersByTime(1000);
  expect(keys()).toEqual(["up"]);
});

test("a paste waits longer than Escape does, and is whole when its end is lost", () => {
  const { stdin, keys } = open();
  stdin.type("\x1b[200~2.4");
  vi.advanceTimersByTime(PASTE_WAIT_MS - 1);
  expect(keys()).toEqual([]);
  vi.advanceTimersByTime(1);
  expect(keys()).toEqual(["paste"]);
});

test("after stop() nothing held is told, and a stopped source can start again", () => {
  const { stdin, source, keys } = open();
  stdin.type("\x1b");
  source.stop();
  vi.advanceTimersByTime(5000);
  expect(keys()).toEqual([]);
  source.start();
  stdin.type("[A");
  expect(keys()).toEqual(["[", "A"]);
});

test("stop() within an event drops the rest of its chunk", () => {
  const stdin = new FakeKeyboard();
  const keys: string[] = [];
  const source = openInput({
    stdin,
    onEvent: (event) => {
      if (event.kind === "key") keys.push(event.key);
      if (event.kind === "key" && event.key === "ctrl+c") source.stop();
    },
    onGone: () => {},
  });
  source.start();
  stdin.type("a\x03b");
  expect(keys).toEqual(["a", "ctrl+c"]);
});

test.each(["end", "close", "error"])("the stream's %s says that the terminal is gone", (event) => {
  const { stdin, gone } = open();
  stdin.on("error", () => {});
  stdin.emit(event, new Error("EIO"));
  expect(gone()).toBe(1);
});

test("stop() survives a terminal that is gone", () => {
  const { stdin, source } = open();
  stdin.setRawMode = () => {
    throw new Error("EIO");
  };
  source.stop();
  expect(stdin.flowing).toBe(false);
});
