// Money: unit prices in minor units of an ISO 4217 currency, line costs in whole minor units, halves up.
//
// Source: [ISO4217] minor-unit digits (exceptions from memory, checked in the tests against the runtime's own currency data).

import { accepted, type Read, refused } from "./refusal.ts";

const NO_MINOR = [
  "BIF",
  "CLP",
  "DJF",
  "GNF",
  "ISK",
  "JPY",
  "KMF",
  "KRW",
  "PYG",
  "RWF",
  "UGX",
  "VND",
  "VUV",
  "XAF",
  "XOF",
  "XPF",
];
const THOUSAND_MINOR = ["BHD", "IQD", "JOD", "KWD", "LYD", "OMR", "TND"];

/** Digits of the minor unit: 2 for most currencies, 0 for some, 3 for a few. */
export function minorDigits(currency: string): number {
  if (NO_MINOR.includes(currency)) return 0;
  return THOUSAND_MINOR.includes(currency) ? 3 : 2;
}

export const isCurrency = (text: string): boolean => /^[A-Z]{3}$/.test(text);

const WANT = 'a price such as "3.90", zero or more, at most 1 000 000 000, in plain digits without an exponent';

/** A unit price in minor units; it may be a fraction of one ("0.0034"). Refuses what is negative, absurd or no number. */
export function parsePrice(text: string, currency: string, decimalComma: boolean | "never" = false): Read<number> {
  const cell = text.trim();
  const match = /^(\d+)(?:([.,])(\d+))?$/.exec(cell);
  if (!match) return refused({ code: "bad-price", place: {}, read: JSON.stringify(text), want: WANT });
  const [, whole = "", mark, fraction = ""] = match;
  if (mark === "," && decimalComma === "never") {
    return refused({
      code: "ambiguous-comma",
      place: {},
      read: JSON.stringify(text),
      want: `${whole}.${fraction}, with a point`,
    });
  }
  if (mark === (decimalComma === true ? "." : ",") && fraction.length === 3 && !/^0+$/.test(whole)) {
    const [name, other] = mark === "," ? ["comma", "."] : ["point", ","];
    const want = `${whole}${fraction} if the ${name} groups thousands, ${whole}${other}${fraction} if it is the decimal mark`;
    return refused({ code: "ambiguous-comma", place: {}, read: JSON.stringify(text), want });
  }
  const major = Number(`${whole}.${fraction}`);
  if (!(major <= 1e9)) return refused({ code: "bad-price", place: {}, read: JSON.stringify(text), want: WANT });
  return accepted(Number(`${whole}.${fraction}e${minorDigits(currency)}`));
}

/** Cost of a quantity at a unit price, whole minor units, halves up. */
export const lineCost = (quantity: number, unitPrice: number): number => Math.floor(quantity * unitPrice + 0.5 + 1e-9);

/** Minor units as a plain major-unit number for JSON: 1234 to 12.34. */
export const toMajor = (minor: number, currency: string): number => Number(`${minor}e-${minorDigits(currency)}`);

/** Minor units as text: `12.34 EUR`. Unknown prints `no price`. */
export function formatMoney(minor: number | null | undefined, currency: string): string {
  const known = minor ?? Number.NaN;
  if (!Number.isFinite(known)) return "no price";
  return `${toMajor(Math.round(known), currency).toFixed(minorDigits(currency))} ${currency}`;
}
