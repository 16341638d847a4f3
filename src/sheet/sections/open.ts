// Every blank of the sheet that a figure should stand in, gathered with what it blocks, so that none is passed over.

import type { SheetInput } from "../input.ts";
import { type Cell, type Section, type Table, text } from "../model.ts";

type Open = readonly [missing: string, blocks: string];

export function openPoints({ unit, brief, layout, shot, fuse, placed, words, earth }: SheetInput): readonly Open[] {
  const points: (Open | null)[] = [
    unit.tolerance === undefined
      ? ["tolerance of the unit", "worst shares, longest times, acceptance bands, energy at most"]
      : null,
    layout.series > 1 && layout.share.holding === null
      ? ["leakage or insulation of the unit", "worst unit while holding"]
      : null,
    unit.polarised === undefined
      ? ["polarity of the unit", "whether reverse voltage spoils it; taken as polarised"]
      : null,
    unit.esr === undefined ? ["ESR of the unit", "heat in the units, fault currents, fuses"] : null,
    unit.esl === undefined ? ["ESL of the unit", "fault currents"] : null,
    unit.ruptureEnergy === undefined ? ["energy that a case contains", "verdict on a shorted unit"] : null,
    unit.peakCurrent === undefined ? ["peak current of the unit", "whether the shot is borne"] : null,
    shot === null ? ["load in the brief", "peak current, reversal, conductors, life"] : null,
    brief.bus === undefined ? ["bus by its shape", "its inductance, its force in a fault"] : null,
    brief.charger === undefined ? ["charger in the brief", "charging time, highest rate, runaway voltage"] : null,
    brief.charger !== undefined && brief.charger.highest === undefined && brief.charger.supply === undefined
      ? ["highest voltage of the charger", "the fault of a charger that runs on"]
      : null,
    brief.dumpResistance === undefined ? ["dump resistance", "dump time and peak, surge of clamp diodes"] : null,
    layout.balance === null ? ["bleed resistor", "time to touch-safe without a hand"] : null,
    layout.balance?.assumed
      ? ["a resistor family that can be bought", "the balancing resistors are of an assumed family"]
      : null,
    fuse === null || fuse.chosen === null
      ? ["fuse of each unit or string", "what cuts a failed unit off; energy into it stands in the fault table"]
      : null,
    placed === null ? ["serials and measured capacitances", "tracing a unit; narrow acceptance bands"] : null,
    words.switch === null ? ["switch", "its drop, its current, whether it blocks reverse"] : null,
    earth === "unknown" ? ["earthed end", "potentials on the bank face"] : null,
    ["torque and lugs of the terminals", "the wiring list"],
    ["case potential of the units", "mounting and insulation"],
  ];
  return points.filter((point): point is Open => point !== null);
}

export function openSection(input: SheetInput): Section {
  const table: Table = {
    kind: "table",
    id: "open",
    caption: "Still open",
    columns: [
      { heading: "missing" },
      { heading: "blocks" },
      { heading: "settled as", written: true },
      { heading: "initials", written: true },
    ],
    rows: openPoints(input).map((point): readonly Cell[] => [...point, null, null]),
  };
  return {
    id: "open",
    title: "Open points",
    blocks: [text("What is not known is left blank on this sheet; nothing stands in for it."), table],
  };
}
