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
