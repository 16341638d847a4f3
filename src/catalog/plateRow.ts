// A catalogue row of plates to the capacitance and voltage of the capacitor they make.

import { accepted, type Place, type Read, refused } from "../quantity/index.ts";

const EPS0 = 8.8541878188e-12;

interface PlateRow {
  readonly plateArea?: number | undefined;
  readonly gap?: number | undefined;
  readonly permittivity?: number | undefined;
  readonly plates?: number | undefined;
  readonly breakdownField?: number | undefined;
}

export function plateCapacitor(
  row: PlateRow,
  place: Place,
): Read<{ readonly capacitance: number; readonly voltage?: number }> {
  const { plateArea, gap, permittivity = 1, plates = 2, breakdownField } = row;
  if (plateArea === undefined || gap === undefined) {
    return refused({ code: "missing-value", place, read: "plates without area or gap", want: "plate area and gap" });
  }
  const capacitance = (EPS0 * permittivity * plateArea * (plates - 1)) / gap;
  return accepted(breakdownField === undefined ? { capacitance } : { capacitance, voltage: breakdownField * gap });
}
