// One arrangement in full against the worked numbers, and that what is unknown is never made up.
import { describe, expect, test } from "vitest";
import { type Capacitor, DEFAULT_FAMILY, type ResistorFamily, readResistors } from "../../src/catalog/index.ts";
import { type AssessInput, assess, type BalanceWish, type LayoutResult } from "../../src/search/index.ts";
import { briefOf, must } from "../support/labParts.ts";

const near = (a: number | null, b: number, relative = 1e-9): void => {
  expect(a).not.toBe(null);
  expect(Math.abs((a as number) - b), `${a} for ${b}`).toBeLessThanOrEqual(relative * Math.abs(b));
};
const TWENTY = { low: 0.2, high: 0.2 };
const can: Capacitor = {
  part: "can",
  capacitance: 3300e-6,
  voltage: 450,
  tolerance: TWENTY,
  leakage: 1e-3,
  polarised: true,
  diameter: 0.05,
  length: 0.1,
  mass: 0.2,
  price: 1000,
  currency: "EUR",
  states: {},
  file: "c.csv",
  line: 2,
};
const without = (...keys: readonly (keyof Capacitor)[]): Capacitor =>
  Object.fromEntries(
    Object.entries(can).filter(([key]) => !keys.includes(key as keyof Capacitor)),
  ) as unknown as Capacitor;

const at = (
  series: number,
  parallel: number,
  over: Partial<AssessInput> & {
    readonly brief?: ReturnType<typeof briefOf>;
    readonly ties?: "strings" | "cross-tied";
  } = {},
): LayoutResult => {
  const { ties = "cross-tied", ...rest } = over;
  return assess({
    unit: can,
    brief: briefOf({ energy: 5000, voltage: 1600, derating: 1 }),
    families: [DEFAULT_FAMILY],
    currency: "EUR",
    layout: { part: "can", series, parallel, ties },
    ...rest,
  });
};
const finding = (result: LayoutResult, id: string) => result.findings.find((f) => f.id === id);
const fixed = (resistance: number, tolerance: number): BalanceWish => ({ kind: "fixed", resistance, tolerance });

describe("assess(input): worked numbers", () => {
  test("A1: 4s5p of 3300 uF at 1600 V: 4.125 mF, 5280 J, 533.333333 V on a unit of 450 V: fails", () => {
    const bank = at(4, 5);
    near(bank.capacitance.nominal, 0.004125);
    near(bank.energy.nominal, 5280);
    near(bank.share.charging, 1600 / 3);
    expect(bank.share.even).toBe(400);
    expect(finding(bank, "charging-share")?.verdict).toBe("fail");
    expect(bank.units).toBe(20);
  });
  test("A3: the low stage is left reversed by 133.333333 V", () => near(at(4, 5).share.leftAfterDump, 400 / 3));
  test("A4: 24 kohm at 5 % across single units leaking 1 mA: 449.184615 V; 8.88157895 W is the bound at 450 V", () => {
    const bank = at(4, 1, { balance: fixed(24000, 0.05) });
    near(bank.share.holding, 449.184615, 1e-8);
    const { powerEach = 0, elements = 1 } = bank.balance ?? {};
    near(powerEach * elements, 449.184615 ** 2 / (24000 * 0.95), 1e-8);
    expect(powerEach * elements).toBeLessThan(8.88157895);
  });
  test("A5: 825 uF (+20 %) at 1600 V through 82 kohm (+5 %) to 60 V: 279.874955 s", () => {
    // Two units of 1650 uF in series are 825 uF; two resistors of 41 kohm are 82.
    const unit = { ...can, capacitance: 1650e-6, voltage: 1600 };
    near(at(2, 1, { unit, balance: fixed(41000, 0.05) }).bleed.seconds, 279.874955, 1e-8);
  });
});

