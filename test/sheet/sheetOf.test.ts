import { describe, expect, test } from "vitest";
import type { Capacitor } from "../../src/catalog/index.ts";
import { sheetOf, sheetText } from "../../src/sheet/index.ts";
import fc from "../support/property.ts";
import { LOAD, largeInput, placedIn, RATED, sheetInput } from "../support/sheet.ts";

/** Everything that is printed as text of a sheet. */
const printed = (sheet: ReturnType<typeof sheetOf>): readonly string[] =>
  sheet.sections.flatMap(({ blocks }) =>
    blocks.flatMap((block) => {
      if (block.kind === "text") return [block.text];
      if (block.kind === "list") return [...block.items];
      if (block.kind === "drawing") return [block.words];
      return [
        block.caption,
        ...block.columns.map(({ heading }) => heading),
        ...block.rows.flat().filter((cell) => cell !== null),
      ];
    }),
  );

const SHEETS = [
  sheetInput(),
  sheetInput({ brief: { ...LOAD, dumpResistance: "1 kohm" }, rule: "nfpa-70e-360" }),
  sheetInput({ shape: { ties: "strings" }, brief: LOAD }),
  sheetInput({ shape: { series: 1, parallel: 1, ties: "strings" }, brief: { voltage: "300 V", energy: "10 J" } }),
  largeInput(),
].map((input) => [input.layout.id, input] as const);

describe("sheetOf(input)", () => {
  test.each(SHEETS)("%s: every section once, rows as wide as their table, no number that is none", (_, input) => {
    for (const given of [input, { ...input, placed: placedIn(input) }]) {
      const sheet = sheetOf(given);
      const ids = sheet.sections.map(({ id }) => id);
      expect(new Set(ids).size).toBe(ids.length);
      const tables = sheet.sections.flatMap(({ blocks }) => blocks).filter((block) => block.kind === "table");
      expect(new Set(tables.map(({ id }) => id)).size).toBe(tables.length);
      for (const table of tables)
        expect(table.rows.filter((row) => row.length !== table.columns.length).map((row) => [table.id, row])).toEqual(
          [],
        );
      expect(printed(sheet).filter((words) => /NaN|undefined|Infinity|\[object|unlimited|null/.test(words))).toEqual(
        [],
      );
    }
  });

  test("same input, same sheet; date and revision only when they are given", () => {
    const input = sheetInput({ brief: LOAD });
    expect(JSON.stringify(sheetOf(input))).toBe(JSON.stringify(sheetOf(input)));
    expect(sheetOf(input)).toMatchObject({ date: null, revision: null });
    expect(sheetOf({ ...input, date: "d", revision: "r" })).toMatchObject({ date: "d", revision: "r" });
  });

  test("the cautions all stand at the head, and those of every page in the footer", () => {
    const sheet = sheetOf(sheetInput());
    expect(sheet.cautions).toHaveLength(4);
    expect(sheet.footer).toEqual(["A charged bank can kill.", "This is a calculation.", "Follow the codes in force."]);
  });

  test("the rule that governs is named on the sheet", () => {
    expect(sheetOf(sheetInput()).rule).toBe("the brief's touch-safe voltage");
    expect(sheetOf(sheetInput({ brief: { touchSafeRule: "house rule 7" } })).rule).toMatch(/\(house rule 7\)$/);
    expect(sheetOf(sheetInput({ rule: "nec-460-6" })).rule).toMatch(/^NEC \(NFPA 70\) 460\.6, second hand$/);
  });
});

describe("whatever is known and whatever is not", () => {
  /** Keys that a catalogue may lack. */
  const OPTIONAL = [
    "technology",
    "polarised",
    "tolerance",
    "leakage",
    "esr",
    "esl",
    "peakCurrent",
    "reversal",
    "ruptureEnergy",
    "diameter",
    "price",
    "currency",
  ] as const;
  const known = fc.subarray([...OPTIONAL]);
  const keys = fc.record(
    {
      dumpResistance: fc.constantFrom("1 ohm", "10 kohm"),
      hold: fc.constantFrom("0 s", "30 s"),
      overshoot: fc.constantFrom("0 %", "5 %"),
      charger: fc.constantFrom({ current: "10 mA" }, { supply: "9 kV", resistance: "1 kohm" }),
      load: fc.constantFrom(LOAD.load, { short: true }, { resistance: "10 ohm" }),
      isolating: fc.constant("10 mohm"),
      rate: fc.constant("0.1 Hz"),
      spares: fc.nat(20),
    },
    { requiredKeys: [] },
  );
  const shape = fc.record({
    series: fc.integer({ min: 1, max: 7 }),
    parallel: fc.integer({ min: 1, max: 5 }),
    ties: fc.constantFrom("cross-tied" as const, "strings" as const),
  });

  test("a sheet is made: rows as wide as their tables, no number that is none, the same in both formats", () => {
    fc.assert(
      fc.property(
        known,
        keys,
        shape,
        fc.boolean(),
        fc.constantFrom(null, "nfpa-70e-360", "iec-60335-charge"),
        (has, brief, form, measured, rule) => {
          const unit = Object.fromEntries(
            Object.entries(RATED).filter(
              ([key]) => !(OPTIONAL as readonly string[]).includes(key) || has.includes(key as never),
            ),
          ) as unknown as Capacitor;
          const voltage = `${240 * form.series} V`;
          const bare = sheetInput({
            unit,
            shape: form,
            brief: { ...brief, voltage, energy: "1 J" },
            rule: rule as null,
          });
          const sheet = sheetOf(measured ? { ...bare, placed: placedIn(bare) } : bare);
          const tables = sheet.sections.flatMap(({ blocks }) => blocks).filter((block) => block.kind === "table");
          for (const { id, rows, columns } of tables)
            for (const row of rows) if (row.length !== columns.length) throw new Error(`${id}: ${row.join()}`);
          expect(
            printed(sheet).filter((words) => /NaN|undefined|Infinity|\[object|unlimited|\bnull\b/.test(words)),
          ).toEqual([]);
          const html = sheetText(sheet, "html");
          expect(html).not.toMatch(/NaN|undefined|Infinity|\[object/);
          expect(html.match(/<table/g)).toHaveLength(tables.length + 1);
          expect(sheetText(sheet, "md")).not.toMatch(/NaN|undefined|Infinity/);
        },
      ),
      { numRuns: 25 },
    );
  }, 30_000);
});
