// The record of the tests under voltage: at each step what every stage or unit should read, the band accepted, and room for the reading.

import { roundTo } from "../../quantity/index.ts";
import { cell, up } from "../cells.ts";
import type { SheetInput } from "../input.ts";
import { type Cell, list, type Section, type Table, text } from "../model.ts";
import { unitName } from "../names.ts";
import { METER, predictedShares, STEPS } from "../predict.ts";

const percent = (step: number): string => `${Math.round(step * 100)} %`;

/** Volts on paper: as many places as a handheld meter shows, the band never narrower than computed. */
const volts = (value: number, side: "up" | "down"): string => {
  const rounded = side === "up" ? Math.ceil(value * 10 - 1e-9) / 10 : Math.floor(value * 10 + 1e-9) / 10;
  return rounded.toFixed(1);
};

/** Of the measured units in their places; the worst case of the tolerance stands beside it, as nobody may forget it where leakage was not measured. */
function holdingWords({ layout, placed }: SheetInput): string {
  const whole = up(layout.share.holding, "voltage");
  const worst = `the worst unit while holding is predicted at ${whole ?? "______ (leakage or tolerance not known)"}`;
  if (placed === null) return worst;
  const here = up(placed.holding, "voltage");
  return here === null
    ? `${worst}, by the whole tolerance: leakage was not measured on every unit`
    : `the worst unit while holding, of the measured units in their places, is predicted at ${here}`;
}

export function hotTestSection(input: SheetInput): Section {
  const { layout, brief, placed } = input;
  const rows = predictedShares(input);
  const tied = layout.ties === "cross-tied";
  const at = (step: number): number => brief.voltage * step;
  const table: Table = {
    kind: "table",
    id: "hot-test",
    caption: `Hot-test record: ${tied ? "stage" : "unit"} voltages in volts, accepted band and reading`,
    columns: [
      { heading: tied ? "stage" : "unit" },
      ...STEPS.flatMap((step) => [
        { heading: `${percent(step)}: accepted`, side: "right" as const },
        { heading: `${percent(step)}: read`, written: true as const },
      ]),
    ],
    rows: rows.map(({ spot, low, high }): readonly Cell[] => [
      spot.place === null ? `stage ${spot.group}` : unitName({ group: spot.group, place: spot.place }),
      ...STEPS.flatMap((step) => [
        low === null || high === null
          ? null
          : `${volts(Math.max(0, low * at(step) - METER.absolute), "down")} to ${volts(high * at(step) + METER.absolute, "up")}`,
        null,
      ]),
    ]),
  };
  const steps: Table = {
    kind: "table",
    id: "hot-steps",
    caption: "Steps",
    columns: [
      { heading: "step" },
      { heading: "bank", side: "right" },
      { heading: tied ? "stage, predicted on average" : "unit, predicted on average", side: "right" },
      { heading: "held for", written: true },
      { heading: "charging current read", written: true },
      { heading: "bleed-down read", written: true },
      { heading: "dump good?", written: true },
      { heading: "initials", written: true },
    ],
    rows: STEPS.map((step): readonly Cell[] => [
      percent(step),
      cell(at(step), "voltage"),
      `${roundTo(at(step) / layout.series, 4)} V`,
      null,
      null,
      null,
      null,
      null,
    ]),
  };
  return {
    id: "hot-test",
    title: "Hot tests, step by step",
    ownPage: true,
    blocks: [
      text(
        `Charge to a step, read every row, dump, and go on only when every reading lies in its band. ${placed === null ? "The bands are those of the whole tolerance: the units were not measured." : "The bands follow from the measured capacitances in their places."} They hold right after the charge, and allow ${METER.relative * 100} % and ${METER.absolute} V for the meter (assumed: a handheld one).`,
      ),
      list([
        "A reading out of its band ends the test: dump, short, and find out why. The commission command reads the readings and says which unit is suspect.",
        `No unit may pass ${cell(layout.share.limit, "voltage", "down")}, whatever its band says.`,
        "Then a ring test into a known load, and the real load at the lowest step first. Predicted and measured figures stand side by side among the ten figures.",
        `Hold at 100 %: ${Number.isFinite(brief.hold) ? cell(brief.hold, "time") : "until nothing moves any more"}; ${holdingWords(input)}.`,
      ]),
      steps,
      table,
    ],
  };
}
