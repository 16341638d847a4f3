// One film unit with every rating known, and banks of it, for tests of the shot.
import type { Capacitor } from "../../src/catalog/index.ts";
import { assess, type Brief, type LayoutResult, readBrief } from "../../src/search/index.ts";
import { FAMILIES } from "./bank.ts";

/** 100 uF +-10 %, 2.5 kV, 100 mohm, no ESL worth the name, 2 kA, 20 V/us, 20 % reversal, exponents 6 and 1.6. */
export const FILM: Capacitor = {
  part: "film",
  technology: "metallised film",
  polarised: false,
  capacitance: 1e-4,
  voltage: 2500,
  tolerance: { low: 0.1, high: 0.1 },
  leakage: 1e-6,
  esr: 0.1,
  esl: 1e-12,
  peakCurrent: 2000,
  rippleCurrent: 5,
  slew: 2e7,
  reversal: 0.2,
  ratedShots: 30000,
  lifeExponent: 6,
  reversalExponent: 1.6,
  thermalResistance: 2,
  ruptureEnergy: 1000,
  currency: "EUR",
  price: 1000,
  states: {},
  file: "film.csv",
  line: 2,
};

/** A brief of 2 kV into 0.9 ohm and 25 uH (methods A8), with more keys over it. */
export function shotBrief(more: Readonly<Record<string, unknown>> = {}): Brief {
  const load = { resistance: "0.9 ohm", inductance: "25 uH" };
  const read = readBrief({ energy: "100 J", voltage: "2 kV", ripple: "100 %", load, ...more });
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
}

export function shotLayout(
  brief: Brief,
  shape: Pick<LayoutResult, "series" | "parallel" | "ties"> = { series: 1, parallel: 1, ties: "strings" },
  unit: Capacitor = FILM,
): LayoutResult {
  return assess({ unit, layout: { part: unit.part, ...shape }, brief, families: FAMILIES, currency: "EUR" });
}
