// The ranked layouts as a table: the columns that matter most stay when the terminal is narrow.

import { formatQuantity } from "../quantity/index.ts";
import type { LayoutResult } from "../search/index.ts";
import { VERDICTS } from "./findingWords.ts";
import { costWords } from "./layoutText.ts";
import { textTable } from "./table.ts";

/** One row a layout, indented by two. The energy is the least by the tolerance, or `placedEnergy` (J) of the units themselves where it is known. */
export function rankedTable(
  layouts: readonly LayoutResult[],
  width: number,
  placedEnergy: ReadonlyMap<string, number> = new Map(),
): string {
  const worst = (one: LayoutResult): string => {
    const { charging, holding, limit } = one.share;
    if (charging === null || holding === null) return "not assessed";
    return formatQuantity(Math.max(charging, holding) / limit, "fraction", { digits: 3, rounding: "up" });
  };
  const checks = (one: LayoutResult): string => {
    const worstFirst = ["fail", "warn", "not assessed"] as const;
    const found = worstFirst.find((verdict) => one.findings.some((f) => f.verdict === verdict));
    return found === undefined ? "pass" : found === "not assessed" ? "open" : VERDICTS[found];
  };
  return textTable<LayoutResult>(
    [
      { heading: "#", cell: (_, i) => String(i + 1), side: "right" },
      { heading: "part", cell: (one) => one.part, least: 14 },
      { heading: "shape", cell: (one) => `${one.series}s${one.parallel}p` },
      { heading: "ties", cell: (one) => one.ties },
      { heading: "units", cell: (one) => String(one.units), side: "right" },
      { heading: "cost", cell: costWords, side: "right" },
      {
        heading: placedEnergy.size > 0 ? "energy placed" : "energy",
        cell: (one) =>
          formatQuantity(placedEnergy.get(one.id) ?? one.energy.low, "energy", { digits: 4, rounding: "down" }),
        side: "right",
        rank: 3,
      },
      { heading: "worst", cell: worst, side: "right", rank: 1 },
      { heading: "checks", cell: checks, rank: 1 },
      { heading: "volume", cell: (one) => formatQuantity(one.volume, "volume", { digits: 3 }), side: "right", rank: 4 },
      { heading: "mass", cell: (one) => formatQuantity(one.mass, "mass", { digits: 3 }), side: "right", rank: 5 },
      {
        heading: "bleed",
        cell: (one) =>
          one.bleed.seconds === null
            ? "none"
            : formatQuantity(one.bleed.seconds, "time", { digits: 3, rounding: "up" }),
        side: "right",
        rank: 6,
      },
      {
        heading: "balancing",
        cell: (one) =>
          one.balance === null ? "none" : formatQuantity(one.balance.resistance, "resistance", { digits: 4 }),
        side: "right",
        rank: 7,
      },
    ],
    layouts,
    width,
    "  ",
  );
}
