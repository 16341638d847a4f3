import { describe, expect, test } from "vitest";
import type { BankFlags } from "../../../src/cli/checked.ts";
import { checkCommand } from "../../../src/cli/commands/check.ts";
import { planCommand } from "../../../src/cli/commands/plan.ts";
import { at, fakePorts } from "../../support/fakePorts.ts";

/** A1 and A3 of the worked examples: 4 stages of 5 units, 3300 uF +-20 %, 1600 V, units of 600 V so that the limit holds. */
const CATALOG = "part,capacitance [uF],voltage [V],tolerance [%],polarised,leakage [mA]\nu,3300,600,20,yes,0.2\n";
const FLAGS: BankFlags = {
  catalog: ["c.csv"],
  energy: "4 kJ",
  voltage: "1600 V",
  ripple: "100 %",
  part: "u",
  series: "4",
  parallel: "5",
  ties: "cross-tied",
};
function check(flags: BankFlags, texts: Record<string, string> = {}) {
  const ports = fakePorts({ "c.csv": CATALOG, ...texts });
  const status = checkCommand(undefined, flags, ports);
  return { status, out: ports.printed(), err: ports.told() };
}

describe("check --json", () => {
  test("Source: methods A1, A3: capacitance, worst share, and what a dump leaves", () => {
    const { status, out } = check({ ...FLAGS, json: true });
    const result = JSON.parse(out);
    expect(status).toBe(0);
    expect(result.capacitance.nominal).toBeCloseTo(0.004125, 12);
    expect(result.share.charging).toBeCloseTo(533.333333, 5);
    expect(result.left.low).toBeCloseTo(-133.333333, 5);
    expect(result.left.high).toBeCloseTo(109.090909, 5);
    expect(result).toMatchObject({
      brief: { hold: "for ever" },
      cautions: expect.any(Array),
      inputs: expect.any(Object),
    });
    expect(out).not.toMatch(/NaN|Infinity/);
  });

  test("left: nought for one in series, null where the tolerance is unknown", () => {
    const single = check({ ...FLAGS, series: "1", voltage: "500 V", energy: "1 kJ", json: true });
    expect(JSON.parse(single.out).left).toEqual({ low: 0, high: 0 });
    const unknown = check({ ...FLAGS, json: true }, { "c.csv": CATALOG.replace(",20,", ",,") });
    expect(JSON.parse(unknown.out).left).toEqual({ low: null, high: null });
  });

  test("one element of plan's layouts checks to itself", () => {
    const ports = fakePorts();
    const brief = at("fixtures/briefs/flash-lamp.json");
    const catalog = [at("catalogs/electrolytic.csv")];
    const resistors = at("catalogs/resistors.csv");
    planCommand(brief, { catalog, resistors, json: true }, ports);
    for (const layout of JSON.parse(ports.printed()).layouts) {
      const again = fakePorts({ "l.json": JSON.stringify(layout) });
      expect(checkCommand(brief, { catalog, resistors, layout: "l.json", json: true }, again)).toBe(0);
      expect(JSON.parse(again.printed())).toMatchObject(layout);
    }
  });
});

describe("check as text", () => {
  test("a unit over its limit fails with 1 and says so", () => {
    const { status, out } = check({ ...FLAGS, voltage: "2 kV" });
    expect(status).toBe(1);
    expect(out).toMatch(/FAIL {2,}worst unit while charging/);
    expect(out).toMatch(/CHECKS FAILED/);
  });

  test("unknown tolerance is not assessed, and no pass", () => {
    const { status, out } = check(FLAGS, { "c.csv": CATALOG.replace(",20,", ",,") });
    expect(status).toBe(0);
    expect(out).toMatch(/not assessed {2}worst unit while charging/);
    expect(out).toMatch(/No check failed; \d could not be assessed/);
    expect(out).toMatch(/not assessed: the tolerance is unknown/);
  });

  test("holds the signed voltages that a dump leaves, and the cautions", () => {
    const { out } = check(FLAGS);
    expect(out).toMatch(/left after a dump +-133\.3 V to 109\.1 V/);
    expect(out).toMatch(/can kill/);
    expect(Math.max(...out.split("\n").map((line) => line.length))).toBeLessThanOrEqual(80);
  });

  test("without balancing the leakage rules: the whole voltage may fall on one", () => {
    const { status, out } = check({ ...FLAGS, balance: "none" });
    expect(status).toBe(1);
    expect(out).toMatch(/FAIL {2,}worst unit while holding +1\.6 kV/);
  });
});
