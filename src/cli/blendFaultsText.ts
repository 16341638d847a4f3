// The faults of a blend as text: group by group, with what the other groups bring, and what stops them.

import { visible } from "../order/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import type { BlendFault } from "../search/index.ts";
import { VERDICTS } from "./findingWords.ts";
import { textTable } from "./table.ts";
import { bullet } from "./wrap.ts";

const UP = { digits: 4, rounding: "up" } as const;
const named = ({ id }: BlendFault): string => id.replaceAll("-", " ");

/** A table of figures, rounded up, then each way of stopping once. */
export function blendFaultsText(faults: readonly BlendFault[], width: number): string {
  const table = textTable<BlendFault>(
    [
      { heading: "verdict", cell: (one) => VERDICTS[one.verdict] },
      { heading: "group", cell: (one) => one.part, least: 12 },
      { heading: "fault", cell: named, least: 12 },
      { heading: "sound unit", cell: (one) => formatQuantity(one.worstVoltageSpread, "voltage", UP), side: "right" },
      { heading: "after the hold", cell: (one) => formatQuantity(one.worstHeld, "voltage", UP), side: "right" },
      {
        heading: "into the unit",
        cell: (one) => formatQuantity(one.energyIntoUnit, "energy", UP),
        side: "right",
        rank: 2,
      },
      { heading: "both at most", cell: (one) => formatQuantity(one.energyWorst, "energy", UP), side: "right" },
      { heading: "of it others", cell: (one) => formatQuantity(one.fromOthers, "energy", UP), side: "right", rank: 1 },
    ],
    faults,
    width,
    "  ",
  );
  const open = faults.filter(({ verdict }) => verdict !== "pass").map((one) => `${named(one)}: ${visible(one.stops)}`);
  return [table, ...[...new Set(open)].map((line) => bullet(line, width))].join("\n");
}
