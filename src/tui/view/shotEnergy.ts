// Where the joules of a shot go: one bar for all of them, a letter for each taker, and a line for each with its part.
import type { ShotReport } from "../../search/index.ts";
import { type Row, rowOf, span } from "../row.ts";
import { fitText } from "../text.ts";
import { shown } from "../values.ts";
import { heading } from "./section.ts";
import { portion } from "./shotFigures.ts";

const TAKERS = [
  ["load", "L", "load"],
  ["bank", "B", "bank's own ESR"],
  ["isolating", "I", "isolating resistors"],
  ["bus", "U", "bus"],
  ["switch", "S", "switch"],
  ["clamp", "C", "clamp"],
  ["left", ".", "left in the bank"],
] as const;
const WIDEST_BAR = 72;

/** Letters in proportion, each at most one cell off; all cells are given out. */
function balanceBar(parts: readonly { readonly part: number; readonly letter: string }[], cells: number): string {
  let out = "";
  let sum = 0;
  for (const { part, letter } of parts) {
    sum += Math.max(0, part);
    out += letter.repeat(Math.max(0, Math.min(cells, Math.round(sum * cells)) - out.length));
  }
  return out + "?".repeat(cells - out.length);
}

/** What is nothing is left out, but for load and rest; what is unknown says so. */
export function energyRows({ discharge: { energy, bounds } }: ShotReport, columns: number): readonly Row[] {
  const { stored } = energy;
  const takers = TAKERS.map(([key, letter, words]) => ({ key, letter, words, value: energy[key] })).filter(
    ({ key, value }) => value !== 0 || key === "load" || key === "left",
  );
  const parts = takers.map(({ letter, value }) => ({ letter, part: stored > 0 ? (value ?? 0) / stored : 0 }));
  const bar = balanceBar(parts, Math.max(10, Math.min(WIDEST_BAR, columns - 2)));
  return [
    heading(`Where the ${shown(stored, "energy")} go`),
    rowOf(span("["), span(bar, "accent"), span("]")),
    ...takers.map(({ key, letter, words, value }) => {
      const name = span(`  ${letter} ${fitText(words, 20)}`);
      if (value === null) return rowOf(name, span("unknown, and counted as none", "accent"));
      const bound = key === "load" && bounds.loadEnergy !== "value" ? ` (${bounds.loadEnergy})` : "";
      const part = portion(stored > 0 ? value / stored : 0);
      return rowOf(name, span(`${fitText(shown(value, "energy"), 9, "right")} ${fitText(part, 8, "right")}${bound}`));
    }),
  ];
}
