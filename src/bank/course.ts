// The whole time course of a chain: charge, hold, dump, rest, each an exact stretch or several.
import { type Chain, chargingShares, leftAfterDump } from "./chain.ts";
import { instantPhase, type Phase, type PhaseName, phaseFrom } from "./coursePhase.ts";
import type { Drive } from "./courseSegment.ts";

export interface Program {
  /** `instant`: so fast that nothing leaks meanwhile. `seriesResistance` (ohm) of what stays between charger and chain, default 0. */
  readonly charge:
    | { readonly kind: "instant" }
    | { readonly kind: "current"; readonly current: number }
    | { readonly kind: "source"; readonly voltage: number; readonly resistance: number };
  readonly voltage: number;
  readonly seriesResistance?: number;
  /** Seconds at `voltage`, 0 to Infinity. */
  readonly hold: number;
  /** Resistance 0 is an instant dump. Null: none. */
  readonly dump: { readonly resistance: number; readonly seconds: number } | null;
  /** Seconds with the ends open, 0 to Infinity. */
  readonly rest: number;
  /** Stage voltages (V) before the charge; default empty. */
  readonly start?: readonly number[];
}

export interface Course {
  readonly phases: readonly Phase[];
  /** False when the charge never reaches the voltage, because leakage takes all that it brings. Nothing follows it then. */
  readonly reached: boolean;
  /** Stage voltages (V) at a time since the charge began (s); the last phase's end when later. */
  voltagesAt(seconds: number): Float64Array;
}

/** The time course of a chain through a program. Source: [methods-derived] 2.1 made a function of time */
export function courseOf(chain: Chain, program: Program): Course {
  const empty = chain.map(() => 0);
  const phases: Phase[] = [chargePhase(chain, program, program.start ?? empty)];
  const reached = phases[0]!.seconds < Number.POSITIVE_INFINITY;
  const follow = (name: PhaseName, drive: Drive, seconds: number): void => {
    phases.push(phaseFrom({ name, chain, drive, start: phases.at(-1)!.end, seconds }));
  };
  if (reached) {
    const held: Drive = { kind: "source", voltage: program.voltage, resistance: program.seriesResistance ?? 0 };
    if (program.hold > 0) follow("hold", held, program.hold);
    if (program.dump && program.dump.resistance > 0)
      follow("dump", { kind: "source", voltage: 0, resistance: program.dump.resistance }, program.dump.seconds);
    else if (program.dump) {
      phases.push(instantPhase("dump", phases.at(-1)!.end, leftAfterDump(chain, phases.at(-1)!.end)));
      // Ends still joined by a wire: the stages go on leaking while they sum to zero.
      if (program.dump.seconds > 0) follow("dump", { kind: "source", voltage: 0, resistance: 0 }, program.dump.seconds);
    }
    if (program.rest > 0) follow("rest", { kind: "current", current: 0 }, program.rest);
  }
  return { phases, reached, voltagesAt: (seconds) => phasesAt(phases, seconds) };
}

function chargePhase(chain: Chain, program: Program, start: readonly number[]): Phase {
  const { charge, voltage } = program;
  if (charge.kind === "instant") {
    const shares = chargingShares(chain);
    const missing = voltage - start.reduce((sum, v) => sum + v, 0);
    return instantPhase(
      "charge",
      start,
      start.map((v, i) => v + missing * shares[i]!),
    );
  }
  return phaseFrom({ name: "charge", chain, drive: charge, start, seconds: Number.POSITIVE_INFINITY, until: voltage });
}

function phasesAt(phases: readonly Phase[], seconds: number): Float64Array {
  let begun = 0;
  for (const phase of phases) {
    if (seconds < begun + phase.seconds) return phase.voltagesAt(Math.max(0, seconds - begun));
    begun += phase.seconds;
  }
  return Float64Array.from(phases.at(-1)!.end);
}
