// The sums of a bill: priced lines alone, in one currency; what they leave out is listed.

import { minorDigits, tenTo } from "../quantity/index.ts";
import type { BillLine, Totals } from "./bill.ts";

export interface TotalsInput {
  readonly lines: readonly BillLine[];
  /** Currency of the sums; null when nothing is priced. */
  readonly currency: string | null;
  /** Units of `currency` for one unit of another. */
  readonly exchange?: Readonly<Record<string, number>> | undefined;
}

const named = (line: BillLine): string => (line.line === "spares" ? `${line.item} (spares)` : line.item);

/** Sums in whole minor units, so that no cent is lost to binary fractions. A line in a currency without a rate counts as unpriced. */
export function totalsOf({ lines, currency, exchange }: TotalsInput): Totals {
  const unpriced: string[] = [];
  let purchase = 0;
  let consumed = 0;
  let pricedLines = 0;
  const scale = tenTo(minorDigits(currency ?? ""));
  for (const line of lines) {
    const rate = line.currency === null ? undefined : line.currency === currency ? 1 : exchange?.[line.currency];
    if (line.purchase === null || rate === undefined || currency === null) {
      unpriced.push(named(line));
      continue;
    }
    pricedLines++;
    purchase += Math.round(line.purchase * rate * scale);
    consumed += Math.round((line.consumed ?? 0) * rate * scale);
  }
  const none = pricedLines === 0;
  return {
    purchase: none ? null : purchase / scale,
    consumed: none ? null : consumed / scale,
    currency: none ? null : currency,
    pricedLines,
    unpriced,
  };
}
