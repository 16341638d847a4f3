import { describe, expect, test } from "vitest";
import { rankedTable } from "../../src/cli/rankedTable.ts";
import { widthOf } from "../../src/cli/wrap.ts";
import { bankOf, UNIT } from "../support/bank.ts";

const head = (width: number): string => rankedTable([bankOf()], width).split("\n")[0]?.trim().replace(/ +/g, " ") ?? "";

describe("rankedTable(layouts, width)", () => {
  test("80 columns keep rank, part, shape, ties, units, cost, worst and checks; more come when there is room", () => {
    expect(head(80)).toMatch(/^# part shape ties units cost (energy )?worst checks/);
    expect(head(200)).toBe("# part shape ties units cost energy worst checks volume mass bleed balancing");
    expect(head(60)).toMatch(/^# part shape ties units cost/);
  });

  test("the energy of the placed units stands in place of the least of the tolerance", () => {
    const bank = bankOf();
    const table = rankedTable([bank], 200, new Map([[bank.id, 123.45]]));
    expect(table.split("\n")[0]).toMatch(/energy placed/);
    expect(table).toMatch(/123\.4 J/);
    expect(rankedTable([bank], 200)).toMatch(/400 J/);
  });

  test("fits every width from 60 up, also with the longest name a catalogue may have", () => {
    const long = bankOf({ unit: { ...UNIT, part: "p".repeat(120) } });
    for (const width of [60, 80, 100, 140, 200])
      for (const line of rankedTable([long, bankOf()], width).split("\n"))
        expect(widthOf(line), `${width}`).toBeLessThanOrEqual(width);
  });

  test("unknown sharing is not assessed, never nought", () => {
    const { tolerance: _tolerance, ...unit } = UNIT;
    expect(rankedTable([bankOf({ unit })], 200)).toMatch(/not assessed/);
  });

  test("the worst verdict stands in the row", () => {
    const failing = bankOf({ layout: { part: "x", series: 4, parallel: 2, ties: "cross-tied" } });
    expect(failing.findings.some((f) => f.verdict === "fail")).toBe(true);
    expect(rankedTable([failing], 200)).toMatch(/FAIL/);
  });
});
