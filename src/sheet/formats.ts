// The formats a sheet is written in, by name.

import { sheetToHtml } from "./html/page.tsx";
import type { Paper } from "./html/style.ts";
import { sheetToMarkdown } from "./markdown.ts";
import type { Sheet } from "./model.ts";

export const SHEET_FORMATS = ["html", "md"] as const;
export type SheetFormat = (typeof SHEET_FORMATS)[number];

/** The sheet as text in one format, ending in a line break. `paper` is that of HTML. */
export function sheetText(sheet: Sheet, format: SheetFormat, paper: Paper = "A4"): string {
  switch (format) {
    case "html":
      return sheetToHtml(sheet, paper);
    case "md":
      return sheetToMarkdown(sheet);
  }
}
