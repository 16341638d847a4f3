// charge: refusals, the worked three ways, and each against its own sum of small steps.
import { describe, expect, test } from "vitest";
import { type Charger, chargeOf } from "../../src/pulse/charge.ts";
import { codesOf, got, near } from "./near.ts";

const task = { capacitance: 825e-6, from: 0, to: 1600 };

describe("chargeOf(charger, task)", () => {
  test("refuses numbers not above zero, a start above the end, a supply that never gets there", () => {
    expect(codesOf(chargeOf({ kind: "constant current", current: 0 }, { ...task, capacitance: -1 }))).toEqual([
      "pulse.charge.current",
      "pulse.charge.capacitance",
    ]);
    expect(codesOf(chargeOf({ kind: "constant current", current: 1 }, { ...task, from: 1600 }))).toEqual([
      "pulse.charge.from",
    ]);
    expect(codesOf(chargeOf({ kind: "resistor", resistance: 1, supply: 1600 }, task))).toEqual(["pulse.charge.supply"]);
  });

  test("each refusal names its field, shows the number and says what would do; a start below zero too", () => {
    const told = (charger: Charger, over: Partial<typeof task>) => {
      const read = chargeOf(charger, { ...task, ...over });
      return read.ok ? [] : read.refusals.map(({ code, place, read: shown, want }) => [code, place.field, shown, want]);
    };
    const current: Charger = { kind: "constant current", current: 1 };
    expect(told(current, { to: Number.POSITIVE_INFINITY })).toEqual([
      ["pulse.charge.to", "to", "Infinity", "a number above zero"],
    ]);
    expect(told(current, { from: -1 })).toEqual([
      ["pulse.charge.from", "from", "-1", expect.stringContaining("below the end voltage")],
    ]);
    expect(told({ kind: "resistor", resistance: 1, supply: 1500 }, {})).toEqual([
      ["pulse.charge.supply", "supply", "1500", expect.stringContaining("above the end voltage")],
    ]);
    expect(told({ kind: "resistor", resistance: 0, supply: 1700 }, {})[0]?.[1]).toBe("resistance");
    expect(told({ kind: "constant power", power: 0, currentLimit: 0 }, {}).map(([, field]) => field)).toEqual([
      "power",
      "currentLimit",
    ]);
  });

  test("from 600 V: each way gains C(V_f^2 - V_i^2)/2, wastes what it says, and its mean power over its time is the sum", () => {
    const warm = { ...task, from: 600 };
    const gained = (825e-6 * (1600 ** 2 - 600 ** 2)) / 2;
    const chargers: readonly Charger[] = [
      { kind: "constant current", current: 0.05 },
      { kind: "constant power", power: 200, currentLimit: 0.25 },
      { kind: "resistor", resistance: 2000, supply: 1700 },
    ];
    for (const charger of chargers) {
      const charge = got(chargeOf(charger, warm));
      near(charge.meanPower * charge.seconds, gained + charge.resistorHeat, 1e-12);
      near(charge.efficiency, gained / (gained + charge.resistorHeat), 1e-12);
      if (charger.kind === "resistor") near(charge.resistorHeat, charge.action * charger.resistance, 1e-12);
      else expect(charge.resistorHeat).toBe(0);
    }
    near(got(chargeOf(chargers[2]!, warm)).seconds, 2000 * 825e-6 * Math.log(1100 / 100), 1e-12);
  });

  test("the most amperes and watts, and where constant power takes over", () => {
    const peaks = (charger: Charger, over: Partial<typeof task> = {}) => {
      const { peakCurrent, peakPower, crossover } = got(chargeOf(charger, { ...task, ...over }));
      return [peakCurrent, peakPower, crossover];
    };
    expect(peaks({ kind: "constant current", current: 0.05 })).toEqual([0.05, 80, null]);
    expect(peaks({ kind: "constant power", power: 200, currentLimit: 0.25 })).toEqual([0.25, 200, 800]);
    expect(peaks({ kind: "resistor", resistance: 2000, supply: 1700 })).toEqual([0.85, 1445, null]);
    expect(peaks({ kind: "resistor", resistance: 2000, supply: 1700 }, { from: 700 })).toEqual([0.5, 850, null]);
    near(got(chargeOf({ kind: "constant current", current: 0.05 }, task)).action, 0.05 ** 2 * 26.4, 1e-12);
  });

  test("worked: 0.05 A takes 26.4 s, 80 W at the end and 40 W on average", () => {
    const charge = got(chargeOf({ kind: "constant current", current: 0.05 }, task));
    near(charge.seconds, 26.4, 1e-12);
    near(charge.peakPower, 80, 1e-12);
    near(charge.meanPower, 40, 1e-12);
  });

  test("worked: 200 W after a limit of 0.25 A crosses over at 800 V and takes 6.6 s", () => {
    const charge = got(chargeOf({ kind: "constant power", power: 200, currentLimit: 0.25 }, task));
    near(charge.crossover, 800, 1e-12);
    near(charge.seconds, 6.6, 1e-12);
  });

  test("worked: 2000 ohm from 1700 V takes 4.67480202 s, burns 1188 J at 47.06 %", () => {
    const charge = got(chargeOf({ kind: "resistor", resistance: 2000, supply: 1700 }, task));
    near(charge.seconds, 4.67480202);
    near(charge.resistorHeat, 1188, 1e-12);
    near(charge.efficiency, 0.470588235);
  });

  test("a limit never reached is constant power throughout; a power never reached is constant current throughout", () => {
    const warm = { ...task, from: 800 };
    const power = got(chargeOf({ kind: "constant power", power: 200, currentLimit: 10 }, warm));
    near(power.seconds, (825e-6 * (1600 ** 2 - 800 ** 2)) / 400, 1e-12);
    near(power.peakCurrent, 0.25, 1e-12);
    near(power.peakPower, 200, 1e-12);
    const current = got(chargeOf({ kind: "constant power", power: 1e6, currentLimit: 0.05 }, task));
    near(current.seconds, 26.4, 1e-12);
    near(current.peakPower, 80, 1e-12);
  });

  // A published module: 60 W into 330 uF to 848.5 V takes 2.0 s at constant power, 4.0 s at a constant 0.07 A.
  test("published: the factor of two between constant power and constant current of the same wattage", () => {
    const module = { capacitance: 330e-6, from: 0, to: 848.5 };
    near(got(chargeOf({ kind: "constant power", power: 60, currentLimit: 1e6 }, module)).seconds, 2, 0.02);
    near(got(chargeOf({ kind: "constant current", current: 0.07 }, module)).seconds, 4, 0.01);
  });

  test("time and action are the sums over small steps of voltage: dt = C dV/i, dA = i C dV", () => {
    const chargers: readonly (readonly [Charger, (v: number) => number])[] = [
      [{ kind: "constant power", power: 200, currentLimit: 0.25 }, (v) => Math.min(0.25, 200 / v)],
      [{ kind: "resistor", resistance: 2000, supply: 1700 }, (v) => (1700 - v) / 2000],
    ];
    for (const [charger, current] of chargers) {
      let [seconds, action] = [0, 0];
      const dv = 1600 / 160000;
      for (let k = 0; k < 160000; k++) {
        const i = current((k + 0.5) * dv);
        seconds += (825e-6 * dv) / i;
        action += 825e-6 * dv * i;
      }
      const charge = got(chargeOf(charger, task));
      near(charge.seconds, seconds, 1e-7);
      near(charge.action, action, 1e-7);
    }
  });
});
