import { describe, expect, test } from "vitest";
import { coldTestSection } from "../../../src/sheet/sections/coldTest.ts";
import { BARE, placedIn, sheetInput, tableOf } from "../../support/sheet.ts";

const rows = (input: ReturnType<typeof sheetInput>) =>
  new Map(tableOf({ sections: [coldTestSection(input)] }, "cold-test").rows.map((row) => [row[0], row.slice(1)]));

describe("coldTestSection(input)", () => {
  test("capacitance of every stage and of the bank between its low and high end", () => {
    const found = rows(sheetInput());
    expect(found.get("capacitance of stage 8")?.slice(0, 2)).toEqual(["2 mF", "1.6 mF to 2.4 mF"]);
    expect(found.get("capacitance of the bank")?.slice(0, 2)).toEqual(["250 µF", "200 µF to 300 µF"]);
    expect(rows(sheetInput({ shape: { ties: "strings" } })).get("capacitance of string 2")?.[0]).toBe("125 µF");
  });

  test("measured units: the sum of those that stand there, within the meter's doubt", () => {
    const bare = sheetInput();
    const placed = placedIn(bare);
    const sum = placed.positions.filter(({ group }) => group === 3).reduce((total, p) => total + p.capacitance, 0);
    const [predicted, accepted] = rows({ ...bare, placed }).get("capacitance of stage 3")!;
    expect(predicted).toBe(`${Number((sum * 1e3).toPrecision(4))} mF`);
    const [low, high] = accepted!.split(" to ").map((text) => Number.parseFloat(text) * 1e-3) as [number, number];
    // 0.4 % from unit to unit and two standard deviations of two meters of 0.3 %: sqrt(2) times 0.6 %.
    const u = 0.004 + 2 * Math.hypot(0.003, 0.003);
    expect([low <= sum * (1 - u), high >= sum * (1 + u), high - low < sum * 0.027]).toEqual([true, true, true]);
  });

  test("two strings of 16.12 and 20.17 uF make a bank of 36.29 uF, in a band of the meters", () => {
    const bare = sheetInput({ shape: { ties: "strings", series: 2 }, brief: { voltage: "500 V", energy: "1 J" } });
    const one = { ...placedIn(bare).positions[0]!, use: "fitted" as const };
    // Equal halves of a string are twice its capacitance each.
    const values = [32.24e-6, 32.24e-6, 40.34e-6, 40.34e-6];
    const positions = values.map((capacitance, i) => ({ ...one, serial: `u${i}`, capacitance }));
    const placed = {
      ...placedIn(bare),
      positions,
      groups: [
        ["u0", "u1"],
        ["u2", "u3"],
      ],
    };
    const found = rows({ ...bare, placed });
    expect(found.get("capacitance of string 1")?.[0]).toBe("16.12 µF");
    expect(found.get("capacitance of the bank")?.[0]).toBe("36.29 µF");
    const [low, high] = found.get("capacitance of the bank")![1]!.split(" to ").map(Number.parseFloat);
    expect([low! > 35.8, high! < 36.8]).toEqual([true, true]);
  });

  test("every balancing position is read; the dump, the interlock and the loss of power are proven", () => {
    const { layout } = sheetInput();
    const found = rows(sheetInput());
    const low = layout.balance!.resistance * 0.95;
    expect(found.get("resistance of RB8")?.[1]).toMatch(/ to /);
    expect(Number.parseFloat(found.get("resistance of RB8")![1]!) * 1e3).toBeCloseTo(low, -1);
    expect(found.has("dump closes when its power fails")).toBe(true);
    expect(found.get("dump resistance, relay closed")?.[0]).toBeNull();
  });

  test("no tolerance, no band; a unit without polarity needs no second look at it", () => {
    expect(rows(sheetInput({ unit: BARE })).get("capacitance of stage 1")?.[1]).toBeNull();
    const film = sheetInput({ unit: { ...BARE, polarised: false } });
    expect([...rows(film).keys()].some((test) => test?.startsWith("polarity"))).toBe(false);
    expect([...rows(sheetInput({ unit: BARE })).keys()].some((test) => test?.startsWith("polarity"))).toBe(true);
  });
});
