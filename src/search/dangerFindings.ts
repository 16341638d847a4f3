// Findings on what can hurt: stored energy and recovery, one shorted unit, and the brief's own limits on shot, fault and life.

import { hazardFindings } from "../hazard/index.ts";
import { unitShort, worstOfFault } from "../pulse/index.ts";
import { type Finding, withinMost } from "../quantity/index.ts";
import { faultBankOf } from "./faults.ts";
import type { FindingsInput } from "./findingsInput.ts";
import { limitFindings } from "./limits.ts";

/** What can hurt, by the rules of the hazard layer; the bleed of the balancing chain is a finding of its own. */
export function hazards({ result, unit, brief }: FindingsInput): readonly Finding[] {
  const findings = hazardFindings({
    capacitance: result.capacitance.high ?? result.capacitance.nominal,
    voltage: brief.voltage * (1 + brief.overshoot),
    safeVoltage: brief.touchSafe,
    polarised: unit.polarised !== false,
    bleedSeconds: result.bleed.seconds ?? Number.POSITIVE_INFINITY,
  });
  return findings.filter((finding) => finding.id !== "bleed-time");
}

/** One unit shorted with the charger still on: what the sound ones then see. A warning, because it takes a fault to get there. */
export function oneShorted({ result, unit, brief }: FindingsInput): readonly Finding[] {
  if (result.series === 1) return [];
  const fault = unitShort(faultBankOf({ result, unit, brief }));
  const note = `One unit shorted with the charger still on: the sound ones against their ${unit.surgeVoltage === undefined ? "rated" : "surge"} voltage. ${fault.stops}`;
  const limit = unit.surgeVoltage ?? unit.voltage;
  // what the hold adds may be unknown: over at once is over all the same
  const atOnce = fault.worstVoltageSpread ?? 0;
  const value = worstOfFault(fault) ?? (atOnce > limit ? atOnce : null);
  return [
    withinMost({
      id: "unit-short",
      state: "faulted",
      value,
      limit,
      unit: "V",
      source: "methods-derived",
      exceeded: "warn",
      note,
    }),
  ];
}
/** The brief's own limits on shot, fault and life. */
export function limits({ result, unit, brief, candidate }: FindingsInput): readonly Finding[] {
  const known = result.stress !== null && (result.series === 1 || candidate.leak !== null);
  const worst = known && result.stress !== null ? result.stress * unit.voltage : Number.POSITIVE_INFINITY;
  return limitFindings(brief, { unit, worst, ...result });
}
