import { describe, expect, test } from "vitest";
import { candidatesOf, outlierFindings, wildFindings } from "../../src/place/candidates.ts";
import { outliersOf } from "../../src/place/outliers.ts";
import type { PlaceRequest } from "../../src/place/request.ts";
import { units } from "./lots.ts";

const request: PlaceRequest = { series: 3, parallel: 3, ties: "cross-tied" };
const lot = units("normal", 11, 2, 0.2).map((unit, i) =>
  i === 0
    ? { ...unit, capacitance: 2e-3 }
    : i === 1
      ? { ...unit, capacitance: 1.5e-3 }
      : i === 2
        ? { ...unit, leakage: 1 }
        : unit,
);
const outliers = outliersOf(lot, 0.003);

describe("candidatesOf(units, request, outliers)", () => {
  test("as many outliers go as there are spares, the furthest out first", () => {
    const { units: kept, rejected } = candidatesOf(lot, request, outliers);
    expect(outliers.map((o) => o.serial).sort()).toEqual(["U001", "U002", "U003"]);
    expect(rejected.map((o) => o.serial).sort()).toEqual(["U001", "U003"]);
    expect(kept.length).toBe(9);
  });
  test("a pinned unit stays, and all stay when asked to", () => {
    const pins = [{ serial: "U001", group: 0 }];
    expect(candidatesOf(lot, { ...request, pins }, outliers).rejected.map((o) => o.serial)).not.toContain("U001");
    expect(candidatesOf(lot, { ...request, outliers: "keep" }, outliers).units).toBe(lot);
  });
});

describe("outlierFindings and wildFindings", () => {
  test("leakage in one, capacitance in the other, each with its unit's serial", () => {
    expect(outlierFindings(outliers, new Set()).map((f) => f.id)).toEqual(["place.outlier-leakage"]);
    const wild = wildFindings(lot, request, { outliers, fitted: new Set(["U002"]), gap: 0.04 });
    expect(wild.map((f) => f.id)).toEqual(["place.wild-unit", "place.wild-unit"]);
    expect(wild[0]!.note).toContain("U001");
    expect(wild[1]!.value).toBe(0.04);
  });
});
