import { describe, expect, test } from "vitest";
import { bleedDownSection } from "../../../src/sheet/sections/bleedDown.ts";
import { BARE, LOAD, sheetInput, tableOf, wordsIn } from "../../support/sheet.ts";

const rows = (wishes: Parameters<typeof sheetInput>[0]) =>
  new Map(
    tableOf({ sections: [bleedDownSection(sheetInput(wishes))] }, "bleed-down").rows.map((row) => [
      row[0],
      row.slice(1),
    ]),
  );
const seconds = (cell: string | null | undefined): number => {
  const [, value, unit] = /^([\d.]+) (\w+)$/.exec(cell ?? "") ?? [];
  return Number(value) * { ms: 1e-3, s: 1, min: 60, h: 3600 }[unit as "s"]!;
};

/** Four figures, rounded up: never below, and at most one in the fourth above. */
const expectRoundedUp = (printed: string | null | undefined, exact: number): void => {
  expect(seconds(printed) / exact).toBeGreaterThanOrEqual(1 - 1e-9);
  expect(seconds(printed) / exact).toBeLessThan(1.001);
};

describe("bleedDownSection(input)", () => {
  test("from full: each way alone, at high C and high R", () => {
    const { layout } = sheetInput();
    const found = rows({ brief: { dumpResistance: "1 kohm" } }).get("full")!;
    const chain = layout.balance!.resistance * 1.05 * 8;
    expect(found[0]).toBe("2 kV");
    expectRoundedUp(found[1], chain * 300e-6 * Math.log(2000 / 60));
    expect(found[2]).toBe("never");
    expectRoundedUp(found[3], 0.3 * Math.log(2000 / 60));
  });

  test("a unit shorted with the charger on, cross-tied: the same time constant from the same voltage", () => {
    const found = rows({ brief: { dumpResistance: "1 kohm" } });
    expect(found.get("one unit shorted, charger on")?.[1]).toBe(found.get("full")?.[1]);
    // C grows by 8/7.
    expectRoundedUp(found.get("one unit shorted, charger on")?.[3], 0.3 * (8 / 7) * Math.log(2000 / 60));
  });

  test("strings: one string of n - 1 beside p - 1 whole ones, by hand; the worst chain to lose is the short string's", () => {
    const wishes = { shape: { ties: "strings", parallel: 3 }, brief: { dumpResistance: "1 kohm" } } as const;
    const { layout } = sheetInput(wishes);
    const found = rows(wishes);
    const [n, p] = [8, 3];
    const r = layout.balance!.resistance * 1.05;
    const unit = 1.2e-3;
    const c = ((p - 1) * unit) / n + unit / (n - 1);
    const g = (p - 1) / (n * r) + 1 / ((n - 1) * r);
    const fall = Math.log(2000 / 60);
    const row = found.get("one unit shorted, charger on")!;
    expectRoundedUp(row[1], (c / g) * fall);
    expectRoundedUp(row[2], c * ((n * r) / (p - 1)) * fall);
    expectRoundedUp(row[3], 1000 * c * fall);
    expect(found.get("balancing resistor of one unit open")?.[1]).toBe(found.get("full")?.[2]);
  });

  test("states that the brief does not tell are blanks; those that it tells are rows of figures", () => {
    const open = rows({});
    expect(open.get("charger ran on")?.slice(0, 4)).toEqual([null, null, null, null]);
    expect(open.get("after a shot, or fired early")?.[0]).toBeNull();
    const told = rows({ brief: { ...LOAD, charger: { current: "50 mA", highest: "2.4 kV" } } });
    expect(told.get("charger ran on")?.[0]).toBe("2.4 kV");
    expect(told.get("after a shot, or fired early")?.[0]).not.toBeNull();
    expect(told.get("dump stuck open")?.[3]).toBe("never");
  });

  test("no tolerance: no longest time is given; no chain: it is said that only the dump empties it", () => {
    const bare = bleedDownSection(sheetInput({ unit: BARE, brief: { dumpResistance: "1 kohm" } }));
    expect(tableOf({ sections: [bare] }, "bleed-down").rows[0]?.[4]).toBeNull();
    expect(wordsIn(bare)).toMatch(/no longest time can be given, and none is/);
    const single = sheetInput({ shape: { series: 1, ties: "strings" }, brief: { voltage: "300 V", energy: "10 J" } });
    expect(tableOf({ sections: [bleedDownSection(single)] }, "bleed-down").rows[0]?.[2]).toBe("no chain");
  });

  test("after a shot the units may keep their own; a second open bleeder of one chain is never; the dump is nominal", () => {
    const found = rows({ brief: { ...LOAD, hold: "30 s" } });
    expect(found.get("after a shot, or fired early")?.at(-1)).toMatch(/units may keep 103 V/);
    const section = bleedDownSection(sheetInput({ shape: { ties: "strings", parallel: 2 } }));
    const open = tableOf({ sections: [section] }, "bleed-down").rows.find(([name]) =>
      name?.includes("of one unit open"),
    );
    // Two chains: one open is the row, a second the column.
    expect(open?.[3]).toBe("never");
    expect(open?.[2]).not.toBe("never");
    expect(wordsIn(section)).toMatch(/the dump resistor at its nominal resistance/);
  });

  test("the rule that governs is named with its time, and what comes back after a short", () => {
    const section = bleedDownSection(sheetInput({ rule: "iec-60204-residual" }));
    expect(wordsIn(section)).toMatch(/IEC 60204-1 6\.2\.4, second hand\. It allows 5 s\./);
    // 10 % to 15 % of 2 kV for wet electrolytics.
    expect(wordsIn(section)).toMatch(/200 V to 300 V may come back/);
    expect(wordsIn(section)).toMatch(/Bleed chains alone: OVER the 5 s of the rule\./);
  });
});
