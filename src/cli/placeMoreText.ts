// The further parts of a placing's text: resistors, the front of charging against holding, what to do when a unit comes out.

import { visible } from "../order/index.ts";
import type { FrontPoint, ResistorEffect } from "../place/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import type { Placed } from "./placed.ts";
import { textTable } from "./table.ts";
import { bullet, wrap } from "./wrap.ts";

const percent = (gap: number | null): string =>
  gap === null ? "not assessed" : formatQuantity(gap, "fraction", { digits: 3, rounding: "up" });

/** The holding gap beside other resistors, as placed and after placing anew. */
export function resistorsText({ resistors }: Placed, width: number): string {
  if (resistors === null) return "";
  const table = textTable<ResistorEffect>(
    [
      {
        heading: "balancing resistor",
        cell: (row) => (Number.isFinite(row.resistance) ? formatQuantity(row.resistance, "resistance") : "none"),
      },
      { heading: "holding gap as placed", cell: (row) => percent(row.asPlaced), side: "right" },
      { heading: "placed for it", cell: (row) => percent(row.replaced), side: "right" },
    ],
    resistors,
    width,
    "  ",
  );
  return `Effect of the balancing resistors on holding\n${table}`;
}

/** Points of the front; the balanced one is marked. */
export function frontText({ front }: Placed, width: number): string {
  if (front === null) return "";
  const table = textTable<FrontPoint>(
    [
      { heading: "charging gap", cell: (point) => percent(point.charging), side: "right" },
      { heading: "holding gap", cell: (point) => percent(point.holding), side: "right" },
      { heading: "", cell: (_, i) => (i === front.balanced ? "balanced: the greater of the two is least" : "") },
    ],
    front.points,
    width,
    "  ",
  );
  const how = front.exact ? "exact: every placing was looked at" : "the best found";
  return `Charging against holding, ${how}\n${table}`;
}

/** The fewest units to solder anew after one comes out. */
export function mendingText({ mending, placing }: Placed, width: number): string {
  if (mending === null) return "";
  const { out, found } = mending;
  const name = placing.ties === "cross-tied" ? "stage" : "string";
  const rows = found.rows.map((row) => {
    const steps = row.steps.map(
      (step) =>
        `${name} ${step.group + 1} place ${step.at + 1}: ${step.in === null ? "left empty" : `${visible(step.in)} in`}`,
    );
    const enough = row === found.enough ? ", which brings the gap back" : "";
    const text = `${row.moves} ${row.moves === 1 ? "position" : "positions"} changed, charging gap ${percent(row.charging)}${enough}: ${steps.join("; ")}`;
    return bullet(text, width);
  });
  const goal = found.enough === null ? "nothing found brings the gap back" : "fewest changes first";
  return [wrap(`When ${visible(out)} comes out (${goal})`, width), ...rows].join("\n");
}
