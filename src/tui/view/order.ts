// What must be bought for the shown bank, line by line, and the question for a file to save it in.
import { type Column, columnsFor, headingRow, tableRow, widen } from "../columns.ts";
import { shownBank } from "../pick.ts";
import type { BillLine } from "../ports.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { shownMoney } from "../values.ts";
import { bankHead, noBank } from "./bank.ts";
import { type Page, pageOf, type Room, scrolled } from "./page.ts";
import { paragraph } from "./words.ts";

function billColumns(currency: string): readonly Column<BillLine>[] {
  const count = (title: string, priority: number, value: (line: BillLine) => number): Column<BillLine> => ({
    title,
    width: 7,
    priority,
    side: "right",
    cell: (line) => span(String(value(line))),
  });
  return [
    { title: "item", width: 18, priority: 0, side: "left", cell: (line) => span(line.item) },
    count("needed", 1, (line) => line.needed),
    count("on hand", 3, (line) => line.onHand),
    count("bought", 0, (line) => line.bought),
    count("packs", 4, (line) => line.packs),
    count("surplus", 5, (line) => line.surplus),
    {
      title: "cost",
      width: 13,
      priority: 0,
      side: "right",
      cell: (line) => (line.cost === null ? span("no price", "warn") : span(shownMoney(line.cost, currency))),
    },
    {
      title: "of it used",
      width: 13,
      priority: 6,
      side: "right",
      cell: (line) => span(line.consumed === null ? "unknown" : shownMoney(line.consumed, currency)),
    },
    { title: "order code", width: 20, priority: 7, side: "left", cell: (line) => span(line.orderCode) },
  ];
}

export function orderPage(state: State, room: Room): Page {
  const layout = shownBank(state);
  if (layout === null || state.answer?.kind !== "planned") return noBank(state, room);
  const { bill } = state.answer;
  const head = bankHead(state, layout);
  if (bill === null) return pageOf([...head, EMPTY_ROW, ...paragraph("Working out what to buy.", room.columns)]);
  const columns = widen(columnsFor(billColumns(bill.currency), room.columns), "item", room.columns, 48);
  const rows: readonly Row[] = [
    ...bill.lines.map((line) => tableRow(columns, line)),
    EMPTY_ROW,
    rowOf(span(`Money to spend: ${shownMoney(bill.total, bill.currency)}`, "strong")),
    ...(bill.unpriced.length > 0
      ? paragraph(`Without a price, and not in that sum: ${bill.unpriced.join(", ")}.`, room.columns, "warn")
      : []),
    ...paragraph("e saves this as .csv, .json or .md, by the name you give.", room.columns, "quiet"),
  ];
  return scrolled(state, "order", [...head, EMPTY_ROW, headingRow(columns)], rows, room);
}
