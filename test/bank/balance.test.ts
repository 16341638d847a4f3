// The choice of a balancing resistor against a slow search of every element count and every preferred value.
import { describe, expect, test, vi } from "vitest";
import { type Choice, chooseBalance, elementPower, leastHolding, surelyChooses } from "../../src/bank/balance.ts";
import type { FiniteHold } from "../../src/bank/finiteHold.ts";
import { holdHighest, holdWorst, largestBalanceForHold } from "../../src/bank/finiteHold.ts";
import { holdingWorst, largestBalance } from "../../src/bank/share.ts";
import { DEFAULT_FAMILY, type ResistorFamily, readResistors } from "../../src/catalog/index.ts";
import { chance } from "../support/random.ts";
import { slowBalance } from "../support/slowBank.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const EVER = Number.POSITIVE_INFINITY;
const bank = (over: Partial<FiniteHold> = {}): FiniteHold => ({
  voltage: 1600,
  series: 4,
  sharing: 1,
  spread: 0.05,
  leak: { kind: "current", amperes: 0.001 },
  capacitance: 3300e-6,
  tolerance: { low: 0.2, high: 0.2 },
  hold: EVER,
  ...over,
});
const family = (row: string): ResistorFamily => {
  const heading = "family,series,lowest [ohm],highest [ohm],tolerance [%],power [W],derating,voltage [V]";
  const read = readResistors(`${heading}\n${row}`, "r.csv");
  if (!read.ok || read.value.families[0] === undefined) throw new Error(JSON.stringify(read));
  return read.value.families[0];
};
const choose = (one: FiniteHold, limit: number, from: ResistorFamily): Choice | null => {
  const choice: Choice = { resistance: 0, element: 0, elements: 0, worst: 0 };
  return chooseBalance(one, limit, from, choice) ? choice : null;
};
const slow = (one: FiniteHold, limit: number, from: ResistorFamily, most: number) =>
  slowBalance(
    {
      ...one,
      leakage: one.leak.kind === "current" ? one.leak.amperes : undefined,
      insulation: one.leak.kind === "insulation" ? one.leak.ohms : undefined,
      low: one.tolerance.low,
      high: one.tolerance.high,
    },
    limit,
    from,
    most,
  );

/** Same choice; worst to 1e-9, both being closed forms in doubles. */
function same(one: FiniteHold, limit: number, from: ResistorFamily, at: string): boolean {
  const quick = choose(one, limit, from);
  // The slow search looks a little further than the quick one found, or far where the quick one found none.
  const obvious = slow(one, limit, from, quick === null ? 1000 : quick.elements + 1);
  if (obvious === null || quick === null) {
    expect(quick, at).toBe(obvious);
    return false;
  }
  expect(quick.elements, at).toBe(obvious.elements);
  expect(Math.abs(quick.element / obvious.element - 1), at).toBeLessThan(1e-9);
  expect(Math.abs(quick.resistance / obvious.resistance - 1), at).toBeLessThan(1e-9);
  expect(Math.abs(quick.worst / obvious.worst - 1), at).toBeLessThan(1e-9);
  return true;
}

describe("elementPower(worst, resistance, spread, elements)", () => {
  test("worked number A4: 450 V, 24 kohm low by 5 %: 8.88157895 W", () =>
    expect(elementPower(450, 24000, 0.05, 1)).toBeCloseTo(8.88157895, 7));
  test("shared evenly among the elements", () =>
    expect(elementPower(450, 24000, 0.05, 8)).toBeCloseTo(8.88157895 / 8, 8));
});

