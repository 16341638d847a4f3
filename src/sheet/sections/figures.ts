// The ten figures that a reviewer or safety officer asks for first, each with its limit, or a blank that says what is missing.
//
// Source: [practice-5b] list of what settles a reviewer: common practice, no source.

import { cell, said, wait } from "../cells.ts";
import { factsOf } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import { type Cell, type Section, type Table, text } from "../model.ts";
import { waysDown } from "../ways.ts";
import { dangerFigures, type FigureRow } from "./figuresDanger.ts";
import { dutyFigures } from "./figuresDuty.ts";

function compared(input: SheetInput): readonly FigureRow[] {
  const { layout, shot, brief } = input;
  const facts = factsOf(input);
  const { balance } = layout;
  const chain = balance === null ? null : balance.resistance * layout.series;
  const nominal = { ...facts, capacitance: layout.capacitance.nominal, chain };
  const ways = waysDown(nominal, { from: brief.voltage, to: brief.touchSafe });
  const esl = shot === null || shot.bank.esl === null ? null : shot.bank.esl + (shot.bus.path?.inductance ?? 0);
  const row = (figure: string, value: Cell): FigureRow => ["9", `${figure}, predicted`, value, "read: ______"];
  return [
    row("capacitance", cell(layout.capacitance.nominal, "capacitance")),
    row("inductance of bank and bus", cell(esl, "inductance")),
    row("resistance of the bank", cell(shot?.bank.esr, "resistance")),
    row("peak current", cell(shot?.discharge.peakCurrent, "current")),
    row(
      `bleed time to ${said(cell(brief.touchSafe, "voltage"))}, nominal values`,
      facts.chain === null ? "no chain" : wait(ways.chains),
    ),
  ];
}

export function figuresSection(input: SheetInput): Section {
  const rows: readonly FigureRow[] = [
    ...dangerFigures(input),
    ...dutyFigures(input),
    ...compared(input),
    [
      "10",
      "rule that governs",
      factsOf(input).rule,
      input.rule === null ? "no rule was chosen" : "the user's choice; every other rule stands in the hazard file",
    ],
  ];
  const sorted = [...rows].sort((a, b) => Number(a[0]) - Number(b[0]));
  const table: Table = {
    kind: "table",
    id: "ten-figures",
    caption: "The ten figures",
    columns: [
      { heading: "no." },
      { heading: "figure" },
      { heading: "value" },
      { heading: "against, or what is missing" },
    ],
    rows: sorted,
  };
  return {
    id: "ten-figures",
    title: "Ten figures for the reviewer",
    blocks: [
      text(
        "A blank value is open, never passed. Predicted and read figures within 5 % to 10 % of each other are taken as understood (common practice, no source).",
      ),
      table,
    ],
  };
}
