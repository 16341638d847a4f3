import { describe, expect, test } from "vitest";
import { factsOf } from "../../src/sheet/facts.ts";
import { againstRule, clearWords, NO_WAYS, pathCount, shortedWays, waysDown } from "../../src/sheet/ways.ts";
import { BARE, sheetInput } from "../support/sheet.ts";

describe("waysDown(facts, fall)", () => {
  // t = R C ln(V/Vs), textbook.
  test("each way alone, one chain fewer with a bleeder open, never when it was the only one", () => {
    const facts = { capacitance: 1e-3, chain: 1e4, chains: 2, dump: 100 };
    const fall = { from: 1000, to: 50 };
    const ways = waysDown(facts, fall);
    expect(ways.chains).toBeCloseTo(5 * Math.log(20), 9);
    expect(ways.oneOpen).toBeCloseTo(10 * Math.log(20), 9);
    expect(ways.dump).toBeCloseTo(0.1 * Math.log(20), 9);
    expect(waysDown({ ...facts, chains: 1 }, fall).oneOpen).toBe(Number.POSITIVE_INFINITY);
    expect(waysDown({ ...facts, chain: null, chains: 0, dump: null }, fall)).toEqual({
      chains: Number.POSITIVE_INFINITY,
      oneOpen: Number.POSITIVE_INFINITY,
      dump: null,
    });
  });
});

describe("shortedWays(input, facts, fall)", () => {
  test("cross-tied: the chain as before, the dump n/(n - 1) longer; no capacitance, no times", () => {
    const input = sheetInput({ brief: { dumpResistance: "1 kohm" } });
    const facts = factsOf(input);
    const fall = { from: 2000, to: 60 };
    const [whole, short] = [waysDown(facts, fall), shortedWays(input, facts, fall)];
    expect(short.chains! / whole.chains!).toBeCloseTo(1, 12);
    expect(short.dump! / whole.dump!).toBeCloseTo(8 / 7, 12);
    expect(shortedWays(sheetInput({ unit: BARE }), factsOf(sheetInput({ unit: BARE })), fall)).toEqual(NO_WAYS);
  });
});

describe("clearWords and pathCount(facts)", () => {
  test("the level with what sets it", () => {
    expect(clearWords({ clear: 60, clearBy: "R" })).toBe("60 V (R)");
  });

  test("chains are one way however many, the dump another", () => {
    expect(pathCount({ chains: 0, dump: null }).count).toBe(0);
    expect(pathCount({ chains: 1, dump: null })).toMatchObject({
      count: 1,
      words: expect.stringMatching(/one open resistor ends it/),
    });
    expect(pathCount({ chains: 5, dump: 100 })).toMatchObject({
      count: 2,
      words: expect.stringMatching(/5 bleed chains side by side, counted as one/),
    });
  });
});

describe("againstRule(facts, ways)", () => {
  test("each way within or over the rule's time; at the time itself it is within", () => {
    const ways = { chains: 5, oneOpen: Number.POSITIVE_INFINITY, dump: null };
    expect(againstRule({ allowed: 5, chain: 1 }, ways)).toEqual([
      "Bleed chains alone: within the 5 s of the rule.",
      "With one bleeder open: OVER the 5 s of the rule.",
    ]);
    expect(againstRule({ allowed: null, chain: 1 }, ways)).toEqual([]);
    expect(againstRule({ allowed: 5, chain: null }, { ...ways, dump: 6 })).toEqual([
      "Dump resistor alone: OVER the 5 s of the rule.",
    ]);
  });
});
