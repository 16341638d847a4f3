import { describe, expect, test } from "vitest";
import { countsOf } from "../../src/order/index.ts";

describe("countsOf(layout)", () => {
  test("one unit: two bars, no links, nothing to fuse against", () => {
    expect(countsOf({ series: 1, parallel: 1, ties: "strings" })).toEqual({
      bars: 2,
      links: 0,
      groups: 1,
      stickPoints: 2,
      terminals: 2,
      fuses: 0,
      labels: 3,
    });
  });

  test("6s10p cross-tied: seven potentials, six stages, sixty fuses", () => {
    const counts = countsOf({ series: 6, parallel: 10, ties: "cross-tied" });
    expect(counts).toMatchObject({ bars: 7, links: 0, groups: 6, stickPoints: 7, terminals: 120, fuses: 60 });
    expect(counts.labels).toBe(60 + 6 + 1);
  });

  test("6s10p strings: two bars, fifty links, every unit a group, one fuse a string", () => {
    const counts = countsOf({ series: 6, parallel: 10, ties: "strings" });
    expect(counts).toMatchObject({ bars: 2, links: 50, groups: 60, stickPoints: 52, fuses: 10 });
  });

  test("units in plain parallel each have their fuse", () => {
    expect(countsOf({ series: 1, parallel: 4, ties: "strings" }).fuses).toBe(4);
  });

  test("bars and links join every terminal exactly once into the potentials (a graph, drawn out)", () => {
    for (const [series, parallel] of [
      [1, 3],
      [4, 1],
      [3, 5],
    ] as const) {
      for (const ties of ["cross-tied", "strings"] as const) {
        if (ties === "cross-tied" && (series === 1 || parallel === 1)) continue;
        const nodes = new Set<string>();
        for (let s = 0; s <= series; s++)
          for (let p = 0; p < parallel; p++)
            nodes.add(ties === "cross-tied" || s === 0 || s === series ? `${s}` : `${s}/${p}`);
        expect(countsOf({ series, parallel, ties }).stickPoints).toBe(nodes.size);
      }
    }
  });
});
