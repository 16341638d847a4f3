// What would change the choice of a blend, in words: prices, stock, and what more room is worth.

import { visible } from "../order/index.ts";
import type { BlendPlan, CeilingWorth } from "../search/index.ts";
import { money } from "./layoutText.ts";
import { bullet, wrap } from "./wrap.ts";

export function movesText({ priceMoves, currency }: BlendPlan, width: number): readonly string[] {
  if (priceMoves.length === 0) return [];
  const lines = priceMoves.map(({ part, move, perUnit, next, proven }) => {
    const way = move === "rise" ? "rises" : "falls";
    return bullet(
      `if ${visible(part)} ${way} by more than ${money(perUnit, currency ?? undefined)} a unit, at the quantities now best, ${visible(next)} is cheaper${proven ? "" : "; a smaller change may do"}`,
      width,
    );
  });
  return [`What prices would change the choice\n${lines.join("\n")}`];
}

export function stockText({ stockMoves, currency }: BlendPlan, width: number): readonly string[] {
  if (stockMoves.length === 0) return [];
  const lines = stockMoves.map(({ part, move, units, change, next, proven }) => {
    const amount = money(Math.abs(change ?? 0), currency ?? undefined);
    const then =
      next === null
        ? proven
          ? "no blend fits"
          : "it is not known whether a blend fits"
        : `${visible(next)} is the cheapest, ${change === 0 ? "at the same cost" : `${amount} ${(change ?? 0) > 0 ? "dearer" : "cheaper"}`}`;
    const how =
      move === "fewer"
        ? `with fewer than ${units} of ${visible(part)}, on hand and bought,`
        : `with ${units} of ${visible(part)} on sale,`;
    return bullet(`${how} ${then}${proven ? "" : " (not proven)"}`, width);
  });
  return [`What stock would change the choice\n${lines.join("\n")}`];
}

const ROOM: readonly (readonly [keyof CeilingWorth, number, string])[] = [
  ["volume", 1e-3, "one more litre of room"],
  ["mass", 1, "one more kilogram"],
  ["units", 1, "one more unit allowed"],
  ["types", 1, "one more part allowed"],
];

export function worthText({ worth, currency }: BlendPlan, width: number): readonly string[] {
  if (worth === null) return [];
  const lines = ROOM.flatMap(([key, each, words]) =>
    worth[key] * each >= 0.005
      ? [bullet(`${words} is worth about ${money(worth[key] * each, currency ?? undefined)}`, width)]
      : [],
  );
  if (lines.length === 0)
    return [
      wrap("No limit holds the cost up: more room would save nothing, as far as fractions of strings tell.", width),
    ];
  return [`What the limits cost (a guide, from fractions of strings)\n${lines.join("\n")}`];
}
