// Worst shares against brute force over every corner, against the circuit equations solved by ml-matrix, and the worked numbers.
import { Matrix, solve } from "ml-matrix";
import { describe, expect, test } from "vitest";
import {
  chargingLeast,
  chargingWorst,
  type HoldingChain,
  holdingLine,
  holdingWorst,
  largestBalance,
  leftAfterDump,
} from "../../src/bank/share.ts";
import { chance } from "../support/random.ts";

const TWENTY = { low: 0.2, high: 0.2 };
/** Closed forms in doubles against a solver in doubles. */
const near = (a: number, b: number, relative = 1e-9): void =>
  expect(Math.abs(a - b), `${a} for ${b}`).toBeLessThanOrEqual(relative * Math.abs(b));

/** Node voltages of stages in series between V and zero, by nodal analysis: any admittance a stage, and a current drawn in parallel. */
function stageVolts(volts: number, admittance: readonly number[], drawn: readonly number[]): readonly number[] {
  const n = admittance.length;
  if (n === 1) return [volts];
  // Unknown: the n - 1 inner nodes, from the top. Sum of currents into each is zero.
  const a = Matrix.zeros(n - 1, n - 1);
  const b = Matrix.zeros(n - 1, 1);
  for (let k = 0; k < n - 1; k++) {
    const [up, down] = [admittance[k]!, admittance[k + 1]!];
    a.set(k, k, up + down);
    if (k > 0) a.set(k, k - 1, -up);
    else b.set(k, 0, up * volts);
    if (k < n - 2) a.set(k, k + 1, -down);
    b.set(k, 0, b.get(k, 0) + drawn[k]! - drawn[k + 1]!);
  }
  const nodes = [volts, ...solve(a, b).to1DArray(), 0];
  return admittance.map((_, k) => nodes[k]! - nodes[k + 1]!);
}

/** Every way to give n stages one of `choices` each. */
function* corners<T>(n: number, choices: readonly T[]): Generator<readonly T[]> {
  if (n === 0) yield [];
  else for (const rest of corners(n - 1, choices)) for (const one of choices) yield [one, ...rest];
}

describe("chargingWorst(voltage, series, tolerance)", () => {
  test("one in series carries all, whatever the tolerance", () => expect(chargingWorst(500, 1, TWENTY)).toBe(500));
  test("no tolerance: the even share", () => near(chargingWorst(1600, 4, { low: 0, high: 0 }), 400));
  test("worked number A1: 533.333333 V, least 290.909091 V, of 1600 V on four at 20 %", () => {
    near(chargingWorst(1600, 4, TWENTY), 1600 / 3);
    near(chargingLeast(1600, 4, TWENTY), 290.909091, 1e-8);
    near(chargingWorst(1, 4, TWENTY), 0.333333333, 1e-8);
    near(chargingWorst(1350, 4, TWENTY), 450);
  });
  test("two stages: the textbook (1 + t)/2", () => near(chargingWorst(100, 2, TWENTY), 60));

  test("series C, sharing and the worst of all 2^n corners, n to 5, against nodal analysis: equal to 1e-9", () => {
    const c = chance(1);
    for (const n of [1, 2, 3, 4, 5]) {
      for (let i = 0; i < 10; i++) {
        const tolerance = { low: c.between(0, 0.6), high: c.between(0, 1) };
        const volts = c.between(1, 5000);
        let [most, least] = [0, Number.POSITIVE_INFINITY];
        for (const units of corners(n, [1 - tolerance.low, 1 + tolerance.high])) {
          const shares = stageVolts(
            volts,
            units,
            units.map(() => 0),
          );
          most = Math.max(most, ...shares);
          least = Math.min(least, ...shares);
          // The charge through the top stage over the whole voltage is the series capacitance.
          near((shares[0]! * units[0]!) / volts, 1 / units.reduce((sum, u) => sum + 1 / u, 0));
        }
        near(chargingWorst(volts, n, tolerance), most);
        near(chargingLeast(volts, n, tolerance), least);
      }
    }
  });

  test("the same bound holds cross-tied: a stage of units is no lower than all of them low, over all corners of 3 stages of 2", () => {
    let most = 0;
    for (const units of corners(6, [0.8, 1.2])) {
      const stages = [0, 2, 4].map((k) => units[k]! + units[k + 1]!);
      most = Math.max(most, ...stageVolts(900, stages, [0, 0, 0]));
    }
    near(chargingWorst(900, 3, TWENTY), most);
  });
});

