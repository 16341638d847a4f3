// An order in a file: the ending decides the format, nothing is replaced unasked, every trouble in words.
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, expect, test } from "vitest";
import { filesOn } from "../../src/cli/index.ts";
import { billText } from "../../src/order/index.ts";
import { formatOf, saveBill } from "../../src/tui/billFile.ts";
import { BRIEF, engine } from "../support/stock.ts";

const folder = mkdtempSync(join(tmpdir(), "bill-"));
afterAll(() => rmSync(folder, { recursive: true }));

const read = engine.readBrief(BRIEF);
if (!read.ok) throw new Error("brief");
const layout = engine.check(read.value, { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" });
const made = layout === null ? null : engine.bill(read.value, layout);
if (made === null) throw new Error("bill");
const bill = made;
const files = filesOn();

test.each([
  ["a.csv", "csv"],
  ["a.JSON", "json"],
  ["a.b.md", "md"],
  ["/x/a.html", "html"],
  ["a", null],
  ["a.", null],
  [".csv", "csv"],
  ["a.xlsx", null],
])("formatOf(%j) is %s", (path, want) => {
  expect(formatOf(path)).toBe(want);
});

test.each(["csv", "json", "md", "html"] as const)("saveBill writes %s as the order command does", (format) => {
  const path = join(folder, `a.${format}`);
  expect(saveBill(files, bill, path, false)).toEqual({ kind: "saved", path });
  expect(readFileSync(path, "utf8")).toBe(billText(bill, format));
});

test("saveBill leaves a file that is there as it is, until told to replace it", () => {
  const path = join(folder, "there.csv");
  writeFileSync(path, "mine");
  expect(saveBill(files, bill, path, false)).toEqual({ kind: "exists", path });
  expect(readFileSync(path, "utf8")).toBe("mine");
  expect(saveBill(files, bill, path, true).kind).toBe("saved");
  expect(readFileSync(path, "utf8")).not.toBe("mine");
});

test("saveBill says in words what is wrong with the name or the place", () => {
  expect(saveBill(files, bill, join(folder, "a.doc"), false)).toEqual({
    kind: "trouble",
    words: "the name must end in one of .csv, .json, .md, .html",
  });
  const gone = saveBill(files, bill, join(folder, "none", "a.csv"), false);
  expect(gone).toEqual({
    kind: "trouble",
    words: "no such file; needed: the path of a file that exists, in a folder that exists",
  });
  expect(existsSync(join(folder, "none"))).toBe(false);
});
