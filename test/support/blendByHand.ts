// Blends the slow and obvious way, from the rules on paper: every string type, every count, every mix. Nothing of src/search.
import type { Capacitor, ResistorFamily } from "../../src/catalog/index.ts";
import type { Brief } from "../../src/search/index.ts";
import { type SlowChain, slowBalance, slowCharging, slowPurchase, within } from "./slowBank.ts";
import { slowRequired } from "./slowPlan.ts";

/** More than any purchase beyond the need in these small catalogues. */
const BOUND = 600;

export interface HandType {
  readonly part: string;
  readonly series: number;
  /** Of one string: F, m3, kg. */
  readonly capacity: number;
  readonly volume: number;
  readonly mass: number;
  /** Minor units for 0, 1, 2 ... strings, as long as they can be had at a known price. */
  readonly costs: readonly number[];
  /** Every way to buy and balance 0, 1, 2 ... strings: its cost and whom it needs something from ("" for one without a name). */
  readonly ways: readonly (readonly HandWay[])[];
}

export interface HandWay {
  readonly cost: number;
  readonly senders: readonly string[];
}

export type HandShipments = (supplier: string) => number;

export interface HandBlend {
  readonly cost: number;
  readonly counts: readonly { readonly part: string; readonly strings: number }[];
}

const boxOf = (u: Capacitor): number => {
  const tall = u.length ?? u.height;
  if (u.diameter !== undefined && tall !== undefined) return u.diameter * u.diameter * tall;
  if (u.length !== undefined && u.width !== undefined && u.height !== undefined) return u.length * u.width * u.height;
  return Number.NaN;
};

function chainOf(unit: Capacitor, brief: Brief, n: number, m: number, q: number): SlowChain {
  return {
    voltage: brief.voltage * (1 + brief.overshoot),
    series: n,
    sharing: m,
    spread: q,
    leakage: unit.leakage,
    insulation: unit.leakage === undefined ? unit.insulation : undefined,
    capacitance: unit.capacitance,
    low: unit.tolerance?.low ?? 0,
    high: unit.tolerance?.high ?? 0,
    hold: brief.hold,
  };
}

/** Resistors of each priced family that serves; one that costs nothing where only families without a price do; none when none serves. */
function resistorWays(
  unit: Capacitor,
  brief: Brief,
  at: { readonly n: number; readonly m: number; readonly positions: number; readonly limit: number },
  families: readonly ResistorFamily[],
): readonly HandWay[] {
  const ways: HandWay[] = [];
  let any = false;
  for (const family of families) {
    const choice = slowBalance(chainOf(unit, brief, at.n, at.m, family.tolerance), at.limit, family);
    if (choice === null) continue;
    any = true;
    const count = at.positions * choice.elements;
    const bought = slowPurchase(family, count, count + BOUND);
    if (bought === null || !Number.isFinite(bought.cost)) continue;
    ways.push({ cost: bought.cost, senders: count > (family.onHand ?? 0) ? [family.supplier ?? ""] : [] });
  }
  return any && ways.length === 0 ? [{ cost: 0, senders: [] }] : ways;
}

/** The cheapest of them; Infinity when none serves. */
const resistors = (...given: Parameters<typeof resistorWays>): number =>
  Math.min(...resistorWays(...given).map(({ cost }) => cost));

