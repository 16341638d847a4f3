// The brief's limits in a blend: each group beside the others, and the first that is not proven to be kept.
import { expect, test } from "vitest";
import { assessBuiltBlend } from "../../src/search/blendAssess.ts";
import { brokenLimit, groupLimits, isLimitFinding } from "../../src/search/blendLimits.ts";
import { limitFindings } from "../../src/search/limits.ts";
import { partsOf, priced } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const units = partsOf({ capacitance: 470 }, { capacitance: 100 }).map((unit) => ({ ...unit, esr: 0.05, esl: 2e-8 }));
const load = { resistance: 0.5, inductance: 1e-5 };
const brief = briefOf({ energy: 10, voltage: 400, load, maxPeakCurrent: 300, maxFaultEnergy: "60 J" });
const built = (asked: typeof brief, ...counts: readonly number[]) =>
  assessBuiltBlend({
    groups: counts.map((parallel, at) => ({
      unit: units[at]!,
      layout: { part: units[at]!.part, series: 1, parallel, ties: "strings" },
      families: priced,
    })),
    brief: asked,
    currency: "EUR",
    minor: 100,
  });

test("groupLimits: one group is a layout of its own; beside others its current falls and its fault energy rises", () => {
  const alone = built(brief, 2);
  const [own] = groupLimits(alone.strings, units, brief);
  expect(own).toEqual(limitFindings(brief, { unit: units[0]!, series: 1, parallel: 2, ties: "strings", worst: 400 }));
  const [beside] = groupLimits(built(brief, 2, 6).strings, units, brief);
  const value = (list: typeof own, id: string) => list!.find((one) => one.id === id)!.value!;
  // 2 x 470 uF hold 75.2 J each at 400 V, nothing of it their own; the other group's 600 uF add 48 J.
  expect(value(own, "limit-fault-energy")).toBeCloseTo(37.6, 6);
  expect(value(beside, "limit-fault-energy")).toBeCloseTo(37.6 + 48, 6);
  expect(own!.every(isLimitFinding)).toBe(true);
});

test("brokenLimit(blend, brief): the first limit that is over, or open; null when all are proven", () => {
  // 2 x 470 uF and 6 x 100 uF into 0.5 ohm: near 800 A in all, more than 180 A in each large unit.
  const low = briefOf({ energy: 10, voltage: 400, load, maxPeakCurrent: 180 });
  expect(brokenLimit(built(low, 2, 6), low)).toMatchObject({ part: "a", open: false, limit: "peak-current" });
  const easy = briefOf({ energy: 10, voltage: 400, load, maxPeakCurrent: 900 });
  expect(brokenLimit(built(easy, 2, 6), easy)).toBeNull();
  const fault = briefOf({ energy: 10, voltage: 400, maxFaultEnergy: "60 J" });
  expect(brokenLimit(built(fault, 2, 6), fault)).toMatchObject({ limit: "fault-energy", open: false, allowed: 60 });
  // Without a load there is no shot to judge: nothing is proven.
  const blind = { ...easy, load: undefined } as unknown as typeof easy;
  expect(brokenLimit(built(blind, 2, 6), blind)).toMatchObject({ limit: "peak-current", value: null, open: true });
});
