// Source: [methods-derived] fuse duty of methods.md 8; costs by hand.
import { describe, expect, test } from "vitest";
import type { Fuse } from "../../src/catalog/index.ts";
import { plan } from "../../src/search/plan.ts";
import { isProtected, protectionCost, protectionOf, sectionCount } from "../../src/search/protection.ts";
import { FAMILIES } from "../support/bank.ts";
import { FILM, shotBrief } from "../support/shotBank.ts";

const FUSE: Fuse = { fuse: "fu", voltage: 3000, melting: 1e5, clearing: 100, currency: "EUR", price: 300 };
const SHAPE = { series: 2, parallel: 4, ties: "cross-tied", unit: FILM, worst: 1100 } as const;
const stock = (fuses: readonly Fuse[] | null = null) => ({ fuses, currency: "EUR" });

describe("protectionOf(brief, case, stock)", () => {
  test("asked for nothing: nothing; a resistor and an inductance at the builder's own price, in minor units", () => {
    expect(isProtected(shotBrief())).toBe(false);
    expect(protectionOf(shotBrief(), SHAPE, stock())).toEqual([]);
    const brief = shotBrief({ isolating: "0.1 ohm", isolatingPrice: 1.5, section: { inductance: "1 uH", price: "4" } });
    expect(isProtected(brief)).toBe(true);
    const lines = protectionOf(brief, SHAPE, stock());
    if (typeof lines === "string") throw new Error(lines);
    expect(lines).toMatchObject([
      { kind: "isolating resistor", count: 8, cost: 1200 },
      { kind: "section inductance", count: 8, cost: 3200 },
    ]);
    expect(protectionCost(lines)).toBe(4400);
    expect(sectionCount({ series: 2, parallel: 4, ties: "strings" })).toBe(4);
  });

  test("fuses: the cheapest that does, one to each unit; none of the catalogue: whether more in parallel may mend it; no catalogue: to be chosen", () => {
    const brief = shotBrief({ fused: true });
    expect(protectionOf(brief, SHAPE, stock([{ ...FUSE, fuse: "dear", price: 900 }, FUSE]))).toEqual([
      { kind: "fuse", item: "fu", count: 8, cost: 2400 },
    ]);
    expect(protectionOf(brief, SHAPE, stock([{ ...FUSE, voltage: 1000 }]))).toBe("stuck");
    expect(protectionOf(brief, SHAPE, stock([{ ...FUSE, melting: 1 }]))).toBe("more");
    expect(protectionOf(brief, SHAPE, stock())).toMatchObject([{ item: "to be chosen", cost: null }]);
    expect(protectionOf(brief, { ...SHAPE, parallel: 1, ties: "strings" }, stock([]))).toEqual([]);
  });
});

describe("plan({ brief, parts, families, fuses }) with protection", () => {
  const run = (more: Record<string, unknown>, fuses: readonly Fuse[] | null = null) => {
    const brief = shotBrief({ energy: "500 J", maxSeries: 2, maxUnits: 12, ...more });
    const read = plan({ brief, parts: [FILM], families: FAMILIES, fuses, limit: 0 });
    if (!read.ok) throw new Error(JSON.stringify(read.refusals));
    return read.value;
  };

  test("its cost is in the total that ranks: a bank of few fuses passes one that is cheaper bare", () => {
    const bare = run({});
    const fused = run({ fused: true }, [{ ...FUSE, price: 100000 }]);
    for (const layout of fused.layouts) {
      const fuses = layout.protection?.[0];
      const plain = bare.layouts.find(({ id }) => id === layout.id);
      expect(layout.cost?.protection).toBe((fuses?.count ?? 0) * 1000);
      expect(layout.cost?.total).toBeCloseTo((plain?.cost?.total ?? 0) + (layout.cost?.protection ?? 0), 9);
    }
    const totals = fused.layouts.map(({ cost }) => cost?.total ?? 0);
    expect(totals).toEqual([...totals].sort((a, b) => a - b));
    // two in series: cross-tied takes a fuse to each unit, strings one to each string
    const of = (ties: string) => fused.layouts.find((one) => one.series === 2 && one.ties === ties)?.cost?.protection;
    expect(of("cross-tied")).toBe(2 * (of("strings") as number));
  });

  test("a fuse that none fits refuses the part with its reason; fuses asked without a catalogue are refused", () => {
    const none = run({ fused: true }, [{ ...FUSE, voltage: 100 }]);
    expect(none.layouts).toEqual([]);
    expect(none.refused[0]?.reason).toBe("no-fuse");
    const brief = shotBrief({ fused: true });
    const read = plan({ brief, parts: [FILM], families: FAMILIES });
    expect(read.ok ? [] : read.refusals.map(({ place }) => place.field)).toEqual(["fuses"]);
  });

  test("an isolating resistor brings the fault's joules under a limit once the short's own resistance is told", () => {
    const limit = { maxFaultEnergy: "100 J", maxSeries: 1 };
    expect(run(limit).layouts).toEqual([]);
    const guarded = { ...limit, isolating: "0.2 ohm", isolatingPrice: 2 };
    expect(run(guarded).layouts).toEqual([]);
    const told = run({ ...guarded, shortResistance: "20 mohm" });
    expect(told.layouts.length).toBeGreaterThan(0);
    expect(told.layouts[0]?.cost?.protection).toBe(2 * (told.layouts[0]?.units ?? 0));
  });
});
