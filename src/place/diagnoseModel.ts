/*
 * A small model of stage voltages after a quick charge: what a diagnosis compares readings with.
 *
 *   symbol  unit  range   meaning
 *   C_i     F     > 0     capacitance of a stage (of a unit, in a string)
 *   g_i     S     >= 0    leakage conductance
 *   R_i     ohm   > 0     balancing resistor; infinite when there is none;  G_i = g_i + 1/R_i
 *   V       V             bank voltage
 *
 *   at once        V_i = V (1/C_i)/sum(1/C_k)
 *   charger on     C_i dV_i/dt = I - G_i V_i,  sum V_i = V         I = sum(G_k V_k/C_k)/sum(1/C_k)
 *   charger off    V_i = V_i(0) exp(-t G_i/C_i)                    I = 0
 *
 * Integrated by a second-order L-stable two-stage rule on steps that grow with time; within 2e-4 of V of the exact course.
 * Leakage in proportion to voltage; a fuller model may be given in its place (`Course`).
 * Source: [methods-derived] 2.1; [Alexander1977] the rule of integration.
 */

export interface StageModel {
  readonly capacitance: number;
  readonly conductance: number;
  readonly resistance: number;
}

export interface CourseRow {
  /** V across each stage. */
  readonly volts: readonly number[];
  /** A, from the charger; 0 when it is off. */
  readonly current: number;
}

/** Voltages (and the charger's current) of the stages at the given times (s, rising) after a quick charge to `bank` V. */
export type Course = (stages: readonly StageModel[], bank: number, times: readonly number[]) => readonly CourseRow[];

const GAMMA = 1 - Math.SQRT1_2;
const FIRST_STEP = 0.05;
const GROWTH = 1.15;

export const conductanceOf = ({ conductance, resistance }: StageModel): number => conductance + 1 / resistance;

/** Voltages just after a quick charge. */
export function chargedVolts(stages: readonly StageModel[], bank: number): number[] {
  const inverse = stages.map((stage) => 1 / stage.capacitance);
  const sum = inverse.reduce((total, x) => total + x, 0);
  return inverse.map((x) => (bank * x) / sum);
}

/** Voltages after an endless hold with the charger on; charge shares when nothing conducts. */
export function heldVolts(stages: readonly StageModel[], bank: number): number[] {
  const conductances = stages.map(conductanceOf);
  if (conductances.every((g) => g === 0)) return chargedVolts(stages, bank);
  const blocking = conductances.filter((g) => g === 0).length;
  // Stages that conduct nothing take the whole voltage between them in the end.
  if (blocking > 0) return conductances.map((g) => (g === 0 ? bank / blocking : 0));
  const sum = conductances.reduce((total, g) => total + 1 / g, 0);
  return conductances.map((g) => bank / g / sum);
}

/** Advances `volts` in place by `step` s: two implicit part-steps, in each of which the common current makes the sum `bank`. */
function advance(stages: readonly StageModel[], volts: Float64Array, bank: number, step: number): void {
  const part = GAMMA * step;
  const from = Float64Array.from(volts);
  for (let half = 0; half < 2; half++) {
    let free = 0;
    let perAmpere = 0;
    for (let i = 0; i < volts.length; i++) {
      const { capacitance, conductance, resistance } = stages[i]!;
      const denominator = capacitance + part * (conductance + 1 / resistance);
      free += (capacitance * from[i]!) / denominator;
      perAmpere += part / denominator;
    }
    const current = (bank - free) / perAmpere;
    for (let i = 0; i < volts.length; i++) {
      const { capacitance, conductance, resistance } = stages[i]!;
      const reached = (capacitance * from[i]! + part * current) / (capacitance + part * (conductance + 1 / resistance));
      // The second part-step starts from the line through the start and the end of the first.
      from[i] = half === 0 ? volts[i]! + ((1 - GAMMA) / GAMMA) * (reached - volts[i]!) : reached;
    }
  }
  volts.set(from);
}

function holdCurrent(stages: readonly StageModel[], volts: ArrayLike<number>): number {
  let flow = 0;
  let inverse = 0;
  for (const [i, stage] of stages.entries()) {
    flow += (conductanceOf(stage) * volts[i]!) / stage.capacitance;
    inverse += 1 / stage.capacitance;
  }
  return flow / inverse;
}

/** The course with the charger on, holding `bank`. */
export const chargerOn: Course = (stages, bank, times) => {
  const fastest = Math.max(...stages.map((stage) => conductanceOf(stage) / stage.capacitance));
  const volts = Float64Array.from(chargedVolts(stages, bank));
  let now = 0;
  let step = fastest > 0 ? FIRST_STEP / fastest : Number.POSITIVE_INFINITY;
  return times.map((time) => {
    while (time > now) {
      const length = Math.min(step, time - now);
      // Nothing conducts, or the hold is endless: the voltages it ends in are known.
      if (Number.isFinite(length)) advance(stages, volts, bank, length);
      else volts.set(heldVolts(stages, bank));
      now = length === step ? now + length : time;
      step *= GROWTH;
    }
    return { volts: Array.from(volts), current: holdCurrent(stages, volts) };
  });
};

/** The course with the charger taken off at time 0: every stage falls by itself. */
export const chargerOff: Course = (stages, bank, times) => {
  const start = chargedVolts(stages, bank);
  return times.map((time) => ({
    volts: stages.map((stage, i) => start[i]! * Math.exp((-time * conductanceOf(stage)) / stage.capacitance)),
    current: 0,
  }));
};
