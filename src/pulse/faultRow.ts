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
  /** The same with every unit at its high capacitance [A]; null where the tolerance is not known either. */
  readonly peakCurrentWorst: number | null;
  readonly peakIs: Bound;
  readonly energyIntoUnit: number | null;
  /** What a shorted unit itself held, at its worst voltage [J]; 0 where none is shorted. */
  readonly energyOwn: number;
  /** Both together with every unit at its high capacitance [J]; this is what is judged. null where the tolerance is not known. */
  readonly energyWorst: number | null;
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

/** Joules that end in a shorted unit: at least, and at most (null: not known). */
interface Joules {
  readonly least: number;
  readonly most: number | null;
}

/** Volts are judged by the rated, then the surge voltage; joules in a shorted unit by what its case is known to hold. */
function judge(bank: FaultBank, volts: Volts, joules: Joules): Verdict {
  const { ratedVoltage, surgeVoltage = null, ruptureEnergy = null } = bank.unit;
  const within = (limit: number): boolean => volts.most <= limit * (1 + 1e-9);
  const rank: Verdict[] = volts.known ? [] : ["not assessed"];
  if (within(ratedVoltage)) rank.push("pass");
  else rank.push(surgeVoltage !== null && within(surgeVoltage) ? "warn" : "fail");
  const most = ruptureEnergy === null ? null : ruptureEnergy * (1 + 1e-9);
  if (joules.least > 0) {
    if (most === null) rank.push("not assessed");
    else if (joules.least > most || (joules.most ?? 0) > most) rank.push("fail");
    else rank.push(joules.most === null ? "not assessed" : "pass");
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
  /** The same at the high capacitance; left out: the same. */
  readonly peakWorst?: FaultCurrent | null;
  /** The highest of `joules` and `own` together; left out: theirs with the high capacitance. */
  readonly joulesWorst?: number | null;
  /** Joules that a shorted unit itself held; left out: none is shorted. */
  readonly own?: number;
  /** `joules` are the unit's own, counted once. */
  readonly alone?: boolean;
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
  const { own = 0, peak = null, peakWorst = peak } = parts;
  const { toleranceHigh } = bank.unit;
  const together = parts.joules === null ? null : parts.joules + (parts.alone ? 0 : own);
  const raised =
    together === null || (together > 0 && toleranceHigh === undefined) ? null : together * (1 + (toleranceHigh ?? 0));
  const energyWorst = parts.joulesWorst === undefined ? raised : parts.joulesWorst;
  return {
    id: parts.id,
    worstVoltage: parts.volts,
    worstVoltageSpread: spread,
    worstHeld: held === null ? null : judged.most,
    peakCurrent: peak?.amperes ?? null,
    peakCurrentWorst: toleranceHigh === undefined && peak?.amperes !== 0 ? null : (peakWorst?.amperes ?? null),
    peakIs: peak?.bound ?? "value",
    energyIntoUnit: parts.joules,
    energyOwn: own,
    energyWorst,
    energyIntoIsolating: parts.isolating ?? null,
    verdict: judge(bank, judged, own > 0 ? { least: together ?? own, most: energyWorst } : { least: 0, most: 0 }),
    stops: parts.stops,
    note: parts.note,
    findings: parts.findings ?? [],
  };
}

/** The higher of what a sound unit sees at once and after the hold [V]; null when what is known of neither is all. */
export const worstOfFault = ({ worstVoltageSpread, worstHeld }: Pick<Fault, "worstVoltageSpread" | "worstHeld">) =>
  worstVoltageSpread === null || worstHeld === null ? null : Math.max(worstVoltageSpread, worstHeld);
