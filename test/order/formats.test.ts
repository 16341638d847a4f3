import { expect, test } from "vitest";
import { BILL_FORMATS, billOf, billText } from "../../src/order/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";

const brief = briefOf();
const bill = billOf({ layout: bankOf(), unit: UNIT, families: FAMILIES, brief, currency: "EUR", cautions: ["c"] });

test("billText(bill, format): each format ends in a line break, opens as it should, and is the same twice", () => {
  const opens = { csv: "item,", json: "{", md: "# ", html: "<!DOCTYPE html>" } as const;
  for (const format of BILL_FORMATS) {
    const text = billText(bill, format);
    expect(text.startsWith(opens[format])).toBe(true);
    expect(text.endsWith("\n")).toBe(true);
    expect(billText(bill, format)).toBe(text);
  }
});

test("billText(bill, json) has nothing hidden in it", () => {
  const odd = { ...bill, layout: "\u202ea\u009b" };
  expect(billText(odd, "json")).toContain('"\\u202ea\\u009b"');
});

test("billText(bill, json) reads back to the bill", () => {
  expect(JSON.parse(billText(bill, "json"))).toEqual(bill);
});
