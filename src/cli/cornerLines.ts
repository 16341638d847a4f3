// The corner behind each worst case, a line each.

import { formatQuantity } from "../quantity/index.ts";
import { type BankCorners, type CornerFact, heldWords } from "../search/index.ts";
import { hanging } from "./layoutText.ts";

/** Labels and texts; what is not assessed is left to its finding. */
export function cornerLines(
  { charging, holding, dumped, dumpedFromHold }: BankCorners,
  width: number,
): readonly string[] {
  const volts = (x: number): string => formatQuantity(x, "voltage", { rounding: x < 0 ? "down" : "up" });
  const line = (label: string, fact: CornerFact | null, when = ""): readonly string[] =>
    fact === null ? [] : [hanging(label, `${volts(fact.voltage)}${when}: ${fact.words}`, width)];
  const when =
    holding === null || holding.hold === 0
      ? ", at its start"
      : holding.hold === Number.POSITIVE_INFINITY
        ? ", in the end"
        : `, after ${formatQuantity(holding.hold, "time", { digits: 3 })}`;
  const worse = dumpedFromHold !== null && dumped !== null && dumpedFromHold.voltage < dumped.voltage;
  return [
    ...line("worst, charging", charging),
    ...line("worst, holding", holding, when),
    ...line("worst, dumped", dumped, " from equal sharing"),
    ...(worse ? line("worst, dumped", dumpedFromHold, ` from ${heldWords(dumpedFromHold.hold)}`) : []),
  ];
}
