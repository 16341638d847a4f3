import { describe, expect, test } from "vitest";
import { readSheetFlags } from "../../src/cli/sheetFlags.ts";

describe("readSheetFlags(flags)", () => {
  test("A4, the negative end at earth, no rule, no date, no revision unless told", () => {
    expect(readSheetFlags({})).toEqual({
      ok: true,
      value: { paper: "A4", earth: "negative", rule: null, date: null, revision: null },
    });
  });

  test("choices in any case, words as they were given", () => {
    const flags = { paper: "letter", earth: "None", rule: "NEC-460-6", date: " 2 March ", revision: "B" };
    expect(readSheetFlags(flags)).toEqual({
      ok: true,
      value: { paper: "Letter", earth: "none", rule: "nec-460-6", date: "2 March", revision: "B" },
    });
  });

  test("every wrong one is told at once, with the nearest; a rule that sets no level or time cannot govern", () => {
    const read = readSheetFlags({
      paper: "A5",
      earth: "negativ",
      rule: "absorption-other",
      date: " ",
      revision: "x".repeat(61),
    });
    expect(read).toMatchObject({
      ok: false,
      refusals: [
        { place: { field: "--paper" }, code: "bad-choice" },
        { place: { field: "--earth" }, want: expect.stringMatching(/perhaps "negative"/) },
        { place: { field: "--rule" }, code: "bad-choice" },
        { place: { field: "--date" }, code: "empty" },
        { place: { field: "--revision" }, code: "too-long" },
      ],
    });
  });
});

describe("readSheetFlags(flags): of measured units", () => {
  test.each(["positions", "uncertainty", "leakageAt"] as const)(
    "%s without --measured is refused, beside it not",
    (key) => {
      expect(readSheetFlags({ [key]: "1 %" })).toMatchObject({ ok: false, refusals: [{ code: "contradiction" }] });
      expect(readSheetFlags({ [key]: "1 %", measured: "lot.csv" }).ok).toBe(true);
    },
  );
});
