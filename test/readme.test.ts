// The README's examples are true: each command of a console block is run, and prints what the page shows.
// A number behind `console` says how many lines are shown, where the rest says nothing new.
// To write the page anew from the program: README=write npx vitest run test/readme.test.ts
import { readFileSync, writeFileSync } from "node:fs";
import { resolve } from "node:path";
import { expect, test } from "vitest";
import { filesOn } from "../src/cli/files.ts";
import { run } from "../src/cli/program.ts";

const PAGE = resolve(import.meta.dirname, "../README.md");
const BLOCK = /```console(?: (\d+))?\n\$ joulewright (.*)\n([\s\S]*?)```/g;
const MORE = "(and so on)";

/** Words of a command line, quotes taken off. */
const words = (line: string): string[] => [...line.matchAll(/"([^"]*)"|(\S+)/g)].map((m) => m[1] ?? m[2] ?? "");

async function printed(line: string): Promise<string> {
  let text = "";
  await run(words(line), {
    out: (part) => {
      text += part;
    },
    err: (part) => {
      text += part;
    },
    columns: 80,
    files: filesOn(),
    catalogs: resolve(import.meta.dirname, "../catalogs"),
  });
  // CSV has its own line ends; the page has one kind.
  return text.replaceAll("\r\n", "\n");
}

const page = readFileSync(PAGE, "utf8");
const blocks = [...page.matchAll(BLOCK)].map((m) => ({
  whole: m[0],
  lines: m[1] === undefined ? Number.POSITIVE_INFINITY : Number(m[1]),
  line: m[2] ?? "",
  shown: m[3] ?? "",
}));

/** The first lines of a text, and a word where there are more. */
function first(text: string, lines: number): string {
  const all = text.trimEnd().split("\n");
  return all.length <= lines ? all.join("\n") : `${all.slice(0, lines).join("\n").trimEnd()}\n${MORE}`;
}

test("the page has examples, opens with the job, and shows the two commands", () => {
  expect(blocks.length).toBeGreaterThanOrEqual(3);
  expect(page).toContain("npm ci && npm start");
  expect(page).toContain("npm ci && npm test");
});

if (process.env.README === "write") {
  test("written anew", async () => {
    let text = page;
    for (const { whole, line, lines } of blocks) {
      const now = first(await printed(line), lines);
      const fence = Number.isFinite(lines) ? `console ${lines}` : "console";
      text = text.replace(whole, () => `\`\`\`${fence}\n$ joulewright ${line}\n${now}\n\`\`\``);
    }
    writeFileSync(PAGE, text);
    expect(text).toContain("```console");
  });
} else {
  test.each(blocks)("$line", async ({ line, shown, lines }) => {
    expect(first(await printed(line), lines)).toBe(shown.trimEnd());
  });
}
