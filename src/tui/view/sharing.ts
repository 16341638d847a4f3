// How one bank divides its voltage: every state as a bar, the worst corners, the course, the spread, and what eats the margin.

import type { LayoutResult } from "../../search/index.ts";
import { detailsOf } from "../detail.ts";
import { shownBank } from "../pick.ts";
import type { RestDetail, SharedWords } from "../ports.ts";
import { EMPTY_ROW, type Row } from "../row.ts";
import type { State } from "../state.ts";
import { bankHead, noBank } from "./bank.ts";
import { RULE, sideBySide } from "./beside.ts";
import { type Page, type Room, scrolled } from "./page.ts";
import { cautionRows, heading, sections, TWO_COLUMNS, working } from "./section.ts";
import { barRows } from "./sharingBars.ts";
import { causeRows } from "./sharingCauses.ts";
import { cornerRows } from "./sharingCorners.ts";
import { courseRows } from "./sharingCourse.ts";
import { spreadRows } from "./sharingSpread.ts";
import { paragraph } from "./words.ts";

/** With no resistors, and with clamp diodes. */
function mendRows(layout: LayoutResult, rest: RestDetail, words: SharedWords, columns: number): readonly Row[] {
  const without = words.withoutBalanceWords(layout);
  return [
    ...(without === "" ? [] : paragraph(`Without balancing resistors: ${without}.`, columns)),
    ...(rest.clamp === null ? [] : paragraph(`Against reversal: ${words.clampWords(rest.clamp)}.`, columns)),
  ];
}

/** Rows of each chart: they share what the texts leave. */
const chartHeight = ({ columns, rows }: Room): number =>
  columns >= TWO_COLUMNS ? Math.max(7, Math.min(14, Math.floor((rows - 18) / 2))) : rows < 16 ? 6 : 8;

export function sharingPage(state: State, room: Room): Page {
  const layout = shownBank(state);
  const { words } = state;
  if (layout === null || state.answer?.kind !== "planned" || words === null) return noBank(state, room);
  const { brief, plan } = state.answer;
  const { rest, margin, spread } = detailsOf(state) ?? {};
  const wide = room.columns >= TWO_COLUMNS;
  const left = wide ? Math.floor((room.columns - RULE) / 2) : room.columns;
  const right = wide ? room.columns - left - RULE : room.columns;
  const size = { columns: right, rows: chartHeight(room) };
  const bars = barRows(layout, { rest, spread, state, columns: left });
  const corners = rest ? cornerRows(layout, rest, left, brief.hold === Number.POSITIVE_INFINITY) : working(left);
  const mends = rest ? mendRows(layout, rest, words, left) : [];
  const course = [
    heading("Time course at the worst corner"),
    ...(rest ? courseRows(layout, rest, { brief, state, size }) : working(right)),
  ];
  const chance = [heading("How the worst unit is spread"), ...spreadRows(layout, spread, { brief, state, size })];
  const causes = [
    heading("What eats the margin"),
    ...(margin === undefined ? working(left) : causeRows(margin, { layout, currency: plan.currency, columns: left })),
  ];
  const cautions = rest ? cautionRows(rest.cautions, room.columns) : [];
  const rows = wide
    ? [
        ...sideBySide(sections(bars, corners, mends, causes), sections(course, chance), left, state),
        EMPTY_ROW,
        ...cautions,
      ]
    : sections(bars, corners, mends, course, chance, causes, cautions);
  return scrolled(state, "sharing", bankHead(state, layout), rows, room);
}
