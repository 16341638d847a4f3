// The currency of a plan, and the prices of parts and resistors brought into it by the brief's rates.

import { isPriced, type PurchaseTerms } from "../catalog/index.ts";
import { accepted, minorDigits, type Read, refused, tenTo } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";

/** Decimals in which a price without a currency was read. */
const PLAIN_DIGITS = minorDigits("");

/** The currency of a plan: the brief's, else the only one in the catalogues. Two without a rate are refused. */
export function planCurrency(
  brief: Brief,
  parts: readonly PurchaseTerms[],
  families: readonly PurchaseTerms[],
): Read<string | null> {
  const seen = new Set<string>();
  let priced = false;
  for (const list of [parts, families]) {
    for (const terms of list) {
      if (!isPriced(terms)) continue;
      priced = true;
      if (terms.currency !== undefined) seen.add(terms.currency);
    }
  }
  const currency = brief.currency ?? [...seen][0] ?? (priced ? "EUR" : null);
  const foreign = [...seen].filter((code) => code !== currency && brief.exchange?.[code] === undefined);
  if (foreign.length === 0) return accepted(currency);
  return refused({
    code: "two-currencies",
    place: { field: "currency" },
    read: `prices in ${[...new Set([currency, ...seen])].sort().join(" and ")}`,
    want: `one currency, or a rate in the brief such as "currency": "${currency}", "exchange": {"${foreign[0]}": 0.92}`,
  });
}

/** The same things with their prices in the plan's currency; what is in it already is left as it is. */
export function pricedIn<T extends PurchaseTerms>(
  things: readonly T[],
  currency: string | null,
  brief: Brief,
): readonly T[] {
  if (currency === null || things.every((thing) => !isPriced(thing) || thing.currency === currency)) return things;
  return things.map((thing) => {
    if (!isPriced(thing) || thing.currency === currency) return thing;
    const { currency: own, price, priceBreaks } = thing;
    const rate = own === undefined ? 1 : (brief.exchange?.[own] ?? 1);
    const factor = rate * tenTo(minorDigits(currency) - (own === undefined ? PLAIN_DIGITS : minorDigits(own)));
    const breaks = priceBreaks?.map((step) => ({ from: step.from, price: step.price * factor }));
    return { ...thing, currency, price: price === undefined ? undefined : price * factor, priceBreaks: breaks };
  });
}
