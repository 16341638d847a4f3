// `plan --basis statistical --measured`: the risk of the lot's own spread, against banks drawn from it one by one.
import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { readMeasured } from "../../src/catalog/index.ts";
import { got } from "../pulse/near.ts";
import { at } from "../support/fakePorts.ts";
import { cli } from "../support/placeCli.ts";
import { chance } from "../support/random.ts";

const ASKED = ["--energy", "120 J", "--voltage", "1.8 kV", "--ripple", "100 %", "--catalog", at("catalogs/drawer.csv")];
const LOT = at("fixtures/units/lot-200.csv");
const GIVEN = [...ASKED, "--measured", LOT, "--part", "drawer-pf-330-360", "--basis", "statistical"];

describe("plan --basis statistical --measured FILE", () => {
  test("a tight lot needs no more in series than its tolerance does, and the law is named", async () => {
    const lot = JSON.parse((await cli(["plan", ...GIVEN, "--json"])).out);
    const stated = JSON.parse((await cli(["plan", ...ASKED, "--basis", "statistical", "--json", "--limit", "0"])).out);
    const least = (found: { layouts: { part: string; series: number }[] }) =>
      Math.min(...found.layouts.filter(({ part }) => part === "drawer-pf-330-360").map(({ series }) => series));
    expect(lot.searched.parts).toBe(1);
    expect(least(lot)).toBeLessThanOrEqual(least(stated));
    expect(lot.layouts[0].risk.law).toMatch(/as the 200 measured units/);
    expect(lot.measured).toEqual({ part: "drawer-pf-330-360", units: 200, findings: [] });
    for (const { risk } of lot.layouts) expect(risk.exceed).toBeLessThanOrEqual(1e-4);
  }, 30_000);

  test("a risk borne of one in five: of 20 000 banks drawn from the lot as many exceed as was said, within four deviations", async () => {
    // A part that hardly leaks, so that its resistors are never what decides, charged near what the even share allows.
    const part = "part,capacitance [uF],voltage [V],tolerance [%],leakage [uA]\ndry,330,360,20,0.01\n";
    const texts = { "dry.csv": part, "lot.csv": readFileSync(LOT, "utf8") };
    const asked = ["plan", "--energy", "120 J", "--voltage", "1.84 kV", "--ripple", "100 %", "--catalog", "dry.csv"];
    const tight = ["--resistors", at("catalogs/resistors.csv")];
    const lot = ["--measured", "lot.csv", "--part", "dry", "--basis", "statistical", "--risk", "0.2"];
    const { layouts } = JSON.parse((await cli([...asked, ...tight, ...lot, "--json", "--limit", "0"], texts)).out);
    const risky = layouts.find(({ risk }: { risk: { exceed: number } }) => risk.exceed > 0.01);
    expect(risky).toBeDefined();
    const values = got(readMeasured(readFileSync(LOT, "utf8"), "lot")).units.map((unit) => unit.capacitance);
    const c = chance(5);
    const { series, parallel, ties, share } = risky;
    let over = 0;
    for (let t = 0; t < 20_000; t++) {
      const stage = () => {
        let sum = 0;
        for (let k = 0; k < (ties === "cross-tied" ? parallel : 1); k++) sum += c.pick(values);
        return sum;
      };
      let worst = 0;
      for (let chain = 0; chain < (ties === "cross-tied" ? 1 : parallel); chain++) {
        const stages = Array.from({ length: series }, stage);
        const elastance = stages.reduce((sum, one) => sum + 1 / one, 0);
        worst = Math.max(worst, 1840 / Math.min(...stages) / elastance);
      }
      if (worst > share.limit) over++;
    }
    const { exceed, error } = risky.risk;
    const deviation = Math.sqrt((exceed * (1 - exceed)) / 20_000);
    expect(Math.abs(over / 20_000 - exceed)).toBeLessThan(4 * deviation + error);
  }, 60_000);

  test("said in words; fewer than five units are no lot; a basis that does not ask for units refuses them", async () => {
    const text = await cli(["plan", ...GIVEN, "--limit", "1"]);
    expect(text.out.replace(/\s+/g, " ")).toContain("each unit is drawn from the 200 measured ones");
    expect(text.out.replace(/\s+/g, " ")).toMatch(/up to one in 66 of all such units may lie outside the lot/);
    expect(text.out.replace(/\s+/g, " ")).toMatch(/statistical, risk 0\.0001, drawn from the 200 measured units/);
    expect(text.out.replace(/\s+/g, " ")).not.toMatch(/uniform within the tolerance/);
    const few = "serial,capacitance [uF]\na,330\nb,331\nc,329\n";
    const small = await cli(
      ["plan", ...ASKED, "--basis", "statistical", "--part", "drawer-pf-330-360", "--measured", "few.csv"],
      { "few.csv": few },
    );
    expect([small.status, small.err]).toEqual([2, expect.stringMatching(/at least 5 measured units/)]);
    const wrong = await cli(["plan", ...ASKED, "--basis", "nominal", "--measured", LOT]);
    expect([wrong.status, wrong.err]).toEqual([2, expect.stringMatching(/basis nominal/)]);
  }, 30_000);
});
