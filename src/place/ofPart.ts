// Measured units against the part that they are said to be: which lie outside its tolerance beyond what the meter can err.
import type { Capacitor } from "../catalog/index.ts";
import { type Finding, formatQuantity, type Refusal } from "../quantity/index.ts";
import type { MeasuredUnit } from "./unit.ts";

/** More than this part of the units outside the tolerance: the lot is another part. Common practice, no source. */
const ANOTHER_PART = 0.9;
/** More than this part outside: a fail; fewer may be strays. Common practice, no source. */
const MANY = 0.1;
/** Two standard uncertainties of the meter are given away, 95 %. Source: [JCGM100] 6.3.3. */
const COVERAGE = 2;
const NAMED = 5;

type Part = Pick<Capacitor, "part" | "capacitance" | "tolerance">;

interface Range {
  readonly low: number;
  readonly high: number;
}

const rangeOf = ({ capacitance, tolerance }: Part): Range | null =>
  tolerance === undefined ? null : { low: capacitance * (1 - tolerance.low), high: capacitance * (1 + tolerance.high) };

/** Units outside the part's tolerance, the meter's doubt `uncertainty` (relative) given away; none where the part has no tolerance. */
export function outsideTolerance(units: readonly MeasuredUnit[], part: Part, uncertainty: number): MeasuredUnit[] {
  const range = rangeOf(part);
  if (range === null) return [];
  return units.filter((unit) => {
    const doubt = COVERAGE * (unit.uncertainty ?? uncertainty) * unit.capacitance;
    return unit.capacitance + doubt < range.low || unit.capacitance - doubt > range.high;
  });
}

const show = (value: number): string => formatQuantity(value, "capacitance", { digits: 4 });

const named = (units: readonly MeasuredUnit[]): string => {
  const shown = units.slice(0, NAMED).map(({ serial, capacitance }) => `${serial} (${show(capacitance)})`);
  return units.length > NAMED ? `${shown.join(", ")} and ${units.length - NAMED} more` : shown.join(", ");
};

/** Nearly all units outside the tolerance: they are not of this part. */
export function anotherPart(units: readonly MeasuredUnit[], part: Part, uncertainty: number): Refusal | null {
  const out = outsideTolerance(units, part, uncertainty);
  const range = rangeOf(part);
  if (range === null || units.length < 2 || out.length <= ANOTHER_PART * units.length) return null;
  return {
    code: "place.another-part",
    place: { field: part.part },
    read: `${out.length} of ${units.length} units outside it, such as ${named(out.slice(0, 2))}`,
    want: `units from ${show(range.low)} to ${show(range.high)}, the tolerance of the part; or the part that they are`,
  };
}

/** One finding for the units outside the tolerance, named; none when all are within. */
export function ofPartFindings(units: readonly MeasuredUnit[], part: Part, uncertainty: number): Finding[] {
  const out = outsideTolerance(units, part, uncertainty);
  const range = rangeOf(part);
  if (range === null || out.length === 0) return [];
  return [
    {
      id: "place.outside-tolerance",
      state: "charging",
      verdict: out.length > MANY * units.length ? "fail" : "warn",
      value: out.length,
      limit: 0,
      margin: null,
      unit: "1",
      source: "datasheet",
      note: `${out.length} of ${units.length} units lie outside the tolerance of ${part.part}, ${show(range.low)} to ${show(range.high)}: ${named(out)}. They are worn, wrongly read or another part.`,
    },
  ];
}
