// faultTable: all eight, in order, with no infinite or missing number, for any bank.

import { expect, test } from "vitest";
import { faultTable } from "../../src/pulse/faultTable.ts";
import fc from "../support/property.ts";
import { tied } from "./faultBanks.ts";

test("faultTable(bank) has the eight faults in a reviewer's order, each with what stops it", () => {
  const table = faultTable(tied);
  expect(table.map(({ id }) => id)).toEqual([
    "unit-short",
    "unit-open",
    "row-short",
    "load-short",
    "early-fire",
    "bleeder-open",
    "dump-stuck",
    "charger-running",
  ]);
  expect(table.every(({ stops, note }) => stops.endsWith(".") && note.endsWith("."))).toBe(true);
});

test("faultTable(bank) holds only finite numbers and nulls, for any counts and ties", () => {
  fc.assert(
    fc.property(
      fc.integer({ min: 1, max: 40 }),
      fc.integer({ min: 1, max: 40 }),
      fc.boolean(),
      fc.boolean(),
      (series, parallel, cross, known) => {
        const unit = { ...tied.unit, esr: known ? 0.02 : null, esl: known ? 25e-9 : null };
        const ties = cross ? "cross-tied" : "strings";
        for (const fault of faultTable({ ...tied, series, parallel, ties, unit, worstCharging: 1600 / series })) {
          for (const value of [fault.worstVoltage, fault.worstVoltageSpread, fault.peakCurrent, fault.energyIntoUnit]) {
            expect(value === null || (Number.isFinite(value) && value >= 0)).toBe(true);
          }
        }
      },
    ),
  );
});