describe("chooseBalance(bank, limit, family, choice)", () => {
  test("no resistor is small enough: false", () =>
    expect(choose(bank(), 450, family("a,E24,100000,1000000,5,2,0.5,350"))).toBe(null));
  test("the spread alone breaks the limit: false", () =>
    expect(choose(bank({ spread: 0.2 }), 450, family("a,E24,1,1000000,20,2,0.5,350"))).toBe(null));
  test("a limit below the even share: false", () => expect(choose(bank(), 399, DEFAULT_FAMILY)).toBe(null));

  test("worked numbers A4: E24 at or below 25062.6566 ohm is 24 kohm; E96 at or below 58339.1673 ohm is 57.6 kohm", () => {
    expect(choose(bank(), 450, family("a,E24,1,1e6,5,100,1,1000"))).toMatchObject({ resistance: 24000, elements: 1 });
    expect(choose(bank({ spread: 0.01 }), 450, family("a,E96,1,1e6,1,100,1,1000"))).toMatchObject({
      resistance: 57600,
      elements: 1,
    });
  });

  test("worked number A6: 450 V across about 56 kohm of half-watt elements of 350 V takes eight", () => {
    // V/V_element asks 2, P/P_derated asks 7.23 at nominal R: 8. Here leak and limit are set so that R_max is 56 kohm, spread 0.
    const one = bank({
      voltage: 900,
      series: 2,
      spread: 0,
      leak: { kind: "current", amperes: 1e-9 },
      tolerance: { low: 0, high: 0 },
    });
    const made = choose(one, 450 * (1 + 1e-6), family("a,E24,1,7000,0,0.5,1,350"));
    expect(made).toMatchObject({ elements: 8, element: 6800 });
    expect(450 ** 2 / 56000 / 0.5).toBeCloseTo(7.23214286, 7);
  });

  test("elements are never above the family's largest, nor below its smallest", () => {
    const none = choose(bank({ leak: { kind: "current", amperes: 0 } }), 450, family("a,E24,100,10000,5,2,0.5,350"));
    expect(none?.element).toBe(10000);
  });

  test("200 random banks held for ever, both kinds of leak, against the slow search: the same element, count and share", () => {
    const c = chance(31);
    let chosen = 0;
    for (let i = 0; i < 200; i++) {
      const leak = c.maybe(0.6)
        ? ({ kind: "current", amperes: c.pick([0, 1e-6, 1e-5, 3e-4, 5e-3]) } as const)
        : ({ kind: "insulation", ohms: c.pick([1e6, 3e7, 1e9, 1e11]) } as const);
      const spread = c.pick([0.01, 0.05, 0.1]);
      const one = bank({ voltage: c.between(300, 6000), series: c.whole(2, 9), sharing: c.whole(1, 12), leak, spread });
      const limit = (one.voltage / one.series) * c.between(0.95, c.pick([1.1, 1.7, 4]));
      if (limit >= one.voltage) continue;
      const from = family(
        `a,${c.pick(["E3", "E6", "E12", "E24", "E48"])},${c.pick([1, 100, 4700])},${c.pick([10000, 220000, 10000000])},${spread * 100},${c.pick([0.25, 2, 10])},${c.pick([0.5, 1])},${c.pick([200, 350, 3500])}`,
      );
      if (same(one, limit, from, `case ${i}`)) chosen++;
    }
    expect(chosen).toBeGreaterThan(80);
  });

  test("100 random banks held for a while, units wider than resistors, against the slow search: the same", () => {
    const c = chance(32);
    let chosen = 0;
    for (let i = 0; i < 100; i++) {
      const leak = c.maybe(0.6)
        ? ({ kind: "current", amperes: c.between(1e-5, 5e-3) } as const)
        : ({ kind: "insulation", ohms: c.pick([1e5, 1e6, 3e7]) } as const);
      const one = bank({
        voltage: c.between(300, 4000),
        series: c.whole(2, 7),
        sharing: c.whole(1, 8),
        leak,
        spread: 0.01,
        hold: c.pick([1, 30, 600, 3600]),
        tolerance: { low: 0.2, high: 0.1 },
      });
      const limit = Math.min(
        ((one.voltage * 1.1) / (1.1 + (one.series - 1) * 0.8)) * c.between(1, 1.3),
        one.voltage * 0.99,
      );
      const from = family(`a,E12,100,1000000,1,${c.pick([2, 10])},0.5,${c.pick([350, 3500])}`);
      if (same(one, limit, from, `case ${i}`)) chosen++;
    }
    expect(chosen).toBeGreaterThan(40);
  });

  // Alike units, a 10 % resistor, ten minutes: at 1 Mohm the resistors have had time to pull one unit to 370 V of 350 V allowed,
  // while a far larger resistor would not have moved it and a far smaller one does not exist.
  test("what is chosen holds its share: 7 in series on 2200 V, units of 5 %, resistors of 10 %, 600 s", () => {
    const one = bank({
      voltage: 2200,
      series: 7,
      spread: 0.1,
      leak: { kind: "insulation", ohms: 3.957e9 },
      capacitance: 220e-6,
      tolerance: { low: 0.05, high: 0.05 },
      hold: 600,
    });
    const choice = choose(one, 350, family("a,E6,100,1000000,10,2,0.7,500"));
    expect(choice === null || holdWorst(one, choice.resistance) <= 350 * (1 + 1e-9)).toBe(true);
  });

  // For ever, the resistor is chosen as if a stage could rise above all the volts; for an hour, as if it could not.
  test("a limit above all the volts asks the same resistor for an hour as for ever", () => {
    const one = bank({ voltage: 378, series: 3, sharing: 6, leak: { kind: "current", amperes: 381e-6 } });
    const from = family("a,E24,100,220000,5,10,0.5,500");
    expect(choose({ ...one, hold: 1e8 }, 405, from)?.resistance).toBe(choose(one, 405, from)?.resistance);
  });

  // An exact fit is a fit: the even share of resistors all alike is the limit, the element's volts and its watts.
  test("a share, a voltage and a power just reached", () => {
    const even = bank({ voltage: 2.1, series: 3, spread: 0, leak: { kind: "current", amperes: 0 } });
    expect(choose(even, 0.7, family("a,E24,1,1000,0,2,0.5,350"))?.elements).toBe(1);
    const two = { ...even, voltage: 900, series: 2 };
    expect(choose(two, 600, family("a,E24,1,10000,0,20.25,1,450"))).toMatchObject({ elements: 1, resistance: 10000 });
    expect(choose(two, 600, family("a,E24,1,10000,0,20.25,1,449.9"))?.elements).toBe(2);
    expect(choose(two, 600, family("a,E24,1,10000,0,20.24,1,450"))?.elements).toBe(2);
  });

  // The highest of these holds comes on the way, with some of the others low: the larger resistor holds at both ends and not between.
  const DIPPING: readonly (readonly [largest: number, next: number, Partial<FiniteHold>])[] = [
    [
      11000,
      10700,
      {
        voltage: 446,
        series: 7,
        sharing: 7,
        leak: { kind: "current", amperes: 287e-6 },
        tolerance: { low: 0.1975, high: 0.1978 },
        hold: 3600,
      },
    ],
    [
      26100,
      25500,
      {
        voltage: 1507.5,
        series: 6,
        sharing: 2,
        leak: { kind: "current", amperes: 1.556e-3 },
        tolerance: { low: 0.1525, high: 0.2457 },
        hold: 3600,
      },
    ],
    [
      5230,
      5110,
      {
        voltage: 1097,
        series: 4,
        sharing: 7,
        leak: { kind: "current", amperes: 1.4463e-3 },
        tolerance: { low: 0.1609, high: 0.1083 },
        hold: 300,
      },
    ],
  ];
  test.each(DIPPING)(
    "a hold that stands highest on its way takes not %d ohm but the next below, %d ohm",
    (largest, next, over) => {
      const one = bank({ capacitance: 1e-4, ...over });
      const [ends, way] = [holdWorst(one, largest), holdHighest(one, largest)];
      expect(way).toBeGreaterThan(ends);
      const from = family("a,E96,1,1e6,5,1000,1,10000");
      const limit = (ends + way) / 2;
      expect(choose(one, limit, from)).toMatchObject({ resistance: next, elements: 1 });
      expect(choose(one, limit, from)!.worst).toBeLessThanOrEqual(limit);
      // With no value below there is no choice; with the way allowed to its very height the larger one does.
      expect(choose(one, limit, family(`a,E96,${largest},${largest},5,1000,1,10000`))).toBe(null);
      expect(choose(one, way, from)).toMatchObject({ resistance: largest, worst: way });
    },
  );

  test("the end of a hold just at the limit is within it", () => {
    const one = bank({ hold: 600, capacitance: 1e-4 });
    const limit = holdWorst(one, 20000);
    expect(choose(one, limit, family("a,E24,1,1e6,5,1000,1,10000"))).toMatchObject({ resistance: 20000, worst: limit });
  });

  // Resistors wider than units: a smaller R may divide worse than a larger one, so each count of elements is judged by its own R.
  test("200 random holds of wide resistors: the first count whose largest value holds the share, the volts and the watts", () => {
    const c = chance(33);
    let skipped = 0;
    for (let i = 0; i < 200; i++) {
      const spread = c.pick([0.1, 0.2]);
      const one = bank({
        voltage: c.between(300, 4000),
        series: c.whole(2, 7),
        sharing: c.whole(1, 8),
        spread,
        leak: { kind: "insulation", ohms: c.pick([1e6, 3e7]) },
        capacitance: c.pick([1e-4, 1e-3]),
        tolerance: { low: c.between(0, 0.1), high: c.between(0, 0.3) },
        hold: c.pick([30, 300, 3600]),
      });
      const start =
        (one.voltage * (1 + one.tolerance.high)) /
        (1 + one.tolerance.high + (one.series - 1) * (1 - one.tolerance.low));
      const limit = Math.min(start * c.between(1, 1.1), one.voltage * 0.99);
      const from = family(`a,E12,100,1000000,${spread * 100},10,0.5,${c.pick([350, 3500])}`);
      const most = largestBalanceForHold(one, limit, largestBalance(one, limit));
      let wanted: number | null = null;
      for (let k = 1; k <= 200 && wanted === null; k++) {
        const value = from.values.filter((ohms) => ohms * k <= most * (1 + 1e-9)).at(-1);
        if (value === undefined) break;
        const worst = holdWorst(one, value * k);
        const within =
          worst <= from.voltage * k && elementPower(worst, value * k, spread, k) <= from.power * from.derating;
        if (within && worst > limit * (1 + 1e-9)) skipped++;
        if (within && worst <= limit * (1 + 1e-9)) wanted = value * k;
      }
      expect(choose(one, limit, from)?.resistance ?? null, `case ${i}`).toBe(wanted);
    }
    expect(skipped).toBeGreaterThan(10);
  });

  // The rule sets no most for k; a stage of 200 kV takes 572 elements of 350 V.
  test("as many elements as it takes: 400 kV on two stages, elements of 350 V", () => {
    const one = bank({ voltage: 400e3, series: 2, leak: { kind: "insulation", ohms: 1e15 }, spread: 0.01 });
    expect(choose(one, 220e3, family("a,E24,1,1e7,1,2,0.5,350"))?.elements).toBeGreaterThan(500);
  });
});

