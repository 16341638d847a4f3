// The currency of a plan and prices brought into it.
import { describe, expect, test } from "vitest";
import { type Brief, readBrief } from "../../src/search/brief.ts";
import { planCurrency, pricedIn } from "../../src/search/currency.ts";

const brief = (over: object = {}): Brief => {
  const read = readBrief({ energy: 1, voltage: 400, ripple: 1, ...over });
  if (!read.ok) throw new Error(JSON.stringify(read));
  return read.value;
};

describe("planCurrency(brief, parts, families)", () => {
  test("nothing priced: no currency", () => expect(planCurrency(brief(), [{}], [])).toEqual({ ok: true, value: null }));
  test("prices without a currency: EUR", () =>
    expect(planCurrency(brief(), [{ price: 100 }], [])).toEqual({ ok: true, value: "EUR" }));
  test("the only one there is", () =>
    expect(planCurrency(brief(), [{ price: 100, currency: "CHF" }], [{ price: 1, currency: "CHF" }])).toEqual({
      ok: true,
      value: "CHF",
    }));
  test("two without a rate are refused, the resistors' counted", () => {
    const read = planCurrency(brief(), [{ price: 100, currency: "CHF" }], [{ price: 1, currency: "USD" }]);
    expect(read.ok ? null : read.refusals.map((r) => r.code)).toEqual(["two-currencies"]);
  });
  test("a part without a price does not bring its currency in", () =>
    expect(planCurrency(brief(), [{ currency: "USD" }, { price: 1, currency: "EUR" }], []).ok).toBe(true));
  test("with a rate they are one", () =>
    expect(
      planCurrency(brief({ currency: "EUR", exchange: { USD: 0.92 } }), [{ price: 1, currency: "USD" }], []),
    ).toEqual({ ok: true, value: "EUR" }));
});

describe("pricedIn(things, currency, brief): minor units to minor units", () => {
  const rates = brief({ currency: "EUR", exchange: { USD: 0.92, JPY: 0.006, KWD: 3 } });
  test("already in it: the very same things", () => {
    const things = [{ price: 100, currency: "EUR" }, {}];
    expect(pricedIn(things, "EUR", rates)).toBe(things);
  });
  test.each([
    ["USD", 92],
    ["JPY", 60],
    ["KWD", 30],
  ])(
    "0.92 EUR a dollar; 0.006 EUR a yen is 0.6 cents; 3 EUR a dinar is 0.3 cents a fils: 100 of %s give %d",
    (code, cents) => {
      const [thing] = pricedIn([{ price: 100, currency: code, priceBreaks: [{ from: 10, price: 50 }] }], "EUR", rates);
      expect(thing?.price).toBeCloseTo(cents, 9);
      expect(thing?.priceBreaks?.[0]?.price).toBeCloseTo(cents / 2, 9);
      expect(thing?.currency).toBe("EUR");
    },
  );
  test("a price without a currency is read in the plan's: 3.90 is 4 yen, not 390", () =>
    expect(pricedIn([{ price: 390 }], "JPY", brief({ currency: "JPY" }))[0]?.price).toBeCloseTo(3.9, 9));
});
