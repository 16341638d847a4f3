// The builder's own measured lot, read for the statistical basis: capacitances of the part's units, enough of them to be a distribution.

import { LEAST_LOT } from "../bank/index.ts";
import { readMeasured } from "../catalog/index.ts";
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { Files } from "./files.ts";

export interface Lot {
  /** F. */
  readonly values: readonly number[];
  /** Rows that were lost, told beside the result. */
  readonly faults: readonly Refusal[];
}

/** Rows that name another part are left out. Fewer than LEAST_LOT are no distribution: refused. */
export function readLot(path: string, part: string, files: Files): Read<Lot> {
  const file = path === "-" ? "standard input" : path;
  const text = files.read(path);
  if (!text.ok) return text;
  const lot = readMeasured(text.value, file);
  if (!lot.ok) return lot;
  const units = lot.value.units.filter((unit) => unit.part === undefined || unit.part === part);
  if (units.length >= LEAST_LOT)
    return accepted({ values: units.map((unit) => unit.capacitance), faults: lot.value.faults });
  const want = `at least ${LEAST_LOT} measured units of ${JSON.stringify(part)}: fewer say nothing about how a lot is spread`;
  return refused(...lot.value.faults, { code: "small-lot", place: { file }, read: `${units.length} units`, want });
}
