// Clamp diodes, where a dump may leave a unit reversed.

import { formatQuantity } from "../quantity/index.ts";
import type { BillLine } from "./bill.ts";
import { toBeChosen } from "./chosenLine.ts";
import { countsOf } from "./counts.ts";
import type { OtherInput } from "./otherLines.ts";

/** A clamp diode across each stage or unit, where a dump may leave a unit reversed beyond its rating or beyond what is known. */
export function clampLines({ layout, unit }: OtherInput): readonly BillLine[] {
  const finding = layout.findings.find((f) => f.id === "reverse-after-dump");
  const fine = finding === undefined || finding.verdict === "pass";
  if (fine || unit.polarised === false || layout.series === 1) return [];
  const { charging, holding, limit } = layout.share;
  const stands = Math.max(charging ?? limit, holding ?? limit);
  const where = layout.ties === "cross-tied" ? "stage" : "unit";
  const maybe = unit.polarised === undefined ? " Needed if the unit is polarised; the catalogue does not say." : "";
  return [
    toBeChosen({
      item: "clamp diode",
      line: "clamp diodes",
      needed: countsOf(layout).groups,
      rating: `at least ${formatQuantity(stands, "voltage", { digits: 3, rounding: "up" })} reverse, surge current of the dump`,
      note: `One across each ${where}, cathode to the positive terminal.${maybe}`,
    }),
  ];
}
