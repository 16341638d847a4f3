import { describe, expect, test } from "vitest";
import cases from "../../fixtures/placing/cases.json" with { type: "json" };
import { place, placing } from "../../src/place/place.ts";
import type { Placing } from "../../src/place/placing.ts";
import type { PlaceRequest } from "../../src/place/request.ts";
import { bestGap, stagesGap, stringsGap } from "./brute.ts";
import { capacitances, KINDS, units, wholes } from "./lots.ts";
import { cutRival, differencingRival, largestFirstRival, snakeRival } from "./rivals.ts";

const done = (lot: Parameters<typeof place>[0], request: PlaceRequest): Placing => {
  const read = place(lot, request);
  if (!read.ok) throw new Error(read.refusals.map((r) => `${r.code} ${r.read}`).join());
  return read.value;
};
const measured = (values: readonly number[], step = 1e-7) =>
  values.map((c, i) => ({ serial: String(i), capacitance: c * step }));
const indices = ({ groups }: Placing) => groups.map((group) => group.map(Number));

describe("place(units, request): reference instances with proven optima", () => {
  const optimumOf = (c: (typeof cases.cases)[number] | (typeof cases.tiny)[number]): number =>
    "dynamic" in c ? c.dynamic.optimal.gap_ppm : c.optimal.gap_ppm;
  test.each([...cases.cases, ...cases.tiny].map((c) => [c.id, c] as const))("%s", (_, c) => {
    const cross = c.topology === "matrix";
    const made = done(measured(c.C), { series: c.n_s, parallel: c.n_p, ties: cross ? "cross-tied" : "strings" });
    const optimum = optimumOf(c);
    expect(Math.abs(made.charging.gap * 1e6 - optimum)).toBeLessThanOrEqual(1e-9 * optimum + 1e-6);
    expect(made.charging.proof).toBe("optimal");
    expect((cross ? stagesGap : stringsGap)(c.C, indices(made)) * 1e6).toBeCloseTo(optimum, 5);
    expect(made.charging.worst).toBeCloseTo((1 + optimum / 1e6) / c.n_s, 12);
  });
});

describe("place(units, request): full enumeration", () => {
  const shapes = [
    [2, 2, 1],
    [3, 2, 1],
    [2, 3, 2],
    [3, 3, 0],
    [4, 2, 0],
    [4, 1, 3],
    [2, 4, 1],
    [5, 2, 0],
    [6, 1, 1],
    [1, 4, 2],
  ] as const;
  test.each(["cross-tied", "strings"] as const)("%s: proven and equal to it, 120 lots", (ties) => {
    for (let seed = 1; seed <= 120; seed++) {
      const [series, parallel, spares] = shapes[seed % shapes.length]!;
      const values = wholes(series * parallel + spares, seed);
      const made = done(measured(values), { series, parallel, ties, outliers: "keep" });
      const shape = ties === "cross-tied" ? { groups: series, size: parallel } : { groups: parallel, size: series };
      const best = bestGap(values, shape, ties === "cross-tied" ? stagesGap : stringsGap);
      expect(made.charging.gap).toBeCloseTo(best, 11);
      expect(made.charging.proof).toBe("optimal");
    }
  });
});

describe("place(units, request): published rules as rivals", () => {
  test("snake, largest first and largest differencing never do better, 200 lots", () => {
    const shapes = [
      [4, 4],
      [6, 10],
      [8, 12],
      [7, 4],
      [5, 3],
    ] as const;
    for (let seed = 1; seed <= 200; seed++) {
      const [series, parallel] = shapes[seed % shapes.length]!;
      const lot = capacitances(KINDS[seed % 4]!, series * parallel, seed);
      const made = done(measured(lot, 1), { series, parallel, ties: "cross-tied", moves: 3e5 });
      for (const rule of [snakeRival, largestFirstRival, differencingRival]) {
        expect(made.charging.gap).toBeLessThanOrEqual(stagesGap(lot, rule(lot, series)) + 1e-12);
      }
      expect(made.charging.lowerBound).toBeLessThanOrEqual(made.charging.gap);
    }
  });
  test("strings: never worse than sort-and-cut, 40 lots", () => {
    for (let seed = 1; seed <= 40; seed++) {
      const lot = capacitances(KINDS[seed % 4]!, 60, seed);
      const made = done(measured(lot, 1), { series: 6, parallel: 10, ties: "strings", moves: 1e5 });
      expect(made.charging.gap).toBeLessThanOrEqual(stringsGap(lot, cutRival(lot, 6)) + 1e-12);
    }
  });
});

