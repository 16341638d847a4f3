// Peak current against the loop's inductance as a short table, beside the lossless bound.

import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { InductanceSweep, SweepPoint } from "../search/index.ts";
import { textTable } from "./table.ts";
import { wrap } from "./wrap.ts";

/** Points that are shown, evenly apart, both ends among them; all are in the JSON. */
const SHOWN = 5;

const show = (x: number, dimension: Dimension): string => formatQuantity(x, dimension, { digits: 4 });

/** The block; empty where inductance has no say. */
export function sweepText(sweep: InductanceSweep | null, width: number): string {
  if (sweep === null || sweep.points.length < 2) return "";
  const { points, here, bound } = sweep;
  const last = points.length - 1;
  const shown = Array.from({ length: SHOWN }, (_, i) => points[Math.round((i * last) / (SHOWN - 1))] as SweepPoint);
  const table = textTable<SweepPoint>(
    [
      { heading: "inductance", cell: ({ inductance }) => show(inductance, "inductance"), side: "right" },
      { heading: "peak", cell: ({ peak }) => show(peak, "current"), side: "right" },
      { heading: "lossless bound", cell: ({ lossless }) => show(lossless, "current"), side: "right" },
    ],
    [...new Set(shown)],
    width,
    "  ",
  );
  const own =
    here === null
      ? "The loop's own inductance is unknown: usual values are swept."
      : `The loop has ${show(here, "inductance")}${bound ? ", as far as it is known" : ""}.`;
  const upper = bound ? " The peaks are upper bounds: something in the loop is unknown." : "";
  return ["Peak current against loop inductance", table, wrap(`${own}${upper}`, width, "  ")].join("\n");
}
