// What is wanted: the brief, read from JSON or flags, every value a number in SI or text with a unit.

import * as z from "zod";
import {
  accepted,
  type Dimension,
  example,
  formatQuantity,
  isCurrency,
  nearestWord,
  parseQuantity,
  type Read,
  type Refusal,
  refused,
} from "../quantity/index.ts";

export const BASES = ["worst case", "nominal", "statistical"] as const;
export type Basis = (typeof BASES)[number];

interface Range {
  readonly least: number;
  readonly most: number;
  /** The least value itself is not allowed. */
  readonly open?: boolean;
}

const rangeWords = (dimension: Dimension, { least, most, open }: Range): string =>
  `${open ? "above" : "from"} ${formatQuantity(least, dimension)} to ${formatQuantity(most, dimension)}`;

/** A number in SI or text with a unit, within a range. */
function quantity(dimension: Dimension, range: Range) {
  return z
    .union([z.number(), z.string()])
    .transform((raw, context): number => {
      const reject = (read: string, want: string): never => {
        context.addIssue({ code: "custom", message: want, params: { read } });
        return z.NEVER;
      };
      const read = typeof raw === "number" ? accepted(raw) : parseQuantity(raw, dimension);
      if (!read.ok) return reject(JSON.stringify(raw), read.refusals[0]?.want ?? example(dimension));
      const value = read.value;
      const bareFraction = dimension === "fraction" && (typeof raw === "number" || /^[\d.,\s]+$/.test(raw));
      const shown = bareFraction ? `${raw}, that is ${formatQuantity(value, "fraction")}` : JSON.stringify(raw);
      if (
        !Number.isFinite(value) ||
        value < range.least ||
        value > range.most ||
        (range.open && value === range.least)
      ) {
        const hint = bareFraction && value > range.most ? `; for ${raw} percent write "${raw} %"` : "";
        return reject(shown, `${rangeWords(dimension, range)}${hint}`);
      }
      return value;
    })
    .describe(`${example(dimension)} or a number in SI; ${rangeWords(dimension, range)}`);
}

/** A whole number, also as text (flags are text). */
function whole(least: number, most: number) {
  return z.union([z.number(), z.string()]).transform((raw, context): number => {
    const value = typeof raw === "number" ? raw : /^\s*\d+\s*$/.test(raw) ? Number(raw) : Number.NaN;
    if (Number.isInteger(value) && value >= least && value <= most) return value;
    context.addIssue({
      code: "custom",
      message: `a whole number from ${least} to ${most}`,
      params: { read: JSON.stringify(raw) },
    });
    return z.NEVER;
  });
}

const hold = z.union([z.number(), z.string()]).transform((raw, context): number => {
  if (typeof raw === "string" && /^\s*for ?ever\s*$/i.test(raw)) return Number.POSITIVE_INFINITY;
  const read = typeof raw === "number" ? accepted(raw) : parseQuantity(raw, "time");
  if (read.ok && read.value >= 0 && read.value <= 1e9) return read.value;
  context.addIssue({
    code: "custom",
    message: '"for ever", or a time such as "30 s" from 0 s up',
    params: { read: JSON.stringify(raw) },
  });
  return z.NEVER;
});

const basis = z.string().transform((raw, context): Basis => {
  const plain = raw
    .trim()
    .toLowerCase()
    .replace(/[\s_-]+/g, " ");
  const found = BASES.find((b) => b === plain);
  if (found) return found;
  context.addIssue({
    code: "custom",
    message: BASES.map((b) => `"${b}"`).join(", "),
    params: { read: JSON.stringify(raw) },
  });
  return z.NEVER;
});

/** None and certainty are no risks to plan with: each is told what it would mean. */
const risk = z.union([z.number(), z.string()]).transform((raw, context): number => {
  const read = typeof raw === "number" ? accepted(raw) : parseQuantity(raw, "fraction");
  const value = read.ok ? read.value : Number.NaN;
  if (value > 0 && value <= 0.5) return value;
  const none = 'a chance above 0 such as 1e-4; for none at all take the basis "worst case"';
  const message =
    value === 0
      ? none
      : value === 1
        ? "a chance of at most 0.5 such as 1e-4; at 1 every bank would do"
        : "a chance above 0 and at most 0.5, such as 1e-4";
  context.addIssue({ code: "custom", message, params: { read: JSON.stringify(raw) } });
  return z.NEVER;
});

const currency = z.string().refine(isCurrency, { error: "a code of ISO 4217 such as EUR" });

const ceiling = (dimension: Dimension, most: number) => quantity(dimension, { least: 0, most, open: true }).optional();

