import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { fishCompletion } from "../../src/cli/completeFish.ts";
import { OPTIONS, TREE } from "../support/commandTree.ts";
import { has } from "../support/shells.ts";

const text = fishCompletion(TREE);

describe("fishCompletion(tree)", () => {
  test("has one line for every option and command, each with its help", () => {
    const lines = text.split("\n");
    for (const { command, option } of OPTIONS.filter(({ option: one }) => one.long !== "--help")) {
      const when = command === "" ? "__fish_use_subcommand" : `__fish_seen_subcommand_from ${command}'`;
      expect(
        lines.filter((line) => line.includes(when) && line.includes(` -l ${option.long.slice(2)} `)),
        `${command} ${option.long}`,
      ).toHaveLength(1);
    }
    for (const { name } of TREE.commands) expect(text).toContain(`-a ${name} -d `);
  });
});

let folder = "";
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "fish-"));
  writeFileSync(join(folder, "completion.fish"), text);
  writeFileSync(join(folder, "brief.json"), "{}");
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** What fish itself offers for a line. */
const offered = (lines: readonly string[]): readonly (readonly string[])[] => {
  const ask = lines.map((line) => `complete -C ${JSON.stringify(line)}; echo ==`).join("\n");
  const ran = spawnSync("fish", ["--no-config", "-c", `source completion.fish\n${ask}`], {
    cwd: folder,
    encoding: "utf8",
    env: { ...process.env, HOME: folder },
  });
  expect(ran.stderr).toBe("");
  return ran.stdout
    .split("==\n")
    .slice(0, -1)
    .map((part) =>
      part
        .split("\n")
        .filter((line) => line !== "")
        .map((line) => line.split("\t")[0] ?? ""),
    );
};

describe.runIf(has("fish"))("fishCompletion(tree), in fish", () => {
  test("commands, options, words and files where they belong, and nothing for a free value", () => {
    const [commands, options, words, files, brief, free, shells] = offered([
      "joulewright ",
      "joulewright order --",
      "joulewright plan --basis ",
      "joulewright order --layout b",
      "joulewright plan b",
      "joulewright plan --energy ",
      "joulewright completion ",
    ]);
    expect([...(commands ?? [])].sort()).toEqual(TREE.commands.map(({ name }) => name).sort());
    const order = TREE.commands.find(({ name }) => name === "order");
    expect([...(options ?? [])].sort()).toEqual(order?.options.map(({ long }) => long).sort());
    expect([...(words ?? [])].sort()).toEqual(["measured", "nominal", "statistical", "worst case"]);
    expect(files).toEqual(["brief.json"]);
    expect(brief).toEqual(["brief.json"]);
    expect(free).toEqual([]);
    expect([...(shells ?? [])].sort()).toEqual(["bash", "fish", "zsh"]);
  });
});
