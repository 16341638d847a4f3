// The first event of a text: how much of it was taken, and when more must come first.
import { describe, expect, test } from "vitest";
import { readOne } from "../../src/tui/sequences.ts";

describe("readOne(text)", () => {
  test.each([
    "\x1b",
    "\x1b[",
    "\x1b[1",
    "\x1b[1;5",
    "\x1b[[",
    "\x1bO",
    "\x1b]",
    "\x1b]11;x",
    "\x1b]11;x\x1b",
    "\x1bP",
    "\ud83d",
    "\x1b\ud83d",
  ])("%j waits for more", (text) => {
    expect(readOne(text)).toBeNull();
  });

  test.each([
    ["ab", 1, "a"],
    ["\x1b[Axyz", 3, "up"],
    ["\x1b[3~q", 4, "delete"],
    ["\x1b[1;5C\x1b", 6, "ctrl+right"],
    ["\x1b[[Bz", 4, "f2"],
    ["\x1bOPz", 3, "f1"],
    ["\x1bO!", 2, "alt+O"],
    ["\x1b\x1b[A", 1, "escape"],
    ["\x1b\x03", 1, "escape"],
    ["\x1bqx", 2, "alt+q"],
    ["\x1b😀x", 3, "alt+😀"],
    ["😀x", 2, "😀"],
    ["\x03\x03", 1, "ctrl+c"],
  ])("%j takes %i and is %s", (text, took, key) => {
    const step = readOne(text);
    expect([step?.took, step?.event.kind === "key" && step.event.key]).toEqual([took, key]);
  });

  test.each([
    ["\x1b[12\x03", 4],
    ["\x1b[1\x1b[A", 3],
    ["\x1b[1µ", 3],
    ["\x1b]x\x1b[A", 3],
    ["\x1b]x\rq", 3],
    ["\udc00a", 1],
    ["\u0085a", 1],
  ])("%j gives up after %i characters and reports them", (text, took) => {
    const step = readOne(text);
    expect([step?.took, step?.event.kind, step?.event.text]).toEqual([took, "report", text.slice(0, took)]);
  });
});
