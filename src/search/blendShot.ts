// The shot of one group of a blend: what its worst unit carries beside the other groups, which have impedances of their own.
//
// The groups are branches in parallel into one load, followed exactly; the corners are all groups high, all low, and this group
// at one end with the others at the other. Only plain loads (resistor, coil, short) without a clamp or a switch with a drop can be
// reckoned so, and only with every ESR and ESL known: else nothing is said of the shot of a mix.
// Source: [methods-derived] corners as for one layout; the division in parallel branches is circuit theory.

import type { Capacitor } from "../catalog/index.ts";
import { type Branch, boundsOf, branchShot, type PulseBank, unitDutyOf, unknownsOf } from "../pulse/index.ts";
import { accepted, type Read, refused } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { circuitOf } from "./circuit.ts";
import { bankAt, type CornerName, isPlain, type Shape, type ShotCorner } from "./shotCorner.ts";

export interface ShotGroup extends Shape {
  readonly unit: Capacitor;
}

/** The groups beside one group. */
export interface Beside {
  readonly others: readonly ShotGroup[];
}

const bankOf = ({ unit, ...shape }: ShotGroup, corner: CornerName): PulseBank => bankAt(unit, shape, corner);

/** Nominal capacitance of the others, F. */
export const othersNominal = ({ others }: Beside): number =>
  others.reduce((sum, one) => sum + bankOf(one, "nominal").capacitance, 0);

const unreckoned = (read: string, want: string): Read<never> =>
  refused({ code: "missing-value", place: { field: "load" }, read, want });

const branchOf = (bank: PulseBank, isolating: number): Branch | null =>
  bank.esr === null || bank.esl === null
    ? null
    : {
        capacitance: bank.capacitance,
        resistance: bank.esr + (isolating * bank.series) / bank.parallel,
        inductance: bank.esl,
      };

/** The worst over the corners, as the group's worst unit meets it. Refused: what cannot be reckoned, as the head of the file says. */
export function besideShot(brief: Brief, group: ShotGroup, { others }: Beside): Read<ShotCorner> {
  const ends = brief.basis === "nominal" ? (["nominal"] as const) : (["high", "low"] as const);
  let worst: ShotCorner | null = null;
  for (const own of ends) {
    for (const rest of ends) {
      const banks = [bankOf(group, own), ...others.map((one) => bankOf(one, rest))];
      const read = shotAt(brief, banks);
      if (!read.ok) return read;
      worst = worst === null ? read.value : worse(worst, read.value);
    }
  }
  return worst === null ? unreckoned("nothing", "a basis") : accepted(worst);
}

function shotAt(brief: Brief, banks: readonly PulseBank[]): Read<ShotCorner> {
  const own = banks[0]!;
  const capacitance = banks.reduce((sum, bank) => sum + bank.capacitance, 0);
  const whole = { ...own, capacitance };
  const found = circuitOf(brief, whole);
  if (!found.ok) return found;
  const { circuit } = found.value;
  if (!isPlain(circuit))
    return unreckoned(circuit.load.kind, "a resistor, a coil or a short, without clamp or switch drop");
  const branches = banks.map((bank) => branchOf(bank, brief.isolating ?? 0));
  if (!branches.every((one) => one !== null))
    return unreckoned("a group of unknown ESR or ESL", "the ESR and ESL of every part");
  const { load, bus, switch: sw } = circuit;
  const outer = {
    resistance: (bus?.resistance ?? 0) + sw.resistance + ("resistance" in load ? (load.resistance ?? 0) : 0),
    inductance: (bus?.inductance ?? 0) + ("inductance" in load ? (load.inductance ?? 0) : 0),
  };
  const { peakCurrent, action, reversal } = branchShot(branches, outer, brief.voltage)[0]!;
  const bounds = boundsOf(unknownsOf(whole, circuit), false);
  return accepted({
    bank: whole,
    reversal,
    // The action here is the group's own: its part of the bank's current is in it.
    action,
    unit: unitDutyOf(own, { peakCurrent, action, reversal }),
    bounds: sw.oneWay ? { ...bounds, action: "upper bound" } : bounds,
    left: sw.oneWay ? brief.voltage * reversal : 0,
  });
}

const worse = (one: ShotCorner, other: ShotCorner): ShotCorner => ({
  ...(other.bank.capacitance > one.bank.capacitance ? other : one),
  reversal: Math.max(one.reversal, other.reversal),
  action: Math.max(one.action ?? 0, other.action ?? 0),
  left: Math.max(one.left, other.left),
  unit: {
    ...one.unit,
    peakCurrent: Math.max(one.unit.peakCurrent, other.unit.peakCurrent),
    slew: Math.max(one.unit.slew, other.unit.slew),
  },
});
