// Clamp diodes, where a dump may leave a unit reversed, with what each must stand.

import { formatQuantity } from "../quantity/index.ts";
import { type BankClamp, clampOf } from "../search/index.ts";
import type { BillLine } from "./bill.ts";
import { toBeChosen } from "./chosenLine.ts";
import type { OtherInput } from "./otherLines.ts";

const UP = { digits: 3, rounding: "up" } as const;

/** What one diode must stand; what is not known is said to be. */
function ratingOf({ reverseVoltage, surgeCurrent, action }: BankClamp): string {
  const blocks =
    reverseVoltage === null
      ? "reverse voltage not known"
      : `at least ${formatQuantity(reverseVoltage, "voltage", UP)} reverse`;
  if (surgeCurrent === null || action === null) return `${blocks}, surge current of the dump not known`;
  return `${blocks}, ${formatQuantity(surgeCurrent, "current", UP)} surge, ${formatQuantity(action, "action", UP)}`;
}

function limitWords({ through, surgeCurrent }: BankClamp): string {
  if (through === null || surgeCurrent === null) return " State the dump resistance to know surge and action integral.";
  if (through.kind === "dump resistor")
    return ` Surge through a dump resistor of ${formatQuantity(through.ohms, "resistance")}; a shot through the load may ask more.`;
  return " No dump resistance was stated: surge as the units' own ESR lets it; a lower ESR lets more through.";
}

/** A clamp diode across each stage or unit, where a dump may leave a unit reversed beyond its rating or beyond what is known. */
export function clampLines({ layout, unit, brief }: OtherInput): readonly BillLine[] {
  const clamp = clampOf({ result: layout, unit, brief, share: layout.share });
  if (clamp === null) return [];
  const where = layout.ties === "cross-tied" ? "stage" : "unit";
  const maybe = clamp.polarityKnown ? "" : " Needed if the unit is polarised; the catalogue does not say.";
  return [
    toBeChosen({
      item: "clamp diode",
      line: "clamp diodes",
      needed: clamp.count,
      rating: ratingOf(clamp),
      note: `One across each ${where}, cathode to the positive terminal.${limitWords(clamp)}${maybe}`,
    }),
  ];
}
