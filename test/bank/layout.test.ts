// Names and plain forms of arrangements.
import { describe, expect, test } from "vitest";
import { type Layout, layoutId, plainTies, shapeOf, unitCount } from "../../src/bank/layout.ts";

const layout = (series: number, parallel: number, ties: Layout["ties"] = "cross-tied"): Layout => ({
  part: "lab-one",
  series,
  parallel,
  ties,
});

describe("plainTies(layout)", () => {
  test("one in series or one in parallel is called strings, whatever was said", () => {
    expect(plainTies(layout(1, 5)).ties).toBe("strings");
    expect(plainTies(layout(5, 1)).ties).toBe("strings");
    expect(plainTies(layout(1, 1)).ties).toBe("strings");
  });
  test("anything else stays as it is", () => {
    expect(plainTies(layout(2, 2))).toEqual(layout(2, 2));
    expect(plainTies(layout(2, 2, "strings")).ties).toBe("strings");
  });
});

describe("names", () => {
  test("unitCount is the product", () => expect(unitCount(layout(6, 10))).toBe(60));
  test("shapeOf: 6s10p", () => expect(shapeOf(layout(6, 10))).toBe("6s10p"));
  test("layoutId holds part, shape and ties, so that two different layouts never share it", () => {
    expect(layoutId(layout(6, 10))).toBe("lab-one 6s10p cross-tied");
    const ids = [1, 2, 11].flatMap((s) =>
      [1, 2, 11].flatMap((p) => (["cross-tied", "strings"] as const).map((t) => layoutId(layout(s, p, t)))),
    );
    expect(new Set(ids).size).toBe(18);
  });
});
