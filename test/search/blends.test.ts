// `plan --blend --json` against a brute force from the rules alone, on random small catalogues; its proofs checked from the catalogue.
import { describe, expect, test } from "vitest";
import type { BlendModel } from "../../src/search/blend/model.ts";
import { verifyCertificate } from "../../src/search/blend/verify.ts";
import type { NamedCertificate } from "../../src/search/index.ts";
import { type HandType, handBlend, handTypes } from "../support/blendByHand.ts";
import { type Drawn, draw, drawShipped, planned } from "../support/blendDraw.ts";
import { slowRequired } from "../support/slowPlan.ts";

/** The model rebuilt by hand; whoever wants few may build more. */
function handModel({ brief, maxTypes }: Drawn, types: readonly HandType[]): BlendModel {
  const open = Number.POSITIVE_INFINITY;
  return {
    requirement: slowRequired(brief),
    maxTypes,
    ceilings: { volume: brief.maxVolume ?? open, mass: brief.maxMass ?? open, units: brief.maxUnits },
    options: types.map(({ capacity, volume, mass, series, costs }, partIndex) => {
      const level = Float64Array.from(costs);
      for (let x = level.length - 2; x >= 1; x -= 1) level[x] = Math.min(level[x]!, level[x + 1]!);
      return { capacity, volume, mass, units: series, maxStrings: level.length - 1, costs: level, partIndex };
    }),
  };
}

const places = (types: readonly HandType[]) => (part: string) => types.findIndex((type) => type.part === part);

function plainCertificate(
  named: NamedCertificate,
  counts: readonly { part: string; strings: number }[],
  types: readonly HandType[],
) {
  const at = places(types);
  return {
    cost: named.cost,
    counts: counts.map(({ part, strings }) => ({ option: at(part), strings })).sort((a, b) => a.option - b.option),
    prices: named.prices,
    bound: named.bound,
    survivors: named.survivors.map(({ part, strings }) => ({ option: at(part), strings })),
  };
}

describe("plan --blend --json on 300 random small catalogues", () => {
  const seen = { fits: 0, mixes: 0, none: 0, dear: 0, checked: 0, falling: 0 };
  test.each([1001, 2001, 3001])(
    "seeds from %i: the same integer cents as every mix tried, and the proof holds",
    async (first) => {
      for (let seed = first; seed < first + 100; seed += 1) {
        const drawn = draw(seed);
        const types = handTypes(drawn.brief, drawn.parts, drawn.families);
        if (types.some(({ costs }) => costs.some((cost, x) => x > 1 && cost < costs[x - 1]!))) seen.falling += 1;
        const best = handBlend(drawn.brief, types, drawn.maxTypes);
        const { status, blends, layouts, blendSearch } = await planned(drawn);
        const at = `seed ${seed}`;
        expect(status, at).toBe(blends.length + layouts.length > 0 ? 0 : 1);
        expect(blendSearch.disagreements, at).toEqual([]);
        if (best === null) {
          expect(blends, at).toEqual([]);
          expect(blendSearch.status, at).toBe("infeasible");
          seen.none += 1;
        } else {
          expect(blends.length, at).toBe(1);
          expect(Math.round((blends[0].cost?.total ?? 0) * 100), at).toBe(best.cost);
          expect(blendSearch.status, at).toBe("optimal");
          expect(
            blends[0].strings.every(
              (one: { series: number; part: string }) => one.series === types[places(types)(one.part)]?.series,
            ),
            at,
          ).toBe(true);
          expect(
            blends[0].strings.reduce(
              (sum: number, one: { series: number; parallel: number }) => sum + one.series * one.parallel,
              0,
            ),
            at,
          ).toBe(blends[0].units);
          seen.fits += 1;
          if (best.counts.length > 1) seen.mixes += 1;
        }
        const named: NamedCertificate | null = blends[0]?.certificate ?? blendSearch.certificate;
        if (named === null) continue;
        expect(named.verdict, at).toBe("valid");
        const dear = best === null && named.cost !== null;
        if (dear) {
          // The cheapest is known and costs more than the ceiling: the proof is of that cost.
          seen.dear += 1;
          continue;
        }
        const counts = (blends[0]?.strings ?? []).map((one: { part: string; parallel: number }) => ({
          part: one.part,
          strings: one.parallel,
        }));
        const model = handModel(drawn, types);
        const plain = plainCertificate(named, counts, types);
        expect(verifyCertificate(model, plain), at).toEqual({ verdict: "valid" });
        if (named.cost !== null && named.cost > 0)
          expect(verifyCertificate(model, { ...plain, cost: named.cost - 1 }).verdict, at).toBe("invalid");
        const [lost, ...left] = plain.survivors;
        if (lost !== undefined && lost.strings.length > 0 && named.bound < (named.cost ?? 0) - 1.01)
          expect(verifyCertificate(model, { ...plain, survivors: left }).verdict, at).toBe("invalid");
        seen.checked += 1;
      }
    },
    60_000,
  );

  test("the draws hold banks that fit, mixes, and needs that cannot be met", () => {
    expect(seen.fits).toBeGreaterThan(60);
    expect(seen.mixes).toBeGreaterThan(10);
    expect(seen.none).toBeGreaterThan(40);
    expect(seen.checked).toBeGreaterThan(100);
    console.log(seen);
  });
});

test("plan --blend --shipment-cost on 150 random catalogues: each supplier paid once, the same integer cents as every mix tried", async () => {
  const seen = { fits: 0, sent: 0, changed: 0, none: 0 };
  for (let seed = 9261; seed < 9411; seed += 1) {
    const drawn = drawShipped(seed);
    const { shipments } = drawn;
    const types = handTypes(drawn.brief, drawn.parts, drawn.families);
    const best = handBlend(drawn.brief, types, drawn.maxTypes, (name) => shipments[name]!);
    const { blends, blendSearch } = await planned(drawn, ["--shipment-cost", drawn.flag]);
    const at = `seed ${seed}`;
    if (best === null) {
      expect(blends, at).toEqual([]);
      expect(blendSearch.status, at).toBe("infeasible");
      seen.none += 1;
      continue;
    }
    expect(Math.round(blends[0].cost.total * 100), at).toBe(best.cost);
    expect(blendSearch.status, at).toBe("optimal");
    expect(blends[0].certificate.verdict, at).toBe("valid");
    seen.fits += 1;
    if (blends[0].cost.shipments > 0) seen.sent += 1;
    const plain = handBlend(drawn.brief, types, drawn.maxTypes);
    if (JSON.stringify(plain?.counts) !== JSON.stringify(best.counts)) seen.changed += 1;
  }
  expect(seen.fits).toBeGreaterThan(30);
  expect(seen.sent).toBeGreaterThan(20);
  expect(seen.changed).toBeGreaterThan(3);
}, 60_000);
