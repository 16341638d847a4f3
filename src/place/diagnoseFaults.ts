// The faults that a diagnosis can name, each as a change of the model, with how likely it is before anything is read.
import { type Course, type CourseRow, conductanceOf, type StageModel } from "./diagnoseModel.ts";

export const FAULT_KINDS = [
  "low capacitance",
  "high capacitance",
  "leaky",
  "resistor open",
  "resistor wrong value",
  "meter lead swapped",
  "reversed unit",
] as const;
export type FaultKind = (typeof FAULT_KINDS)[number];

/** Common practice, no source: a lost joint or a tired unit is commoner than a unit too large or put in backwards. */
const ODDS: Readonly<Record<FaultKind, number>> = {
  "low capacitance": 2,
  "high capacitance": 1,
  leaky: 2,
  "resistor open": 1,
  "resistor wrong value": 1,
  "meter lead swapped": 1,
  "reversed unit": 0.5,
};

/** A bank without fault on the same scale: some nine banks in ten of those that are read. Common practice, no source. */
export const SOUND_ODDS = 100;

/** One fault at one position. `sizes`: the range of its size, or the single sizes that are likely in themselves. */
export interface Hypothesis {
  readonly position: number;
  readonly kind: FaultKind;
  readonly odds: number;
  readonly sizes:
    | { readonly kind: "none" }
    | { readonly kind: "range"; readonly from: number; readonly to: number }
    | { readonly kind: "one"; readonly at: number };
}

/** Wrong resistors that are likely in themselves, with their part of the odds: decade slips, then a preferred value off. */
const SLIPS: readonly (readonly [number, number])[] = [
  [0.1, 0.2],
  [10, 0.2],
  [0.01, 0.05],
  [100, 0.05],
  ...[0.22, 0.47, 0.5, 2, 2.2, 4.7].map((factor) => [factor, 0.05] as const),
];
const OTHER_PART = 0.1;

/** All single faults of a chain. Relative sizes: C lost or gained, leakage over what flows now, R over its value, V of a reversed unit over its share. */
export function hypotheses(stages: readonly StageModel[], polarised: boolean): Hypothesis[] {
  const range = (from: number, to: number) => ({ kind: "range", from, to }) as const;
  return stages.flatMap((stage, position) => {
    const of = (kind: FaultKind, sizes: Hypothesis["sizes"], part = 1): Hypothesis => ({
      position,
      kind,
      sizes,
      odds: (ODDS[kind] * part) / stages.length,
    });
    const resistor = Number.isFinite(stage.resistance)
      ? [
          of("resistor open", { kind: "none" }),
          of("resistor wrong value", range(0.02, 0.9), OTHER_PART),
          of("resistor wrong value", range(1.1, 50), OTHER_PART),
          ...SLIPS.map(([at, part]) => of("resistor wrong value", { kind: "one", at }, part)),
        ]
      : [];
    return [
      of("low capacitance", range(0.005, 0.97)),
      of("high capacitance", range(0.005, 3)),
      of("leaky", range(0.05, 2000)),
      ...resistor,
      of("meter lead swapped", { kind: "none" }),
      ...(polarised ? [of("reversed unit", range(0.0005, 0.08))] : []),
    ];
  });
}

/** The stages as the fault would have them. */
export function faulty(stages: readonly StageModel[], { position, kind }: Hypothesis, size: number): StageModel[] {
  return stages.map((stage, i) => {
    if (i !== position) return stage;
    if (kind === "low capacitance") return { ...stage, capacitance: stage.capacitance * (1 - size) };
    if (kind === "high capacitance") return { ...stage, capacitance: stage.capacitance * (1 + size) };
    if (kind === "leaky") {
      // A stage that conducts nothing leaks against a time constant of 10,000 s, that of a good film unit.
      const present = conductanceOf(stage) || stage.capacitance / 1e4;
      return { ...stage, conductance: stage.conductance + size * present };
    }
    if (kind === "resistor open") return { ...stage, resistance: Number.POSITIVE_INFINITY };
    if (kind === "resistor wrong value") return { ...stage, resistance: stage.resistance * size };
    return stage;
  });
}

/** The course with the fault, as the meter would show it. */
export function faultyCourse(course: Course, hypothesis: Hypothesis, size: number): Course {
  const { position, kind } = hypothesis;
  return (stages, bank, times): readonly CourseRow[] => {
    if (kind === "meter lead swapped") {
      return course(stages, bank, times).map((row) => ({
        ...row,
        volts: row.volts.map((v, i) => (i === position ? -v : v)),
      }));
    }
    if (kind === "reversed unit") {
      // A polarised unit backwards conducts like a diode: its stage stays low and the others carry the rest.
      const held = (size * bank) / stages.length;
      const others = stages.filter((_, i) => i !== position);
      if (others.length === 0) return times.map(() => ({ volts: [held], current: 0 }));
      return course(others, bank - held, times).map((row) => ({
        ...row,
        volts: row.volts.toSpliced(position, 0, held),
      }));
    }
    return course(faulty(stages, hypothesis, size), bank, times);
  };
}
