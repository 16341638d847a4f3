// Scaling: limits of 1, no zeros, and a refusal of what cannot be scaled.
import { expect, test } from "vitest";
import { scaleProgram } from "../../../src/search/blend/programScale.ts";

const open = Number.POSITIVE_INFINITY;
const column = (whole: boolean, cost = 1, most = open) => ({ cost, most, whole });

test("scaleProgram divides a row by its limit and turns every row to >=", () => {
  const scaled = scaleProgram({ columns: [column(true)], rows: [{ terms: [[0, 1e-9]], least: 5e-9, most: 8e-9 }] });
  if (scaled === null || scaled === "scale") throw new Error("not scaled");
  expect(scaled.rows.map(({ terms }) => terms[0]![1])).toEqual([expect.closeTo(0.2, 12), expect.closeTo(-0.125, 12)]);
  expect(scaled.rows.map(({ limit }) => limit)).toEqual([expect.closeTo(1, 12), expect.closeTo(-1, 12)]);
});

test("scaleProgram stretches fractional columns, never whole ones", () => {
  const row = { terms: [[0, 4e3] as const], least: -open, most: 1 };
  const scaled = (whole: boolean) => scaleProgram({ columns: [column(whole)], rows: [row] });
  expect(scaled(false)).toMatchObject({ stretch: [4e3] });
  expect(scaled(true)).toMatchObject({ stretch: [1] });
});

test("scaleProgram drops zeros; a row without terms is kept or breaks the whole", () => {
  const empty = (least: number, most: number) =>
    scaleProgram({ columns: [column(true)], rows: [{ terms: [[0, 0]], least, most }] });
  expect(empty(-open, 4)).toMatchObject({ rows: [] });
  expect(empty(0, 0)).toMatchObject({ rows: [] });
  expect(empty(1, open)).toBeNull();
  expect(empty(-open, -1)).toBeNull();
});

test("scaleProgram refuses terms that an absolute 1e-8 would drown", () => {
  const rows = [{ terms: [[0, 1] as const, [1, 1e-9] as const], least: 1, most: open }];
  expect(scaleProgram({ columns: [column(true), column(true)], rows })).toBe("scale");
});
