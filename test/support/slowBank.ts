// A bank at rest worked out the slow and obvious way, straight from the rules on paper: plain loops, nothing of src/bank but the time course.
import { worstAtHold } from "../../src/bank/index.ts";
import type { PurchaseTerms, ResistorFamily } from "../../src/catalog/index.ts";

/** One comparison of the rules: an exact fit is a fit. */
export const within = (value: number, limit: number): boolean => value <= limit * (1 + 1e-9);

export interface SlowChain {
  readonly voltage: number;
  readonly series: number;
  /** Units that share one resistor. */
  readonly sharing: number;
  /** Resistor tolerance q. */
  readonly spread: number;
  readonly leakage?: number | undefined;
  readonly insulation?: number | undefined;
  readonly capacitance: number;
  readonly low: number;
  readonly high: number;
  /** s; Infinity is for ever. */
  readonly hold: number;
}

export const slowCharging = (voltage: number, n: number, low: number, high: number): number =>
  (voltage * (1 + high)) / (1 + high + (n - 1) * (1 - low));

/** Worst end of the hold, V, at most V: more than all the volts no stage can have. */
const slowEnd = (chain: SlowChain, resistance: number): number =>
  Math.min(slowFormula(chain, resistance), chain.voltage);

/**
 * The same, or the highest on the way of a finite hold where that is higher than both ends. The time course is the bank layer's own, which its
 * tests hold to a circuit simulator and to every corner; all else here is written anew.
 */
export function slowHolding(chain: SlowChain, resistance: number): number {
  const end = slowEnd(chain, resistance);
  if (chain.hold === Number.POSITIVE_INFINITY || chain.series === 1) return end;
  const { voltage: V, series: n, sharing: m, capacitance: C, low, high, spread: q, hold } = chain;
  const { leakage = 0, insulation = Number.POSITIVE_INFINITY } = chain;
  const way = worstAtHold({ n, m, C, tLow: low, tHigh: high, leakage, insulation, R: resistance, q, V, hold }).voltage;
  return way > Math.max(end, slowCharging(V, n, low, high)) * (1 + 1e-9) ? way : end;
}

/** The rule's own equation for V_1, then, for a finite hold, the exponential from each corner of C; may exceed V, and is what R is chosen by. */
export function slowFormula(chain: SlowChain, resistance: number): number {
  const { voltage, series: n, sharing: m, spread: q, capacitance, low, high, hold } = chain;
  if (n === 1) return voltage;
  const leak = chain.leakage === undefined ? 0 : m * chain.leakage;
  const leaky = chain.insulation === undefined ? 0 : m / chain.insulation;
  const tight = 1 / (resistance * (1 + q));
  const rest = 1 / (resistance * (1 - q)) + leaky;
  // Charge balance of the node between the tight stage and the n - 1 others in series.
  const end = ((voltage * rest) / (n - 1) + leak) / (tight + rest / (n - 1));
  if (hold === Number.POSITIVE_INFINITY) return end;
  let worst = 0;
  for (const c1 of [1 - low, 1 + high]) {
    for (const c2 of [1 - low, 1 + high]) {
      const start = (voltage * c2) / (c2 + (n - 1) * c1);
      const tau = (m * capacitance * (c1 + c2 / (n - 1))) / (tight + rest / (n - 1));
      worst = Math.max(worst, end + (start - end) * Math.exp(-hold / tau));
    }
  }
  return worst;
}

export interface SlowChoice {
  readonly resistance: number;
  readonly element: number;
  readonly elements: number;
  readonly worst: number;
}

/** As slowBelow; where the way of the hold stands too high, the same with a smaller R, a few times. */
export function slowBalance(chain: SlowChain, limit: number, family: ResistorFamily, most = 3000): SlowChoice | null {
  let below = Number.POSITIVE_INFINITY;
  for (let step = 0; step < 6; step++) {
    const choice = slowBelow(chain, limit, family, { most, below });
    if (choice === null) return null;
    const worst = slowHolding(chain, choice.resistance);
    if (within(worst, limit) || chain.hold === Number.POSITIVE_INFINITY) return { ...choice, worst };
    below = choice.resistance * (1 - 1e-6);
  }
  return null;
}

/** For k = 1, 2, 3, ...: tries every preferred value from the top until the share holds, then the volts and watts of one element. */
function slowBelow(
  chain: SlowChain,
  limit: number,
  family: ResistorFamily,
  { most, below }: { readonly most: number; readonly below: number },
): SlowChoice | null {
  const { spread: q } = chain;
  for (let k = 1; k <= most; k++) {
    let element = 0;
    for (const value of family.values) {
      if (value > element && value * k <= below && within(slowFormula(chain, value * k), limit)) element = value;
    }
    if (element === 0) continue;
    const resistance = element * k;
    const worst = slowEnd(chain, resistance);
    const watts = (worst * worst) / (resistance * (1 - q)) / k;
    if (within(worst / k, family.voltage) && within(watts, family.power * family.derating))
      return { resistance, element, elements: k, worst };
  }
  return null;
}

export interface SlowPurchase {
  readonly bought: number;
  /** Minor units; Infinity without a price. */
  readonly cost: number;
}

/** Every quantity from nothing to `bound`: those that are whole packs, reach the minimum order and can be had. */
export function slowPurchase(terms: PurchaseTerms, needed: number, bound: number): SlowPurchase | null {
  const { onHand = 0, pack = 1, minimumOrder = 1, available = Number.POSITIVE_INFINITY } = terms;
  if (onHand >= needed) return { bought: 0, cost: 0 };
  let best: SlowPurchase | null = null;
  for (let bought = 1; bought <= bound && bought <= available; bought++) {
    if (bought % pack !== 0 || bought < minimumOrder || bought + onHand < needed) continue;
    let price = terms.price ?? Number.POSITIVE_INFINITY;
    for (const step of terms.priceBreaks ?? []) if (bought >= step.from) price = step.price;
    const cost = Number.isFinite(price) ? Math.floor(bought * price + 0.5 + 1e-9) : Number.POSITIVE_INFINITY;
    if (best === null || cost < best.cost) best = { bought, cost };
  }
  return best;
}
