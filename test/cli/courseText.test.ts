import { describe, expect, test } from "vitest";
import { courseText } from "../../src/cli/courseText.ts";
import { type BankCourse, bankCourse } from "../../src/search/index.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

const of = (more: Record<string, unknown> = {}): BankCourse => {
  const brief = briefOf(more);
  return bankCourse({ result: bankOf({ brief }), unit: UNIT, brief }) as BankCourse;
};

describe("courseText(course, width)", () => {
  test("a line for each state, the corner, the peak, the reverse; within 80 columns", () => {
    const text = courseText(of({ hold: "30 s", dumpResistance: "100 ohm" }), 80);
    for (const state of ["charge", "hold", "dump", "rest"]) expect(text).toMatch(new RegExp(`^ {2}${state} `, "m"));
    expect(text.replace(/\s+/g, " ")).toMatch(
      /Corner: one stage at -20 %.*Highest: .* on tight stage.*Lowest in this corner: -.*reversed.*Dump through 100 ohm/,
    );
    expect(Math.max(...text.split("\n").map((line) => line.length))).toBeLessThanOrEqual(80);
    expect(text).not.toMatch(/NaN|Infinity|undefined/);
  });

  test("says what was taken for granted: an endless hold, an instant dump", () =>
    expect(courseText(of(), 80).replace(/\s+/g, " ")).toMatch(
      /for ever: it is shown until it has settled.*taken as instant/,
    ));
});
