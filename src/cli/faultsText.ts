// The fault table of one bank as text: what one failure does to the sound units, and what stops it.

import { visible } from "../order/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import { VERDICTS } from "./findingWords.ts";
import type { joinedFacts } from "./joined.ts";
import { textTable } from "./table.ts";
import { bullet } from "./wrap.ts";

type Faults = ReturnType<typeof joinedFacts>["faults"];

/** What the isolating resistors take of a fault, where the short's own resistance tells the split. */
function isolatingLine({ id, energyIntoIsolating: taken }: Faults[number], width: number): readonly string[] {
  if (!taken) return [];
  const joules = (x: number): string => formatQuantity(x, "energy", { digits: 4 });
  const words = `isolating resistors take ${joules(taken.faulted)} in the failed unit's leg and ${joules(taken.others)} in all the others`;
  return [bullet(`${id.replaceAll("-", " ")}: ${words}`, width)];
}

/** What ends in a shorted unit: its own, what the others pour in, and both at the worst; none where no unit is shorted alone. */
function joulesLine(fault: Faults[number], width: number): readonly string[] {
  if (fault.id !== "unit-short") return [];
  const joules = (x: number | null): string => formatQuantity(x, "energy", { digits: 4, rounding: "up" });
  const parts = `its own ${joules(fault.energyOwn)}, ${joules(fault.energyIntoUnit)} from others`;
  return [
    bullet(`unit short: ${parts}; both at most ${joules(fault.energyWorst)}, every unit at high capacitance`, width),
  ];
}

/** A table of figures, then what stops each fault that does not pass. Figures round up. */
export function faultsText(faults: Faults, width: number): string {
  const up = { digits: 4, rounding: "up" } as const;
  const table = textTable<Faults[number]>(
    [
      { heading: "verdict", cell: (one) => VERDICTS[one.verdict] },
      { heading: "fault", cell: (one) => one.id.replaceAll("-", " "), least: 12 },
      { heading: "sound unit", cell: (one) => formatQuantity(one.worstVoltageSpread, "voltage", up), side: "right" },
      { heading: "after the hold", cell: (one) => formatQuantity(one.worstHeld, "voltage", up), side: "right" },
      {
        heading: "into the unit",
        cell: (one) => formatQuantity(one.energyIntoUnit, "energy", up),
        side: "right",
        rank: 2,
      },
      { heading: "both at most", cell: (one) => formatQuantity(one.energyWorst, "energy", up), side: "right" },
      {
        heading: "peak",
        cell: (one) => formatQuantity(one.peakCurrentWorst ?? one.peakCurrent, "current", up),
        side: "right",
        rank: 1,
      },
    ],
    faults,
    width,
    "  ",
  );
  const stops = faults
    .filter((one) => one.verdict !== "pass")
    .map((one) => bullet(`${one.id.replaceAll("-", " ")}: ${visible(one.stops)}`, width));
  return [table, ...faults.flatMap((one) => [...joulesLine(one, width), ...isolatingLine(one, width)]), ...stops].join(
    "\n",
  );
}
