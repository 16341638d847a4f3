// The causes of a lost margin: they add up, each alone is the whole, unknown is said.
import { describe, expect, test, vi } from "vitest";
import { type HoldCase, worstAtHold } from "../../src/bank/cornersHold.ts";
import { type MarginCase, marginCauses } from "../../src/bank/margins.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const NONE = Number.POSITIVE_INFINITY;
const BASE: MarginCase = {
  n: 4,
  m: 5,
  C: 3300e-6,
  tLow: 0.2,
  tHigh: 0.2,
  leakage: 1e-3 / 5,
  insulation: NONE,
  R: 24e3,
  q: 0.05,
  V: 1600,
  hold: NONE,
  overshoot: 0.02,
  derating: 0.9,
  rating: 600,
};

const sum = (found: ReturnType<typeof marginCauses>): number =>
  found.causes.reduce((all, { volts }) => all + (volts ?? Number.NaN), 0);

describe("marginCauses(case)", () => {
  test("nothing amiss: only derating takes anything", () => {
    const found = marginCauses({ ...BASE, tLow: 0, tHigh: 0, leakage: 0, q: 0, overshoot: 0 });
    expect(found.even).toBe(400);
    expect(found.worst).toBeCloseTo(400, 10);
    expect(found.causes[0]).toMatchObject({ cause: "derating", volts: expect.closeTo(60, 9) });
    expect(sum(found)).toBeCloseTo(60, 9);
    expect(found.free).toBeCloseTo(140, 9);
  });

  test("one cause alone takes all: capacitance tolerance 133.333 V [methods-derived A1], overshoot 2 % of V/n", () => {
    const bare = { ...BASE, leakage: 0, q: 0, overshoot: 0, derating: 1 };
    expect(marginCauses(bare).causes[0]).toMatchObject({
      cause: "capacitance tolerance",
      volts: expect.closeTo(133.333333333, 8),
      without: expect.closeTo(400, 8),
    });
    const over = marginCauses({ ...bare, tLow: 0, tHigh: 0, overshoot: 0.02 });
    expect(over.causes[0]).toMatchObject({ cause: "overshoot", volts: expect.closeTo(8, 9) });
  });

  test("leakage and resistor tolerance of methods A4 share its 49.184615 V [methods-derived A4]", () => {
    const found = marginCauses({ ...BASE, tLow: 0, tHigh: 0, overshoot: 0, derating: 1 });
    expect(found.worst! - found.even).toBeCloseTo(49.184615, 6);
    const volts = Object.fromEntries(found.causes.map((cause) => [cause.cause, cause.volts]));
    expect(volts.leakage! + volts["resistor tolerance"]!).toBeCloseTo(49.184615, 6);
    expect(volts.leakage!).toBeGreaterThan(0);
    expect(volts["resistor tolerance"]!).toBeGreaterThan(0);
  });

  test("they add up to worst - even + derated volts, and `without` is the worst recomputed: 200 random layouts", () => {
    const draw = uniformFrom(streamState(8, 0));
    for (let k = 0; k < 200; k++) {
      const given: MarginCase = {
        ...BASE,
        n: 2 + (k % 7),
        tLow: 0.3 * draw(),
        tHigh: 0.5 * draw(),
        leakage: 1e-4 * draw(),
        insulation: k % 3 ? NONE : 1e6,
        R: k % 4 ? 3e4 * draw() + 100 : null,
        q: 0.1 * draw(),
        hold: k % 2 ? 100 * draw() : NONE,
        overshoot: 0.05 * draw(),
        derating: 0.8 + 0.2 * draw(),
      };
      const found = marginCauses(given);
      const derated = given.rating * (1 - given.derating);
      expect(sum(found)).toBeCloseTo(found.worst! - found.even + derated, 8);
      expect(found.worst).toBeCloseTo(
        worstAtHold({ ...given, V: given.V * (1 + given.overshoot) } as HoldCase).voltage,
        8,
      );
      expect(found.free).toBeCloseTo(given.rating - found.even - sum(found), 8);
      const leakage = found.causes.find(({ cause }) => cause === "leakage")!;
      const tight = worstAtHold({
        ...given,
        leakage: 0,
        insulation: NONE,
        V: given.V * (1 + given.overshoot),
      });
      expect(leakage.without).toBeCloseTo(tight.voltage, 8);
    }
  });

  test("insulation alone is leakage too: it takes all that is lost", () => {
    const found = marginCauses({
      ...BASE,
      tLow: 0,
      tHigh: 0,
      leakage: 0,
      insulation: 1e6,
      q: 0,
      overshoot: 0,
      derating: 1,
    });
    expect(found.causes[0]).toMatchObject({ cause: "leakage", volts: expect.closeTo(found.worst! - 400, 8) });
    expect(found.worst).toBeGreaterThan(401);
  });

  test.each(["leakage", "insulation"])(
    "%s unknown: said once as unknown, not as zero, no worst, and the others as without any",
    (what) => {
      const found = marginCauses({ ...BASE, [what]: null });
      expect(found.worst).toBeNull();
      expect(found.free).toBeNull();
      expect(found.causes.at(-1)).toMatchObject({ cause: "leakage", volts: null });
      const tight = marginCauses({ ...BASE, leakage: 0, insulation: NONE });
      const others = (of: typeof found) => of.causes.filter(({ cause }) => cause !== "leakage");
      expect(others(found)).toEqual(
        others(tight).map((cause) => ({ ...cause, volts: expect.closeTo(cause.volts!, 9) })),
      );
      expect(found.causes.length).toBe(5);
      expect(found.causes.at(-1)?.without).toBeCloseTo(tight.worst!, 9);
    },
  );
});
