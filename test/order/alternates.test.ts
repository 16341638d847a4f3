import { describe, expect, test } from "vitest";
import { alternatesFor } from "../../src/order/alternates.ts";
import { billOf } from "../../src/order/index.ts";
import { assess } from "../../src/search/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";

// 300 J of the 400 J that eight 2 x 1 mF at -20 % give at 2 kV, so that nothing fails.
const brief = briefOf({ energy: "300 J" });
const layout = bankOf({ brief });
const input = { layout, unit: UNIT, brief, families: FAMILIES, currency: "EUR" };
const part = (name: string, more: object) => ({ ...UNIT, part: name, onHand: 0, ...more });

describe("alternatesFor(input)", () => {
  test("none without other parts, and never the part itself", () => {
    expect(alternatesFor({ ...input, parts: [] })).toEqual({});
    expect(alternatesFor({ ...input, parts: [UNIT] })).toEqual({});
  });

  test("too small, too low in volts, not to be had, of another polarity, or with more unknown: not named", () => {
    const { leakage: _leakage, ...dry } = part("unknown-tolerance", { tolerance: undefined });
    const parts = [
      part("small", { capacitance: 5e-4 }),
      part("low", { voltage: 300 }),
      part("none-left", { available: 3 }),
      part("film", { polarised: false }),
      dry,
    ];
    expect(alternatesFor({ ...input, parts })).toEqual({});
  });

  test("the cheapest three of those that pass, with what they cost; units and spares alike", () => {
    const parts = [4, 1, 3, 2].map((n) => part(`alt-${n}`, { price: 200 + n }));
    const found = alternatesFor({ ...input, parts });
    expect(found.units).toEqual(["alt-1 (40.20 EUR)", "alt-2 (40.40 EUR)", "alt-3 (40.60 EUR)"]);
    expect(found.spares).toEqual(found.units);
    const bill = billOf({ ...input, cautions: [], alternates: found });
    expect(bill.lines[0]?.alternates).toBe("alt-1 (40.20 EUR); alt-2 (40.40 EUR); alt-3 (40.60 EUR)");
  });

  test("each one named holds where it is put: assessed anew with the same resistors nothing fails", () => {
    const parts = Array.from({ length: 40 }, (_, i) =>
      part(`p${i}`, { capacitance: 8e-4 + i * 2e-5, voltage: 340 + i * 5, leakage: 3e-6 * (1 + i) }),
    );
    const { balance } = layout;
    if (balance === null) throw new Error("the bank has resistors");
    const names = (alternatesFor({ ...input, parts }).units ?? []).map((text) => text.replace(/ \(.*/, ""));
    expect(names.length).toBe(3);
    for (const name of names) {
      const unit = parts.find((one) => one.part === name) ?? UNIT;
      const wish = { kind: "fixed", resistance: balance.resistance, tolerance: balance.tolerance } as const;
      const result = assess({ ...input, unit, layout: { ...layout, part: name }, balance: wish });
      expect(result.findings.filter(({ verdict }) => verdict === "fail")).toEqual([]);
    }
  });

  test("another family that makes the same value as strong is named; a weaker one is not", () => {
    const [family] = FAMILIES;
    if (family === undefined) throw new Error("there is a family");
    const strong = { ...family, family: "strong", power: 5 };
    const weak = { ...family, family: "weak", power: 0.05 };
    expect(
      alternatesFor({ ...input, parts: [], families: [...FAMILIES, weak, strong] })["balancing resistors"],
    ).toEqual([expect.stringMatching(/^strong \(/)]);
  });
});
