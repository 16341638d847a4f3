// The voltage of one stage in each state as bars, against the derated limit and the full rating.
import type { LayoutResult, ShareSpread } from "../../search/index.ts";
import { wantsSpread } from "../detail.ts";
import { marksBar } from "../marksBar.ts";
import type { RestDetail } from "../ports.ts";
import { type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { fitText } from "../text.ts";
import { NOT_ASSESSED, shown, shownLimit, shownWorst } from "../values.ts";
import { paragraph } from "./words.ts";

const LABEL = 16;
/** "316.44 V, 97.6 % over". */
const FIGURE = 22;
const WIDEST_BAR = 70;

interface Bar {
  readonly label: string;
  readonly volts: number | null;
  readonly text: string;
}

export interface BarsOf {
  readonly rest: RestDetail | null | undefined;
  readonly spread: ShareSpread | null | undefined;
  readonly state: State;
  readonly columns: number;
}

/** What stands for the likely voltage: it is drawn only when it is wanted. */
function likely({ spread, state }: BarsOf, { series }: LayoutResult): Bar {
  const label = "likely worst";
  if (spread) return { label, volts: spread.median, text: shown(spread.median, "voltage") };
  const words = wantsSpread(state) ? (spread === null ? NOT_ASSESSED : "...") : "c shows it";
  return { label, volts: null, text: series === 1 ? "one stage: none" : words };
}

/** One row a state; where the limit and the rating stand is told beneath. */
export function barRows(layout: LayoutResult, of: BarsOf): readonly Row[] {
  const { rest, state, columns } = of;
  const { share, series } = layout;
  const { even, charging, holding, limit } = share;
  const rating = rest?.rating ?? null;
  const worst = (label: string, volts: number | null): Bar => ({ label, volts, text: shownWorst(volts, "voltage") });
  const bars: readonly Bar[] = [
    { label: "even", volts: even, text: shown(even, "voltage") },
    likely(of, layout),
    worst("worst, charging", charging),
    worst("worst, holding", holding),
  ];
  const known = bars.map(({ volts }) => volts ?? 0);
  const full = Math.max(limit, rating ?? 0, ...known) * 1.05;
  const width = Math.max(8, Math.min(WIDEST_BAR, columns - LABEL - FIGURE - 2));
  const marks = [{ at: limit, letter: "L" }, ...(rating === null ? [] : [{ at: rating, letter: "R" }])];
  const ascii = state.look.ascii;
  const which = series === 1 ? "The one stage" : `One stage of ${series}; any may be the worst`;
  const rated = rating === null ? "" : `, R its full rating ${shownLimit(rating, "voltage")}`;
  return [
    ...paragraph(`${which}. L is the limit ${shownLimit(limit, "voltage")}${rated}.`, columns, "quiet"),
    ...bars.map(({ label, volts, text }) => {
      const over = volts !== null && volts > limit;
      const past = rating !== null && volts !== null && volts > rating ? " over R" : " over L";
      const part = volts === null || over ? "" : `, ${shownWorst(volts / limit, "fraction")}`;
      return rowOf(
        span(fitText(label, LABEL)),
        span(marksBar(volts ?? Number.NaN, { columns: width, full, marks, ascii }), over ? "bad" : "good"),
        span(` ${text}${part}`, over ? "bad" : "plain"),
        ...(over ? [span(past, "bad")] : []),
      );
    }),
  ];
}
