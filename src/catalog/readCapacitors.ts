// Text of a capacitor catalogue to capacitors, with every fault placed and every assumption named.

import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import { CAPACITOR_COLUMNS, type Capacitor, capacitorSchema, type ValueState } from "./capacitor.ts";
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

function toCapacitor(row: Row, file: string, notes: Refusal[]): Read<Capacitor> {
  const { measured, assumed, plateArea, gap, permittivity, plates, breakdownField, ...values } = row.values as Record<
    string,
    never
  >;
  const place = { file, line: row.line };
  let states: Record<string, ValueState> = {};
  if (measured !== undefined || assumed !== undefined) {
    const named = namedStates(measured, assumed);
    states = named.states;
    for (const name of named.strange) {
      notes.push({
        code: "unknown-column-name",
        place,
        read: JSON.stringify(name),
        want: "a heading of this catalogue in `measured` or `assumed`",
      });
    }
  }
  const unit: Record<string, unknown> = values;
  if (plateArea !== undefined || gap !== undefined || plates !== undefined) {
    const plate = plateCapacitor({ plateArea, gap, permittivity, plates, breakdownField }, place);
    if (!plate.ok) return plate;
    for (const [key, value] of Object.entries(plate.value)) {
      if (unit[key] !== undefined) continue;
      unit[key] = value;
      states[key] = { state: "assumed", rule: RULES.plate };
    }
    unit.technology ??= "home-made plates";
  }
  for (const key of ["capacitance", "voltage"]) {
    if (unit[key] !== undefined) continue;
    return refused({
      code: "missing-value",
      place: { ...place, field: key },
      read: "a blank cell or no such column",
      want: `a value for ${key}, or plate area, gap, plates and breakdown field`,
    });
  }
  if (unit.polarised === undefined) {
    const polarised = polarityOf(unit.technology as string | undefined);
    if (polarised !== undefined) {
      unit.polarised = polarised;
      states.polarised = { state: "assumed", rule: RULES.polarity };
    }
  }
  if (unit.polarised === true && unit.leakage === undefined && unit.insulation === undefined) {
    unit.leakage = assumedLeakage(unit.capacitance as number, unit.voltage as number);
    states.leakage = { state: "assumed", rule: RULES.leakage };
  }
  const gate = capacitorSchema.safeParse(unit);
  if (!gate.success) {
    return refused(
      ...gate.error.issues.map((issue) => ({
        code: "contradiction",
        place: { ...place, field: String(issue.path[0] ?? "part") },
        read: String(unit[String(issue.path[0])] ?? "a blank"),
        want: issue.message,
      })),
    );
  }
  unit.states = states;
  unit.file = file;
  unit.line = row.line;
  return accepted(unit as unknown as Capacitor);
}
