// A shipment is paid once a supplier: in the count, in the search, in its proof, and in the programme for an outside engine.
import { expect, test } from "vitest";
import { findAlternatives, optionsUsed } from "../../../src/search/blend/alternatives.ts";
import { allPairs, optionForm, runForm } from "../../../src/search/blend/blendPrograms.ts";
import { certify } from "../../../src/search/blend/certificate.ts";
import { blendTotals } from "../../../src/search/blend/evaluate.ts";
import { findBlend } from "../../../src/search/blend/findBlend.ts";
import { blendModelFaults } from "../../../src/search/blend/model.ts";
import { shipmentCost, shipmentShares, withShares } from "../../../src/search/blend/shipments.ts";
import { verifyCertificate } from "../../../src/search/blend/verify.ts";
import { solveWithHighs } from "../../../src/search/highs.ts";
import { solveWhole } from "../../../src/search/solve.ts";
import { bruteForce, kinds } from "../../support/blendBrute.ts";
import { plainModel, shippedModel } from "../../support/blendModels.ts";

const two = () => {
  const model = plainModel(10, [
    { capacity: 3, most: 2, price: 10 },
    { capacity: 4, most: 2, price: 12 },
    { capacity: 2, most: 5, price: 9 },
  ]);
  const senders = [[0], [1], [1]];
  return {
    ...model,
    shipments: [5, 30],
    options: model.options.map((option, at) => ({ ...option, suppliers: senders[at]! })),
  };
};

test("shipmentCost(model, options): each supplier once, nothing without options", () => {
  expect(shipmentCost(two(), [])).toBe(0);
  expect(shipmentCost(two(), [0])).toBe(5);
  expect(shipmentCost(two(), [1, 2])).toBe(30);
  expect(shipmentCost(two(), [0, 1, 2])).toBe(35);
  expect(
    blendTotals(two(), [
      { option: 1, strings: 2 },
      { option: 2, strings: 1 },
    ])?.cost,
  ).toBe(63);
  expect(
    blendTotals(two(), [
      { option: 1, strings: 0 },
      { option: 0, strings: 1 },
    ])?.cost,
  ).toBe(15);
});

test("shipmentShares(model): a shipment is split over the string types that can come in it, never above it", () => {
  expect(shipmentShares(two())).toEqual([5, 15]);
  expect(shipmentShares({ ...two(), maxTypes: 1 })).toEqual([5, 30]);
  for (let seed = 0; seed < 200; seed += 1) {
    const model = shippedModel(seed);
    const shared = withShares(model);
    bruteForce({ ...model, shipments: [] }, (counts) => {
      const low = counts.reduce((sum, { option, strings }) => sum + shared.options[option]!.costs[strings]!, 0);
      expect(low).toBeLessThanOrEqual(blendTotals(model, counts)!.cost);
    });
  }
});

test("withShares(model): the very same model where no shipment costs anything", () => {
  const free = { ...two(), shipments: [0, 0] };
  expect(withShares(free)).toBe(free);
  const model = two();
  expect(withShares(withShares(model))).toBe(withShares(model));
});

test("findBlend: one supplier for all is cheaper than the cheapest strings of two", () => {
  // Without shipments 3 + 3 + 4 for 32; with them 4 + 4 + 2 from one supplier, 33 + 30, beats 32 + 35 from two.
  expect(findBlend({ ...two(), shipments: [0, 0] }).best?.cost).toBe(32);
  expect(findBlend(two()).best).toEqual({
    counts: [
      { option: 1, strings: 2 },
      { option: 2, strings: 1 },
    ],
    cost: 63,
  });
});

test("findBlend and its proof against every mix tried, 1,000 models with suppliers, some without any blend", () => {
  let none = 0;
  for (let seed = 0; seed < 1000; seed += 1) {
    const model = shippedModel(seed);
    expect(blendModelFaults(model)).toEqual([]);
    const answer = findBlend(model);
    const best = bruteForce(model);
    expect(answer.best?.cost ?? null, `seed ${seed}`).toBe(best);
    expect(answer.status).toBe(best === null ? "infeasible" : "optimal");
    if (best === null) none += 1;
    const proof = certify(model, answer)!;
    expect(verifyCertificate(model, proof), `seed ${seed}`).toEqual({ verdict: "valid" });
    if (best === null) continue;
    expect(verifyCertificate(model, { ...proof, cost: best - 1 }).verdict).toBe("invalid");
    // A shipment dearer by one is another catalogue: the proof holds there only if nothing in the blend is sent by it.
    const sent = new Set(proof.counts.flatMap(({ option }) => model.options[option]!.suppliers ?? []));
    for (const supplier of sent) {
      const shipments = model.shipments!.map((cost, at) => (at === supplier ? cost + 1 : cost));
      expect(verifyCertificate({ ...model, shipments }, proof).verdict).toBe("invalid");
    }
  }
  expect(none).toBeGreaterThan(150);
});

test("HiGHS and javascript-lp-solver, given the shipments as binaries, come to the same cents: 40 and 80 models", async () => {
  for (let seed = 0; seed < 40; seed += 1) {
    const model = shippedModel(seed);
    const form = runForm(model);
    const answer = await solveWithHighs(form.program);
    const best = findBlend(model).best?.cost ?? null;
    expect(answer.status).toBe(best === null ? "infeasible" : "optimal");
    if (answer.status !== "optimal") continue;
    expect(Math.round(answer.cost)).toBe(best);
    expect(blendTotals(model, form.read(answer.values))?.cost).toBe(best);
  }
  let claimed = 0;
  for (let seed = 0; seed < 80; seed += 1) {
    const model = shippedModel(seed);
    const answer = solveWhole(optionForm(model, allPairs(model)).program);
    if (answer.status === "unknown") continue;
    claimed += 1;
    expect(answer.status === "claimed" ? Math.round(answer.cost) : null).toBe(findBlend(model).best?.cost ?? null);
  }
  expect(claimed).toBeGreaterThan(70);
}, 20_000);

test("findAlternatives: the cheapest of each set of options with its shipments, against every mix tried: 200 models", () => {
  for (let seed = 0; seed < 200; seed += 1) {
    const model = shippedModel(seed);
    const best = findBlend(model).best;
    if (best === null) continue;
    const found = findAlternatives(model, { cheapest: best.cost, within: 0.5, most: 1000 });
    const hand = kinds(model, Math.floor(best.cost * 1.5 + 1e-9) + 1);
    expect(new Map(found.blends.map(({ counts, cost }) => [optionsUsed(counts), cost])), `seed ${seed}`).toEqual(hand);
  }
});

test("blendModelFaults names a supplier without a shipment, one named twice, and a shipment that is no amount", () => {
  const model = two();
  const [first, ...rest] = model.options;
  expect(blendModelFaults({ ...model, options: [{ ...first!, suppliers: [2] }, ...rest] })).toHaveLength(1);
  expect(blendModelFaults({ ...model, options: [{ ...first!, suppliers: [0, 0] }, ...rest] })).toHaveLength(1);
  expect(blendModelFaults({ ...model, shipments: [0.5, 1] })).toHaveLength(1);
});
