import { expect, test } from "vitest";
import { linesInk } from "../../../src/sheet/draw/lines.ts";

test("linesInk(sentences, top): each from a line of its own, long ones broken, endless ones cut", () => {
  const { ink, bottom } = linesInk(["one", "two ".repeat(100), "x".repeat(5000)], 50);
  const words = ink.words!;
  expect(words[0]!.text).toBe("one");
  expect(words.filter(({ text }) => text.startsWith("two")).length).toBeGreaterThan(1);
  expect(words.filter(({ text }) => text.startsWith("xx"))).toHaveLength(4);
  expect(words.at(-1)!.text.endsWith("…")).toBe(true);
  expect(words[0]!.y).toBeGreaterThan(50);
  expect(bottom).toBeGreaterThan(words.at(-1)!.y);
  expect(linesInk([], 50).ink.words).toEqual([]);
});
