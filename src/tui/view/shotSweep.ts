// Peak current against the loop's inductance, the loop's own marked, under the bound that no loss at all would allow.
import type { InductanceSweep, ShotReport } from "../../search/index.ts";
import { chartRows } from "../chart.ts";
import type { Row } from "../row.ts";
import { shown } from "../values.ts";
import { dotted } from "./sharingCourse.ts";
import type { ShotDrawn } from "./shotTrace.ts";
import { paragraph } from "./words.ts";

export function sweepRows(
  sweep: InductanceSweep | null,
  { discharge }: ShotReport,
  { state, size }: ShotDrawn,
): readonly Row[] {
  const { columns } = size;
  if (sweep === null) {
    const why = discharge.method === "samples" ? "The current is given, so inductance has no say." : "Not assessed.";
    return paragraph(why, columns);
  }
  const { points, here, bound } = sweep;
  const { ascii } = state.look;
  const [first, last] = [points[0], points.at(-1)];
  if (first === undefined || last === undefined) return [];
  const x = (inductance: number): number => Math.log(inductance);
  const most = Math.max(...points.map(({ peak }) => peak));
  // The bound runs off the top where losses decide: it is drawn as far as the peaks leave room.
  const high = Math.min(most * 1.6, Math.max(...points.map(({ lossless }) => lossless))) * 1.05;
  const peaks = points.map(({ inductance, peak }) => ({ x: x(inductance), y: peak }));
  const lossless = points.map((point) => ({ x: x(point.inductance), y: point.lossless }));
  const own =
    here === null
      ? "The loop's own inductance is unknown: usual values are swept, and the shot above counts none."
      : `H here: ${shown(here, "inductance")}${bound ? ", as far as it is known" : ""}.`;
  return [
    ...chartRows({
      ...size,
      x: { low: x(first.inductance), high: x(last.inductance) },
      y: { low: 0, high },
      curves: [
        { points: peaks, joined: true, glyph: "*" },
        { points: dotted(lossless, columns), joined: false, glyph: "o" },
      ],
      marks: here === null ? [] : [{ at: { x: x(here), y: discharge.peakCurrent }, letter: "H" }],
      top: shown(high, "current"),
      bottom: "0",
      under: [shown(first.inductance, "inductance"), "loop inductance, log", shown(last.inductance, "inductance")],
      ascii,
    }),
    ...paragraph(
      `${ascii ? "*" : "Line"}: peak current${bound ? " (upper bound: something in the loop is unknown)" : ""}. ${ascii ? "o" : "Dots"}: the lossless bound V sqrt(C/L), which no loop passes. ${own}`,
      columns,
    ),
  ];
}
