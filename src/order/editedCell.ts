// One cell of an edited bill to its value; a fault says what was read and what would be accepted.

import { accepted, isCurrency, parsePrice, type Read, refused, toMajor } from "../quantity/index.ts";
import { type BillColumn, isOpen } from "./columns.ts";
import { visible } from "./visible.ts";

/** null: nothing stands there, or the words for what is open. */
export type CellValue = string | number | null;

const LONGEST = 1000;
const MOST = 1e9;

const no = (code: string, text: string, want: string): Read<never> =>
  refused({ code, place: {}, read: JSON.stringify(text.length > 80 ? `${text.slice(0, 80)}...` : text), want });

/** `comma`: a comma is the decimal mark, may be it, or is never it (a file separated by commas). */
export function readEditedCell(text: string, { key, kind }: BillColumn, comma: boolean | "never"): Read<CellValue> {
  if (kind === "text") {
    if (text.length > LONGEST) return no("too-long", text, `at most ${LONGEST} characters`);
    if (key !== "currency") return accepted(visible(text));
    if (text === "" || isCurrency(text)) return accepted(text === "" ? null : text);
    return no("bad-currency", text, "a code of ISO 4217 such as EUR");
  }
  if (isOpen(text)) return accepted(null);
  // A currency with two digits after the point, so that the major unit comes back as it was written.
  const read = parsePrice(text, "EUR", comma);
  if (kind === "money") return read.ok ? accepted(toMajor(read.value, "EUR")) : read;
  const value = read.ok ? toMajor(read.value, "EUR") : Number.NaN;
  const whole = key === "pack";
  if (value <= MOST && (!whole || (Number.isInteger(value) && value >= 1))) return accepted(value);
  if (!read.ok && read.refusals[0]?.code === "ambiguous-comma") return read;
  if (whole) return no("bad-count", text, `a whole number from 1 to ${MOST}`);
  const want = `a quantity from 0 to ${MOST} in plain digits, such as 12.5: no sign, no exponent`;
  return no(Number.isFinite(Number(text)) ? "out-of-range" : "not-a-number", text, want);
}