describe("assess(input): strings and cross-tied", () => {
  const tied = at(4, 5, { balance: fixed(4800, 0.05) });
  const strings = at(4, 5, { ties: "strings", balance: fixed(24000, 0.05) });
  test("one a stage shared by five, or one a unit: five times the ohms hold the same share and bleed as fast", () => {
    near(tied.share.holding, strings.share.holding as number);
    near(tied.bleed.seconds, strings.bleed.seconds as number);
    expect([tied.balance?.positions, strings.balance?.positions]).toEqual([4, 20]);
    near(tied.balance?.powerTotal ?? null, strings.balance?.powerTotal as number);
  });
  test("one in series, or one in parallel, is called strings and needs no choice", () => {
    expect(at(4, 1).id).toBe("can 4s1p strings");
    expect(at(1, 5)).toMatchObject({ id: "can 1s5p strings", balance: null });
  });
});

describe("assess(input): the brief", () => {
  test("overshoot raises the voltage of limits, not the energy", () => {
    const plain = at(4, 5);
    const over = at(4, 5, { brief: briefOf({ energy: 5000, voltage: 1600, derating: 1, overshoot: 0.05 }) });
    near(over.share.charging, (plain.share.charging as number) * 1.05);
    expect(over.energy).toEqual(plain.energy);
  });
  test("ageing lowers the least energy, not the shares", () => {
    const plain = at(4, 5);
    const aged = at(4, 5, { brief: briefOf({ energy: 5000, voltage: 1600, derating: 1, ageing: 0.1 }) });
    near(aged.energy.low, (plain.energy.low as number) * 0.9);
    expect(aged.share).toEqual(plain.share);
  });
  test("a part of the fall gives a part of the energy: half the volts give three quarters", () =>
    near(at(4, 5, { brief: briefOf({ energy: 5000, voltage: 1600, ripple: 0.5 }) }).energy.nominal, 5280 * 0.75));
  test("the limit is the lower derating of row and brief", () => {
    near(at(4, 5, { brief: briefOf({ energy: 1, voltage: 1600 }) }).share.limit, 405);
    near(at(4, 5, { unit: { ...can, derating: 0.8 }, brief: briefOf({ energy: 1, voltage: 1600 }) }).share.limit, 360);
  });
  test("spares are bought and not built in", () => {
    const bank = at(4, 5, { brief: briefOf({ energy: 1, voltage: 1600, spares: 3 }) });
    expect(bank.units).toBe(20);
    expect(bank.purchase.capacitors?.bought).toBe(23);
  });
  // A steady current that the bank cannot feed is no less a failure than joules it cannot give.
  test("a bank too small for the steady current has a finding that says so", () => {
    const brief = briefOf({
      energy: 1,
      voltage: 1600,
      ripple: 0.01,
      derating: 1,
      steady: { current: 100, frequency: 1 },
    });
    expect(
      at(5, 1, { brief })
        .findings.filter((f) => f.state === "pulse")
        .some((f) => f.verdict === "fail"),
    ).toBe(true);
  });
});

describe("assess(input): the balancing resistor", () => {
  test("none wished: none; the tight stage then ends with all the volts", () => {
    const bank = at(5, 1, { balance: { kind: "none" } });
    expect(bank.balance).toBe(null);
    expect(bank.share.holding).toBe(1600);
    expect(finding(bank, "holding-share")?.verdict).toBe("fail");
    expect(bank.bleed.seconds).toBe(null);
  });
  test("chosen: elements within the volts and derated watts of their family", () => {
    const bank = at(6, 1, { brief: briefOf({ energy: 1, voltage: 1600, derating: 1 }) });
    expect(bank.balance?.voltageEach).toBeLessThanOrEqual(350 * (1 + 1e-9));
    expect(bank.balance?.powerEach).toBeLessThanOrEqual(1 + 1e-9);
    expect(bank.balance).toMatchObject({ assumed: true, positions: 6 });
    expect(bank.cost?.unpriced).toEqual(["balancing resistors"]);
  });
  test("what each element dissipates adds up: all chains at the low resistance draw powerTotal", () => {
    const bank = at(4, 5, { balance: fixed(24000, 0.05) });
    near(bank.balance?.powerTotal ?? null, 1600 ** 2 / (4 * 24000 * 0.95));
  });
});

