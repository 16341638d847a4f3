// Reads back a bank that was built: do the voltages agree with the prediction, and if not, which unit or resistor is it and how?
import { accepted, type Finding, type Read, type Refusal, refused } from "../quantity/index.ts";
import { type MeterModel, observed, type PriorDoubt, type ReadingRow } from "./diagnoseEvidence.ts";
import { type FaultKind, faultyCourse, type Hypothesis } from "./diagnoseFaults.ts";
import { type Course, chargerOn, type StageModel } from "./diagnoseModel.ts";
import { type Explanation, type NextMeasurement, nextMeasurement } from "./diagnoseNext.ts";
import { limitFindings, STOP_ACTIONS, sumFindings } from "./diagnoseSafety.ts";
import { type Weighed, weigh } from "./diagnoseWeigh.ts";

export interface DiagnosisRequest {
  /** Cross-tied: each stage as measured. Strings: the units of one string; ask once for each string. */
  readonly stages: readonly StageModel[];
  readonly rows: readonly ReadingRow[];
  /** Relative uncertainty of a voltage reading, and V of resolution and zero error. */
  readonly meter: { readonly relative: number; readonly absolute: number } & Partial<MeterModel>;
  /** Relative uncertainties of the stages as measured; defaults 0.003, 0.3 (of ln leakage), 0.05, 0.02. */
  readonly doubt?: Partial<PriorDoubt>;
  /** V that no stage may exceed; absent: not assessed. */
  readonly limit?: number;
  readonly polarised?: boolean;
  /** How the voltages go in time; default: quick charge, charger left on. */
  readonly course?: Course;
  /** The step of the hot test that would come next. */
  readonly next?: { readonly bank: number; readonly seconds: number };
}

export interface Suspect {
  /** Stage (or unit of the string), from 0. */
  readonly position: number;
  readonly kind: FaultKind;
  /** Probability, given the readings. */
  readonly likelihood: number;
  /** Size of the fault: part of C lost or gained, extra leakage over what flowed, R over its value, V of a reversed unit over its even share; 1 where it has none. */
  readonly size: number;
}

export interface GoOn {
  readonly safe: boolean | null;
  /** V, the worst stage at the next step under any explanation that is still likely. */
  readonly worst: number;
  readonly position: number;
}

export interface Diagnosis {
  readonly verdict: "agrees" | "differs" | "stop";
  /** Probability that nothing is wrong, given the readings and that at most one thing is. */
  readonly sound: number;
  readonly suspects: readonly Suspect[];
  /** True when no single fault explains the readings: more than one thing is wrong, or the prediction is. */
  readonly unexplained: boolean;
  readonly next: NextMeasurement | null;
  readonly goOn: GoOn | null;
  /** What to do, in order, when the verdict is stop. */
  readonly actions: readonly string[];
  readonly findings: readonly Finding[];
}

/** A chi-squared this many standard deviations up does not agree: one sound bank in a thousand. */
const TOO_FAR = 3.1;
/** Beyond this even the best single fault does not explain the readings. */
const UNEXPLAINED = 4;
const LISTED = 0.01;
/** An explanation this likely counts when it is asked whether it is safe to go on. */
const COUNTS = 0.02;
const DEFAULT_DOUBT: PriorDoubt = { capacitance: 0.003, leakage: 0.3, resistance: 0.05, bank: 0.02 };

const fault = (code: string, read: string, want: string): Refusal => ({
  code,
  place: { field: "readings" },
  read,
  want,
});

function check({ stages, rows, meter }: DiagnosisRequest): Refusal[] {
  const faults: Refusal[] = [];
  if (stages.length === 0) faults.push(fault("commission.no-stages", "0 stages", "1 or more"));
  if (observed(rows).length === 0) faults.push(fault("commission.no-readings", "no readings", "1 or more"));
  for (const [k, row] of rows.entries()) {
    if (row.volts.length !== stages.length) {
      faults.push(
        fault(
          "commission.count",
          `row ${k + 1}: ${row.volts.length} readings`,
          `${stages.length}, blank where not read`,
        ),
      );
    }
    if (!(row.seconds >= 0) || !(row.bank > 0) || observed([row]).some((v) => !Number.isFinite(v))) {
      faults.push(
        fault("commission.number", `row ${k + 1}`, "finite readings, a time of 0 or more, a bank voltage above 0"),
      );
    }
  }
  if (!(meter.relative > 0 || meter.absolute > 0)) {
    faults.push(fault("commission.meter", "no uncertainty", "the meter's uncertainty, above 0"));
  }
  return faults;
}

/**
 * The verdict on one chain of stages.
 *
 * @returns `stop` when a reading is over the limit or a polarised unit stands backwards; `differs` when the readings do not fit the
 *   prediction, or when an explanation still likely would put a stage over the limit; `agrees` otherwise. Refusals for readings that
 *   do not match the stages in number, or without a meter uncertainty.
 */
