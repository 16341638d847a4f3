// Findings on what the bank gives and bears at rest: energy, steady supply, balancing resistors, bleed.

import { type Finding, formatQuantity, withinLeast, withinMost } from "../quantity/index.ts";
import type { FindingsInput } from "./findingsInput.ts";

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

export function balanceLoad({ result, family }: FindingsInput): readonly Finding[] {
  const { balance } = result;
  if (balance === null || family === null) return [];
  const from = balance.assumed ? " The resistor's limits are assumed, not from a datasheet." : "";
  return [
    withinMost({
      id: "balance-power",
      state: "holding",
      value: balance.powerEach,
      limit: family.power * family.derating,
      unit: "W",
      source: "joulewright-design",
      note: `Power in the worst element against ${formatQuantity(family.derating, "fraction")} of its rating.${from}`,
    }),
    withinMost({
      id: "balance-voltage",
      state: "holding",
      value: balance.voltageEach,
      limit: family.voltage,
      unit: "V",
      source: "joulewright-design",
      note: `Voltage across the worst element against its working voltage.${from}`,
    }),
  ];
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
