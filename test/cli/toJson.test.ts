import { expect, test } from "vitest";
import { toJson } from "../../src/cli/toJson.ts";

test("toJson(value): an endless hold in words, no other number that JSON lacks", () => {
  const value = { hold: Number.POSITIVE_INFINITY, a: Number.NaN, b: [Number.POSITIVE_INFINITY, 1], c: { hold: 30 } };
  expect(JSON.parse(toJson(value))).toEqual({ hold: "for ever", a: null, b: [null, 1], c: { hold: 30 } });
  expect(toJson({ text: "a\u0007\u202e\u009b\n" })).toContain("a\\u0007\\u202e\\u009b\\n");
  expect(toJson(1)).toBe("1\n");
});
