// verdict: what may pass, what may fail, and what proves nothing.
import { describe, expect, test } from "vitest";
import { atLeast, atMost, type Bound, remark } from "../../src/pulse/verdict.ts";

const claim = { id: "x", unit: "A", source: "methods-derived", note: "n" };
const verdict = (value: number | null, limit: number | null, bound: Bound = "value") =>
  atMost({ ...claim, value, limit, bound }).verdict;

describe("atMost(claim)", () => {
  test("an unknown value or limit is not assessed, and has no margin", () => {
    expect(verdict(null, 1)).toBe("not assessed");
    expect(verdict(1, null)).toBe("not assessed");
    expect(atMost({ ...claim, value: 1, limit: null }).margin).toBeNull();
  });

  test("an exact fit fits, also a rounding above", () => {
    expect(verdict(1, 1)).toBe("pass");
    expect(verdict(1 + 1e-12, 1)).toBe("pass");
    expect(verdict(1 + 1e-8, 1)).toBe("fail");
  });

  test("a bound proves one side only", () => {
    expect([verdict(1, 2, "upper bound"), verdict(3, 2, "upper bound")]).toEqual(["pass", "not assessed"]);
    expect([verdict(1, 2, "lower bound"), verdict(3, 2, "lower bound")]).toEqual(["not assessed", "fail"]);
    expect([verdict(1, 2, "side unknown"), verdict(3, 2, "side unknown")]).toEqual(["not assessed", "not assessed"]);
  });

  test("margin is the free part of the limit; a limit of zero has none", () => {
    expect(atMost({ ...claim, value: 1, limit: 4 }).margin).toBe(0.75);
    expect(atMost({ ...claim, value: 0, limit: 0 })).toMatchObject({ verdict: "pass", margin: null });
  });

  test("the note names the bound", () => {
    expect(atMost({ ...claim, value: 1, limit: 2, bound: "upper bound" }).note).toContain("upper bound");
  });
});

describe("atLeast(claim)", () => {
  test("the other way round", () => {
    expect(atLeast({ ...claim, value: 2, limit: 1 })).toMatchObject({ verdict: "pass", margin: 1 });
    expect(atLeast({ ...claim, value: 0.5, limit: 1 }).verdict).toBe("fail");
    expect(atLeast({ ...claim, value: null, limit: 1 }).verdict).toBe("not assessed");
  });
});

describe("remark(id, verdict, source, note)", () => {
  test("has no value and no limit", () => {
    expect(remark("r", "warn", "methods-derived", "n")).toMatchObject({
      value: null,
      limit: null,
      margin: null,
      verdict: "warn",
    });
  });
});
