import { readdirSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { type PlanFlags, planCommand } from "../../../src/cli/commands/plan.ts";
import { at, fakePorts, UNSAFE } from "../../support/fakePorts.ts";

const CATALOG = at("catalogs/electrolytic.csv");
const BRIEF = at("fixtures/briefs/flash-lamp.json");
/** Three parts: the statistical basis works out a chance for every layout, which takes its time on more. */
const SMALL = at("fixtures/catalogs/good/plain.csv");
function plan(brief: string | undefined, flags: PlanFlags = {}, texts: Record<string, string> = {}) {
  const ports = fakePorts(texts);
  const status = planCommand(brief, { catalog: [CATALOG], ...flags }, ports);
  return { status, out: ports.printed(), err: ports.told() };
}

describe("plan --json", () => {
  const { status, out, err } = plan(BRIEF, { json: true, limit: "3" });
  const result = JSON.parse(out);

  test("holds at least what is promised, with an endless hold in words", () => {
    expect([status, err]).toEqual([0, ""]);
    expect(result).toMatchObject({
      required: { capacitance: expect.closeTo((2 * 2400) / 2200 ** 2, 12) },
      searched: { parts: 31, layouts: expect.any(Number), proof: "exhaustive" },
      brief: { hold: "for ever", ripple: 1 },
      cautions: expect.arrayContaining([{ id: "kills-when-off", text: expect.any(String) }]),
      inputs: { brief: BRIEF, catalogues: [{ file: CATALOG, read: 31 }], assumed: ["assumed 2 W leaded"] },
    });
    expect(result.layouts).toHaveLength(3);
    expect(result.layouts[0]).toMatchObject({
      id: expect.stringMatching(/ \d+s\d+p (cross-tied|strings)$/),
      share: { even: expect.any(Number), limit: expect.any(Number) },
      bleed: { toVoltage: 60 },
      findings: expect.arrayContaining([expect.objectContaining({ id: "charging-share", verdict: "pass" })]),
    });
    expect(result.front.length).toBeGreaterThan(3);
  });

  test("--limit 0 prints all, and the same input gives the same bytes", () => {
    const all = plan(BRIEF, { json: true, limit: "0" }).out;
    expect(JSON.parse(all).layouts).toHaveLength(result.searched.layouts);
    expect(plan(BRIEF, { json: true, limit: "0" }).out).toBe(all);
  });

  test("bare SI numbers give the same layouts", () => {
    const si = JSON.parse(plan(at("fixtures/briefs/flash-lamp-si.json"), { json: true, limit: "3" }).out);
    expect(si.layouts).toEqual(result.layouts);
  });
});

describe("plan as text", () => {
  test("every good brief plans, in at most 80 columns, and nothing unsafe is printed", () => {
    for (const name of ["flash-lamp", "flash-lamp-nominal", "pulsed-magnet", "spot-welder", "steady-rules"]) {
      const { status, out } = plan(at(`fixtures/briefs/${name}.json`), {
        catalog: [CATALOG, at("catalogs/double-layer.csv")],
        limit: "3",
      });
      expect(status, name).toBe(0);
      expect(UNSAFE.test(out), name).toBe(false);
      expect(Math.max(...out.split("\n").map((line) => line.length)), name).toBeLessThanOrEqual(80);
    }
  });

  test("the statistical basis says its risk and how units are spread", () => {
    const { status, out } = plan(at("fixtures/briefs/flash-lamp-statistical.json"), { catalog: [SMALL], limit: "2" });
    expect(status).toBe(0);
    expect(out).toMatch(/basis +statistical, risk 0\.0001, uniform within the tolerance/);
    expect(out).toMatch(/chance of one over its limit/);
  });

  test("every impossible brief ends with 1, the reasons and the cautions", () => {
    for (const name of readdirSync(at("fixtures/briefs/impossible"))) {
      const { status, out } = plan(at(`fixtures/briefs/impossible/${name}`));
      expect(status, name).toBe(1);
      expect(out, name).toMatch(/NOTHING FITS/);
      expect(out, name).toMatch(/Refused parts: 31/);
      expect(out, name).toMatch(/can kill/);
    }
  });
});

describe("plan refuses", () => {
  /** A brief that the schema now takes, because risk has a default. */
  const TAKEN = new Set(["statistical-without-risk.json"]);

  test("every bad brief with 2, its file, and no stack", () => {
    for (const name of readdirSync(at("fixtures/briefs/bad"))) {
      const { status, out, err } = plan(at(`fixtures/briefs/bad/${name}`), { limit: "1", catalog: [SMALL] });
      expect(status, name).toBe(TAKEN.has(name) ? 0 : 2);
      if (TAKEN.has(name)) continue;
      expect(out, name).toBe("");
      expect(err, name).toContain(name);
      expect(err, name).not.toMatch(/\n\s+at /);
    }
  });

  test("a bare 20 says how it was read", () => {
    expect(plan(at("fixtures/briefs/bad/ripple-bare-20.json")).err).toMatch(/read 20, that is 2000 %.*write "20 %"/);
  });

  test("no catalogue, a wrong limit and a wrong rank, all at once", () => {
    const { status, err } = plan(BRIEF, { catalog: [], limit: "-1", rank: "volum" });
    expect(status).toBe(2);
    expect(err).toMatch(/--catalog: /);
    expect(err).toMatch(/--limit: /);
    expect(err).toMatch(/--rank: .*perhaps "volume"/);
  });

  test("two currencies without a rate; with one it plans", () => {
    const catalog = [at("fixtures/catalogs/bad/two-currencies.csv")];
    const refused = plan(BRIEF, { catalog, json: true });
    expect(refused.status).toBe(2);
    expect(JSON.parse(refused.out).refusals[0].code).toBe("two-currencies");
    const others = ["USD=0.9", "GBP=1.2", "CHF=1"];
    expect(plan(BRIEF, { catalog, currency: "EUR", exchange: others }).status).toBe(0);
  });
});

test("plan --brief-schema prints a JSON Schema with every key", () => {
  const { status, out } = plan(undefined, { briefSchema: true });
  expect(status).toBe(0);
  expect(Object.keys(JSON.parse(out).properties)).toEqual(
    expect.arrayContaining(["energy", "voltage", "ripple", "hold"]),
  );
});

test("rows that are lost are told on the error stream, and the rest is planned", () => {
  const { status, err, out } = plan(BRIEF, { catalog: [at("fixtures/catalogs/bad/nan.csv")], limit: "1" });
  expect(status).toBe(0);
  expect(err).toMatch(/nan\.csv:3:2 capacitance: this is no number/);
  expect(out).toMatch(/1 fault costs its row/);
});

describe("plan --fuses", () => {
  const CHEAP = {
    catalog: [at("catalogs/oil-and-paper.csv")],
    energy: "2 kJ",
    voltage: "2 kV",
    ripple: "100 %",
    loadResistance: "0.2 ohm",
    loadInductance: "10 uH",
    limit: "3",
  } as unknown as PlanFlags;

  test("a fuse for each unit is in the cost and said; without it the same bank costs so much less", () => {
    const fused = plan(undefined, { ...CHEAP, limit: "40", fuses: at("catalogs/fuses.csv"), json: true });
    const layouts: readonly { id: string; protection: { cost: number }[]; cost: { total: number } }[] = JSON.parse(
      fused.out,
    ).layouts;
    // a fuse may ask for more in parallel than the energy does; this one is in both plans
    const ids: readonly string[] = JSON.parse(plan(undefined, { ...CHEAP, limit: "40", json: true }).out).layouts.map(
      ({ id }: { id: string }) => id,
    );
    const best = layouts.find(({ id, protection }) => ids.includes(id) && protection.length > 0);
    if (best === undefined) throw new Error("no layout is in both plans");
    expect(best.protection).toMatchObject([{ kind: "fuse", count: expect.any(Number), cost: expect.any(Number) }]);
    const bare = JSON.parse(plan(undefined, { ...CHEAP, limit: "40", json: true }).out).layouts;
    const same = bare.find(({ id }: { id: string }) => id === best.id);
    expect(best.cost.total - same.cost.total).toBeCloseTo(best.protection[0]?.cost as number, 9);
    expect(plan(undefined, { ...CHEAP, fuses: at("catalogs/fuses.csv") }).out).toMatch(
      /fuse +\d+ x lab-fu-\S+ \S+ EUR, in/,
    );
  });

  test("fuses asked by the brief without a catalogue of them, and beside a measured lot, are refused", () => {
    const asked = plan(undefined, { ...CHEAP, fused: true } as unknown as PlanFlags);
    expect([asked.status, asked.err]).toEqual([2, expect.stringMatching(/fuse catalogue/)]);
    const lot = { measured: at("fixtures/units/lot.csv"), basis: "measured", fuses: at("catalogs/fuses.csv") };
    const beside = plan(undefined, { ...CHEAP, ...lot } as unknown as PlanFlags);
    expect([beside.status, beside.err]).toEqual([2, expect.stringMatching(/--fuses/)]);
  });
});

describe("plan and flags that would be ignored", () => {
  test("--part without --measured is refused", () => {
    expect(plan(BRIEF, { part: "lab-pf-330-360" })).toMatchObject({ status: 2, err: expect.stringMatching(/--part/) });
  });
  test("--risk beside the worst case is said not to be used", () => {
    const { status, err } = plan(BRIEF, { risk: "1 %", limit: "1", catalog: [SMALL] });
    expect([status, err]).toEqual([0, expect.stringMatching(/--risk is not used: the basis is worst case/)]);
  });
});
