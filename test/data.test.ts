// The shape of the data that comes with the program: invented catalogues, briefs, measured lots and published banks.
import { readdirSync, readFileSync } from "node:fs";
import { join, resolve } from "node:path";
import { parse } from "csv-parse/sync";
import { describe, expect, test } from "vitest";
import { bigCatalogue } from "./support/bigCatalogue.ts";

const ROOT = resolve(import.meta.dirname, "..");
const read = (path: string): string => readFileSync(join(ROOT, path), "utf8");
const table = (path: string, delimiter = ","): string[][] =>
  parse(read(path), { delimiter, bom: true, relax_column_count: false, skip_empty_lines: true, trim: true });
const records = (path: string): Record<string, string>[] => parse(read(path), { columns: true, bom: true });
const name = (heading: string): string => heading.replace(/ \[.*\]$/, "").toLowerCase();

const CAPACITOR_FILES = ["electrolytic", "film", "oil-and-paper", "double-layer", "home-made", "drawer"];
const CAPACITOR_COLUMNS = new Set(
  `part,capacitance,voltage,maker,technology,polarised,tolerance,surge voltage,derating,leakage,insulation,esr,esl,peak current,ripple current,slew,reversal,rated shots,life exponent,diameter,length,width,height,mass,price,price breaks,currency,pack,minimum order,on hand,available,supplier,order code,note,plate area,gap,permittivity,plates,breakdown field,measured,assumed`.split(
    ",",
  ),
);
const parts = CAPACITOR_FILES.flatMap((file) => records(`catalogs/${file}.csv`));

describe("catalogs/", () => {
  test("every file is a square table with known and distinct headings", () => {
    for (const file of CAPACITOR_FILES) {
      const heads = table(`catalogs/${file}.csv`)[0]!.map(name);
      expect(new Set(heads).size, file).toBe(heads.length);
      expect(
        heads.filter((head) => !CAPACITOR_COLUMNS.has(head)),
        file,
      ).toEqual([]);
    }
    for (const file of ["resistors", "fuses"]) expect(table(`catalogs/${file}.csv`).length, file).toBeGreaterThan(6);
  });

  test("at least 60 capacitors of at least 6 technologies, no name twice", () => {
    expect(parts.length).toBeGreaterThanOrEqual(60);
    const kinds = new Set(parts.map((part) => part.technology));
    for (const kind of [
      "photoflash electrolytic",
      "snap-in electrolytic",
      "screw-terminal electrolytic",
      "metallised film",
      "film-foil pulse",
      "oil-paper",
      "double-layer",
      "home-made plates",
    ])
      expect(kinds).toContain(kind);
    expect(new Set(parts.map((part) => part.part)).size).toBe(parts.length);
  });

  test("makers and suppliers are marked invented", () => {
    for (const part of parts) {
      expect(part.maker ?? "").toMatch(/^(|Invented Works [A-Z]|made in the lab)$/);
      expect(part.supplier ?? "").toMatch(/^(|Invented Supply (North|South))$/);
      expect(part.part).toMatch(/^(lab|drawer)-/);
    }
  });

  test("gaps are there on purpose: leakage, esr, esl, price and peak current each unknown somewhere", () => {
    for (const column of ["leakage [uA]", "esl [nH]", "peak current [A]", "price", "insulation [Mohm]"])
      expect(parts.filter((part) => part[column] === "").length, column).toBeGreaterThan(0);
  });

  test("measured and assumed name columns of their own file that are filled in that row", () => {
    for (const part of parts) {
      const filled = Object.entries(part).flatMap(([head, cell]) => (cell === "" ? [] : [name(head)]));
      const said = `${part.measured ?? ""};${part.assumed ?? ""}`.split(";").map((word) => word.trim());
      for (const word of said.filter((one) => one !== "")) expect(filled, part.part).toContain(word);
    }
  });
});

