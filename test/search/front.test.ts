// The front against all pairs, on tables with ties, unknowns, copies and one column that decides.
import { describe, expect, test } from "vitest";
import { frontRows } from "../../src/search/front.ts";
import { type LayoutTable, newTable, pushRow } from "../../src/search/table.ts";
import { chance } from "../support/random.ts";

const INF = Number.POSITIVE_INFINITY;
type Five = readonly [cost: number, volume: number, mass: number, series: number, stress: number];

const tableOf = (rows: readonly Five[]): LayoutTable => {
  const table = newTable(Math.max(1, rows.length));
  for (const [part, [cost, volume, mass, series, stress]] of rows.entries())
    pushRow(table, { part, series, parallel: 1, tied: false, family: -1, cost, volume, mass, stress });
  return table;
};
const beats = (a: Five, b: Five): boolean => a.every((x, i) => x <= b[i]!) && a.some((x, i) => x < b[i]!);
const slow = (rows: readonly Five[]): readonly number[] =>
  rows.flatMap((row, i) => (rows.some((other) => beats(other, row)) ? [] : [i]));
const sorted = (rows: readonly number[]): readonly number[] => [...rows].sort((a, b) => a - b);

describe("frontRows(table)", () => {
  test("nothing, one, two alike (neither beats the other)", () => {
    expect(frontRows(tableOf([]))).toEqual([]);
    expect(frontRows(tableOf([[1, 1, 1, 1, 0.5]]))).toEqual([0]);
    expect(
      sorted(
        frontRows(
          tableOf([
            [1, 1, 1, 1, 0.5],
            [1, 1, 1, 1, 0.5],
          ]),
        ),
      ),
    ).toEqual([0, 1]);
  });
  test("unknown counts as the worst: it is beaten by what is known, and stays when best elsewhere", () => {
    expect(
      frontRows(
        tableOf([
          [INF, 1, 1, 1, 0.5],
          [5, 1, 1, 1, 0.5],
        ]),
      ),
    ).toEqual([1]);
    expect(
      sorted(
        frontRows(
          tableOf([
            [INF, 1, 1, 1, 0.5],
            [5, 2, 1, 1, 0.5],
          ]),
        ),
      ),
    ).toEqual([0, 1]);
    expect(
      sorted(
        frontRows(
          tableOf([
            [INF, INF, INF, 3, INF],
            [INF, INF, INF, 3, INF],
          ]),
        ),
      ),
    ).toEqual([0, 1]);
  });
  test("comes in order of cost", () => {
    const rows: Five[] = [
      [3, 1, 1, 1, 0.5],
      [1, 3, 1, 1, 0.5],
      [2, 2, 1, 1, 0.5],
    ];
    expect(frontRows(tableOf(rows))).toEqual([1, 2, 0]);
  });
  test("stress over the rating, at zero and at one are judged like any other", () => {
    const rows: Five[] = [
      [1, 1, 1, 1, 1],
      [1, 1, 1, 1, 1.5],
      [1, 1, 1, 1, 0],
      [0.5, 1, 1, 1, 2],
    ];
    expect(sorted(frontRows(tableOf(rows)))).toEqual(sorted(slow(rows)));
  });

  test("300 random tables of up to 120 rows, coarse values so that ties abound, against all pairs: the same rows", () => {
    const c = chance(61);
    let kept = 0;
    for (let i = 0; i < 300; i++) {
      const steps = c.pick([2, 4, 30, 1000]);
      const value = (): number => (c.maybe(0.08) ? INF : c.whole(0, steps) / steps);
      const rows = Array.from(
        { length: c.whole(1, 120) },
        (): Five => [value(), value(), value(), c.whole(1, steps), value()],
      );
      const front = frontRows(tableOf(rows));
      expect(sorted(front), `case ${i}`).toEqual(sorted(slow(rows)));
      const costs = front.map((row) => rows[row]![0]);
      expect(costs).toEqual([...costs].sort((a, b) => a - b));
      kept += front.length;
    }
    expect(kept).toBeGreaterThan(1000);
  });

  test("3000 rows that trade cost against stress, so that many stay, against all pairs", () => {
    const c = chance(62);
    const rows = Array.from({ length: 3000 }, (): Five => {
      const x = c.next();
      return [x, 1 - x + c.next() * 0.2, c.next(), c.whole(1, 40), 1 - x * 0.5];
    });
    expect(sorted(frontRows(tableOf(rows)))).toEqual(sorted(slow(rows)));
  });
});
