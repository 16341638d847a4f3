// Speed of the bank's sharing, each figure a ratio measured within this run.

import { chargingShares, type Stage } from "../../src/bank/chain.ts";
import { phaseFrom } from "../../src/bank/coursePhase.ts";
import { monteCarloChunk } from "../../src/bank/monteCarlo.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";
import { exceedRisk } from "../../src/bank/tail.ts";
import type { TailCase } from "../../src/bank/tailLaw.ts";
import { type SimulatedChain, simulate, startSimulator } from "../bank/simulate.ts";
import { atLeast, atMost, type BenchRow } from "./row.ts";

/** Best of several timings, s; interleaved by the caller where two are compared. */
function seconds(work: () => unknown): number {
  const start = performance.now();
  work();
  return (performance.now() - start) / 1e3;
}

function bestOf(times: number, works: readonly (() => unknown)[]): readonly number[] {
  const best = works.map(() => Number.POSITIVE_INFINITY);
  for (let turn = 0; turn < times; turn++)
    for (const [i, work] of works.entries()) best[i] = Math.min(best[i]!, seconds(work));
  return best;
}

const BANK: TailCase = {
  law: { kind: "uniform", low: 0.8, high: 1.2 },
  ties: "cross-tied",
  n: 8,
  p: 12,
  share: 1.1675 / 8,
};
const BANKS = 10_000;

/** Draws the numbers of as many banks and adds them up: nothing else. */
function bareLoop(draws: number): number {
  const state = streamState(1, 0);
  let a = state.a | 0;
  let b = state.b | 0;
  let c = state.c | 0;
  let counter = state.counter | 0;
  let sum = 0;
  for (let k = 0; k < draws; k++) {
    const t = (((a + b) | 0) + counter) | 0;
    counter = (counter + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = (((c << 21) | (c >>> 11)) + t) | 0;
    sum += (t >>> 0) * 2 ** -32;
  }
  return sum;
}

function tailRows(): readonly BenchRow[] {
  const chunk = (ties: TailCase["ties"]) => () =>
    monteCarloChunk({ ...BANK, ties }, { seed: 1, chunk: 0, banks: BANKS });
  // Warm: a loop that the engine optimises while it runs once stays slower than one called many times.
  for (let turn = 0; turn < 300; turn++) bareLoop(2000);
  const [tail, tied, strings, bare] = bestOf(40, [
    () => exceedRisk(BANK),
    chunk("cross-tied"),
    chunk("strings"),
    () => bareLoop(BANKS * 96),
  ]) as [number, number, number, number];
  const { exceed, error } = exceedRisk(BANK);
  // Banks for a relative standard error e at chance p: (1 - p)/(p e^2).
  const needed = (1 - exceed) / (exceed * (error / exceed) ** 2);
  return [
    {
      what: `8s12p tail at ${exceed.toExponential(2)} (+-${((100 * error) / exceed).toFixed(2)} %) against Monte Carlo of equal standard error, times faster`,
      value: ((needed / BANKS) * tied) / tail,
      promise: atLeast(1000),
    },
    {
      what: "Monte Carlo 8s12p cross-tied against a bare loop of the same draws, times as long",
      value: tied / bare,
      promise: atMost(3),
    },
    {
      what: "Monte Carlo 8s12p strings against a bare loop of the same draws, times as long",
      value: strings / bare,
      promise: atMost(3),
    },
  ];
}

async function courseRows(): Promise<readonly BenchRow[]> {
  const draw = uniformFrom(streamState(6, 0));
  const chain: readonly Stage[] = Array.from({ length: 20 }, () => ({
    capacitance: 0.8e-3 + 0.4e-3 * draw(),
    leakageCurrent: 0.02 * draw(),
    conductance: 1e-3 * draw(),
    resistance: 500 + 2000 * draw(),
  }));
  const start = chargingShares(chain).map((share) => share * 4000);
  const drive = { kind: "source", voltage: 4000, resistance: 0 } as const;
  const simulated: SimulatedChain = {
    drive,
    stages: chain.map(({ resistance, ...unit }, i) => ({ units: [unit], resistance, start: start[i]! })),
  };
  const ours = (): Float64Array => {
    const phase = phaseFrom({ name: "hold", chain, drive, start, seconds: 0.5 });
    return phase.voltagesOver({ from: 5e-4, step: 5e-4, count: 1000 });
  };
  const simulator = await startSimulator();
  const [mine] = bestOf(60, [ours]) as [number];
  const rows: BenchRow[] = [];
  // The simulator's error falls with the square of its step, ours is rounding: at either step it is the less exact, so the comparison favours it.
  for (const [name, step] of [
    ["at 1,000 instants of its own", 5e-4],
    ["at a step 20 times finer", 2.5e-5],
  ] as const) {
    let theirs = Number.POSITIVE_INFINITY;
    let worst = 0;
    for (let turn = 0; turn < 3; turn++) {
      const begun = performance.now();
      const found = await simulate(simulator, [simulated], { seconds: 0.5, step, stops: false });
      theirs = Math.min(theirs, (performance.now() - begun) / 1e3);
      const phase = phaseFrom({ name: "hold", chain, drive, start, seconds: 0.5 });
      worst = 0;
      for (let k = 0; k < found.seconds.length; k += 7)
        for (const [i, v] of phase.voltagesAt(found.seconds[k]!).entries())
          worst = Math.max(worst, Math.abs(v - found.voltages[0]![i]![k]!) / 4000);
    }
    rows.push({
      what: `20 stages at 1,000 instants against the circuit simulator ${name}, off by ${worst.toExponential(1)}, times faster`,
      value: theirs / mine,
      promise: atLeast(200),
    });
  }
  return rows;
}

/** All rows; takes some seconds. */
export async function benchBank(): Promise<readonly BenchRow[]> {
  return [...tailRows(), ...(await courseRows())];
}
