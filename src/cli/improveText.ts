// What eats the margin and what tightening it would save, as a table; information, not advice.

import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { Improve, Improvement } from "../search/index.ts";
import { money } from "./layoutText.ts";
import { textTable } from "./table.ts";
import { wrap } from "./wrap.ts";

const DIMENSIONS: Readonly<Record<string, Dimension>> = { A: "current", ohm: "resistance", "1": "fraction" };

function triedWords({ tightened }: Improvement): string {
  if (tightened === null) return "nothing";
  const { to, unit } = tightened;
  return `to ${formatQuantity(to, DIMENSIONS[unit] ?? "count", { digits: 3 })}`;
}

function savedWords({ tightened, found, saves }: Improvement, currency: string | null): string {
  if (tightened === null) return "";
  if (found === null || saves === null) return "not assessed";
  const units = saves.units === 0 ? "no units" : `${saves.units} units`;
  const cost =
    saves.cost === null ? "" : saves.cost === 0 ? ", no money" : `, ${money(saves.cost, currency ?? undefined)}`;
  return `${units}${cost}`;
}

/** The causes, the largest first. */
export function improveText(improve: Improve, currency: string | null, width: number): string {
  const volts = (x: number | null): string => (x === null ? "unknown" : formatQuantity(x, "voltage", { digits: 3 }));
  const table = textTable<Improvement>(
    [
      { heading: "cause", cell: (one) => one.cause },
      { heading: "eats", cell: (one) => volts(one.volts), side: "right" },
      {
        heading: "of margin",
        cell: ({ share }) => (share === null ? "" : formatQuantity(share, "fraction", { digits: 3 })),
        side: "right",
        rank: 2,
      },
      { heading: "tried", cell: triedWords, side: "right", rank: 3 },
      { heading: "saves", cell: (one) => savedWords(one, currency) },
    ],
    improve.causes,
    width,
    "  ",
  );
  const { even, rating, free, baseline } = improve;
  const rest = free === null ? "what is free is unknown" : `${volts(free)} ${free < 0 ? "over" : "free"}`;
  const from = baseline === null ? "nothing fits as things are" : `${baseline.units} units as things are`;
  const words = `Margin between the even share ${volts(even)} and the full rating ${volts(rating)}; ${rest}. Savings are those of a new search with that one value changed, same part and ties, against ${from}; below zero is more. Derating is there for life and for what is not known: its row is information, no advice.`;
  return [table, wrap(words, width, "  ")].join("\n");
}
