// What is poured into a shorted unit, by charge and energy before and after.
import { expect, test } from "vitest";
import { pouredIntoShort } from "../../src/search/blendPoured.ts";

test("pouredIntoShort(case): charge is kept, energy is not; the whole of the others where there is one in series", () => {
  for (const ties of ["cross-tied", "strings"] as const) {
    const left = ((ties === "cross-tied" ? 5 : 1) * 1e-4) / 2;
    const end = (left * 600 + 3e-4 * 900) / (left + 3e-4);
    const loss = (left * 600 ** 2 + 3e-4 * 900 ** 2 - (left + 3e-4) * end ** 2) / 2;
    const given = { series: 3, parallel: 5, ties, capacitance: 1e-4, others: 3e-4, voltage: 900 };
    expect(pouredIntoShort(given)).toBeCloseTo(loss, 9);
    expect(pouredIntoShort({ ...given, series: 1 })).toBeCloseTo((3e-4 * 900 ** 2) / 2, 9);
    expect(pouredIntoShort({ ...given, others: 0 })).toBe(0);
  }
});
