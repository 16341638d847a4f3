// The ten figures that a reviewer or safety officer asks for first, each with its limit, or a blank that says what is missing.
//
// Source: [practice-5b] list of what settles a reviewer: common practice, no source.

import { shotOf } from "../../search/index.ts";
import { cell, said, wait } from "../cells.ts";
import { factsOf } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import { measuredOf } from "../measured.ts";
import { type Cell, type Section, type Table, text } from "../model.ts";
import { waysDown } from "../ways.ts";
import { dangerFigures, type FigureRow } from "./figuresDanger.ts";
import { dutyFigures } from "./figuresDuty.ts";

/** Peak of the shot, A, at the capacitance that the bank is taken to have; null without a shot. */
function firedAt({ layout, unit, brief, shot }: SheetInput, bank: number): number | null {
  if (shot === null) return null;
  if (bank === layout.capacitance.nominal) return shot.discharge.peakCurrent;
  const fired = shotOf({ layout, brief, unit: { ...unit, capacitance: (bank * layout.series) / layout.parallel } });
  return fired.ok ? fired.value.discharge.peakCurrent : null;
}

/** Of the units' ESR, ohm, also where no load is in the brief; null when it is not known. Source: [textbook] p equal branches of n. */
const bankEsr = ({ layout, unit, shot }: SheetInput): number | null =>
  shot?.bank.esr ?? (unit.esr === undefined ? null : (unit.esr * layout.series) / layout.parallel);

function compared(input: SheetInput): readonly FigureRow[] {
  const { layout, shot, brief } = input;
  const measured = measuredOf(input);
  const capacitance = measured?.bank ?? layout.capacitance.nominal;
  const by = measured === null ? "predicted" : "predicted from the measured units";
  const facts = factsOf(input);
  const { balance } = layout;
  const chain = balance === null ? null : balance.resistance * layout.series;
  const nominal = { ...facts, capacitance, chain };
  const ways = waysDown(nominal, { from: brief.voltage, to: brief.touchSafe });
  const esl = shot === null || shot.bank.esl === null ? null : shot.bank.esl + (shot.bus.path?.inductance ?? 0);
  const row = (figure: string, value: Cell, how = "predicted"): FigureRow => [
    "9",
    `${figure}, ${how}`,
    value,
    "read: ______",
  ];
  return [
    row("capacitance", cell(capacitance, "capacitance"), by),
    row("inductance of bank and bus", cell(esl, "inductance")),
    row("resistance of the bank", cell(bankEsr(input), "resistance")),
    row("peak current", cell(firedAt(input, capacitance), "current"), by),
    row(
      `bleed time to ${said(cell(brief.touchSafe, "voltage"))}, ${measured === null ? "nominal values" : "measured capacitance, nominal resistors"}`,
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
