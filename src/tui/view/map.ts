// The map of the trade-off: the whole front as a scatter, or by its counts, and the layout under the cursor in sentences.
import { AXES } from "../axes.ts";
import { chartRows, type Mark } from "../chart.ts";
import { frontOf, type Placed, placedPoints, pointUnder } from "../mapPoints.ts";
import { isSame, planOf } from "../pick.ts";
import type { PlotRange } from "../plot.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { grouped } from "../values.ts";
import { layoutSentences } from "./layouts.ts";
import { countRows } from "./mapCounts.ts";
import { type Page, pageOf, type Room } from "./page.ts";
import { emptyRows, paragraph } from "./words.ts";

/** Where the largest is so many times the smallest, the axis is logarithmic, or all would crowd at its low end. */
const LOG_FROM = 30;

interface Scale {
  readonly at: (value: number) => number;
  readonly range: PlotRange;
  readonly low: number;
  readonly high: number;
  readonly isLog: boolean;
}

function scaleOf(values: readonly number[]): Scale {
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const isLog = low > 0 && high / low >= LOG_FROM;
  const at = isLog ? Math.log : (value: number) => value;
  // A margin, so that no point lies on the frame.
  const pad = (at(high) - at(low)) * 0.04 || Math.abs(at(high)) * 0.04 || 1;
  return { at, range: { low: at(low) - pad, high: at(high) + pad }, low, high, isLog };
}

function scatterRows(state: State, points: readonly Placed[], here: Placed, room: Room): readonly Row[] {
  const [across, up] = [AXES[state.map.x], AXES[state.map.y]];
  const x = scaleOf(points.map((point) => point.x));
  const y = scaleOf(points.map((point) => point.y));
  const spot = (point: Placed) => ({ x: x.at(point.x), y: y.at(point.y) });
  const pins = state.pins.flatMap((pin, index): readonly Mark[] => {
    const found = points.find(({ point }) => isSame(point.layout, pin));
    return found === undefined ? [] : [{ at: spot(found), letter: "ABCD"[index] ?? "?" }];
  });
  const log = (scale: Scale): string => (scale.isLog ? ", logarithmic" : "");
  return chartRows({
    columns: room.columns,
    rows: Math.max(3, room.rows - 1),
    x: x.range,
    y: y.range,
    curves: [{ points: points.map(spot), joined: false, glyph: "o" }],
    marks: [...pins, { at: spot(here), letter: "X" }],
    top: up.text(y.high, here.point),
    bottom: up.text(y.low, here.point),
    under: [across.text(x.low, here.point), `${across.words}${log(x)}`, across.text(x.high, here.point)],
    ascii: state.look.ascii,
  });
}

const headWords = (state: State, shown: number, all: number): string => {
  const { x, y, table } = state.map;
  const what = table ? "series across, parallel down" : `${AXES[y].words} up, ${AXES[x].words} across`;
  return `${grouped(shown)} of ${grouped(all)} unbeaten layouts: ${what}`;
};

export function mapPage(state: State, room: Room): Page {
  const empty = emptyRows(state, room.columns);
  if (empty.length > 0) return pageOf(empty);
  if (state.answer?.kind === "planned" && state.answer.front === null)
    return pageOf(paragraph("Working out the front ...", room.columns, "strong"));
  const all = planOf(state)?.front.length ?? 0;
  const points = placedPoints(state);
  const here = pointUnder(state, points);
  const head = rowOf(span(headWords(state, points.length, all), "strong"));
  const off = frontOf(state).length - points.length;
  const beyond = all - frontOf(state).length;
  const notes = [
    ...(off > 0
      ? [`${grouped(off)} cannot be placed: ${AXES[state.map.x].words} or ${AXES[state.map.y].words} is unknown.`]
      : []),
    ...(beyond > 0 ? [`The ${grouped(beyond)} beyond the first ${grouped(frontOf(state).length)} are left out.`] : []),
  ].flatMap((note) => paragraph(note, room.columns, "warn"));
  if (here === null) return pageOf([head, ...notes, ...paragraph("x and y choose other axes.", room.columns)]);
  const { layout } = here.point;
  const lead = state.map.table
    ? `under the cursor: ${layout.series} in series, ${layout.parallel} in parallel`
    : `X: ${AXES[state.map.y].words} ${AXES[state.map.y].text(here.y, here.point)}, ${AXES[state.map.x].words} ${AXES[state.map.x].text(here.x, here.point)}`;
  const detail = [
    ...notes,
    rowOf(span(lead, "accent")),
    ...layoutSentences(layout).flatMap((sentence) => paragraph(sentence, room.columns)),
  ].slice(0, Math.max(2, Math.floor(room.rows * 0.4)));
  const size = { columns: room.columns, rows: room.rows - detail.length - 1 };
  const drawn = state.map.table ? countRows(points, here, size) : scatterRows(state, points, here, size);
  const fill = Array.from({ length: Math.max(0, size.rows - drawn.length) }, () => EMPTY_ROW);
  return pageOf([head, ...drawn.slice(0, size.rows), ...fill, ...detail]);
}
