// One layout fired once, and again: current, reversal, energies, what each unit bears, charging, heat, life, faults.

import type { Capacitor } from "../catalog/index.ts";
import {
  type Charge,
  type Consistency,
  checkStated,
  type Discharge,
  type Drift,
  dischargeOf,
  type Envelope,
  type Fault,
  type Fuse,
  faultTable,
  type Heating,
  type PulseBank,
  rateFindings,
  reversalBound,
} from "../pulse/index.ts";
import { accepted, type Finding, type Read } from "../quantity/index.ts";
import { type Band, shotBand } from "./band.ts";
import type { Brief } from "./brief.ts";
import { chargeFor, driftFor, firingOf, rippleFor } from "./charging.ts";
import { type BusFound, circuitOf, pulseBankFor } from "./circuit.ts";
import { placedReversal, shotEnvelope } from "./envelope.ts";
import { faultBankOf } from "./faults.ts";
import { fuseSeesAt } from "./fuses.ts";
import { highestShot } from "./highestShot.ts";
import { type LampReport, lampReport } from "./lampReport.ts";
import { type LifeReport, lifeOf } from "./life.ts";
import { limitFindings } from "./limits.ts";
import type { LayoutResult } from "./result.ts";
import { unitRatingFindings } from "./unitRatings.ts";

export interface ShotInput {
  readonly layout: LayoutResult;
  readonly unit: Capacitor;
  readonly brief: Brief;
  /** Fuse in series with each unit (each string, for strings); null for none. */
  readonly fuse?: Fuse | null;
}

/** Everything about one layout's shot. null is not asked or not known; `notes` and `findings` say which. */
export interface ShotReport {
  readonly voltage: number;
  readonly bank: PulseBank;
  readonly discharge: Discharge;
  readonly bus: BusFound;
  readonly envelope: Envelope;
  /** Current and voltage over time with everything that spreads; null when nothing does. */
  readonly band: Band | null;
  readonly charge: Charge | null;
  /** Highest rate that the charger keeps up with, all units at their high capacitance, Hz. */
  readonly highestRate: number | null;
  readonly heating: Heating | null;
  readonly drift: Drift | null;
  readonly ripple: number | null;
  readonly life: LifeReport;
  readonly lamp: LampReport | null;
  readonly stated: Consistency | null;
  readonly faults: readonly Fault[];
  readonly findings: readonly Finding[];
  readonly notes: readonly string[];
}

/** Voltage of the worst unit while charged, V; null when charging or holding is not assessed. */
function worstVoltage({ layout, unit }: ShotInput): number | null {
  const { share, series } = layout;
  if (series === 1) return share.even;
  const leaks = unit.leakage !== undefined || unit.insulation !== undefined;
  if (share.charging === null || share.holding === null || !leaks) return null;
  return Math.max(share.charging, share.holding);
}

const statedOf = ({ brief }: ShotInput, bank: PulseBank): Consistency | null => {
  const { stated } = brief;
  if (stated === undefined) return null;
  const { peakCurrent = null, ringFrequency = null, loss = null } = stated;
  return checkStated({ capacitance: bank.capacitance, voltage: brief.voltage, peakCurrent, ringFrequency, loss });
};

