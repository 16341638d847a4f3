import { describe, expect, test } from "vitest";
import { gather, likely, worstOf } from "../../src/place/diagnoseAnswer.ts";
import type { FaultKind } from "../../src/place/diagnoseFaults.ts";
import { chargerOn } from "../../src/place/diagnoseModel.ts";
import type { Weighed } from "../../src/place/diagnoseWeigh.ts";

const weighed = (kind: FaultKind, position: number, chance: number, size = 1): Weighed => ({
  hypothesis: { kind, position, odds: 1, sizes: { kind: "none" } },
  size,
  weight: Math.log(chance),
  excess: 0,
});
const list = [
  weighed("resistor wrong value", 1, 0.2, 0.5),
  weighed("resistor wrong value", 1, 0.3, 0.1),
  weighed("leaky", 1, 0.4, 3),
  weighed("leaky", 0, 0.001),
];

describe("gather(weighed, chance)", () => {
  test("one suspect for a kind at a place, with the size of the likelier; the hopeless are left out", () => {
    expect(
      gather(list, Math.exp).map(({ kind, likelihood, size }) => [kind, Number(likelihood.toFixed(6)), size]),
    ).toEqual([
      ["resistor wrong value", 0.5, 0.1],
      ["leaky", 0.4, 3],
    ]);
  });
});

describe("likely(weighed, chance, sound)", () => {
  test("likeliest first, a sound bank among them", () => {
    const kinds = likely(list, Math.exp, { chance: 0.35 }).map((e) => e.hypothesis?.kind ?? "sound");
    expect(kinds).toEqual(["leaky", "sound", "resistor wrong value", "resistor wrong value"]);
  });
});

describe("worstOf(explanations, step)", () => {
  test("the worst stage of the worst explanation, over the whole hold", () => {
    const stages = [1, 2].map(() => ({ capacitance: 1e-2, conductance: 1e-6, resistance: 50e3 }));
    const step = { stages, course: chargerOn, bank: 200 };
    expect(worstOf([{ hypothesis: null, size: 1 }], { ...step, seconds: 100 }).worst).toBeCloseTo(100, 6);
    const open = {
      hypothesis: { kind: "resistor open", position: 1, odds: 1, sizes: { kind: "none" } },
      size: 1,
    } as const;
    const held = worstOf([{ hypothesis: null, size: 1 }, open], { ...step, seconds: 5000 });
    expect(held.position).toBe(1);
    expect(held.worst).toBeGreaterThan(150);
  });
});
