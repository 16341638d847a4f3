/*
 * Stages in series: the states of a chain that need no time course.
 *
 * | symbol | in code        | unit | range                                                         |
 * | ------ | -------------- | ---- | ------------------------------------------------------------- |
 * | C_i    | capacitance    | F    | > 0                                                           |
 * | I_i    | leakageCurrent | A    | >= 0; a constant sink while the stage is above zero volts     |
 * | g_i    | conductance    | S    | >= 0; 1/insulation resistance                                 |
 * | R_i    | resistance     | ohm  | > 0; balancing resistor, Infinity when there is none          |
 *
 * Charging: the same charge through every stage, v_i = V (1/C_i) / sum(1/C_k).
 * After an endless hold: v_i = (I - I_i)/(g_i + 1/R_i) with sum(v_i) = V; see endOfHold for stages that conduct nothing.
 * A leakage current stops at zero volts: it cannot drive its own stage negative.
 * Holds for ideal capacitors; a bank of strings is one chain for each string, with one unit a stage.
 */

export interface Stage {
  readonly capacitance: number;
  readonly leakageCurrent: number;
  readonly conductance: number;
  readonly resistance: number;
}

export type Chain = readonly Stage[];

/** One unit without its balancing resistor. */
export type ChainUnit = Omit<Stage, "resistance">;

/**
 * The chain of cross-tied stages: `stages[i]` are the units in parallel of stage i, `resistances[i]` (ohm) the balancing
 * resistor across stage i.
 */
export function crossTiedChain(stages: readonly (readonly ChainUnit[])[], resistances: readonly number[]): Chain {
  return stages.map((units, i) => ({
    capacitance: total(units.map((unit) => unit.capacitance)),
    leakageCurrent: total(units.map((unit) => unit.leakageCurrent)),
    conductance: total(units.map((unit) => unit.conductance)),
    resistance: resistances[i] ?? Number.POSITIVE_INFINITY,
  }));
}

/** Everything of a stage that conducts in proportion to its voltage, S. */
export const stageConductance = (stage: Stage): number => stage.conductance + 1 / stage.resistance;

/** Capacitance of the whole chain, F: 1/sum(1/C_i). */
export const chainCapacitance = (chain: Chain): number => 1 / total(chain.map((stage) => 1 / stage.capacitance));

/**
 * Share of the chain's voltage on each stage while charge flows; the shares sum to 1.
 * Source: [methods-derived] 1.1
 */
export function chargingShares(chain: Chain): readonly number[] {
  const capacitance = chainCapacitance(chain);
  return chain.map((stage) => capacitance / stage.capacitance);
}

/**
 * Voltages (V) that an endless hold at `voltage` (V) ends in, having been charged fast from empty.
 * Source: [methods-derived] 2.1, with the leakage of a stage stopping at zero volts.
 *
 * The chain current I is the root of sum(v_i(I)) = V, v_i = max(0, I - I_i)/G_i. Stages that conduct nothing in proportion
 * to voltage (G_i = 0) hold the current at the smallest leakage among them, and what the others leave is theirs: it is divided
 * by how they were charged, less what each has lost, so only `courseOf` can say it when more than one remains; null then.
 */
export function endOfHold(chain: Chain, voltage: number): readonly number[] | null {
  const conductances = chain.map(stageConductance);
  const at = (current: number): readonly number[] =>
    chain.map((stage, i) => Math.max(0, current - stage.leakageCurrent) / (conductances[i] ?? 0));
  const ceilings = chain.filter((_, i) => conductances[i] === 0).map((stage) => stage.leakageCurrent);
  const ceiling = Math.min(...ceilings);
  if (ceilings.length > 0) {
    const voltages = at(ceiling).map((v, i) => (conductances[i] === 0 ? 0 : v));
    const keepers = chain.flatMap((stage, i) =>
      conductances[i] === 0 && stage.leakageCurrent === ceiling && voltages[i] === 0 ? [i] : [],
    );
    const left = voltage - total(voltages);
    // With less than enough voltage the conducting stages alone carry it, at a current below the ceiling.
    if (left >= 0) {
      const [only, ...more] = keepers;
      return more.length > 0 || only === undefined ? null : voltages.map((v, i) => (i === only ? left : v));
    }
  }
  // sum(v_i) is piecewise linear in I and bends at each stage's leakage: walk the bends upwards.
  const bends = chain
    .map((stage, i) => ({ leakage: stage.leakageCurrent, conductance: conductances[i] ?? 0 }))
    .filter((bend) => bend.conductance > 0)
    .sort((a, b) => a.leakage - b.leakage);
  let resistance = 0;
  let offset = 0;
  let current = 0;
  for (const [i, bend] of bends.entries()) {
    resistance += 1 / bend.conductance;
    offset += bend.leakage / bend.conductance;
    current = (voltage + offset) / resistance;
    const next = bends[i + 1];
    if (next === undefined || current <= next.leakage) break;
  }
  return at(current).map((v, i) => (conductances[i] === 0 ? 0 : v));
}

/**
 * Voltages (V) left on each stage when the ends of a chain standing at `voltages` (V) are brought to zero at once.
 * They sum to zero; below zero is a stage in reverse.
 * Source: [methods-derived] 1.4
 */
export function leftAfterDump(chain: Chain, voltages: readonly number[]): readonly number[] {
  const shares = chargingShares(chain);
  const ends = total(voltages);
  return voltages.map((v, i) => v - ends * (shares[i] ?? 0));
}

export function total(values: readonly number[]): number {
  let sum = 0;
  for (const value of values) sum += value;
  return sum;
}
