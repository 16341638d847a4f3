// The page of changes: its table of formats says the versions that the program has.
import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { PLACING_VERSION } from "../src/cli/bankSheet.ts";
import { LAYOUT_VERSION } from "../src/cli/layoutInput.ts";
import { BILL_VERSION } from "../src/order/marks.ts";
import { BRIEF_VERSION } from "../src/search/brief.ts";
import { savedText } from "../src/tui/saved.ts";
import { at } from "./support/fakePorts.ts";
import { stateWith } from "./support/stock.ts";

const page = readFileSync(at("src/changes.md"), "utf8");

test("the table of file formats says the versions that the program reads and writes", () => {
  const version = (file: string): number =>
    Number(new RegExp(`^\\| ${file}[^|]*\\|[^|]*\\| (\\d+) +\\|`, "m").exec(page)?.[1]);
  expect([version("brief"), version("layout"), version("placing"), version("bill"), version("session")]).toEqual([
    BRIEF_VERSION,
    LAYOUT_VERSION,
    PLACING_VERSION,
    BILL_VERSION,
    JSON.parse(savedText(stateWith({}))).version,
  ]);
});

test("the version of the package has a heading, or is still to come", () => {
  const { version } = JSON.parse(readFileSync(at("package.json"), "utf8"));
  expect(page.includes(`\n## ${version}`) || page.includes("\n## Not released yet")).toBe(true);
  expect(page).not.toMatch(/#\d+|https?:/);
});
