// The limits that a brief may set on the shot and on a fault, each for the worst unit of the bank.

import * as z from "zod";
import { type Dimension, example, parseQuantity } from "../quantity/index.ts";
import { part, plain, quantity } from "./fields.ts";

/** A limit in its own unit, or as a part of the unit's own rating. */
export type RatedLimit =
  | { readonly kind: "absolute"; readonly value: number }
  | { readonly kind: "part"; readonly value: number };

/** "400 A" or a bare number is the limit itself; "80 %" is that part of the unit's own rating. */
function rated(dimension: Dimension, most: number) {
  const absolute = quantity(dimension, { least: 0, most, open: true });
  const share = quantity("fraction", { least: 0, most: 1, open: true });
  const isShare = (raw: unknown): boolean =>
    typeof raw === "string" && raw.includes("%") && parseQuantity(raw, "fraction").ok;
  return z
    .union([z.number(), z.string()])
    .transform((raw, context): RatedLimit => {
      const read = (isShare(raw) ? share : absolute).safeParse(raw);
      if (read.success) return { kind: isShare(raw) ? "part" : "absolute", value: read.data };
      for (const { message, ...issue } of read.error.issues) {
        const params = "params" in issue ? { params: issue.params as Record<string, unknown> } : {};
        context.addIssue({ code: "custom", message: `${message}; or a part of the unit's rating, "80 %"`, ...params });
      }
      return z.NEVER;
    })
    .describe(`${example(dimension)}, or a part of the unit's own rating such as "80 %"`);
}

export const limitKeys = {
  /** Peak current through one unit. */
  maxPeakCurrent: rated("current", 1e9).optional(),
  /** Fastest fall of one unit's voltage. */
  maxSlew: rated("slew", 1e15).optional(),
  /** First opposite voltage over the charge voltage. */
  maxReversal: part().optional(),
  /** Rms current through one unit at the brief's rate. */
  maxRms: rated("current", 1e9).optional(),
  /** Rise of one unit over its surroundings at the brief's rate, K. */
  maxTemperatureRise: plain({ least: 0, most: 500, open: true }).optional(),
  /** Energy that the other units pour into a shorted one. */
  maxFaultEnergy: quantity("energy", { least: 0, most: 1e9 }).optional(),
  /** Life over the life at the unit's ratings. */
  minLife: plain({ least: 0, most: 1e9, open: true }).optional(),
} as const;

export const LIMIT_KEYS = Object.keys(limitKeys) as readonly (keyof typeof limitKeys)[];
