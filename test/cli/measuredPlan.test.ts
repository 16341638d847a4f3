import { describe, expect, test } from "vitest";
import { at } from "../support/fakePorts.ts";
import { cli } from "../support/placeCli.ts";

const ASKED = ["--energy", "120 J", "--voltage", "1.8 kV", "--ripple", "100 %", "--catalog", at("catalogs/drawer.csv")];
const LOT = ["--measured", at("fixtures/units/lot-200.csv")];
const PART = ["--part", "drawer-pf-330-360"];

describe("plan --basis measured", () => {
  test("the measured lot supports fewer in series than the worst case, and what it saves is said", async () => {
    const { status, out } = await cli(["plan", ...ASKED, ...LOT, ...PART, "--basis", "measured", "--json"]);
    const found = JSON.parse(out);
    expect(status).toBe(0);
    const { measured, worstCase } = found.measured.leastSeries;
    expect(measured.series).toBeLessThan(worstCase.series);
    expect(found.measured.placed.length).toBe(found.layouts.length);
    for (const { charging, energy } of found.measured.placed) {
      expect(charging).toBeLessThanOrEqual(324 * (1 + 1e-9));
      expect(energy).toBeGreaterThanOrEqual(120);
    }
    expect(found.layouts.every((layout: { units: number }) => layout.units <= 200)).toBe(true);
    const text = await cli(["plan", ...ASKED, ...LOT, ...PART, "--basis", "measured", "--limit", "1"]);
    expect(text.out).toMatch(/Measuring\s+saves \d+\s+in\s+series/);
  }, 30_000);

  test("refused: the basis without units, units without the basis, no telling which part", async () => {
    const say = async (...more: string[]) => {
      const { status, err } = await cli(["plan", ...ASKED, ...more]);
      expect(status).toBe(2);
      return err;
    };
    expect(await say("--basis", "measured")).toMatch(/--measured: something needed was not given/);
    expect(await say(...LOT)).toMatch(/values contradict each other: read basis worst case/);
    expect(await say(...LOT, "--basis", "measured")).toMatch(/name it with --part/);
    expect(await say(...LOT, "--basis", "measured", "--part", "x")).toMatch(/no catalogue has this part/);
  });

  test("a lot that is not the part is refused, and strays of it are named, by plan and by place", async () => {
    const lot = (...micro: number[]) => ["serial,capacitance [uF]", ...micro.map((c, i) => `u${i},${c}`)].join("\n");
    const near = [330, 331, 332, 333, 334, 335, 336, 337, 338];
    const texts = { "other.csv": lot(...near.map((c) => c / 2)), "stray.csv": lot(185, ...near) };
    const plan = ["plan", ...ASKED, ...PART, "--basis", "measured", "--limit", "1", "--measured"];
    const place = ["place", "--series", "2", "--parallel", "2", "--ties", "cross-tied", "--catalog"];
    const placed = [...place, at("catalogs/drawer.csv"), ...PART, "--measured"];
    for (const argv of [plan, placed]) {
      const other = await cli([...argv, "other.csv"], texts);
      expect([other.status, other.err]).toEqual([2, expect.stringMatching(/not of this part: read 9 of 9 units/)]);
      const stray = await cli([...argv, "stray.csv"], texts);
      expect(stray.out.replace(/\s+/g, " ")).toMatch(/1 of 10 units lie outside the tolerance .*u0 \(185 µF\)/);
    }
  }, 30_000);

  test("check does not take the basis on trust", async () => {
    const argv = ["check", ...ASKED, ...PART, "--series", "6", "--parallel", "2", "--ties", "cross-tied"];
    const { status, err } = await cli([...argv, "--basis", "measured"]);
    expect([status, err]).toEqual([2, expect.stringMatching(/where the units judge/)]);
  });
});
