import { expect, test } from "vitest";
import { faultLines, inputSentences, inputsJson, withWords } from "../../src/cli/inputNotes.ts";
import type { Stock } from "../../src/cli/stock.ts";
import { briefOf, DEFAULT_FAMILY, FAMILIES } from "../support/bank.ts";

const fault = { code: "not-a-number", place: { file: "a.csv", line: 2 }, read: "x", want: "y" };
const stock = (count: number, families = FAMILIES): Stock => ({
  parts: [],
  families,
  sources: [
    { file: "a.csv", kind: "capacitors", read: 1, faults: Array.from({ length: count }, () => fault), notes: [] },
  ],
});

test("faultLines(stock): a dozen, then a count and where to see the rest", () => {
  expect(faultLines(stock(0))).toEqual([]);
  expect(faultLines(stock(12))).toHaveLength(12);
  expect(faultLines(stock(30)).at(-1)).toBe("a.csv: and 18 more; see them with: joulewright parts a.csv");
});

test("inputSentences(stock): rows lost, and the assumed family by name", () => {
  expect(inputSentences(stock(0))).toEqual([]);
  expect(inputSentences(stock(1))[0]).toMatch(/^1 fault costs/);
  expect(inputSentences(stock(0, [DEFAULT_FAMILY]))[0]).toMatch(/assumed family/);
});

test("inputsJson(settings, stock): files, flags, faults with their words, what is assumed", () => {
  const settings = { brief: briefOf(), given: new Set<string>(), file: "b.json", flags: ["--energy"] };
  expect(inputsJson(settings, stock(1, [DEFAULT_FAMILY]))).toEqual({
    brief: "b.json",
    flags: ["--energy"],
    catalogues: [{ file: "a.csv", kind: "capacitors", read: 1, faults: [withWords(fault)], notes: [] }],
    assumed: ["assumed 2 W leaded"],
  });
  expect(withWords(fault).words).toMatch(/^a.csv:2: /);
});