/** The brief's schema. Ranges are those within which the formulas and the arithmetic were checked. */
export const briefSchema = z.strictObject({
  title: z.string().max(200).optional(),
  energy: quantity("energy", { least: 0, most: 1e12, open: true }),
  voltage: quantity("voltage", { least: 0, most: 1e7, open: true }),
  ripple: quantity("fraction", { least: 0, most: 1, open: true }),
  basis: basis.default("worst case"),
  risk: risk.default(1e-4),
  /** How a unit's capacitance is spread over its tolerance, for the statistical basis. */
  distribution: z.enum(["uniform", "normal"]).default("uniform"),
  derating: quantity("fraction", { least: 0, most: 1, open: true }).default(0.9),
  overshoot: quantity("fraction", { least: 0, most: 1 }).default(0),
  ageing: quantity("fraction", { least: 0, most: 0.9 }).default(0),
  hold: hold.default(Number.POSITIVE_INFINITY),
  touchSafe: quantity("voltage", { least: 0, most: 1e4, open: true }).default(60),
  touchSafeRule: z.string().max(200).optional(),
  maxSeries: whole(1, 1000).default(40),
  maxUnits: whole(1, 1e6).default(2000),
  maxCost: quantity("count", { least: 0, most: 1e12 }).optional(),
  maxVolume: ceiling("volume", 1e6),
  maxMass: ceiling("mass", 1e9),
  spares: whole(0, 1e5).default(0),
  currency: currency.optional(),
  /** Units of the brief's currency for one unit of another: {"USD": 0.92}. */
  exchange: z.record(currency, z.number().positive().finite()).optional(),
  steady: z
    .strictObject({
      current: quantity("current", { least: 0, most: 1e9, open: true }),
      frequency: quantity("frequency", { least: 0, most: 1e9, open: true }),
    })
    .optional(),
  load: z.looseObject({}).optional(),
  rate: quantity("frequency", { least: 0, most: 1e6, open: true }).optional(),
  ambient: quantity("temperature", { least: -60, most: 150 }).optional(),
  /** ohm, of the resistor that empties the bank; absent: not stated, and a dump is taken as instant. */
  dumpResistance: quantity("resistance", { least: 0, most: 1e9, open: true }).optional(),
});

export type Brief = z.output<typeof briefSchema>;
/** A brief as its user writes it: text with units, or numbers in SI. */
export type BriefInput = z.input<typeof briefSchema>;

export const BRIEF_KEYS: readonly string[] = Object.keys(briefSchema.shape);

/** JSON Schema of the brief file. */
export const briefJsonSchema = (): unknown => z.toJSONSchema(briefSchema, { io: "input", unrepresentable: "any" });

const REQUIRED: Readonly<Record<string, string>> = {
  energy: 'the energy of one pulse such as "2.4 kJ"',
  voltage: 'the charge voltage such as "2.2 kV"',
  ripple: 'the allowed fall such as "20 %", or "100 %" for a full dump',
};

/** Reads a brief from parsed JSON or from flags. Every fault is told, with the key and what would be accepted. */
export function readBrief(input: unknown, file?: string): Read<Brief> {
  if (typeof input !== "object" || input === null || Array.isArray(input)) {
    const read = Array.isArray(input) ? "a list" : String(input);
    return refused({
      code: "bad-brief",
      place: file ? { file } : {},
      read,
      want: "an object with energy, voltage and ripple",
    });
  }
  const result = briefSchema.safeParse(input);
  if (result.success) return accepted(result.data);
  const faults: Refusal[] = [];
  for (const issue of result.error.issues) {
    const field = issue.path.map(String).join(".");
    const place = { ...(file ? { file } : {}), ...(field ? { field } : {}) };
    const raw = issue.path.reduce<unknown>(
      (node, key) => (node as Record<PropertyKey, unknown> | undefined)?.[key],
      input,
    );
    if (issue.code === "unrecognized_keys") {
      for (const key of issue.keys) {
        const near = nearestWord(key, BRIEF_KEYS);
        const want = near === null ? `one of ${BRIEF_KEYS.join(", ")}` : `perhaps "${near}"`;
        faults.push({
          code: "unknown-key",
          place: { ...place, field: field ? `${field}.${key}` : key },
          read: JSON.stringify(key),
          want,
        });
      }
    } else if (issue.code === "custom") {
      faults.push({
        code: "bad-value",
        place,
        read: String(issue.params?.read ?? JSON.stringify(raw)),
        want: issue.message,
      });
    } else {
      const read = raw === undefined ? "nothing" : JSON.stringify(raw);
      const want = REQUIRED[field] ?? issue.message;
      faults.push({ code: raw === undefined ? "missing-value" : "bad-value", place, read, want });
    }
  }
  return refused(...faults);
}
