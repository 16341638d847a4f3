import { describe, expect, test } from "vitest";
import { SCREEN_OPTIONS } from "../../src/cli/commandTree.ts";
import { run } from "../../src/cli/program.ts";
import { screenFlags } from "../../src/tui/screenFlags.ts";
import { OPTIONS, TREE } from "../support/commandTree.ts";
import { fakePorts } from "../support/fakePorts.ts";

describe("treeOf(program)", () => {
  test("has every command and option that the help pages list, and no other", async () => {
    const ports = fakePorts({}, 240);
    await run(["--help"], ports);
    const listed = [...ports.printed().matchAll(/^ {2}([a-z]+)(?: \[| <|$| {2})/gm)].map((m) => m[1]);
    expect(TREE.commands.map(({ name }) => name).sort()).toEqual(
      [...new Set(listed)].filter((name) => name !== "joulewright").sort(),
    );
    for (const command of TREE.commands.filter(({ name }) => name !== "help")) {
      const page = fakePorts({}, 240);
      await run([command.name, "--help"], page);
      const options = [...page.printed().matchAll(/^ {2}(?:-[a-zA-Z], )?(--[a-z-]+)/gm)].map((m) => m[1]);
      expect(command.options.map(({ long }) => long).sort(), command.name).toEqual(options.sort());
      for (const { help } of command.options.filter(({ long }) => long !== "--help"))
        expect(page.printed()).toContain(help.slice(0, 30));
    }
  });

  test("the options of the screens are those that open them", () => {
    for (const { long, value } of SCREEN_OPTIONS)
      expect(screenFlags(value === null ? [long] : [long, "x"]), long).not.toBeNull();
    // Every fact that the flags settle has its option, the ground two of them.
    const settled = Object.keys(screenFlags([]) ?? {});
    expect(settled.sort()).toEqual(["ascii", "brief", "catalog", "ground", "resistors"]);
    const named = SCREEN_OPTIONS.map(({ long }) => long.slice(2)).sort();
    expect(named).toEqual(["ascii", "brief", "catalog", "dark", "light", "resistors"]);
  });

  test("what names a file is a file, and takes a value", () => {
    const files = OPTIONS.filter(({ option }) => option.file);
    expect(files.length).toBeGreaterThan(20);
    for (const { option } of files) expect(option.value, option.long).not.toBeNull();
    expect(OPTIONS.filter(({ option }) => option.variadic).map(({ option }) => option.long)).toContain("--catalog");
  });
});
