import { describe, expect, test } from "vitest";
import { type Face, faceRows, gapBar, offEven, offWords } from "../../../src/tui/units/face.ts";

const capacitances = new Map([
  ["a", 1],
  ["b", 2],
  ["c", 3],
  ["d", 4.5],
]);
const face = (groups: readonly (readonly string[])[], ties: Face["ties"] = "cross-tied", size = 2): Face => ({
  groups,
  size,
  ties,
  capacitances,
});
const drawn = (one: Face, columns = 40, ascii = true): readonly string[] =>
  faceRows(one, { columns, ascii }).map(({ left }) => left.map(({ text }) => text).join(""));

describe("offEven(face)", () => {
  test("a stage over the mean of the stages, by hand: 5.5 and 5 of 5.25", () => {
    const [one, two] = offEven(
      face([
        ["a", "d"],
        ["b", "c"],
      ]),
    );
    expect(one).toBeCloseTo(0.25 / 5.25, 12);
    expect(two).toBeCloseTo(-0.25 / 5.25, 12);
  });
  test("a string by its worst unit over even: 1 and 3 in series stand at 3/4 of the string, half over", () => {
    expect(offEven(face([["a", "c"]], "strings"))[0]).toBeCloseTo(0.5, 12);
  });
  test("a row with an empty place, or a unit that nobody measured, is not told", () => {
    expect(offEven(face([["a"], ["b", "c"], ["b", "zz"]]))).toEqual([null, 0, null]);
  });
});

test("offWords(off): per cent above 0.1 %, else parts per million, signed", () => {
  expect([0.0123, -0.001, 0.0004567, -0.00000123, 0, null].map(offWords)).toEqual([
    "+1.23 %",
    "-0.10 %",
    "+457 ppm",
    "-1.23 ppm",
    "+0.00 ppm",
    "",
  ]);
});

describe("faceRows(face, room)", () => {
  test("a mark a unit, low to high; an empty place a dot", () => {
    expect(drawn(face([["a", "d"], ["b"]]))).toEqual(["  1 18  +0.00 ppm", "  2 3.           "]);
    expect(drawn(face([["a", "d"]]), 40, false)[0]).toContain("▁█");
  });
  test("never wider than its room; what is left off is counted", () => {
    const wide = face([Array.from({ length: 60 }, () => "a")], "cross-tied", 60);
    for (const columns of [26, 40, 80]) {
      const [row = ""] = drawn(wide, columns);
      expect(row.length).toBeLessThanOrEqual(columns);
      if (columns < 70) expect(row).toMatch(/ and \d+/);
    }
  });
});

test("gapBar(gap, floor, room): decades; the mark of the floor is covered only by what is above it", () => {
  const room = { columns: 16, ascii: true };
  expect(gapBar(1e-2, 1e-4, room)).toBe("############....");
  expect(gapBar(1e-6, 1e-4, room)).toBe("####...|........");
  expect(gapBar(0, 1e-4, room)).toBe(".......|........");
});
