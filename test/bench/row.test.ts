import { expect, test } from "vitest";
import { atLeast, atMost, type BenchRow, keptOf, TABLE_HEAD, tableLine } from "./row.ts";

const row = (value: number, promise: BenchRow["promise"]): BenchRow => ({ what: "x", value, promise });

test("keptOf(row): the limit itself keeps the promise, no figure keeps none, no promise is for scale", () => {
  expect([row(3, atMost(3)), row(3.01, atMost(3)), row(3, atLeast(3)), row(2.99, atLeast(3))].map(keptOf)).toEqual([
    "kept",
    "NOT KEPT",
    "kept",
    "NOT KEPT",
  ]);
  expect([row(Number.NaN, atMost(3)), row(Number.NaN, atLeast(3))].map(keptOf)).toEqual(["NOT KEPT", "NOT KEPT"]);
  expect(keptOf(row(Number.NaN, null))).toBe("for scale");
});

test("tableLine(group, row): three figures, the unit behind both, as many cells as the head", () => {
  expect(tableLine("tui", { what: "a frame", value: 4.5678, unit: "ms", promise: atMost(5) })).toBe(
    "| tui | a frame | 4.57 ms | at most 5 ms | kept |",
  );
  expect(tableLine("bank", row(12_345_678.9, null))).toBe("| bank | x | 1.23e+7 |  | for scale |");
  expect(tableLine("pulse", row(1.23456e-9, atMost(1e-6)))).toBe("| pulse | x | 1.23e-9 | at most 0.000001 | kept |");
  for (const line of [tableLine("a", row(1, null)), ...TABLE_HEAD.split("\n")]) expect(line.split("|")).toHaveLength(7);
});
