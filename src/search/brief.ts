// What is wanted: the brief, read from JSON or flags, every value a number in SI or text with a unit.

import * as z from "zod";
import {
  accepted,
  type Dimension,
  isCurrency,
  nearestWord,
  type Place,
  parseQuantity,
  type Read,
  type Refusal,
  refused,
  versionFault,
} from "../quantity/index.ts";
import { crossFaults } from "./briefFaults.ts";
import { above, fromZero, quantity, whole, word, yesNo } from "./fields.ts";
import { withLampDrive } from "./lampDrive.ts";
import { limitKeys } from "./limitKeys.ts";
import {
  busSchema,
  chargerSchema,
  clampSchema,
  lifeSchema,
  loadSchema,
  sectionSchema,
  spreadSchema,
  statedSchema,
  switchSchema,
} from "./load.ts";

export const BASES = ["worst case", "nominal", "statistical", "measured"] as const;
export type Basis = (typeof BASES)[number];

const hold = z
  .union([z.number(), z.string()])
  .transform((raw, context): number => {
    if (typeof raw === "string" && /^\s*for ?ever\s*$/i.test(raw)) return Number.POSITIVE_INFINITY;
    const read = typeof raw === "number" ? accepted(raw) : parseQuantity(raw, "time");
    if (read.ok && read.value >= 0 && read.value <= 1e9) return read.value;
    context.addIssue({
      code: "custom",
      message: '"for ever", or a time such as "30 s" from 0 s to 1e9 s, some 30 years',
      params: { read: JSON.stringify(raw) },
    });
    return z.NEVER;
  })
  .describe('"for ever", or a time such as "30 s" from 0 s to 1e9 s, some 30 years');

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
  basis: word(BASES).default("worst case"),
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
  load: loadSchema.optional(),
  switch: switchSchema.optional(),
  bus: busSchema.optional(),
  clamp: clampSchema.optional(),
  charger: chargerSchema.optional(),
  /** A resistor in series with each unit. */
  isolating: above("resistance").optional(),
  /** Price of one such resistor, in the plan's currency. */
  isolatingPrice: quantity("count", { least: 0, most: 1e9 }).optional(),
  section: sectionSchema.optional(),
  /** A fuse in series with each unit (each string): the cheapest of the fuse catalogue that does. */
  fused: yesNo.optional(),
  /** What a shorted unit itself still resists with. */
  shortResistance: fromZero("resistance").optional(),
  life: lifeSchema.optional(),
  spread: spreadSchema.optional(),
  stated: statedSchema.optional(),
  ...limitKeys,
  rate: quantity("frequency", { least: 0, most: 1e6, open: true }).optional(),
  ambient: quantity("temperature", { least: -60, most: 150 }).optional(),
  /** ohm, of the resistor that empties the bank; absent: not stated, and a dump is taken as instant. */
  dumpResistance: quantity("resistance", { least: 0, most: 1e9, open: true }).optional(),
});

export type Brief = z.output<typeof briefSchema>;
/** A brief as its user writes it: text with units, or numbers in SI. */
export type BriefInput = z.input<typeof briefSchema>;

export const BRIEF_KEYS: readonly string[] = Object.keys(briefSchema.shape);

const LAMP_KEYS = Object.keys(loadSchema.shape.lamp.unwrap().shape);

/** Keys of each object within the brief, by its path; the brief's own are under "". */
const KEYS_AT: Readonly<Record<string, readonly string[]>> = {
  "": BRIEF_KEYS,
  "load.lamp": LAMP_KEYS,
  steady: ["current", "frequency"],
  ...Object.fromEntries(
    Object.entries({
      load: loadSchema,
      switch: switchSchema,
      bus: busSchema,
      clamp: clampSchema,
      charger: chargerSchema,
      section: sectionSchema,
      life: lifeSchema,
      spread: spreadSchema,
      stated: statedSchema,
    }).map(([path, schema]) => [path, Object.keys(schema.shape)]),
  ),
};

/** Version of the brief file's format. A brief without one is of the first. */
export const BRIEF_VERSION = 1;

/** JSON Schema of the brief file. */
export function briefJsonSchema(): unknown {
  const schema = z.toJSONSchema(briefSchema, { io: "input", unrepresentable: "any" });
  const version = { type: "integer", minimum: 1, maximum: BRIEF_VERSION } as const;
  return { ...schema, properties: { version, ...schema.properties } };
}

const REQUIRED: Readonly<Record<string, string>> = {
  energy: 'the energy of one pulse such as "2.4 kJ"',
  voltage: 'the charge voltage such as "2.2 kV"',
  ripple: 'the allowed fall such as "20 %", or "100 %" for a full dump',
};

interface SchemaNode {
  readonly description?: string;
  readonly type?: string | readonly string[];
  readonly enum?: readonly string[];
  readonly properties?: Readonly<Record<string, SchemaNode>>;
}

/** What the schema says of a key, for faults whose own words are the schema library's. */
function wantedAt(path: readonly PropertyKey[]): string | null {
  let node = briefJsonSchema() as SchemaNode | undefined;
  for (const key of path) node = node?.properties?.[String(key)];
  if (node?.description) return node.description;
  if (node?.enum) return `one of ${node.enum.join(", ")}`;
  if (node?.properties) return `an object with ${Object.keys(node.properties).join(", ")}`;
  return node?.type === "object" ? "an object" : node?.type === "string" ? "text" : null;
}

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
  const { version, ...keys } = input as Readonly<Record<string, unknown>>;
  const place: Place = { ...(file ? { file } : {}), field: "version" };
  const old = versionFault({ found: version, newest: BRIEF_VERSION, place });
  // What a later version means by its keys is not known: nothing else is said of them.
  if (old !== null) return refused(old);
  const result = briefSchema.safeParse(withLampDrive(keys));
  if (result.success) {
    const crossed = crossFaults(result.data, file);
    return crossed.length > 0 ? refused(...crossed) : accepted(result.data);
  }
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
        const keys = KEYS_AT[field] ?? BRIEF_KEYS;
        const near = nearestWord(key, keys);
        const want = near === null ? `one of ${keys.join(", ")}` : `perhaps "${near}"`;
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
      const want = REQUIRED[field] ?? wantedAt(issue.path) ?? issue.message;
      faults.push({ code: raw === undefined ? "missing-value" : "bad-value", place, read, want });
    }
  }
  return refused(...faults);
}
