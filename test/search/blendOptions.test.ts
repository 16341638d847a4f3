// The model of a blend: sound for the search, floors below tables, and every part in it or named.
import { describe, expect, test } from "vitest";
import { blendModelFaults } from "../../src/search/blend/model.ts";
import { stringsCost } from "../../src/search/blendString.ts";
import { costTable } from "../../src/search/blendWays.ts";
import { draw } from "../support/blendDraw.ts";
import { partsOf, workOf } from "../support/blendLab.ts";
import { briefOf, fixtureBrief, labParts, labResistors } from "../support/labParts.ts";

const brief = briefOf({ energy: 100, voltage: 400, basis: "nominal" });

describe("blendWork(demand)", () => {
  test("the lab's catalogues make a sound model for every brief, and each part is in it or named, never both", () => {
    for (const name of ["flash-lamp", "flash-lamp-bounded", "pulsed-magnet", "spot-welder"]) {
      const work = workOf(labParts, fixtureBrief(name), 4, labResistors);
      expect(blendModelFaults(work.model), name).toEqual([]);
      const names = [...work.types.map(({ unit }) => unit.part), ...work.leftOut.map(({ part }) => part)];
      expect(names.sort(), name).toEqual(labParts.map(({ part }) => part).sort());
    }
  });
  test("on 200 random catalogues: sound, and no floor stands above its table", () => {
    for (let seed = 1; seed <= 200; seed += 1) {
      const { brief: asked, parts, families, maxTypes } = draw(seed);
      const { model } = workOf(parts, asked, maxTypes, families);
      expect(blendModelFaults(model), `seed ${seed}`).toEqual([]);
      for (const { floor, costs, maxStrings } of model.options) {
        for (let x = 1; x <= maxStrings; x += 1) {
          const { fixed, perString, least = 0 } = floor!;
          expect(Math.max(least, fixed + perString * x), `seed ${seed}, ${x}`).toBeLessThanOrEqual(costs[x]!);
        }
      }
    }
  });
  test("most strings: whole packs of what is available, the hand beside it", () => {
    const { model } = workOf(
      partsOf({ available: 14, pack: 4, "on hand": 1 }),
      briefOf({ energy: 8000, voltage: 400 }),
    );
    expect(model.options[0]!.maxStrings).toBe(13);
  });
  test("each reason for staying out", () => {
    const out = (row: object, asked: object = {}) =>
      workOf(partsOf({ ...row }), briefOf({ energy: 100, voltage: 400, basis: "nominal", ...asked })).leftOut[0];
    expect(out({ price: "" })).toMatchObject({ reason: "price-missing" });
    expect(out({ available: 0 })).toMatchObject({ reason: "stock", value: 1, limit: 0 });
    expect(out({ available: 5, pack: 10 })).toMatchObject({ reason: "stock", value: 10, limit: 5 });
    expect(out({ diameter: "" }, { maxVolume: 1 })).toMatchObject({ reason: "volume-unknown" });
    expect(out({ mass: "" }, { maxMass: 1 })).toMatchObject({ reason: "mass-unknown" });
    expect(out({ mass: 2000 }, { maxMass: 1 })).toMatchObject({ reason: "mass-limit", value: 2, limit: 1 });
    expect(out({}, { maxVolume: 1e-5 })).toMatchObject({ reason: "volume-limit", limit: 1e-5 });
    expect(out({ voltage: 200 }, { maxUnits: 2 })).toMatchObject({ reason: "unit-limit", value: 3, limit: 2 });
  });
  test("a part without a price is used from the hand, and asked about", () => {
    const work = workOf(partsOf({ price: "", "on hand": 3 }), brief);
    expect(work.model.options[0]).toMatchObject({ maxStrings: 3, capacity: 1e-4 });
    expect(work.unpriced).toHaveLength(1);
    expect(workOf(partsOf({ price: "", "on hand": 3, available: 0 }), brief).unpriced).toEqual([]);
  });
  test("a cost beyond what sums exactly ends the table", () => {
    const { model } = workOf(partsOf({ price: 3e8 }), briefOf({ energy: 8000, voltage: 400 }));
    expect(model.options[0]!.maxStrings).toBe(3);
  });
});

test("costTable(type, most): never falls, and is what some count from x on costs", () => {
  for (let seed = 1; seed <= 60; seed += 1) {
    const { brief: asked, parts, families, maxTypes } = draw(seed);
    const { types, model } = workOf(parts, asked, maxTypes, families);
    types.forEach((type, at) => {
      const { maxStrings } = model.options[at]!;
      const table = costTable(type, maxStrings);
      const raw = Array.from({ length: maxStrings + 1 }, (_, x) => stringsCost(type, x)!);
      table.forEach((cost, x) => {
        expect(cost).toBe(x === 0 ? 0 : Math.min(...raw.slice(x)));
      });
    });
  }
});
