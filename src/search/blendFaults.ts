// What one failure does in a blend: the faults of each group, with what the other groups pour into it.
//
// The other groups hold the ends as a charger would, so volts are those of the group's own table. A string shorted end to end takes
// V^2 C_o/2 of the other groups (C_o) over its n units. Source: [methods-derived] as in the file on what is poured in.

import type { Capacitor } from "../catalog/index.ts";
import type { Fault } from "../pulse/index.ts";
import type { Verdict } from "../quantity/index.ts";
import { pouredIntoShort } from "./blendPoured.ts";
import type { BlendResult } from "./blendResult.ts";
import type { Brief } from "./brief.ts";
import { faultsOf } from "./faults.ts";

export interface BlendFault extends Fault {
  /** Part of the group that the fault is in. */
  readonly part: string;
  /** Joules of `energyIntoUnit` that other groups pour in, at most. */
  readonly fromOthers: number;
}

export function blendFaults(
  { strings }: Pick<BlendResult, "strings">,
  units: readonly Capacitor[],
  brief: Brief,
): readonly BlendFault[] {
  const voltage = brief.voltage * (1 + brief.overshoot);
  const all = strings.reduce((sum, { capacitance }) => sum + capacitance.nominal, 0);
  return strings.flatMap((group) => {
    const unit = units.find(({ part }) => part === group.part);
    if (unit === undefined) return [];
    const others = strings.length === 1 ? 0 : all - group.capacitance.nominal;
    return faultsOf({ result: group, unit, brief }).map((fault): BlendFault => {
      const { series, parallel, ties } = group;
      const { capacitance } = unit;
      const string = fault.id === "row-short" && series > 1 && ties === "strings";
      const poured =
        fault.id === "unit-short"
          ? pouredIntoShort({ series, parallel, ties, capacitance, others, voltage })
          : string
            ? (voltage * voltage * others) / (2 * series)
            : 0;
      if (poured === 0) return { ...fault, part: group.part, fromOthers: 0 };
      const joules = fault.energyIntoUnit === null ? null : fault.energyIntoUnit + poured;
      // the others at their high capacitance too; a loss that is concave in it is no more than so much larger
      const highest = Math.max(
        ...strings.map((one) => (one.capacitance.high ?? Number.POSITIVE_INFINITY) / one.capacitance.nominal),
      );
      const raised = Number.isFinite(highest) ? poured * highest : null;
      const energyWorst = fault.energyWorst === null || raised === null ? null : fault.energyWorst + raised;
      const least = joules === null ? null : joules + fault.energyOwn;
      return {
        ...fault,
        part: group.part,
        fromOthers: poured,
        energyIntoUnit: joules,
        energyWorst,
        // The other groups add to it by ways whose resistance is not known.
        peakIs: fault.peakCurrent === null ? fault.peakIs : "lower bound",
        verdict: worse(fault.verdict, held({ least, most: energyWorst }, unit.ruptureEnergy)),
        note: `${fault.note} The other groups pour in up to what is told here.`,
      };
    });
  });
}

const held = (joules: { readonly least: number | null; readonly most: number | null }, limit?: number): Verdict => {
  if (limit === undefined) return "not assessed";
  const over = (value: number | null): boolean => value !== null && value > limit * (1 + 1e-9);
  if (over(joules.least) || over(joules.most)) return "fail";
  return joules.most === null ? "not assessed" : "pass";
};

const worse = (one: Verdict, other: Verdict): Verdict =>
  (["fail", "not assessed", "warn"] as const).find((verdict) => verdict === one || verdict === other) ?? "pass";
