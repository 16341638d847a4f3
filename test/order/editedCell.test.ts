import { describe, expect, test } from "vitest";
import { BILL_COLUMNS, type BillColumn } from "../../src/order/columns.ts";
import { readEditedCell } from "../../src/order/editedCell.ts";

const column = (heading: string): BillColumn => BILL_COLUMNS.find((one) => one.heading === heading) as BillColumn;
const value = (text: string, heading: string, comma: boolean | "never" = "never") => {
  const read = readEditedCell(text, column(heading), comma);
  return read.ok ? read.value : read.refusals[0]?.code;
};

describe("readEditedCell(text, column, comma)", () => {
  test("blank and the words for open are null, not nought", () => {
    for (const heading of ["quantity needed", "on hand", "pack", "unit price"])
      expect(
        ["", "to be chosen", "no price"].map((text) => value(text, heading)),
        heading,
      ).toEqual([null, null, null]);
    expect(value("", "currency")).toBeNull();
  });

  test("what is no number, below nought, absurd or half a pack is refused", () => {
    expect(["-1", "1e3", "2e9"].map((text) => value(text, "quantity needed"))).toEqual(Array(3).fill("out-of-range"));
    expect(["x", "NaN"].map((text) => value(text, "quantity needed"))).toEqual(Array(2).fill("not-a-number"));
    const minus = readEditedCell("-5", column("quantity needed"), false);
    expect(minus.ok ? null : minus.refusals[0]?.want).toMatch(/from 0 .* no sign, no exponent/);
    const price = readEditedCell("1e3", column("unit price"), false);
    expect(price.ok ? null : price.refusals[0]?.want).toMatch(/without an exponent/);
    expect(["0", "1.5", "ten"].map((text) => value(text, "pack"))).toEqual(Array(3).fill("bad-count"));
    expect(["12 EUR", "-3", "free"].map((text) => value(text, "unit price"))).toEqual(Array(3).fill("bad-price"));
    expect(["eur", "€", "EURO"].map((text) => value(text, "currency"))).toEqual(Array(3).fill("bad-currency"));
    expect(value("x".repeat(1001), "note")).toBe("too-long");
  });

  test("decimal commas: never in a file separated by them, else as the file has them, and never by guess", () => {
    expect(value("0,25", "unit price")).toBe("ambiguous-comma");
    expect(value("0,25", "unit price", true)).toBe(0.25);
    expect(value("1.500", "unit price", true)).toBe("ambiguous-comma");
    expect(value("1,500", "quantity needed", false)).toBe("ambiguous-comma");
  });

  test("a price is the very double that is written; counts may be lengths", () => {
    for (const text of ["0.1", "0.0034", "58", "58.00", "19.99"]) expect(value(text, "unit price")).toBe(Number(text));
    expect(value("12.5", "quantity needed")).toBe(12.5);
    expect(value("50", "pack")).toBe(50);
  });

  test("text is kept, with what cannot be seen written out", () => {
    expect(value("M6\u202e", "value")).toBe("M6\\u{202e}");
  });
});
