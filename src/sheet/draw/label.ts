// What stands on a label of a unit, a stage, a string or a spare, as plain data, and how many labels a page holds.

import { PAGE } from "./drawing.tsx";
import { piecesOf } from "./slots.ts";

export interface Label {
  readonly kind: "unit" | "stage" | "string" | "spare";
  /** "3.7": stage or string, then the place in it; "3" for a stage or a string; null: a blank to fill in. */
  readonly position: string | null;
  /** null: a line to fill in. A stage or a string has none: left out. */
  readonly serial?: string | null;
  readonly part: string;
  /** true: "+" and "-" ends are printed; null: not known, and a blank asks for it. */
  readonly polarised: boolean | null;
  /** Rating of one unit, or of the stage or string as a whole: V, F; null: a blank. */
  readonly voltage: number | null;
  readonly capacitance: number | null;
  /** V to earth that its most distant terminal may stand at; null: a blank. Left out: it has none, as a spare. */
  readonly toEarth?: number | null;
}

export const LABEL_PAPERS = ["A4", "Letter"] as const;
export type LabelPaper = (typeof LABEL_PAPERS)[number];

/** Points: three labels across; as many rows as the paper holds upright at margins of 15 mm, with a line of caption. */
export const LABEL_SIZE = { width: PAGE.width / 3, height: 73 } as const;
export const LABEL_GRID: Readonly<Record<LabelPaper, { readonly columns: number; readonly rows: number }>> = {
  A4: { columns: 3, rows: 10 },
  Letter: { columns: 3, rows: 9 },
};

/** The labels of each page, in order. */
export function labelPages(labels: readonly Label[], paper: LabelPaper): readonly (readonly Label[])[] {
  const { columns, rows } = LABEL_GRID[paper];
  if (labels.length === 0) return [];
  // Pages are filled from the first on, not evenly: the rest of the last sheet can be used again.
  const pages = piecesOf(labels.length, columns * rows).length;
  return Array.from({ length: pages }, (_, page) => labels.slice(page * columns * rows, (page + 1) * columns * rows));
}
