/*
 * What the worst stage or unit of a placed bank sees from the end of a quick charge to the end of a hold, and between.
 *
 *   symbol  in code          unit  meaning
 *   V       voltage          V     charge voltage, held by the charger
 *   G       I_leak / V_meas  S     leakage, in proportion to voltage
 *   R       resistance       ohm   balancing resistor of a stage (cross-tied) or unit (strings), all alike; infinite for none
 *
 * The voltages run from the charging share to the holding share, each stage by a sum of exponentials; one may stand higher on the way
 * than at either end. Peaks are those of the exact course. Source: [methods-derived] 2.1 as a function of time.
 */
import { type Chain, courseOf, crossTiedChain, type Stage } from "../bank/index.ts";
import type { MeasuredUnit, Ties } from "./unit.ts";

export interface HeldBank {
  /** Stages (cross-tied) or strings; every unit with its leakage, > 0 where there is no resistor. */
  readonly groups: readonly (readonly MeasuredUnit[])[];
  readonly ties: Ties;
  readonly voltage: number;
  /** Voltage on a unit at which leakage was read. */
  readonly leakageVoltage: number;
  readonly resistance: number;
  /** s; may be endless. */
  readonly hold: number;
}

/** A voltage and where and when it stands. */
export interface Stand {
  readonly voltage: number;
  /** Stage (cross-tied) or string, and place in the string (0 when cross-tied), from 0. */
  readonly group: number;
  readonly place: number;
  /** s after the end of the charge. */
  readonly seconds: number;
}

export interface HoldCourse {
  readonly charging: Stand;
  /** At the end of the hold. */
  readonly holding: Stand;
  /** The highest anywhere between. */
  readonly peak: Stand;
  /** By what part the peak stands above the higher of the two ends. */
  readonly above: number;
}

/** The chains of a bank: one when cross-tied, one for each string. */
export function chainsOf({ groups, ties, leakageVoltage, resistance }: Omit<HeldBank, "voltage" | "hold">): Chain[] {
  const unitOf = (unit: MeasuredUnit): Omit<Stage, "resistance"> => ({
    capacitance: unit.capacitance,
    leakageCurrent: 0,
    conductance: (unit.leakage ?? 0) / leakageVoltage,
  });
  if (ties === "strings") return groups.map((group) => group.map((unit) => ({ ...unitOf(unit), resistance })));
  return [
    crossTiedChain(
      groups.map((group) => group.map(unitOf)),
      groups.map(() => resistance),
    ),
  ];
}

const higher = (a: Stand, b: Stand): Stand => (b.voltage > a.voltage ? b : a);

/** The two ends and the peak between. An endless hold has its end at an endless time. */
export function holdCourse(bank: HeldBank): HoldCourse {
  const none: Stand = { voltage: 0, group: 0, place: 0, seconds: 0 };
  let [charging, holding, peak] = [none, none, none];
  for (const [c, chain] of chainsOf(bank).entries()) {
    const program = {
      charge: { kind: "instant" },
      voltage: bank.voltage,
      hold: bank.hold,
      dump: null,
      rest: 0,
    } as const;
    const phases = courseOf(chain, program).phases;
    const last = phases.at(-1)!;
    const stand = (voltage: number, i: number, seconds: number): Stand =>
      bank.ties === "strings" ? { voltage, group: c, place: i, seconds } : { voltage, group: i, place: 0, seconds };
    for (const [i, v] of phases[0]!.end.entries()) charging = higher(charging, stand(v, i, 0));
    for (const [i, v] of last.end.entries()) holding = higher(holding, stand(v, i, bank.hold));
    for (const [i, p] of last.peaks().entries()) peak = higher(peak, stand(p.voltage, i, p.seconds));
  }
  peak = higher(higher(peak, charging), holding);
  const ends = Math.max(charging.voltage, holding.voltage);
  return { charging, holding, peak, above: peak.voltage / ends - 1 };
}
