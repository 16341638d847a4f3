// What clamp diodes carry, what leaving the resistors out would mean, and the chance with its witness, each in a sentence.

import { formatQuantity, roundTo } from "../quantity/index.ts";
import type { BankClamp, LayoutResult, ShareSpread } from "../search/index.ts";
import type { Witness } from "./witness.ts";

/** Duty of the clamp diodes; what is unknown says so. Also the rating of the order's line. */
export function clampWords(clamp: BankClamp): string {
  const up = { digits: 3, rounding: "up" } as const;
  const { count, reverseVoltage, surgeCurrent, action, through, polarityKnown } = clamp;
  const blocks =
    reverseVoltage === null
      ? "reverse voltage not assessed"
      : `at least ${formatQuantity(reverseVoltage, "voltage", up)} reverse`;
  const carries =
    surgeCurrent === null || action === null
      ? "surge and action integral unknown: state the dump resistance"
      : `surge ${formatQuantity(surgeCurrent, "current", up)}, action ${formatQuantity(action, "action", up)}`;
  const by =
    through === null
      ? ""
      : ` through ${through.kind === "dump resistor" ? "the dump resistor of" : "the units' own ESR of"} ${formatQuantity(through.ohms, "resistance")}`;
  const least = through?.kind === "units' ESR" ? " (a lower ESR than the datasheet's lets more through)" : "";
  return `${count} clamp diodes${polarityKnown ? "" : " if the units are polarised"}: ${blocks}, ${carries}${by}${least}`;
}

/** The arrangement with no balancing resistors; empty for one in series or when the hold is endless and leakage decides all. */
export function withoutBalanceWords({
  withoutBalance,
  share,
  balance,
}: Pick<LayoutResult, "withoutBalance" | "share" | "balance">): string {
  if (withoutBalance === null || balance === null) return "";
  const { holding, safe } = withoutBalance;
  if (holding === null || safe === null) return "not assessed: the tolerance or the leakage is unknown";
  const volts = formatQuantity(holding, "voltage", { rounding: "up" });
  const limit = formatQuantity(share.limit, "voltage", { rounding: "down" });
  return safe
    ? `safe over the whole hold: at most ${volts} of ${limit}; but then nothing bleeds the bank: it needs a bleed resistor of its own`
    : `not safe: up to ${volts} of ${limit}`;
}

/** The middle of the spread, and how it was come by. */
export const spreadWords = ({ median, banks, seed }: ShareSpread): string =>
  `${formatQuantity(median, "voltage", { digits: 4 })}: the worst unit of half of ${banks} banks, drawn with seed ${seed}, stays below it while charging`;

const chance = (x: number): string => (x === 0 ? "0" : roundTo(x, 3, "up").toExponential());

/** The reckoned chance, its error, and what was counted beside it. */
export function riskWords({ risk }: Pick<LayoutResult, "risk">, witness: Witness | null): string {
  if (risk === undefined) return "";
  if (risk === null) return "not assessed: the tolerance is unknown";
  const reckoned = `${chance(risk.exceed)} (+- ${chance(risk.error)}), each unit ${risk.law ?? "alone"}`;
  if (witness === null) return reckoned;
  const { banks, seed, counted, exceed, error, agrees } = witness;
  const found =
    counted === 0
      ? `none, so less than ${chance(error)}`
      : `${counted}, that is ${chance(exceed)} (+- ${chance(error)})`;
  return `${reckoned}; witness: of ${banks} banks drawn with seed ${seed} ${found}: ${agrees ? "agrees" : "DOES NOT AGREE"}`;
}