/** The shot of a layout from the brief's charge voltage. Refused: no load, and what the pulse layer cannot reckon with. */
export function shotOf(input: ShotInput): Read<ShotReport> {
  const { layout, unit, brief, fuse = null } = input;
  const bank = pulseBankFor(unit, layout);
  const found = circuitOf(brief, bank);
  if (!found.ok) return found;
  const { circuit, bus } = found.value;
  const shot = dischargeOf(bank, circuit, brief.voltage);
  if (!shot.ok) return shot;
  const discharge = shot.value;
  const envelope = shotEnvelope({ brief, unit, shape: layout, circuit, bank });
  if (!envelope.ok) return envelope;
  const placed = placedReversal({ brief, unit, shape: layout, circuit, bank });
  if (!placed.ok) return placed;
  const band = shotBand({ brief, unit, shape: layout, circuit, bank });
  if (!band.ok) return band;
  const highest = highestShot({ brief, unit, shape: layout, circuit, bank });
  if (!highest.ok) return highest;
  const top = highest.value;
  const left = Math.sqrt((2 * discharge.energy.left) / bank.capacitance);
  const charge = chargeFor(brief, { capacitance: bank.capacitance, left });
  const slowest = chargeFor(brief, { capacitance: layout.capacitance.high ?? bank.capacitance, left });
  if (!charge.ok) return charge;
  if (!slowest.ok) return slowest;
  const fired = { action: discharge.action, seconds: discharge.duration, share: discharge.unit.actionShare };
  const { heating } = firingOf(brief, bank, unit, { charge: charge.value, shot: fired });
  const { highest: highestRate } = firingOf(brief, bank, unit, { charge: slowest.value, shot: fired });
  const own =
    bank.esl === null || circuit.bus === null ? null : bank.esl + (circuit.section ?? 0) + circuit.bus.inductance;
  const lamp = lampReport(brief, { capacitance: bank.capacitance, own });
  if (!lamp.ok) return lamp;
  const worst = worstVoltage(input);
  const rise = brief.rate === undefined ? 0 : (heating?.unitRise ?? null);
  const stated = statedOf(input, bank);
  const faults = faultTable({
    ...faultBankOf({ result: layout, unit, brief }),
    fuse,
    bus: circuit.bus,
    shot: {
      peakCurrent: discharge.peakCurrent,
      unitAction:
        fuse === null
          ? top.discharge.unit.action
          : fuseSeesAt(brief, unit, layout, worst ?? Number.POSITIVE_INFINITY).normalAction,
      unitHeat: discharge.unit.heat,
      highest: top,
    },
    chargerHighest: brief.charger?.highest ?? brief.charger?.supply ?? null,
  });
  const rated =
    brief.rate === undefined || heating === null
      ? []
      : rateFindings(
          heating,
          { rate: brief.rate, highest: highestRate },
          { rippleCurrent: unit.rippleCurrent ?? null, temperatureRise: brief.maxTemperatureRise ?? null },
        ).filter(({ id }) => id !== "pulse.unit.rise" || brief.maxTemperatureRise === undefined);
  return accepted({
    voltage: brief.voltage,
    bank,
    discharge,
    bus,
    envelope: envelope.value,
    band: band.value,
    charge: charge.value,
    highestRate,
    heating,
    drift: driftFor(brief, bank, unit, layout.balance),
    ripple: rippleFor(brief, bank),
    life: lifeOf(brief, unit, { voltage: worst, reversal: discharge.unit.reversal, rise }),
    lamp: lamp.value,
    stated,
    faults,
    findings: [
      ...unitRatingFindings(top.discharge, {
        unit,
        envelope: top.envelope,
        series: layout.series,
        parallel: layout.parallel,
        clampDrop: circuit.clamp?.drop ?? null,
        placed: {
          reversal: placed.value,
          bound: reversalBound({ bank, circuit, unit: discharge.unit, bounds: discharge.bounds }),
        },
      }),
      ...bus.findings,
      ...rated,
      ...(stated?.findings ?? []),
      ...faults.flatMap(({ findings }) => findings),
      ...limitFindings(brief, { unit, worst: worst ?? Number.POSITIVE_INFINITY, ...layout }),
    ],
    notes: notesOf(input, { discharge, bus, heating }),
  });
}

function notesOf(
  { brief, unit, layout }: ShotInput,
  of: { readonly discharge: Discharge; readonly bus: BusFound; readonly heating: Heating | null },
): readonly string[] {
  const { discharge, bus, heating } = of;
  return [
    ...discharge.notes,
    ...(bus.note === null ? [] : [bus.note]),
    ...(unit.tolerance === undefined && layout.parallel > 1
      ? ["The tolerance is unknown: the units are taken as alike, so the worst unit may carry more."]
      : []),
    ...(brief.charger === undefined ? ["No charger was given: charging time and highest rate are not assessed."] : []),
    ...(brief.rate !== undefined && brief.charger === undefined && heating !== null
      ? ["Heat counts the shots alone: the charging current is unknown."]
      : []),
    ...(brief.rate !== undefined && heating === null
      ? ["Heat is not assessed: the action of a shot has no bound here."]
      : []),
  ];
}
