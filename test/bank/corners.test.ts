// Worst corners against every corner there is, for n up to 5, and against the worked examples.
import { describe, expect, test, vi } from "vitest";
import { type Chain, chargingShares, endOfHold, type Stage } from "../../src/bank/chain.ts";
import { chargingCorners, dumpedCorners, holdingCorners } from "../../src/bank/corners.ts";
import { type StageRange, stageRange } from "../../src/bank/cornersRange.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const KEYS = ["capacitance", "leakageCurrent", "conductance", "resistance"] as const;
const draw = uniformFrom(streamState(99, 0));

/** Every chain at the corners of the quantities named; the others at their greatest. */
function* everyCorner(ranges: readonly StageRange[], keys: readonly (keyof Stage)[]): Generator<Chain> {
  const bits = ranges.length * keys.length;
  for (let set = 0; set < 1 << bits; set++) {
    yield ranges.map((range, i) => {
      const stage: Record<keyof Stage, number> = { capacitance: 0, leakageCurrent: 0, conductance: 0, resistance: 0 };
      for (const key of KEYS) {
        const bit = keys.indexOf(key);
        stage[key] = bit >= 0 && (set >> (i * keys.length + bit)) & 1 ? range[key].low : range[key].high;
      }
      return stage;
    });
  }
}

const someRanges = (n: number, resistance: () => number | null): readonly StageRange[] =>
  Array.from({ length: n }, () =>
    stageRange({
      units: 1 + Math.floor(3 * draw()),
      capacitance: 0.5 + draw(),
      tLow: 0.3 * draw(),
      tHigh: 0.5 * draw(),
      leakage: 0.02 * draw(),
      insulation: draw() < 0.5 ? Number.POSITIVE_INFINITY : 1e3 + 1e4 * draw(),
      resistance: resistance(),
      q: 0.1 * draw(),
    }),
  );

describe("chargingCorners(ranges, V)", () => {
  test("methods A1: 533.333 V and 290.909 V, and says why [methods-derived A1]", () => {
    const ranges = Array.from({ length: 4 }, () =>
      stageRange({
        units: 5,
        capacitance: 3300e-6,
        tLow: 0.2,
        tHigh: 0.2,
        leakage: 0,
        insulation: Infinity,
        resistance: null,
        q: 0,
      }),
    );
    const { highest, lowest } = chargingCorners(ranges, 1600);
    expect(highest.voltage).toBeCloseTo(533.333333333, 8);
    expect(lowest.voltage).toBeCloseTo(290.909090909, 8);
    expect(highest.words).toBe("stage 1 at -20 %, the rest at +20 %");
    expect(lowest.words).toBe("stage 1 at +20 %, the rest at -20 %");
  });

  test("one stage has it all; no tolerance has no corner", () => {
    const range = stageRange({
      units: 1,
      capacitance: 1,
      tLow: 0,
      tHigh: 0,
      leakage: 0,
      insulation: Infinity,
      resistance: null,
      q: 0,
    });
    expect(chargingCorners([range], 50).highest).toMatchObject({ voltage: 50, stage: 0, words: "every stage alike" });
  });

  test("equals the best of all 2^n corners, unlike stages, n = 2..5", () => {
    for (let k = 0; k < 60; k++) {
      const ranges = someRanges(2 + (k % 4), () => null);
      const all = [...everyCorner(ranges, ["capacitance"])].flatMap((chain) => chargingShares(chain));
      const { highest, lowest } = chargingCorners(ranges, 1);
      expect(highest.voltage).toBeCloseTo(Math.max(...all), 13);
      expect(lowest.voltage).toBeCloseTo(Math.min(...all), 13);
    }
  });
});

