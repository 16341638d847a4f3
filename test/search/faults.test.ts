// The fault table as fed from an assessed layout: the worked fault numbers come out, and what is unknown is handed on as unknown.
import { describe, expect, test } from "vitest";
import { type Capacitor, DEFAULT_FAMILY } from "../../src/catalog/index.ts";
import { faultBankOf, faultsOf } from "../../src/search/faults.ts";
import { assess } from "../../src/search/index.ts";
import { briefOf } from "../support/labParts.ts";

const can: Capacitor = {
  part: "can",
  capacitance: 3300e-6,
  voltage: 450,
  tolerance: { low: 0, high: 0 },
  leakage: 0,
  states: {},
  file: "c.csv",
  line: 2,
};
const bank = (ties: "cross-tied" | "strings", unit: Capacitor = can, over: object = {}) => {
  const brief = briefOf({ energy: 1, voltage: 1600, derating: 1, ...over });
  const result = assess({
    unit,
    brief,
    families: [DEFAULT_FAMILY],
    currency: null,
    layout: { part: "can", series: 4, parallel: 5, ties },
  });
  return { result, unit, brief };
};

describe("faultBankOf(bank)", () => {
  test("volts carry the overshoot; an endless hold is null, a finite one its seconds", () => {
    expect(faultBankOf(bank("cross-tied", can, { overshoot: 0.05 })).voltage).toBeCloseTo(1680, 9);
    expect(faultBankOf(bank("cross-tied")).balance?.hold).toBe(null);
    expect(faultBankOf(bank("cross-tied", can, { hold: 30 })).balance?.hold).toBe(30);
  });
  test("what the catalogue lacks stays unknown", () => {
    const { unit } = faultBankOf(bank("cross-tied"));
    expect([unit.esr, unit.esl, unit.surgeVoltage, unit.ruptureEnergy]).toEqual([null, null, null, null]);
  });
  // Unknown is not even: the worst share before the fault is not known without a tolerance.
  test("a charging share that is not assessed is not handed on as the even one", () => {
    const { tolerance: _known, ...bare } = can;
    expect(faultBankOf(bank("cross-tied", bare)).worstCharging).not.toBe(400);
  });
});

describe("faultsOf(bank)", () => {
  test("worked number A15: one unit short with the bank held leaves V/(n - 1) = 533.333333 V on the others, over 450 V: fails, both ties", () => {
    for (const ties of ["cross-tied", "strings"] as const) {
      const short = faultsOf(bank(ties)).find((f) => /unit.*short|short.*unit/.test(f.id));
      expect(short, ties).toBeDefined();
      expect(short?.worstVoltage, ties).toBeCloseTo(1600 / 3, 6);
      expect(short?.verdict, ties).toBe("fail");
    }
  });
  test("worked number A15: cross-tied, the neighbours empty 1056 J into the short at 400 V a stage; the tool counts the worst stage voltage", () => {
    const made = bank("cross-tied");
    const short = faultsOf(made).find((f) => /unit.*short|short.*unit/.test(f.id));
    const worst = Math.max(made.result.share.charging as number, made.result.share.holding as number);
    expect(worst).toBeGreaterThan(400);
    expect(short?.energyIntoUnit).toBeCloseTo(1056 * (worst / 400) ** 2, 6);
  });
  test("every fault once", () => {
    const ids = faultsOf(bank("strings")).map((f) => f.id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(ids.length).toBeGreaterThanOrEqual(3);
  });
});
