// Which part of the catalogues a measured lot is of: named by the flag, by the file, or the only one there is.

import type { Capacitor } from "../catalog/index.ts";
import { type Read, refused } from "../quantity/index.ts";
import type { MeasuredInput } from "./measuredInput.ts";
import { findPart, type Stock } from "./stock.ts";

/** Refuses a lot of fewer than two units or of several parts (bad-value), and a part that no catalogue has. */
export function lotPart({ units, file }: MeasuredInput, flag: string | undefined, stock: Stock): Read<Capacitor> {
  const named = [...new Set(units.flatMap((unit) => (unit.part === undefined ? [] : [unit.part])))];
  const [only, ...more] = stock.parts;
  const name = flag ?? (named.length === 1 ? named[0] : more.length === 0 ? only?.part : undefined);
  if (name === undefined || units.length < 2) {
    const want = "two measured units or more of one part: name it with --part";
    const read = units.length < 2 ? `${units.length} units` : `${named.length} parts named`;
    return refused({ code: "bad-value", place: { file, field: "part" }, read, want });
  }
  return findPart(name, stock.parts, { field: flag === undefined ? `${file} part` : "--part" });
}
