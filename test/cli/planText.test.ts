import { describe, expect, test } from "vitest";
import { planText } from "../../src/cli/planText.ts";
import { widthOf } from "../../src/cli/wrap.ts";
import { plan, type Ranking } from "../../src/search/index.ts";
import { briefOf, FAMILIES, UNIT } from "../support/bank.ts";

const given = new Set(["energy", "voltage", "ripple"]);
function text(more: Record<string, unknown> = {}, width = 80, rank: Ranking = "cost", parts = [UNIT]): string {
  const planned = plan({ brief: briefOf(more), parts, families: FAMILIES, limit: 5, rank });
  if (!planned.ok) throw new Error("must plan");
  return planText({ result: planned.value, parts, given, rank, width, inputs: ["Said about inputs."] });
}

describe("planText(of)", () => {
  test("says what was asked, what is needed, what was searched, the ranking, the best, the front, the cautions", () => {
    const all = text();
    for (const part of [
      /allowed fall +100 %, a full dump/,
      /Capacitance needed: 250 µF/,
      /Searched 1 part; \d+ layouts do it; exhaustive/,
      /Layouts by cost \(first 5 of/,
      /Best: test-1000-400 \d+s\d+p/,
      /Why this one: lowest cost/,
      /Front: \d+/,
      /Said about inputs\./,
      /can kill/,
      /not an approval/,
    ])
      expect(all.replace(/\n {2,}/g, " ")).toMatch(part);
  });

  test("2E/V^2 = 250 uF is what is needed for 500 J at 2 kV", () => {
    expect((2 * 500) / 2000 ** 2).toBe(250e-6);
  });

  test("fits the width at 60, 80 and 120 columns", () => {
    for (const width of [60, 80, 120])
      for (const line of text({}, width).split("\n")) expect(widthOf(line), line).toBeLessThanOrEqual(width);
  });

  test("nothing fits: the reasons in words and the least changes", () => {
    const all = text({ energy: "10 MJ" });
    expect(all).toMatch(/NOTHING FITS/);
    expect(all.replace(/\s+/g, " ")).toMatch(
      /- lower the energy of a pulse from 10 MJ to [\d.]+ kJ: then test-1000-400/,
    );
    expect(all).toMatch(/Refused parts: 1/);
    expect(all).toMatch(/needs \d+ units, limit 2000/);
    expect(all).toMatch(/can kill/);
  });

  test("notes of the plan are printed", () => {
    expect(text({ ageing: "5 %" })).toMatch(/Note: Ageing is counted in energy/);
  });

  test("hostile names reach nothing raw", () => {
    const unit = { ...UNIT, part: "x\u001b]0;t\u0007\u202e" };
    expect(text({ title: "t\u001b[2J" }, 80, "cost", [unit])).not.toMatch(/[\u001b\u0007\u202e]/);
  });
});
