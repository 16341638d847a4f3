import { expect, test } from "vitest";
import { attributeOf, BRIEF_FLAGS } from "../../src/cli/briefFlags.ts";
import { BRIEF_KEYS } from "../../src/search/index.ts";

test("every key of the brief has a flag, and every flag a key", () => {
  expect([...new Set(BRIEF_FLAGS.map(({ key }) => key.split(".")[0]))].sort()).toEqual([...BRIEF_KEYS].sort());
  expect(new Set(BRIEF_FLAGS.map(({ flag }) => flag)).size).toBe(BRIEF_FLAGS.length);
});

test("attributeOf(flag) is commander's name for it", () => {
  expect(attributeOf("--touch-safe-rule")).toBe("touchSafeRule");
  expect(attributeOf("--energy")).toBe("energy");
});
