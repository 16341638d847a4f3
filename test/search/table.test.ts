// The table of layouts: rows come back as they went in, also after it has grown.
import { describe, expect, test } from "vitest";
import { newTable, pushRow } from "../../src/search/table.ts";

describe("newTable(capacity), pushRow(table, row)", () => {
  test("an empty table", () => expect(newTable(0 + 1).count).toBe(0));
  test("5000 rows through a table made for 4: all columns kept", () => {
    const table = newTable(4);
    for (let i = 0; i < 5000; i++)
      pushRow(table, {
        part: i,
        series: (i % 1000) + 1,
        parallel: 1000 - (i % 7),
        tied: i % 2 === 1,
        family: (i % 5) - 1,
        cost: i / 3,
        volume: i % 3 === 0 ? Number.POSITIVE_INFINITY : i * 1e-5,
        mass: i * 1e-3,
        stress: i / 5000,
      });
    expect(table.count).toBe(5000);
    for (const i of [0, 3, 4, 4999]) {
      expect([table.part[i], table.series[i], table.parallel[i], table.tied[i], table.family[i]]).toEqual([
        i,
        (i % 1000) + 1,
        1000 - (i % 7),
        i % 2,
        (i % 5) - 1,
      ]);
      expect([table.cost[i], table.volume[i], table.mass[i], table.stress[i]]).toEqual([
        i / 3,
        i % 3 === 0 ? Number.POSITIVE_INFINITY : i * 1e-5,
        i * 1e-3,
        i / 5000,
      ]);
      expect(table.units[i]).toBe(((i % 1000) + 1) * (1000 - (i % 7)));
    }
  });
  test("the largest that a brief allows fits: 1000 in series, a million units", () => {
    const table = newTable(1);
    pushRow(table, {
      part: 99999,
      series: 1000,
      parallel: 1000000,
      tied: true,
      family: 30000,
      cost: 1e12,
      volume: 1,
      mass: 1,
      stress: 1,
    });
    expect([table.series[0], table.parallel[0], table.family[0]]).toEqual([1000, 1000000, 30000]);
  });
});
