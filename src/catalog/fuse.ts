// A fuse as sold, and the reader of a fuse catalogue.

import { accepted, type Read, type Refusal } from "../quantity/index.ts";
import type { PurchaseTerms } from "./capacitor.ts";
import { above, type Column, PURCHASE_COLUMNS, text } from "./column.ts";
import { readTable, record } from "./table.ts";

/** A, V dc, A^2 s. `melting` and `clearing` are the action integrals to melt and to clear. */
export interface Fuse extends PurchaseTerms {
  readonly fuse: string;
  readonly current?: number;
  readonly voltage?: number;
  readonly melting?: number;
  readonly clearing?: number;
  readonly note?: string;
}

const FUSE_COLUMNS: readonly Column[] = [
  { heading: "fuse", also: ["part", "name"], key: "fuse", type: text(120), required: true },
  { heading: "current", also: ["rated current"], key: "current", type: above("current", 1e-3, 1e6) },
  { heading: "voltage", also: ["dc voltage", "rated voltage"], key: "voltage", type: above("voltage", 0.1, 1e6) },
  { heading: "melting action", also: ["melting"], key: "melting", type: above("action", 1e-9, 1e12) },
  { heading: "clearing action", also: ["clearing"], key: "clearing", type: above("action", 1e-9, 1e12) },
  ...PURCHASE_COLUMNS,
  { heading: "note", also: ["notes"], key: "note", type: text(1000) },
  { heading: "maker", key: "maker", type: text() },
];

export interface FuseCatalogue {
  readonly fuses: readonly Fuse[];
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
}

/** Reads a fuse catalogue; blank ratings stay unknown. */
export function readFuses(source: string, file: string): Read<FuseCatalogue> {
  const fuses: Fuse[] = [];
  const faults: Refusal[] = [];
  const table = readTable(source, FUSE_COLUMNS, file, (row) => {
    const fuse = record(FUSE_COLUMNS, row) as unknown as Fuse;
    if (fuses.some((known) => known.fuse === fuse.fuse)) {
      const read = JSON.stringify(fuse.fuse);
      faults.push({
        code: "duplicate-part",
        place: { file, line: row.line },
        read,
        want: "a name of its own for each row",
      });
    } else fuses.push(fuse);
  });
  if (!table.ok) return table;
  return accepted({ fuses, faults: [...table.value.faults, ...faults], notes: table.value.notes });
}
