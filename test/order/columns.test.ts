import { describe, expect, test } from "vitest";
import { toBeChosen } from "../../src/order/chosenLine.ts";
import { cellText, columnsOf, isOpen, plainNumber } from "../../src/order/columns.ts";
import { BILL_COLUMNS } from "../../src/order/index.ts";

const line = toBeChosen({ item: "lug", line: "lugs", needed: null, note: "" });
const column = (heading: string) => BILL_COLUMNS.find((one) => one.heading === heading) ?? BILL_COLUMNS[0]!;

describe("columns of a bill", () => {
  test("are those that were asked for, in order", () => {
    expect(BILL_COLUMNS.map((one) => one.heading).join(",")).toBe(
      "item,line,value,rating,quantity needed,on hand,to buy,pack,packs,surplus,unit price,consumed cost,purchase cost,currency,supplier,order code,alternates,status,note,state",
    );
  });

  test("cellText(line, column): missing prices and quantities are marked, other unknowns blank", () => {
    expect(cellText(line, column("purchase cost"))).toBe("to be chosen");
    expect(cellText({ ...line, state: "no price" }, column("purchase cost"))).toBe("no price");
    expect(cellText(line, column("quantity needed"))).toBe("to be chosen");
    expect(cellText(line, column("on hand"))).toBe("");
    expect(cellText({ ...line, purchase: 0 }, column("purchase cost"))).toBe("0");
  });

  test("plainNumber(value): never an exponent", () => {
    expect([1e-7, 1.5, 0, 123456789].map(plainNumber)).toEqual(["0.0000001", "1.5", "0", "123456789"]);
  });

  test("columnsOf(bill): the builder's own headings follow, a line without them is blank there", () => {
    const [owner] = columnsOf({ extraHeadings: ["who buys"] }).slice(BILL_COLUMNS.length);
    expect([owner?.heading, owner?.cell({ ...line, extra: ["me"] }), owner?.cell(line)]).toEqual([
      "who buys",
      "me",
      "",
    ]);
    expect(columnsOf({})).toHaveLength(BILL_COLUMNS.length);
  });

  test("isOpen(text): blank and the two words, nothing else", () => {
    expect(["", "to be chosen", "no price", "0", " "].map(isOpen)).toEqual([true, true, true, false, false]);
  });
});
