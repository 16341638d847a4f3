// A general circuit simulator as an outside check: chains as netlists, unit by unit.
import { Simulation } from "eecircuit-engine";

/** Volts over which a leakage fades at zero: the simulator cannot step over a jump. */
const STOP = 2e-3;

export interface SimulatedStage {
  /** The units in parallel; leakage as a constant sink that stops at zero volts when `stops`. */
  readonly units: readonly {
    readonly capacitance: number;
    readonly leakageCurrent: number;
    readonly conductance: number;
  }[];
  readonly resistance: number;
  readonly start: number;
}

export interface SimulatedChain {
  readonly stages: readonly SimulatedStage[];
  readonly drive:
    | { readonly kind: "source"; readonly voltage: number; readonly resistance: number }
    | { readonly kind: "current"; readonly current: number };
}

/** All chains in one circuit, each on its own nodes: `x` + chain + `_` + stage, stage 0 the grounded one. */
export function netlist(chains: readonly SimulatedChain[], seconds: number, step: number, stops: boolean): string {
  const lines = ["chains of capacitors"];
  for (const [c, chain] of chains.entries()) {
    const node = (stage: number): string => (stage < 0 ? "0" : `x${c}_${stage}`);
    for (const [s, stage] of chain.stages.entries()) {
      const across = `${node(s)} ${node(s - 1)}`;
      for (const [u, unit] of stage.units.entries()) {
        const name = `${c}_${s}_${u}`;
        lines.push(`C${name} ${across} ${unit.capacitance} ic=${stage.start}`);
        if (unit.conductance > 0) lines.push(`Rg${name} ${across} ${1 / unit.conductance}`);
        if (unit.leakageCurrent > 0) {
          const volts = s === 0 ? `v(${node(s)})` : `v(${node(s)})-v(${node(s - 1)})`;
          if (stops) lines.push(`B${name} ${across} I=${unit.leakageCurrent / 2}*(1+tanh((${volts})/${STOP}))`);
          else lines.push(`I${name} ${across} ${unit.leakageCurrent}`);
        }
      }
      if (stage.resistance < Number.POSITIVE_INFINITY) lines.push(`Rb${c}_${s} ${across} ${stage.resistance}`);
    }
    const top = node(chain.stages.length - 1);
    if (chain.drive.kind === "current") {
      if (chain.drive.current !== 0) lines.push(`Id${c} 0 ${top} ${chain.drive.current}`);
    } else if (chain.drive.resistance > 0) {
      lines.push(`Vd${c} d${c} 0 ${chain.drive.voltage}`, `Rd${c} d${c} ${top} ${chain.drive.resistance}`);
    } else lines.push(`Vd${c} ${top} 0 ${chain.drive.voltage}`);
  }
  lines.push(".options reltol=1e-6 abstol=1e-12 vntol=1e-7 gmin=1e-18");
  lines.push(`.tran ${step} ${seconds} 0 ${step} uic`, ".end");
  return lines.join("\n");
}

export interface Simulated {
  readonly seconds: readonly number[];
  /** Stage voltages: [chain][stage][time]. */
  readonly voltages: readonly (readonly (readonly number[])[])[];
}

export async function startSimulator(): Promise<Simulation> {
  const simulator = new Simulation();
  await simulator.start();
  return simulator;
}

export async function simulate(
  simulator: Simulation,
  chains: readonly SimulatedChain[],
  run: { readonly seconds: number; readonly step: number; readonly stops: boolean },
): Promise<Simulated> {
  simulator.setNetList(netlist(chains, run.seconds, run.step, run.stops));
  const result = await simulator.runSim();
  const errors = simulator.getError();
  if (errors.length > 0) throw new Error(`the simulator complains: ${errors.join("; ")}`);
  const columns = new Map(result.data.map((column) => [column.name.toLowerCase(), column.values as number[]]));
  const read = (name: string): number[] => {
    const values = columns.get(name);
    if (values === undefined) throw new Error(`no ${name} among ${[...columns.keys()].slice(0, 5).join(" ")}`);
    return values;
  };
  const seconds = read("time");
  const voltages = chains.map((chain, c) =>
    chain.stages.map((_, s) => {
      const above = read(`v(x${c}_${s})`);
      const below = s === 0 ? null : read(`v(x${c}_${s - 1})`);
      return above.map((v, k) => v - (below?.[k] ?? 0));
    }),
  );
  return { seconds, voltages };
}
