// Small blend models by hand, and small random ones that brute force can settle.
import type { BlendModel, BlendOption } from "../../src/search/blend/model.ts";
import { chance } from "./blendInstances.ts";

export interface PlainOption {
  readonly capacity: number;
  readonly most: number;
  /** Cents a string, or the whole table without its leading 0. */
  readonly price: number | readonly number[];
  readonly fixed?: number;
  readonly volume?: number;
  readonly mass?: number;
  readonly units?: number;
  readonly part?: number;
}

export function plainOption(from: PlainOption, at = 0): BlendOption {
  const { price, fixed = 0 } = from;
  const costs = Float64Array.from({ length: from.most + 1 }, (_, x) => {
    if (x === 0) return 0;
    return typeof price === "number" ? fixed + price * x : price[x - 1]!;
  });
  return {
    capacity: from.capacity,
    volume: from.volume ?? 0,
    mass: from.mass ?? 0,
    units: from.units ?? 1,
    maxStrings: from.most,
    costs,
    partIndex: from.part ?? at,
  };
}

const OPEN = Number.POSITIVE_INFINITY;

export const plainModel = (
  requirement: number,
  options: readonly PlainOption[],
  limits: { readonly volume?: number; readonly mass?: number; readonly units?: number; readonly types?: number } = {},
): BlendModel => ({
  requirement,
  options: options.map(plainOption),
  ceilings: { volume: limits.volume ?? OPEN, mass: limits.mass ?? OPEN, units: limits.units ?? OPEN },
  maxTypes: limits.types ?? options.length,
});

/** A few options with uneven, stepped prices; some share a part, some weigh nothing, some ceilings are open. */
export function tinyModel(seed: number): BlendModel {
  const random = chance(seed * 104729 + 17);
  const whole = (low: number, high: number): number => low + Math.floor(random() * (high - low + 1));
  const count = whole(1, 5);
  const options = Array.from({ length: count }, (_, at): BlendOption => {
    const most = whole(0, 7);
    const costs = new Float64Array(most + 1);
    let cost = whole(0, 30);
    for (let x = 1; x <= most; x += 1) {
      if (x > 1 || random() < 0.9) cost += random() < 0.3 ? 0 : whole(1, 40);
      costs[x] = cost;
    }
    return {
      capacity: whole(1, 12) * 1e-6,
      volume: random() < 0.2 ? 0 : whole(1, 9) * 1e-4,
      mass: random() < 0.2 ? 0 : whole(1, 9) * 0.1,
      units: whole(1, 4),
      maxStrings: most,
      costs,
      partIndex: random() < 0.25 ? 0 : at,
    };
  });
  const ceiling = (size: number): number => (random() < 0.3 ? OPEN : size * whole(2, 30));
  return {
    options,
    requirement: whole(5, 60) * 1e-6,
    ceilings: { volume: ceiling(1e-4), mass: ceiling(0.1), units: random() < 0.6 ? OPEN : whole(3, 30) },
    maxTypes: whole(1, 4),
  };
}

/** The same with suppliers: up to four, some options from the hand, some with two senders, some shipments free. */
export function shippedModel(seed: number): BlendModel {
  const model = tinyModel(seed);
  const random = chance(seed * 7 + 3);
  const whole = (low: number, high: number): number => low + Math.floor(random() * (high - low + 1));
  const shipments = Array.from({ length: whole(1, 4) }, () => (random() < 0.15 ? 0 : whole(1, 80)));
  const options = model.options.map((option): BlendOption => {
    const senders = shipments.map((_, at) => at).filter(() => random() < (random() < 0.2 ? 0.9 : 0.4));
    return senders.length === 0 ? option : { ...option, suppliers: senders.slice(0, 2) };
  });
  return { ...model, options, shipments };
}

/** Prices drawn near those that matter for a model whose blends cost about `cost`. */
export function anyPrices(seed: number, cost: number) {
  const random = chance(seed + 5);
  const draw = (): number => (random() < 0.3 ? 0 : cost * 2 * random());
  return { cost: 1 as const, capacity: cost * 3 * random(), volume: draw(), mass: draw(), units: draw() };
}
