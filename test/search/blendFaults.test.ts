// The faults of a blend: its groups' own, and what the others pour in, by charge and energy before and after.
import { describe, expect, test } from "vitest";
import { assessBuiltBlend } from "../../src/search/blendAssess.ts";
import { blendFaults } from "../../src/search/blendFaults.ts";
import { faultsOf } from "../../src/search/faults.ts";
import { partsOf, priced } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const brief = briefOf({ energy: 100, voltage: 1200, overshoot: 0.05 });
const V = 1260;
const units = partsOf({ capacitance: 470, voltage: 450 }, { capacitance: 100, voltage: 1600 }).map((unit) => ({
  ...unit,
  esr: 0.04,
  esl: 2e-8,
}));
const shape = (part: number, series: number, parallel: number, ties: "cross-tied" | "strings") => ({
  unit: units[part]!,
  layout: { part: units[part]!.part, series, parallel, ties },
  families: priced,
});
const built = (...groups: ReturnType<typeof shape>[]) =>
  assessBuiltBlend({ groups, brief, currency: "EUR", minor: 100 });

describe("blendFaults(blend, units, brief)", () => {
  test("one group alone has its own table", () => {
    const blend = built(shape(0, 4, 3, "cross-tied"));
    expect(blendFaults(blend, units, brief)).toEqual(
      faultsOf({ result: blend.strings[0]!, unit: units[0]!, brief }).map((fault) => ({
        ...fault,
        part: "a",
        fromOthers: 0,
      })),
    );
  });
  test.each(["cross-tied", "strings"] as const)(
    "a unit shorted, %s: the loss when the others fill the group up again",
    (ties) => {
      const blend = built(shape(0, 4, 3, ties), shape(1, 1, 5, "strings"));
      const fault = blendFaults(blend, units, brief).find(({ id, part }) => id === "unit-short" && part === "a")!;
      // Before: what is left of it at 3/4 V beside the others at V. After: one voltage, the same charge.
      const left = ((ties === "cross-tied" ? 3 : 1) * 470e-6) / 3;
      const others = 5 * 100e-6;
      const low = (V * 3) / 4;
      const end = (left * low + others * V) / (left + others);
      const loss = (left * low ** 2 + others * V ** 2 - (left + others) * end ** 2) / 2;
      expect(fault.fromOthers).toBeCloseTo(loss, 9);
      const own = faultsOf({ result: blend.strings[0]!, unit: units[0]!, brief })[0]!;
      expect(fault.energyIntoUnit).toBeCloseTo(own.energyIntoUnit! + loss, 9);
      expect(fault.worstVoltage).toBe(own.worstVoltage);
      expect(fault.peakIs).toBe("lower bound");
    },
  );
  test("single units: the whole of the other groups empties into a shorted one", () => {
    const blend = built(shape(0, 4, 3, "cross-tied"), shape(1, 1, 5, "strings"));
    const fault = blendFaults(blend, units, brief).find(({ id, part }) => id === "unit-short" && part === "b")!;
    expect(fault.fromOthers).toBeCloseTo(((3 * 470e-6) / 4) * (V ** 2 / 2), 9);
    expect(fault.verdict).not.toBe("pass");
  });
  test("what the case is known to hold is judged with all that comes in", () => {
    const tough = units.map((unit) => ({ ...unit, ruptureEnergy: 250 }));
    const one = (group: number) => blendFaults(built(shape(group, 1, 1, "strings")), tough, { ...brief, voltage: 400 });
    expect(one(1).find(({ id }) => id === "unit-short")?.verdict).toBe("pass");
    const both = blendFaults(built(shape(0, 4, 3, "cross-tied"), shape(1, 1, 1, "strings")), tough, brief);
    expect(both.find(({ id, part }) => id === "unit-short" && part === "b")?.verdict).toBe("fail");
  });
});
