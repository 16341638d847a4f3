// `plan` by the measured basis: which part was measured, the plan, and what measuring saved in words.

import { visible } from "../order/index.ts";
import { anotherPart, DEFAULTS, type MeasuredPlan, measuredPlan, ofPartFindings } from "../place/index.ts";
import { accepted, type Finding, formatQuantity, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { LayoutResult, Ranking } from "../search/index.ts";
import { lotPart } from "./lotPart.ts";
import { readMeasuredInput } from "./measuredInput.ts";
import type { PlaceFlags } from "./placeFlags.ts";
import { flagQuantity } from "./placeFlags.ts";
import type { Ports } from "./ports.ts";
import type { Settings } from "./settings.ts";
import type { Stock } from "./stock.ts";

export type MeasuredPlanFlags = Pick<PlaceFlags, "measured" | "uncertainty" | "part">;

export interface MeasuredPlanned extends MeasuredPlan {
  readonly part: string;
  readonly units: number;
  /** The units against the tolerance of the part. */
  readonly findings: readonly Finding[];
  /** Rows of the measured file that were lost. */
  readonly faults: readonly Refusal[];
}

/** For the measured basis. Refuses a basis without units, a lot of several parts, a part that no catalogue has. */
export function planMeasured(
  flags: MeasuredPlanFlags,
  {
    settings,
    stock,
    limit,
    rank,
  }: { readonly settings: Settings; readonly stock: Stock; readonly limit: number; readonly rank: Ranking },
  ports: Ports,
): Read<MeasuredPlanned> {
  const measured = readMeasuredInput(flags.measured, flags.part, ports.files);
  if (!measured.ok) return measured;
  const { units, faults } = measured.value;
  const part = lotPart(measured.value, flags.part, stock);
  if (!part.ok) return part;
  const given =
    flags.uncertainty === undefined ? undefined : flagQuantity(flags.uncertainty, "--uncertainty", "fraction");
  if (typeof given === "object") return refused(given);
  const doubt = given ?? DEFAULTS.uncertainty;
  const other = anotherPart(units, part.value, doubt);
  if (other !== null) return refused(other);
  const planned = measuredPlan({
    brief: settings.brief,
    part: part.value,
    units,
    families: stock.families,
    limit,
    rank,
    ...(given === undefined ? {} : { uncertainty: given }),
  });
  if (!planned.ok) return planned;
  const findings = ofPartFindings(units, part.value, doubt);
  return accepted({ ...planned.value, part: part.value.part, units: units.length, faults, findings });
}

/** What `plan --json` adds: the lot, what the placed units do in each listed layout, and the least in series either way. */
export const measuredJson = ({ part, units, placed, least, worstCase, findings }: MeasuredPlanned) => {
  const shown = (layout: LayoutResult | null) =>
    layout && { id: layout.id, series: layout.series, units: layout.units, worst: layout.share.charging };
  return { part, units, findings, placed, leastSeries: { measured: shown(least), worstCase: shown(worstCase) } };
};

/** What measuring saved against the worst case of the datasheet. */
export function savedText({ result, least, worstCase, placed, units, part }: MeasuredPlanned): string {
  const best = result.layouts[0];
  if (best === undefined || least === null)
    return `The ${units} measured units of ${visible(part)} do not do it in any shape.`;
  const share = placed.find(({ id }) => id === best.id);
  const volts = share && formatQuantity(share.charging, "voltage", { rounding: "up" });
  const energy = share && formatQuantity(share.energy, "energy", { rounding: "down" });
  const asked = result.brief.energy;
  const below =
    share !== undefined && share.energy < asked
      ? `, less than the ${formatQuantity(asked, "energy")} asked: the mean of the lot gives it, these units do not`
      : "";
  const now = share
    ? `Placed, ${visible(best.id)} has its worst unit at ${volts} while charging, the meter's doubt counted, and gives ${energy} a pulse${below}. `
    : "";
  const fewest = `Fewest in series that the measured units support: ${least.series}, with ${least.units} units; `;
  if (worstCase === null) return `${now}${fewest}by the worst case of the datasheet no shape does it.`;
  const saved = worstCase.series - least.series;
  return `${now}${fewest}by the worst case of the datasheet ${worstCase.series}, with ${worstCase.units} units. Measuring saves ${saved} in series.`;
}
