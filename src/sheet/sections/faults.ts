// The fault table: for each thing that can go wrong, the worst volts, amperes and joules, and what stops it.

import { up } from "../cells.ts";
import type { SheetInput } from "../input.ts";
import { type Cell, list, type Section, type Table, text } from "../model.ts";

export function faultSection({ faults, unit, fuse }: SheetInput): Section {
  const table: Table = {
    kind: "table",
    id: "faults",
    caption: "If one thing fails",
    columns: [
      { heading: "fault" },
      { heading: "verdict" },
      { heading: "sound unit, worst", side: "right" },
      { heading: "after the hold", side: "right" },
      { heading: "peak", side: "right" },
      { heading: "into one unit", side: "right" },
      { heading: "its own", side: "right" },
      { heading: "both at most", side: "right" },
      { heading: "what stops it" },
      { heading: "remark" },
    ],
    rows: faults.map((f): readonly Cell[] => {
      const peak = up(f.peakCurrentWorst ?? f.peakCurrent, "current");
      return [
        f.id.replaceAll("-", " "),
        f.verdict,
        up(f.worstVoltageSpread, "voltage"),
        up(f.worstHeld, "voltage"),
        peak === null || f.peakIs === "value" ? peak : `${peak} (${f.peakIs})`,
        up(f.energyIntoUnit, "energy"),
        up(f.energyOwn, "energy"),
        up(f.energyWorst, "energy"),
        f.stops,
        f.note,
      ];
    }),
  };
  const open = [
    ...(unit.ruptureEnergy === undefined
      ? [
          "The energy that a unit's case contains is not known: whether a shorted unit bursts is not assessed. Treat it as if it did: a screen, and nobody in line with it.",
        ]
      : []),
    ...(unit.esr === undefined || unit.esl === undefined
      ? ["ESR or ESL of the unit is not known: peaks are upper bounds, or blank where nothing known limits them."]
      : []),
    ...(fuse === null ? ["No fuse catalogue was given: nothing is judged that would cut a failed unit off."] : []),
  ];
  return {
    id: "faults",
    title: "Faults",
    blocks: [
      text(
        "Judged by the unit's rated, then its surge voltage, and by what its case contains. A blank is not known, and not a pass.",
      ),
      table,
      ...(open.length > 0 ? [list(open)] : []),
    ],
  };
}
