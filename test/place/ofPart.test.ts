import { describe, expect, test } from "vitest";
import { anotherPart, ofPartFindings, outsideTolerance } from "../../src/place/ofPart.ts";

const part = { part: "k-1500", capacitance: 1500e-6, tolerance: { low: 0.2, high: 0.2 } };
const lot = (...micro: readonly number[]) => micro.map((c, i) => ({ serial: `U${i + 1}`, capacitance: c * 1e-6 }));
const ten = [1400, 1450, 1500, 1550, 1500, 1490, 1480, 1510, 1600, 1700];

describe("outsideTolerance(units, part, uncertainty)", () => {
  test("1200 to 1800 uF, two uncertainties of the meter given away; no tolerance, nothing told", () => {
    const units = lot(1192, 1194, 1500, 1806, 1812);
    expect(outsideTolerance(units, part, 0.003).map((u) => u.serial)).toEqual(["U1", "U5"]);
    const { tolerance: _, ...open } = part;
    expect(outsideTolerance(units, open, 0.003)).toEqual([]);
  });
});

describe("ofPartFindings and anotherPart(units, part, uncertainty)", () => {
  test("all within: no finding, no refusal", () => {
    expect(ofPartFindings(lot(...ten), part, 0.003)).toEqual([]);
    expect(anotherPart(lot(...ten), part, 0.003)).toBeNull();
  });
  test("one in ten is a warning, more a fail, each named with its value", () => {
    expect(ofPartFindings(lot(845, ...ten.slice(1)), part, 0.003)).toMatchObject([{ verdict: "warn", value: 1 }]);
    const [found] = ofPartFindings(lot(845, 846, ...ten.slice(2)), part, 0.003);
    expect(found).toMatchObject({ verdict: "fail", value: 2 });
    expect(found?.note).toMatch(/2 of 10 units .*k-1500, 1\.2 mF to 1\.8 mF: U1 \(845 .F\), U2 \(846 .F\)/);
  });
  test("nearly all outside is another part: refused, with what would be accepted", () => {
    expect(anotherPart(lot(...ten.map((c) => c - 650)), part, 0.003)).toMatchObject({
      code: "place.another-part",
      read: expect.stringMatching(/10 of 10 units/),
      want: expect.stringMatching(/1\.2 mF to 1\.8 mF/),
    });
    expect(anotherPart(lot(845, ...ten.slice(1)), part, 0.003)).toBeNull();
  });
});
