// What a group carries in a shot beside others: equal groups are one layout, corners only add, and what cannot be reckoned is refused.
import { expect, test } from "vitest";
import { besideShot, othersNominal } from "../../src/search/blendShot.ts";
import { shotCorner } from "../../src/search/shotCorner.ts";
import { partsOf } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const [unit, other] = partsOf({ capacitance: 470 }, { capacitance: 100, tolerance: 5 }).map((one) => ({
  ...one,
  esr: 0.05,
  esl: 3e-8,
}));
const load = { resistance: 0.1, inductance: 2e-6 };
const brief = briefOf({ energy: 1, voltage: 400, basis: "nominal", load });
const shape = (parallel: number) => ({ series: 2, parallel, ties: "strings" as const });
const group = (parallel: number, of = unit!) => ({ ...shape(parallel), unit: of });

test("besideShot: a layout cut in two groups carries in each unit what it carried whole", () => {
  const whole = shotCorner(brief, { ...unit!, tolerance: { low: 0, high: 0 } }, shape(6), "nominal");
  const sure = { ...unit!, tolerance: { low: 0, high: 0 } };
  const cut = besideShot(brief, group(2, sure), { others: [group(4, sure)] });
  if (!whole.ok || !cut.ok) throw new Error("refused");
  expect(cut.value.unit.peakCurrent / whole.value.unit.peakCurrent).toBeCloseTo(1, 4);
  expect(cut.value.unit.slew / whole.value.unit.slew).toBeCloseTo(1, 4);
  expect(cut.value.reversal).toBeCloseTo(whole.value.reversal, 4);
  expect((cut.value.action! * 9) / whole.value.action!).toBeCloseTo(1, 4);
});

test("besideShot: the worst case is no less than the nominal, for either group", () => {
  for (const [one, rest] of [
    [group(3), group(5, other)],
    [group(5, other), group(3)],
  ] as const) {
    const nominal = besideShot(brief, one, { others: [rest] });
    const worst = besideShot({ ...brief, basis: "worst case" }, one, { others: [rest] });
    if (!nominal.ok || !worst.ok) throw new Error("refused");
    expect(worst.value.unit.peakCurrent).toBeGreaterThan(nominal.value.unit.peakCurrent);
    expect(worst.value.reversal).toBeGreaterThanOrEqual(nominal.value.reversal);
    expect(worst.value.bounds.peakCurrent).toBe("value");
  }
});

test("besideShot: refused without a load, without an ESR or ESL, and for a load that is not plain", () => {
  const beside = { others: [group(5, other)] };
  expect(besideShot(briefOf({ voltage: 400 }), group(3), beside).ok).toBe(false);
  for (const key of ["esr", "esl"] as const) {
    const bare = { ...other!, [key]: undefined } as unknown as typeof other;
    expect(besideShot(brief, group(3), { others: [group(5, bare)] }).ok, key).toBe(false);
  }
  const steady = briefOf({ voltage: 400, load: { current: 5, time: 1e-3 } });
  expect(besideShot(steady, group(3), beside)).toMatchObject({ refusals: [{ place: { field: "load" } }] });
});

test("othersNominal(beside): F of all the others", () => {
  expect(othersNominal({ others: [group(3), group(5, other)] })).toBeCloseTo((3 * 470e-6 + 5 * 100e-6) / 2, 12);
});
