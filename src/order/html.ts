// A bill as one plain HTML table, everything escaped; no script, no style from outside.

import type { Bill } from "./bill.ts";
import { columnsOf } from "./columns.ts";
import { visible } from "./visible.ts";

const ENTITIES: Readonly<Record<string, string>> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&#39;",
  "`": "&#96;",
};

/** Text that HTML shows as it is, in content and in quoted attributes. */
export const htmlText = (text: string): string => visible(text).replace(/[&<>"'`]/g, (char) => ENTITIES[char] ?? char);

export function billToHtml(bill: Bill): string {
  const { purchase, consumed, currency, unpriced } = bill.totals;
  const columns = columnsOf(bill);
  const sum = (value: number | null): string => (value === null ? "no price" : `${value} ${currency}`);
  const title = `Bill of materials: ${htmlText(bill.layout)}`;
  const head = columns.map((column) => `<th scope="col">${htmlText(column.heading)}</th>`).join("");
  const rows = bill.lines.map(
    (line) => `<tr>${columns.map((column) => `<td>${htmlText(column.cell(line))}</td>`).join("")}</tr>`,
  );
  const left = unpriced.length > 0 ? `<p>Left out, no price: ${unpriced.map(htmlText).join("; ")}.</p>\n` : "";
  return `<!DOCTYPE html>
<html lang="en">
<head><meta charset="utf-8"><title>${title}</title></head>
<body>
<h1>${title}</h1>
<table>
<thead><tr>${head}</tr></thead>
<tbody>
${rows.join("\n")}
</tbody>
</table>
<p>Purchase cost of the priced lines: ${htmlText(sum(purchase))}. Consumed cost: ${htmlText(sum(consumed))}.</p>
${left}<ul>${bill.cautions.map((caution) => `<li>${htmlText(caution)}</li>`).join("")}</ul>
</body>
</html>
`;
}
