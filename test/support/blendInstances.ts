// Invented catalogues of string types, from a seed: the marketplaces that the blend search is tried on.

import type { BlendModel, BlendOption } from "../../src/search/blend/model.ts";
import { tabulateCosts } from "../../src/search/blend/tabulate.ts";

/** Numbers in [0, 1) from a seed (mulberry32, public domain, from memory). */
export function chance(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/** A part as sold, invented. Prices in cents. */
export interface InventedPart {
  readonly series: number;
  readonly capacity: number;
  readonly volume: number;
  readonly mass: number;
  readonly tiers: readonly { readonly from: number; readonly price: number }[];
  readonly pack: number;
  readonly minimum: number;
  readonly stock: number;
  readonly fixed: number;
  readonly resistor: number;
}

export interface Instance {
  readonly model: BlendModel;
  /** One a model option, in its order. */
  readonly parts: readonly InventedPart[];
}

export interface Recipe {
  readonly parts: number;
  readonly seed: number;
  readonly maxTypes?: number;
  /** Energy range in kJ; the default regime is 0.15 to 8. */
  readonly energy?: readonly [number, number];
  /** Factor on stock; 0.3 is the scarce regime. */
  readonly stock?: number;
  /** Most strings of one part. */
  readonly mostStrings?: number;
  /** Factor on the ceilings, after the draw of 0.75 to 1.65 of a greedy bank; absent: the draw alone. */
  readonly ceiling?: number;
}

/** Cheapest purchase of at least q units under all-units tiers, packs, minimum and stock; null when it cannot be had. */
export function invoice(part: InventedPart, units: number): number | null {
  const least = Math.max(units, part.minimum);
  let best: number | null = null;
  part.tiers.forEach((tier, at) => {
    const packs = Math.ceil(Math.max(least, tier.from) / part.pack);
    const bought = packs * part.pack;
    const next = part.tiers[at + 1];
    if (bought > part.stock || (next && bought >= next.from)) return;
    const cost = bought * tier.price;
    if (best === null || cost < best) best = cost;
  });
  return best;
}

const KINDS = [
  { name: "elko", volts: [63, 450], farads: [1e-4, 1e-2], density: 0.5e6, kilos: 1500, euro: 0.06 },
  { name: "film", volts: [400, 1500], farads: [5e-6, 2e-4], density: 0.18e6, kilos: 1200, euro: 0.5 },
  { name: "oil", volts: [1000, 6000], farads: [2e-6, 1e-4], density: 0.12e6, kilos: 1600, euro: 0.35 },
] as const;

const between = (random: () => number, low: number, high: number): number => low * (high / low) ** random();

function inventPart(random: () => number, voltage: number, stockFactor: number): InventedPart {
  const kind = KINDS[Math.floor(random() * KINDS.length)]!;
  const rated = between(random, kind.volts[0], kind.volts[1]);
  const unit = Number(between(random, kind.farads[0], kind.farads[1]).toPrecision(2));
  const tolerance = 0.05 + 0.15 * random();
  // Least n whose worst stage, one low among many high, stays within the rating.
  let series = Math.max(1, Math.ceil(voltage / rated));
  while (series > 1 && voltage / (1 + ((series - 1) * (1 - tolerance)) / (1 + tolerance)) > rated) series += 1;
  const joules = 0.5 * unit * rated * rated;
  const volume = (joules / kind.density) * between(random, 0.7, 1.6);
  const price = Math.max(5, Math.round(100 * (0.3 + joules * kind.euro * between(random, 0.5, 2))));
  const steps = [1, 0.97 - 0.05 * random(), 0.9 - 0.08 * random(), 0.8 - 0.12 * random()];
  return {
    series,
    capacity: (unit * (1 - tolerance)) / series,
    volume: volume * series * 1.2,
    mass: volume * series * kind.kilos * between(random, 0.8, 1.2),
    tiers: [1, 10, 50, 100].map((from, at) => ({ from, price: Math.max(1, Math.round(price * steps[at]!)) })),
    pack: [1, 1, 1, 2, 5, 10, 25][Math.floor(random() * 7)]!,
    minimum: Math.max(1, Math.floor(20 * random() ** 2)),
    stock: Math.max(2, Math.round(stockFactor * between(random, 4, 3000))),
    fixed: Math.round(500 + 3500 * random()),
    resistor: Math.round(5 + 40 * random()),
  };
}

const tableOf = (part: InventedPart, most: number): Float64Array =>
  tabulateCosts({
    purchase: (units) => invoice(part, units),
    unitsPerString: part.series,
    resistorsPerString: part.series,
    resistorPurchase: (count) => count * part.resistor,
    fixed: part.fixed,
    mostStrings: most,
  });

export function optionOf(part: InventedPart, most: number, partIndex: number): BlendOption {
  const costs = tableOf(part, most);
  const { capacity, volume, mass, series } = part;
  return { capacity, volume, mass, units: series, maxStrings: costs.length - 1, costs, partIndex };
}

/** What the `maxTypes` largest options bring together: a need above it would be trivially out of reach. */
function mostCapacity(options: readonly BlendOption[], maxTypes: number): number {
  const each = options.map((o) => o.capacity * o.maxStrings).sort((a, b) => b - a);
  return each.slice(0, maxTypes).reduce((sum, value) => sum + value, 0);
}

/** A bank picked by cost per farad among options that bring their part of what is missing, for the size of the ceilings. */
function greedy(options: readonly BlendOption[], need: number, maxTypes: number) {
  const all = (o: BlendOption): number => o.capacity * o.maxStrings;
  const rate = (o: BlendOption): number => o.costs[o.maxStrings]! / all(o);
  const left = new Set(options.filter((o) => o.maxStrings > 0));
  const sum = { capacity: 0, volume: 0, mass: 0 };
  for (let slots = maxTypes; slots > 0 && sum.capacity < need && left.size > 0; slots -= 1) {
    const share = (need - sum.capacity) / slots;
    const able = [...left].filter((o) => all(o) >= share);
    const pick =
      able.length > 0
        ? able.reduce((a, b) => (rate(b) < rate(a) ? b : a))
        : [...left].reduce((a, b) => (all(b) > all(a) ? b : a));
    const x = Math.min(pick.maxStrings, Math.ceil((need - sum.capacity) / pick.capacity));
    sum.capacity += x * pick.capacity;
    sum.volume += x * pick.volume;
    sum.mass += x * pick.mass;
    left.delete(pick);
  }
  return sum;
}

/** Elko, film and oil parts at one voltage, with ceilings on volume and mass near those of a greedy bank. */
export function inventInstance(recipe: Recipe): Instance {
  const random = chance(recipe.seed * 7919 + recipe.parts);
  const voltage = between(random, 600, 6000);
  const [low, high] = recipe.energy ?? [0.15, 8];
  const requirement = (2000 * between(random, low, high)) / (voltage * voltage);
  const maxTypes = recipe.maxTypes ?? 2 + Math.floor(3 * random());
  const most = recipe.mostStrings ?? 60;
  const parts: InventedPart[] = [];
  const options: BlendOption[] = [];
  for (let k = 0; k < recipe.parts; k += 1) {
    const part = inventPart(random, voltage, recipe.stock ?? 1);
    parts.push(part);
    options.push(optionOf(part, Math.min(most, Math.ceil(requirement / part.capacity)), k));
  }
  const reach = mostCapacity(options, maxTypes);
  const within = reach > 0 ? Math.min(requirement, 0.85 * reach) : requirement;
  const bank = greedy(options, within, maxTypes);
  const factor = recipe.ceiling ?? 1;
  const ceilings = {
    volume: bank.volume * (0.75 + 0.9 * random()) * factor,
    mass: bank.mass * (0.75 + 0.9 * random()) * factor,
    units: Number.POSITIVE_INFINITY,
  };
  return { model: { options, requirement: within, ceilings, maxTypes }, parts };
}
