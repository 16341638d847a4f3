// The verifier throws out certificates that were tampered with, unless what they say is still true.
import { expect, test } from "vitest";
import { type BlendCertificate, certify } from "../../../src/search/blend/certificate.ts";
import { isFittingBlend } from "../../../src/search/blend/evaluate.ts";
import { findBlend } from "../../../src/search/blend/findBlend.ts";
import type { BlendModel } from "../../../src/search/blend/model.ts";
import { verifyCertificate } from "../../../src/search/blend/verify.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { chance } from "../../support/blendInstances.ts";
import { tinyModel } from "../../support/blendModels.ts";

type Mutation = readonly [
  name: string,
  change: (c: BlendCertificate, random: () => number, model: BlendModel) => BlendCertificate | null,
];

const pick = <T>(list: readonly T[], random: () => number): T => list[Math.floor(random() * list.length)]!;

const MUTATIONS: readonly Mutation[] = [
  ["a cost one cent lower", (c) => (c.cost === null ? null : { ...c, cost: c.cost - 1 })],
  ["a cost one cent higher", (c) => (c.cost === null ? null : { ...c, cost: c.cost + 1 })],
  ["a claim that nothing exists", (c) => (c.cost === null ? null : { ...c, cost: null, counts: [] })],
  ["no counts", (c) => (c.cost === null ? null : { ...c, counts: [] })],
  [
    "a string less",
    (c, random) => {
      if (c.counts.length === 0) return null;
      const at = Math.floor(random() * c.counts.length);
      return { ...c, counts: c.counts.map((n, i) => (i === at ? { ...n, strings: n.strings - 1 } : n)) };
    },
  ],
  [
    "a price moved by a thousandth or more",
    (c, random) => {
      const name = pick(["capacity", "volume", "mass", "units"] as const, random);
      const by = (0.001 + random()) * (random() < 0.5 ? -1 : 1);
      if (c.prices[name] < 1) return null;
      return { ...c, prices: { ...c.prices, [name]: c.prices[name] * (1 + by) } };
    },
  ],
  ["a negative price", (c) => ({ ...c, prices: { ...c.prices, mass: -1 } })],
  ["an unknown price", (c) => ({ ...c, prices: { ...c.prices, volume: Number.NaN } })],
  ["a bound raised", (c, random) => ({ ...c, bound: c.bound + 1 + Math.abs(c.bound) * random() })],
  [
    "a survivor dropped",
    (c, random) => {
      if (c.survivors.length === 0) return null;
      const at = Math.floor(random() * c.survivors.length);
      return {
        ...c,
        survivors: c.survivors.map((s, i) =>
          i === at ? { ...s, strings: s.strings.filter((x) => x !== pick(s.strings, () => 0)) } : s,
        ),
      };
    },
  ],
  ["all survivors dropped", (c) => (c.survivors.length === 0 ? null : { ...c, survivors: [] })],
  [
    "a survivor twice",
    (c) => (c.survivors.length === 0 ? null : { ...c, survivors: [...c.survivors, c.survivors[0]!] }),
  ],
  [
    "a survivor of nowhere",
    (c, _, model) => ({ ...c, survivors: [...c.survivors, { option: model.options.length, strings: [1] }] }),
  ],
  [
    "a survivor with half a string",
    (c) =>
      c.survivors.length === 0
        ? null
        : { ...c, survivors: [{ ...c.survivors[0]!, strings: [0.5] }, ...c.survivors.slice(1)] },
  ],
];

test.each(MUTATIONS)("verifyCertificate rejects %s, on 400 models", (_, change) => {
  let tried = 0;
  let stillTrue = 0;
  for (let seed = 0; seed < 400; seed += 1) {
    const model = tinyModel(seed);
    const random = chance(seed);
    const certificate = certify(model, findBlend(model))!;
    const mutated = change(certificate, random, model);
    if (mutated === null || JSON.stringify(mutated) === JSON.stringify(certificate)) continue;
    tried += 1;
    const { verdict } = verifyCertificate(model, mutated);
    if (verdict === "invalid") continue;
    // Now and then a change leaves a true proof: a string fewer at the same cost, or a price that its row does not feel.
    stillTrue += 1;
    expect(mutated.cost).toBe(bruteForce(model));
    expect(mutated.cost === null || isFittingBlend(model, mutated.counts)).toBe(true);
    expect(mutated.survivors).toEqual(certificate.survivors);
  }
  expect(tried).toBeGreaterThan(20);
  expect(stillTrue).toBeLessThanOrEqual(0.03 * tried);
});

test("verifyCertificate: another model's certificate passes only where it is true there: 2,000 pairs", () => {
  let passed = 0;
  for (let seed = 0; seed < 200; seed += 1) {
    const certificate = certify(tinyModel(seed), findBlend(tinyModel(seed)))!;
    for (let other = 1; other <= 10; other += 1) {
      const model = tinyModel(seed + other);
      if (verifyCertificate(model, certificate).verdict !== "valid") continue;
      passed += 1;
      expect(bruteForce(model)).toBe(certificate.cost);
    }
  }
  expect(passed).toBeLessThan(200);
});

test("verifyCertificate rejects a dearer blend passed off as the cheapest, with the survivors that its cost would need", () => {
  let tried = 0;
  for (let seed = 0; seed < 400; seed += 1) {
    const model = tinyModel(seed);
    const answer = findBlend(model);
    if (answer.best === null) continue;
    let dearer: { counts: { option: number; strings: number }[]; cost: number } | null = null;
    bruteForce(model, (counts, cost) => {
      if (cost > answer.best!.cost && isFittingBlend(model, counts)) dearer = { counts: [...counts], cost };
    });
    if (dearer === null) continue;
    tried += 1;
    const forged = certify(model, { ...answer, best: dearer })!;
    expect(verifyCertificate(model, forged).verdict).toBe("invalid");
  }
  expect(tried).toBeGreaterThan(50);
});
