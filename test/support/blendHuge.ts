// A very large invented catalogue whose cost tables are only made when the search asks for them.
import type { BlendModel, BlendOption } from "../../src/search/blend/model.ts";
import { lazyOption } from "../../src/search/blend/tabulate.ts";
import { type InventedPart, inventInstance, invoice, optionOf } from "./blendInstances.ts";

/** Least price of a unit over all tiers, which packs and minimum orders only add to; and the cheapest way to one string. */
const floorOf = (part: InventedPart) => ({
  fixed: part.fixed,
  perString: part.series * (Math.min(...part.tiers.map(({ price }) => price)) + part.resistor),
  least: part.fixed + (invoice(part, part.series) ?? 0) + part.series * part.resistor,
});

export function hugeModel(parts: number, seed: number): BlendModel {
  const instance = inventInstance({ parts, seed });
  const options = instance.model.options.map((option, at): BlendOption => {
    const { costs: _, ...facts } = option;
    const part = instance.parts[at]!;
    return lazyOption(facts, floorOf(part), () => optionOf(part, facts.maxStrings, at).costs);
  });
  return { ...instance.model, options };
}
