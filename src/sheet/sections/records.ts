// Records that are kept while the bank lives: the shot log, and the block of revisions and signatures.

import type { SheetInput } from "../input.ts";
import { type Section, type Table, text } from "../model.ts";

const LOG_ROWS = 24;
const REVISION_ROWS = 4;

const written = (...headings: readonly string[]) => headings.map((heading) => ({ heading, written: true as const }));

export function shotLogSection(): Section {
  const table: Table = {
    kind: "table",
    id: "shot-log",
    caption: "Shot log",
    columns: [
      { heading: "no." },
      ...written("date", "charged to", "held", "peak read", "reversal read", "what was seen", "initials"),
    ],
    rows: Array.from({ length: LOG_ROWS }, (_, i) => [String(i + 1), null, null, null, null, null, null, null]),
  };
  return {
    id: "shot-log",
    title: "Shot log",
    ownPage: true,
    blocks: [
      text(
        "Capacitance, ESR and leakage are measured again every year or every 1 000 shots (common practice, no source); a unit that has moved is replaced, and the sheet is made anew.",
      ),
      table,
    ],
  };
}

export function revisionSection({ date, revision, program }: SheetInput): Section {
  const blank = [null, null, null, null, null, null] as const;
  const table: Table = {
    kind: "table",
    id: "revisions",
    caption: "Revisions",
    columns: [
      { heading: "revision" },
      { heading: "date" },
      ...written("what changed", "made by", "checked by", "released by"),
    ],
    rows: [[revision, date, null, null, null, null], ...Array.from({ length: REVISION_ROWS }, () => blank)],
  };
  return {
    id: "revisions",
    title: "Revisions and signatures",
    blocks: [
      text(`Made with ${program}. The program reads no clock: date and revision stand here only when they were given.`),
      table,
    ],
  };
}