describe("surelyChooses(bank, limit, family), leastHolding(bank, limit, family, mostSeries)", () => {
  const c = chance(35);
  const cases = Array.from({ length: 3000 }, () => {
    const leak = c.maybe(0.6)
      ? ({ kind: "current", amperes: c.pick([0, 1e-9, 1e-6, 1e-5, 3e-4, 5e-3]) } as const)
      : ({ kind: "insulation", ohms: c.pick([1e4, 1e6, 3e7, 1e9, 1e11]) } as const);
    const spread = c.pick([0, 0.01, 0.05, 0.1]);
    const one = bank({ voltage: c.between(300, 6000), series: c.whole(2, 30), sharing: c.whole(1, 12), leak, spread });
    const limit = (one.voltage / one.series) * c.between(0.95, c.pick([1.1, 1.7, 20]));
    const [lowest, highest] = c.pick([
      [1, 1e7],
      [100, 1e4],
      [105, 105e4],
      [4640, 4700],
      [1e6, 1e7],
    ]) as [number, number];
    const from = family(
      `a,${c.pick(["E3", "E6", "E12", "E24", "E48"])},${lowest},${highest},${spread * 100},${c.pick([0.01, 0.25, 2, 10])},${c.pick([0.5, 1])},${c.pick([1, 200, 350, 3500])}`,
    );
    return { one, limit, from };
  });
  test("3000 random banks held for ever: what is sure is chosen, and most of what is chosen was sure", () => {
    let [sure, chosen] = [0, 0];
    for (const [i, { one, limit, from }] of cases.entries()) {
      const found = choose(one, limit, from);
      if (found !== null) chosen++;
      if (!surelyChooses(one, limit, from)) continue;
      sure++;
      expect(found, `case ${i}`).not.toBeNull();
    }
    expect(chosen).toBeGreaterThan(1000);
    expect(sure).toBeGreaterThan(0.8 * chosen);
  });
  test("the same: from a shorter chain to a longer one, no choice holds below the floor, and the floor is worth having", () => {
    let [near, chosen] = [0, 0];
    for (const [i, { one, limit, from }] of cases.entries()) {
      const found = choose(one, limit, from);
      if (found === null) continue;
      chosen++;
      for (const [first, last] of [
        [2, 40],
        [one.series, one.series],
        [one.series, 200],
        [2, one.series],
      ] as const) {
        const floor = leastHolding({ ...one, series: first }, limit, from, last);
        expect(floor, `case ${i} ${first}..${last}`).toBeLessThanOrEqual(found.worst);
        if (first === last && floor > found.worst / 3) near++;
      }
    }
    expect(near).toBeGreaterThan(0.5 * chosen);
  });
  // One element of 10 kohm at 90 % of its value takes a ninth more than the watts it has, and R_max leaves no room for two.
  test("not sure of one element whose watts only suffice at its nominal value", () => {
    const one = bank({ spread: 0.1, leak: { kind: "current", amperes: 1e-3 } });
    const limit = holdingWorst(one, 11000);
    const from = family(`a,E24,10000,10000,10,${limit ** 2 / 10000},1,1000`);
    expect(choose(one, limit, from)).toBe(null);
    expect(surelyChooses(one, limit, from)).toBe(false);
    expect(surelyChooses(one, limit, { ...from, power: from.power / 0.89 })).toBe(true);
  });
  test("no share holds: nothing is sure", () =>
    expect(surelyChooses(bank({ spread: 0.2 }), 450, DEFAULT_FAMILY)).toBe(false));
  test("a hold of finite time: nothing is known beforehand", () => {
    expect(surelyChooses(bank({ hold: 30 }), 450, DEFAULT_FAMILY)).toBe(false);
    expect(leastHolding(bank({ hold: 30 }), 450, DEFAULT_FAMILY, 40)).toBe(0);
  });
});