describe("leftAfterDump(voltage, series, tolerance)", () => {
  test("one in series keeps nothing, not a rounding, 300 volts and tolerances", () => {
    for (let i = 1; i <= 300; i++)
      expect(leftAfterDump(i * 7.7, 1, { low: i / 1000, high: i / 700 })).toEqual({ low: 0, high: 0 });
  });
  test("worked number A3: -133.333333 V and 109.090909 V", () => {
    const left = leftAfterDump(1600, 4, TWENTY);
    near(left.low, -400 / 3);
    near(left.high, 109.090909, 1e-8);
  });

  test("charge taken equally from evened-out stages: the worst of all corners, n to 5, and the ends read zero", () => {
    for (const n of [2, 3, 4, 5]) {
      let [low, high] = [0, 0];
      for (const units of corners(n, [0.9, 1.5])) {
        const charge = 1000 / units.reduce((sum, u) => sum + 1 / u, 0);
        const left = units.map((u) => 1000 / n - charge / u);
        near(left.reduce((a, b) => a + b, 0) + 1000, 1000);
        low = Math.min(low, ...left);
        high = Math.max(high, ...left);
      }
      const found = leftAfterDump(1000, n, { low: 0.1, high: 0.5 });
      near(found.low, low);
      near(found.high, high);
    }
  });
});

const chain = (over: Partial<HoldingChain>): HoldingChain => ({
  voltage: 1600,
  series: 4,
  sharing: 1,
  spread: 0.05,
  leak: { kind: "current", amperes: 0.001 },
  ...over,
});

describe("holdingWorst(chain, resistance)", () => {
  test("one in series: all of it and not a rounding more or less, 300 volts and spreads", () => {
    for (let i = 1; i <= 300; i++) {
      const one = { series: 1, voltage: i * 7.7, spread: i / 1000 };
      expect(holdingWorst(chain(one), 24000)).toBe(one.voltage);
      expect(holdingWorst(chain({ ...one, leak: { kind: "insulation", ohms: i * 1e6 } }), 24000)).toBe(one.voltage);
    }
  });
  test("no resistor and no leak: the even share", () =>
    expect(holdingWorst(chain({ leak: { kind: "current", amperes: 0 } }), Number.POSITIVE_INFINITY)).toBe(400));
  test("no resistor and a leak: the tight stage ends with all of it", () =>
    expect(holdingWorst(chain({}), Number.POSITIVE_INFINITY)).toBe(1600));
  test("no resistor and insulation: the same", () =>
    expect(holdingWorst(chain({ leak: { kind: "insulation", ohms: 1e9 } }), Number.POSITIVE_INFINITY)).toBe(1600));
  test("never more than all the volts", () => expect(holdingWorst(chain({}), 1e12)).toBe(1600));

  test("worked number A4: 449.184615 V with 24 kohm at 5 %, 449.442894 V with 57.6 kohm at 1 %", () => {
    near(holdingWorst(chain({}), 24000), 449.184615, 1e-8);
    near(holdingWorst(chain({ spread: 0.01 }), 57600), 449.442894, 1e-8);
  });

  test("leakage current: the worst of all 4^n corners (R high or low, leak none or full), n to 5, by nodal analysis: 1e-9", () => {
    const c = chance(2);
    for (const n of [2, 3, 4, 5]) {
      for (let i = 0; i < (n === 5 ? 2 : 6); i++) {
        const spread = c.between(0, 0.2);
        const amperes = c.between(0, 2e-4);
        const sharing = c.whole(1, 6);
        const resistance = c.between(1e3, 5e4);
        const volts = c.between(500, 3000);
        const choices = [1 - spread, 1 + spread].flatMap((r) => [0, sharing * amperes].map((leak) => ({ r, leak })));
        let most = 0;
        for (const stages of corners(n, choices)) {
          const shares = stageVolts(
            volts,
            stages.map((s) => 1 / (resistance * s.r)),
            stages.map((s) => s.leak),
          );
          most = Math.max(most, ...shares);
        }
        near(
          holdingWorst(
            chain({ voltage: volts, series: n, sharing, spread, leak: { kind: "current", amperes } }),
            resistance,
          ),
          most,
        );
      }
    }
  });

  test("insulation: the worst of all 4^n corners (R high or low, leaking or not), n to 5, by nodal analysis: 1e-9", () => {
    const c = chance(3);
    for (const n of [2, 3, 4, 5]) {
      for (let i = 0; i < (n === 5 ? 2 : 6); i++) {
        const spread = c.between(0, 0.2);
        const ohms = c.between(1e7, 1e9);
        const sharing = c.whole(1, 6);
        const resistance = c.between(1e5, 5e7);
        const choices = [1 - spread, 1 + spread].flatMap((r) => [0, sharing / ohms].map((leak) => ({ r, leak })));
        let most = 0;
        for (const stages of corners(n, choices)) {
          const shares = stageVolts(
            2000,
            stages.map((s) => 1 / (resistance * s.r) + s.leak),
            stages.map(() => 0),
          );
          most = Math.max(most, ...shares);
        }
        near(
          holdingWorst(
            chain({ voltage: 2000, series: n, sharing, spread, leak: { kind: "insulation", ohms } }),
            resistance,
          ),
          most,
        );
      }
    }
  });
});

