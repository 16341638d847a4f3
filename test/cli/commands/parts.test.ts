import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { type PartsFlags, partsCommand } from "../../../src/cli/commands/parts.ts";
import { filesOn } from "../../../src/cli/index.ts";
import { bigCatalogue } from "../../support/bigCatalogue.ts";
import { at, fakePorts, UNSAFE } from "../../support/fakePorts.ts";

function parts(paths: readonly string[], flags: PartsFlags = {}, texts: Record<string, string> = {}) {
  const ports = fakePorts(texts);
  const status = partsCommand(paths, flags, ports);
  return { status, out: ports.printed(), err: ports.told() };
}
const bad = (name: string): string => at(`fixtures/catalogs/bad/${name}`);

describe("parts FILE...", () => {
  test("every bad catalogue: 0 when rows were understood, else 2; nothing unsafe, never a stack", () => {
    const names = readdirSync(at("fixtures/catalogs/bad"));
    expect(names.length).toBeGreaterThan(50);
    for (const name of names) {
      const { status, out, err } = parts([bad(name)]);
      const understood = Number(/, (\d+) rows? understood/.exec(out)?.[1] ?? 0);
      expect(status, name).toBe(understood > 0 ? 0 : 2);
      expect(UNSAFE.test(out + err), name).toBe(false);
      expect(out + err, name).not.toMatch(/\n\s+at .*:\d+:\d+/);
      expect(out + err, name).toContain(name);
    }
  });

  test("a flaw in a row names file, line, column and heading", () => {
    expect(parts([bad("voltage-in-capacitance.csv")]).out.replace(/\s+/g, " ")).toMatch(
      /voltage-in-capacitance\.csv:3:2 capacitance: the unit is one of another quantity: read "450 V"/,
    );
  });

  test("what reads nothing ends with 2: empty, heading only, binary, Latin-1, UTF-16, a folder, a missing file, a brief", () => {
    for (const name of [
      "empty.csv",
      "heading-only.csv",
      "binary.csv",
      "latin-1.csv",
      "utf-16.csv",
      "duplicate-heading.csv",
    ])
      expect(parts([bad(name)]).status, name).toBe(2);
    expect(parts([at("catalogs")]).err).toMatch(/folder/);
    expect(parts(["/none/at/all.csv"]).status).toBe(2);
    expect(parts([at("fixtures/briefs/flash-lamp.json")]).err).toMatch(/another kind of file/);
  });

  test("terms of purchase are told, and what is blank among them is named", () => {
    const text =
      "part,capacitance [uF],voltage [V],price,currency,price breaks,pack,minimum order,on hand,available,supplier\n" +
      'k,820,450,6.40,EUR,"10: 5.90; 100: 5.10",10,20,13,40,Shelf\nm,820,450,,,,,,,,\n';
    const flat = parts(["-"], {}, { "-": text }).out.replace(/\s+/g, " ");
    expect(flat).toMatch(
      /purchase: currency EUR, price 6\.40 EUR, price breaks 10: 5\.90; 100: 5\.10, pack 10, minimum order 20, on hand 13, available 40, supplier Shelf purchase unknown: order code/,
    );
    expect(flat).toMatch(/purchase unknown: currency, price, price breaks, pack, minimum order, on hand, available/);
    const json = JSON.parse(parts(["-"], { json: true }, { "-": text }).out);
    expect(json.files[0].rows[0].purchase).toContainEqual(expect.objectContaining({ key: "available", value: 40 }));
  });

  test("faults of rows leave the status at 0 and are counted at the end", () => {
    const text = "part,capacitance [uF],voltage [V]\nk,820,450\nm,x,450\nn,820,y\n";
    const { status, out } = parts(["-"], {}, { "-": text });
    expect(status).toBe(0);
    expect(out).toMatch(/2 faults in all, each told above with its line\.\n$/);
  });

  test("every good catalogue reads to the same values", () => {
    const values = (name: string): unknown =>
      JSON.parse(parts([at(`fixtures/catalogs/good/${name}`)], { json: true }).out).files[0].rows.map(
        (row: { name: string; values: { key: string; text: string }[] }) => [
          row.name,
          row.values.map((v) => [v.key, v.text]),
        ],
      );
    const plain = values("plain.csv");
    for (const name of readdirSync(at("fixtures/catalogs/good"))) expect(values(name), name).toEqual(plain);
  });

  test("state of each value: datasheet, measured, assumed with its rule, unknown", () => {
    const { out } = parts([at("catalogs/drawer.csv")]);
    const flat = out.replace(/\s+/g, " ");
    expect(flat).toMatch(/measured: leakage 310 µA, esr 118 mohm/);
    expect(flat).toMatch(
      /assumed: leakage [^:]* \(0\.01 C V uA \(C in uF\) or 3 uA, the greater, for polarised units\)/,
    );
    expect(flat).toMatch(/unknown: .*esl/);
  });

  test("resistors, fuses and measured units by their headings, several files at once", () => {
    const { status, out } = parts(
      ["catalogs/resistors.csv", "catalogs/fuses.csv", "fixtures/units/lot-gap.csv"].map(at),
    );
    expect(status).toBe(0);
    for (const kind of ["resistors", "fuses", "measured units"])
      expect(out).toMatch(new RegExp(`: ${kind}, \\d+ rows`));
  });

  test("--json is one JSON text, also with refusals, and --limit bounds the rows", () => {
    const { status, out } = parts([at("catalogs/film.csv"), "/none"], { json: true, limit: "2" });
    const result = JSON.parse(out);
    expect(status).toBe(2);
    expect(result.files[0]).toMatchObject({ kind: "capacitors", understood: 17, faults: [] });
    expect(result.files[0].rows).toHaveLength(2);
    expect(result.refusals[0].code).toBe("no-such-file");
    expect(parts(["/none"], { json: true }).out).toMatch(/^\{/);
    expect(JSON.parse(parts(["/none"], { json: true }).out).files).toEqual([]);
    expect(parts([at("catalogs/film.csv")], { limit: "x" }).status).toBe(2);
    expect(parts([at("catalogs/film.csv")], { limit: "2" }).out).toMatch(/and 15 more rows/);
  });

  test("rows are told in pieces: 1200 rows come in order, none twice", () => {
    const pieces: string[] = [];
    const ports = { ...fakePorts({ "big.csv": bigCatalogue(1200, 1) }), out: (text: string) => void pieces.push(text) };
    expect(partsCommand(["big.csv"], {}, ports)).toBe(0);
    const lines = [...pieces.join("").matchAll(/^ {2}line (\d+):/gm)].map((match) => Number(match[1]));
    expect(lines).toEqual(lines.toSorted((a, b) => a - b));
    expect(new Set(lines).size).toBe(lines.length);
    expect(pieces.length).toBeGreaterThan(3);
  });

  test("standard input, once", () => {
    const text = readFileSync(at("catalogs/film.csv"), "utf8");
    expect(parts(["-"], {}, { "-": text }).out).toMatch(/^standard input: capacitors, 17/);
    expect(filesOn().read("/none/-").ok).toBe(false);
  });
});
