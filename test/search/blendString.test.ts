// One kind of string: its series count, its reasons, the cheaper ties, and what so many cost.
import { describe, expect, test } from "vitest";
import { resistorsOf, type StringType, stringsCost, stringType } from "../../src/search/blendString.ts";
import { partsOf, priced, termsOf } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";
import { slowBalance } from "../support/slowBank.ts";

const typeOf = (row: object, asked: object = {}, lineCost = 0): StringType => {
  const type = stringType(partsOf({ ...row })[0]!, termsOf(briefOf({ voltage: 1200, ...asked }), priced, lineCost));
  if ("reason" in type) throw new Error(type.reason);
  return type;
};
const reason = (row: object, asked: object = {}) => {
  const type = stringType(partsOf({ ...row })[0]!, termsOf(briefOf({ voltage: 1200, ...asked }), priced));
  return "reason" in type ? type : null;
};

describe("stringType(unit, terms)", () => {
  test("one in series when a unit bears it all, without resistors", () =>
    expect(typeOf({}, { voltage: 405 })).toMatchObject({ series: 1, elements: [] }));
  test("worked number A1: 1350 V at 20 % and full rating takes four of 450 V while charging, 1351 V five", () => {
    const row = { tolerance: 20, leakage: 0.001 };
    // Resistors of 5 % share worse than that leaves room for at exactly 1350 V only if their spread exceeded the units'.
    expect(typeOf(row, { voltage: 1350, derating: 1 }).series).toBe(4);
    expect(typeOf(row, { voltage: 1351, derating: 1 }).series).toBe(5);
  });
  test("never fewer than charging asks, and the resistor it needs is there", () => {
    const { series, elements } = typeOf({});
    expect(series).toBe(4);
    expect(elements[0]).toBeGreaterThan(0);
  });
  test("what cannot be vouched for says why", () => {
    expect(reason({ tolerance: "" })?.reason).toBe("tolerance-unknown");
    expect(reason({ leakage: "" })?.reason).toBe("leakage-unknown");
    expect(reason({ voltage: 10 })).toMatchObject({ reason: "series-limit", limit: 40 });
    // A leakage that no resistor of the family can swamp within its watts and least value.
    expect(reason({ leakage: 9e7 })?.reason).toBe("balance");
  });
  test("one in series needs no tolerance where the nominal counts", () => {
    expect(reason({ tolerance: "" }, { voltage: 400, basis: "nominal" })).toBeNull();
    expect(reason({ tolerance: "" }, { voltage: 400 })?.reason).toBe("tolerance-unknown");
  });
});

describe("resistorsOf(type, strings)", () => {
  test("one string and single units are `strings`", () => {
    expect(resistorsOf(typeOf({}), 1).ties).toBe("strings");
    expect(resistorsOf(typeOf({}, { voltage: 400 }), 7)).toEqual({ ties: "strings", cost: 0, from: null });
  });
  test("the cheaper of one a unit and one a stage, each by the slow rule", () => {
    const type = typeOf({ leakage: 200 });
    for (let x = 2; x <= 12; x += 1) {
      const elements = (m: number) =>
        slowBalance(
          {
            voltage: 1200,
            series: 4,
            sharing: m,
            spread: 0.05,
            leakage: 2e-4,
            capacitance: 1e-4,
            low: 0.1,
            high: 0.1,
            hold: Infinity,
          },
          405,
          priced[0]!,
        )!.elements;
      const cents = (count: number) => Math.ceil(count / 10) * 100;
      const apart = cents(4 * x * elements(1));
      const tied = cents(4 * elements(x));
      expect(resistorsOf(type, x), `${x}`).toMatchObject(
        tied <= apart ? { ties: "cross-tied", cost: tied } : { ties: "strings", cost: apart },
      );
    }
  });
});

describe("stringsCost(type, strings)", () => {
  test("units by their purchase, the line once, nothing for what is on hand", () => {
    const type = typeOf({ "on hand": 4, pack: 3, price: 2 }, { voltage: 400 }, 50);
    expect([0, 1, 4, 5, 7, 8].map((x) => stringsCost(type, x))).toEqual([0, 0, 0, 650, 650, 1250]);
  });
  test("spares are bought with every part", () =>
    expect(stringsCost(typeOf({ price: 2 }, { voltage: 400, spares: 3 }), 1)).toBe(800));
  test("null beyond what can be had or has a price", () => {
    expect(stringsCost(typeOf({ available: 5 }, { voltage: 400 }), 6)).toBeNull();
    expect(stringsCost(typeOf({ price: "", "on hand": 2 }, { voltage: 400 }), 2)).toBe(0);
    expect(stringsCost(typeOf({ price: "", "on hand": 2 }, { voltage: 400 }), 3)).toBeNull();
  });
});
