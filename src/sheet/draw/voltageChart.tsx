/** @jsxImportSource preact */
// The chart of voltages against limits, in pieces when there are many states.

import { Drawing, type Figure } from "./drawing.tsx";
import { Inked } from "./inked.tsx";
import { linesInk } from "./lines.ts";
import { piecesOf } from "./slots.ts";
import { type LimitLine, limitWords, nominalWords, type VoltageBar, voltagePlot, worstWords } from "./voltageBars.ts";

export interface VoltageChartProps {
  /** Starts every id inside the drawing: letters, digits, hyphens. */
  readonly id: string;
  readonly title: string;
  readonly bars: readonly VoltageBar[];
  readonly limits: readonly LimitLine[];
}

const MOST_BARS = 16;
const NOTE =
  "Open bar: even share. Hatched bar: the worst that one unit or stage may see. Thick upright lines: limits.";

/** The chart, in pieces when there are many states. */
export function voltageFigures({ id, title, bars, limits }: VoltageChartProps): readonly Figure[] {
  const pieces = bars.length === 0 ? [] : piecesOf(bars.length, MOST_BARS);
  return pieces.map(([from, to], index): Figure => {
    const part = bars.slice(from - 1, to);
    const { inks, bottom } = voltagePlot(part, limits);
    const { ink, bottom: height } = linesInk([NOTE], bottom);
    const place = pieces.length === 1 ? "" : `, ${index + 1} of ${pieces.length}`;
    const told = part.map((bar) =>
      [`${bar.words}: ${worstWords(bar.worst)}`, nominalWords(bar.nominal)].filter(Boolean).join(", "),
    );
    return {
      id: `${id}-${index + 1}`,
      caption: `Voltages against limits${place}: ${title}`,
      drawing: (
        <Drawing
          id={`${id}-${index + 1}`}
          title={`Voltages against limits of ${title}`}
          description={`${told.join("; ")}. Limits: ${limits.map(limitWords).join(", ") || "none given"}.`}
          height={height}
        >
          <Inked inks={[...inks, ink]} />
        </Drawing>
      ),
    };
  });
}
