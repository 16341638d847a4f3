import { describe, expect, test } from "vitest";
import { gapWords } from "../../src/cli/placeText.ts";
import { at, UNSAFE } from "../support/fakePorts.ts";
import { cli, lotCsv, SMALL, SMALL_ARGV, shape } from "../support/placeCli.ts";

describe("gapWords(gap)", () => {
  test("ppm below a tenth of a per cent, per cent above, rounded up", () => {
    expect([0, 1e-9, 1.54415e-6, 648.7738e-6, 0.0237211].map(gapWords)).toEqual([
      "0 ppm",
      "under 0.01 ppm",
      "1.55 ppm",
      "649 ppm",
      "2.38 %",
    ]);
  });
});

describe("place as text", () => {
  test("no more digits of a voltage than the meter supports; within 80 columns", async () => {
    const { out } = await cli([...SMALL_ARGV, "--uncertainty", "0.3 %"], { "lot.csv": SMALL });
    expect(out).toMatch(/worst at 33\.\d % of the bank, 33\d(\.\d)? V, \+-0\.43 % by the meter/);
    expect(out).toMatch(/proven optimal/);
    expect(Math.max(...out.split("\n").map((line) => line.length))).toBeLessThanOrEqual(80);
  });

  test("with the part's catalogue it says what measuring saved", async () => {
    const lot = lotCsv([330, 331, 332, 333]);
    const argv = ["place", ...shape(2, 2, "cross-tied"), "--measured", "l.csv", "--catalog", at("catalogs/drawer.csv")];
    const { out } = await cli([...argv, "--part", "drawer-pf-330-360", "--voltage", "600 V"], { "l.csv": lot });
    expect(out).toMatch(
      /measuring saved +the worst case of the tolerance is 3\d\d\.?\d* V on a unit while\s+charging; measured and\s+placed it is 300/,
    );
  });

  test("no serial reaches the terminal raw", async () => {
    const lot = 'serial,capacitance [uF]\n"a\u001b[2J",470\nb\u202e,471\n';
    const { out, err } = await cli(["place", ...shape(2, 1, "strings"), "--measured", "l.csv"], { "l.csv": lot });
    expect(UNSAFE.test(out + err)).toBe(false);
  });
});
