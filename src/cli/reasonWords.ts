// Why a part gives no layout, in words with the value and the limit.

import { visible } from "../order/index.ts";
import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { BalanceMends, RefusedPart } from "../search/index.ts";

interface Reason {
  /** `{value}` and `{limit}` stand for the figures. */
  readonly words: string;
  /** Used when the value or the limit is not known. */
  readonly plain: string;
  readonly dimension: Dimension | "money";
  /** The limit is a least. */
  readonly least?: boolean;
}

export const REASONS: Readonly<Record<string, Reason>> = {
  "series-limit": {
    words: "needs {value} in series to share safely, limit {limit}",
    plain: "needs more in series than the limit",
    dimension: "count",
  },
  "unit-limit": {
    words: "needs {value} units, limit {limit}",
    plain: "needs more units than the limit",
    dimension: "count",
  },
  stock: {
    words: "{value} units must be bought, {limit} can be had, packs and minimum order counted",
    plain: "more units must be bought than can be had",
    dimension: "count",
  },
  balance: {
    words: "no balancing resistor keeps the worst unit within {limit}",
    plain: "no balancing resistor keeps the worst unit within {limit}",
    dimension: "voltage",
  },
  risk: {
    words: "",
    plain: "no number in series that was tried keeps the chance of an excess within {limit}",
    dimension: "fraction",
  },
  "volume-limit": {
    words: "takes {value} at least, limit {limit}",
    plain: "takes more room than the limit",
    dimension: "volume",
  },
  "volume-unknown": {
    words: "",
    plain: "its size is unknown, so the limit of {limit} cannot be held",
    dimension: "volume",
  },
  "mass-limit": {
    words: "weighs {value} at least, limit {limit}",
    plain: "weighs more than the limit",
    dimension: "mass",
  },
  "mass-unknown": {
    words: "",
    plain: "its mass is unknown, so the limit of {limit} cannot be held",
    dimension: "mass",
  },
  "cost-limit": {
    words: "costs {value} at least, limit {limit}",
    plain: "costs more than the limit",
    dimension: "money",
  },
  "price-unknown": {
    words: "",
    plain: "its price is unknown, so the limit of {limit} cannot be held",
    dimension: "money",
  },
  "peak-current-limit": {
    words: "peak current through a unit {value} at least, limit {limit}",
    plain: "peak current through a unit is over its limit",
    dimension: "current",
  },
  "peak-current-unproven": {
    words:
      "peak current through a unit {value} as far as is known, limit {limit}: not proven, for parts of the loop are unknown",
    plain: "peak current through a unit cannot be proven",
    dimension: "current",
  },
  "peak-current-unknown": {
    words: "",
    plain: "peak current through a unit: the figure or the rating is unknown, so the limit cannot be held",
    dimension: "current",
  },
  "slew-limit": {
    words: "slew of a unit {value} at least, limit {limit}",
    plain: "slew of a unit is over its limit",
    dimension: "slew",
  },
  "slew-unproven": {
    words: "slew of a unit {value} as far as is known, limit {limit}: not proven, for parts of the loop are unknown",
    plain: "slew of a unit cannot be proven",
    dimension: "slew",
  },
  "slew-unknown": {
    words: "",
    plain: "slew of a unit: the figure or the rating is unknown, so the limit cannot be held",
    dimension: "slew",
  },
  "reversal-limit": {
    words: "reversal {value} at least, limit {limit}",
    plain: "reversal is over its limit",
    dimension: "fraction",
  },
  "reversal-unproven": {
    words: "reversal {value} as far as is known, limit {limit}: not proven, for parts of the loop are unknown",
    plain: "reversal cannot be proven",
    dimension: "fraction",
  },
  "reversal-unknown": {
    words: "",
    plain: "reversal: the figure or the rating is unknown, so the limit cannot be held",
    dimension: "fraction",
  },
  "rms-limit": {
    words: "rms current through a unit {value} at least, limit {limit}",
    plain: "rms current through a unit is over its limit",
    dimension: "current",
  },
  "rms-unproven": {
    words:
      "rms current through a unit {value} as far as is known, limit {limit}: not proven, for parts of the loop are unknown",
    plain: "rms current through a unit cannot be proven",
    dimension: "current",
  },
  "rms-unknown": {
    words: "",
    plain: "rms current through a unit: the figure or the rating is unknown, so the limit cannot be held",
    dimension: "current",
  },
  "temperature-rise-limit": {
    words: "rise in K of a unit {value} at least, limit {limit}",
    plain: "rise in K of a unit is over its limit",
    dimension: "count",
  },
  "temperature-rise-unproven": {
    words:
      "rise in K of a unit {value} as far as is known, limit {limit}: not proven, for parts of the loop are unknown",
    plain: "rise in K of a unit cannot be proven",
    dimension: "count",
  },
  "temperature-rise-unknown": {
    words: "",
    plain: "rise in K of a unit: the figure or the rating is unknown, so the limit cannot be held",
    dimension: "count",
  },
  "fault-energy-limit": {
    words: "energy into a shorted unit {value} at least, limit {limit}",
    plain: "energy into a shorted unit is over its limit",
    dimension: "energy",
  },
  "fault-energy-unproven": {
    words:
      "energy into a shorted unit {value} as far as is known, limit {limit}: not proven, for parts of the loop are unknown",
    plain: "energy into a shorted unit cannot be proven",
    dimension: "energy",
  },
  "fault-energy-unknown": {
    words: "",
    plain: "energy into a shorted unit: the figure or the rating is unknown, so the limit cannot be held",
    dimension: "energy",
  },
  "life-limit": {
    words: "life {value} of that at its ratings, wanted {limit} at least",
    plain: "life is below its limit",
    dimension: "count",
    least: true,
  },
  "life-unproven": {
    words:
      "life {value} of that at its ratings as far as is known, wanted {limit}: not proven, for parts of the loop are unknown",
    plain: "life cannot be proven",
    dimension: "count",
    least: true,
  },
  "life-unknown": {
    words: "",
    plain: "life: an exponent or a reference is unknown, so the limit cannot be held",
    dimension: "count",
  },
  "no-shot": {
    words: "",
    plain: "its shot cannot be reckoned with this load, so no limit on it can be held",
    dimension: "count",
  },
};

