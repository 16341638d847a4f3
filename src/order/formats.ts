// The formats a bill is written in, by name.

import type { Bill } from "./bill.ts";
import { billToCsv } from "./csv.ts";
import { billToHtml } from "./html.ts";
import { billToMarkdown } from "./markdown.ts";
import { visibleJson } from "./visible.ts";

export const BILL_FORMATS = ["csv", "json", "md", "html"] as const;
export type BillFormat = (typeof BILL_FORMATS)[number];

/** The bill as text in one format, ending in a line break. */
export function billText(bill: Bill, format: BillFormat): string {
  switch (format) {
    case "csv":
      return billToCsv(bill);
    case "json":
      return `${visibleJson(JSON.stringify(bill, null, 2))}\n`;
    case "md":
      return billToMarkdown(bill);
    case "html":
      return billToHtml(bill);
  }
}
