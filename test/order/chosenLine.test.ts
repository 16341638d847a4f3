import { expect, test } from "vitest";
import { toBeChosen } from "../../src/order/chosenLine.ts";

test("toBeChosen(wish): what is not said is to be chosen, and no price is ever nought", () => {
  const line = toBeChosen({ item: "lug", line: "lugs", needed: 4, note: "n" });
  expect(line).toMatchObject({
    value: "to be chosen",
    rating: "to be chosen",
    needed: 4,
    toBuy: 4,
    state: "to be chosen",
  });
  expect([line.unitPrice, line.consumed, line.purchase, line.currency]).toEqual([null, null, null, null]);
  expect(toBeChosen({ item: "x", line: "screen", needed: null, note: "" }).toBuy).toBeNull();
});