describe("fixtures/", () => {
  test("good catalogues: every file has the three parts of plain.csv", () => {
    for (const file of readdirSync(join(ROOT, "fixtures/catalogs/good"))) {
      const delimiter = file.startsWith("tab") ? "\t" : file.startsWith("semicolon") ? ";" : ",";
      const rows = table(`fixtures/catalogs/good/${file}`, delimiter);
      const column = rows[0]!.findIndex((head) => head.toLowerCase() === "part");
      expect(
        rows.slice(1).map((row) => row[column]),
        file,
      ).toEqual(["lab-one", "lab-two", "lab-three"]);
    }
  });

  test("crlf.csv, bom.csv and utf-16.csv still have the bytes they are named for", () => {
    expect(read("fixtures/catalogs/good/crlf.csv")).toContain("\r\n");
    expect(read("fixtures/catalogs/good/bom.csv").startsWith("\ufeff")).toBe(true);
    expect([...readFileSync(join(ROOT, "fixtures/catalogs/bad/utf-16.csv")).subarray(0, 2)]).toEqual([0xff, 0xfe]);
  });

  test("every fixture file is named in a README of its folder or the one above", () => {
    for (const [folder, page] of [
      ["briefs", "briefs"],
      ["briefs/impossible", "briefs"],
      ["units", "units"],
      ["catalogs/good", "catalogs"],
    ] as const) {
      const said = read(`fixtures/${page}/README.md`);
      const files = readdirSync(join(ROOT, "fixtures", folder)).filter((file) => /\.(csv|json)$/.test(file));
      expect(
        files.filter((file) => !said.includes(file)),
        folder,
      ).toEqual([]);
    }
  });

  test("units/lot-200.csv: 200 distinct serials within -10/+20 % of 330 uF; the gap and the twin are where the page says", () => {
    const lot = records("fixtures/units/lot-200.csv");
    expect(new Set(lot.map((unit) => unit.serial)).size).toBe(200);
    for (const unit of lot) {
      expect(Number(unit["capacitance [uF]"])).toBeGreaterThanOrEqual(297);
      expect(Number(unit["capacitance [uF]"])).toBeLessThanOrEqual(396);
    }
    expect(records("fixtures/units/lot-gap.csv")[73]).toMatchObject({ serial: "pf-074", "capacitance [uF]": "" });
    const twins = records("fixtures/units/lot-duplicate.csv");
    expect([twins[53]!.serial, twins[154]!.serial]).toEqual(["pf-054", "pf-054"]);
  });

  test("briefs: demo asks 991.735537 uF; every brief but those of bad/ has the three needed keys", () => {
    expect((2 * 2400) / 2200 ** 2).toBeCloseTo(991.735537e-6, 12);
    for (const folder of ["briefs", "briefs/impossible"]) {
      for (const file of readdirSync(join(ROOT, "fixtures", folder)).filter((one) => one.endsWith(".json"))) {
        expect(Object.keys(JSON.parse(read(`fixtures/${folder}/${file}`))), file).toEqual(
          expect.arrayContaining(["energy", "voltage", "ripple"]),
        );
      }
    }
  });

  test("published-banks.json: eight banks; capacitance, energy and units follow from the arrangement", () => {
    const { banks } = JSON.parse(read("fixtures/published-banks.json"));
    expect(banks.length).toBe(8);
    for (const bank of banks) {
      const capacitance = (bank.unit.capacitance * bank.parallel) / bank.series;
      expect(bank.expect.units, bank.id).toBe(bank.series * bank.parallel);
      expect(bank.expect.capacitance / capacitance, bank.id).toBeCloseTo(1, 8);
      expect(bank.expect.energy / ((capacitance * bank.charge ** 2) / 2), bank.id).toBeCloseTo(1, 8);
    }
  });
});

describe("bigCatalogue(rows, seed)", () => {
  test("bigCatalogue(0, 1) is a heading alone", () => expect(bigCatalogue(0, 1).split("\n").length).toBe(2));

  test("same seed same bytes, other seed other bytes", () => {
    expect(bigCatalogue(50, 3)).toBe(bigCatalogue(50, 3));
    expect(bigCatalogue(50, 3)).not.toBe(bigCatalogue(50, 4));
  });

  test("2000 rows: square, distinct names, known headings, positive values, gaps", () => {
    const rows = parse(bigCatalogue(2000, 5), { columns: true }) as Record<string, string>[];
    expect(rows.length).toBe(2000);
    expect(new Set(rows.map((row) => row.part)).size).toBe(2000);
    expect(Object.keys(rows[0]!).map(name)).toSatisfy((heads: string[]) =>
      heads.every((h) => CAPACITOR_COLUMNS.has(h)),
    );
    for (const row of rows) {
      expect(Number(row["capacitance [uF]"])).toBeGreaterThan(0);
      expect(Number(row.price)).toBeGreaterThan(0);
      expect(Number(row["diameter [mm]"] || "1")).toBeGreaterThan(0);
    }
    expect(rows.filter((row) => row["leakage [uA]"] === "" && row.polarised === "yes").length).toBeGreaterThan(0);
  });
});
