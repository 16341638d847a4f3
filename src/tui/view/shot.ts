// One shot of the chosen bank into the brief's load: its course, figures, energies, faults, and what is not assessed.

import type { Bound } from "../../pulse/index.ts";
import type { ShotReport } from "../../search/index.ts";
import { detailsOf } from "../detail.ts";
import { shownBank } from "../pick.ts";
import type { SharedWords, ShotDetail } from "../ports.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { shown, shownVerdict, VERDICT_STYLE, worstVerdict } from "../values.ts";
import { bankHead, noBank } from "./bank.ts";
import { RULE, sideBySide } from "./beside.ts";
import { findingRows } from "./findings.ts";
import { type Page, pageOf, type Room, scrolled } from "./page.ts";
import { cautionRows, heading, sections, TWO_COLUMNS, working } from "./section.ts";
import { energyRows } from "./shotEnergy.ts";
import { faultRows } from "./shotFaults.ts";
import { figureRows, unitRows } from "./shotFigures.ts";
import { openRows } from "./shotOpen.ts";
import { sweepRows } from "./shotSweep.ts";
import { traceRows } from "./shotTrace.ts";
import { paragraph } from "./words.ts";

/** A state once the engine is there. */
type Worded = State & { readonly words: SharedWords };
const isWorded = (state: State): state is Worded => state.words !== null;

/** Without a load there is no shot: how to give one. */
function noLoad(head: readonly Row[], { columns }: Room): Page {
  return pageOf([
    ...head,
    EMPTY_ROW,
    ...paragraph("The brief has no load, so there is no shot to show.", columns, "strong"),
    ...paragraph(
      "l goes to the brief: give the load's resistance, its inductance, or both, with those of its leads.",
      columns,
    ),
    ...paragraph(
      'A flash lamp, a dead short or a steady current comes from a brief file, under the key "load": joulewright --brief FILE.json.',
      columns,
    ),
  ]);
}

function refusedRows(
  read: Extract<ShotDetail["report"], { readonly ok: false }>,
  columns: number,
  words: SharedWords,
): readonly Row[] {
  return [
    ...paragraph("This shot cannot be reckoned:", columns, "strong"),
    ...read.refusals.flatMap((refusal) => paragraph(`- ${words.refusalWords(refusal)}`, columns, "warn")),
    ...paragraph("l goes to the load on the brief; the rest of it is in the brief's file.", columns),
  ];
}

const BOUND_WORDS: Readonly<Record<Bound, string>> = {
  value: "",
  "upper bound": "at most ",
  "lower bound": "at least ",
  "side unknown": "about ",
};

/** Peak and reversal at a glance, each with its bound said, and how the checks of the shot went. */
function glance({ discharge, findings }: ShotReport): Row {
  const { peakCurrent, peakTime, reversal, bounds } = discharge;
  const peak = `Peak ${BOUND_WORDS[bounds.peakCurrent]}${shown(peakCurrent, "current")} after ${shown(peakTime, "time")}`;
  const back = `reversal ${BOUND_WORDS[bounds.reversal]}${shown(reversal, "fraction")}`;
  const { verdict } = worstVerdict({ findings });
  return {
    left: [span(peak, "strong"), span(`, ${back}`)],
    right: [span(`shot: ${shownVerdict({ findings })}`, VERDICT_STYLE[verdict])],
  };
}

/** Charging, heat, life and lamp, in the words of the pulse command. */
const rateRows = (report: ShotReport, columns: number, words: SharedWords): readonly Row[] =>
  words
    .rateBlocks(report, columns)
    .flatMap((block, index) => [
      ...(index === 0 ? [] : [EMPTY_ROW]),
      ...block.split("\n").map((line, at) => rowOf(span(line, at === 0 ? "strong" : "plain"))),
    ]);

function shotRows(report: ShotReport, detail: ShotDetail, state: Worded, room: Room): readonly Row[] {
  const wide = room.columns >= TWO_COLUMNS;
  const left = wide ? Math.floor((room.columns - RULE) / 2) : room.columns;
  const right = wide ? room.columns - left - RULE : room.columns;
  const height = wide ? Math.max(5, Math.min(11, Math.floor((room.rows - 14) / 3))) : room.rows < 16 ? 4 : 6;
  const size = { columns: left, rows: height };
  const trace = [heading("Over time"), ...traceRows(report, { state, size })];
  const sweep = [
    heading("Peak current against loop inductance"),
    ...sweepRows(detail.sweep, report, { state, size: { ...size, rows: height + 1 } }),
  ];
  const figures = [heading("Figures and how far they spread"), ...figureRows(report, right)];
  const energy = energyRows(report, right);
  const unit = [heading("Worst unit"), ...unitRows(report, right)];
  const faults = [heading("If one thing fails"), ...faultRows(report.faults, right)];
  const last = [
    [heading("Not assessed"), ...openRows(report, room.columns)],
    [heading("Checks of the shot"), ...findingRows(report.findings, room.columns, state.words)],
    rateRows(report, room.columns, state.words),
    cautionRows(detail.cautions, room.columns),
  ] as const;
  return wide
    ? sections(sideBySide(sections(trace, sweep), sections(figures, energy, unit, faults), left, state), ...last)
    : sections(trace, figures, energy, faults, sweep, unit, ...last);
}

export function shotPage(state: State, room: Room): Page {
  const layout = shownBank(state);
  if (layout === null || state.answer?.kind !== "planned" || !isWorded(state)) return noBank(state, room);
  const head = bankHead(state, layout);
  if (state.answer.brief.load === undefined) return noLoad(head, room);
  const { shot } = detailsOf(state) ?? {};
  if (shot === undefined) return pageOf([...head, ...working(room.columns)]);
  if (shot === null) return pageOf([...head, ...paragraph("The catalogue has no such part.", room.columns, "warn")]);
  const { report } = shot;
  if (!report.ok) return scrolled(state, "shot", head, refusedRows(report, room.columns, state.words), room);
  return scrolled(state, "shot", [...head, glance(report.value)], shotRows(report.value, shot, state, room), room);
}
