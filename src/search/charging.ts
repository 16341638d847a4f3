// Charging and firing again: the charger of the brief, one charge, the highest rate, the heat of the units, the drift of a wait.

import type { Capacitor } from "../catalog/index.ts";
import {
  type Charge,
  type Charger,
  chargeOf,
  chargerRipple,
  type Drift,
  driftOf,
  type Heating,
  heatingOf,
  highestRate,
  type PulseBank,
} from "../pulse/index.ts";
import { accepted, type Read } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import type { Balance } from "./result.ts";

/** The charger in the pulse layer's words; null when the brief does not say how it charges. */
export function chargerOf({ charger }: Pick<Brief, "charger">): Charger | null {
  const { current, power, currentLimit, resistance, supply } = charger ?? {};
  if (current !== undefined) return { kind: "constant current", current };
  if (power !== undefined && currentLimit !== undefined) return { kind: "constant power", power, currentLimit };
  if (supply !== undefined && resistance !== undefined) return { kind: "resistor", resistance, supply };
  return null;
}

/** One charge from what the shot left, V, up to the charge voltage; null without a charger. Refused as by `chargeOf`. */
export function chargeFor(
  brief: Brief,
  bank: { readonly capacitance: number; readonly left: number },
): Read<Charge | null> {
  const charger = chargerOf(brief);
  if (charger === null || bank.left >= brief.voltage) return accepted(null);
  return chargeOf(charger, { capacitance: bank.capacitance, from: bank.left, to: brief.voltage });
}

/** What a shot does to the bank that is fired again and again. */
export interface Firing {
  readonly action: number | null;
  readonly seconds: number;
  readonly share: number;
}

/** Highest rate [Hz] (null without a charger) and the heat at the brief's rate (null without a rate or with a boundless action). */
export function firingOf(
  brief: Brief,
  bank: PulseBank,
  unit: Capacitor,
  of: { readonly charge: Charge | null; readonly shot: Firing },
): { readonly highest: number | null; readonly heating: Heating | null } {
  const { charge, shot } = of;
  const highest = charge === null ? null : highestRate({ charge: charge.seconds, wait: 0, pulse: shot.seconds });
  if (brief.rate === undefined || shot.action === null) return { highest, heating: null };
  const heating = heatingOf({
    rate: brief.rate,
    chargeAction: charge?.action ?? 0,
    shotAction: shot.action,
    esr: bank.esr,
    unitShare: shot.share,
    unitEsr: unit.esr ?? null,
    thermalResistance: unit.thermalResistance ?? null,
  });
  return { highest, heating };
}

/** Where the bank stands after the brief's hold with the charger off, leaking at worst; null for an endless hold or unknown leakage. */
export function driftFor(brief: Brief, bank: PulseBank, unit: Capacitor, balance: Balance | null): Drift | null {
  if (!Number.isFinite(brief.hold)) return null;
  const { series, parallel, capacitance } = bank;
  const chains = balance === null ? 0 : balance.positions / series;
  const paths = balance === null ? 0 : chains / (series * balance.resistance * (1 - balance.tolerance));
  const through = unit.insulation === undefined ? 0 : parallel / (series * unit.insulation);
  if (unit.leakage === undefined && unit.insulation === undefined) return null;
  const siemens = paths + (unit.leakage === undefined ? through : 0);
  return driftOf({
    voltage: brief.voltage,
    capacitance,
    leakage: unit.leakage === undefined ? 0 : unit.leakage * parallel,
    bleeder: siemens === 0 ? null : 1 / siemens,
    seconds: brief.hold,
  });
}

/** Fall between two recharges under the brief's steady current, V; null without one. */
export const rippleFor = ({ steady }: Brief, { capacitance }: PulseBank): number | null =>
  steady === undefined ? null : chargerRipple({ ...steady, capacitance });
