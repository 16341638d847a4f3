import { expect, test } from "vitest";
import { codeOf, refuseFile, trouble } from "../../src/cli/fileTroubles.ts";

test("trouble(error, file): a known code has its refusal, an unknown one is unreadable, what has no code is thrown on", () => {
  expect(trouble({ code: "ENOSPC" }, "a")).toMatchObject({ refusals: [{ code: "disk-full", place: { file: "a" } }] });
  expect(trouble({ code: "EWEIRD" }, "a")).toMatchObject({ refusals: [{ code: "unreadable" }] });
  expect(() => trouble(new Error("ours"), "a")).toThrow("ours");
});

test("codeOf(error): empty for what has none", () => {
  expect([codeOf(null), codeOf(3), codeOf(new Error("x")), codeOf({ code: "EPIPE" })]).toEqual(["", "", "", "EPIPE"]);
});

test("refuseFile(code, file, read, want) names the file", () => {
  expect(refuseFile("too-large", "a", "r", "w")).toEqual({
    ok: false,
    refusals: [{ code: "too-large", place: { file: "a" }, read: "r", want: "w" }],
  });
});
