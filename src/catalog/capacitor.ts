// One capacitor as sold or owned: its ratings, each with its state, and the terms on which it is bought.

import type { Tolerance } from "../quantity/index.ts";
import type { PriceBreak } from "./cell.ts";
import { above, type Column, fromZero, PURCHASE_COLUMNS, text } from "./column.ts";

/** Where a value comes from. A value that is absent is unknown. `assumed` names its rule. */
export type ValueState =
  | { readonly state: "datasheet" }
  | { readonly state: "measured" }
  | { readonly state: "assumed"; readonly rule: string };

/** Terms of purchase. Prices are unit prices in minor units of `currency`, all-units. Blank is unknown, not zero. */
export interface PurchaseTerms {
  readonly currency?: string;
  readonly price?: number;
  readonly priceBreaks?: readonly PriceBreak[];
  readonly pack?: number;
  readonly minimumOrder?: number;
  readonly onHand?: number;
  readonly available?: number;
  readonly supplier?: string;
  readonly orderCode?: string;
}

/** A unit capacitor. SI values: F, V, A, ohm, H, V/s, m, kg; fractions for reversal and derating. */
export interface Capacitor extends PurchaseTerms {
  readonly part: string;
  readonly maker?: string;
  readonly technology?: string;
  readonly polarised?: boolean;
  readonly capacitance: number;
  /** Rated dc voltage. */
  readonly voltage: number;
  readonly tolerance?: Tolerance;
  readonly surgeVoltage?: number;
  /** Reverse voltage that the unit may bear at rest. */
  readonly reverseVoltage?: number;
  readonly derating?: number;
  /** Largest leakage current at rated voltage. */
  readonly leakage?: number;
  readonly insulation?: number;
  readonly esr?: number;
  readonly esl?: number;
  readonly peakCurrent?: number;
  readonly rippleCurrent?: number;
  readonly slew?: number;
  /** Action integral of one shot that the unit may bear, A^2 s. */
  readonly action?: number;
  /** First opposite peak over charge voltage that the unit may bear in a shot. */
  readonly reversal?: number;
  readonly ratedShots?: number;
  readonly lifeExponent?: number;
  readonly reversalExponent?: number;
  /** Kelvin of temperature rise per watt lost in the unit. */
  readonly thermalResistance?: number;
  /** Energy that the case contains when the unit fails. */
  readonly ruptureEnergy?: number;
  readonly diameter?: number;
  readonly length?: number;
  readonly width?: number;
  readonly height?: number;
  readonly mass?: number;
  readonly note?: string;
  /** A home-made plate capacitor: area of one plate, gap, relative permittivity, count of plates, breakdown field. */
  readonly plateArea?: number;
  readonly gap?: number;
  readonly permittivity?: number;
  readonly plates?: number;
  readonly breakdownField?: number;
  /** States of the values that are not from a datasheet; a key absent here is a datasheet value. */
  readonly states: Readonly<Record<string, ValueState>>;
  readonly file: string;
  readonly line: number;
}

const PLATE_COLUMNS: readonly Column[] = [
  { heading: "plate area", key: "plateArea", type: above("area", 1e-8, 1e4) },
  { heading: "gap", key: "gap", type: above("length", 1e-8, 1) },
  { heading: "permittivity", key: "permittivity", type: { kind: "quantity", dimension: "count", least: 1, most: 1e5 } },
  { heading: "plates", key: "plates", type: { kind: "whole", least: 2, most: 100000 } },
  { heading: "breakdown field", key: "breakdownField", type: above("field", 1e3, 1e10) },
];

/** The columns of a capacitor catalogue, with the range of each. */
export const CAPACITOR_COLUMNS: readonly Column[] = [
  { heading: "part", key: "part", type: text(500), required: true },
  { heading: "maker", key: "maker", type: text() },
  { heading: "technology", key: "technology", type: text() },
  { heading: "polarised", also: ["polarized"], key: "polarised", type: { kind: "yes-no" } },
  { heading: "capacitance", key: "capacitance", type: above("capacitance", 1e-13, 5e3) },
  { heading: "voltage", also: ["rated voltage", "working voltage"], key: "voltage", type: above("voltage", 0.1, 1e7) },
  { heading: "tolerance", key: "tolerance", type: { kind: "tolerance" } },
  { heading: "surge voltage", key: "surgeVoltage", type: above("voltage", 0.1, 1e7) },
  { heading: "reverse voltage", key: "reverseVoltage", type: fromZero("voltage", 1e7) },
  { heading: "derating", key: "derating", type: above("fraction", 0.05, 1) },
  { heading: "leakage", also: ["leakage current"], key: "leakage", type: fromZero("current", 100) },
  { heading: "insulation", also: ["insulation resistance"], key: "insulation", type: above("resistance", 1, 1e18) },
  { heading: "esr", key: "esr", type: above("resistance", 1e-7, 1e6) },
  { heading: "esl", key: "esl", type: above("inductance", 1e-12, 1) },
  { heading: "peak current", key: "peakCurrent", type: above("current", 1e-6, 1e8) },
  { heading: "ripple current", key: "rippleCurrent", type: above("current", 1e-6, 1e6) },
  { heading: "slew", also: ["dv/dt"], key: "slew", type: above("slew", 1, 1e15) },
  {
    heading: "action",
    also: ["i2t", "i\u00b2t", "action integral", "unit action", "peak i2t"],
    key: "action",
    type: above("action", 1e-9, 1e12),
  },
  { heading: "reversal", key: "reversal", type: fromZero("fraction", 1) },
  { heading: "rated shots", key: "ratedShots", type: { kind: "quantity", dimension: "count", least: 1, most: 1e12 } },
  { heading: "life exponent", key: "lifeExponent", type: { kind: "quantity", dimension: "count", least: 0, most: 40 } },
  {
    heading: "reversal exponent",
    key: "reversalExponent",
    type: { kind: "quantity", dimension: "count", least: 0, most: 40 },
  },
  {
    heading: "thermal resistance",
    also: ["thermal resistance [k/w]"],
    key: "thermalResistance",
    type: { kind: "quantity", dimension: "count", least: 1e-4, most: 1e5 },
  },
  { heading: "rupture energy", key: "ruptureEnergy", type: above("energy", 1e-3, 1e8) },
  { heading: "diameter", key: "diameter", type: above("length", 1e-4, 10) },
  { heading: "length", key: "length", type: above("length", 1e-4, 10) },
  { heading: "width", key: "width", type: above("length", 1e-4, 10) },
  { heading: "height", key: "height", type: above("length", 1e-4, 10) },
  { heading: "mass", also: ["weight"], key: "mass", type: above("mass", 1e-6, 1e5) },
  ...PURCHASE_COLUMNS,
  { heading: "note", also: ["notes"], key: "note", type: text(1000) },
  { heading: "measured", key: "measured", type: text() },
  { heading: "assumed", key: "assumed", type: text() },
  ...PLATE_COLUMNS,
];

/** Volume that a unit takes in square packing (its enclosing box), m^3; null when its size is unknown. */
export function unitVolume(unit: Pick<Capacitor, "diameter" | "length" | "width" | "height">): number | null {
  const { diameter, length, width, height } = unit;
  const tall = length ?? height;
  if (diameter !== undefined && tall !== undefined) return diameter * diameter * tall;
  if (length !== undefined && width !== undefined && height !== undefined) return length * width * height;
  return null;
}
