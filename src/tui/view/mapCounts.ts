// The front by its counts: a table of marks, series across and parallel down, each mark how many layouts have these counts.
import type { Placed } from "../mapPoints.ts";
import { type Row, rowOf, type Span, span } from "../row.ts";
import type { Room } from "./page.ts";

/** Cells of one column: a mark between its brackets. */
const CELL = 4;
const LABEL = 10;

/** Rising values gathered to at most so many runs, as even as may be. */
export function runsOf(values: readonly number[], most: number): readonly (readonly number[])[] {
  const rising = [...new Set(values)].sort((a, b) => a - b);
  const count = Math.min(rising.length, Math.max(1, most));
  return Array.from({ length: count }, (_, run) =>
    rising.slice(Math.floor((run * rising.length) / count), Math.floor(((run + 1) * rising.length) / count)),
  );
}

/** ".", "1" to "9", "+" for more. */
const markOf = (count: number): string => (count === 0 ? "." : count > 9 ? "+" : String(count));

const runWords = (run: readonly number[]): string =>
  run.length === 1 ? String(run[0]) : `${run[0]}-${run[run.length - 1]}`;

export function countRows(points: readonly Placed[], here: Placed, { columns, rows }: Room): readonly Row[] {
  const across = runsOf(
    points.map(({ x }) => x),
    Math.floor((columns - LABEL) / CELL),
  );
  const down = runsOf(
    points.map(({ y }) => y),
    Math.max(1, rows - 2),
  );
  const heads = across.map((run) =>
    span(
      String(run[0])
        .padStart(CELL - 1)
        .padEnd(CELL),
      "quiet",
    ),
  );
  const table = down.map((parallel): Row => {
    const cells = across.map((series): Span => {
      const count = points.filter(({ x, y }) => series.includes(x) && parallel.includes(y)).length;
      const isHere = series.includes(here.x) && parallel.includes(here.y);
      const mark = markOf(count);
      return isHere ? span(` [${mark}]`, "focus") : span(`  ${mark} `, count === 0 ? "quiet" : "plain");
    });
    return rowOf(span(`${runWords(parallel)}p `.padStart(LABEL)), ...cells);
  });
  return [
    rowOf(span("series ".padStart(LABEL), "quiet"), ...heads),
    ...table,
    rowOf(span("Marks: 1 to 9 layouts, + for more; [ ] is the cursor.", "quiet")),
  ];
}
