// What hangs on the bank, as the brief says it: load, switch, bus, clamp, charger, and what is stated or known of them.

import * as z from "zod";
import { above, fromZero, part, plain, quantity, whole, word, yesNo } from "./fields.ts";

const FILL = { least: 0, most: 1e7, open: true } as const;

/** A flash lamp: bore, arc length of one, gas, cold fill pressure, lamps in series. */
const lampSchema = z.strictObject({
  bore: above("length"),
  arc: above("length"),
  gas: word(["xenon", "krypton"]),
  pressure: quantity("pressure", FILL),
  count: whole(1, 1000).default(1),
});

/** A time and a current, both in SI. */
const sample = z.tuple([z.number(), z.number()]);

/**
 * The load. Resistance and inductance are those of the load with its leads. Alone: a resistor or a coil; beside `lamp`: the
 * coil that shapes its pulse. `width` and `damping` size a lamp's circuit. `recorded` names a CSV file of time and current,
 * or holds the samples.
 */
export const loadSchema = z.strictObject({
  resistance: fromZero("resistance").optional(),
  inductance: fromZero("inductance").optional(),
  lamp: lampSchema.optional(),
  width: above("time").optional(),
  damping: quantity("count", { least: 0.05, most: 10 }).optional(),
  short: yesNo.optional(),
  current: above("current").optional(),
  time: above("time").optional(),
  recorded: z.union([z.string(), z.array(sample).max(1e6)]).optional(),
});

/** Voltage that the switch keeps while it conducts, its resistance, and whether it blocks reverse current. */
export const switchSchema = z.strictObject({
  drop: fromZero("voltage").default(0),
  resistance: fromZero("resistance").default(0),
  oneWay: yesNo.default(false),
});

/**
 * The bus, as measured (resistance, inductance) or by its shape, go and return together: the run from the load to the first
 * unit. What lies along the row of units is told by `feed` with `pitch` or the two steps.
 */
export const busSchema = z.strictObject({
  resistance: fromZero("resistance").optional(),
  inductance: fromZero("inductance").optional(),
  shape: word(["flat bars", "wire pair", "coax"]).optional(),
  length: above("length").optional(),
  width: above("length").optional(),
  gap: above("length").optional(),
  thickness: above("length").optional(),
  radius: above("length").optional(),
  spacing: above("length").optional(),
  inner: above("length").optional(),
  outer: above("length").optional(),
  wall: above("length").optional(),
  metal: word(["copper", "aluminium"]).default("copper"),
  /** Where the load's leads join the row of units; without it their place on the bus is not counted. */
  feed: word(["end", "centre"]).optional(),
  /** From one unit (or string) to the next along a bus of this shape. */
  pitch: above("length").optional(),
  /** The same stretch of a bus of measured values, go and return together. */
  stepResistance: fromZero("resistance").optional(),
  stepInductance: fromZero("inductance").optional(),
});

/** A diode across the bank that blocks while the bank is the right way round. */
export const clampSchema = z.strictObject({
  drop: fromZero("voltage"),
  resistance: fromZero("resistance").default(0),
});

/** Constant current; power with a current limit; or a supply behind a resistor. `highest`: what it reaches when it runs on. */
export const chargerSchema = z.strictObject({
  current: above("current").optional(),
  power: above("power").optional(),
  currentLimit: above("current").optional(),
  resistance: above("resistance").optional(),
  supply: above("voltage").optional(),
  highest: above("voltage").optional(),
});

/** The builder's own exponents; they beat the catalogue's. `halving`: kelvins that halve the life, from `reference` degC. */
export const lifeSchema = z.strictObject({
  voltageExponent: plain({ least: 0, most: 40 }).optional(),
  reversalExponent: plain({ least: 0, most: 40 }).optional(),
  halving: plain({ least: 1, most: 100 }).optional(),
  reference: quantity("temperature", { least: -60, most: 250 }).optional(),
});

/** An inductance in series with each unit of a stage, or with each string; price of one, in the plan's currency. */
export const sectionSchema = z.strictObject({
  inductance: above("inductance"),
  price: quantity("count", { least: 0, most: 1e9 }).optional(),
});

/** How far ESR, and the loop's outer resistance and inductance, may lie from what is given; capacitance has its tolerance. */
export const spreadSchema = z.strictObject({
  esr: part(0.99).default(0),
  resistance: part(0.99).default(0),
  inductance: part(0.99).default(0),
});

/** What a page, a maker or a meter says of this bank's discharge, to be held against what is possible. */
export const statedSchema = z.strictObject({
  peakCurrent: above("current").optional(),
  ringFrequency: quantity("frequency", { least: 0, most: 1e9, open: true }).optional(),
  loss: quantity("energy", { least: 0, most: 1e12, open: true }).optional(),
});

export type LoadBrief = z.output<typeof loadSchema>;
export type BusBrief = z.output<typeof busSchema>;
export type ChargerBrief = z.output<typeof chargerSchema>;
export type LampBriefKeys = z.output<typeof lampSchema>;
