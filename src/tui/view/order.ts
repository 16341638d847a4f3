// What must be bought for the shown bank, line by line, and the question for a file to save it in.

import type { Bill, BillLine } from "../../order/index.ts";
import { type Column, columnsFor, headingRow, snug, tableRow, widen } from "../columns.ts";
import { shownBank } from "../pick.ts";
import { EMPTY_ROW, type Row, rowOf, type Span, span } from "../row.ts";
import type { State } from "../state.ts";
import { shownMoney } from "../values.ts";
import { bankHead, handRows, noBank } from "./bank.ts";
import { type Page, pageOf, type Room, scrolled } from "./page.ts";
import { paragraph } from "./words.ts";

/** A missing price is said in its place: a blank is read as nought. */
function money(line: BillLine, amount: number | null): Span {
  if (amount !== null) return span(shownMoney(amount, line.currency ?? ""));
  return span(line.state === "to be chosen" ? "to be chosen" : "no price", "warn");
}

function count(title: string, priority: number, value: (line: BillLine) => number | null): Column<BillLine> {
  return { title, width: 7, priority, side: "right", cell: (line) => span(String(value(line) ?? "?")) };
}

const COLUMNS: readonly Column<BillLine>[] = [
  { title: "item", width: 22, priority: 0, side: "left", cell: (line) => span(line.item) },
  count("needed", 1, (line) => line.needed),
  count("on hand", 3, (line) => line.onHand),
  count("to buy", 0, (line) => line.toBuy),
  count("packs", 4, (line) => line.packs),
  count("surplus", 5, (line) => line.surplus),
  { title: "spent", width: 14, priority: 0, side: "right", cell: (line) => money(line, line.purchase) },
  { title: "of it used", width: 14, priority: 6, side: "right", cell: (line) => money(line, line.consumed) },
  { title: "value", width: 16, priority: 2, side: "left", cell: (line) => span(line.value) },
  { title: "rating", width: 18, priority: 7, side: "left", cell: (line) => span(line.rating) },
  { title: "order code", width: 16, priority: 8, side: "left", cell: (line) => span(line.orderCode) },
  { title: "supplier", width: 24, priority: 9, side: "left", cell: (line) => span(line.supplier) },
];

/** The sum, and how many lines it leaves out. */
function sumRow({ totals }: Bill): Row {
  const { purchase, currency, pricedLines, unpriced } = totals;
  const sum = purchase === null ? "unknown" : shownMoney(purchase, currency ?? "");
  const lines = `for ${pricedLines} ${pricedLines === 1 ? "line" : "lines"}`;
  const left = unpriced.length === 0 ? "" : `; ${unpriced.length} without a price`;
  return rowOf(
    span(`Money to spend: ${sum}`, "strong"),
    span(` ${lines}${left}`, unpriced.length === 0 ? "plain" : "warn"),
  );
}

export function orderPage(state: State, room: Room): Page {
  const layout = shownBank(state);
  if (layout === null || state.answer?.kind !== "planned") return noBank(state, room);
  const { bill } = state.answer;
  const head = bankHead(state, layout);
  if (bill === null) return pageOf([...head, EMPTY_ROW, ...paragraph("Working out what to buy.", room.columns)]);
  const columns = widen(columnsFor(snug(COLUMNS, bill.lines), room.columns), "item", room.columns, 60);
  const { unpriced } = bill.totals;
  const fails = layout.findings.some(({ verdict }) => verdict === "fail");
  const rows: readonly Row[] = [
    ...handRows(state, layout, room.columns),
    ...bill.lines.map((line) => tableRow(columns, line)),
    EMPTY_ROW,
    ...(unpriced.length === 0
      ? []
      : paragraph(`Not in that sum, for want of a price or a choice: ${unpriced.join(", ")}.`, room.columns, "quiet")),
    ...paragraph("e saves this as .csv, .json, .md or .html, by the name you give.", room.columns, "quiet"),
  ];
  const warning = fails ? paragraph("x fail: a check of this bank fails. Do not buy it.", room.columns, "bad") : [];
  return scrolled(state, "order", [...head, sumRow(bill), ...warning, headingRow(columns)], rows, room);
}
