import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { parse } from "csv-parse/sync";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { type OrderFlags, orderCommand } from "../../../src/cli/commands/order.ts";
import { filesOn } from "../../../src/cli/index.ts";
import { at, fakePorts } from "../../support/fakePorts.ts";

const FLAGS: OrderFlags = {
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
function order(flags: OrderFlags) {
  const ports = { ...fakePorts() };
  const status = orderCommand(BRIEF, { ...FLAGS, ...flags }, { ...ports, files: filesOn() });
  return { status, out: ports.printed(), err: ports.told() };
}

describe("order", () => {
  test("a blank name of a file is refused by its flag", () => {
    expect(order({ output: " " })).toMatchObject({
      status: 2,
      out: "",
      err: expect.stringMatching(/^--output: .*blank/),
    });
  });

  test("CSV to the output by default; another reader gets the units and the sum", () => {
    const { status, out } = order({});
    expect(status).toBe(0);
    const rows: Record<string, string>[] = parse(out, { columns: true });
    expect(rows[0]).toMatchObject({ item: "lab-pf-330-360", line: "units", "quantity needed": "279", currency: "EUR" });
    expect(rows.map((row) => row.line)).toEqual(
      expect.arrayContaining(["clamp diodes", "fuses", "shorting links", "labels"]),
    );
    expect(rows.at(-1)?.item).toBe("caution");
  });

  test("every format; --json is the format json; a wrong one is refused with the nearest", () => {
    expect(order({ format: "md" }).out).toMatch(/^# Bill/);
    expect(order({ format: "HTML" }).out).toMatch(/^<!DOCTYPE html>/);
    expect(JSON.parse(order({ json: true }).out).totals.currency).toBe("EUR");
    const wrong = order({ format: "cvs" });
    expect([wrong.status, wrong.out]).toEqual([2, ""]);
    expect(wrong.err).toMatch(/--format: .*perhaps "csv"/);
  });

  test("to a file: the ending names the format, an existing file is replaced only with --force", () => {
    const output = join(folder, "bill.json");
    expect(order({ output }).status).toBe(0);
    const first = readFileSync(output, "utf8");
    expect(JSON.parse(first).lines.length).toBeGreaterThan(10);
    const again = order({ output, spares: "9" });
    expect(again.status).toBe(2);
    expect(again.err).toMatch(/exists already/);
    expect(readFileSync(output, "utf8")).toBe(first);
    expect(order({ output, spares: "9", force: true }).status).toBe(0);
    expect(readFileSync(output, "utf8")).not.toBe(first);
    expect(readdirSync(folder)).toEqual(["bill.json"]);
  });

  test("a full disk, a folder, a missing folder: refused, nothing left", () => {
    expect(order({ output: "/dev/full" })).toMatchObject({ status: 2, err: expect.stringMatching(/disk is full/) });
    expect(order({ output: folder }).err).toMatch(/is a folder/);
    expect(order({ output: join(folder, "no", "a.csv") }).err).toMatch(/no such file/);
    expect(readdirSync(folder)).toEqual([]);
  });

  test("a bank that fails its checks is written with a warning and ends with 1", () => {
    const output = join(folder, "a.csv");
    const { status, err } = order({ output, series: "6" });
    expect(status).toBe(1);
    expect(err).toMatch(/FAIL, worst unit while charging.*Do not buy this bank/);
    expect(existsSync(output)).toBe(true);
  });

  test("--edited: an own line and a price come back and are told; the file's faults are refused, nothing is written", () => {
    const edited = join(folder, "edited.csv");
    const rows = order({}).out.split("\r\n");
    writeFileSync(edited, [rows[0], "glue,,,,2,,,,,,1.50", ...rows.slice(1)].join("\n"));
    const { status, out, err } = order({ edited, json: true });
    expect(status).toBe(0);
    expect(JSON.parse(out).lines.at(-1)).toMatchObject({
      item: "glue",
      line: "own line",
      purchase: 3,
      currency: "EUR",
    });
    expect(JSON.parse(out).changes).toHaveLength(1);
    expect(err).toContain(`${edited}:2: glue: your own line is kept`);
    writeFileSync(edited, [rows[0], "glue,glues,,,many"].join("\n"));
    const output = join(folder, "new.csv");
    const wrong = order({ edited, output });
    expect(wrong).toMatchObject({ status: 2, out: "" });
    expect(wrong.err).toContain(`${edited}:2:2 line`);
    expect(existsSync(output)).toBe(false);
    expect(order({ edited: join(folder, "none.csv") }).err).toMatch(/no such file/);
  });
});
