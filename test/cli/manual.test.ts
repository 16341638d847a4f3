import { spawnSync } from "node:child_process";
import { describe, expect, test } from "vitest";
import { manualPage, roffText } from "../../src/cli/manual.ts";
import { CAUTIONS } from "../../src/hazard/index.ts";
import { TREE } from "../support/commandTree.ts";
import { has } from "../support/shells.ts";

const page = manualPage(TREE);

describe("roffText(text)", () => {
  test("backslashes, hyphens, quotes and leading points show as they are", () => {
    expect(roffText("a\\b")).toBe("a\\eb");
    expect(roffText("--json")).toBe("\\-\\-json");
    expect(roffText(".TH\n.x")).toBe("\\&.TH\n\\&.x");
    expect(roffText("'x ~ ^ `")).toBe("\\(aqx \\(ti \\(ha \\(ga");
  });
});

describe("manualPage(tree)", () => {
  test("has the sections in their usual order, and no date", () => {
    const sections = [...page.matchAll(/^\.SH (.*)$/gm)].map((m) => m[1]);
    expect(sections).toEqual([
      "NAME",
      "SYNOPSIS",
      "DESCRIPTION",
      "OPTIONS",
      "COMMANDS",
      "EXIT STATUS",
      "ENVIRONMENT",
      "FILES",
      "CAUTIONS",
    ]);
    expect(page.split("\n")[0]).toBe(`.TH JOULEWRIGHT 1 "" "joulewright ${TREE.version}" "User Commands"`);
  });
});

describe.runIf(has("groff"))("the page, set by groff", () => {
  const set = spawnSync("groff", ["-man", "-Tutf8", "-ww", "-P-c", "-P-b", "-P-u", "-rLL=120n"], {
    input: page,
    encoding: "utf8",
  });
  // Breaks and filled blanks are the formatter's.
  const text = set.stdout.replace(/\u2010\n\s*/g, "").replace(/\s+/g, " ");

  test("without a single warning", () => {
    expect([set.status, set.stderr]).toEqual([0, ""]);
  });

  test("every command, option, caution and example stands on it as it is typed", () => {
    for (const command of TREE.commands) {
      expect(text).toContain(`joulewright ${command.name} `);
      for (const { long, value } of command.options.filter((option) => option.long !== "--help"))
        expect(text).toContain(value === null ? `${long} ` : `${long} ${value.replace(/[<>]/g, "")}`);
    }
    expect(text).toContain('joulewright plan --energy "2.4 kJ" --voltage "2.2 kV" --ripple "100 %"');
    for (const { when, long } of CAUTIONS) if (when === "always") expect(text).toContain(long.slice(0, 40));
  });

  test.runIf(has("man"))("man reads it too", () => {
    const read = spawnSync("man", ["-l", "-"], {
      input: page,
      encoding: "utf8",
      env: { ...process.env, MANPAGER: "cat", MANWIDTH: "100" },
    });
    expect(read.status).toBe(0);
    expect(read.stdout).toMatch(/JOULEWRIGHT\(1\)/);
  });
});
