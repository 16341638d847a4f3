// The chance of an excess against plain Monte-Carlo with seeded units, and the quick judge against the full answer.
import { describe, expect, test } from "vitest";
import { type RiskCase, riskJudge, riskOf } from "../../src/search/risk.ts";
import { briefOf } from "../support/labParts.ts";
import { type Chance, chance } from "../support/random.ts";

const brief = (risk = 1e-4) => briefOf({ basis: "statistical", risk });

/** Share of banks, drawn unit by unit from the flat law, in which any unit gets more than `share` of the voltage. */
function drawn({ tolerance, series, parallel, ties, share }: RiskCase, c: Chance, trials: number): number {
  const unit = (): number => 1 - tolerance.low + c.next() * (tolerance.low + tolerance.high);
  let over = 0;
  for (let t = 0; t < trials; t++) {
    const chains = ties === "cross-tied" ? 1 : parallel;
    const sharing = ties === "cross-tied" ? parallel : 1;
    let worst = 0;
    for (let k = 0; k < chains; k++) {
      let [elastance, least] = [0, Number.POSITIVE_INFINITY];
      for (let s = 0; s < series; s++) {
        let stage = 0;
        for (let u = 0; u < sharing; u++) stage += unit();
        elastance += 1 / stage;
        least = Math.min(least, stage);
      }
      worst = Math.max(worst, 1 / least / elastance);
    }
    if (worst > share) over++;
  }
  return over / trials;
}

const TWENTY = { low: 0.2, high: 0.2 };

describe("riskOf(case, brief)", () => {
  test("a limit at or above the worst case is never exceeded; one below the even share always is", () => {
    const worst = 1.2 / (1.2 + 2 * 0.8);
    expect(
      riskOf({ tolerance: TWENTY, series: 3, parallel: 2, ties: "cross-tied", share: worst * 1.001 }, brief()).exceed,
    ).toBeLessThan(1e-12);
    expect(
      riskOf({ tolerance: TWENTY, series: 3, parallel: 2, ties: "cross-tied", share: 0.333 }, brief()).exceed,
    ).toBeCloseTo(1, 9);
  });

  test("two in series, one string: the chance that C_1/(C_1 + C_2) leaves more than s to the other is an area: closed form", () => {
    // Flat on a square of side 0.4 about 1; C_2 over s/(1 - s) C_1 either way: two triangles at the corners.
    const s = 0.55;
    const k = s / (1 - s);
    const side = 1.2 - 0.8 * k;
    const triangle = (side * (1.2 / k - 0.8)) / 2;
    const { exceed, error } = riskOf({ tolerance: TWENTY, series: 2, parallel: 1, ties: "strings", share: s }, brief());
    expect(Math.abs(exceed - (2 * triangle) / 0.16)).toBeLessThanOrEqual(error + 1e-6);
  });

  test("twelve banks of both ties against 40000 drawn ones: within four standard deviations of the drawing and the stated error", () => {
    const c = chance(81);
    for (let i = 0; i < 12; i++) {
      const ties = i % 2 === 0 ? ("cross-tied" as const) : ("strings" as const);
      const [series, parallel] = [c.whole(2, 5), c.whole(1, 4)];
      const tolerance = c.pick([TWENTY, { low: 0.1, high: 0.3 }]);
      const one = { tolerance, series, parallel, ties, share: (1 / series) * c.between(1.04, 1.2) };
      const { exceed, error } = riskOf(one, brief());
      const found = drawn(one, c, 40000);
      const sigma = Math.sqrt(Math.max(exceed * (1 - exceed), 1e-4) / 40000);
      expect(
        Math.abs(exceed - found),
        `${i} ${ties} ${series}s${parallel}p: ${exceed} for ${found}`,
      ).toBeLessThanOrEqual(4 * sigma + error);
    }
  });

  test("a normal law risks less than a flat one of the same limits", () => {
    const one = { tolerance: TWENTY, series: 4, parallel: 2, ties: "cross-tied", share: 0.29 } as const;
    expect(riskOf(one, briefOf({ basis: "statistical", distribution: "normal" })).exceed).toBeLessThan(
      riskOf(one, brief()).exceed,
    );
  });
});

describe("riskJudge(brief)", () => {
  test("says the same as the full answer, 150 random banks at three risks", () => {
    const c = chance(82);
    let [yes, no] = [0, 0];
    for (const risk of [1e-2, 1e-4, 1e-6]) {
      const judge = riskJudge(brief(risk));
      for (let i = 0; i < 50; i++) {
        const series = c.whole(2, 6);
        const one: RiskCase = {
          tolerance: c.pick([TWENTY, { low: 0.1, high: 0.3 }]),
          series,
          parallel: c.whole(1, 8),
          ties: c.pick(["cross-tied", "strings"]),
          share: (1 / series) * c.between(1.02, 1.45),
        };
        const { exceed, error } = riskOf(one, brief(risk));
        // Within the error of the answer either verdict may stand.
        if (Math.abs(exceed - risk) <= 2 * error) continue;
        const within = judge(one);
        expect(within, `${risk} ${JSON.stringify(one)}: ${exceed} +- ${error}`).toBe(exceed + error <= risk);
        if (within) yes++;
        else no++;
      }
    }
    expect(Math.min(yes, no)).toBeGreaterThan(20);
  });
  test("asked twice, answers alike", () => {
    const judge = riskJudge(brief());
    const one = { tolerance: TWENTY, series: 3, parallel: 3, ties: "cross-tied", share: 0.4 } as const;
    expect(judge(one)).toBe(judge(one));
  });
});

describe("riskOf(given, brief): the law in words", () => {
  test("a lopsided normal says that it is two pieces about nominal, an even one does not", () => {
    const normal = briefOf({ basis: "statistical", risk: 1e-4, distribution: "normal" });
    const given = { series: 2, parallel: 2, ties: "cross-tied", share: 0.6 } as const;
    const law = (low: number, high: number) => riskOf({ ...given, tolerance: { low, high } }, normal).law;
    expect(law(0.1, 0.3)).toMatch(/two pieces about nominal/);
    expect(law(0.2, 0.2)).toBe("normal over its tolerance, cut at three sigma");
  });
});
