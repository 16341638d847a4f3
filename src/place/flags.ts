// The findings of a placing: what was missing, what does not belong, and what the shape cannot reach.
import type { Finding, Verdict } from "../quantity/index.ts";
import type { Conductances } from "./conductance.ts";
import { OUTLIER_RULE, type Outlier } from "./outliers.ts";
import type { MeasuredUnit } from "./unit.ts";
import type { WildEffect } from "./wild.ts";

type Facts = Pick<Finding, "id" | "state" | "verdict" | "value" | "limit" | "note"> & { readonly source?: string };

const finding = ({ source = "methods-derived", ...facts }: Facts): Finding => ({
  ...facts,
  margin:
    facts.value !== null && facts.limit !== null && facts.limit !== 0
      ? (facts.limit - facts.value) / facts.limit
      : null,
  unit: "1",
  source,
});

const list = (serials: readonly string[]): string =>
  serials.length <= 6 ? serials.join(", ") : `${serials.slice(0, 5).join(", ")} and ${serials.length - 5} more`;

/** The gap against the floor: below it the meter cannot tell a better placing. */
export function gapFinding(state: "charging" | "holding", gap: number, floor: number): Finding {
  const verdict: Verdict = gap <= floor ? "pass" : "warn";
  const note =
    verdict === "pass"
      ? "The gap is below what the measurement can tell."
      : state === "charging"
        ? "The gap is above what the meter can tell: more spares or another shape would lower it."
        : "Holding is uneven beyond the doubt of the leakage readings: look at the front and at the balancing resistors.";
  return finding({ id: `place.${state}-gap`, state, verdict, value: gap, limit: floor, note });
}

const WHY = {
  missing: "Leakage was not measured on every unit: placed by capacitance only.",
  "no test voltage": "Leakage beside a balancing resistor needs the voltage at which leakage was read.",
  zero: "A leakage of 0 with no balancing resistor: a reading of 0 is the end of the meter's range, not a value.",
} as const;

export function holdingUnknown(conductances: Conductances & { readonly known: false }): Finding {
  const units = conductances.serials.length > 0 ? ` Units: ${list(conductances.serials)}.` : "";
  return finding({
    id: `place.leakage-${conductances.why.replaceAll(" ", "-")}`,
    state: "holding",
    verdict: "not assessed",
    value: null,
    limit: null,
    note: WHY[conductances.why] + units,
  });
}

export function wildFinding({ serial, withUnit, without, supposed }: WildEffect): Finding {
  return finding({
    id: "place.wild-unit",
    state: "charging",
    verdict: "warn",
    value: withUnit,
    limit: without,
    note: supposed
      ? `${serial} does not belong to the lot (${OUTLIER_RULE}); without it, a unit of median capacitance in its place is supposed.`
      : `${serial} does not belong to the lot (${OUTLIER_RULE}) and was set aside.`,
    source: "NIST-handbook",
  });
}

export function outlierFinding({ serial, quantity, value, high }: Outlier, fitted: boolean): Finding {
  return {
    id: `place.outlier-${quantity}`,
    state: quantity === "leakage" ? "holding" : quantity === "esr" ? "pulse" : "charging",
    verdict: "warn",
    value,
    limit: high,
    margin: (high - value) / high,
    unit: quantity === "leakage" ? "A" : quantity === "esr" ? "ohm" : "F",
    source: "NIST-handbook",
    note: `${serial} is ${OUTLIER_RULE}${fitted ? ", and there was no spare to fit instead" : ", and was set aside"}.`,
  };
}

/** One finding for all groups that hold more than one part. */
export function mixedParts(units: readonly MeasuredUnit[], groups: readonly (readonly number[])[]): Finding[] {
  const mixed = groups.flatMap((group, g) => (new Set(group.map((i) => units[i]!.part)).size > 1 ? [g + 1] : []));
  if (mixed.length === 0) return [];
  const note = `Different parts share one stage or string (${list(mixed.map(String))}): they age and leak differently.`;
  return [
    finding({
      id: "place.mixed-parts",
      state: "charging",
      verdict: "warn",
      value: mixed.length,
      limit: 0,
      note,
      source: "common-practice",
    }),
  ];
}
