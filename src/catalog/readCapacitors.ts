// Text of a capacitor catalogue to capacitors, with every fault placed and every assumption named.

import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import { CAPACITOR_COLUMNS, type Capacitor, type ValueState } from "./capacitor.ts";
import { plateCapacitor } from "./plateRow.ts";
import { assumedLeakage, namedStates, polarityOf, RULES } from "./states.ts";
import { MOST_FAULTS, type Row, readTable } from "./table.ts";

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
  });
  if (!table.ok) return table;
  const all = [...table.value.faults, ...faults].sort((a, b) => (a.place.line ?? 1e12) - (b.place.line ?? 1e12));
  return accepted({
    parts,
    faults: all.slice(0, MOST_FAULTS + 1),
    notes: [...table.value.notes, ...notes],
    rowCount: table.value.rowCount,
  });
}

const NONE: Readonly<Record<string, ValueState>> = Object.freeze({});
const LEAKAGE: ValueState = { state: "assumed", rule: RULES.leakage };
const POLARITY: ValueState = { state: "assumed", rule: RULES.polarity };
const PLATES: ValueState = { state: "assumed", rule: RULES.plate };

/** A row to a capacitor. The row's own record becomes the capacitor, so that all capacitors have one shape. */
function toCapacitor(row: Row, file: string, notes: Refusal[]): Read<Capacitor> {
  const unit = row.values as Record<string, unknown> & { -readonly [K in keyof Capacitor]?: Capacitor[K] };
  const place = { file, line: row.line };
  let states = NONE as Record<string, ValueState>;
  const mark = (key: string, state: ValueState): void => {
    states = { ...states, [key]: state };
  };
  if (unit.measured !== undefined || unit.assumed !== undefined) {
    const named = namedStates(unit.measured as string | undefined, unit.assumed as string | undefined);
    states = named.states;
    for (const name of named.strange) {
      const want = "a heading of this catalogue in `measured` or `assumed`";
      notes.push({ code: "unknown-column-name", place, read: JSON.stringify(name), want });
    }
  }
  if (unit.plateArea !== undefined || unit.gap !== undefined || unit.plates !== undefined) {
    const plate = plateCapacitor(unit, place);
    if (!plate.ok) return plate;
    for (const [key, value] of Object.entries(plate.value)) {
      if (unit[key] !== undefined) continue;
      unit[key] = value;
      mark(key, PLATES);
    }
    unit.technology ??= "home-made plates";
  }
  for (const key of ["capacitance", "voltage"]) {
    if (unit[key] !== undefined) continue;
    const want = `a value for ${key}, or plate area, gap, plates and breakdown field`;
    return refused({
      code: "missing-value",
      place: { ...place, field: key },
      read: "a blank cell or no such column",
      want,
    });
  }
  if (unit.polarised === undefined) {
    const polarised = polarityOf(unit.technology);
    if (polarised !== undefined) {
      unit.polarised = polarised;
      mark("polarised", POLARITY);
    }
  }
  const { capacitance = 0, voltage = 0, surgeVoltage = voltage } = unit;
  if (unit.polarised === true && unit.leakage === undefined && unit.insulation === undefined) {
    unit.leakage = assumedLeakage(capacitance, voltage);
    mark("leakage", LEAKAGE);
  }
  if (surgeVoltage < voltage) {
    const want = "a surge voltage at least the rated voltage";
    return refused({
      code: "contradiction",
      place: { ...place, field: "surge voltage" },
      read: `${surgeVoltage} V below ${voltage} V`,
      want,
    });
  }
  unit.states = states;
  unit.file = file;
  unit.line = row.line;
  return accepted(unit as unknown as Capacitor);
}
