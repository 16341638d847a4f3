// What to improve: what each cause eats of the margin, and what tightening it saves, by searching again with the tightened value.

import { type Cause, marginCauses, requiredCapacitance } from "../bank/index.ts";
import type { Capacitor, Fuse, ResistorFamily } from "../catalog/index.ts";
import { toMajor } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { pricedIn } from "./currency.ts";
import { comparison, firstRows, idOf, tiesOf } from "./rank.ts";
import type { Found, Improve, Improvement, LayoutResult } from "./result.ts";
import { holdCaseOf } from "./sharing/holdCase.ts";
import { sweep } from "./sweep.ts";

export interface ImproveInput {
  readonly result: Pick<LayoutResult, "series" | "parallel" | "ties" | "balance">;
  readonly unit: Capacitor;
  readonly brief: Brief;
  readonly families: readonly ResistorFamily[];
  readonly currency: string | null;
  /** Fuses that the search chooses from; null or left out: no fuse catalogue. */
  readonly fuses?: readonly Fuse[] | null;
}

/** Resistor tolerance that is tried: E96, the closest that is sold everywhere. */
const CLOSE_RESISTOR = 0.01;

/** Null for one in series or an unknown tolerance: there is no margin to divide. */
export function improve(input: ImproveInput): Improve | null {
  const { result, unit, brief } = input;
  const known = holdCaseOf(input);
  const tolerance = unit.tolerance;
  if (result.series === 1 || tolerance === undefined) return null;
  const derating = Math.min(brief.derating, unit.derating ?? 1);
  const sharing = result.ties === "cross-tied" ? result.parallel : 1;
  const margins = marginCauses({
    n: result.series,
    m: sharing,
    C: unit.capacitance,
    tLow: tolerance.low,
    tHigh: tolerance.high,
    leakage: known?.leakage ?? null,
    insulation: known?.insulation ?? null,
    R: result.balance?.resistance ?? null,
    q: result.balance?.tolerance ?? 0,
    V: brief.voltage,
    hold: brief.hold,
    overshoot: brief.overshoot,
    derating,
    rating: unit.voltage,
  });
  const baseline = bestOf(input);
  const whole = unit.voltage - margins.even;
  return {
    even: margins.even,
    worst: margins.worst,
    rating: unit.voltage,
    free: margins.free,
    baseline,
    causes: margins.causes.map(({ cause, volts, without }) => {
      const tried = volts === null ? null : tighten(input, cause);
      const found = tried === null ? null : bestOf(tried.input);
      return {
        cause,
        volts,
        share: volts === null || !(whole > 0) ? null : volts / whole,
        without,
        tightened: tried?.change ?? null,
        found,
        saves: found === null || baseline === null ? null : savedBy(baseline, found),
      };
    }),
  };
}

const savedBy = (before: Found, after: Found): { readonly units: number; readonly cost: number | null } => ({
  units: before.units - after.units,
  cost: before.cost === null || after.cost === null ? null : Number((before.cost - after.cost).toPrecision(12)),
});

interface Tried {
  readonly input: ImproveInput;
  readonly change: NonNullable<Improvement["tightened"]>;
}

/** The input with one cause tightened; null when it is as tight as it is tried already. */
function tighten(input: ImproveInput, cause: Cause): Tried | null {
  const { unit, brief, families } = input;
  const change = (quantity: string, from: number, to: number, unitName = "1") => ({
    quantity,
    from,
    to,
    unit: unitName,
  });
  switch (cause) {
    case "capacitance tolerance": {
      const { low, high } = unit.tolerance ?? { low: 0, high: 0 };
      if (low === 0 && high === 0) return null;
      const half = { low: low / 2, high: high / 2 };
      // What energy is reckoned with changes with it, as it would on the bench.
      return {
        input: { ...input, unit: { ...unit, tolerance: half } },
        change: change("tolerance halved", Math.max(low, high), Math.max(low, high) / 2),
      };
    }
    case "leakage": {
      if (unit.leakage !== undefined && unit.leakage > 0)
        return {
          input: { ...input, unit: { ...unit, leakage: unit.leakage / 2 } },
          change: change("leakage halved", unit.leakage, unit.leakage / 2, "A"),
        };
      if (unit.leakage !== undefined || unit.insulation === undefined) return null;
      return {
        input: { ...input, unit: { ...unit, insulation: unit.insulation * 2 } },
        change: change("insulation doubled", unit.insulation, unit.insulation * 2, "ohm"),
      };
    }
    case "resistor tolerance": {
      const widest = Math.max(0, ...families.map((one) => one.tolerance));
      if (widest <= CLOSE_RESISTOR) return null;
      const close = families.map((one) => ({ ...one, tolerance: Math.min(one.tolerance, CLOSE_RESISTOR) }));
      return {
        input: { ...input, families: close },
        change: change("resistor tolerance", input.result.balance?.tolerance ?? widest, CLOSE_RESISTOR),
      };
    }
    case "overshoot":
      if (brief.overshoot === 0) return null;
      return {
        input: { ...input, brief: { ...brief, overshoot: 0 } },
        change: change("overshoot", brief.overshoot, 0),
      };
    default: {
      const derating = Math.min(brief.derating, unit.derating ?? 1);
      if (derating >= 1) return null;
      return {
        input: { ...input, unit: { ...unit, derating: 1 }, brief: { ...brief, derating: 1 } },
        change: change("derating", derating, 1),
      };
    }
  }
}

/** The best by cost, then units, of one part in the given ties. */
function bestOf({ result, unit, brief, currency, ...input }: ImproveInput): Found | null {
  const parts = pricedIn([unit], currency, brief);
  const families = pricedIn(input.families, currency, brief);
  const { table } = sweep({
    parts,
    families,
    brief,
    required: requiredCapacitance(brief),
    currency,
    fuses: input.fuses ?? null,
  });
  const kept = Array.from({ length: table.count }, (_, row) => row).filter((row) => {
    const plain = table.series[row] === 1 || table.parallel[row] === 1;
    return plain || tiesOf(table, row) === result.ties;
  });
  const compare = comparison(table, parts, "cost");
  const [first] = firstRows(kept.length, 1, (a, b) => compare(kept[a] as number, kept[b] as number));
  const row = first === undefined ? undefined : kept[first];
  if (row === undefined) return null;
  const cost = table.cost[row] as number;
  return {
    id: idOf(table, parts, row),
    series: table.series[row] as number,
    parallel: table.parallel[row] as number,
    units: table.units[row] as number,
    cost: currency === null || !Number.isFinite(cost) ? null : toMajor(cost, currency),
  };
}
