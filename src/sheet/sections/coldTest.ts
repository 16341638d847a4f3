// The record of the tests at no voltage: what must be found before anything is charged, its limits, and room for the reading.

import { cell, down, up } from "../cells.ts";
import type { SheetInput } from "../input.ts";
import { measuredOf } from "../measured.ts";
import { type Cell, type Section, type Table, text } from "../model.ts";
import { groupWord, positionsOf } from "../names.ts";

type Row = readonly [test: string, predicted: Cell, band: Cell];

const band = (low: number | null, high: number | null): Cell =>
  low === null || high === null ? null : `${down(low, "capacitance")} to ${up(high, "capacitance")}`;

/** Capacitance of each stage (cross-tied) or string, and of the bank, as it stands on the meter. */
function capacitances(input: SheetInput): readonly Row[] {
  const { layout, unit } = input;
  const word = groupWord(layout);
  const measured = measuredOf(input);
  if (measured !== null) {
    const row = (test: string, value: number): Row => [
      `capacitance of ${test}`,
      cell(value, "capacitance"),
      band(value * (1 - measured.doubt), value * (1 + measured.doubt)),
    ];
    return [...measured.groups.map((value, g) => row(`${word} ${g + 1}`, value)), row("the bank", measured.bank)];
  }
  const { ties, series, parallel, capacitance: c } = layout;
  const tied = ties === "cross-tied";
  const { tolerance } = unit;
  const nominal = tied ? unit.capacitance * parallel : unit.capacitance / series;
  // Without the tolerance there is no band to accept by.
  const limits = tolerance === undefined ? null : band(nominal * (1 - tolerance.low), nominal * (1 + tolerance.high));
  return [
    ...Array.from(
      { length: tied ? series : parallel },
      (_, g): Row => [`capacitance of ${word} ${g + 1}`, cell(nominal, "capacitance"), limits],
    ),
    ["capacitance of the bank", cell(c.nominal, "capacitance"), band(c.low, c.high)],
  ];
}

/** Each balancing position, read after the meter has settled: the units beside it charge through the meter first. */
function resistors({ layout }: SheetInput): readonly Row[] {
  const { balance } = layout;
  if (balance === null) return [];
  const { resistance, tolerance } = balance;
  const limits = `${down(resistance * (1 - tolerance), "resistance")} to ${up(resistance * (1 + tolerance), "resistance")}`;
  return positionsOf(layout, "RB").map(
    ({ name }): Row => [`resistance of ${name}`, cell(resistance, "resistance"), limits],
  );
}

export function coldTestSection(input: SheetInput): Section {
  const { unit } = input;
  const polarity: Row[] =
    unit.polarised === false
      ? []
      : [["polarity of every unit, by a second person", "every + to the bar above it", "no exception"]];
  const rows: readonly Row[] = [
    ["bank shorted and strapped before work", "0 V on every unit", "0 V"],
    ...polarity,
    ["continuity of every joint on the wiring list", null, null],
    ["insulation, bars to frame, at full voltage", null, null],
    ...capacitances(input),
    ...resistors(input),
    ["dump resistance, relay closed", cell(input.brief.dumpResistance, "resistance"), null],
    ["dump closes when its power fails", "closes", "no exception"],
    ["dump closes when the interlock opens", "closes", "no exception"],
    ["charger stays off while the interlock is open", "stays off", "no exception"],
    ["meter and divider read a known voltage", null, null],
    ["earthing stick: resistor and continuity", null, null],
    ["screen, signs, key and second person in place", "in place", "no exception"],
  ];
  const table: Table = {
    kind: "table",
    id: "cold-test",
    caption: "Cold-test record",
    columns: [
      { heading: "test" },
      { heading: "predicted", side: "right" },
      { heading: "accepted", side: "right" },
      { heading: "reading", written: true },
      { heading: "good?", written: true },
      { heading: "initials", written: true },
    ],
    rows: rows.map((row) => [...row, null, null, null]),
  };
  return {
    id: "cold-test",
    title: "Cold tests, at no voltage",
    ownPage: true,
    blocks: [
      text(
        "Every row is done and signed before anything is charged. A resistance read beside capacitors is true only once the meter has settled. Blank limits are those of the meter, the standard or the maker: fill them in first; a test without a limit cannot pass. Bands of measured capacitances allow for the gain of the list's meter and of the one that reads (0.3 % each, assumed).",
      ),
      table,
    ],
  };
}
