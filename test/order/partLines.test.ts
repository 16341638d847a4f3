import { describe, expect, test } from "vitest";
import { resistorLines, unitLines } from "../../src/order/partLines.ts";
import { bankOf, briefOf, DEFAULT_FAMILY, FAMILIES, UNIT } from "../support/bank.ts";

describe("unitLines(layout, unit, spares)", () => {
  test("sixteen units, three on hand: thirteen short, two packs of ten, seven over", () => {
    const [line, ...rest] = unitLines(bankOf(), UNIT, 0);
    expect(rest).toEqual([]);
    expect(line).toMatchObject({ needed: 16, onHand: 3, toBuy: 20, packs: 2, surplus: 7, unitPrice: 2.5 });
    expect(line).toMatchObject({ consumed: 32.5, purchase: 50, currency: "EUR", state: "priced", orderCode: "X-1" });
  });

  test("spares are a line of the same purchase, and both costs add up to it", () => {
    const layout = bankOf({ brief: briefOf({ spares: 5 }) });
    const [units, spares] = unitLines(layout, UNIT, 5);
    expect(spares).toMatchObject({ line: "spares", needed: 5, onHand: 0, toBuy: 5, packs: null, purchase: 12.5 });
    expect(units?.note).toMatch(/of units and spares together/);
    expect((units?.purchase ?? 0) + (spares?.purchase ?? 0)).toBe((layout.purchase.capacitors?.cost ?? 0) / 100);
    expect((units?.toBuy ?? 0) + (spares?.toBuy ?? 0)).toBe(20);
  });

  test("every line keeps its own sum: to buy = needed - on hand + surplus", () => {
    for (const spares of [0, 1, 4, 7])
      for (const onHand of [0, 3, 16, 18, 40]) {
        const unit = { ...UNIT, onHand };
        const layout = bankOf({ unit, brief: briefOf({ spares }) });
        for (const line of unitLines(layout, unit, spares))
          expect(line.toBuy, `${spares} ${onHand}`).toBe((line.needed ?? 0) - (line.onHand ?? 0) + (line.surplus ?? 0));
      }
  });

  test("all on hand costs nothing, and that is a price", () => {
    const unit = { ...UNIT, onHand: 16 };
    expect(unitLines(bankOf({ unit }), unit, 0)[0]).toMatchObject({
      toBuy: 0,
      purchase: 0,
      consumed: 0,
      state: "priced",
    });
  });

  test("no price is marked, never zero", () => {
    const { price: _price, ...unit } = UNIT;
    const line = unitLines(bankOf({ unit }), unit, 0)[0];
    expect(line).toMatchObject({ purchase: null, consumed: null, unitPrice: null, state: "no price", toBuy: 20 });
  });

  test("what cannot be had says so", () => {
    const unit = { ...UNIT, available: 5 };
    const lines = unitLines(bankOf({ unit, brief: briefOf({ spares: 2 }) }), unit, 2);
    expect(lines).toHaveLength(2);
    for (const line of lines) expect(line).toMatchObject({ toBuy: null, purchase: null, state: "no price" });
    expect(lines[0]?.note).toMatch(/Not enough can be had/);
  });
});

describe("resistorLines(layout, family)", () => {
  test("none without balancing", () => {
    expect(resistorLines(bankOf({ balance: { kind: "none" } }), null)).toEqual([]);
  });

  test("positions times elements, by value, priced in packs of ten", () => {
    const layout = bankOf();
    const [line] = resistorLines(layout, FAMILIES[0] ?? null);
    const needed = (layout.balance?.positions ?? 0) * (layout.balance?.elements ?? 0);
    expect(layout.balance?.positions).toBe(8);
    expect(line).toMatchObject({ needed, toBuy: Math.ceil(needed / 10) * 10, unitPrice: 0.1, state: "priced" });
    expect(line?.rating).toBe("2 W, 500 V, +-5 %");
    expect(line?.note).not.toMatch(/preferred/);
  });

  test("the assumed family is to be chosen, not bought", () => {
    const layout = bankOf({ families: [DEFAULT_FAMILY] });
    const [line] = resistorLines(layout, DEFAULT_FAMILY);
    expect(line).toMatchObject({ state: "to be chosen", purchase: null });
    expect(line?.note).toMatch(/assumed/);
  });

  test("a fixed value that no family makes is told", () => {
    const layout = bankOf({ balance: { kind: "fixed", resistance: 23456, tolerance: 0.05 } });
    expect(resistorLines(layout, FAMILIES[0] ?? null)[0]?.note).toMatch(/No preferred value/);
  });
});
