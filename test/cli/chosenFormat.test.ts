import { describe, expect, test } from "vitest";
import { chosenFormat } from "../../src/cli/chosenFormat.ts";

const FORMATS = ["html", "md", "json"] as const;
const of = (flags: Parameters<typeof chosenFormat>[0]) => chosenFormat(flags, FORMATS, "html");

describe("chosenFormat(flags, formats, own)", () => {
  test("the name beats --json, which beats the ending, which beats the command's own", () => {
    expect(of({})).toEqual({ ok: true, value: "html" });
    expect(of({ output: "a.b/sheet.MD" })).toEqual({ ok: true, value: "md" });
    expect(of({ output: "sheet.markdown" })).toEqual({ ok: true, value: "md" });
    expect(of({ output: "sheet.md", json: true })).toEqual({ ok: true, value: "json" });
    expect(of({ output: "sheet.md", json: true, format: "HTML" })).toEqual({ ok: true, value: "html" });
    expect(of({ output: "sheet.txt" })).toEqual({ ok: true, value: "html" });
  });

  test("a strange name is refused with the nearest", () => {
    expect(of({ format: "htlm" })).toMatchObject({
      ok: false,
      refusals: [{ code: "bad-choice", place: { field: "--format" }, want: expect.stringMatching(/perhaps "html"/) }],
    });
  });
});
