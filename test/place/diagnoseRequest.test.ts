import { expect, test } from "vitest";
import { checkDiagnosis } from "../../src/place/diagnoseRequest.ts";

test("checkDiagnosis(request): a sound request has no faults; every fault of a bad one is told", () => {
  const stages = [{ capacitance: 1e-2, conductance: 0, resistance: 1e5 }];
  const row = { seconds: 0, bank: 100, volts: [100] };
  const meter = { relative: 0.001, absolute: 0 };
  expect(checkDiagnosis({ stages, rows: [row], meter })).toEqual([]);
  const bad = { stages, rows: [{ seconds: -1, bank: 100, volts: [1, 2] }], meter: { relative: 0, absolute: 0 } };
  expect(checkDiagnosis(bad).map((r) => r.code)).toEqual(["commission.count", "commission.number", "commission.meter"]);
  expect(checkDiagnosis({ stages: [], rows: [], meter }).map((r) => r.code)).toEqual([
    "commission.no-stages",
    "commission.no-readings",
  ]);
});
