// `plan` by the statistical basis with the builder's own lot: units drawn from what was measured, not from a tolerance.

import { LEAST_LOT } from "../bank/index.ts";
import { visible } from "../order/index.ts";
import { anotherPart, DEFAULTS, ofPartFindings } from "../place/index.ts";
import { accepted, type Finding, type Read, type Refusal, refused } from "../quantity/index.ts";
import { type PlanResult, plan, type Ranking } from "../search/index.ts";
import { lotPart } from "./lotPart.ts";
import { readMeasuredInput } from "./measuredInput.ts";
import type { MeasuredPlanFlags } from "./measuredPlan.ts";
import type { Ports } from "./ports.ts";
import type { Settings } from "./settings.ts";
import type { Stock } from "./stock.ts";

export interface LotPlanned {
  readonly result: PlanResult;
  readonly part: string;
  readonly units: number;
  /** The units against the tolerance of the part. */
  readonly findings: readonly Finding[];
  /** Rows of the measured file that were lost. */
  readonly faults: readonly Refusal[];
}

export interface LotWork {
  readonly settings: Settings;
  readonly stock: Stock;
  readonly limit: number;
  readonly rank: Ranking;
}

/** Plans the measured part alone. Refuses fewer than LEAST_LOT units, a lot of several parts, a part that no catalogue has. */
export function planLot(
  flags: MeasuredPlanFlags,
  { settings, stock, limit, rank }: LotWork,
  ports: Ports,
): Read<LotPlanned> {
  const measured = readMeasuredInput(flags.measured, flags.part, ports.files);
  if (!measured.ok) return measured;
  const { units, file, faults } = measured.value;
  const part = lotPart(measured.value, flags.part, stock);
  if (!part.ok) return part;
  if (units.length < LEAST_LOT) {
    const want = `at least ${LEAST_LOT} measured units: fewer say nothing about how a lot is spread`;
    return refused(...faults, { code: "small-lot", place: { file }, read: `${units.length} units`, want });
  }
  const other = anotherPart(units, part.value, DEFAULTS.uncertainty);
  if (other !== null) return refused(...faults, other);
  const { brief } = settings;
  const lot = units.map((unit) => unit.capacitance);
  const planned = plan({ brief, parts: [part.value], families: stock.families, limit, rank, lot });
  if (!planned.ok) return planned;
  const findings = ofPartFindings(units, part.value, DEFAULTS.uncertainty);
  return accepted({ result: planned.value, part: part.value.part, units: units.length, faults, findings });
}

/** (1 - p)^n = 5 % at p near 3/n: so many may be what none of n was. Source: [methods-derived]. */
const RULE_OF_THREE = 3;

/** What the lot stands for, and for what it does not. */
export const lotSentence = ({ part, units }: LotPlanned): string =>
  `Only ${visible(part)} was planned with: each unit is drawn from the ${units} measured ones, every value equally likely; ` +
  `what no unit of the lot shows is not in the risk, and up to one in ${Math.max(1, Math.floor(units / RULE_OF_THREE))} of all such units may lie outside the lot (95 %).`;
