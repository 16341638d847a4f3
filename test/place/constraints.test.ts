import { describe, expect, test } from "vitest";
import { constraintsOf, lotRange, mayFormGroup } from "../../src/place/constraints.ts";
import { units } from "./lots.ts";

const lot = units("uniform", 8, 1).map((unit, i) => ({ ...unit, lot: i < 4 ? "A" : "B" }));
const asked = { series: 2, parallel: 4, ties: "cross-tied" } as const;

describe("constraintsOf(units, request)", () => {
  test("no wish: any unit may go anywhere, one class", () => {
    const rule = constraintsOf(lot, asked);
    expect([rule.any, rule.rules.classes, rule.groups, rule.size]).toEqual([false, 1, 2, 4]);
  });
  test("strings turn the shape round", () => {
    const rule = constraintsOf(lot, { ...asked, ties: "strings" });
    expect([rule.groups, rule.size]).toEqual([4, 2]);
  });
  test("lots make classes whether mixed or apart; a pin fixes a unit; a polarity group makes a label", () => {
    expect(constraintsOf(lot, { ...asked, lots: "mix" }).rules.classes).toBe(2);
    expect(constraintsOf(lot, { ...asked, lots: "apart" }).label[0]).not.toBe(
      constraintsOf(lot, { ...asked, lots: "apart" }).label[7],
    );
    const pinned = constraintsOf(lot, { ...asked, pins: [{ serial: "U003", group: 1 }] });
    expect([pinned.any, pinned.rules.fixed[2], pinned.pinnedTo[2]]).toEqual([true, 1, 1]);
    expect(
      constraintsOf(
        lot.map((u, i) => ({ ...u, group: i < 4 ? "axial" : "snap-in" })),
        asked,
      ).any,
    ).toBe(true);
  });
});

describe("lotRange(size, ofLot, among)", () => {
  test("between the share rounded down and up; a whole share leaves no play", () => {
    expect(lotRange(4, 4, 8)).toEqual([2, 2]);
    expect(lotRange(4, 3, 8)).toEqual([1, 2]);
  });
});

describe("mayFormGroup(rule, ranges)(members)", () => {
  test("apart, mixed and pinned together", () => {
    const apart = mayFormGroup(constraintsOf(lot, { ...asked, lots: "apart" }), new Map());
    expect([apart([0, 1, 2, 3]), apart([0, 1, 2, 4])]).toEqual([true, false]);
    const mix = mayFormGroup(constraintsOf(lot, { ...asked, lots: "mix" }), new Map([["A", [2, 2] as const]]));
    expect([mix([0, 1, 4, 5]), mix([0, 1, 2, 4])]).toEqual([true, false]);
    const pins = [
      { serial: "U001", group: 0 },
      { serial: "U002", group: 0 },
      { serial: "U003", group: 1 },
    ];
    const pinned = mayFormGroup(constraintsOf(lot, { ...asked, pins }), new Map());
    expect([pinned([0, 1, 4, 5]), pinned([0, 4, 5, 6]), pinned([0, 1, 2, 4])]).toEqual([true, false, false]);
  });
});
