// One row of the fault table: its shape, and how its volts and joules are judged.
import type { Finding, Verdict } from "../quantity/index.ts";
import type { FaultBank } from "./faultBank.ts";
import type { FaultCurrent } from "./faultCurrents.ts";
import type { Bound } from "./verdict.ts";

export type FaultId =
  | "unit-short"
  | "unit-open"
  | "row-short"
  | "load-short"
  | "early-fire"
  | "bleeder-open"
  | "dump-stuck"
  | "charger-running";

/** One row. Volts and amperes null are unknown; `energyIntoUnit` [J] is what others pour into one unit, or its own in a short. */
export interface Fault {
  readonly id: FaultId;
  /** Highest voltage of a sound unit, all units alike before the fault unless it says otherwise [V]. */
  readonly worstVoltage: number | null;
  /** The same at the worst corner of the capacitance tolerance [V]. */
  readonly worstVoltageSpread: number | null;
  /** The highest in the hold with the fault standing, leakage and resistors at their worst [V]; null: not known. The higher is judged. */
  readonly worstHeld: number | null;
  readonly peakCurrent: number | null;
  readonly peakIs: Bound;
  readonly energyIntoUnit: number | null;
  /** Joules that the isolating resistors take off: the one of the failed unit, and all the others together; null: not told. */
  readonly energyIntoIsolating: { readonly faulted: number; readonly others: number } | null;
  readonly verdict: Verdict;
  /** What stops it, plain words. */
  readonly stops: string;
  readonly note: string;
  readonly findings: readonly Finding[];
}

/** The highest volts known of, and whether anything higher is ruled out. */
interface Volts {
  readonly most: number;
  readonly known: boolean;
}

/** Volts are judged by the rated, then the surge voltage; joules from outside by what the case is known to hold. */
function judge(bank: FaultBank, volts: Volts, outsideJoules: number): Verdict {
  const { ratedVoltage, surgeVoltage = null, ruptureEnergy = null } = bank.unit;
  const within = (limit: number): boolean => volts.most <= limit * (1 + 1e-9);
  const rank: Verdict[] = volts.known ? [] : ["not assessed"];
  if (within(ratedVoltage)) rank.push("pass");
  else rank.push(surgeVoltage !== null && within(surgeVoltage) ? "warn" : "fail");
  if (outsideJoules > 0) {
    if (ruptureEnergy === null) rank.push("not assessed");
    else rank.push(outsideJoules <= ruptureEnergy * (1 + 1e-9) ? "pass" : "fail");
  }
  return (["fail", "not assessed", "warn", "pass"] as const).find((verdict) => rank.includes(verdict)) ?? "pass";
}

/** What a row is made of; left-out parts are none. */
export interface RowParts {
  readonly id: FaultId;
  readonly volts: number | null;
  readonly spread?: number | null;
  /** Left out: the hold adds nothing. */
  readonly held?: number | null;
  readonly peak?: FaultCurrent | null;
  readonly joules: number | null;
  /** Joules that come from other units. */
  readonly outside?: number;
  readonly isolating?: Fault["energyIntoIsolating"];
  readonly stops: string;
  readonly note: string;
  readonly findings?: readonly Finding[];
}

/** A judged row. */
export function row(bank: FaultBank, parts: RowParts): Fault {
  const spread = parts.spread === undefined ? parts.volts : parts.spread;
  const start = parts.volts === null ? null : Math.max(parts.volts, spread ?? 0);
  const held = parts.held === undefined ? start : parts.held;
  const judged = { most: Math.max(start ?? 0, held ?? 0), known: start !== null && held !== null };
  return {
    id: parts.id,
    worstVoltage: parts.volts,
    worstVoltageSpread: spread,
    worstHeld: held === null ? null : judged.most,
    peakCurrent: parts.peak?.amperes ?? null,
    peakIs: parts.peak?.bound ?? "value",
    energyIntoUnit: parts.joules,
    energyIntoIsolating: parts.isolating ?? null,
    verdict: judge(bank, judged, parts.outside ?? 0),
    stops: parts.stops,
    note: parts.note,
    findings: parts.findings ?? [],
  };
}

/** The higher of what a sound unit sees at once and after the hold [V]; null when what is known of neither is all. */
export const worstOfFault = ({ worstVoltageSpread, worstHeld }: Pick<Fault, "worstVoltageSpread" | "worstHeld">) =>
  worstVoltageSpread === null || worstHeld === null ? null : Math.max(worstVoltageSpread, worstHeld);
