// `plan --blend` through the program: the lab's catalogues, its exit status, what it refuses, and engines put in its place.
import { describe, expect, test } from "vitest";
import { planBlendCommand } from "../../../src/cli/commands/planBlend.ts";
import { run } from "../../../src/cli/program.ts";
import { settleBlend } from "../../../src/search/blend/fallback.ts";
import { rowsOf } from "../../support/blendLab.ts";
import { at, fakePorts, UNSAFE } from "../../support/fakePorts.ts";
import { hardCase } from "../../support/hardCatalogue.ts";

const CATALOGS = ["electrolytic", "film", "oil-and-paper", "drawer"].map((name) => at(`catalogs/${name}.csv`));
const RESISTORS = at("catalogs/resistors.csv");
const LINE = ["--catalog", ...CATALOGS, "--resistors", RESISTORS, "--blend", "--limit", "1"];

async function cli(argv: readonly string[], texts: Record<string, string> = {}) {
  const ports = fakePorts(texts);
  const status = await run(["plan", ...argv], ports);
  return { status, out: ports.printed(), err: ports.told() };
}

describe("plan --blend --json", () => {
  test("adds blends to the plan, at a cost no layout of one part beats, the same bytes each time", async () => {
    for (const name of ["flash-lamp", "pulsed-magnet", "flash-lamp-bounded"]) {
      const brief = at(`fixtures/briefs/${name}.json`);
      const { status, out, err } = await cli([brief, ...LINE, "--json"]);
      expect([status, err], name).toEqual([0, ""]);
      const { blends, blendSearch, layouts, required } = JSON.parse(out);
      expect(blendSearch.status, name).toBe("optimal");
      expect(blends[0].certificate.verdict, name).toBe("valid");
      if (layouts.length > 0) expect(blends[0].cost.total, name).toBeLessThanOrEqual(layouts[0].cost.total);
      expect(blends[0].capacitance.low, name).toBeGreaterThanOrEqual(required.capacitance * (1 - 1e-9));
      if (name === "flash-lamp") expect((await cli([brief, ...LINE, "--json"])).out).toBe(out);
    }
  }, 30_000);
  test("the mix costs less than any one part, by the figures in the catalogue", async () => {
    // 1 mF at 400 V from six of 100 uF at 3 EUR, all there are, and 150 uF at 5: 4 a + 4 b fit exactly, at 32; 6 a + 3 b take 33.
    const csv = rowsOf({ price: 3, available: 6 }, { capacitance: 150, price: 5 });
    const asked = ["--energy", "80 J", "--voltage", "400 V", "--ripple", "100 %", "--basis", "nominal"];
    const { out } = await cli([...asked, "--catalog", "c.csv", "--blend", "--json"], { "c.csv": csv });
    const { blends, layouts } = JSON.parse(out);
    expect(blends[0].strings.map((one: { part: string; parallel: number }) => [one.part, one.parallel])).toEqual([
      ["a", 4],
      ["b", 4],
    ]);
    expect([blends[0].cost.total, layouts[0].cost.total]).toEqual([32, 35]);
    const fee = JSON.parse(
      (await cli([...asked, "--catalog", "c.csv", "--blend", "--line-cost", "4", "--json"], { "c.csv": csv })).out,
    ).blends[0];
    expect([fee.id, fee.cost.total, fee.cost.lines]).toEqual(["b 1s7p strings", 39, 4]);
  });
});

describe("plan --blend as text", () => {
  test("strings, proof and rivals, in at most 80 columns, safe to print", async () => {
    const { status, out } = await cli([
      at("fixtures/briefs/flash-lamp.json"),
      ...LINE,
      "--explain",
      "--within",
      "90 %",
    ]);
    expect(status).toBe(0);
    expect(out).toMatch(/Cheapest blend: /);
    expect(out).toMatch(/How this is known\n {2}1\. /);
    expect(UNSAFE.test(out)).toBe(false);
    expect(Math.max(...out.split("\n").map((line) => line.length))).toBeLessThanOrEqual(80);
  });
  test("nothing fits: exit 1, and what to loosen", async () => {
    const other = await cli([at("fixtures/briefs/flash-lamp.json"), ...LINE, "--max-volume", "1 cm3"]);
    expect(other.status).toBe(1);
    expect(other.out).toMatch(/NO BLEND FITS/);
  });
});

describe("plan --blend refuses", () => {
  test("wrong flags with 2, all at once with the rest", async () => {
    const { status, err } = await cli([...LINE, "--max-types", "0", "--within", "x"]);
    expect(status).toBe(2);
    for (const flag of ["--max-types", "--within", "--energy"]) expect(err).toContain(`${flag}: `);
  });
  test("--explain without --blend", async () => {
    const { status, err } = await cli([at("fixtures/briefs/flash-lamp.json"), "--catalog", ...CATALOGS, "--explain"]);
    expect([status, err]).toEqual([2, expect.stringMatching(/--explain: .*--blend beside it/)]);
  });
  test("two currencies without a rate", async () => {
    const two = at("fixtures/catalogs/bad/two-currencies.csv");
    expect((await cli([at("fixtures/briefs/flash-lamp.json"), "--catalog", two, "--blend"])).status).toBe(2);
  });
});

