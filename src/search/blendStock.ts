// What stock would change the choice: one string fewer of a part that is used, or more of one that has run out.

import { purchase } from "../catalog/index.ts";
import { toMajor } from "../quantity/index.ts";
import { type BlendLimits, findBlend } from "./blend/findBlend.ts";
import type { BlendModel, BlendOption } from "./blend/model.ts";
import { bestWith } from "./blend/priceSwitch.ts";
import { facts } from "./blend/shipments.ts";
import type { FoundBlend } from "./blend/singles.ts";
import type { BlendWork } from "./blendOptions.ts";
import { type BlendDemand, blendWork } from "./blendOptions.ts";
import type { StockMove } from "./blendResult.ts";

export interface StockQuestion {
  readonly work: BlendWork;
  readonly demand: BlendDemand;
  readonly cheapest: FoundBlend;
  readonly currency: string;
  readonly limits: BlendLimits;
  readonly nameOf: (blend: FoundBlend, work: BlendWork) => string;
}

/** Counts beyond the stock that are tried for one part. */
const MOST_MORE = 60;

const held = (option: BlendOption, most: number): BlendOption => ({
  ...facts(option),
  maxStrings: Math.min(option.maxStrings, most),
  costs: option.costs,
});

const withParts = (model: BlendModel, part: number, most: (option: BlendOption) => number): BlendModel => ({
  ...model,
  options: model.options.map((option) => (option.partIndex === part ? held(option, most(option)) : option)),
});

/** Every part of the cheapest blend with a string fewer; every part whose stock bounds it, with as much more as first pays. */
export function stockMoves(question: StockQuestion): readonly StockMove[] {
  const { work, cheapest, currency, limits, nameOf } = question;
  const fewer = cheapest.counts.map(({ option, strings }): StockMove => {
    const type = work.types[option]!;
    const answer = findBlend(
      withParts(work.model, work.model.options[option]!.partIndex, () => strings - 1),
      limits,
    );
    const units = type.series * strings + type.terms.brief.spares;
    return {
      part: type.unit.part,
      move: "fewer",
      // Below what the strings of the blend take, it cannot be built.
      units,
      change: answer.best === null ? null : toMajor(answer.best.cost - cheapest.cost, currency),
      next: answer.best === null ? null : nameOf(answer.best, work),
      proven: answer.status !== "stopped",
    };
  });
  return [...fewer, ...moreOf(question)];
}

/** A part bounded by what can be had: the least that must be on sale before a blend with more of it is cheaper. */
function moreOf({ work, demand, cheapest, currency, limits, nameOf }: StockQuestion): readonly StockMove[] {
  const scarce = demand.parts.filter((unit) => unit.available !== undefined);
  return scarce.flatMap((unit): StockMove[] => {
    const { available: _, ...endless } = unit;
    const parts = demand.parts.map((one) => (one === unit ? endless : one));
    const open = blendWork({ ...demand, parts });
    const best = findBlend(open.model, limits);
    if (best.best === null || best.best.cost >= cheapest.cost) return [];
    // Some blend with more of it is cheaper: the smallest count that is.
    const spares = demand.terms.brief.spares;
    let proven = best.status === "optimal";
    for (let more = 1; more <= MOST_MORE; more += 1) {
      for (const [option, type] of open.types.entries()) {
        if (type.unit !== endless) continue;
        const had = Math.max(
          0,
          ...work.types.flatMap((one, at) => (one.unit === unit ? [work.model.options[at]!.maxStrings] : [])),
        );
        const strings = had + more;
        if (strings > open.model.options[option]!.maxStrings) continue;
        const other = bestWith(open.model, { option, strings }, limits);
        proven &&= other.proven;
        if (other.blend === null || other.blend.cost >= cheapest.cost) continue;
        return [
          {
            part: unit.part,
            move: "more",
            units: purchase(endless, type.series * strings + spares)?.bought ?? 0,
            change: toMajor(other.blend.cost - cheapest.cost, currency),
            next: nameOf(other.blend, open),
            proven,
          },
        ];
      }
    }
    return [];
  });
}