describe("holdingCorners(ranges, V)", () => {
  test("methods A4: 449.184615 V, and says why [methods-derived A4]", () => {
    const ranges = Array.from({ length: 4 }, () =>
      stageRange({
        units: 1,
        capacitance: 1,
        tLow: 0,
        tHigh: 0,
        leakage: 1e-3,
        insulation: Infinity,
        resistance: 24e3,
        q: 0.05,
      }),
    );
    const { highest } = holdingCorners(ranges, 1600);
    expect(highest.voltage).toBeCloseTo(449.184615, 6);
    expect(highest.words).toBe(
      "stage 1 with no leakage, the rest with the greatest leakage; stage 1 resistor at +5 %, the rest resistor at -5 %",
    );
  });

  test("where nothing conducts a hold leaves what charging gave: 533.333 V and 290.909 V of methods A1, and a dump nothing", () => {
    const ranges = Array.from({ length: 4 }, () =>
      stageRange({
        units: 5,
        capacitance: 3300e-6,
        tLow: 0.2,
        tHigh: 0.2,
        leakage: 0,
        insulation: Infinity,
        resistance: null,
        q: 0,
      }),
    );
    const { highest, lowest } = holdingCorners(ranges, 1600);
    expect(highest.voltage).toBeCloseTo(533.333333333, 8);
    expect(lowest.voltage).toBeCloseTo(290.909090909, 8);
    expect(dumpedCorners(ranges, 1600, "held").lowest.voltage).toBeCloseTo(0, 9);
  });

  test("equals the best of all 4^n corners of leakage and resistor, n = 2..5, even where stages run dry", () => {
    for (let k = 0; k < 40; k++) {
      const n = 2 + (k % 4);
      const ranges = someRanges(n, () => 50 + (k < 20 ? 100 : 3e4) * draw());
      let high = 0;
      let low = Infinity;
      for (const chain of everyCorner(ranges, ["leakageCurrent", "resistance"])) {
        const v = endOfHold(
          chain.map((stage, i) => ({ ...stage, conductance: ranges[i]!.conductance.low })),
          10 * n,
        )!;
        high = Math.max(high, ...v);
        low = Math.min(low, ...v);
      }
      const bare = ranges.map((range) => ({ ...range, conductance: { low: 0, nominal: 0, high: 0 } }));
      const { highest, lowest } = holdingCorners(bare, 10 * n);
      expect(highest.voltage).toBeCloseTo(high, 9);
      expect(lowest.voltage).toBeCloseTo(low, 9);
    }
  });

  test("equals the best of all 8^n corners of leakage, insulation and resistor, n = 2..4", () => {
    for (let k = 0; k < 24; k++) {
      const n = 2 + (k % 3);
      const ranges = someRanges(n, () => 50 + 3000 * draw());
      let high = 0;
      let low = Infinity;
      for (const chain of everyCorner(ranges, ["leakageCurrent", "conductance", "resistance"])) {
        const v = endOfHold(chain, 20 * n)!;
        high = Math.max(high, ...v);
        low = Math.min(low, ...v);
      }
      const { highest, lowest } = holdingCorners(ranges, 20 * n);
      expect(highest.voltage).toBeCloseTo(high, 9);
      expect(lowest.voltage).toBeCloseTo(low, 9);
    }
  });
});

describe("dumpedCorners(ranges, V, from)", () => {
  test("methods A3: -133.333 V and +109.091 V from an equalised hold [methods-derived A3]", () => {
    const ranges = Array.from({ length: 4 }, () =>
      stageRange({
        units: 1,
        capacitance: 1,
        tLow: 0.2,
        tHigh: 0.2,
        leakage: 0,
        insulation: Infinity,
        resistance: 1e4,
        q: 0.05,
      }),
    );
    const { highest, lowest } = dumpedCorners(ranges, 1600, "equalised");
    expect(lowest.voltage).toBeCloseTo(-133.333333333, 8);
    expect(highest.voltage).toBeCloseTo(109.090909091, 8);
    expect(lowest.words).toBe("stage 1 at -20 %, the rest at +20 %");
  });

  test("held: the words name what the hold did as well as the capacitance", () => {
    const ranges = Array.from({ length: 4 }, () =>
      stageRange({
        units: 1,
        capacitance: 1,
        tLow: 0.2,
        tHigh: 0.2,
        leakage: 1e-3,
        insulation: Infinity,
        resistance: 24e3,
        q: 0.05,
      }),
    );
    expect(dumpedCorners(ranges, 1600, "held").lowest.words).toBe(
      "stage 1 at -20 %, the rest at +20 %; stage 1 with the greatest leakage, the rest with no leakage; stage 1 resistor at -5 %, the rest resistor at +5 %",
    );
    expect(dumpedCorners(ranges, 1600, "equalised").lowest.words).toBe("stage 1 at -20 %, the rest at +20 %");
  });

  test("held: equals the best of all 8^n corners of C, leakage and resistor, n = 2..4", () => {
    for (let k = 0; k < 24; k++) {
      const n = 2 + (k % 3);
      const ranges = someRanges(n, () => 50 + 3000 * draw()).map((range) => ({
        ...range,
        conductance: { low: 0, nominal: 0, high: 0 },
      }));
      let high = -Infinity;
      let low = Infinity;
      for (const chain of everyCorner(ranges, ["capacitance", "leakageCurrent", "resistance"])) {
        const held = endOfHold(chain, 20 * n)!;
        for (const [i, share] of chargingShares(chain).entries()) {
          high = Math.max(high, held[i]! - 20 * n * share);
          low = Math.min(low, held[i]! - 20 * n * share);
        }
      }
      const { highest, lowest } = dumpedCorners(ranges, 20 * n, "held");
      expect(highest.voltage).toBeCloseTo(high, 9);
      expect(lowest.voltage).toBeCloseTo(low, 9);
    }
  });
});
