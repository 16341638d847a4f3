// The screen of measured units: the file in a field, the bank face before and after placing, the gaps against the floor of the meter.

import { drawBar } from "../bar.ts";
import { shownBank } from "../pick.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { drawnText } from "../text.ts";
import { type Face, offWords } from "../units/face.ts";
import type { Placed } from "../units/state.ts";
import { bankHead, noBank } from "./bank.ts";
import { seenPart } from "./brief.ts";
import { type Page, type Room, scrolled } from "./page.ts";
import { faces, gapRow, proofRows } from "./unitsFigures.ts";
import { paragraph } from "./words.ts";

const PATH_LABEL = "Measured units: ";
const SAVE_LABEL = "Save the list as: ";
const ABOUT_FILE =
  "The file is a table in CSV with the headings serial and capacitance [uF], and where known leakage [uA], esr [mohm], lot, part, group. Each unit then goes where the voltages come out most equal.";
const PHASES = {
  first: "first placing",
  exchange: "exchanging units",
  proof: "ruling out what could be better",
  holding: "levelling the hold",
} as const;

interface Field {
  readonly row: Row;
  readonly caret: number | null;
}

/** The line that is typed into, or what was read. */
function field(state: State, columns: number): Field {
  const { typing, path, save, replace, lot } = state.units;
  if (replace) return { row: rowOf(span(`! Replace the file that is there? ${save.text}`, "warn")), caret: null };
  if (typing === null) {
    if (lot === null) return { row: rowOf(span("No units were read yet. m names their file.", "strong")), caret: null };
    const lost = lot.faults.length > 0 ? `, ${lot.faults.length} rows lost` : "";
    return {
      row: rowOf(span(PATH_LABEL, "strong"), span(`${lot.path}, ${lot.units.length} units${lost}`)),
      caret: null,
    };
  }
  const label = typing === "path" ? PATH_LABEL : SAVE_LABEL;
  const line = typing === "path" ? path : save;
  const room = Math.max(8, columns - label.length - 1);
  const seen = seenPart(drawnText(line.text, state.look.ascii), line.caret, room);
  return { row: rowOf(span(label, "strong"), span(seen.text)), caret: label.length + seen.at };
}

const refusalRows = (state: State, columns: number): readonly Row[] =>
  state.units.refusals
    .slice(0, 6)
    .flatMap((refusal) =>
      paragraph(
        `! ${state.words?.refusalWords(refusal) ?? `${refusal.place.field ?? ""} ${refusal.read}; needed: ${refusal.want}`}`,
        columns,
        "warn",
      ),
    );

export function unitsPage(state: State, room: Room): Page {
  const bank = shownBank(state);
  const { units, look } = state;
  const { ascii } = look;
  const { columns } = room;
  const typed = field(state, columns);
  // Without a bank there is nothing to place units in, but their file can be named already.
  const top = bank === null ? [...noBank(state, room).rows, EMPTY_ROW] : bankHead(state, bank);
  const head = [...top, typed.row];
  const caret = typed.caret === null ? null : { row: head.length - 1, column: typed.caret };
  const rows: Row[] = [...refusalRows(state, columns)];
  const { lot, before, running, placed } = units;
  if (lot === null) rows.push(...paragraph(ABOUT_FILE, columns, "quiet"));
  if (lot !== null && before !== null && bank !== null) {
    const [count, size] = bank.ties === "cross-tied" ? [bank.series, bank.parallel] : [bank.parallel, bank.series];
    const same = ({ part, series, parallel, ties }: Placed["bank"]): boolean =>
      part === bank.part && series === bank.series && parallel === bank.parallel && ties === bank.ties;
    const capacitances = new Map(lot.units.map(({ serial, capacitance }) => [serial, capacitance]));
    const face = (groups: Face["groups"]): Face => ({
      groups: groups.length === 0 ? Array.from({ length: count }, () => []) : groups,
      size,
      ties: bank.ties,
      capacitances,
    });
    if (!same(before.bank))
      rows.push(
        ...paragraph("These units were placed for another bank; Enter places them for this one.", columns, "warn"),
      );
    else {
      if (running !== null) {
        const bar = drawBar(running.part, { columns: 24, full: 1, limit: null, ascii });
        rows.push(
          rowOf(span(`${PHASES[running.phase]} `, "accent"), span(bar), span(`  ${offWords(running.gap).slice(1)}`)),
        );
      }
      const floor = placed?.placing.floor ?? 0;
      rows.push(EMPTY_ROW, gapRow("as listed", before.gap, floor, { columns, ascii }));
      const now = placed?.placing.charging.gap ?? running?.gap;
      if (now !== undefined) rows.push(gapRow(placed === null ? "so far" : "placed", now, floor, { columns, ascii }));
      if (placed !== null) {
        rows.push(gapRow("bound", placed.placing.charging.lowerBound, floor, { columns, ascii }));
        rows.push(
          ...paragraph(
            "Gaps on a scale of decades, 0.01 ppm to the whole; the mark is what the meter can tell.",
            columns,
            "quiet",
          ),
        );
        rows.push(...proofRows(placed, bank, columns));
      }
      const after = placed?.placing.groups ?? running?.groups ?? [];
      rows.push(EMPTY_ROW, ...faces(face(before.groups), face(after), { columns, look, done: placed !== null }));
      const what =
        bank.ties === "cross-tied"
          ? "a row is a stage, off the mean of the stages"
          : "a row is a string, its worst unit over even";
      rows.push(...paragraph(`A mark is a unit, low to high capacitance in this lot; ${what}.`, columns, "quiet"));
      if (placed !== null && placed.placing.spares.length > 0)
        rows.push(...paragraph(`Spares: ${placed.placing.spares.join(", ")}`, columns));
    }
  }
  const page = scrolled(state, "units", head, rows, room);
  return { ...page, caret };
}
