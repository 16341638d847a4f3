// What happens to one arrangement when something fails: the fault table of the pulse layer, fed from an assessed layout.

import type { Capacitor } from "../catalog/index.ts";
import { type Fault, type FaultBank, type FaultUnit, faultTable } from "../pulse/index.ts";
import type { Brief } from "./brief.ts";
import type { LayoutResult } from "./result.ts";
import { holdCaseOf } from "./sharing/holdCase.ts";

export interface FaultedBank {
  readonly result: Pick<LayoutResult, "series" | "parallel" | "ties" | "share" | "balance">;
  readonly unit: Capacitor;
  readonly brief: Brief;
}

/** One unit as the fault table wants it. */
export const faultUnitOf = (unit: Capacitor): FaultUnit => ({
  capacitance: unit.capacitance,
  ratedVoltage: unit.voltage,
  surgeVoltage: unit.surgeVoltage ?? null,
  ...(unit.tolerance ? { toleranceLow: unit.tolerance.low, toleranceHigh: unit.tolerance.high } : {}),
  esr: unit.esr ?? null,
  esl: unit.esl ?? null,
  ruptureEnergy: unit.ruptureEnergy ?? null,
  action: unit.action ?? null,
});

/** What of the brief stands between a failed unit and the others, fuses apart. */
export const guardsOf = ({ isolating, section, shortResistance }: Brief) => ({
  isolatingResistance: isolating ?? null,
  sectionInductance: section?.inductance ?? null,
  shortResistance: shortResistance ?? null,
});

/** An assessed layout as the fault table wants it; what is unknown stays unknown. */
export function faultBankOf({ result, unit, brief }: FaultedBank): FaultBank {
  const { share, balance } = result;
  const voltage = brief.voltage * (1 + brief.overshoot);
  return {
    series: result.series,
    parallel: result.parallel,
    ties: result.ties,
    unit: faultUnitOf(unit),
    voltage,
    leastVoltage: brief.voltage,
    ...guardsOf(brief),
    // Without the tolerance nothing less than the whole voltage bounds what one unit may see.
    worstCharging: share.charging ?? voltage,
    worstHolding: share.holding,
    hold: holdCaseOf({ result, unit, brief }),
    balance: balance && { resistance: balance.resistance, hold: Number.isFinite(brief.hold) ? brief.hold : null },
  };
}

export const faultsOf = (bank: FaultedBank): readonly Fault[] => faultTable(faultBankOf(bank));
