import { describe, expect, test } from "vitest";
import { otherLines } from "../../src/order/otherLines.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

const brief = briefOf();
const of = (layout = bankOf(), unit = UNIT) => otherLines({ layout, unit, brief });

describe("otherLines({ layout, unit, brief })", () => {
  test("counts what follows from 8s2p cross-tied", () => {
    const needed = Object.fromEntries(of().map((line) => [line.line, line.needed]));
    expect(needed).toMatchObject({
      fuses: 16,
      "fuse holders": 16,
      "shorting links": 8,
      lugs: 32,
      labels: 16 + 8 + 1,
      "resistor mounts": 8,
      "dump resistor": 1,
      "dump relay": 1,
      "earthing stick": 1,
      "meter with divider": 1,
      screen: null,
    });
    expect(needed).not.toHaveProperty("bleed resistor");
    expect(needed).not.toHaveProperty("unit links");
  });

  test("strings have links and a fuse each; no balancing means a bleed resistor of its own and no mounts", () => {
    const layout = bankOf({
      layout: { part: "x", series: 8, parallel: 2, ties: "strings" },
      balance: { kind: "none" },
    });
    const needed = Object.fromEntries(of(layout).map((line) => [line.line, line.needed]));
    expect(needed).toMatchObject({ "unit links": 14, fuses: 2, "bleed resistor": 1 });
    expect(needed).not.toHaveProperty("resistor mounts");
  });

  test("the dump resistor is rated by the joules of the highest capacitance: C_high V^2 / 2, rounded up", () => {
    const rating = of().find((line) => line.line === "dump resistor")?.rating ?? "";
    const joules = (((1e-3 * 1.2 * 2) / 8) * 2000 ** 2) / 2;
    expect(joules).toBe(600);
    expect(rating).toBe("at least 600 J in one dump, at least 2 kV dc");
  });

  test("a dump resistor that the brief states has its value and its peak: V / R = 2 kV / 200 ohm = 10 A", () => {
    const stated = otherLines({ layout: bankOf(), unit: UNIT, brief: briefOf({ dumpResistance: "200 ohm" }) });
    expect(stated.find((line) => line.line === "dump resistor")).toMatchObject({
      value: "200 ohm",
      rating: "at least 600 J in one dump, at least 2 kV dc, 10 A peak",
      purchase: null,
    });
  });

  test("nothing has a price, and nothing is nought", () => {
    for (const line of of()) {
      expect(line.purchase).toBeNull();
      expect(line.needed).not.toBe(0);
    }
  });
});
