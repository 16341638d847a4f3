// What `plan` answers as JSON: the keys that the design promises, all plain data.
import { describe, expect, test } from "vitest";
import { plan } from "../../src/search/index.ts";
import { fixtureBrief, labParts, labResistors, must } from "../support/labParts.ts";

const made = must(plan({ brief: fixtureBrief("flash-lamp"), parts: labParts, families: labResistors, limit: 0 }));
const json = JSON.parse(JSON.stringify(made));

describe("PlanResult as JSON", () => {
  test("loses nothing: no NaN, no Infinity, no undefined inside", () => {
    const strange: string[] = [];
    const walk = (value: unknown, path: string): void => {
      if (typeof value === "number" && !Number.isFinite(value) && path !== ".brief.hold") strange.push(path);
      if (typeof value === "function") strange.push(path);
      if (value !== null && typeof value === "object")
        for (const [k, v] of Object.entries(value)) walk(v, `${path}.${k}`);
    };
    walk(made, "");
    expect(strange).toEqual([]);
  });
  test("top level", () => {
    expect(json.required).toEqual({ capacitance: expect.any(Number) });
    expect(json.searched).toEqual({ parts: labParts.length, layouts: made.layouts.length, proof: "exhaustive" });
    expect(Object.keys(json)).toEqual(expect.arrayContaining(["required", "searched", "layouts", "front", "refused"]));
  });
  test("every layout has what was promised", () => {
    const number = (x: unknown): boolean => x === null || typeof x === "number";
    for (const l of json.layouts) {
      expect(Object.keys(l), l.id).toEqual(
        expect.arrayContaining([
          "id",
          "part",
          "series",
          "parallel",
          "ties",
          "units",
          "capacitance",
          "energy",
          "share",
          "balance",
          "bleed",
          "cost",
          "findings",
        ]),
      );
      for (const key of ["low", "nominal", "high"])
        expect(number(l.capacitance[key]) && number(l.energy[key]), l.id).toBe(true);
      for (const key of ["even", "charging", "holding", "leftAfterDump", "limit"])
        expect(number(l.share[key]), `${l.id} ${key}`).toBe(true);
      if (l.balance !== null)
        for (const key of ["resistance", "tolerance", "positions", "elements", "powerEach", "powerTotal"])
          expect(typeof l.balance[key], l.id).toBe("number");
      expect(Object.keys(l.bleed)).toEqual(["seconds", "toVoltage"]);
      if (l.cost !== null) {
        expect(number(l.cost.capacitors) && number(l.cost.resistors) && typeof l.cost.total === "number", l.id).toBe(
          true,
        );
        expect(l.cost.total, l.id).toBeCloseTo((l.cost.capacitors ?? 0) + (l.cost.resistors ?? 0), 9);
      }
      if (l.balance !== null)
        expect(l.balance.positions, l.id).toBe(l.ties === "cross-tied" ? l.series : l.series * l.parallel);
      for (const f of l.findings)
        expect(Object.keys(f), l.id).toEqual(
          expect.arrayContaining(["id", "state", "verdict", "value", "limit", "unit", "source"]),
        );
    }
  });
  test("every refusal has part, reason, value and limit", () => {
    expect(json.refused.length).toBeGreaterThan(0);
    for (const r of json.refused) expect(Object.keys(r)).toEqual(["part", "reason", "value", "limit"]);
  });
});
