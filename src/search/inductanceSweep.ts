// Peak current of one layout's shot against the inductance of its loop, beside the bound that no loss at all would allow.

import type { Capacitor } from "../catalog/index.ts";
import { type Circuit, dischargeOf, type PulseBank } from "../pulse/index.ts";
import { power } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { circuitOf, pulseBankFor } from "./circuit.ts";
import type { LayoutResult } from "./result.ts";

export interface SweepPoint {
  /** H, of the whole loop. */
  readonly inductance: number;
  /** A. */
  readonly peak: number;
  /** A: V sqrt(C/L), which no loop of that inductance can pass. */
  readonly lossless: number;
}

export interface InductanceSweep {
  /** The loop's own inductance, H; null when none of its parts is known, so that the sweep is over usual values. */
  readonly here: number | null;
  /** Some part of the loop's inductance or resistance is unknown, so that every peak is an upper bound. */
  readonly bound: boolean;
  readonly points: readonly SweepPoint[];
}

/** Swept to a tenth and ten times the loop's own. */
const REACH = 10;
/** H: a tight bus to a metre of loose wire; used when nothing is known. */
const USUAL = { low: 20e-9, high: 2e-6 };

/** Every inductance of the loop at `factor` times its own; where there is none, the bus gets `inductance`. */
function loopWith(
  bank: PulseBank,
  circuit: Circuit,
  at: { readonly factor: number | null; readonly inductance: number },
) {
  const { factor, inductance } = at;
  const { bus, load } = circuit;
  if (factor === null) return { bank, circuit: { ...circuit, bus: { resistance: bus?.resistance ?? 0, inductance } } };
  const own = "inductance" in load ? { ...load, inductance: (load.inductance ?? 0) * factor } : load;
  return {
    bank: { ...bank, esl: bank.esl === null ? null : bank.esl * factor },
    circuit: {
      ...circuit,
      load: own,
      section: (circuit.section ?? 0) * factor,
      bus: bus && { ...bus, inductance: bus.inductance * factor },
    },
  };
}

/**
 * The sweep at `count` (at least 2) inductances, evenly apart in their logarithm. Null without a load, with a current that is
 * given (inductance has no say in it), and where the pulse layer refuses. Source: [Cona] series discharge, lossless limit.
 */
export function inductanceSweep(
  { layout, unit, brief }: { readonly layout: LayoutResult; readonly unit: Capacitor; readonly brief: Brief },
  count: number,
): InductanceSweep | null {
  const bank = pulseBankFor(unit, layout);
  const found = circuitOf(brief, bank);
  if (!found.ok) return null;
  const circuit = { ...found.value.circuit, place: null };
  const { load, bus } = circuit;
  if (load.kind === "steady current" || load.kind === "recorded") return null;
  const known =
    (bank.esl ?? 0) +
    (circuit.section ?? 0) +
    (bus?.inductance ?? 0) +
    ("inductance" in load ? (load.inductance ?? 0) : 0);
  const here = known > 0 ? known : null;
  const low = here === null ? USUAL.low : here / REACH;
  const high = here === null ? USUAL.high : here * REACH;
  const points: SweepPoint[] = [];
  for (let index = 0; index < count; index += 1) {
    const inductance = low * power(high / low, index / (count - 1));
    const loop = loopWith(bank, circuit, { factor: here === null ? null : inductance / here, inductance });
    const shot = dischargeOf(loop.bank, loop.circuit, brief.voltage);
    if (!shot.ok) return null;
    const lossless = brief.voltage * Math.sqrt(bank.capacitance / inductance);
    points.push({ inductance, peak: shot.value.peakCurrent, lossless });
  }
  return { here, bound: bank.esr === null || bank.esl === null || bus === null, points };
}
