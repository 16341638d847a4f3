// The catalogue as it was understood: every part with what is known, assumed, set by hand and unknown of it, and every fault with its place.
import type { Capacitor } from "../../catalog/index.ts";
import { type Column, columnsFor, headingRow, snug, tableRow, widen } from "../columns.ts";
import type { PartValue, SharedWords } from "../ports.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { headingInHand, partAt } from "../update/parts.ts";
import { grouped, shown, shownMoney } from "../values.ts";
import { type Page, pageOf, type Room, scrolled } from "./page.ts";
import { emptyRows, paragraph } from "./words.ts";

const countOf = (values: readonly PartValue[], state: PartValue["state"]): number =>
  values.filter((value) => value.state === state).length;

/** Blank for none: a column of noughts hides the ones that are not. */
const some = (count: number): string => (count === 0 ? "" : String(count));

function columnsOf(state: State, words: SharedWords): readonly Column<Capacitor>[] {
  const column = (
    title: string,
    width: number,
    priority: number,
    text: (unit: Capacitor) => string,
    side: "left" | "right" = "right",
  ): Column<Capacitor> => ({ title, width, priority, side, cell: (unit) => span(text(unit)) });
  const hand = (unit: Capacitor): number => Object.keys(state.overrides[unit.part] ?? {}).length;
  return [
    column("part", 24, 0, (u) => u.part, "left"),
    column("capacitance", 11, 0, (u) => shown(u.capacitance, "capacitance")),
    column("voltage", 8, 0, (u) => shown(u.voltage, "voltage")),
    column("by hand", 7, 0, (u) => some(hand(u))),
    column("unknown", 7, 1, (u) => some(countOf(words.valuesOf(u), "unknown"))),
    column("assumed", 7, 2, (u) => some(countOf(words.valuesOf(u), "assumed"))),
    column("technology", 20, 4, (u) => u.technology ?? "", "left"),
    column("price", 12, 3, (u) =>
      u.price === undefined ? "no price" : shownMoney(words.majorOf(u.price, u.currency), u.currency ?? ""),
    ),
    column("on hand", 7, 5, (u) => (u.onHand === undefined ? "" : grouped(u.onHand))),
    column("line", 6, 6, (u) => String(u.line)),
    column("file", 24, 7, (u) => u.file.split("/").at(-1) ?? "", "left"),
  ];
}

/** What the part under the cursor has, by where it comes from; the value in hand first, with its file's own. */
function detailRows(state: State, unit: Capacitor, words: SharedWords, columns: number): readonly Row[] {
  const values = words.valuesOf(unit);
  const heading = headingInHand(state);
  const own = state.overrides[unit.part] ?? {};
  const inHand = values.find((value) => value.heading === heading);
  const told = inHand === undefined ? "" : inHand.state === "unknown" ? "unknown" : inHand.text;
  const why = inHand?.rule === undefined ? (inHand?.state ?? "") : `${inHand.state}: ${inHand.rule}`;
  const list = (state: PartValue["state"]): string =>
    values
      .filter((value) => value.state === state && own[value.heading] === undefined)
      .map((value) => (state === "unknown" ? value.heading : `${value.heading} ${value.text}`))
      .join(", ");
  const set = Object.entries(own).map(([name, text]) => `${name} ${text}`);
  const line = (lead: string, text: string, style: "plain" | "warn" | "quiet" | "accent"): readonly Row[] =>
    text === "" ? [] : paragraph(`${lead}: ${text}.`, columns, style);
  return [
    rowOf(span(`> ${heading}: ${told}`, "focus"), span(told === "unknown" ? "" : `  ${why}`, "quiet")),
    ...line("Set by hand, beside the file", set.join(", "), "warn"),
    ...line("Assumed", list("assumed"), "accent"),
    ...line("Unknown", list("unknown"), "accent"),
    ...line("Measured", list("measured"), "plain"),
    ...line("From the file", list("datasheet"), "quiet"),
  ];
}

function headWords({ catalogue, overrides }: State): string {
  const { parts = [], sources = [] } = catalogue ?? {};
  const sum = (of: (source: (typeof sources)[number]) => number): number =>
    sources.reduce((all, one) => all + of(one), 0);
  const faults = sum((source) => source.faults.length);
  const notes = sum((source) => source.notes.length);
  const hand = Object.values(overrides).reduce((all, texts) => all + Object.keys(texts).length, 0);
  const count = (number: number, one: string, more: string): string =>
    `${grouped(number)} ${number === 1 ? one : more}`;
  return [
    `${count(parts.length, "part", "parts")} of ${count(sources.length, "file", "files")}`,
    count(faults, "fault", "faults"),
    count(notes, "note", "notes"),
    `${count(hand, "value", "values")} by hand`,
  ].join(", ");
}

function faultPage(state: State, words: SharedWords, room: Room): Page {
  const { sources = [] } = state.catalogue ?? {};
  const rows = sources.flatMap(({ file, read, kind, faults, notes }): readonly Row[] => [
    ...paragraph(
      `${file}: ${kind}, ${grouped(read)} understood, ${faults.length === 0 ? "no faults" : faults.length === 1 ? "1 fault" : `${faults.length} faults`}`,
      room.columns,
      "strong",
    ),
    ...faults.flatMap((fault) => paragraph(`x ${words.refusalWords(fault)}`, room.columns, "bad")),
    ...notes.flatMap((note) => paragraph(`! ${words.refusalWords(note)}`, room.columns, "warn")),
  ]);
  return scrolled(state, "parts", [rowOf(span(headWords(state), "strong"))], rows, room);
}

export function partsPage(state: State, room: Room): Page {
  const { catalogue, words } = state;
  if (catalogue === null || words === null || state.stock.parts === 0) return pageOf(emptyRows(state, room.columns));
  if (state.showFaults) return faultPage(state, words, room);
  const { parts } = catalogue;
  const at = partAt(state);
  const unit = parts[at];
  if (unit === undefined) return pageOf(emptyRows({ ...state, stock: { ...state.stock, parts: 0 } }, room.columns));
  const most = Math.max(3, Math.floor(room.rows * 0.55));
  const detail = detailRows(state, unit, words, room.columns).slice(0, most);
  const space = Math.max(1, room.rows - 3 - detail.length);
  const from = Math.max(0, Math.min(parts.length - space, at - Math.floor(space / 2)));
  const seen = parts.slice(from, from + space);
  const columns = widen(
    columnsFor(snug(columnsOf(state, words), seen), room.columns - 2),
    "part",
    room.columns - 2,
    40,
  );
  const rows = seen.map((one, index): Row => {
    const row = tableRow(columns, one);
    const here = from + index === at;
    const left = here ? row.left.map((cell) => ({ ...cell, style: "focus" as const })) : row.left;
    return { left: [span(here ? "> " : "  ", "key"), ...left] };
  });
  return pageOf([
    rowOf(span(headWords(state), "strong")),
    { left: [span("  "), ...headingRow(columns).left] },
    ...rows,
    ...Array.from({ length: space - rows.length }, () => EMPTY_ROW),
    EMPTY_ROW,
    ...detail,
  ]);
}
