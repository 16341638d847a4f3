import { describe, expect, test } from "vitest";
import { type BankFlags, checkedBank } from "../../src/cli/checked.ts";
import { fakePorts } from "../support/fakePorts.ts";

const CATALOG =
  "part,capacitance [uF],voltage [V],tolerance [%],polarised,leakage [uA]\np,1000,400,20,yes,100\nq,500,400,20,no,\n";
const RESISTORS =
  "family,series,lowest [ohm],highest [ohm],tolerance [%],power [W],voltage [V]\nsmall,E24,1,1000000,5,0.25,250\nbig,E24,1,1000000,5,10,1000\n";
const BASE: BankFlags = { energy: "500 J", voltage: "2 kV", ripple: "100 %", catalog: ["c.csv"] };
const FLAGS: BankFlags = { ...BASE, part: "p", series: "8", parallel: "2", ties: "cross-tied" };
const run = (flags: BankFlags, layout = "") =>
  checkedBank(undefined, flags, fakePorts({ "c.csv": CATALOG, "r.csv": RESISTORS, "l.json": layout }));
const good = (flags: BankFlags, layout = "") => {
  const read = run(flags, layout);
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
};
const LAYOUT = (balance: unknown): string =>
  JSON.stringify({ part: "p", series: 8, parallel: 2, ties: "cross-tied", balance });

describe("checkedBank(brief, flags, ports)", () => {
  test("every fault of every input at once", () => {
    const read = run({ catalog: ["/none"], part: "p", series: "0" });
    const codes = read.ok ? [] : read.refusals.map((one) => one.code);
    expect(codes).toEqual(expect.arrayContaining(["missing-value", "no-such-file", "bad-count", "missing-option"]));
  });

  test("an unknown part is told with the nearest", () => {
    const read = run({ ...FLAGS, part: "P" });
    expect(read.ok ? null : read.refusals[0]).toMatchObject({ code: "unknown-part", place: { field: "--part" } });
  });

  test("a resistance that takes an absurd count of elements is refused with the least that does not", () => {
    const read = run({ ...FLAGS, balance: "1e-9 ohm" });
    expect(read.ok ? null : read.refusals).toMatchObject([
      { code: "bad-balance", place: { field: "--balance" }, read: expect.stringMatching(/100000 elements/) },
    ]);
    // Of 2 kV the one 5 % high beside seven 5 % low has 272.7 V; squared over 0.95 R, 1 W used of each of 100 000: 0.783 ohm.
    const least = /^(\S+ \S+) or more/.exec(read.ok ? "" : (read.refusals[0]?.want ?? ""))?.[1] ?? "";
    expect(least).toBe("783 mohm");
    expect(run({ ...FLAGS, balance: least }).ok).toBe(true);
    expect(run({ ...FLAGS, balance: "775 mohm" }).ok).toBe(false);
  });

  test("the rule chooses the resistor when nothing else is said", () => {
    expect(good(FLAGS).result.balance?.family).toBe("assumed 2 W leaded");
    expect(good(FLAGS).notes).toEqual([]);
  });

  test("flags fix it, its missing tolerance is assumed and said, none leaves it out", () => {
    const fixed = good({ ...FLAGS, balance: "20 kohm" });
    expect(fixed.result.balance).toMatchObject({ resistance: 20000, tolerance: 0.05 });
    expect(fixed.notes[0]).toMatch(/5 % is assumed/);
    expect(good({ ...FLAGS, balance: "20 kohm", balanceTolerance: "1 %" }).notes).toEqual([]);
    expect(good({ ...FLAGS, balance: "none" }).result.balance).toBeNull();
  });

  test("a fixed resistor is made of the family that takes the fewest elements", () => {
    // By hand: V_1 = (2000/19000 + 7 x 0.2 mA)/(7/21000 + 1/19000) = 276.4 V, 4.02 W: one of 10 W at half its rating, 33 of 0.25 W.
    const { balance } = good({ ...FLAGS, balance: "20 kohm", balanceTolerance: "5 %", resistors: "r.csv" }).result;
    expect(balance).toMatchObject({ family: "big", elements: 1 });
  });

  test("a file's own resistor is kept and said, in its own family; one of the assumed family is chosen again", () => {
    const own = good(
      { ...BASE, layout: "l.json", resistors: "r.csv" },
      LAYOUT({ resistance: 10000, tolerance: 0.05, family: "small" }),
    );
    expect(own.result.balance).toMatchObject({ resistance: 10000, family: "small" });
    expect(own.notes[0]).toMatch(/the layout's file/);
    const assumed = good(
      { ...BASE, layout: "l.json", resistors: "r.csv" },
      LAYOUT({ resistance: 10000, tolerance: 0.05, family: "assumed 2 W leaded", assumed: true }),
    );
    expect(assumed.result.balance?.resistance).not.toBe(10000);
    expect(assumed.notes[0]).toMatch(/chosen again/);
  });

  test("a file without resistors has none; one that the rule would choose anyway makes no note", () => {
    const none = good({ ...BASE, layout: "l.json" }, LAYOUT(null));
    expect(none.result.balance).toBeNull();
    expect(none.notes[0]).toMatch(/none are counted/);
    const { balance } = good(FLAGS).result;
    expect(good({ ...BASE, layout: "l.json" }, LAYOUT(balance)).notes).toEqual([]);
  });
});