describe("engines", () => {
  const csv = rowsOf({ price: 3, available: 6 }, { capacitance: 150, price: 5 });
  const flags = {
    energy: "80 J",
    voltage: "400 V",
    ripple: "100 %",
    basis: "nominal",
    catalog: ["c.csv"],
    blend: true,
    limit: "1",
  };
  test("an engine that claims too dear a blend is contradicted: both are printed, nothing is proven", async () => {
    const ports = fakePorts({ "c.csv": csv });
    const settle: typeof settleBlend = async (model, limits) => {
      const honest = await settleBlend(model, limits);
      return { ...honest, status: "infeasible", best: null, lowerBound: Number.POSITIVE_INFINITY, gap: null };
    };
    await planBlendCommand(undefined, { ...flags, json: true }, ports, { settle });
    const { blends, blendSearch } = JSON.parse(ports.printed());
    expect(blendSearch.status).toBe("stopped");
    expect(blendSearch.disagreements).toEqual([
      { engine: "own search", cost: null, id: null },
      { engine: "javascript-lp-solver", cost: 3200, id: "a 1s4p strings + b 1s4p strings" },
    ]);
    expect(blends.map((one: { certificate: unknown }) => one.certificate)).toEqual([null]);
  });
  test("a hard case that is stopped says how far it may be off, and the true bound", async () => {
    const { csv: hard, brief } = hardCase(4, 80);
    const ports = fakePorts({ "h.csv": hard, "b.json": JSON.stringify(brief) });
    const line = ["plan", "b.json", "--catalog", "h.csv", "--blend", "--max-types", "8", "--solver-time", "0.5 s"];
    expect(await run([...line, "--limit", "1", "--json"], ports)).toBe(0);
    const { blends, blendSearch } = JSON.parse(ports.printed());
    expect(blendSearch.status).toBe("stopped");
    expect(blendSearch.gap).toBeGreaterThan(0);
    expect(blendSearch.gap).toBeLessThan(0.5);
    expect(blendSearch.lowerBound).toBeLessThan(blends[0].cost.total);
    expect(blends[0].certificate).toBeNull();
  }, 30_000);
});

describe("plan --blend refuses or flags", () => {
  const asked = ["--energy", "80 J", "--voltage", "400 V", "--ripple", "100 %", "--basis", "nominal", "--limit", "1"];
  const line = [...asked, "--catalog", "c.csv", "--blend"];
  test("the price under which the best part without one would win, and what is known ranked", async () => {
    const { out } = await cli([...line, "--json"], { "c.csv": rowsOf({ price: "" }, { price: 5 }) });
    const { blends, blendSearch } = JSON.parse(out);
    expect(blends[0].strings[0].part).toBe("b");
    expect(blendSearch.winningPrices).toEqual([{ part: "a", below: 5, computed: true, proven: true }]);
  });
  test("a larger quantity at a higher unit price is taken as it stands, and said", async () => {
    const { out, status } = await cli(line, { "c.csv": rowsOf({ price: 5, "price breaks": "10: 6.50" }) });
    expect(status).toBe(0);
    expect(out.replace(/\s+/g, " ")).toContain("A larger quantity has a higher unit price in the list of a");
    expect((await cli(line, { "c.csv": rowsOf({ price: 5 }) })).out).not.toContain("A larger quantity");
  });
  test("a pack larger than the stock: the part is named with both figures", async () => {
    const { out } = await cli([...line, "--json"], { "c.csv": rowsOf({ pack: 25, available: 20 }, { price: 9 }) });
    expect(JSON.parse(out).blendSearch.leftOut).toEqual([{ part: "a", reason: "stock", value: 25, limit: 20 }]);
  });
  test("two currencies without a rate are refused; with one they are one list", async () => {
    const texts = { "c.csv": rowsOf({ currency: "EUR" }, { currency: "USD", price: 3 }) };
    const refused = await cli(line, texts);
    expect([refused.status, refused.err]).toEqual([2, expect.stringContaining("EUR and USD")]);
    const brief = JSON.stringify({
      energy: 80,
      voltage: 400,
      ripple: 1,
      basis: "nominal",
      currency: "EUR",
      exchange: { USD: 0.5 },
    });
    const rated = await cli(["b.json", "--catalog", "c.csv", "--blend", "--limit", "1", "--json"], {
      ...texts,
      "b.json": brief,
    });
    // 10 of b at 3 USD are 15 EUR.
    expect(JSON.parse(rated.out).blends[0].cost).toMatchObject({ total: 15, currency: "EUR" });
  });
  test("ceilings that no bank meets: which to loosen first, alone and together, computed", async () => {
    const tight = [...line, "--max-volume", "0.5 L", "--max-mass", "0.5 kg", "--json"];
    const { out, status } = await cli(tight, { "c.csv": rowsOf({}) });
    const { blends, blendSearch } = JSON.parse(out);
    expect([status, blends, blendSearch.status]).toEqual([1, [], "infeasible"]);
    const by = Object.fromEntries(blendSearch.loosen.map((one: { field: string }) => [one.field, one]));
    // Ten units of 96 cm3 and 100 g: neither limit alone lets them in, twice both does.
    expect([by.maxVolume.to, by.maxMass.to]).toEqual([null, null]);
    expect(by["all ceilings"].to).toBeCloseTo(2, 4);
    expect(by.energy.to).toBeCloseTo(40, 3);
    const text = await cli(tight.slice(0, -1), { "c.csv": rowsOf({}) });
    expect(text.out.replace(/\s+/g, " ")).toContain("raise all limits on room, mass and units together by 100 %");
  });
});
