// A model says what is wrong with it before anyone searches it.
import { expect, test } from "vitest";
import { blendModelFaults } from "../../../src/search/blend/model.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

const sound = plainModel(1e-3, [{ capacity: 1e-4, most: 20, price: 100 }]);

test("blendModelFaults(model) is empty for a sound model, and for 200 random ones", () => {
  expect(blendModelFaults(sound)).toEqual([]);
  for (let seed = 0; seed < 200; seed += 1) expect(blendModelFaults(tinyModel(seed))).toEqual([]);
});

test.each([
  ["no requirement", { ...sound, requirement: 0 }, "requirement"],
  ["no types", { ...sound, maxTypes: 0 }, "maxTypes"],
  ["unknown ceiling", { ...sound, ceilings: { ...sound.ceilings, mass: Number.NaN } }, "mass"],
  ["no capacity", { ...sound, options: [{ ...sound.options[0]!, capacity: 0 }] }, "capacity"],
  ["unknown volume", { ...sound, options: [{ ...sound.options[0]!, volume: Number.NaN }] }, "volume"],
  ["half units", { ...sound, options: [{ ...sound.options[0]!, units: 1.5 }] }, "units"],
  ["short table", { ...sound, options: [{ ...sound.options[0]!, maxStrings: 21 }] }, "shorter"],
  [
    "falling table",
    { ...sound, options: [{ ...sound.options[0]!, maxStrings: 2, costs: Float64Array.of(0, 5, 4) }] },
    "less",
  ],
  [
    "half a cent",
    { ...sound, options: [{ ...sound.options[0]!, maxStrings: 1, costs: Float64Array.of(0, 5.5) }] },
    "whole",
  ],
  [
    "nothing costs",
    { ...sound, options: [{ ...sound.options[0]!, maxStrings: 1, costs: Float64Array.of(1, 5) }] },
    "cost 0",
  ],
])("blendModelFaults(model) names: %s", (_, model, word) => {
  expect(blendModelFaults(model).join("; ")).toContain(word);
  expect(blendModelFaults(model)).toHaveLength(1);
});
