// The faulty banks of faults.ts in a general circuit simulator: charged from nothing, a reversed unit as a diode, voltages read off.
import type { Simulation } from "eecircuit-engine";
import type { FaultKind } from "../../src/place/diagnoseFaults.ts";
import { type Drawn, draw, READ_AT, readBy, type Trial } from "./faults.ts";

/** ohm of the charger: the bank is full within microseconds. */
const CHARGER = 0.01;
/** s after which the bank counts as charged. */
const FULL = 2e-3;
const STEP = 3;
/** A silicon junction: saturation current, A, and thermal voltage, V. */
const SATURATION = 1e-9;
const THERMAL = 0.02585;

/** The bank as a netlist, stage 0 the grounded one. */
export function faultNetlist({ truth, stages, diode, voltage }: Drawn): string {
  const lines = ["a faulty bank"];
  for (const [i, stage] of truth.entries()) {
    const across = `x${i} ${i === 0 ? "0" : `x${i - 1}`}`;
    if (stage === null) {
      // Backwards it conducts: its drop at a milliampere is about `diode`, by the emission coefficient.
      const emission = diode / (THERMAL * Math.log(1e-3 / SATURATION));
      lines.push(`.model j${i} d(is=${SATURATION} n=${emission})`, `D${i} ${across} j${i}`);
      lines.push(`C${i} ${across} ${stages[i]!.capacitance} ic=0`);
      continue;
    }
    lines.push(`C${i} ${across} ${stage.capacitance} ic=0`, `Rg${i} ${across} ${1 / stage.conductance}`);
    if (Number.isFinite(stage.resistance)) lines.push(`Rb${i} ${across} ${stage.resistance}`);
  }
  lines.push(`V1 top 0 pwl(0 0 1m ${voltage} 2m ${voltage} 3m ${voltage})`, `R1 top x${truth.length - 1} ${CHARGER}`);
  lines.push(".options reltol=1e-6 abstol=1e-12 vntol=1e-6 gmin=1e-18");
  lines.push(`.tran ${STEP} ${READ_AT.at(-1)! + 2 * STEP} 0 ${STEP} uic`, ".end");
  return lines.join("\n");
}

/** Stage voltages when the charge is done, and at the later times. */
export async function simulatedVolts(simulator: Simulation, drawn: Drawn): Promise<number[][]> {
  simulator.setNetList(faultNetlist(drawn));
  const { data } = await simulator.runSim();
  const errors = simulator.getError();
  if (errors.length > 0) throw new Error(`the simulator complains: ${errors.join("; ")}`);
  const columns = new Map(data.map((column) => [column.name.toLowerCase(), column.values as number[]]));
  const column = (name: string): number[] => {
    const values = columns.get(name);
    if (values === undefined) throw new Error(`no ${name} among ${[...columns.keys()].join(" ")}`);
    return values;
  };
  const seconds = column("time");
  return READ_AT.map((time) => {
    const at = seconds.findIndex((s) => s >= Math.max(time, FULL));
    // Between two steps the voltages are taken as straight; after the charge they bend over minutes.
    const part = (Math.max(time, FULL) - seconds[at - 1]!) / (seconds[at]! - seconds[at - 1]!);
    const node = (i: number): number => {
      if (i < 0) return 0;
      const values = column(`v(x${i})`);
      return values[at - 1]! * (1 - part) + values[at]! * part;
    };
    return drawn.truth.map((_, i) => node(i) - node(i - 1));
  });
}

/** `trial`, its voltages by the simulator. */
export async function simulatedTrial(
  simulator: Simulation,
  kind: FaultKind | null,
  random: () => number,
): Promise<Trial> {
  const drawn = draw(kind, random);
  return readBy(drawn, await simulatedVolts(simulator, drawn), random);
}