export function diagnose(request: DiagnosisRequest): Read<Diagnosis> {
  const faults = check(request);
  if (faults.length > 0) return refused(...faults);
  const { stages, rows, limit = null, polarised = true, course = chargerOn } = request;
  const meter: MeterModel = { common: 0.01, current: 0.05, ...request.meter };
  const doubt = { ...DEFAULT_DOUBT, ...request.doubt };
  const { sound, faults: weighed } = weigh({ stages, rows, meter, doubt }, course, polarised);

  const top = Math.max(sound.weight, ...weighed.map((w) => w.weight));
  const scale = Math.exp(sound.weight - top) + weighed.reduce((sum, w) => sum + Math.exp(w.weight - top), 0);
  const chance = (weight: number): number => Math.exp(weight - top) / scale;
  const soundChance = chance(sound.weight);
  const suspects = gather(weighed, chance);
  const leastExcess = Math.min(sound.excess, ...weighed.map((w) => w.excess));

  const explanations = likely(weighed, chance, { chance: soundChance });
  const bank = Math.max(...rows.map((row) => row.bank));
  const latest = Math.max(...rows.map((row) => row.seconds));
  const here = worstOf(explanations, { stages, course, bank, seconds: latest });
  const goOn = request.next ? worstOf(explanations, { stages, course, ...request.next }) : null;
  const over = limitFindings(rows, limit);
  const reversed = suspects.find((s) => s.kind === "reversed unit" && s.likelihood > 0.5);
  const fits = sound.excess <= TOO_FAR && soundChance >= 0.5;
  const mayMatter = limit !== null && here.worst > limit;
  const verdict = over.length > 0 || reversed ? "stop" : fits && !mayMatter ? "agrees" : "differs";
  return accepted({
    verdict,
    sound: soundChance,
    suspects: verdict === "agrees" ? suspects.filter((s) => s.likelihood >= COUNTS) : suspects,
    unexplained: leastExcess > UNEXPLAINED,
    next: nextMeasurement(explanations, { stages, course, meter, bank, latest }),
    goOn: goOn ? { ...goOn, safe: limit === null ? null : verdict === "agrees" && goOn.worst <= limit } : null,
    actions: verdict === "stop" ? STOP_ACTIONS : [],
    findings: [...over, ...sumFindings(rows, meter)],
  });
}

/** Hypotheses of one kind at one place are one suspect. */
function gather(weighed: readonly Weighed[], chance: (weight: number) => number): Suspect[] {
  const suspects = new Map<string, Suspect & { readonly top: number }>();
  for (const { hypothesis, size, weight } of weighed) {
    const { position, kind } = hypothesis;
    const key = `${position} ${kind}`;
    const before = suspects.get(key);
    const likelihood = chance(weight) + (before?.likelihood ?? 0);
    const better = before === undefined || weight > before.top;
    suspects.set(key, {
      position,
      kind,
      likelihood,
      size: better ? size : before.size,
      top: better ? weight : before.top,
    });
  }
  return [...suspects.values()]
    .filter((s) => s.likelihood >= LISTED)
    .sort((a, b) => b.likelihood - a.likelihood)
    .map(({ top: _, ...suspect }) => suspect);
}

/** Explanations that still count, likeliest first. */
function likely(
  weighed: readonly Weighed[],
  chance: (weight: number) => number,
  sound: { readonly chance: number },
): Explanation[] {
  const all: (Explanation & { readonly p: number })[] = weighed.map(({ hypothesis, size, weight }) => ({
    hypothesis,
    size,
    p: chance(weight),
  }));
  all.push({ hypothesis: null, size: 1, p: sound.chance });
  return all
    .filter(({ p }) => p >= COUNTS)
    .sort((a, b) => b.p - a.p)
    .map(({ p: _, ...explanation }) => explanation);
}

const INSTANTS = 12;

interface Step {
  readonly stages: readonly StageModel[];
  readonly course: Course;
  readonly bank: number;
  readonly seconds: number;
}

/** The worst stage under any of the explanations, from the end of the charge to `seconds` later. */
function worstOf(explanations: readonly Explanation[], { stages, course, bank, seconds }: Step): Omit<GoOn, "safe"> {
  const times = Array.from({ length: INSTANTS + 1 }, (_, k) => (seconds * k * k) / INSTANTS ** 2);
  let worst = { worst: 0, position: 0 };
  for (const { hypothesis, size } of explanations) {
    for (const { volts } of physical(course, hypothesis, size)(stages, bank, times)) {
      for (const [position, v] of volts.entries()) {
        if (Math.abs(v) > worst.worst) worst = { worst: Math.abs(v), position };
      }
    }
  }
  return worst;
}

const physical = (course: Course, hypothesis: Hypothesis | null, size: number): Course =>
  hypothesis === null ? course : faultyCourse(course, hypothesis, size);
