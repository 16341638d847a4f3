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
    expect(of({ output: "sheet.md", format: "HTML" })).toEqual({ ok: true, value: "html" });
    expect(of({ json: true, format: "json" })).toEqual({ ok: true, value: "json" });
  });

  test("an ending of no format is refused with those that are, unless a format is named", () => {
    for (const output of ["t.pdf", "a/t.CSV", "t.txt"])
      expect(of({ output })).toMatchObject({
        ok: false,
        refusals: [{ place: { field: "--output" }, want: expect.stringMatching(/\.html, \.md, \.json; or --format/) }],
      });
    expect([of({ output: "t.pdf", format: "md" }), of({ output: "t.pdf", json: true })]).toEqual([
      { ok: true, value: "md" },
      { ok: true, value: "json" },
    ]);
    // No ending, or a name that is one: the command's own.
    for (const output of ["sheet", "/dev/stdout", ".hidden", "a.b/sheet", "sheet.2", "-"])
      expect(of({ output })).toEqual({ ok: true, value: "html" });
  });

  test("--json beside another format contradicts it", () => {
    expect(of({ json: true, format: "md" })).toMatchObject({
      ok: false,
      refusals: [{ code: "contradiction", place: { field: "--format" } }],
    });
  });

  test("a strange name is refused with the nearest", () => {
    expect(of({ format: "htlm" })).toMatchObject({
      ok: false,
      refusals: [{ code: "bad-choice", place: { field: "--format" }, want: expect.stringMatching(/perhaps "html"/) }],
    });
  });
});
