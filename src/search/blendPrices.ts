// What prices would change the choice: a part without a price that would win below one, and how far a known price may move.

import { type Capacitor, purchase } from "../catalog/index.ts";
import { toMajor } from "../quantity/index.ts";
import type { BlendLimits } from "./blend/findBlend.ts";
import type { BlendCount, BlendModel } from "./blend/model.ts";
import { bestWith, priceSwitches } from "./blend/priceSwitch.ts";
import type { FoundBlend } from "./blend/singles.ts";
import type { PriceMove, WinningPrice } from "./blendResult.ts";
import { sendersOf } from "./blendShipments.ts";
import { resistorsOf, type StringType } from "./blendString.ts";

/** Counts of one unpriced part that are tried, and parts; each is a search of its own. */
const MOST_COUNTS = 100;
const MOST_PARTS = 20;

export interface PriceQuestion {
  readonly model: BlendModel;
  readonly types: readonly StringType[];
  /** Names of the suppliers of the model's shipments. */
  readonly senders: readonly string[];
  /** The cheapest blend, or null when none fits yet: then any price would do that lets the part in. */
  readonly cheapest: FoundBlend | null;
  readonly currency: string;
  readonly limits: BlendLimits;
}

/** For each part without a price, the unit price below which a blend with it would be the cheapest. */
export function winningPrices(question: PriceQuestion, unpriced: readonly StringType[]): readonly WinningPrice[] {
  return unpriced.map((type, at) => {
    const unknown = { part: type.unit.part, below: null, computed: false, proven: false };
    return at < MOST_PARTS && question.cheapest !== null ? winningPrice(question, question.cheapest, type) : unknown;
  });
}

function winningPrice(question: PriceQuestion, cheapest: FoundBlend, type: StringType): WinningPrice {
  const { model, types, senders, currency } = question;
  const { unit, series, candidate, terms } = type;
  const { brief } = terms;
  const own = types.findIndex((one) => one.unit.part === unit.part);
  const amount = (each: number | null, ceiling: number): number =>
    ceiling === Number.POSITIVE_INFINITY ? 0 : series * (each as number);
  const most = Math.min(
    MOST_COUNTS,
    Math.ceil(model.requirement / (candidate.basis / series)),
    Math.floor(brief.maxUnits / series),
  );
  let best = 0;
  let proven = true;
  for (let x = 1; x <= most; x += 1) {
    // Its own cost in the model is what stays when the units are free: resistors and the line.
    const bought = boughtFor(unit, series * x + brief.spares);
    if (bought === null) break;
    if (bought === 0) continue;
    const rest = resistorsOf(type, x).cost + terms.lineCost;
    if ((cheapest.cost - rest) / bought <= best) continue;
    const costs = new Float64Array(x + 1).fill(rest, 1);
    const suppliers = sendersOf(type, x, senders).map((name) => senders.indexOf(name));
    const option = {
      suppliers,
      capacity: candidate.basis / series,
      volume: amount(candidate.volume, model.ceilings.volume),
      mass: amount(candidate.mass, model.ceilings.mass),
      units: series,
      maxStrings: x,
      costs,
      partIndex: own < 0 ? model.options.length : model.options[own]!.partIndex,
    };
    const extended = { ...model, options: [...model.options, option] };
    const other = bestWith(extended, { option: model.options.length, strings: x }, question.limits);
    proven &&= other.proven;
    if (other.blend !== null) best = Math.max(best, (cheapest.cost - other.blend.cost) / bought);
  }
  const reached = most < MOST_COUNTS || candidate.basis * most >= model.requirement * series;
  return {
    part: unit.part,
    below: best > 0 ? toMajor(Math.round(best * 100) / 100, currency) : null,
    computed: true,
    proven: proven && reached,
  };
}

/** Units that must be bought at one unit price, packs and minimum order included; null when they cannot be had. */
function boughtFor(unit: Capacitor, needed: number): number | null {
  const { priceBreaks: _breaks, ...terms } = unit;
  return purchase({ ...terms, price: 1 }, needed)?.bought ?? null;
}

/** Moves of the prices that the cheapest blend rests on, and falls of the prices of `others`, smallest first, at the quantities now bought. */
export function priceMoves(
  question: PriceQuestion,
  others: readonly number[],
  nameOf: (blend: FoundBlend) => string,
): readonly PriceMove[] {
  const { model, types, cheapest, currency, limits } = question;
  if (cheapest === null) return [];
  const used = cheapest.counts.map(({ option }) => option);
  const partOf = (option: number): number => model.options[option]!.partIndex;
  return [...new Set([...used, ...others].map(partOf))]
    .flatMap((part) => {
      const ways = model.options.flatMap(({ partIndex }, at) => (partIndex === part ? [at] : []));
      const bought = ({ option, strings }: BlendCount): number => {
        const { unit, series, terms } = types[option]!;
        return strings === 0 ? 0 : (purchase(unit, series * strings + terms.brief.spares)?.bought ?? 0);
      };
      return priceSwitches(model, cheapest, ways, limits, bought);
    })
    .map(({ option, move, perUnit, next, proven }) => ({
      part: types[option]!.unit.part,
      move,
      perUnit: toMajor(Math.round(perUnit * 100) / 100, currency),
      next: nameOf(next),
      proven,
    }))
    .sort((a, b) => a.perUnit - b.perUnit || (a.part < b.part ? -1 : 1));
}
