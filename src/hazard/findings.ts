// The hazards of one bank as findings: energy class, arc blast, what touch-safe volts still hold, recovery, bleed time.

import type { Finding, Verdict } from "../quantity/index.ts";
import { energyClass } from "./energyClass.ts";
import { TOUCH_SAFE } from "./governed.ts";
import { recovery } from "./recovery.ts";
import { ruleOf } from "./rules.ts";

export interface HazardOf {
  /** F, the bank's at its high end. */
  readonly capacitance: number;
  /** V, the highest it may be charged to. */
  readonly voltage: number;
  /** V, touch-safe by the brief's rule. */
  readonly safeVoltage: number;
  readonly polarised: boolean;
  /** s to the safe voltage through the permanent bleed; Infinity when there is none. */
  readonly bleedSeconds: number;
  /** s, the longest the builder allows; absent: no limit known, so that finding is not assessed. */
  readonly bleedLimit?: number | undefined;
}

/** Range: capacitance, voltage, safeVoltage > 0. Source: [NFPA-70E], [LBNL-hazard], [absorption-notes]. */
export function hazardFindings(bank: HazardOf): readonly Finding[] {
  const energy = (bank.capacitance * bank.voltage ** 2) / 2;
  const full = energyClass({ energy, voltage: bank.voltage });
  const atSafe = Math.min(bank.voltage, bank.safeVoltage);
  const left = (bank.capacitance * atSafe ** 2) / 2;
  const safe = energyClass({ energy: left, voltage: atSafe });
  const back = recovery({ soak: bank.voltage, capacitance: bank.capacitance, polarised: bank.polarised });
  const { bleedSeconds, bleedLimit } = bank;
  const within = bleedLimit === undefined ? "not assessed" : bleedSeconds <= bleedLimit ? "pass" : "fail";
  const never = bleedSeconds === Number.POSITIVE_INFINITY;
  return [
    finding({
      id: "energy-class",
      state: "holding",
      verdict: warn(full.hazardous),
      unit: "J",
      source: "NFPA-70E",
      value: energy,
      limit: full.threshold,
      bad: "hazardous by stored energy (second hand, at or over counts): interlock, two ways to discharge, proof before touch",
      good: "below the threshold of stored energy at this voltage (second hand)",
    }),
    // The rule speaks of 100 V and more; below it there is nothing to judge.
    ...(bank.voltage < ARC_BLAST_FROM
      ? []
      : [
          finding({
            id: "arc-blast",
            state: "holding",
            verdict: warn(full.arcBlast),
            unit: "J",
            source: "LBNL-hazard",
            value: energy,
            limit: ARC_BLAST,
            bad: "an arc would also be a blast: remote control, exclusion area, hearing protection",
            good: "not an arc-blast hazard by this rule; hearing protection for every hard discharge all the same",
          }),
        ]),
    finding({
      id: "energy-at-safe",
      state: "dumped",
      verdict: warn(safe.hazardous),
      unit: "J",
      source: "NFPA-70E",
      value: left,
      limit: safe.threshold,
      bad:
        atSafe > TOUCH_SAFE
          ? "not safe to touch, whatever the brief calls it: discharge to zero before work"
          : "safe to touch by voltage, but a short still burns: discharge to zero before work",
      good: "below the threshold of stored energy at the touch-safe voltage",
    }),
    finding({
      id: "recovery",
      state: "stored",
      verdict: warn(back.high > bank.safeVoltage),
      unit: "V",
      value: back.high,
      limit: bank.safeVoltage,
      source: RECOVERY_SOURCES[back.ruleId],
      bad: `${ruleOf(back.ruleId).words} Here that is over the touch-safe voltage: leave the strap on.`,
      good: `${ruleOf(back.ruleId).words} Leave the strap on.`,
    }),
    finding({
      id: "bleed-time",
      state: "dumped",
      verdict: within,
      unit: "s",
      source: "methods-derived",
      value: bleedSeconds,
      limit: bleedLimit ?? null,
      bad: never ? NEVER : "slower than allowed: a lower resistance or a dump resistor would mend it",
      good: never ? NEVER : bleedLimit === undefined ? "no limit was given to judge it by" : "within the time allowed",
    }),
  ];
}

const ARC_BLAST_FROM = 100;
const ARC_BLAST = Math.max(...ruleOf("lbnl-arc-blast").limits.map((limit) => limit.value));
const NEVER = "no permanent bleed: the bank never empties by itself";
const RECOVERY_SOURCES = { "absorption-electrolytic": "absorption-notes", "absorption-other": "Moore-electrostatics" };

const warn = (bad: boolean): Verdict => (bad ? "warn" : "pass");

function finding(facts: Omit<Finding, "margin" | "note"> & { readonly bad: string; readonly good: string }): Finding {
  const { bad, good, ...kept } = facts;
  const margin = kept.value === null || kept.limit === null ? null : (kept.limit - kept.value) / kept.limit;
  return { ...kept, margin, note: kept.verdict === "warn" || kept.verdict === "fail" ? bad : good };
}
