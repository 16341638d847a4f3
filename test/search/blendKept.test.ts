// The cheapest blend that keeps the limits, through the program: against every mix, each assessed on its own.
import { expect, test } from "vitest";
import { assessBuiltBlend } from "../../src/search/blendAssess.ts";
import { brokenLimit } from "../../src/search/blendLimits.ts";
import { handTypes } from "../support/blendByHand.ts";
import { blendsOf, partsOf, priced } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const parts = partsOf(
  { price: 3, available: 6 },
  { capacitance: 150, price: 5, available: 4 },
  { capacitance: 220, price: 9, available: 3 },
).map((unit, at) => ({ ...unit, esr: [0.1, 0.05, 0.03][at]!, esl: 2e-8, peakCurrent: 1000 }));
const load = { resistance: 0.4, inductance: 5e-6 };
const microfarads = 900;
const asked = { energy: (microfarads * 1e-6 * 400 ** 2) / 2, voltage: 400, basis: "nominal" as const, load };

test.each(["150 A", "105 A", "9 A", "12 %"])(
  "maxPeakCurrent %s: the least cost of all mixes that keep it",
  async (maxPeakCurrent) => {
    const brief = briefOf({ ...asked, maxPeakCurrent });
    const types = handTypes(brief, parts, priced);
    let least: number | null = null;
    // Up to twice the strings that would do alone, as the program looks at.
    const most = types.map(({ capacity }, at) =>
      Math.min([6, 4, 3][at]!, 2 * Math.ceil((microfarads * 1e-6) / capacity)),
    );
    for (let a = 0; a <= most[0]!; a += 1)
      for (let b = 0; b <= most[1]!; b += 1)
        for (let c = 0; c <= most[2]!; c += 1) {
          if (100 * a + 150 * b + 220 * c < microfarads) continue;
          const cost = 300 * a + 500 * b + 900 * c;
          if (least !== null && cost >= least) continue;
          const groups = [a, b, c].flatMap((parallel, at) =>
            parallel === 0
              ? []
              : [
                  {
                    unit: parts[at]!,
                    layout: { part: parts[at]!.part, series: 1, parallel, ties: "strings" as const },
                    families: priced,
                  },
                ],
          );
          if (brokenLimit(assessBuiltBlend({ groups, brief, currency: "EUR", minor: 100 }), brief) === null)
            least = cost;
        }
    const plan = await blendsOf(parts, microfarads, { asked: { load, maxPeakCurrent } });
    expect(plan.blends[0] === undefined ? null : Math.round(plan.blends[0].cost!.total * 100)).toBe(least);
    expect(plan.status).toBe(least === null ? "infeasible" : "optimal");
  },
  20_000,
);

test("keepingLimits: without limits, or where the cheapest keeps them, the proof stays; else what it broke is told", async () => {
  const plain = await blendsOf(parts, microfarads);
  const easy = await blendsOf(parts, microfarads, { asked: { load, maxPeakCurrent: "90 %" } });
  expect([plain.limited, easy.limited]).toEqual([null, null]);
  expect(easy.blends[0]?.certificate?.verdict).toBe("valid");
  const tight = await blendsOf(parts, microfarads, { asked: { load, maxPeakCurrent: "150 A" } });
  expect(tight.limited?.rejected).toBeGreaterThan(0);
  expect(tight.limited?.cheapest.broken?.limit).toBe("peak-current");
  expect(tight.blends[0]?.certificate).toBeNull();
  expect(tight.lowerBound).toBe(tight.blends[0]?.cost?.total);
});

test("a part without the rating that the limit is a part of is named and left out", async () => {
  const bare = [parts[0]!, { ...parts[1]!, peakCurrent: undefined }] as typeof parts;
  const plan = await blendsOf(bare, 500, { asked: { load, maxPeakCurrent: "90 %" } });
  expect(plan.leftOut).toMatchObject([{ part: "b", reason: "peak-current-unknown" }]);
});