describe("place(units, request): the answer", () => {
  const lot = units("uniform", 66, 3, 0.5);
  const request: PlaceRequest = { series: 6, parallel: 10, ties: "cross-tied", seed: 5 };

  test("every unit is in one group or a spare; shares, gap and bound agree; digits follow the meter", () => {
    const made = done(lot, request);
    expect([...made.groups.flat(), ...made.spares].sort()).toEqual(lot.map((unit) => unit.serial).sort());
    expect(made.groups.every((group) => group.length === 10)).toBe(true);
    const values = lot.map((unit) => unit.capacitance);
    const at = made.groups.map((group) => group.map((s) => lot.findIndex((unit) => unit.serial === s)));
    expect(stagesGap(values, at)).toBeCloseTo(made.charging.gap, 11);
    expect(
      stagesGap(
        lot.map((unit) => unit.leakage!),
        at,
      ),
    ).toBeCloseTo(made.holding!.gap, 11);
    expect(made.charging.gap).toBeLessThanOrEqual(0.3 * made.floor + 1e-12);
    expect(made.holding!.gap).toBeLessThan(0.02);
    expect(made.digits).toBe(3);
  });
  test("the same seed and moves give the same bytes; another seed may not, but is as good", () => {
    const text = JSON.stringify(done(lot, request));
    expect(JSON.stringify(done(lot, request))).toBe(text);
    expect(done(lot, { ...request, seed: 6 }).charging.gap).toBeLessThan(0.3 * done(lot, request).floor + 1e-12);
  });
  test("progress is told; a caller who says stop still gets a whole placing with its bound", () => {
    const steps = placing(units("lots", 100, 2), {
      series: 8,
      parallel: 12,
      ties: "cross-tied",
      stopAtFloor: false,
      moves: 1e6,
    });
    const phases = new Set<string>();
    for (let step = steps.next(); !step.done; step = steps.next()) phases.add(step.value.phase);
    expect(phases.has("exchange")).toBe(true);
    const stopped = done(lot, { ...request, within: () => false });
    expect(stopped.groups.flat().length).toBe(60);
    expect(stopped.charging.proof).toBe("within");
    expect(stopped.charging.lowerBound).toBeLessThanOrEqual(stopped.charging.gap);
  });
  test("spares: the worst leakage is set aside, the wild unit before it", () => {
    const odd = lot.map((unit, i) =>
      i === 7 ? { ...unit, leakage: 3e-3 } : i === 9 ? { ...unit, capacitance: 2e-3 } : unit,
    );
    const made = done(odd, request);
    expect(made.spares).toEqual(expect.arrayContaining(["U008", "U010"]));
    expect(made.rejected.map((o) => o.serial)).toContain("U010");
    const wild = made.findings.find((f) => f.id === "place.wild-unit")!;
    expect(wild.note).toContain("U010");
    expect(wild.value!).toBeGreaterThan(wild.limit!);
  });
  test("missing leakage: placed by capacitance, and said so", () => {
    const made = done(lot.with(0, { serial: "U001", capacitance: 1e-3 }), request);
    expect(made.holding).toBeNull();
    expect(made.findings.find((f) => f.state === "holding")).toMatchObject({ verdict: "not assessed" });
  });
  test("wishes: pins kept, lots apart, sizes apart; wishes that do not fit are refused", () => {
    const marked = units("lots", 24, 4).map((unit, i) => ({ ...unit, lot: i % 2 ? "A" : "B" }));
    const asked: PlaceRequest = { series: 4, parallel: 5, ties: "cross-tied", lots: "apart" };
    const pins = [{ serial: "U001", group: 2 }];
    const made = done(marked, { ...asked, pins });
    expect(made.groups[2]).toContain("U001");
    for (const group of made.groups) {
      expect(new Set(group.map((s) => marked.find((unit) => unit.serial === s)!.lot)).size).toBe(1);
    }
    const refusedRead = place(marked.slice(0, 20), { ...asked, pins: [...pins, { serial: "U002", group: 2 }] });
    expect(refusedRead.ok ? "" : refusedRead.refusals[0]!.code).toBe("place.constraints");
  });
  test("the charging limit is kept while holding is improved", () => {
    const made = done(lot, { ...request, chargingLimit: 5e-4 });
    expect(made.charging.gap).toBeLessThanOrEqual(5e-4);
  });
});
