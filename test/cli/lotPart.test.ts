// Which part a lot is of: the flag, the file's own column, the only part there is; refused where none of them tells.
import { describe, expect, test } from "vitest";
import { lotPart } from "../../src/cli/lotPart.ts";
import type { MeasuredInput } from "../../src/cli/measuredInput.ts";
import type { Stock } from "../../src/cli/stock.ts";
import { codesOf, got } from "../pulse/near.ts";
import { labParts } from "../support/labParts.ts";

const [one] = labParts;
const [a, b] = [
  { ...one!, part: "a" },
  { ...one!, part: "b" },
];
const stock = (...parts: readonly (typeof a)[]) => ({ parts }) as unknown as Stock;
const lot = (...parts: readonly (string | undefined)[]): MeasuredInput => ({
  file: "lot.csv",
  units: parts.map((part, i) => ({
    serial: `u${i}`,
    capacitance: 1e-3,
    ...(part === undefined ? {} : { part }),
  })) as never,
  faults: [],
  notes: [],
});

describe("lotPart(measured, flag, stock)", () => {
  test("the flag beats the file, the file beats being the only one", () => {
    expect(got(lotPart(lot("b", "b"), "a", stock(a, b))).part).toBe("a");
    expect(got(lotPart(lot("b", undefined), undefined, stock(a, b))).part).toBe("b");
    expect(got(lotPart(lot(undefined, undefined), undefined, stock(a))).part).toBe("a");
  });
  test("two parts named, none named among two, one unit, a part that nobody has: refused", () => {
    expect(codesOf(lotPart(lot("a", "b"), undefined, stock(a, b)))).toEqual(["bad-value"]);
    expect(codesOf(lotPart(lot(undefined, undefined), undefined, stock(a, b)))).toEqual(["bad-value"]);
    expect(codesOf(lotPart(lot("a"), undefined, stock(a)))).toEqual(["bad-value"]);
    expect(lotPart(lot("c", "c"), undefined, stock(a)).ok).toBe(false);
  });
});
