// A read is a value or its refusals, never both.
import { describe, expect, test } from "vitest";
import { accepted, type Refusal, refused } from "../../src/quantity/refusal.ts";

const one: Refusal = { code: "empty", place: { line: 2 }, read: '""', want: "a number" };

describe("accepted, refused", () => {
  test("accepted(value) holds it, also when it is null or zero", () => {
    expect(accepted(0)).toEqual({ ok: true, value: 0 });
    expect(accepted(null)).toEqual({ ok: true, value: null });
  });
  test("refused(...) holds every refusal in order", () =>
    expect(refused(one, { ...one, code: "other" })).toEqual({ ok: false, refusals: [one, { ...one, code: "other" }] }));
});
