// A value against its limit: exact fits, slack, unknowns, and the verdict beyond the limit.
import { describe, expect, test } from "vitest";
import { withinLeast, withinMost } from "../../src/quantity/judge.ts";

const draft = { id: "x", state: "charging", unit: "V", source: "joulewright-design", note: "why" } as const;

describe("withinMost(claim)", () => {
  test.each([
    [400, 405, "pass", 5 / 405],
    [405, 405, "pass", 0],
    [405 * (1 + 5e-10), 405, "pass", null],
    [405 * (1 + 2e-9), 405, "fail", null],
    [500, 405, "fail", -95 / 405],
    [0, 0, "pass", null],
  ])("%d of %d: %s", (value, limit, verdict, margin) => {
    const made = withinMost({ ...draft, value, limit });
    expect(made.verdict).toBe(verdict);
    if (margin !== null) expect(made.margin).toBeCloseTo(margin, 12);
  });
  test("either unknown: not assessed, no margin", () => {
    expect(withinMost({ ...draft, value: null, limit: 5 })).toMatchObject({ verdict: "not assessed", margin: null });
    expect(withinMost({ ...draft, value: 5, limit: null })).toMatchObject({ verdict: "not assessed", margin: null });
  });
  test("what is only a warning warns", () =>
    expect(withinMost({ ...draft, value: 6, limit: 5, exceeded: "warn" }).verdict).toBe("warn"));
});

describe("a limit of zero", () => {
  test("has no fraction left of it: the verdict stands, the margin is unknown", () => {
    expect(withinMost({ ...draft, value: 5, limit: 0 })).toMatchObject({ verdict: "fail", margin: null });
    expect(withinLeast({ ...draft, value: 5, limit: 0 })).toMatchObject({ verdict: "pass", margin: null });
  });
});

describe("withinLeast(claim)", () => {
  test.each([
    [5000, 5000, "pass"],
    [5000 * (1 - 5e-10), 5000, "pass"],
    [4999, 5000, "fail"],
    [6000, 5000, "pass"],
    [0, 0, "pass"],
  ])("%d for %d: %s", (value, limit, verdict) => expect(withinLeast({ ...draft, value, limit }).verdict).toBe(verdict));
  test("margin is what is left above the limit, as a fraction of it", () => {
    expect(withinLeast({ ...draft, value: 6000, limit: 5000 }).margin).toBeCloseTo(0.2, 12);
    expect(withinLeast({ ...draft, value: 4000, limit: 5000 }).margin).toBeCloseTo(-0.2, 12);
  });
  test("either unknown: not assessed, no margin", () => {
    expect(withinLeast({ ...draft, value: null, limit: 5 })).toMatchObject({ verdict: "not assessed", margin: null });
    expect(withinLeast({ ...draft, value: 5, limit: null })).toMatchObject({ verdict: "not assessed", margin: null });
  });
  test("what is only a warning warns", () =>
    expect(withinLeast({ ...draft, value: 4, limit: 5, exceeded: "warn" }).verdict).toBe("warn"));
});
