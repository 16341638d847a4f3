// Findings on what the bank gives and bears at rest: energy, steady supply, balancing resistors, bleed.

import { elementPower } from "../bank/index.ts";
import { type Finding, formatQuantity, withinLeast, withinMost } from "../quantity/index.ts";
import type { FindingsInput } from "./findingsInput.ts";
import type { Balance } from "./result.ts";

export function energy({ result, brief }: FindingsInput): Finding {
  // The part of the measured basis is the lot itself, whose mean a placing meets; the placing's own energy is told beside.
  const middle = brief.basis === "nominal" || brief.basis === "measured";
  const value = middle ? result.energy.nominal : result.energy.low;
  return withinLeast({
    id: "pulse-energy",
    state: "pulse",
    value,
    limit: brief.energy,
    unit: "J",
    source: "joulewright-design",
    note:
      value === null
        ? "The tolerance is unknown, so the least energy of a pulse is not known."
        : `Energy of one pulse from ${formatQuantity(brief.voltage, "voltage")} with an allowed fall of ${formatQuantity(brief.ripple, "fraction")}, by the ${brief.basis} basis.`,
  });
}

/** With a steady current drawn between recharges: the capacitance that keeps the fall within the brief's. */
export function steadySupply({ result, brief }: FindingsInput): readonly Finding[] {
  if (brief.steady === undefined) return [];
  const { current, frequency } = brief.steady;
  const limit = current / (frequency * brief.ripple * brief.voltage);
  const value = brief.basis === "nominal" ? result.capacitance.nominal : result.capacitance.low;
  const note = "Capacitance that feeds the steady current from one recharge to the next within the allowed fall.";
  return [
    withinLeast({ id: "steady-current", state: "pulse", value, limit, unit: "F", source: "joulewright-design", note }),
  ];
}

export function balanceLoad(input: FindingsInput): readonly Finding[] {
  const { balance } = input.result;
  const { family } = input;
  if (balance === null || family === null) return [];
  const from = balance.assumed ? " The resistor's limits are assumed, not from a datasheet." : "";
  const power = { limit: family.power * family.derating, unit: "W", source: "joulewright-design" } as const;
  const volts = { limit: family.voltage, unit: "V", source: "joulewright-design" } as const;
  const rated = `${formatQuantity(family.derating, "fraction")} of its rating`;
  const held = [
    withinMost({
      ...power,
      id: "balance-power",
      state: "holding",
      value: balance.powerEach,
      note: `Power in the worst element against ${rated}, held at the worst holding share.${from}`,
    }),
    withinMost({
      ...volts,
      id: "balance-voltage",
      state: "holding",
      value: balance.voltageEach,
      note: `Voltage across the worst element against its working voltage, at the worst holding share.${from}`,
    }),
  ];
  const start = startOf(input, balance);
  if (start === null) return held;
  const { lasts, ...worst } = start;
  const begin = `right after the charge, at the worst charging share${lasts === null ? "" : `; it falls to the holding share with a time constant of up to ${formatQuantity(lasts, "time", { digits: 3, rounding: "up" })}`}.`;
  const base = { state: "charging", exceeded: "warn" } as const;
  return [
    ...held,
    withinMost({
      ...power,
      ...base,
      id: "balance-power-start",
      value: worst.power,
      note: `Power in the worst element against ${rated} ${begin}${from}`,
    }),
    withinMost({
      ...volts,
      ...base,
      id: "balance-voltage-start",
      value: worst.voltage,
      note: `Voltage across the worst element against its working voltage ${begin}${from}`,
    }),
  ];
}

/**
 * What the worst element bears as the hold begins, where that is more than the holding share asks (V, W), and the greatest time constant
 * (s) of its fall; null values when the tolerance is unknown; null when the holding share is the worse.
 * tau = (C_lo + C_hi/(n - 1)) / (1/R + 1/((n - 1) R)) with the high R. Source: [methods-derived] 2.1
 */
function startOf(
  { result, unit }: FindingsInput,
  { resistance, tolerance, elements }: Balance,
): { readonly voltage: number | null; readonly power: number | null; readonly lasts: number | null } | null {
  const { series, parallel, ties, share } = result;
  if (share.charging === null || unit.tolerance === undefined) return { voltage: null, power: null, lasts: null };
  if (share.holding !== null && share.charging <= share.holding) return null;
  const units = ties === "cross-tied" ? parallel : 1;
  const others = series - 1;
  const together = units * unit.capacitance * (1 - unit.tolerance.low + (1 + unit.tolerance.high) / others);
  return {
    voltage: share.charging / elements,
    power: elementPower(share.charging, resistance, tolerance, elements),
    lasts: (together * resistance * (1 + tolerance) * others) / series,
  };
}

export function bleed({ result }: FindingsInput): Finding {
  const { seconds, toVoltage } = result.bleed;
  const safe = formatQuantity(toVoltage, "voltage");
  const draft = {
    id: "bleed",
    state: "stored",
    value: seconds,
    limit: null,
    unit: "s",
    source: "joulewright-design",
  } as const;
  if (seconds === null && result.balance !== null) {
    const note = `The tolerance is unknown, so the longest time to ${safe} is not known.`;
    return { ...draft, verdict: "not assessed", margin: null, note };
  }
  if (seconds === null) {
    const note = `No balancing chain drains this bank to ${safe}: it needs a bleed resistor of its own, a dump and a shorting link.`;
    return { ...draft, verdict: "warn", margin: null, note };
  }
  const note = `Time to ${safe} through the balancing chain alone, high capacitance and high resistance. No limit was given to judge it by. Never trust it: dump, measure, short.`;
  return { ...draft, verdict: "not assessed", margin: null, note };
}
