import { describe, expect, test } from "vitest";
import { fuseText, rateBlocks } from "../../src/cli/shotRateText.ts";
import { shotOf } from "../../src/search/index.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

function blocks(more: Record<string, unknown> = {}, unit = FILM): string {
  const brief = shotBrief(more);
  const shot = shotOf({ layout: shotLayout(brief, undefined, unit), unit, brief });
  if (!shot.ok) throw new Error(JSON.stringify(shot.refusals));
  return rateBlocks(shot.value, 80).join("\n\n");
}

describe("rateBlocks(report, width)", () => {
  test("charging, heat and life only where there is something to say", () => {
    const plain = blocks();
    expect(plain).not.toMatch(/^Charging|^At the rate|^What is stated/m);
    expect(plain).toMatch(/3\.815 times that at its ratings of the 30000 shots rated/);
    const firing = blocks({ rate: "0.1 Hz", charger: { supply: "2.5 kV", resistance: "10 kohm" } });
    expect(firing).toMatch(/charging resistor/);
    expect(firing).toMatch(/worst unit +[\d.]+ A rms/);
  });

  test("life without an exponent is not assessed and says of what", () => {
    const { lifeExponent: _, ...unit } = FILM;
    expect(blocks({}, unit)).toMatch(/not assessed: no exponent or reference for voltage/);
  });

  test("an inconsistent statement is called so", () => {
    expect(blocks({ stated: { peakCurrent: "9 kA", ringFrequency: "1 kHz" } })).toMatch(/INCONSISTENT/);
  });
});

describe("fuseText(choice, width)", () => {
  const sees = { normalAction: 1, faultAction: null, leastFaultAction: null, voltage: 2000 };
  test("nothing asked, no neighbours, none that does", () => {
    expect(fuseText(null, 80)).toBe("");
    expect(fuseText({ count: 0, sees, chosen: null, tried: [] }, 80)).toMatch(/without neighbours/);
    expect(fuseText({ count: 2, sees, chosen: null, tried: [{ fuse: "a", findings: [] }] }, 80)).toMatch(
      /none of 1 does\n +a: not enough can be had/,
    );
  });
});
