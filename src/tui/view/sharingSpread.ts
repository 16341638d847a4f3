// How the worst unit's voltage is spread over many such banks, the limit across it, and the chance of passing it.
import { tenTo } from "../../quantity/index.ts";
import type { LayoutResult, ShareSpread } from "../../search/index.ts";
import { chartRows } from "../chart.ts";
import { wantsSpread } from "../detail.ts";
import type { Point } from "../plot.ts";
import { type Row, rowOf, span } from "../row.ts";
import { grouped, shown, shownLimit, shownWorst } from "../values.ts";
import type { DrawnIn } from "./sharingCourse.ts";
import { paragraph } from "./words.ts";

/** A chance as a power of ten, rounded up in its third figure, so that it never looks smaller than it is. */
export function chanceWords(chance: number): string {
  if (chance === 0) return "0";
  if (chance >= 0.01) return shownWorst(chance, "fraction");
  const power = Math.floor(Math.log10(chance)) - 2;
  // A subnormal chance has no third figure to round.
  const scale = tenTo(power);
  return scale > 0
    ? (Math.ceil(Number((chance / scale).toPrecision(12))) * scale).toExponential(2)
    : chance.toExponential(2);
}

/** Cells that the upright axis takes, so that each dot column gets one line: "banks" and its rule. */
const AXIS = "banks".length + 2;

/** Bins gathered to about one a dot, each drawn as an upright line. */
function area(spread: ShareSpread, high: number, count: number): { readonly points: Point[]; readonly most: number } {
  const { from, to, bins } = spread;
  const heights = Array.from({ length: count }, () => 0);
  const step = (high - from) / count;
  const width = (to - from) / bins.length / step;
  for (const [bin, banks] of bins.entries()) {
    // A bin is shared out to the dots that it lies over: whole bins would make some dots taller than their neighbours.
    for (let place = Math.floor(bin * width); place < (bin + 1) * width && place < count; place += 1) {
      const part = Math.min((bin + 1) * width, place + 1) - Math.max(bin * width, place);
      heights[place] = (heights[place] ?? 0) + (banks * part) / width;
    }
  }
  const points = heights.flatMap((y, place) => {
    const x = from + ((high - from) * (place + 0.5)) / count;
    return y === 0
      ? []
      : [
          { x, y: 0 },
          { x, y },
          { x, y: 0 },
        ];
  });
  return { points, most: Math.max(1, ...heights) };
}

/** The highest bin that any bank fell in, upper edge, V. */
function topOf({ from, to, bins }: ShareSpread): number {
  const last = bins.reduce((found, banks, bin) => (banks > 0 ? bin : found), 0);
  return from + ((to - from) * (last + 1)) / bins.length;
}

export function spreadRows(
  layout: LayoutResult,
  spread: ShareSpread | null | undefined,
  { brief, state, size }: DrawnIn,
): readonly Row[] {
  const { columns } = size;
  if (layout.series === 1) return paragraph("One in series: nothing is shared, so nothing is spread.", columns);
  if (!wantsSpread(state))
    return paragraph(`c draws it; the brief's basis is ${brief.basis}, which does not ask for it.`, columns, "quiet");
  if (spread === undefined) return paragraph("Drawing banks ...", columns, "quiet");
  if (spread === null)
    return paragraph("Not assessed: the tolerance of the unit is unknown, or there is none.", columns, "accent");
  const { limit, median, exceed, error, banks, seed, law } = spread;
  const high = spread.from + (Math.max(limit, topOf(spread)) - spread.from) * 1.04;
  const seen = limit >= spread.from;
  const { points, most } = area(spread, high, Math.max(8, Math.min(spread.bins.length, 2 * (columns - AXIS))));
  const statistical = brief.basis === "statistical";
  const over = statistical && exceed + error > brief.risk;
  const asked = statistical ? `; the brief allows ${chanceWords(brief.risk)}${over ? ": over" : ": within"}` : "";
  return [
    ...chartRows({
      columns,
      rows: Math.max(4, size.rows - 2),
      x: { low: spread.from, high },
      y: { low: 0, high: most * 1.1 },
      curves: [
        ...(seen
          ? [
              {
                points: [
                  { x: limit, y: 0 },
                  { x: limit, y: most * 1.1 },
                ],
                joined: true,
                glyph: "|",
              },
            ]
          : []),
        { points, joined: true, glyph: "*" },
      ],
      marks: [
        ...(seen ? [{ at: { x: limit, y: most * 1.1 }, letter: "L" }] : []),
        { at: { x: median, y: 0 }, letter: "M" },
      ],
      top: "banks",
      bottom: "none",
      under: [shown(spread.from, "voltage"), "worst unit, charging", shown(high, "voltage")],
      ascii: state.look.ascii,
    }),
    ...paragraph(`M likely: the worst unit of half the banks stays below ${shown(median, "voltage")}.`, columns),
    rowOf(
      span(`L limit ${shownLimit(limit, "voltage")}${seen ? "" : ", below the even share"}: chance of a bank over it `),
      span(chanceWords(exceed), over ? "bad" : "strong"),
      span(error > 0 ? "" : exceed === 0 ? ": even the worst corner is below" : ""),
      span(error === 0 ? "" : ` +- ${chanceWords(error)}`),
    ),
    ...paragraph(
      `Reckoned, not counted${asked}. ${grouped(banks)} banks drawn from seed ${seed}, each unit ${law}.`,
      columns,
      over ? "bad" : "quiet",
    ),
  ];
}