describe("assess(input): unknown is not zero", () => {
  test("no tolerance: charging, dump and energy span are not assessed, and nothing passes on it", () => {
    const bank = at(5, 2, { unit: without("tolerance") });
    expect(bank.share).toMatchObject({ charging: null, leftAfterDump: null });
    expect([bank.capacitance.low, bank.capacitance.high, bank.energy.low, bank.energy.high, bank.stress]).toEqual([
      null,
      null,
      null,
      null,
      null,
    ]);
    for (const id of ["charging-share", "reverse-after-dump", "pulse-energy"])
      expect(finding(bank, id)?.verdict, id).toBe("not assessed");
  });
  test("no tolerance, one in series: there is nothing to share", () => {
    const bank = at(1, 2, { unit: without("tolerance"), brief: briefOf({ energy: 1, voltage: 300 }) });
    expect(bank.share.charging).toBe(300);
    near(bank.stress, 300 / 450);
  });
  test("no leakage and no insulation: holding is not assessed and no resistor is made up", () => {
    const bank = at(5, 2, { unit: without("leakage") });
    expect([bank.share.holding, bank.balance]).toEqual([null, null]);
    expect(finding(bank, "holding-share")?.verdict).toBe("not assessed");
  });
  test("no size, no mass, no price", () => {
    const bank = at(5, 2, { unit: without("diameter", "mass", "price"), balance: { kind: "none" } });
    expect([bank.volume, bank.mass, bank.cost]).toEqual([null, null, null]);
  });
  test("polarity unknown: the reverse voltage is not assessed; polarised without a reverse rating: a clamp diode is named", () => {
    expect(finding(at(5, 2, { unit: without("polarised") }), "reverse-after-dump")?.verdict).toBe("not assessed");
    expect(finding(at(5, 2), "reverse-after-dump")?.note).toMatch(/clamp diode/i);
  });
  // The start of a finite hold is the charging share, which nobody knows without a tolerance.
  test("no tolerance and a finite hold: holding is not assessed", () =>
    expect(
      at(5, 2, { unit: without("tolerance"), brief: briefOf({ energy: 1, voltage: 1600, hold: 30 }) }).share.holding,
    ).toBe(null));
  // The high capacitance decides the bleed; the nominal one makes it look shorter than it may be.
  test("no tolerance: the bleed time is unknown", () =>
    expect(at(5, 2, { unit: without("tolerance"), balance: fixed(24000, 0.05) }).bleed.seconds).toBe(null));
  // Resistors that will be needed and cannot be sized yet are not free.
  test("no leakage: the balancing resistors are among what the total leaves out", () =>
    expect(at(5, 2, { unit: without("leakage") }).cost?.unpriced).toContain("balancing resistors"));
});

describe("assess(input): money", () => {
  const priced = (currency: string): readonly ResistorFamily[] =>
    must(
      readResistors(
        `family,tolerance [%],power [W],voltage [V],price,currency\nr,5,50,1000,2.00,${currency}\n`,
        "r.csv",
      ),
    ).families;
  test("capacitors and resistors add up to the total, in the major unit", () => {
    const bank = at(6, 1, { families: priced("EUR") });
    expect(bank.cost).toEqual({ capacitors: 60, resistors: 12, total: 72, currency: "EUR", unpriced: [] });
  });
  test("capacitors of another currency at the brief's rate", () => {
    const brief = briefOf({ energy: 1, voltage: 1600, derating: 1, currency: "EUR", exchange: { USD: 0.5 } });
    expect(at(6, 1, { unit: { ...can, currency: "USD" }, brief, families: priced("EUR") }).cost).toMatchObject({
      capacitors: 30,
      resistors: 12,
      total: 42,
    });
  });
  // Twelve dollars at half a euro are six euros.
  test("resistors of another currency at the brief's rate", () => {
    const brief = briefOf({ energy: 1, voltage: 1600, derating: 1, currency: "EUR", exchange: { USD: 0.5 } });
    expect(at(6, 1, { brief, families: priced("USD") }).cost).toMatchObject({
      capacitors: 60,
      resistors: 6,
      total: 66,
    });
  });
});
