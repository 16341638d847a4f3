// Money: minor units against the runtime's own currency data, prices, and line costs in whole minor units.

import { describe, expect, test } from "vitest";
import { formatMoney, isCurrency, lineCost, minorDigits, parsePrice, toMajor } from "../../src/quantity/money.ts";
import fc from "../support/property.ts";

const price = (text: string, currency = "EUR", decimalComma: boolean | "never" = false): number | string => {
  const read = parsePrice(text, currency, decimalComma);
  return read.ok ? read.value : (read.refusals[0]?.code ?? "none");
};

describe("minorDigits(currency)", () => {
  // Source: [ISO4217] minor units (from memory) for the codes where the runtime's data follows everyday use and shows none.
  const CUSTOM = new Set("AFN ALL COP HUF IDR IQD IRR KPW LAK LBP MGA MMK PKR SLL SOS SYP YER".split(" "));
  test("agrees with the runtime's currency data for every code it knows, but where that follows custom and not the standard", () => {
    const apart = Intl.supportedValuesOf("currency").filter((code) => {
      const format = new Intl.NumberFormat("en", { style: "currency", currency: code });
      const digits = format.resolvedOptions().maximumFractionDigits;
      return digits !== minorDigits(code) && !(CUSTOM.has(code) && digits === 0);
    });
    expect(apart).toEqual([]);
    expect(Intl.supportedValuesOf("currency").length).toBeGreaterThan(100);
  });
  test.each([
    ["EUR", 2],
    ["USD", 2],
    ["JPY", 0],
    ["KRW", 0],
    ["KWD", 3],
    ["TND", 3],
    ["HUF", 2],
    ["IQD", 3],
    ["ISK", 0],
  ])("%s: %d", (code, digits) => expect(minorDigits(code)).toBe(digits));
});

describe("isCurrency(text)", () => {
  test.each([
    ["EUR", true],
    ["eur", false],
    ["EURO", false],
    ["", false],
    ["E1R", false],
  ])("%s: %s", (text, is) => expect(isCurrency(text)).toBe(is));
});

describe("parsePrice(text, currency)", () => {
  test.each([
    ["0", 0],
    ["3.90", 390],
    ["3,90", 390],
    [" 12 ", 1200],
    ["0.0034", 0.34],
    ["1e3", "bad-price"],
    ["-3", "bad-price"],
    ["", "bad-price"],
    ["3.9.0", "bad-price"],
    ["€3.90", "bad-price"],
    ["NaN", "bad-price"],
    ["1000000000", 1e11],
    ["1000000001", "bad-price"],
    ["1000000000.5", "bad-price"],
    ["1,500", "ambiguous-comma"],
    ["10,500", "ambiguous-comma"],
    ["05,500", "ambiguous-comma"],
    ["0,500", 50],
    ["00,500", 50],
    ["1.500", 150],
  ])("%j: %s", (text, minor) => expect(price(text)).toBe(minor));
  test("no error of binary fractions: 0.29 is 29, 1.15 is 115, 8.41 is 841, all cents to 100", () => {
    for (let cents = 0; cents <= 10000; cents++) expect(price((cents / 100).toFixed(2))).toBe(cents);
  });
  // Where commas are decimal marks a point groups thousands: 1.234 EUR for a thousand is a thousand times too cheap.
  test("1.234 among decimal commas is refused", () => expect(price("1.234", "EUR", true)).toBe("ambiguous-comma"));
  test("without a word on commas, 1.234 is 1.234 EUR and not a thousand", () =>
    expect(parsePrice("1.234", "EUR")).toEqual({ ok: true, value: 123.4 }));
  test.each([
    ["1,500", false],
    ["1.500", true],
  ])(
    "%s, decimal comma %s: the refusal names both readings, each of them is accepted, and they are a thousand apart",
    (text, comma) => {
      const read = parsePrice(text, "EUR", comma);
      const [, thousands = "", decimal = ""] =
        /^(\S+) if .* thousands, (\S+) if .* decimal mark$/.exec(read.ok ? "" : read.refusals[0]!.want) ?? [];
      expect([price(thousands, "EUR", comma), price(decimal, "EUR", comma)]).toEqual([150000, 150]);
      expect(read.ok ? "" : read.refusals[0]?.want).toContain(comma ? "point" : "comma");
    },
  );
  test("a comma in a table whose cells commas part: refused with the price written with a point", () => {
    const read = parsePrice("3,90", "EUR", "never");
    expect(read).toMatchObject({ ok: false, refusals: [{ code: "ambiguous-comma", read: '"3,90"' }] });
    const [meant = ""] = (read.ok ? "" : read.refusals[0]!.want).split(", ");
    expect(price(meant, "EUR", "never")).toBe(390);
    expect(price("12", "EUR", "never")).toBe(1200);
  });
  test.each(["ask", "2e9", "1000000001"])("%s: the refusal shows a price that is accepted", (text) => {
    const read = parsePrice(text, "EUR");
    expect(read).toMatchObject({ ok: false, refusals: [{ code: "bad-price", read: `"${text}"` }] });
    expect(price(/"(.*)"/.exec(read.ok ? "" : read.refusals[0]!.want)?.[1] ?? "")).toBe(390);
  });
  test("by the digits of its currency", () => {
    expect(price("3.90", "JPY")).toBe(3.9);
    expect(price("3.9", "KWD")).toBe(3900);
  });
});

describe("lineCost(quantity, unitPrice)", () => {
  test("whole minor units, halves up", () => {
    expect(lineCost(0, 390)).toBe(0);
    expect(lineCost(3, 390)).toBe(1170);
    expect(lineCost(1, 0.5)).toBe(1);
    expect(lineCost(1, 0.49)).toBe(0);
    expect(lineCost(100, 0.34)).toBe(34);
    expect(lineCost(5, 0.1)).toBe(1);
  });
  test("rising in quantity and in price", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1e5 }), fc.integer({ min: 0, max: 1e6 }), (q, tenths) => {
        expect(lineCost(q + 1, tenths / 10)).toBeGreaterThanOrEqual(lineCost(q, tenths / 10));
      }),
      { numRuns: 500, seed: 1 },
    );
  });
});

describe("toMajor, formatMoney", () => {
  test("1234 minor units: 12.34 EUR, 1234 JPY, 1.234 KWD", () => {
    expect([toMajor(1234, "EUR"), toMajor(1234, "JPY"), toMajor(1234, "KWD")]).toEqual([12.34, 1234, 1.234]);
    expect(["EUR", "JPY", "KWD"].map((c) => formatMoney(1234, c))).toEqual(["12.34 EUR", "1234 JPY", "1.234 KWD"]);
  });
  test("no price is not zero", () => {
    expect(formatMoney(null, "EUR")).toBe("no price");
    expect(formatMoney(undefined, "EUR")).toBe("no price");
    expect(formatMoney(Number.POSITIVE_INFINITY, "EUR")).toBe("no price");
    expect(formatMoney(0, "EUR")).toBe("0.00 EUR");
  });
  test("what is printed reads back as the same money", () => {
    for (const c of ["EUR", "JPY", "KWD"])
      for (const minor of [0, 1, 99, 100, 123456]) expect(price(formatMoney(minor, c).split(" ")[0]!, c)).toBe(minor);
  });
});
