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

/** The limits on the shot: name, what it is about, its dimension. */
const LIMITS: readonly (readonly [string, string, Dimension])[] = [
  ["peak-current", "peak current through a unit", "current"],
  ["slew", "slew of a unit", "slew"],
  ["reversal", "reversal", "fraction"],
  ["rms", "rms current through a unit", "current"],
  ["temperature-rise", "rise of a unit in K", "count"],
  ["fault-energy", "energy into a shorted unit", "energy"],
  ["life", "life over that at the ratings", "count"],
];

/** Each limit may be passed, unproven because parts of the loop are unknown, or unknown. */
function limitReasons(): Readonly<Record<string, Reason>> {
  const rows = LIMITS.flatMap(([name, about, dimension]): [string, Reason][] => {
    const least = name === "life";
    const wanted = least ? "wanted {limit} at least" : "limit {limit}";
    return [
      [
        `${name}-limit`,
        {
          words: `${about} {value} at ${least ? "most" : "least"}, ${wanted}`,
          plain: `${about} breaks its limit`,
          dimension,
          least,
        },
      ],
      [
        `${name}-unproven`,
        {
          words: `${about} {value} as far as is known, ${wanted}: not proven, for parts of the loop are unknown`,
          plain: `${about} cannot be proven`,
          dimension,
          least,
        },
      ],
      [
        `${name}-unknown`,
        {
          words: "",
          plain: `${about}: the figure or the rating is unknown, so the limit cannot be held`,
          dimension,
        },
      ],
    ];
  });
  return Object.fromEntries(rows);
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
  ...limitReasons(),
  "no-fuse": {
    words: "",
    plain: "no fuse of the catalogue is proven to live through its shot and clear its fault at any count in parallel",
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
