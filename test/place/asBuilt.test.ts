import { describe, expect, test } from "vitest";
import { asBuilt } from "../../src/place/asBuilt.ts";
import { place } from "../../src/place/place.ts";
import { stagesGap } from "./brute.ts";

const values = [912, 934, 951, 968, 987, 1003, 1031, 1058, 1092];
const units = values.map((c, i) => ({ serial: String(i), capacitance: c * 1e-6 }));
const request = { series: 3, parallel: 3, ties: "cross-tied" } as const;
const groups = [
  ["0", "1", "2"],
  ["3", "4", "5"],
  ["6", "7", "8"],
];

describe("asBuilt(units, request, groups)", () => {
  test("positions are kept, the gap is theirs, the bound that of the best placing (T2, 1902.7 ppm)", () => {
    const built = asBuilt(units, request, groups);
    if (!built.ok) throw new Error();
    expect(built.value.groups).toEqual(groups);
    const gap = stagesGap(
      values,
      groups.map((group) => group.map(Number)),
    );
    expect(built.value.charging).toMatchObject({ gap: expect.closeTo(gap, 12), proof: "within" });
    expect(built.value.charging.lowerBound * 1e6).toBeCloseTo(1902.708390525102, 6);
  });

  test("the best placing read back is still proven", () => {
    const best = place(units, request);
    const back = best.ok && asBuilt(units, request, best.value.groups);
    expect(back).toMatchObject({ value: { charging: { proof: "optimal" } } });
  });

  test("refuses: a serial unknown or twice, a group too small, groups too few", () => {
    const codes = (list: string[][]) => {
      const read = asBuilt(units, request, list);
      return read.ok ? [] : read.refusals.map((refusal) => refusal.code);
    };
    expect(codes([["0", "1", "x"], groups[1]!, groups[2]!])).toEqual(["place.list-unknown"]);
    expect(codes([["0", "1", "3"], groups[1]!, groups[2]!])).toEqual(["place.duplicate-serial"]);
    expect(codes([["0", "1"], groups[1]!, groups[2]!])).toEqual(["place.list-shape"]);
    expect(codes(groups.slice(1))).toEqual(["place.list-shape"]);
  });
});
