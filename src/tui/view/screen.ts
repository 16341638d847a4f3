// The whole screen as rows: names of the screens, the brief in a line, the body, the caution, what just happened, the live keys.
import { FIELDS, fieldAt, shownValue, valueIn } from "../fields.ts";
import { helpLineKeys } from "../keys.ts";
import type { Caret } from "../paint.ts";
import { drawRow, EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { Prompt, State } from "../state.ts";
import { cutText, drawnText, wrapText } from "../text.ts";
import { grouped } from "../values.ts";
import { textWidth } from "../width.ts";
import { bankPage } from "./bank.ts";
import { blendPage } from "./blend.ts";
import { briefPage, seenPart } from "./brief.ts";
import { comparePage } from "./compare.ts";
import { helpPage } from "./help.ts";
import { layoutsPage } from "./layouts.ts";
import { mapPage } from "./map.ts";
import { orderPage } from "./order.ts";
import type { Page, Room } from "./page.ts";
import { partsPage } from "./parts.ts";
import { sharingPage } from "./sharing.ts";
import { shotPage } from "./shot.ts";
import { ruleRow, tabsRow } from "./top.ts";
import { trailPage } from "./trail.ts";
import { unitsPage } from "./units.ts";
import { CAUTIONS, refusalOf, refusalWords } from "./words.ts";

export const LEAST_COLUMNS = 60;
export const LEAST_ROWS = 16;

export interface Drawn {
  readonly rows: readonly string[];
  readonly caret: Caret;
}

const PAGES: Readonly<Record<State["screen"], (state: State, room: Room) => Page>> = {
  brief: briefPage,
  layouts: layoutsPage,
  compare: comparePage,
  bank: bankPage,
  sharing: sharingPage,
  shot: shotPage,
  order: orderPage,
  map: mapPage,
  units: unitsPage,
  blend: blendPage,
  parts: partsPage,
  trail: trailPage,
};

const HEAD_ROWS = 3;
const FOOT_ROWS = 3;

const roomOf = (state: State): Room => ({
  columns: state.columns,
  rows: Math.max(1, state.rows - HEAD_ROWS - FOOT_ROWS),
});

const bodyOf = (state: State): Page =>
  state.help ? helpPage(state, roomOf(state)) : PAGES[state.screen](state, roomOf(state));

/** How far the screen under the eye can be scrolled. */
export const mostScroll = (state: State): number => bodyOf(state).mostScroll;

/** The brief in one line, and what it is planned from. */
function briefRow(state: State): Row {
  const { answer, stock } = state;
  const hand = Object.keys(state.overrides).length === 0 ? "" : ", some by hand";
  const from = `${grouped(stock.parts)} parts${hand}${stock.note === "" ? "" : `, ${stock.note}`}`;
  if (answer?.kind !== "planned")
    return {
      left: [span(answer === null ? "" : "The brief is not whole yet.", "quiet")],
      right: [span(from, "quiet")],
    };
  const value = (key: string): string => {
    const field = FIELDS.find((candidate) => candidate.key === key);
    return field === undefined ? "" : shownValue(field, valueIn(answer.brief, field));
  };
  const busy = state.asked === state.answered ? "" : state.stopped === state.asked ? " (of the brief before)" : " ...";
  return {
    left: [
      span(`${value("energy")} at ${value("voltage")}, fall ${value("ripple")}, ${value("basis")}${busy}`, "accent"),
    ],
    right: [span(from, "quiet")],
  };
}

/** What is wrong with the field under the caret, in full: beside the field there may be no room for it. */
function focusedRefusal(state: State): Row {
  const refusal = state.screen === "brief" && !state.help ? refusalOf(state, fieldAt(state.field).key) : null;
  return refusal === null ? EMPTY_ROW : rowOf(span(`! ${refusalWords(refusal)}`, "warn"));
}

const QUESTION = "Save the order as: ";
const questionOf = (prompt: Prompt): string =>
  prompt.what === "order" ? QUESTION : `${prompt.heading} of ${prompt.part}, blank for the catalogue's: `;

/** A long question is cut, so that there is room to type. */
const fitQuestion = (question: string, columns: number): string =>
  textWidth(question) <= columns - 20 ? question : `${cutText(question, columns - 22)}: `;

function noticeRow(state: State): { readonly row: Row; readonly caretColumn: number | null } {
  const { prompt, notice } = state;
  if (prompt?.replace) {
    return { row: rowOf(span(`! Replace the file that is there? ${prompt.line.text}`, "warn")), caretColumn: null };
  }
  const bad = notice !== null && notice.tone === "bad";
  if (prompt !== null && !bad) {
    const question = fitQuestion(drawnText(questionOf(prompt), state.look.ascii), state.columns);
    const width = textWidth(question);
    const room = Math.max(8, state.columns - width - 2);
    const seen = seenPart(drawnText(prompt.line.text, state.look.ascii), prompt.line.caret, room);
    return { row: rowOf(span(question, "strong"), span(seen.text)), caretColumn: width + seen.at };
  }
  if (notice === null) return { row: focusedRefusal(state), caretColumn: null };
  const mark = notice.tone === "bad" || notice.tone === "warn" ? "! " : "";
  return { row: rowOf(span(mark + notice.text, notice.tone)), caretColumn: null };
}

/** As many live keys as fit; the last, help, always does. */
function keysRow(state: State): Row {
  const keys = helpLineKeys(state);
  const last = keys.slice(-2);
  const widthOf = (list: typeof keys): number =>
    list.reduce((sum, { shown, words }) => sum + shown.length + words.length + 3, 0);
  let room = state.columns - widthOf(last);
  const first = keys.slice(0, -2).filter((key) => {
    room -= widthOf([key]);
    return room >= 0;
  });
  return rowOf(...[...first, ...last].flatMap(({ shown, words }) => [span(shown, "key"), span(` ${words}  `)]));
}

function tooSmall(state: State): Drawn {
  const { columns, rows, look } = state;
  const sentence = `joulewright needs ${LEAST_COLUMNS} columns by ${LEAST_ROWS} rows and has ${columns} by ${rows}: make the window larger, or leave with Ctrl-Q.`;
  const lines = wrapText(sentence, Math.max(1, columns)).slice(0, rows);
  return { rows: lines.map((line) => drawRow(rowOf(span(line)), columns, look)), caret: null };
}

export function drawScreen(state: State): Drawn {
  const { columns, rows, look } = state;
  if (columns < LEAST_COLUMNS || rows < LEAST_ROWS) return tooSmall(state);
  const room = roomOf(state);
  const page = bodyOf(state);
  const body = Array.from({ length: room.rows }, (_, index) => page.rows[index] ?? EMPTY_ROW);
  const caution = CAUTIONS.find((text) => textWidth(text) <= columns) ?? "";
  const notice = noticeRow(state);
  const all: readonly Row[] = [
    tabsRow(state),
    briefRow(state),
    ruleRow(state),
    ...body,
    rowOf(span(caution, "caution")),
    notice.row,
    keysRow(state),
  ];
  const caret =
    notice.caretColumn !== null
      ? { row: rows - 2, column: notice.caretColumn }
      : page.caret !== null && state.prompt === null
        ? { row: HEAD_ROWS + page.caret.row, column: page.caret.column }
        : null;
  return { rows: all.map((row) => drawRow(row, columns, look)), caret };
}
