import { expect, test } from "vitest";
import { footerOf, titleOf } from "../../src/sheet/heading.ts";
import { sheetInput } from "../support/sheet.ts";

test("titleOf(input): the brief's, or a plain one", () => {
  expect([titleOf(sheetInput()), titleOf(sheetInput({ brief: { title: "Magnet" } }))]).toEqual([
    "Capacitor bank",
    "Magnet",
  ]);
});

test("footerOf(input): the cautions of every page alone, in their own order", () => {
  expect(footerOf(sheetInput())).toEqual([
    "A charged bank can kill.",
    "This is a calculation.",
    "Follow the codes in force.",
  ]);
});