/** The string types that can be vouched for and had at a price. */
export function handTypes(
  brief: Brief,
  parts: readonly Capacitor[],
  families: readonly ResistorFamily[],
): readonly HandType[] {
  const required = slowRequired(brief);
  const voltage = brief.voltage * (1 + brief.overshoot);
  const types: HandType[] = [];
  for (const unit of parts) {
    const limit = Math.min(brief.derating, unit.derating ?? 1) * unit.voltage;
    const { low, high } = unit.tolerance ?? { low: 0, high: 0 };
    let n = 1;
    const sound = (count: number): boolean =>
      within(slowCharging(voltage, count, low, high), limit) &&
      (count === 1 ||
        (unit.leakage ?? unit.insulation) === undefined ||
        Number.isFinite(resistors(unit, brief, { n: count, m: 1, positions: count, limit }, families)));
    while (n <= brief.maxSeries && !sound(n)) n += 1;
    if (n > brief.maxSeries) continue;
    if (unit.tolerance === undefined && (n > 1 || brief.basis !== "nominal")) continue;
    if (n > 1 && unit.leakage === undefined && unit.insulation === undefined) continue;
    const volume = brief.maxVolume === undefined ? 0 : n * boxOf(unit);
    const mass = brief.maxMass === undefined ? 0 : n * (unit.mass ?? Number.NaN);
    if (Number.isNaN(volume) || Number.isNaN(mass)) continue;
    const each = brief.basis === "nominal" ? unit.capacitance : unit.capacitance * (1 - low) * (1 - brief.ageing);
    const capacity = each / n;
    const costs = [0];
    const ways: HandWay[][] = [[{ cost: 0, senders: [] }]];
    for (let x = 1; x * n <= brief.maxUnits && (x - 1) * capacity < required; x += 1) {
      const bought = slowPurchase(unit, n * x + brief.spares, n * x + brief.spares + BOUND);
      if (bought === null || !Number.isFinite(bought.cost)) break;
      const apart = n === 1 ? 0 : resistors(unit, brief, { n, m: 1, positions: n * x, limit }, families);
      const tied = n === 1 || x === 1 ? apart : resistors(unit, brief, { n, m: x, positions: n, limit }, families);
      costs.push(bought.cost + Math.min(apart, tied));
      const own = n * x + brief.spares > (unit.onHand ?? 0) ? [unit.supplier ?? ""] : [];
      const balances =
        n === 1
          ? [{ cost: 0, senders: [] }]
          : [
              ...resistorWays(unit, brief, { n, m: 1, positions: n * x, limit }, families),
              ...(x === 1 ? [] : resistorWays(unit, brief, { n, m: x, positions: n, limit }, families)),
            ];
      ways.push(balances.map((one) => ({ cost: bought.cost + one.cost, senders: [...own, ...one.senders] })));
    }
    if (costs.length > 1) types.push({ part: unit.part, series: n, capacity, volume, mass, costs, ways });
  }
  return types;
}

/** Every mix of at most `maxTypes`; null when none meets the need within the limits. */
export function handBlend(
  brief: Brief,
  types: readonly HandType[],
  maxTypes: number,
  shipment: HandShipments = () => 0,
): HandBlend | null {
  const need = slowRequired(brief) * (1 - 1e-9);
  let best: HandBlend | null = null;
  const path: { part: string; strings: number }[] = [];
  const sent = (senders: ReadonlySet<string>): number => [...senders].reduce((sum, name) => sum + shipment(name), 0);
  const go = (
    from: number,
    cost: number,
    capacity: number,
    volume: number,
    mass: number,
    units: number,
    senders: ReadonlySet<string>,
  ): void => {
    const total = cost + sent(senders);
    if (best !== null && total >= best.cost) return;
    if (capacity >= need) {
      if (brief.maxCost === undefined || within(total / 100, brief.maxCost)) best = { cost: total, counts: [...path] };
      return;
    }
    if (path.length === maxTypes) return;
    for (let k = from; k < types.length; k += 1) {
      const type = types[k]!;
      for (let x = 1; x < type.costs.length; x += 1) {
        const [v, m, u] = [volume + x * type.volume, mass + x * type.mass, units + x * type.series];
        if (!within(u, brief.maxUnits)) break;
        if (brief.maxVolume !== undefined && !within(v, brief.maxVolume)) break;
        if (brief.maxMass !== undefined && !within(m, brief.maxMass)) break;
        path.push({ part: type.part, strings: x });
        for (const way of type.ways[x]!)
          go(k + 1, cost + way.cost, capacity + x * type.capacity, v, m, u, new Set([...senders, ...way.senders]));
        path.pop();
      }
    }
  };
  go(0, 0, 0, 0, 0, 0, new Set());
  return best;
}
