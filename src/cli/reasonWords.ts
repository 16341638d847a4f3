// Why a part gives no layout, in words with the value and the limit.

import { visible } from "../order/index.ts";
import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { RefusedPart } from "../search/index.ts";

interface Reason {
  /** `{value}` and `{limit}` stand for the figures. */
  readonly words: string;
  /** Used when the value or the limit is not known. */
  readonly plain: string;
  readonly dimension: Dimension | "money";
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
    words: "needs {value} units, {limit} can be had with packs and minimum order counted",
    plain: "more units are needed than can be had",
    dimension: "count",
  },
  balance: {
    words: "no balancing resistor keeps the worst unit within {limit}",
    plain: "no balancing resistor keeps the worst unit within {limit}",
    dimension: "voltage",
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
  "price-missing": {
    words: "",
    plain: "it has no price, and what is on hand does not make a string",
    dimension: "count",
  },
  "tolerance-unknown": {
    words: "",
    plain: "its tolerance is unknown, so neither its sharing nor its least capacitance is known",
    dimension: "count",
  },
  "leakage-unknown": {
    words: "",
    plain: "its leakage is unknown, so its balancing resistors cannot be sized",
    dimension: "count",
  },
  "price-unknown": {
    words: "",
    plain: "its price is unknown, so the limit of {limit} cannot be held",
    dimension: "money",
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
  return pattern.replace("{value}", show(value, "up")).replace("{limit}", show(limit, "down"));
}
