import { expect, test } from "vitest";
import { accepted, refused } from "../../src/quantity/index.ts";
import { saveText } from "../../src/tui/saveText.ts";

test("saveText(files, text, path, replace): saved, there already, or why not in words", () => {
  const answer = (code: string | null) =>
    saveText(
      {
        write: (path) =>
          code === null ? accepted(path) : refused({ code, place: { file: path }, read: "", want: "room on the disk" }),
      },
      "text",
      "a.csv",
      false,
    );
  expect(answer(null)).toEqual({ kind: "saved", path: "a.csv" });
  expect(answer("file-exists")).toEqual({ kind: "exists", path: "a.csv" });
  expect(answer("disk-full")).toEqual({ kind: "trouble", words: "disk full; needed: room on the disk" });
});
