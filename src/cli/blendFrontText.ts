// The fronts and the cost ladder of blends as text: what each step costs, drawn to scale, and what is bought on it.

import { formatQuantity } from "../quantity/index.ts";
import type { BlendFront, BlendLadder } from "../search/index.ts";
import { money } from "./layoutText.ts";
import { textTable } from "./table.ts";
import { wrap } from "./wrap.ts";

const BAR = 12;
const UP = { digits: 4, rounding: "up" } as const;

const DIMENSIONS = { volume: "volume", mass: "mass", units: "count", stress: "fraction" } as const;
const TITLES = {
  volume: "room",
  mass: "mass",
  units: "count of units",
  stress: "worst stress, as a part of a unit's rating",
} as const;

export function frontText({ against, points }: BlendFront, currency: string | null, width: number): string {
  const title = `Least cost against ${TITLES[against]}`;
  if (points.length === 0) return wrap(`${title}: no blend fits.`, width);
  const open = points.filter(({ proven }) => !proven).length;
  const table = textTable<BlendFront["points"][number]>(
    [
      { heading: against, cell: (one) => formatQuantity(one.amount, DIMENSIONS[against], UP), side: "right" },
      { heading: "cost", cell: (one) => money(one.cost, currency ?? undefined), side: "right" },
      { heading: "blend", cell: (one) => one.id, least: 24 },
    ],
    points,
    width,
    "  ",
  );
  const end =
    open === 0
      ? "Each is proven the cheapest under its own limit."
      : `${open} of them ${open === 1 ? "is" : "are"} not proven: something cheaper may exist there.`;
  return `${title}\n${table}\n${wrap(end, width, "  ")}`;
}

const ENDS: Readonly<Record<BlendLadder["end"], string>> = {
  complete: "",
  "out of reach": "No blend gives more than the last step: stock or a limit ends it.",
  cut: "There are more steps than are told.",
};

/** Steps from the least energy to the most, bars to the scale of the dearest. */
export function ladderText({ steps, end }: BlendLadder, currency: string | null, width: number): string {
  const title = "Cost ladder: what each step of energy costs";
  if (steps.length === 0) return wrap(`${title}: no blend fits.`, width);
  const dearest = Math.max(...steps.map(({ cost }) => cost), 1e-9);
  const joules = (x: number, rounding: "up" | "down"): string => formatQuantity(x, "energy", { digits: 4, rounding });
  const table = textTable<BlendLadder["steps"][number]>(
    [
      { heading: "", cell: (one) => (one.asked ? ">" : "") },
      { heading: "up to", cell: (one) => joules(one.energy.to, "down"), side: "right" },
      { heading: "cost", cell: (one) => money(one.cost, currency ?? undefined), side: "right" },
      { heading: "", cell: (one) => "=".repeat(Math.max(1, Math.round((BAR * one.cost) / dearest))) },
      { heading: "blend", cell: (one) => one.id, least: 24 },
    ],
    steps,
    width,
    "  ",
  );
  const open = steps.some(({ proven }) => !proven)
    ? "Not every step is proven."
    : "Each step is proven; > is the energy asked for.";
  const least = `From ${joules(steps[0]!.energy.from, "up")}.`;
  return `${title}\n${table}\n${wrap([least, open, ENDS[end]].filter((one) => one !== "").join(" "), width, "  ")}`;
}
