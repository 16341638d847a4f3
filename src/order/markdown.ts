// A bill as a Markdown table: text of unknown origin can end no cell, start no HTML and form no link.

import type { Bill } from "./bill.ts";
import { columnsOf } from "./columns.ts";
import { visible } from "./visible.ts";

/** Text that Markdown shows as it is. */
export function markdownText(text: string): string {
  return visible(text)
    .replaceAll("&", "&amp;")
    .replaceAll("<", "&lt;")
    .replaceAll(">", "&gt;")
    .replace(/[\\`*_{}[\]()#+!|~$]/g, "\\$&")
    .replace(/(https?|ftp|mailto):/gi, "$1&#58;")
    .replace(/@/g, "&#64;");
}

/** Title, table, sums. */
export function billToMarkdown(bill: Bill): string {
  const { purchase, consumed, currency, unpriced } = bill.totals;
  const columns = columnsOf(bill);
  const digits = (value: number | null): string => (value === null ? "no price" : `${value} ${currency}`);
  const row = (cells: readonly string[]): string => `| ${cells.join(" | ")} |`;
  const rows = bill.lines.map((line) => row(columns.map((column) => markdownText(column.cell(line)))));
  const text = [
    `# Bill of materials: ${markdownText(bill.layout)}`,
    "",
    row(columns.map((column) => markdownText(column.heading))),
    row(columns.map((column) => (column.kind === "text" ? "---" : "---:"))),
    ...rows,
    "",
    `Purchase cost of the priced lines: ${digits(purchase)}. Consumed cost: ${digits(consumed)}.`,
  ];
  if (unpriced.length > 0) text.push("", `Left out, no price: ${unpriced.map(markdownText).join("; ")}.`);
  text.push("", ...bill.cautions.map((caution) => `- ${markdownText(caution)}`));
  return `${text.join("\n")}\n`;
}