/** Words of one refused part's reason; the figures rounded away from the limit's good side. */
export function reasonWords({ reason, value, limit }: Omit<RefusedPart, "part">, currency: string | null): string {
  const known = REASONS[reason];
  if (known === undefined) return visible(reason);
  const show = (x: number | null, rounding: "up" | "down"): string => {
    if (x === null) return "unknown";
    if (known.dimension === "money") return `${x.toFixed(2)} ${currency ?? ""}`.trim();
    return formatQuantity(x, known.dimension, { digits: known.dimension === "count" ? 10 : 4, rounding });
  };
  const pattern = value === null || limit === null || known.words === "" ? known.plain : known.words;
  const [figure, bound] = known.least ? (["down", "up"] as const) : (["up", "down"] as const);
  return pattern.replace("{value}", show(value, figure)).replace("{limit}", show(limit, bound));
}

/** What would let a balancing resistor do, any one of them. */
export function mendsWords({ series, tolerance, voltage }: BalanceMends): string {
  const ways = [
    series === null ? null : `${series} in series`,
    tolerance === null ? null : `resistors of ${formatQuantity(tolerance, "fraction")} or tighter`,
    voltage === null ? null : `at most ${formatQuantity(voltage, "voltage", { rounding: "down" })} of charge`,
  ].filter((way) => way !== null);
  return ways.length === 0 ? "Nothing that was tried mends it" : `Any one mends it: ${ways.join("; ")}`;
}
