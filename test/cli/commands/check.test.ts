import { describe, expect, test } from "vitest";
import type { BankFlags } from "../../../src/cli/checked.ts";
import { type CheckFlags, checkCommand, checkWitnessed } from "../../../src/cli/commands/check.ts";
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
    expect(out).toMatch(/^1 CHECK FAILED\. OF THE FAULTS 7 FAIL, 1 could not be assessed\.$/m);
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
    expect(out).toMatch(/left after a dump +-133\.3 V to 109\.1 V on a stage, from equal\s+sharing/);
    // Unequal leakage does worse for ever, and the finding is judged by that.
    const held = JSON.parse(check({ ...FLAGS, json: true }).out);
    const { voltage, hold } = held.corners.dumpedFromHold;
    expect(hold).toBe("for ever");
    expect(voltage).toBeLessThan(held.left.low);
    expect(held.share.leftAfterDump).toBe(-held.left.low);
    expect(held.findings.find(({ id }: { id: string }) => id === "reverse-after-dump").value).toBe(-voltage);
    expect(out.replaceAll(/\s+/g, " ")).toMatch(/from equal sharing; down to -[\d.]+ V from an endless hold/);
    expect(out).toMatch(/can kill/);
    expect(Math.max(...out.split("\n").map((line) => line.length))).toBeLessThanOrEqual(80);
  });

  test("without balancing the leakage rules: the whole voltage may fall on one", () => {
    const { status, out } = check({ ...FLAGS, balance: "none" });
    expect(status).toBe(1);
    expect(out).toMatch(/FAIL {2,}worst unit while holding +1\.6 kV/);
  });
});

describe("check: the states at rest", () => {
  test("--json has corners, course, clamp and improve, which agree with the shares; text has the same figures", () => {
    const flags = { ...FLAGS, hold: "60 s", dumpResistance: "50 ohm" };
    const json = JSON.parse(check({ ...flags, json: true }).out);
    expect(json.corners.charging).toEqual({
      voltage: json.share.charging,
      words: "stage 1 at -20 %, the rest at +20 %",
    });
    expect(json.course.peak.voltage).toBeCloseTo(json.corners.holding.voltage, 6);
    expect(json.corners.dumped.voltage).toBeCloseTo(json.left.low, 9);
    expect(json.clamp).toMatchObject({ count: 4, through: { kind: "dump resistor", ohms: 50 } });
    // Source: methods A3: V/n less the low share, which the others' charge makes up: U = 3 x 400 x (1 - 0.8/1.2).
    expect(json.clamp.surgeCurrent).toBeCloseTo((3 * 400 * (1 - 0.8 / 1.2)) / 50, 9);
    expect(json.improve.causes).toHaveLength(5);
    expect(json.withoutBalance.safe).toBe(json.withoutBalance.holding <= json.share.limit);
    const { out } = check(flags);
    expect(out).toMatch(/worst, charging +533\.4 V: stage 1 at -20 %, the rest at \+20 %/);
    expect(out).toMatch(/clamp diodes +4 clamp diodes: at least 537 V reverse, surge 8 A/);
    expect(out).toMatch(/^ {2}rest /m);
    expect(out).toMatch(/capacitance tolerance/);
  });

  test("unknown tolerance: null, not nought, and what it would take is told", () => {
    const { out } = check({ ...FLAGS, json: true }, { "c.csv": CATALOG.replace(",20,", ",,") });
    const json = JSON.parse(out);
    expect([json.course, json.improve, json.corners.charging, json.clamp.surgeCurrent]).toEqual([
      null,
      null,
      null,
      null,
    ]);
    const note = json.findings.find((f: { id: string }) => f.id === "charging-share").note;
    // (4 x 540 - 1600)/(1600 + 2 x 540) = 20.9 %, by methods 1.2.
    expect(note).toMatch(/Up to \+-20\.8 % this number in series would pass/);
  });

  test("with --balance none a finite hold that is safe passes holding, and its bleed is a warning", () => {
    const { out } = check({ ...FLAGS, hold: "60 s", balance: "none", json: true });
    const { findings, withoutBalance } = JSON.parse(out);
    const verdict = (id: string) => findings.find((f: { id: string }) => f.id === id).verdict;
    expect(withoutBalance.safe).toBe(true);
    expect(verdict("holding-share")).toBe("pass");
    expect(verdict("bleed")).toBe("warn");
  });

  test("no resistor of the family will do: what mends it is told, each by how much", () => {
    const tight = CATALOG.replace(",600,20,", ",450,0.5,");
    const { out } = check({ ...FLAGS, json: true, derating: "0.9" }, { "c.csv": tight });
    const note = JSON.parse(out).findings.find((f: { id: string }) => f.id === "holding-share").note;
    expect(note).toMatch(/5 in series instead of 4; resistors of [\d.]+ % or tighter; a charge voltage of at most/);
  });
});

describe("check --basis statistical", () => {
  const STAT: CheckFlags = { ...FLAGS, basis: "statistical", voltage: "2 kV", series: "4" };
  async function witnessed(flags: CheckFlags, texts: Record<string, string> = {}) {
    const ports = fakePorts({ "c.csv": CATALOG, ...texts });
    const status = await checkWitnessed(undefined, flags, ports);
    return { status, out: ports.printed(), err: ports.told() };
  }

  test("a witness stands beside the chance in JSON and text; without --witness there is none", async () => {
    const json = JSON.parse((await witnessed({ ...STAT, witness: "1e5", seed: "4", json: true })).out);
    expect(json.witness).toMatchObject({ banks: 1e5, seed: 4, agrees: true });
    expect(json.risk.law).toBe("uniform over its tolerance");
    expect((await witnessed({ ...STAT, witness: "1e5" })).out.replace(/\s+/g, " ")).toMatch(
      /witness: of 100000 banks drawn with seed 1/,
    );
    expect(JSON.parse((await witnessed({ ...STAT, json: true })).out).witness).toBeUndefined();
  });

  test("a witness of what has no chance is refused with 2", async () => {
    for (const flags of [
      { ...STAT, basis: "nominal" },
      { ...STAT, witness: "x" },
    ]) {
      const { status, err } = await witnessed({ witness: "1e5", ...flags });
      expect(status).toBe(2);
      expect(err).toMatch(/--witness/);
    }
  });

  test("a measured lot stands in for the tolerance; four units are refused, and a lot without the basis too", async () => {
    const rows = ["a,3300", "b,3310", "c,3290", "d,3305", "e,3295"];
    const lot = (count: number) => ({ "m.csv": ["serial,capacitance [uF]", ...rows.slice(0, count)].join("\n") });
    const five = JSON.parse((await witnessed({ ...STAT, measured: "m.csv", json: true }, lot(5))).out);
    expect(five.risk).toMatchObject({ exceed: 0, law: "as the 5 measured units, each value equally likely" });
    const four = await witnessed({ ...STAT, measured: "m.csv" }, lot(4));
    expect([four.status, four.err]).toEqual([
      2,
      expect.stringMatching(/too few measured units: read 4 units; accepted: at least 5/),
    ]);
    expect((await witnessed({ ...FLAGS, measured: "m.csv" }, lot(5))).err).toMatch(/--basis statistical/);
  });
});
