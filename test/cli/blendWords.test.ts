// The proof and the changes in words.
import { describe, expect, test } from "vitest";
import { explainText, loosenWords, proofSentence } from "../../src/cli/blendWords.ts";
import type { BlendPlan, NamedCertificate } from "../../src/search/index.ts";
import { blendsOf, partsOf } from "../support/blendLab.ts";

const flat = (text: string) => text.replace(/\s+/g, " ");
const parts = partsOf(
  { price: 3, available: 6 },
  { capacitance: 150, price: 4, pack: 4 },
  { capacitance: 220, price: 7.5 },
);
const plan = await blendsOf(parts, 1000, { explain: true, asked: { maxVolume: 0.0006 } });

describe("proofSentence(plan)", () => {
  test("proven, by whom, and who checked", () =>
    expect(proofSentence(plan)).toMatch(
      /^3 kinds of string compared\. The cheapest is proven \(own search\): its proof was checked/,
    ));
  test("not proven: the bound and the gap, rounded up", () => {
    const stopped: BlendPlan = { ...plan, status: "stopped", lowerBound: 20, gap: 0.0123456 };
    expect(proofSentence(stopped)).toMatch(
      /NOT PROVEN.*No blend costs less than 20\.00 EUR: it is at most 1\.24 % too dear/,
    );
  });
  test("not settled: why not, in the words of who asks", () => {
    const stopped: BlendPlan = { ...plan, status: "stopped", lowerBound: 20, gap: 0.1 };
    expect(proofSentence(stopped, "by noon")).toMatch(/the best found by noon\. No blend/);
    expect(proofSentence({ ...stopped, blends: [] }, "by noon")).toMatch(/Not settled by noon\.$/);
  });
  test("nothing found is not called impossible unless it is", () => {
    expect(proofSentence({ ...plan, status: "stopped", blends: [], gap: null })).toMatch(/Not settled/);
    expect(proofSentence({ ...plan, status: "infeasible", blends: [] })).toMatch(/proven that none meets the need/);
  });
  test("a rejected proof says so", () => {
    const certificate: NamedCertificate = {
      ...plan.blends[0]!.certificate!,
      verdict: "invalid",
      why: "short of the requirement",
    };
    expect(proofSentence({ ...plan, status: "stopped", certificate })).toMatch(
      /rejects the proof \(short of the requirement\)/,
    );
  });
});

describe("explainText(plan, width)", () => {
  test("steps, with the figures of the certificate, within the width", () => {
    const text = explainText(plan, 72);
    const { cost, bound, survivors } = plan.blends[0]!.certificate!;
    const open = survivors.reduce((sum, { strings }) => sum + strings.length, 0);
    expect(flat(text)).toContain(`costs at least ${(Math.round(bound) / 100).toFixed(2)} EUR`);
    expect(flat(text)).toContain(open === 0 ? "is left to try" : `only ${open} count`);
    expect(flat(text)).toContain(`cheaper than ${(cost! / 100).toFixed(2)} EUR`);
    expect(flat(text)).toMatch(/one more litre of room is worth about [\d.]+ EUR/);
    expect(flat(text)).toMatch(/if [abc] (rises|falls) by more than [\d.]+ EUR a unit/);
    expect(Math.max(...text.split("\n").map((line) => line.length))).toBeLessThanOrEqual(72);
  });
  test("proof that no blend exists, by arithmetic alone", async () => {
    const none = await blendsOf(parts, 100_000, { explain: true, asked: { maxVolume: 0.0006 } });
    expect(none.certificate?.claim).toBe("no blend exists");
    expect(flat(explainText(none, 80))).toMatch(/fall short, whatever they cost|cheaper than any blend could cost/);
  });
  test("stopped before a proof", () =>
    expect(explainText({ ...plan, blends: [], certificate: null }, 80)).toMatch(/no proof to explain/));
});

test("loosenWords: the way, the figures to the side that fits, what it costs then", () => {
  const one = { field: "maxVolume", from: 0.003, to: 0.00340016, change: 0.13338, cost: 210, proven: true } as const;
  expect(loosenWords(one, "EUR")).toBe(
    "raise the most room from 3 L to 3.401 L (13.4 %): then the cheapest costs 210.00 EUR",
  );
  expect(loosenWords({ ...one, field: "energy", from: 80, to: 60.004, change: 0.25, proven: false }, "EUR")).toBe(
    "lower the energy of a pulse from 80 J to 60 J (25 %): then the cheapest costs 210.00 EUR; less may do",
  );
  expect(loosenWords({ ...one, field: "maxCost", from: 30, to: 42, change: 0.4, cost: 42 }, "EUR")).toBe(
    "raise the most it may cost from 30.00 EUR to 42.00 EUR (40 %)",
  );
});
