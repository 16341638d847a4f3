// "Did you mean": near words come back, strange ones do not.
import { describe, expect, test } from "vitest";
import { nearestWord } from "../../src/quantity/nearest.ts";

const KNOWN = ["capacitance", "voltage", "tolerance", "price", "esr", "esl"];

describe("nearestWord(word, known)", () => {
  test.each([
    ["capacitanse", "capacitance"],
    ["Voltage", "voltage"],
    ["volage", "voltage"],
    ["votlage", "voltage"],
    ["tolerence", "tolerance"],
    ["pirce", "price"],
    ["kapasitanse", "capacitance"],
    ["er", "esr"],
    ["colour", null],
    ["something else entirely", null],
    ["", null],
  ])("%j: %s", (word, near) => expect(nearestWord(word, KNOWN)).toBe(near));
  test("nothing known, nothing near", () => expect(nearestWord("esr", [])).toBe(null));
  test("a very long word costs no time", () => expect(nearestWord("x".repeat(1e6), KNOWN)).toBe(null));
  test("of two as near the first: a swap of neighbours costs as much as a wrong letter", () => {
    expect(nearestWord("abcd", ["abce", "abdc"])).toBe("abce");
    expect(nearestWord("abcd", ["abdc", "abce"])).toBe("abdc");
  });
  test.each(["ca", "bc"])("half a swap is none: ab is two slips from %s", (other) =>
    expect(nearestWord("ab", [other])).toBe(null),
  );
  // Two letters out of three wrong is no typing slip.
  test("a short word of other letters is not near: xyz is not esr", () => expect(nearestWord("xsz", KNOWN)).toBe(null));
});
