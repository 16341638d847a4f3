import { describe, expect, test } from "vitest";
import { cell, down, partOf, said, up, wait } from "../../src/sheet/cells.ts";

describe("cells", () => {
  test("cell(value, dimension, rounding): what is not known is a blank, nought is nought", () => {
    expect([cell(null, "voltage"), cell(undefined, "voltage"), cell(0, "voltage")]).toEqual([null, null, "0 V"]);
    expect([up(1234.51, "voltage"), down(1234.59, "voltage")]).toEqual(["1.235 kV", "1.234 kV"]);
  });

  test("wait(seconds): endless is never, unknown is a blank, else rounded up", () => {
    expect([wait(Number.POSITIVE_INFINITY), wait(null), wait(75.531)]).toEqual(["never", null, "75.54 s"]);
  });

  test("said(value, missing) has words for a blank", () => {
    expect([said("1 V"), said(null), said(null, "to be chosen")]).toEqual(["1 V", "not known", "to be chosen"]);
  });

  test("partOf(value, rating): no rating, or none above zero, is no part", () => {
    expect([partOf(1, 4), partOf(null, 4), partOf(1, null), partOf(1, 0)]).toEqual([0.25, null, null, null]);
  });
});
