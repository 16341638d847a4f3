// One small bank to test bills and texts on: eight in series, two in parallel, with every price by hand.
import type { Capacitor, ResistorFamily } from "../../src/catalog/index.ts";
import { DEFAULT_FAMILY, readResistors } from "../../src/catalog/index.ts";
import { prepare } from "../../src/search/candidate.ts";
import type { Cornered } from "../../src/search/findingsInput.ts";
import {
  type AssessInput,
  assess,
  type Brief,
  cornersOf,
  type LayoutResult,
  readBrief,
} from "../../src/search/index.ts";

/** 1000 uF +-20 %, 400 V, polarised, 100 uA, 2.50 EUR, packs of 10, 3 on hand. */
export const UNIT: Capacitor = {
  part: "test-1000-400",
  technology: "photoflash electrolytic",
  polarised: true,
  capacitance: 1e-3,
  voltage: 400,
  tolerance: { low: 0.2, high: 0.2 },
  leakage: 1e-4,
  diameter: 0.035,
  length: 0.05,
  mass: 0.05,
  currency: "EUR",
  price: 250,
  pack: 10,
  onHand: 3,
  supplier: "Invented Supply",
  orderCode: "X-1",
  states: {},
  file: "test.csv",
  line: 2,
};

export const FAMILIES: readonly ResistorFamily[] = (() => {
  const read = readResistors(
    "family,series,lowest [ohm],highest [ohm],tolerance [%],power [W],derating,voltage [V],price,currency,pack\ntest-2W,E24,1,1000000,5,2,0.5,500,0.10,EUR,10\n",
    "resistors.csv",
  );
  if (!read.ok) throw new Error("the test family must read");
  return read.value.families;
})();

export function briefOf(more: Readonly<Record<string, unknown>> = {}): Brief {
  const read = readBrief({ energy: "500 J", voltage: "2 kV", ripple: "100 %", ...more });
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
}

export function bankOf(more: Partial<AssessInput> = {}): LayoutResult {
  return assess({
    unit: UNIT,
    layout: { part: UNIT.part, series: 8, parallel: 2, ties: "cross-tied" },
    brief: briefOf(),
    families: FAMILIES,
    currency: "EUR",
    ...more,
  });
}

export { DEFAULT_FAMILY };

/** The input of the findings of the small bank; parts of it may be laid over. */
export function findingsInput(more: Partial<Cornered> = {}): Cornered {
  const unit = more.unit ?? UNIT;
  const brief = more.brief ?? briefOf();
  const result = more.result ?? bankOf({ unit, brief });
  const given = { result, unit, brief, candidate: prepare(unit, brief), family: FAMILIES[0] ?? null, ...more };
  return { ...given, corners: more.corners ?? cornersOf(given) };
}
