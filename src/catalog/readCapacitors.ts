// Text of a capacitor catalogue to capacitors, with every fault placed and every assumption named.

import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import { CAPACITOR_COLUMNS, type Capacitor, type ValueState } from "./capacitor.ts";
import { plateCapacitor } from "./plate.ts";
import { isPriced } from "./purchase.ts";
import type { Row } from "./row.ts";
import { assumedLeakage, namedStates, polarityOf, RULES } from "./states.ts";
import { MOST_FAULTS, positions, readTable } from "./table.ts";

export interface Catalogue {
  readonly parts: readonly Capacitor[];
  /** Rows that were lost, with every fault of each. */
  readonly faults: readonly Refusal[];
  /** Columns passed over and other things that lost no row. */
  readonly notes: readonly Refusal[];
  readonly rowCount: number;
}

/** Reads one catalogue file. Refused as a whole only when no row could be understood by its headings. */
export function readCapacitors(text: string, file: string): Read<Catalogue> {
  const parts: Capacitor[] = [];
  const faults: Refusal[] = [];
  const notes: Refusal[] = [];
  const seen = new Map<string, number>();
  let unnamedPrice = null as number | null;
  const table = readTable(text, CAPACITOR_COLUMNS, file, (row) => {
    const read = toCapacitor(row, file, notes);
    if (!read.ok) {
      faults.push(...read.refusals);
      return;
    }
    const first = seen.get(read.value.part);
    if (first !== undefined) {
      const want = `a name of its own for each row; line ${first} has it already`;
      faults.push({
        code: "duplicate-part",
        place: { file, line: row.line, field: "part" },
        read: JSON.stringify(read.value.part),
        want,
      });
      return;
    }
    seen.set(read.value.part, row.line);
    parts.push(read.value);
    if (unnamedPrice === null && read.value.currency === undefined && isPriced(read.value)) unnamedPrice = row.line;
  });
  if (!table.ok) return table;
  if (unnamedPrice !== null) {
    const want = "a code of ISO 4217 such as EUR; a price without one is taken in the currency of the plan";
    notes.push({
      code: "missing-value",
      place: { file, line: unnamedPrice, field: "currency" },
      read: "a price without a currency",
      want,
    });
  }
  const all = [...table.value.faults, ...faults].sort((a, b) => (a.place.line ?? 1e12) - (b.place.line ?? 1e12));
  return accepted({
    parts,
    faults: all.slice(0, MOST_FAULTS + 1),
    notes: [...table.value.notes, ...notes],
    rowCount: table.value.rowCount,
  });
}

type Mutable = { -readonly [K in keyof Capacitor]: Capacitor[K] | undefined };

const AT = positions<keyof Capacitor | "measured" | "assumed">(CAPACITOR_COLUMNS);
const NONE: Readonly<Record<string, ValueState>> = Object.freeze({});
const LEAKAGE: ValueState = { state: "assumed", rule: RULES.leakage };
const POLARITY: ValueState = { state: "assumed", rule: RULES.polarity };
const PLATES: ValueState = { state: "assumed", rule: RULES.plate };

