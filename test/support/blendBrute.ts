// The cheapest blend by trying every count of every option: slow, and plain enough to be believed.
import { optionsUsed } from "../../src/search/blend/alternatives.ts";
import { capacityNeeded, isFittingBlend, roomUnder } from "../../src/search/blend/evaluate.ts";
import type { BlendCount, BlendModel } from "../../src/search/blend/model.ts";

/** Least cost over all fitting blends, or null. `visit` sees every blend that has no string to spare in its last option. */
export function bruteForce(
  model: BlendModel,
  visit?: (counts: readonly BlendCount[], cost: number) => void,
): number | null {
  const { options, maxTypes, ceilings } = model;
  const need = capacityNeeded(model.requirement);
  let best: number | null = null;
  const path: BlendCount[] = [];
  const sent = (): number => {
    const senders = new Set(path.flatMap(({ option }) => options[option]!.suppliers ?? []));
    return [...senders].reduce((sum, supplier) => sum + (model.shipments?.[supplier] ?? 0), 0);
  };
  const go = (from: number, cost: number, capacity: number, volume: number, mass: number, units: number): void => {
    if (capacity >= need) {
      if (isFittingBlend(model, path)) {
        const total = cost + sent();
        visit?.([...path], total);
        if (best === null || total < best) best = total;
      }
      return;
    }
    if (path.length === maxTypes) return;
    for (let k = from; k < options.length; k += 1) {
      const o = options[k]!;
      for (let x = 1; x <= o.maxStrings; x += 1) {
        if (volume + x * o.volume > roomUnder(ceilings.volume) * (1 + 1e-12)) break;
        if (mass + x * o.mass > roomUnder(ceilings.mass) * (1 + 1e-12)) break;
        if (visit === undefined && best !== null && cost + o.costs[x]! >= best) break;
        path.push({ option: k, strings: x });
        go(
          k + 1,
          cost + o.costs[x]!,
          capacity + x * o.capacity,
          volume + x * o.volume,
          mass + x * o.mass,
          units + x * o.units,
        );
        path.pop();
        if (capacity + x * o.capacity >= need) break;
      }
    }
  };
  go(0, 0, 0, 0, 0, 0);
  return best;
}

/** Cheapest cost of each set of options, where every option is needed. */
export function kinds(model: BlendModel, below: number): Map<string, number> {
  const best = new Map<string, number>();
  bruteForce(model, (counts, cost) => {
    const capacity = counts.reduce((sum, c) => sum + c.strings * model.options[c.option]!.capacity, 0);
    const needed = counts.every((c) => capacity - model.options[c.option]!.capacity < model.requirement * (1 - 1e-9));
    if (needed && cost < below) best.set(optionsUsed(counts), Math.min(cost, best.get(optionsUsed(counts)) ?? cost));
  });
  return best;
}
