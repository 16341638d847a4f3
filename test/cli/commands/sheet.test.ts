import { mkdtempSync, readdirSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join, resolve } from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { sheetCommand } from "../../../src/cli/commands/sheet.ts";
import { filesOn } from "../../../src/cli/index.ts";
import { run } from "../../../src/cli/program.ts";
import type { SheetFlags } from "../../../src/cli/sheetFlags.ts";
import { at, fakePorts, UNSAFE } from "../../support/fakePorts.ts";

const FLAGS: SheetFlags = {
  catalog: [at("catalogs/electrolytic.csv")],
  resistors: at("catalogs/resistors.csv"),
  part: "lab-pf-330-360",
  series: "9",
  parallel: "31",
  ties: "cross-tied",
};
const BRIEF = at("fixtures/briefs/flash-lamp.json");
let folder = "";
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "joulewright-"));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));
function sheet(flags: SheetFlags) {
  const ports = { ...fakePorts() };
  const status = sheetCommand(BRIEF, { ...FLAGS, ...flags }, { ...ports, files: filesOn() });
  return { status, out: ports.printed(), err: ports.told() };
}

describe("sheet", () => {
  test("HTML to the output by default, Markdown and the model by name; same input, same bytes", () => {
    const html = sheet({});
    expect(html.status).toBe(0);
    expect(html.out).toMatch(/^<!DOCTYPE html>/);
    expect(sheet({}).out).toBe(html.out);
    expect(sheet({ format: "MD" }).out).toMatch(/^# Build sheet: Flash-lamp driver, bench 1/);
    const model = JSON.parse(sheet({ json: true }).out);
    expect(model).toMatchObject({ layout: "lab-pf-330-360 9s31p cross-tied", date: null, revision: null });
    expect(model.sections.map(({ id }: { id: string }) => id)).toEqual(
      expect.arrayContaining(["wiring", "hot-test", "hazard", "door"]),
    );
    expect(html.out + sheet({ format: "md" }).out).not.toMatch(UNSAFE);
  });

  test("to a file: the ending names the format, an existing one is left unless forced, nothing is half-written", () => {
    const output = join(folder, "sheet.md");
    const first = sheet({ output });
    expect(first).toMatchObject({ status: 0, out: "", err: expect.stringMatching(/sections written/) });
    const text = readFileSync(output, "utf8");
    expect(text).toMatch(/^# Build sheet/);
    expect(sheet({ output, revision: "C" }).err).toMatch(/exists already/);
    expect(readFileSync(output, "utf8")).toBe(text);
    expect(sheet({ output, revision: "C", force: true }).status).toBe(0);
    expect(readFileSync(output, "utf8")).toContain("| C |");
    expect(sheet({ output: "/dev/full" })).toMatchObject({ status: 2, err: expect.stringMatching(/disk is full/) });
    expect(readdirSync(folder)).toEqual(["sheet.md"]);
  });

  test("paper, date, revision and the rule that governs stand on the sheet; none of them unasked", () => {
    const { out } = sheet({ paper: "letter", date: "2 March", revision: "B", rule: "iec-60204-residual" });
    expect(out).toContain("size: Letter portrait");
    expect(out).toMatch(/2 March/);
    expect(out).toMatch(/IEC 60204-1 6\.2\.4, second hand/);
    expect(sheet({}).out).not.toMatch(/\b20[0-9]{2}-[01][0-9]-[0-3][0-9]\b/);
  });

  test("measured units give serials; a list of positions is taken as built", () => {
    const measured = at("fixtures/units/lot-40-capacitance-only.csv");
    const serials = [...readFileSync(measured, "utf8").matchAll(/^([\w-]+),/gm)].map((m) => m[1] as string).slice(1);
    const list = join(folder, "list.csv");
    const ports = { ...fakePorts(), files: filesOn() };
    expect(
      ports.files.write(
        list,
        `serial,stage\n${serials
          .slice(0, 36)
          .map((serial, i) => `${serial},${Math.floor(i / 4) + 1}`)
          .join("\n")}\n`,
        false,
      ).ok,
    ).toBe(true);
    const { out } = sheet({ parallel: "4", measured, positions: list, format: "md", energy: "250 J" } as SheetFlags);
    expect(out).toMatch(new RegExp(`\\| C1\\.1 \\| ${serials[0]} \\|`));
    expect(out).toMatch(new RegExp(`\\| C9\\.4 \\| ${serials[35]} \\|`));
  });

  test("a bank that fails is written with a warning and ends with 1", () => {
    const { status, out, err } = sheet({ series: "7", format: "md" });
    expect(status).toBe(1);
    expect(out).toMatch(/DO NOT BUILD/);
    expect(err).toMatch(/Do not build this bank/);
  });

  test("refused: a strange format, a blank name, an unknown rule, all at once; nothing is written", () => {
    const { status, out, err } = sheet({ format: "pdf", output: " ", rule: "nec" });
    expect([status, out]).toEqual([2, ""]);
    expect(err).toMatch(/--format[\s\S]*--output[\s\S]*--rule/);
  });

  test("from the command line, with its help", async () => {
    const ports = fakePorts();
    expect(await run(["sheet", "--help"], ports)).toBe(0);
    expect(ports.printed()).toMatch(/--rule <id>[\s\S]*iec-60204-residual/);
    const flags = ["--catalog", at("catalogs/electrolytic.csv"), "--resistors", at("catalogs/resistors.csv")];
    const shape = ["--part", "lab-pf-330-360", "--series", "9", "--parallel", "31", "--ties", "cross-tied"];
    const done = fakePorts();
    expect(await run(["sheet", BRIEF, ...shape, "--format", "md", ...flags], done)).toBe(0);
    expect(done.printed()).toMatch(/^# Build sheet/);
  });
});

describe("loads", () => {
  /** Files that are loaded with this one, without being asked for later. */
  function loadedWith(entry: string, seen = new Set<string>()): ReadonlySet<string> {
    if (seen.has(entry)) return seen;
    seen.add(entry);
    const code = readFileSync(entry, "utf8");
    for (const [statement, spec] of code.matchAll(/^(?:import|export)\b[^;]*?from\s+"([^"]+)"/gm)) {
      if (/^(import|export) type\b/.test(statement)) continue;
      if (spec?.startsWith(".")) loadedWith(resolve(dirname(entry), spec), seen);
      else seen.add(spec as string);
    }
    return seen;
  }

  test("neither the program nor any other command loads the paper, or what draws it", () => {
    const commands = readdirSync(at("src/cli/commands")).filter((name) => !/^(sheet|labels)\.ts$/.test(name));
    for (const entry of [
      "src/main.ts",
      "src/cli/program.ts",
      "src/tui/index.ts",
      ...commands.map((name) => `src/cli/commands/${name}`),
    ]) {
      const loaded = [...loadedWith(at(entry))];
      expect([entry, loaded.filter((file) => /\/src\/sheet\/|^preact|^d3-/.test(file))]).toEqual([entry, []]);
    }
    const own = [...loadedWith(at("src/cli/commands/sheet.ts"))];
    expect(own).toEqual(expect.arrayContaining(["preact-render-to-string", "d3-shape"]));
    expect(own.filter((file) => /^(ink|react)$/.test(file))).toEqual([]);
  });
});
