import { describe, expect, test } from "vitest";
import { clampLines } from "../../src/order/clampLines.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

const brief = briefOf();

describe("clampLines({ layout, unit, brief })", () => {
  test("a polarised unit without a reverse rating: one diode a stage, rated for the worst stage, rounded up", () => {
    const layout = bankOf();
    const [line] = clampLines({ layout, unit: UNIT, brief });
    expect(line).toMatchObject({ line: "clamp diodes", needed: 8, state: "to be chosen" });
    const volts = Number(/at least ([\d.]+) V/.exec(line?.rating ?? "")?.[1]);
    expect(volts).toBeGreaterThanOrEqual(Math.max(layout.share.charging ?? 0, layout.share.holding ?? 0));
  });

  test("a dump resistor gives surge and action, rounded up; without one and without ESR they are said to be unknown", () => {
    const asked = briefOf({ dumpResistance: "100 ohm", hold: "10 s" });
    const [line] = clampLines({ layout: bankOf({ brief: asked }), unit: UNIT, brief: asked });
    const rest = (7 * 250 * (1 - 0.8 / 1.2)) / 100;
    const [, amperes = ""] = /([\d.]+) A surge/.exec(line?.rating ?? "") ?? [];
    expect(Number(amperes)).toBeGreaterThanOrEqual(rest);
    expect(Number(amperes)).toBeLessThan(rest * 1.01);
    expect(line?.rating).toMatch(/A2s/);
    expect(line?.note).toMatch(/dump resistor of 100 ohm/);
    const [open] = clampLines({ layout: bankOf(), unit: UNIT, brief });
    expect(open?.rating).toMatch(/surge current of the dump not known/);
    expect(open?.note).toMatch(/State the dump resistance/);
    const [own] = clampLines({ layout: bankOf(), unit: { ...UNIT, esr: 0.1 }, brief });
    expect(own?.note).toMatch(/the units' own ESR/);
  });

  test("in strings one diode a unit", () => {
    const layout = bankOf({ layout: { part: "x", series: 8, parallel: 2, ties: "strings" } });
    expect(clampLines({ layout, unit: UNIT, brief })[0]?.needed).toBe(16);
  });

  test("none for film, for one in series, and where the reverse rating covers it", () => {
    const film = { ...UNIT, polarised: false };
    expect(clampLines({ layout: bankOf({ unit: film }), unit: film, brief })).toEqual([]);
    const one = bankOf({ layout: { part: "x", series: 1, parallel: 2, ties: "strings" } });
    expect(clampLines({ layout: one, unit: UNIT, brief })).toEqual([]);
    const hardy = { ...UNIT, reverseVoltage: 400 };
    expect(clampLines({ layout: bankOf({ unit: hardy }), unit: hardy, brief })).toEqual([]);
  });

  test("a rating that does not cover it needs the diode", () => {
    const weak = { ...UNIT, reverseVoltage: 1 };
    expect(clampLines({ layout: bankOf({ unit: weak }), unit: weak, brief })).toHaveLength(1);
  });

  test("unknown polarity: the line is there and says why", () => {
    const { polarised: _polarised, ...unit } = UNIT;
    expect(clampLines({ layout: bankOf({ unit }), unit, brief })[0]?.note).toMatch(/does not say/);
  });
});
