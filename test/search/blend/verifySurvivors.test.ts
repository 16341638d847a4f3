// Trying the survivors: finds what is cheaper, and says when it ran out of work.
import { expect, test } from "vitest";
import type { BlendCertificate } from "../../../src/search/blend/certificate.ts";
import { trySurvivors, type VerifyColumn } from "../../../src/search/blend/verifySurvivors.ts";
import { plainModel } from "../../support/blendModels.ts";

const model = plainModel(
  10,
  [
    { capacity: 3, most: 4, price: 10 },
    { capacity: 4, most: 4, price: 13 },
  ],
  { types: 2 },
);
const columns: VerifyColumn[] = model.options.map((option) => ({
  option,
  amounts: [option.capacity / 10, 0, 0, 0],
  last: 4,
  gain: 0,
  share: 0,
}));
const certificate = (cost: number): BlendCertificate => ({
  cost,
  counts: [],
  prices: { cost: 1, capacity: 0, volume: 0, mass: 0, units: 0 },
  bound: 0,
  survivors: [0, 1].map((option) => ({ option, strings: [1, 2, 3, 4] })),
});

test("trySurvivors: nothing below the optimum of 33, something below 34", () => {
  expect(trySurvivors(model, certificate(33), columns, 33, 0, 1e4)).toBe("none");
  expect(trySurvivors(model, certificate(34), columns, 34, 0, 1e4)).toBe("cheaper");
});

test("trySurvivors: one type only leaves 39 as the best", () => {
  const single = { ...model, maxTypes: 1 };
  expect(trySurvivors(single, certificate(39), columns, 39, 0, 1e4)).toBe("none");
  expect(trySurvivors(single, certificate(40), columns, 40, 0, 1e4)).toBe("cheaper");
});

test("trySurvivors: a part in two ways does not count as cheaper", () => {
  const shared = { ...model, options: model.options.map((o) => ({ ...o, partIndex: 0 })) };
  const own = columns.map((c, at) => ({ ...c, option: shared.options[at]! }));
  expect(trySurvivors(shared, certificate(39), own, 39, 0, 1e4)).toBe("none");
});

test("trySurvivors: out of work is unsettled", () => {
  expect(trySurvivors(model, certificate(33), columns, 33, 0, 2)).toBe("unsettled");
});
