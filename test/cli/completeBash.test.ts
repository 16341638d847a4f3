import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { bashCompletion } from "../../src/cli/completeBash.ts";
import { OPTIONS, TREE } from "../support/commandTree.ts";
import { has, typed } from "../support/shells.ts";

let folder = "";
let script = "";
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "bash-"));
  script = join(folder, "completion.bash");
  writeFileSync(script, bashCompletion(TREE));
  writeFileSync(join(folder, "my brief.json"), "{}");
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** What bash itself gets for these words, the last of them being typed. */
const asked = (lines: readonly (readonly string[])[]): readonly (readonly string[])[] => {
  const ask = lines.map((words) => {
    const given = ["joulewright", ...words].map((word) => `'${word.replaceAll("'", "'\\''")}'`).join(" ");
    return `COMP_WORDS=(${given}); COMP_CWORD=${words.length}; _joulewright; printf '%s\\n' "\${COMPREPLY[@]}"; echo ==`;
  });
  const ran = spawnSync("bash", ["--norc", "-c", `set -u; source ${script}\n${ask.join("\n")}`], { encoding: "utf8" });
  expect(ran.stderr).toBe("");
  return ran.stdout
    .split("==\n")
    .slice(0, -1)
    .map((text) => text.split("\n").filter((line) => line !== ""));
};
const one = (...words: readonly string[]): readonly string[] => asked([words])[0] ?? [];

describe.runIf(has("bash"))("bashCompletion(tree), in bash", () => {
  test("an empty word gets the commands, a beginning those that begin so, nonsense nothing", () => {
    expect(one("")).toEqual(TREE.commands.map(({ name }) => name));
    expect(one("pl")).toEqual(["plan", "place"]);
    expect(one("zz")).toEqual([]);
  });

  test("every command gets each of its options, and no other", () => {
    const commands = TREE.commands.filter(({ name }) => name !== "help");
    const found = asked(commands.map(({ name }) => [name, "--"]));
    for (const [i, { name, options }] of commands.entries())
      expect(found[i], name).toEqual(options.map(({ long }) => long));
    expect(one("--a")).toEqual(["--ascii"]);
  });

  test("every option with words gets its words, as the shell must read them; a free value gets nothing", () => {
    const cases = OPTIONS.filter(({ command, option }) => command !== "" && option.words.length > 0);
    const found = asked(cases.map(({ command, option }) => [command, option.long, ""]));
    for (const [i, { option }] of cases.entries())
      expect(found[i], option.long).toEqual(option.words.map((word) => word.replaceAll(" ", "\\ ")));
    expect(one("plan", "--energy", "")).toEqual([]);
  });

  test("a word with blanks completes bare, behind a backslash, and inside quotes; = is passed over", () => {
    expect(one("plan", "--basis", "wo")).toEqual(["worst\\ case"]);
    expect(one("plan", "--basis", "worst\\ c")).toEqual(["worst\\ case"]);
    expect(one("plan", "--basis", '"wo')).toEqual(["worst case"]);
    expect(one("plan", "--basis", "=", "nom")).toEqual(["nominal"]);
    expect(one("check", "--ties", "=")).toEqual(["cross-tied", "strings"]);
  });

  test("completion gets the shells, help the commands", () => {
    expect(one("completion", "")).toEqual(["bash", "zsh", "fish"]);
    expect(one("help", "pl")).toEqual(["plan", "place"]);
  });

  test("at a real prompt, Tab writes a command, an option, a word and the name of a file", async () => {
    const shown = await typed(
      "bash",
      ["--norc", "--noprofile", "-i"],
      [
        { send: `PS1='> '; source ${script}; echo rea''dy\r`, until: /ready\r\n/ },
        { send: "joulewright ord\t", until: /order $/ },
        { send: "--bas\t", until: /--basis $/ },
        { send: "wor\t", until: /worst\\ case $/ },
        { send: "--layout my\t", until: /my\\ brief\.json $/ },
      ],
      folder,
    );
    expect(shown).toMatch(/joulewright order --basis worst\\ case --layout my\\ brief\.json $/);
  }, 60_000);
});