describe("holdingLine(chain)", () => {
  test("base + slope R is the worst share of a hold, until that is all the volts: 200 random chains", () => {
    const c = chance(5);
    let cut = 0;
    for (let i = 0; i < 200; i++) {
      const one = chain({
        voltage: c.between(400, 3000),
        series: c.whole(2, 8),
        sharing: c.whole(1, 9),
        spread: c.between(0, 0.2),
        leak: { kind: "current", amperes: c.between(0, 5e-3) },
      });
      const [line, resistance] = [holdingLine(one), c.between(0, 2e5)];
      const volts = line.base + line.slope * resistance;
      near(holdingWorst(one, resistance), Math.min(volts, one.voltage));
      if (volts > one.voltage) cut++;
    }
    expect(cut).toBeGreaterThan(20);
    expect(cut).toBeLessThan(180);
  });
  test("worked number A4: 449.184615 V at 24 kohm and 5 %", () => {
    const { base, slope } = holdingLine(chain({}));
    near(base + slope * 24000, 449.184615, 1e-8);
  });
  test("insulation draws by its own volts: no line of its own, the resistors' spread alone", () =>
    expect(holdingLine(chain({ leak: { kind: "insulation", ohms: 1e6 } })).slope).toBe(0));
});

describe("largestBalance(chain, limit)", () => {
  test("no leak at all: any resistor", () =>
    expect(largestBalance(chain({ leak: { kind: "current", amperes: 0 } }), 450)).toBe(Number.POSITIVE_INFINITY));
  const LEAKS = [
    { kind: "current", amperes: 1e-3 },
    { kind: "current", amperes: 0 },
    { kind: "insulation", ohms: 1e8 },
  ] as const;
  test.each(LEAKS)("a limit below the even share, or a spread that alone breaks it: none, %o", (leak) => {
    expect(largestBalance(chain({ leak, spread: 0 }), 399)).toBe(0);
    expect(largestBalance(chain({ leak, spread: 0.2 }), 450)).toBe(0);
  });
  test("insulation and a limit of all the volts, or more: any resistor", () => {
    expect(largestBalance(chain({ leak: LEAKS[2] }), 1600)).toBe(Number.POSITIVE_INFINITY);
    expect(largestBalance(chain({ leak: LEAKS[2] }), 1700)).toBe(Number.POSITIVE_INFINITY);
    expect(largestBalance(chain({ leak: LEAKS[2] }), 1599)).toBeLessThan(1e13);
  });
  // An exact fit is a fit: four units of 400 V hold 1600 V when nothing leaks and resistors are alike.
  test("even share exactly at the limit, nothing leaks, no spread: any resistor", () => {
    const exact = chain({ voltage: 2.1, series: 3, spread: 0, leak: { kind: "current", amperes: 0 } });
    expect(largestBalance(exact, 0.7)).toBe(Number.POSITIVE_INFINITY);
    for (let tenths = 1; tenths < 200; tenths++) {
      const limit = Number((7000 + tenths / 10).toFixed(1));
      const voltage = Number((3 * (7000 + tenths / 10)).toFixed(1));
      expect(largestBalance({ ...exact, voltage }, limit), `${voltage} V`).toBe(Number.POSITIVE_INFINITY);
    }
  });

  test("worked number A4: 25062.6566 ohm at 5 %, 58339.1673 ohm at 1 %, 66666.6667 ohm without spread", () => {
    near(largestBalance(chain({}), 450), 25062.6566, 1e-8);
    near(largestBalance(chain({ spread: 0.01 }), 450), 58339.1673, 1e-8);
    near(largestBalance(chain({ spread: 0 }), 450), 200000 / 3);
  });

  test("the rule of thumb without (n - 1), 200 kohm, is not safe for four in series", () => {
    expect(holdingWorst(chain({ spread: 0 }), 200000)).toBeGreaterThan(450);
    expect(largestBalance(chain({ spread: 0 }), 450)).toBeLessThan(200000);
  });

  test("sits on the edge: at it the share is the limit, 1 % above it is over, both kinds of leak, 200 random chains", () => {
    const c = chance(4);
    const edges = { current: 0, insulation: 0 };
    for (let i = 0; i < 200; i++) {
      const leak = c.maybe(0.5)
        ? ({ kind: "current", amperes: c.between(1e-6, 5e-3) } as const)
        : ({ kind: "insulation", ohms: c.between(1e7, 1e10) } as const);
      const one = chain({
        voltage: c.between(400, 3000),
        series: c.whole(2, 8),
        sharing: c.whole(1, 9),
        spread: c.between(0, 0.1),
        leak,
      });
      const limit = (one.voltage / one.series) * c.between(1, 1.6);
      const most = largestBalance(one, limit);
      if (!(most > 0) || !Number.isFinite(most) || limit >= one.voltage) continue;
      edges[leak.kind]++;
      near(holdingWorst(one, most), limit);
      expect(holdingWorst(one, most * 1.01)).toBeGreaterThan(limit);
    }
    expect(edges.current).toBeGreaterThan(40);
    expect(edges.insulation).toBeGreaterThan(40);
  });
});
