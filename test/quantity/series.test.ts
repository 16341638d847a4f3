// Preferred values against the tables of IEC 60063 as published, the rounding rule, and its known exceptions.
import { describe, expect, test } from "vitest";
import {
  lastAtMost,
  preferredAtLeast,
  preferredAtMost,
  preferredNearest,
  SERIES,
  SERIES_NAMES,
  seriesBetween,
} from "../../src/quantity/series.ts";
import { chance } from "../support/random.ts";

const numbers = (text: string): readonly number[] => text.split(" ").map(Number);

/** Source: [IEC60063] E12, E24, E48 and E96 as printed in published copies. */
const PUBLISHED = {
  E3: numbers("10 22 47"),
  E6: numbers("10 15 22 33 47 68"),
  E12: numbers("10 12 15 18 22 27 33 39 47 56 68 82"),
  E24: numbers("10 11 12 13 15 16 18 20 22 24 27 30 33 36 39 43 47 51 56 62 68 75 82 91"),
  E48: numbers(
    "100 105 110 115 121 127 133 140 147 154 162 169 178 187 196 205 215 226 237 249 261 274 287 301 316 332 348 365 383 402 422 442 464 487 511 536 562 590 619 649 681 715 750 787 825 866 909 953",
  ),
  E96: numbers(
    "100 102 105 107 110 113 115 118 121 124 127 130 133 137 140 143 147 150 154 158 162 165 169 174 178 182 187 191 196 200 205 210 215 221 226 232 237 243 249 255 261 267 274 280 287 294 301 309 316 324 332 340 348 357 365 374 383 392 402 412 422 432 442 453 464 475 487 499 511 523 536 549 562 576 590 604 619 634 649 665 681 698 715 732 750 768 787 806 825 845 866 887 909 931 953 976",
  ),
} as const;

describe("SERIES against the published tables and the rule 10^(i/N)", () => {
  test.each(Object.entries(PUBLISHED))("%s is the table", (name, table) => expect(SERIES[name as "E3"]).toEqual(table));

  test("the rule holds but for the known exceptions: eight in E24, five in E12, two in E6, one in E3, none in E48 and E96, 920 in E192", () => {
    const odd = (name: (typeof SERIES_NAMES)[number], digits: number): readonly number[] => {
      const table = SERIES[name];
      return table.filter((value, i) => value !== Math.round(10 ** (i / table.length + digits)));
    };
    expect(odd("E24", 1)).toEqual([27, 30, 33, 36, 39, 43, 47, 82]);
    expect(odd("E12", 1)).toEqual([27, 33, 39, 47, 82]);
    expect(odd("E6", 1)).toEqual([33, 47]);
    expect(odd("E3", 1)).toEqual([47]);
    expect(odd("E48", 2)).toEqual([]);
    expect(odd("E96", 2)).toEqual([]);
    expect(odd("E192", 2)).toEqual([920]);
  });

  test("only 10, 11, 13, 15, 20 and 75 are in E24 and in E96", () =>
    expect(SERIES.E24.filter((v) => SERIES.E96.includes(v * 10))).toEqual([10, 11, 13, 15, 20, 75]));
  test("each table has as many values as its name says", () => {
    for (const name of SERIES_NAMES) expect(SERIES[name].length).toBe(Number(name.slice(1)));
  });
});

describe("lastAtMost(values, x)", () => {
  test("none, first, last, between, exact, and exact within 1e-9", () => {
    expect(lastAtMost([], 5)).toBe(-1);
    expect(lastAtMost([10, 20, 30], 9)).toBe(-1);
    expect(lastAtMost([10, 20, 30], 10)).toBe(0);
    expect(lastAtMost([10, 20, 30], 29)).toBe(1);
    expect(lastAtMost([10, 20, 30], 1e9)).toBe(2);
    expect(lastAtMost([10, 20, 30], 20 * (1 - 1e-10))).toBe(1);
    expect(lastAtMost([10, 20, 30], 20 * (1 - 1e-8))).toBe(0);
    expect(lastAtMost([10, 20, 30], Number.POSITIVE_INFINITY)).toBe(2);
    expect(lastAtMost([10, 20, 30], Number.NaN)).toBe(-1);
  });
});

describe("preferredAtMost, preferredAtLeast, preferredNearest", () => {
  test("worked picks: E24 at or below 25062.6566 ohm is 24 kohm; E96 at or below 58339.1673 ohm is 57.6 kohm", () => {
    expect(preferredAtMost("E24", 25062.6566)).toBe(24000);
    expect(preferredAtMost("E96", 58339.1673)).toBe(57600);
  });
  test.each([
    ["E3", 4.699, 2.2, 4.7],
    ["E3", 9.99, 4.7, 10],
    ["E24", 0.1, 0.1, 0.1],
    ["E24", 0.0999, 0.091, 0.1],
    ["E192", 9.19, 9.09, 9.2],
    ["E24", 1e-12, 1e-12, 1e-12],
    ["E24", 9.2e14, 9.1e14, 1e15],
  ] as const)("%s, %d: %d and %d", (name, x, below, above) => {
    expect(preferredAtMost(name, x)).toBe(below);
    expect(preferredAtLeast(name, x)).toBe(above);
  });
  test("nearest is by ratio, the lower of two as near", () => {
    expect(preferredNearest("E3", 15)).toBe(22);
    expect(preferredNearest("E3", 14.8)).toBe(10);
    expect(preferredNearest("E24", 4700)).toBe(4700);
  });
  test("no value of the series lies between x and the pick, 2000 random x over 20 decades", () => {
    const c = chance(51);
    for (let i = 0; i < 2000; i++) {
      const name = c.pick(SERIES_NAMES);
      const x = 10 ** c.between(-9, 11);
      const [below, above] = [preferredAtMost(name, x), preferredAtLeast(name, x)];
      expect(below).toBeLessThanOrEqual(x * (1 + 1e-9));
      expect(above).toBeGreaterThanOrEqual(x * (1 - 1e-9));
      expect(seriesBetween(name, below * 1.0001, above / 1.0001)).toEqual([]);
    }
  });
});

describe("seriesBetween(name, low, high)", () => {
  test("ends included, rising, no value twice", () => {
    expect(seriesBetween("E3", 10, 100)).toEqual([10, 22, 47, 100]);
    expect(seriesBetween("E3", 11, 21)).toEqual([]);
    expect(seriesBetween("E3", 22, 22)).toEqual([22]);
    expect(seriesBetween("E3", 5, 10 * (1 - 1e-10))).toEqual([10]);
    expect(seriesBetween("E96", 1, 1.02)).toEqual([1, 1.02]);
    const all = seriesBetween("E24", 1, 1e7);
    expect(all.length).toBe(169);
    expect(all.every((v, i) => i === 0 || v > all[i - 1]!)).toBe(true);
  });
  test("values are the doubles nearest to what is printed on the part", () =>
    expect(seriesBetween("E96", 0.1, 0.1021)).toEqual([0.1, 0.102]));
});
