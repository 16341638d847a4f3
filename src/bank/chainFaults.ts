/*
 * A bank with one unit short or open: the voltages it goes to at once, and the energy that flows.
 *
 * v_i unit or stage voltages, V; C_i, F; a short is ideal and sudden and nothing rings.
 * Short, ends held at V: the lost v_k is shared by the rest by charge, v_i + v_k (1/C_i)/sum over the rest; then they hold without k.
 * Short in one of several strings with the charger off: all strings move to u = sum(C_s V_s)/sum(C_s), C_s the string's capacitance.
 * Open: a stage without the unit; a string with an open unit is fed through what resistor remains across the gap.
 * Source: [methods-derived] 8
 */
import { type Chain, type ChainUnit, chainCapacitance, chargingShares, total } from "./chain.ts";

/** A chain that has lost a stage. `positions[i]` is where its stage i stood in the whole chain. */
export interface Faulted {
  readonly chain: Chain;
  readonly positions: readonly number[];
  /** What now stands in series with the chain, ohm; Infinity when nothing can flow. */
  readonly seriesResistance: number;
}

/** The chain with stage k a short circuit. */
export const withShort = (chain: Chain, k: number): Faulted => ({ ...without(chain, k), seriesResistance: 0 });

/** The chain with the only unit of stage k open; its balancing resistor stays. Hold it as a `Program` with that series resistance. */
export const withOpen = (chain: Chain, k: number): Faulted => ({
  ...without(chain, k),
  seriesResistance: chain[k]!.resistance,
});

/** The units of cross-tied stages with one taken out, for `crossTiedChain`; a stage needs one unit more. */
export const withoutUnit = (
  stages: readonly (readonly ChainUnit[])[],
  at: { readonly stage: number; readonly unit: number },
): readonly (readonly ChainUnit[])[] =>
  stages.map((units, i) => (i === at.stage ? units.filter((_, j) => j !== at.unit) : units));

function without(chain: Chain, k: number): Pick<Faulted, "chain" | "positions"> {
  return {
    chain: chain.filter((_, i) => i !== k),
    positions: chain.flatMap((_, i) => (i === k ? [] : [i])),
  };
}

/** Voltages (V) of the stages that remain right after stage k shorts with the ends held: the start of their hold. */
export function afterShortHeld(chain: Chain, voltages: readonly number[], k: number): readonly number[] {
  const rest = without(chain, k);
  const shares = chargingShares(rest.chain);
  return rest.positions.map((i, at) => voltages[i]! + voltages[k]! * shares[at]!);
}

export interface StringShort {
  /** Common voltage (V) of all strings once they have equalised. */
  readonly voltage: number;
  /** Voltages (V) of the faulted string's units, 0 for the shorted one. */
  readonly survivors: readonly number[];
  /** Energy (J) turned to heat between the strings, and that of the shorted unit itself. */
  readonly equalising: number;
  readonly ownEnergy: number;
}

/** Independent strings with the charger off: unit k of string s shorts. `voltages[s][i]` in V. */
export function shortInStrings(
  strings: readonly Chain[],
  voltages: readonly (readonly number[])[],
  at: { readonly string: number; readonly unit: number },
): StringShort {
  const faulted = without(strings[at.string]!, at.unit);
  const own = voltages[at.string]!;
  const sides = strings.map((chain, s) =>
    s === at.string
      ? { capacitance: chainCapacitance(faulted.chain), voltage: total(own) - own[at.unit]! }
      : { capacitance: chainCapacitance(chain), voltage: total(voltages[s]!) },
  );
  const voltage =
    total(sides.map((side) => side.capacitance * side.voltage)) / total(sides.map((side) => side.capacitance));
  const side = sides[at.string]!;
  const charge = side.capacitance * (voltage - side.voltage);
  return {
    voltage,
    survivors: own.map((v, i) => (i === at.unit ? 0 : v + charge / strings[at.string]![i]!.capacitance)),
    equalising: total(sides.map(({ capacitance, voltage: v }) => (capacitance * (v - voltage) ** 2) / 2)),
    ownEnergy: (strings[at.string]![at.unit]!.capacitance * own[at.unit]! ** 2) / 2,
  };
}

export interface StageShort {
  /** J: of the shorted unit itself, and of its neighbours in the stage. */
  readonly ownEnergy: number;
  readonly neighbourEnergy: number;
  /** With an isolation resistor in every unit's leg, else null: A, J in the faulted leg and in each other, A^2 s in the faulted leg. */
  readonly peakCurrent: number | null;
  readonly faultedLegEnergy: number | null;
  readonly neighbourLegEnergy: number | null;
  readonly action: number | null;
}

/**
 * A unit of a cross-tied stage at `voltage` (V) shorts: its equal neighbours (F each) empty into it, each through its own
 * `isolation` resistor (ohm; null when there is none or it is unknown).
 */
export function shortInStage(given: {
  readonly capacitance: number;
  readonly units: number;
  readonly voltage: number;
  readonly isolation: number | null;
}): StageShort {
  const { capacitance, units, voltage, isolation } = given;
  const ownEnergy = (capacitance * voltage ** 2) / 2;
  const neighbours = units - 1;
  const neighbourEnergy = neighbours * ownEnergy;
  if (isolation === null || neighbours === 0) {
    const none = neighbours === 0 ? 0 : null;
    return {
      ownEnergy,
      neighbourEnergy,
      peakCurrent: none,
      faultedLegEnergy: none,
      neighbourLegEnergy: none,
      action: none,
    };
  }
  return {
    ownEnergy,
    neighbourEnergy,
    peakCurrent: (voltage * neighbours) / (units * isolation),
    faultedLegEnergy: (neighbourEnergy * neighbours) / units,
    neighbourLegEnergy: neighbourEnergy / (units * neighbours),
    action: (neighbourEnergy * neighbours) / (units * isolation),
  };
}
