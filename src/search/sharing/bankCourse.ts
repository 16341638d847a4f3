// The time course of one arrangement at its worst corner, at a modest number of instants: charge, hold, dump, rest.

import { courseOf, type HoldCase, holdCornerWords, type Phase, worstAtHold } from "../../bank/index.ts";
import { holdCaseOf, type RestingBank } from "./holdCase.ts";
import { type Lump, tightLumps } from "./lumps.ts";

export interface CourseInstant {
  readonly phase: Phase["name"];
  /** s since the charge ended. */
  readonly seconds: number;
  /** Voltage of one stage of each kind, V; times their counts they add up to the bank's. */
  readonly volts: readonly number[];
}

export interface CoursePeak {
  readonly voltage: number;
  /** Index of its kind of stage. */
  readonly kind: number;
  readonly phase: Phase["name"];
  readonly seconds: number;
}

export interface BankCourse {
  /** The corner in words. */
  readonly corner: string;
  /** Kinds of stage: the tight one, then the rest by their capacitance. */
  readonly stages: readonly { readonly words: string; readonly count: number }[];
  /** Seconds of each phase as shown; an endless hold is shown until it has settled. */
  readonly phases: readonly { readonly name: Phase["name"]; readonly seconds: number }[];
  /** The brief holds for ever: what is shown of the hold ends when nothing moves any more. */
  readonly endlessHold: boolean;
  /** ohm; null: none was stated, so the dump is instant. */
  readonly dumpResistance: number | null;
  readonly instants: readonly CourseInstant[];
  /** Highest and lowest stage voltage over the whole course, in between the instants too. */
  readonly peak: CoursePeak;
  readonly lowest: CoursePeak;
}

/** Parts of a phase's length at which it is told: dense where it bends. */
const HOLD = [0.01, 0.03, 0.08, 0.15, 0.25, 0.4, 0.6, 0.8, 1];
const DUMP = [0.1, 0.2, 0.4, 0.7, 1];
const REST = [0.05, 0.2, 0.5, 1];
/** Time constants after which an exponential has settled for any eye: e^-8 = 0.03 %. */
const SETTLED = 8;
/** s shown of a hold or a rest in which nothing conducts. */
const STILL = 60;

/** The course; null for one in series, and when the tolerance or the leakage is unknown. */
export function bankCourse(bank: RestingBank): BankCourse | null {
  const given = holdCaseOf(bank);
  if (given === null || given.n === 1) return null;
  const worst = worstAtHold(given);
  const lumps = tightLumps(given, worst.lowOthers);
  const chain = lumps.map(({ stage }) => stage);
  const scale = relaxation(given, lumps);
  const endlessHold = given.hold === Number.POSITIVE_INFINITY;
  const hold = endlessHold ? scale : given.hold;
  const dumpResistance = bank.brief.dumpResistance ?? null;
  // Strings share the dump resistor: as if all strings were this one.
  const strings = bank.result.ties === "cross-tied" ? 1 : bank.result.parallel;
  const resistance = (dumpResistance ?? 0) * strings;
  const series = 1 / chain.reduce((sum, { capacitance }) => sum + 1 / capacitance, 0);
  const dump = { resistance, seconds: resistance > 0 ? SETTLED * resistance * series : 0 };
  const course = courseOf(chain, { charge: { kind: "instant" }, voltage: given.V, hold, dump, rest: scale });
  const told = course.phases.filter(({ name }) => name !== "charge");
  const instants: CourseInstant[] = [
    { phase: "charge", seconds: 0, volts: stageVolts(course.phases[0]?.end ?? [], lumps) },
  ];
  let begun = 0;
  for (const phase of told) {
    const parts = phase.name === "hold" ? HOLD : phase.name === "dump" ? (phase.seconds > 0 ? DUMP : [1]) : REST;
    for (const part of parts) {
      const at = part * phase.seconds;
      instants.push({ phase: phase.name, seconds: begun + at, volts: stageVolts(phase.voltagesAt(at), lumps) });
    }
    begun += phase.seconds;
  }
  return {
    // All of the corner is named, also when the charge alone is the worst of it.
    corner: holdCornerWords(given, { ...worst, seconds: Number.POSITIVE_INFINITY }),
    stages: lumps.map(({ count }, i) => ({ words: kindWords(i, lumps, given, worst.lowOthers), count })),
    phases: course.phases.map(({ name, seconds }) => ({ name, seconds })),
    endlessHold,
    dumpResistance,
    instants,
    peak: peakOf(course.phases, lumps, instants),
    lowest: instants.flatMap((instant) => kindsAt(instant)).reduce((a, b) => (b.voltage < a.voltage ? b : a)),
  };
}

const stageVolts = (lumpVolts: ArrayLike<number>, lumps: readonly Lump[]): readonly number[] =>
  lumps.map(({ count }, i) => (lumpVolts[i] as number) / count);

/** s in which the stages find their end: SETTLED time constants, or as long as the tight stage may go on rising. */
function relaxation({ m, leakage, V }: HoldCase, lumps: readonly Lump[]): number {
  const [tight, ...rest] = lumps.map(({ stage }) => stage);
  if (tight === undefined || rest.length === 0) return STILL;
  const conductance = (stage: typeof tight): number => stage.conductance + 1 / stage.resistance;
  const series = 1 / rest.reduce((sum, stage) => sum + 1 / stage.capacitance, 0);
  const across = 1 / rest.reduce((sum, stage) => sum + 1 / conductance(stage), 0);
  const together = conductance(tight) + across;
  if (together > 0) return (SETTLED * (tight.capacitance + series)) / together;
  return leakage > 0 ? (V * (tight.capacitance + series)) / (m * leakage) : STILL;
}

const kindsAt = ({ phase, seconds, volts }: CourseInstant): readonly CoursePeak[] =>
  volts.map((voltage, kind) => ({ voltage, kind, phase, seconds }));

/** The highest stage voltage: the phases know their own peaks between the instants. */
function peakOf(phases: readonly Phase[], lumps: readonly Lump[], instants: readonly CourseInstant[]): CoursePeak {
  let best = instants.flatMap(kindsAt).reduce((a, b) => (b.voltage > a.voltage ? b : a));
  let begun = 0;
  for (const phase of phases) {
    for (const [kind, peak] of phase.peaks().entries()) {
      const voltage = peak.voltage / (lumps[kind]?.count ?? 1);
      if (voltage > best.voltage * (1 + 1e-12))
        best = { voltage, kind, phase: phase.name, seconds: begun + peak.seconds };
    }
    begun += phase.seconds;
  }
  return best;
}

function kindWords(kind: number, lumps: readonly Lump[], { tLow, tHigh, n }: HoldCase, lowOthers: number): string {
  if (kind === 0) return "tight stage";
  if (lumps.length === 2) return n === 2 ? "the other" : "each other";
  return lumps[kind]?.count === lowOthers && kind === 2
    ? `others at -${percent(tLow)} %`
    : `others at +${percent(tHigh)} %`;
}

const percent = (fraction: number): number => Math.round(fraction * 1e5) / 1e3;
