// The fuse catalogue of --fuses, read and brought into the currency of the plan.

import { type Fuse, readFuses } from "../catalog/index.ts";
import { accepted, type Read, refused } from "../quantity/index.ts";
import { type Brief, planCurrency, pricedIn } from "../search/index.ts";
import type { Files } from "./files.ts";
import { tableKind } from "./kind.ts";
import { refusalWords } from "./words.ts";

/** Fuses with prices in one currency, and what was lost while reading, in words. */
export interface FuseStock {
  readonly fuses: readonly Fuse[];
  readonly lost: readonly string[];
}

/** Reads a fuse catalogue. Refused: no such file, another kind of table, no good row, a currency without a rate. */
export function readFuseStock(path: string, files: Files, brief: Brief, currency: string | null): Read<FuseStock> {
  const file = path === "-" ? "standard input" : path;
  const text = files.read(path);
  if (!text.ok) return text;
  const kind = tableKind(text.value);
  if (kind !== "fuses") {
    const want = "a fuse catalogue, with the headings fuse, voltage [V], melting action [A2s], clearing action [A2s]";
    return refused({ code: "wrong-kind", place: { file }, read: kind, want });
  }
  const read = readFuses(text.value, file);
  if (!read.ok) return read;
  const { fuses, faults, notes } = read.value;
  if (fuses.length === 0) {
    const want = "at least one good row";
    return refused(...faults, { code: "no-parts", place: { file }, read: "no good row", want });
  }
  const asked = currency === null ? brief : { ...brief, currency };
  const money = planCurrency(asked, fuses, []);
  if (!money.ok) return money;
  return accepted({ fuses: pricedIn(fuses, money.value, brief), lost: [...faults, ...notes].map(refusalWords) });
}