/** All keys in one order for every row: a catalogue of 100,000 parts is read, and searched, several times faster so. */
function draft({ values, line }: Row, file: string): Mutable {
  return {
    part: values[AT.part] as never,
    maker: values[AT.maker] as never,
    technology: values[AT.technology] as never,
    polarised: values[AT.polarised] as never,
    capacitance: values[AT.capacitance] as never,
    voltage: values[AT.voltage] as never,
    tolerance: values[AT.tolerance] as never,
    surgeVoltage: values[AT.surgeVoltage] as never,
    reverseVoltage: values[AT.reverseVoltage] as never,
    derating: values[AT.derating] as never,
    leakage: values[AT.leakage] as never,
    insulation: values[AT.insulation] as never,
    esr: values[AT.esr] as never,
    esl: values[AT.esl] as never,
    peakCurrent: values[AT.peakCurrent] as never,
    rippleCurrent: values[AT.rippleCurrent] as never,
    slew: values[AT.slew] as never,
    action: values[AT.action] as never,
    reversal: values[AT.reversal] as never,
    ratedShots: values[AT.ratedShots] as never,
    lifeExponent: values[AT.lifeExponent] as never,
    reversalExponent: values[AT.reversalExponent] as never,
    thermalResistance: values[AT.thermalResistance] as never,
    ruptureEnergy: values[AT.ruptureEnergy] as never,
    diameter: values[AT.diameter] as never,
    length: values[AT.length] as never,
    width: values[AT.width] as never,
    height: values[AT.height] as never,
    mass: values[AT.mass] as never,
    currency: values[AT.currency] as never,
    price: values[AT.price] as never,
    priceBreaks: values[AT.priceBreaks] as never,
    pack: values[AT.pack] as never,
    minimumOrder: values[AT.minimumOrder] as never,
    onHand: values[AT.onHand] as never,
    available: values[AT.available] as never,
    supplier: values[AT.supplier] as never,
    orderCode: values[AT.orderCode] as never,
    note: values[AT.note] as never,
    plateArea: values[AT.plateArea] as never,
    gap: values[AT.gap] as never,
    permittivity: values[AT.permittivity] as never,
    plates: values[AT.plates] as never,
    breakdownField: values[AT.breakdownField] as never,
    states: NONE,
    file,
    line,
  };
}

/** A row to a capacitor, with what it leaves out assumed by a named rule or left unknown. */
function toCapacitor(row: Row, file: string, notes: Refusal[]): Read<Capacitor> {
  const unit = draft(row, file);
  const place = { file, line: row.line };
  const mark = (key: string, state: ValueState): void => {
    unit.states = { ...unit.states, [key]: state };
  };
  const [measured, assumed] = [row.values[AT.measured], row.values[AT.assumed]];
  if (measured !== undefined || assumed !== undefined) {
    const named = namedStates(measured as string | undefined, assumed as string | undefined);
    unit.states = named.states;
    for (const name of named.strange) {
      const want = "a heading of this catalogue in `measured` or `assumed`";
      notes.push({ code: "unknown-column-name", place, read: JSON.stringify(name), want });
    }
  }
  if (unit.capacitance !== undefined && (unit.plateArea !== undefined || unit.gap !== undefined)) {
    const want = "either a capacitance or plates with their gap; the other cells blank";
    const at = { ...place, field: "capacitance" };
    return refused({ code: "contradiction", place: at, read: "a capacitance and plates in one row", want });
  }
  if (unit.plateArea !== undefined || unit.gap !== undefined || unit.plates !== undefined) {
    const plate = plateCapacitor(unit, place);
    if (!plate.ok) return plate;
    for (const key of ["capacitance", "voltage"] as const) {
      const value = plate.value[key];
      if (unit[key] !== undefined || value === undefined) continue;
      unit[key] = value;
      mark(key, PLATES);
    }
    unit.technology ??= "home-made plates";
  }
  const { capacitance, voltage } = unit;
  if (capacitance === undefined || voltage === undefined) {
    const field = capacitance === undefined ? "capacitance" : "voltage";
    const want = `a value for ${field}, or plate area, gap, plates and breakdown field`;
    return refused({ code: "missing-value", place: { ...place, field }, read: "a blank cell or no such column", want });
  }
  if (unit.polarised === undefined) {
    unit.polarised = polarityOf(unit.technology);
    if (unit.polarised !== undefined) mark("polarised", POLARITY);
  }
  if (unit.polarised === true && unit.leakage === undefined && unit.insulation === undefined) {
    unit.leakage = assumedLeakage(capacitance, voltage);
    mark("leakage", LEAKAGE);
  }
  if (unit.surgeVoltage !== undefined && unit.surgeVoltage < voltage) {
    const at = { ...place, field: "surge voltage" };
    const want = "a surge voltage at least the rated voltage";
    return refused({ code: "contradiction", place: at, read: `${unit.surgeVoltage} V below ${voltage} V`, want });
  }
  return accepted(unit as Capacitor);
}
