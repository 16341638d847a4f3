// The state of every value of a row: from a datasheet, measured, assumed by a named rule, or unknown.

import type { Capacitor, ValueState } from "./capacitor.ts";
import { CAPACITOR_COLUMNS } from "./capacitor.ts";

/** Rule names of what we assume; each is printed wherever the value is used. */
export const RULES = {
  leakage: "0.01 C V uA (C in uF) or 3 uA, the greater, for polarised units",
  polarity: "polarity from the technology named",
  builder: "assumed by the catalogue's own `assumed` column",
  plate: "computed from the plates",
  hand: "set by hand beside the catalogue",
} as const;

/** State of one value of a capacitor, by its key; `unknown` when the row has no value. */
export function stateOf(unit: Capacitor, key: keyof Capacitor): ValueState | { readonly state: "unknown" } {
  if (unit[key] === undefined) return { state: "unknown" };
  return unit.states[key] ?? { state: "datasheet" };
}

/** States named by the `measured` and `assumed` cells of a row ("capacitance; esr"); unknown names come back. */
export function namedStates(
  measured: string | undefined,
  assumed: string | undefined,
): { readonly states: Record<string, ValueState>; readonly strange: readonly string[] } {
  const states: Record<string, ValueState> = {};
  const strange: string[] = [];
  const mark = (cell: string | undefined, state: ValueState): void => {
    for (const name of (cell ?? "").split(/[;|,]/).map((n) => n.trim().toLowerCase())) {
      if (name === "") continue;
      const column = CAPACITOR_COLUMNS.find((c) => c.heading === name || c.also?.includes(name));
      if (column) states[column.key] = state;
      else strange.push(name);
    }
  };
  mark(measured, { state: "measured" });
  mark(assumed, { state: "assumed", rule: RULES.builder });
  return { states, strange };
}

/** Leakage current of a polarised unit without a datasheet figure, A. Source: [methods-2.5] (second hand). */
export const assumedLeakage = (capacitance: number, voltage: number): number =>
  Math.max(0.01 * (capacitance * 1e6) * voltage, 3) * 1e-6;

const POLAR = /electrolytic|photoflash|double[- ]layer|supercap|tantalum/i;
const NON_POLAR = /film|foil|paper|oil|ceramic|mica|plate|air|glass/i;

/** Polarity that a technology's name implies; undefined when it implies none. */
export function polarityOf(technology: string | undefined): boolean | undefined {
  if (technology === undefined) return undefined;
  if (/bipolar|non-?polari[sz]ed/i.test(technology)) return false;
  if (POLAR.test(technology)) return true;
  return NON_POLAR.test(technology) ? false : undefined;
}
