import { describe, expect, test } from "vitest";
import { constrainedStart } from "../../src/place/constrainedStart.ts";
import { constraintsOf } from "../../src/place/constraints.ts";
import { toLattice } from "../../src/place/lattice.ts";
import type { PlaceRequest } from "../../src/place/request.ts";
import { units } from "./lots.ts";

const start = (lot: ReturnType<typeof units>, request: PlaceRequest) => {
  const { values } = toLattice(lot.map((unit) => unit.capacitance));
  return constrainedStart(
    constraintsOf(lot, request),
    lot.map((_, i) => i),
    values,
  );
};
const asked: PlaceRequest = { series: 4, parallel: 4, ties: "cross-tied" };
const lotOf = (count: number, ofA: number) =>
  units("lots", count, 3).map((unit, i) => ({ ...unit, lot: i < ofA ? "A" : "B" }));

describe("constrainedStart(rule, order, values)", () => {
  test("lots mixed: every stage has its share, rounded one way or the other", () => {
    for (const ofA of [1, 5, 6, 8, 15]) {
      const lot = lotOf(16, ofA);
      const made = start(lot, { ...asked, lots: "mix" });
      if (!made.ok) throw new Error(made.why);
      expect(new Set(made.groups.flat()).size).toBe(16);
      for (const group of made.groups) {
        const inA = group.filter((i) => i < ofA).length;
        expect(inA).toBeGreaterThanOrEqual(Math.floor(ofA / 4));
        expect(inA).toBeLessThanOrEqual(Math.ceil(ofA / 4));
      }
    }
  });
  test("lots apart: one lot to a stage, and no way when the counts do not allow it", () => {
    const made = start(lotOf(18, 9), { ...asked, lots: "apart" });
    if (!made.ok) throw new Error(made.why);
    for (const group of made.groups) expect(new Set(group.map((i) => i < 9)).size).toBe(1);
    expect(start(lotOf(16, 6), { ...asked, lots: "apart" }).ok).toBe(false);
  });
  test("pins are where they were put; pins that break a wish are refused", () => {
    const pins = [
      { serial: "U001", group: 2 },
      { serial: "U016", group: 0 },
    ];
    const made = start(lotOf(16, 8), { ...asked, lots: "apart", pins });
    if (!made.ok) throw new Error(made.why);
    expect(made.groups[2]).toContain(0);
    expect(made.groups[0]).toContain(15);
    const clash = [
      { serial: "U001", group: 0 },
      { serial: "U016", group: 0 },
    ];
    expect(start(lotOf(16, 8), { ...asked, lots: "apart", pins: clash }).ok).toBe(false);
  });
  test("a stage that takes one size group only gets that one", () => {
    const lot = units("uniform", 16, 4).map((unit, i) => ({ ...unit, group: i < 4 ? "tall" : "short" }));
    const made = start(lot, { ...asked, rooms: [{ group: 3, takes: "tall" }] });
    if (!made.ok) throw new Error(made.why);
    expect(made.groups[3]!.sort()).toEqual([0, 1, 2, 3]);
    const pins = [{ serial: "U009", group: 3 }];
    expect(start(lot, { ...asked, rooms: [{ group: 3, takes: "tall" }], pins }).ok).toBe(false);
  });
});
