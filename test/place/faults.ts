// Simulated faulty banks for the tests and the campaign: voltages from the exact course of the bank layer, with meter noise.
import { courseOf } from "../../src/bank/course.ts";
import type { FaultKind } from "../../src/place/diagnoseFaults.ts";
import type { StageModel } from "../../src/place/diagnoseModel.ts";
import type { DiagnosisRequest } from "../../src/place/diagnoseRequest.ts";
import { normal } from "./lots.ts";

export interface Trial {
  readonly request: DiagnosisRequest;
  readonly position: number;
  /** Highest true voltage of any stage, over the limit. */
  readonly overLimit: number;
}

const logEven = (random: () => number, from: number, to: number): number => from * (to / from) ** random();

/** The true stage after the fault; `null` for one that is held down by a reversed unit. */
function broken(stage: StageModel, kind: FaultKind | null, random: () => number): StageModel | null {
  const { capacitance, conductance, resistance } = stage;
  if (kind === "low capacitance") return { ...stage, capacitance: capacitance * (1 - logEven(random, 0.03, 0.5)) };
  if (kind === "high capacitance") return { ...stage, capacitance: capacitance * (1 + logEven(random, 0.03, 1)) };
  if (kind === "leaky") return { ...stage, conductance: conductance + logEven(random, 0.5, 50) / resistance };
  if (kind === "resistor open") return { ...stage, resistance: Number.POSITIVE_INFINITY };
  if (kind === "resistor wrong value") {
    const factor = [0.1, 10, 2.2, 0.47][Math.floor(random() * 4)]!;
    return { ...stage, resistance: resistance * factor };
  }
  return kind === "reversed unit" ? null : stage;
}

/** A bank before it is read: as measured, as it really is, and how it is charged. */
export interface Drawn {
  readonly kind: FaultKind | null;
  readonly stages: readonly StageModel[];
  readonly position: number;
  /** The true stages; null where a reversed unit holds its stage down to `diode` V. */
  readonly truth: readonly (StageModel | null)[];
  readonly diode: number;
  /** V asked for, and V that it was really charged to. */
  readonly bank: number;
  readonly voltage: number;
}

/** s after the charge at which every stage is read. */
export const READ_AT: readonly number[] = [0, 300, 1500];

/** One bank of 3 to 10 stages about 10 mF with 47 kohm, held at 85 % of 400 V a stage. */
export function draw(kind: FaultKind | null, random: () => number): Drawn {
  const g = () => normal(random);
  const count = 3 + Math.floor(random() * 8);
  const bank = 340 * count;
  const stages = Array.from({ length: count }, () => ({
    capacitance: 10e-3 * (1 + 0.02 * g()),
    conductance: 2e-6 * Math.exp(0.3 * g()),
    resistance: 47e3,
  }));
  const position = Math.floor(random() * count);
  const truth = stages.map((s, i) => {
    const made = {
      capacitance: s.capacitance * (1 + 0.003 * g()),
      conductance: s.conductance * Math.exp(0.2 * g()),
      resistance: s.resistance * (1 + 0.02 * g()),
    };
    return i === position ? broken(made, kind, random) : made;
  });
  const diode = 0.6 + 1.5 * random();
  return { kind, stages, position, truth, diode, bank, voltage: bank * (1 + 0.005 * g()) };
}

/** Stage voltages at each of READ_AT, by the exact course of the bank layer. */
export function exactVolts({ truth, position, diode, voltage }: Drawn): readonly (readonly number[])[] {
  const chain = truth.flatMap((s) => (s ? [{ ...s, leakageCurrent: 0 }] : []));
  const reversed = chain.length < truth.length;
  const course = courseOf(chain, {
    charge: { kind: "instant" },
    voltage: voltage - (reversed ? diode : 0),
    hold: 2000,
    dump: null,
    rest: 0,
  });
  return READ_AT.map((seconds) => {
    const exact = [...course.voltagesAt(seconds)];
    return reversed ? exact.toSpliced(position, 0, diode) : exact;
  });
}

/** What a 0.1 % meter with a gain error of 0.3 % reads of true voltages. */
export function readBy(drawn: Drawn, truly: readonly (readonly number[])[], random: () => number): Trial {
  const { kind, stages, position, bank } = drawn;
  const g = () => normal(random);
  const gain = 1 + 0.003 * g();
  const read = (v: number) => v * gain * (1 + 0.001 * g()) + 0.1 * g();
  const sign = (i: number) => (kind === "meter lead swapped" && i === position ? -1 : 1);
  const rows = truly.map((volts, k) => {
    const total = volts.reduce((s, v) => s + v, 0);
    return { seconds: READ_AT[k]!, bank, volts: volts.map((v, i) => sign(i) * read(v)), total: read(total) };
  });
  const limit = 405;
  const request = { stages, rows, meter: { relative: 0.001, absolute: 0.1, common: 0.003 }, limit };
  return { request, position, overLimit: Math.max(...truly.flat()) / limit };
}

/** A bank drawn and read at 0, 5 and 25 minutes, its voltages by the exact course. */
export function trial(kind: FaultKind | null, random: () => number): Trial {
  const drawn = draw(kind, random);
  return readBy(drawn, exactVolts(drawn), random);
}
