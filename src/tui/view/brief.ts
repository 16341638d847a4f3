// The brief's form, each field with how it was read or what is wrong, and beneath or beside it what fits, as one types.
import { columnsFor, headingRow, tableRow, widen } from "../columns.ts";
import { FIELDS, type Field, fieldAt, shownValue, valueIn } from "../fields.ts";
import { planOf } from "../pick.ts";
import { type Row, rowOf, type Span, span } from "../row.ts";
import type { State } from "../state.ts";
import { drawnText, fitText } from "../text.ts";
import { grouped, shown } from "../values.ts";
import { textWidth } from "../width.ts";
import { sideBySide } from "./beside.ts";
import { listColumns } from "./layouts.ts";
import type { Page, Room } from "./page.ts";
import { emptyRows, refusalOf, refusalWords } from "./words.ts";

const LABEL = 20;
const BOX = 16;
/** Column where a field's text begins: marker, label, bracket. */
const TEXT_AT = 2 + LABEL + 2;
/** From here on the results stand beside the form. */
const SIDE_BY_SIDE = 150;
const FORM_WIDTH = 74;

/** The part of a field's text that is seen, so that the caret is always inside. */
export function seenPart(text: string, caret: number, width: number): { readonly text: string; readonly at: number } {
  const before = text.slice(0, caret);
  let from = 0;
  while (textWidth(before.slice(from)) >= width) from += (before.codePointAt(from) ?? 0) > 0xffff ? 2 : 1;
  return { text: text.slice(from), at: textWidth(before.slice(from)) };
}

/** What stands right of a field: what is wrong, how it was read, or what a blank means. */
function remark(state: State, field: Field): Span {
  const text = state.values[field.key] ?? "";
  const refusal = refusalOf(state, field.key);
  if (refusal !== null) return span(`! ${refusalWords(refusal)}`, text === "" ? "accent" : "bad");
  if (field.choices !== undefined) return span("left and right change it", "quiet");
  if (text.trim() === "") return span(field.blank, "quiet");
  if (state.answer?.kind !== "planned") return span("");
  const read = shownValue(field, valueIn(state.answer.brief, field));
  return read === "" || read === text ? span("") : span(`= ${read}`, "good");
}

function fieldRow(state: State, index: number): Row {
  const field = fieldAt(index);
  const focused = index === state.field;
  const value = state.values[field.key] ?? "";
  const text = drawnText(value === "" && field.choices ? (field.choices[0] ?? "") : value, state.look.ascii);
  const seen = focused ? seenPart(text, state.caret, BOX) : { text, at: 0 };
  return rowOf(
    span(focused ? "> " : "  ", "key"),
    span(fitText(field.label, LABEL), focused ? "strong" : "plain"),
    span(" ["),
    span(fitText(seen.text, BOX, "left", state.look.ascii ? "~" : "…"), focused ? "focus" : "plain"),
    span("] "),
    remark(state, field),
  );
}

/** Fields shown, the focused one among them. */
function formRows(state: State, rows: number): { readonly rows: readonly Row[]; readonly focused: number } {
  const count = Math.min(rows, FIELDS.length);
  const most = FIELDS.length - count;
  const from = Math.max(0, Math.min(most, state.field - Math.floor(count / 2)));
  return {
    rows: Array.from({ length: count }, (_, i) => fieldRow(state, from + i)),
    focused: state.field - from,
  };
}

function resultRows(state: State, { columns, rows }: Room): readonly Row[] {
  const plan = planOf(state);
  const empty = emptyRows(state, columns);
  if (plan === null || empty.length > 0) return empty.slice(0, rows);
  const table = widen(columnsFor(listColumns(state, plan.layouts), columns), "part", columns, 40);
  const listed = plan.layouts.slice(0, Math.max(1, rows - 2));
  const count = grouped(plan.searched.layouts);
  const first = listed.length === 1 ? "the first" : `the first ${listed.length}`;
  return [
    rowOf(
      span(`${count} layouts fit; ${first} by ${state.rank}:`, "strong"),
      span(`  needs ${shown(plan.required.capacitance, "capacitance")}`, "quiet"),
    ),
    headingRow(table),
    ...listed.map((layout) => tableRow(table, layout)),
  ].slice(0, rows);
}

export function briefPage(state: State, room: Room): Page {
  const beside = room.columns >= SIDE_BY_SIDE;
  const results = beside ? room.rows : Math.max(5, Math.min(8, room.rows - FIELDS.length - 1));
  const form = formRows(state, beside ? room.rows : room.rows - results - 1);
  const field = fieldAt(state.field);
  const text = drawnText(state.values[field.key] ?? "", state.look.ascii);
  const column = TEXT_AT + seenPart(text, Math.min(state.caret, text.length), BOX).at;
  const caret = field.choices === undefined && !state.help ? { row: form.focused, column } : null;
  if (!beside) {
    const rule = rowOf(span("─".repeat(room.columns), "quiet"));
    const rows = [...form.rows, rule, ...resultRows(state, { columns: room.columns, rows: results })];
    return { rows, caret, mostScroll: 0 };
  }
  const right = resultRows(state, { columns: room.columns - FORM_WIDTH - 3, rows: room.rows });
  return { rows: sideBySide(form.rows, right, FORM_WIDTH, state), caret, mostScroll: 0 };
}
