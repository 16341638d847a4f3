// The whole search the slow and obvious way, written from the rules alone: plain loops over objects, nothing of src/search.
import type { Capacitor, ResistorFamily } from "../../src/catalog/index.ts";
import type { Brief } from "../../src/search/index.ts";
import { type SlowChain, type SlowChoice, slowBalance, slowCharging, slowPurchase, within } from "./slowBank.ts";

export interface SlowLayout {
  readonly id: string;
  readonly part: string;
  readonly series: number;
  readonly parallel: number;
  readonly ties: "cross-tied" | "strings";
  readonly units: number;
  /** Minor units; Infinity when the capacitors have no price. */
  readonly cost: number;
  readonly volume: number;
  readonly mass: number;
  /** Infinity when the tolerance is unknown. */
  readonly stress: number;
  readonly charging: number | null;
  readonly choice: SlowChoice | null;
}

export interface SlowPlan {
  readonly required: number;
  readonly layouts: readonly SlowLayout[];
  readonly front: readonly string[];
  readonly refused: readonly string[];
}

/** More than any purchase of these small catalogues. */
const BOUND = 600;

const boxOf = (u: Capacitor): number => {
  const tall = u.length ?? u.height;
  if (u.diameter !== undefined && tall !== undefined) return u.diameter * u.diameter * tall;
  if (u.length !== undefined && u.width !== undefined && u.height !== undefined) return u.length * u.width * u.height;
  return Number.POSITIVE_INFINITY;
};

export function slowRequired(brief: Brief): number {
  const { energy: e, voltage: v, ripple: r, steady } = brief;
  const pulse = (2 * e) / (v ** 2 * r * (2 - r));
  return steady === undefined ? pulse : Math.max(pulse, steady.current / (steady.frequency * r * v));
}

function balanceOf(
  unit: Capacitor,
  brief: Brief,
  at: { readonly n: number; readonly p: number; readonly tied: boolean; readonly limit: number },
  families: readonly ResistorFamily[],
): { readonly choice: SlowChoice; readonly cost: number } | null {
  let best: { readonly choice: SlowChoice; readonly cost: number } | null = null;
  for (const family of families) {
    const chain: SlowChain = {
      voltage: brief.voltage * (1 + brief.overshoot),
      series: at.n,
      sharing: at.tied ? at.p : 1,
      spread: family.tolerance,
      leakage: unit.leakage,
      insulation: unit.leakage === undefined ? unit.insulation : undefined,
      capacitance: unit.capacitance,
      low: unit.tolerance?.low ?? 0,
      high: unit.tolerance?.high ?? 0,
      hold: brief.hold,
    };
    const choice = slowBalance(chain, at.limit, family);
    if (choice === null) continue;
    const positions = at.tied ? at.n : at.n * at.p;
    const count = positions * choice.elements;
    const cost = slowPurchase(family, count, count + BOUND)?.cost ?? Number.POSITIVE_INFINITY;
    if (best === null || cost < best.cost || (cost === best.cost && choice.elements < best.choice.elements))
      best = { choice, cost };
  }
  return best;
}

export function slowPlan(brief: Brief, parts: readonly Capacitor[], families: readonly ResistorFamily[]): SlowPlan {
  const required = slowRequired(brief);
  const voltage = brief.voltage * (1 + brief.overshoot);
  const layouts: SlowLayout[] = [];
  for (const unit of parts) {
    const limit = Math.min(brief.derating, unit.derating ?? 1) * unit.voltage;
    const low = unit.tolerance?.low ?? 0;
    const high = unit.tolerance?.high ?? 0;
    const each = brief.basis === "nominal" ? unit.capacitance : unit.capacitance * (1 - low) * (1 - brief.ageing);
    for (let n = 1; n <= brief.maxSeries; n++) {
      const charging = slowCharging(voltage, n, low, high);
      if (!within(charging, limit)) continue;
      let p = 1;
      while ((p * each) / n < required * (1 - 1e-9)) p++;
      const units = n * p;
      if (units > brief.maxUnits) continue;
      const bought = slowPurchase(unit, units + brief.spares, units + brief.spares + BOUND);
      if (bought === null) continue;
      const volume = boxOf(unit) * units;
      const mass = (unit.mass ?? Number.POSITIVE_INFINITY) * units;
      if (brief.maxVolume !== undefined && !within(volume, brief.maxVolume)) continue;
      if (brief.maxMass !== undefined && !within(mass, brief.maxMass)) continue;
      for (const tied of n > 1 && p > 1 ? [true, false] : [false]) {
        const leaks = unit.leakage !== undefined || unit.insulation !== undefined;
        const balance = n > 1 && leaks ? balanceOf(unit, brief, { n, p, tied, limit }, families) : null;
        if (n > 1 && leaks && balance === null) continue;
        const resistors = balance === null || !Number.isFinite(balance.cost) ? 0 : balance.cost;
        const cost = bought.cost + resistors;
        if (brief.maxCost !== undefined && !within(cost / 100, brief.maxCost)) continue;
        const worst = Math.max(charging, balance?.choice.worst ?? 0);
        const ties = tied ? "cross-tied" : "strings";
        layouts.push({
          id: `${unit.part} ${n}s${p}p ${ties}`,
          part: unit.part,
          series: n,
          parallel: p,
          ties,
          units,
          cost,
          volume,
          mass,
          // One in series shares with nobody: its stress is known whatever its tolerance.
          stress: unit.tolerance === undefined && n > 1 ? Number.POSITIVE_INFINITY : worst / unit.voltage,
          charging: unit.tolerance === undefined && n > 1 ? null : charging,
          choice: balance?.choice ?? null,
        });
      }
    }
  }
  return {
    required,
    layouts: ordered(layouts),
    front: frontOf(layouts),
    refused: parts.map((u) => u.part).filter((part) => !layouts.some((l) => l.part === part)),
  };
}

/** Selection by the rule: assessed before not assessed, then total cost, units, volume, name. */
function ordered(layouts: readonly SlowLayout[]): readonly SlowLayout[] {
  const before = (a: SlowLayout, b: SlowLayout): boolean => {
    const sure = (l: SlowLayout): number => (Number.isFinite(l.stress) ? 0 : 1);
    if (sure(a) !== sure(b)) return sure(a) < sure(b);
    if (a.cost !== b.cost) return a.cost < b.cost;
    if (a.units !== b.units) return a.units < b.units;
    if (a.volume !== b.volume) return a.volume < b.volume;
    return a.id < b.id;
  };
  const left = [...layouts];
  const out: SlowLayout[] = [];
  while (left.length > 0) {
    let first = 0;
    for (let i = 1; i < left.length; i++) if (before(left[i] as SlowLayout, left[first] as SlowLayout)) first = i;
    out.push(left[first] as SlowLayout);
    left.splice(first, 1);
  }
  return out;
}

/** All pairs: what no other beats in cost, volume, mass, units and stress. */
export function frontOf(layouts: readonly SlowLayout[]): readonly string[] {
  const five = (l: SlowLayout): readonly number[] => [l.cost, l.volume, l.mass, l.units, l.stress];
  const beaten = (l: SlowLayout): boolean =>
    layouts.some((o) => {
      const [a, b] = [five(o), five(l)];
      return a.every((x, i) => x <= (b[i] as number)) && a.some((x, i) => x < (b[i] as number));
    });
  return layouts.filter((l) => !beaten(l)).map((l) => l.id);
}
