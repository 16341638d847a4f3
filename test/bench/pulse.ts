// Measures the two promises of the pulse layer, each as a ratio within one run.
import { Simulation } from "eecircuit-engine";
import { chargingWorst, holdingWorst } from "../../src/bank/index.ts";
import { normalLampPulse } from "../../src/pulse/lampDrive.ts";
import { peakCurrentOf } from "../../src/pulse/peaks.ts";
import { type QuickLayout, quickBankPeak } from "../../src/pulse/peakTable.ts";
import { atLeast, atMost, type BenchRow } from "./row.ts";

/**
 * Shortest of some runs of each work [ms], in turn: the shortest is the least disturbed by whatever else the machine does, and
 * taking turns gives each the same share of its quiet moments.
 */
function shortestInTurn(runs: number, works: readonly (() => void)[]): readonly number[] {
  const best = works.map(() => Number.POSITIVE_INFINITY);
  for (let run = 0; run < runs; run++)
    works.forEach((work, k) => {
      const start = performance.now();
      work();
      best[k] = Math.min(best[k]!, performance.now() - start);
    });
  return best;
}

const shortest = (runs: number, work: () => void): number => shortestInTurn(runs, [work])[0]!;

interface BenchLayout extends QuickLayout {
  readonly low: number;
  readonly high: number;
}

function layoutsOf(count: number): readonly BenchLayout[] {
  let state = 7;
  const random = (): number => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
  return Array.from({ length: count }, () => ({
    capacitance: 1e-4 + 1e-3 * random(),
    esr: 0.005 + 0.05 * random(),
    esl: 1e-8 + 4e-8 * random(),
    series: 2 + Math.floor(38 * random()),
    parallel: 1 + Math.floor(50 * random()),
    voltage: 500 + 3000 * random(),
    low: 0.2,
    high: 0.2,
  }));
}

const OUTSIDE = { resistance: 0.02, inductance: 2e-6 };

function peakRows(): readonly BenchRow[] {
  const layouts = layoutsOf(100_000);
  const out = new Float64Array(layouts.length);
  const shares = (): void => {
    for (let k = 0; k < layouts.length; k++) {
      const one = layouts[k]!;
      out[k] = (one.voltage * (1 + one.high)) / (1 + one.high + (one.series - 1) * (1 - one.low));
    }
  };
  const both = (): void => {
    for (let k = 0; k < layouts.length; k++) {
      const one = layouts[k]!;
      const leak = { kind: "current", amperes: 1e-3 } as const;
      const { voltage, series, parallel } = one;
      const holding = holdingWorst({ voltage, series, sharing: parallel, spread: 0.05, leak }, 24e3);
      out[k] = Math.max(chargingWorst(voltage, series, one), holding);
    }
  };
  const quick = (): void => {
    for (let k = 0; k < layouts.length; k++) out[k] = quickBankPeak(layouts[k]!, OUTSIDE);
  };
  const exact = (): void => {
    for (let k = 0; k < layouts.length; k++) {
      const { capacitance, esr, esl, series, parallel, voltage } = layouts[k]!;
      const ratio = series / parallel;
      const loop = {
        capacitance: capacitance / ratio,
        resistance: esr * ratio + OUTSIDE.resistance,
        inductance: esl * ratio + OUTSIDE.inductance,
      };
      out[k] = peakCurrentOf(loop, voltage);
    }
  };
  const [share = 0, peak = 0, sharing = 0, whole = 0] = shortestInTurn(100, [shares, quick, both, exact]);
  return [
    { what: "worst charging shares of 100,000 layouts", value: share, unit: "ms", promise: null },
    { what: "peaks of 100,000 layouts over their charging shares alone", value: peak / share, promise: atMost(2) },
    {
      what: "peaks of 100,000 layouts over their charging and holding shares",
      value: peak / sharing,
      promise: null,
    },
    {
      what: "the same by the exact form over their charging shares alone",
      value: whole / share,
      promise: null,
    },
  ];
}

/** Peak of the lamp pulse at alpha = 0.8 (C = L = V = 1) by the simulator, with `steps` in one sqrt(LC). */
async function simulatedPeak(simulation: Simulation, steps: number): Promise<{ peak: number; milliseconds: number }> {
  const net = [
    "lamp",
    "C1 a 0 1 IC=1",
    "L1 a b 1 IC=0",
    "VM b c 0",
    "B1 c 0 V=0.8*i(VM)/sqrt(abs(i(VM))+1e-10)",
    ".options reltol=1e-6 abstol=1e-12 vntol=1e-12",
    `.tran ${1 / steps} 4 0 ${1 / steps} uic`,
    ".end",
  ];
  simulation.setNetList(net.join("\n"));
  const start = performance.now();
  const result = await simulation.runSim();
  const milliseconds = performance.now() - start;
  const errors = simulation.getError();
  if (errors.length > 0) throw new Error(errors.join("\n"));
  const values = result.data.find(({ name }) => name.toLowerCase() === "i(vm)")?.values as readonly number[];
  return { peak: Math.max(...values), milliseconds };
}

async function lampRows(): Promise<readonly BenchRow[]> {
  const fine = normalLampPulse(0.8);
  if (!fine.ok) throw new Error("the reference pulse was refused");
  const wanted = fine.value.peakCurrent;
  let error = 1;
  const own = shortest(200, () => {
    const read = normalLampPulse(0.8, 1e-7);
    if (read.ok) error = Math.abs(read.value.peakCurrent / wanted - 1);
  });
  const simulation = new Simulation();
  await simulation.start();
  await simulatedPeak(simulation, 100);
  const rows: BenchRow[] = [{ what: "lamp pulse, relative error of its peak", value: error, promise: atMost(1e-6) }];
  for (const steps of [250, 500, 1000, 2000, 4000]) {
    const { peak, milliseconds } = await simulatedPeak(simulation, steps);
    const off = Math.abs(peak / wanted - 1);
    if (off > 1e-6 && steps < 4000) continue;
    rows.push({
      what: `simulator at ${steps} steps in sqrt(LC), relative error of its peak`,
      value: off,
      promise: null,
    });
    rows.push({
      what: "simulator's time over ours, one lamp pulse",
      value: milliseconds / own,
      promise: atLeast(50),
    });
    break;
  }
  rows.push({ what: "our lamp pulse with all its widths", value: own, unit: "ms", promise: null });
  return rows;
}

/** All rows of the pulse bench. */
export const benchPulse = async (): Promise<readonly BenchRow[]> => [...peakRows(), ...(await lampRows())];
