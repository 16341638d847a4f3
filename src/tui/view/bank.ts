// One bank drawn stage by stage, each stage's worst voltage against its limit, with all that was found.
import type { LayoutResult } from "../../search/index.ts";
import { drawBar } from "../bar.ts";
import { isPinned, shownBank } from "../pick.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { fitText } from "../text.ts";
import {
  nameOf,
  shareOfLimit,
  shown,
  shownCost,
  shownLimit,
  shownSpan,
  shownVerdict,
  shownWorst,
  VERDICT_STYLE,
  worstVerdict,
  worstVoltage,
} from "../values.ts";
import { findingRows } from "./findings.ts";
import { layoutSentences } from "./layouts.ts";
import { type Page, pageOf, type Room, scrolled } from "./page.ts";
import { emptyRows, paragraph } from "./words.ts";

/** A row of units as drawn: at most so many, then how many there are. */
const MOST_DRAWN = 6;
/** From here on each stage also says between which potentials it stands. */
const ROOM_FOR_POTENTIALS = 120;

function unitsDrawn({ parallel, ties }: LayoutResult, ascii: boolean): string {
  const unit = ascii ? "][" : "┤├";
  const gap = ties === "cross-tied" ? (ascii ? "-" : "─") : " ";
  const drawn = Array.from({ length: Math.min(parallel, MOST_DRAWN) }, () => unit).join(gap);
  return `${drawn}${parallel > MOST_DRAWN ? `${gap}..` : ""}`;
}

const drawnWidth = (parallel: number): number =>
  Math.min(parallel, MOST_DRAWN) * 3 - 1 + (parallel > MOST_DRAWN ? 3 : 0);

/** One row a stage. Any stage may be the low one, so each is drawn at the worst that it may see. */
function stageRows(layout: LayoutResult, state: State, columns: number): readonly Row[] {
  const { share, series, parallel } = layout;
  const whole = worstVoltage(layout);
  // What is known already counts: a stage over its limit while charging is over it whatever the leakage turns out to be.
  const worst = whole ?? share.charging ?? share.holding;
  const atLeast = whole === null && worst !== null ? "at least " : "";
  const limit = share.limit;
  const over = worst !== null && worst > limit;
  const numberWidth = String(series).length;
  const units = `x${parallel}`;
  const words = `${atLeast}${shownWorst(worst, "voltage")} of ${shownLimit(limit, "voltage")}`;
  const percent = shareOfLimit(layout) === null ? "" : `, ${shownWorst(shareOfLimit(layout), "fraction")}`;
  const used =
    2 +
    numberWidth +
    1 +
    drawnWidth(parallel) +
    1 +
    units.length +
    2 +
    1 +
    words.length +
    percent.length +
    (over ? 5 : 0);
  const bar = Math.max(6, Math.min(columns < ROOM_FOR_POTENTIALS ? 60 : 40, columns - used));
  const full = Math.max(limit, worst ?? 0, share.even) * 1.1;
  const drawn = drawBar(worst ?? Number.NaN, { columns: bar, full, limit, ascii: state.look.ascii });
  const between = (stage: number): string =>
    columns < ROOM_FOR_POTENTIALS
      ? ""
      : `   between ${shown(share.even * (series - stage), "voltage")} and ${shown(share.even * (series - stage - 1), "voltage")} if even`;
  return Array.from({ length: series }, (_, stage) =>
    rowOf(
      span(`  ${String(stage + 1).padStart(numberWidth)} `),
      span(fitText(unitsDrawn(layout, state.look.ascii), drawnWidth(parallel)), "accent"),
      span(` ${units}  `),
      span(drawn, over ? "bad" : "good"),
      span(` ${words}${percent}`, over ? "bad" : "plain"),
      ...(over ? [span(" over", "bad")] : []),
      span(between(stage), "quiet"),
    ),
  );
}

export function bankHead(state: State, layout: LayoutResult): readonly Row[] {
  const { verdict } = worstVerdict(layout);
  const pinned = isPinned(state, layout) ? ", pinned" : "";
  return [
    {
      left: [span(nameOf(layout), "strong"), span(pinned, "quiet")],
      right: [span(shownVerdict(layout), VERDICT_STYLE[verdict])],
    },
    {
      left: [span(`${layout.units} units, ${shownSpan(layout.capacitance, "capacitance")}`)],
      right: [span(shownCost(layout))],
    },
  ];
}

export function noBank(state: State, room: Room): Page {
  const empty = emptyRows(state, room.columns);
  if (empty.length > 0) return pageOf(empty);
  if (state.asked !== state.answered) return pageOf(paragraph("Working out this bank.", room.columns, "strong"));
  const why =
    state.chosen === null
      ? "No bank is chosen yet."
      : `The catalogue no longer has ${nameOf(state.chosen)}, which was chosen.`;
  return pageOf([
    ...paragraph(why, room.columns, "strong"),
    ...paragraph("Choose one with Enter on the layouts screen.", room.columns),
  ]);
}

/** Values of the unit that are set by hand: nothing here comes from its catalogue alone. */
export function handRows({ overrides }: State, { part }: LayoutResult, columns: number): readonly Row[] {
  const set = Object.entries(overrides[part] ?? {}).map(([heading, text]) => `${heading} ${text}`);
  return set.length === 0 ? [] : paragraph(`! Set by hand, not in the catalogue: ${set.join(", ")}.`, columns, "warn");
}

export function bankPage(state: State, room: Room): Page {
  const layout = shownBank(state);
  if (layout === null) return noBank(state, room);
  const { series, ties, parallel } = layout;
  const how =
    series === 1
      ? "one stage"
      : ties === "cross-tied"
        ? `${series} stages of ${parallel} tied units`
        : parallel === 1
          ? `one string of ${series}`
          : `${parallel} strings of ${series}, not tied`;
  const rows: readonly Row[] = [
    ...paragraph(`${how}; any one may be the worst, and each is drawn so:`, room.columns, "quiet"),
    ...stageRows(layout, state, room.columns),
    EMPTY_ROW,
    ...layoutSentences(layout)
      .slice(1)
      .flatMap((sentence) => paragraph(sentence, room.columns)),
    ...(layout.cost !== null && layout.cost.unpriced.length > 0
      ? paragraph(`Without a price, and not in the cost: ${layout.cost.unpriced.join(", ")}.`, room.columns, "warn")
      : []),
    ...handRows(state, layout, room.columns),
    EMPTY_ROW,
    rowOf(span("Checks", "strong")),
    ...findingRows(layout.findings, room.columns, state.words),
  ];
  return scrolled(state, "bank", bankHead(state, layout), rows, room);
}
