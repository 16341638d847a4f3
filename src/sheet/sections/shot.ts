// The shot: its figures with their spread, and its course; or why none can be reckoned.

import { cell, up } from "../cells.ts";
import { shotChart } from "../charts.ts";
import type { SheetInput } from "../input.ts";
import { list, type Section, type Table, text } from "../model.ts";

export function shotSection(input: SheetInput): Section {
  const { shot, shotOpen } = input;
  const head = { id: "shot", title: "The shot" } as const;
  if (shot === null)
    return {
      ...head,
      blocks: [
        text(
          `No shot is reckoned: ${shotOpen ?? "no load was given"}. It blocks peak current, reversal, heat in the units, conductors, life, and the choice of switch and fuses.`,
        ),
      ],
    };
  const { envelope, discharge } = shot;
  const row = (
    name: string,
    key: "peakCurrent" | "peakTime" | "reversal" | "action",
    dimension: "current" | "time" | "fraction" | "action",
  ) => {
    const { low, nominal, high } = envelope[key];
    return [name, cell(low, dimension, "down"), cell(nominal, dimension), up(high, dimension)];
  };
  const figures: Table = {
    kind: "table",
    id: "shot-figures",
    caption: `The shot from ${cell(shot.voltage, "voltage")}`,
    columns: [
      { heading: "figure" },
      { heading: "low", side: "right" },
      { heading: "nominal", side: "right" },
      { heading: "high", side: "right" },
    ],
    rows: [
      row("peak current", "peakCurrent", "current"),
      row("time of the peak", "peakTime", "time"),
      row("reversal", "reversal", "fraction"),
      row("action integral", "action", "action"),
    ],
  };
  const { energy } = discharge;
  const balance: Table = {
    kind: "table",
    id: "shot-energy",
    caption: "Where the energy goes",
    columns: [{ heading: "where" }, { heading: "energy", side: "right" }],
    rows: [
      ["stored", cell(energy.stored, "energy")],
      ["load", cell(energy.load, "energy")],
      ["units' own resistance", cell(energy.bank, "energy")],
      ["isolating resistors", cell(energy.isolating, "energy")],
      ["bus", cell(energy.bus, "energy")],
      ["switch", cell(energy.switch, "energy")],
      ["clamp", cell(energy.clamp, "energy")],
      ["left in the bank", cell(energy.left, "energy")],
    ],
  };
  const chart = shotChart(input);
  const bounds = Object.entries(discharge.bounds).flatMap(([name, bound]) =>
    bound === "value"
      ? []
      : [
          `${name.replace(/[A-Z]/g, (c) => ` ${c.toLowerCase()}`)} is ${bound === "upper bound" ? "an upper bound" : `a ${bound}`}`,
        ],
  );
  return {
    ...head,
    blocks: [
      figures,
      ...(chart === null ? [] : [chart]),
      balance,
      ...(bounds.length + shot.notes.length > 0 ? [list([...bounds, ...shot.notes])] : []),
    ],
  };
}
