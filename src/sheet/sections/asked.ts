// What the bank is for: the brief as it was read, what was given apart from what was taken by default.

import type { SheetInput } from "../input.ts";
import { list, type Section, type Table } from "../model.ts";

export function askedSection({ words }: SheetInput): Section {
  const table: Table = {
    kind: "table",
    id: "asked",
    caption: "The brief",
    columns: [{ heading: "what" }, { heading: "asked" }, { heading: "by" }],
    rows: words.asked.map(({ label, value, given }) => [label, value, given ? "given" : "default"]),
  };
  const notes = words.notes.length > 0 ? [list(words.notes)] : [];
  return { id: "asked", title: "What was asked", blocks: [table, ...notes] };
}
