import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { zshCompletion } from "../../src/cli/completeZsh.ts";
import { OPTIONS, TREE } from "../support/commandTree.ts";
import { has, typed } from "../support/shells.ts";

const text = zshCompletion(TREE);

describe("zshCompletion(tree)", () => {
  test("opens as a completion function, and has every option of every command", () => {
    expect(text.startsWith("#compdef joulewright\n")).toBe(true);
    for (const { name, options } of TREE.commands.filter((command) => command.name !== "help")) {
      const part = text.slice(text.indexOf(`\n    ${name})\n`));
      const block = part.slice(0, part.indexOf("\n      ;;"));
      for (const { long } of options) expect(block, `${name} ${long}`).toMatch(new RegExp(`'\\*?${long}\\[`));
    }
    for (const { option } of OPTIONS.filter(({ command }) => command === "")) expect(text).toContain(`${option.long}[`);
  });
});

let folder = "";
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "zsh-"));
  writeFileSync(join(folder, "completion.zsh"), text);
  writeFileSync(join(folder, "brief.json"), "{}");
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe.runIf(has("zsh"))("zshCompletion(tree), in zsh", () => {
  test("at a real prompt, Tab writes a command, an option, a word and the name of a file", async () => {
    const shown = await typed(
      "zsh",
      ["-f", "-i"],
      [
        {
          send: "PS1='> '; autoload -U compinit; compinit -u -D; source ./completion.zsh; echo rea''dy\r",
          until: /ready\r\n/,
        },
        { send: "joulewright ord\t", until: /order ?$/ },
        { send: "--bas\t", until: /is ?$/ },
        { send: "wor\t", until: /worst\\ case ?$|st\\ case ?$/ },
        { send: "--catalog br\t", until: /ief\.json ?$/ },
        { send: "br\t", until: /ief\.json ?$/ },
        { send: "--tie\t", until: /s ?$/ },
        { send: "cro\t", until: /ss-tied ?$/ },
        // The screen anew, so that what stands there is drawn whole.
        {
          send: "\x0c",
          until: /joulewright order --basis worst\\ case --catalog brief\.json brief\.json --ties cross-tied/,
        },
      ],
      folder,
    );
    expect(shown).not.toMatch(/command not found|parse error|bad |_arguments:/);
  }, 60_000);
});
