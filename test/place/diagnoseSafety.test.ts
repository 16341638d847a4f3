import { describe, expect, test } from "vitest";
import { limitFindings, STOP_ACTIONS, sumFindings } from "../../src/place/diagnoseSafety.ts";

const meter = { relative: 0.001, absolute: 0.1, common: 0, current: 0.05 };
const row = (volts: readonly (number | null)[], total?: number) => ({
  seconds: 10,
  bank: 300,
  volts,
  ...(total === undefined ? {} : { total }),
});

describe("limitFindings(rows, limit)", () => {
  test("each reading over the limit, with either sign; at the limit is within; no limit, no finding", () => {
    expect(limitFindings([row([100, 101, -102, null])], 100).map((f) => f.value)).toEqual([101, 102]);
    expect(limitFindings([row([900])], null)).toEqual([]);
  });
});

describe("sumFindings(rows, meter)", () => {
  test("readings that add up within the meter are not flagged, nor rows that are not whole", () => {
    expect(sumFindings([row([100, 100.1, 99.8], 300), row([100, null, 100], 300), row([1, 1, 1])], meter)).toEqual([]);
  });
  test("a sum that is off is flagged; one that is right without signs is called a swapped lead", () => {
    expect(sumFindings([row([100, 100, 90], 300)], meter)[0]!.note).toMatch(/differ/);
    expect(sumFindings([row([100, -100, 100], 300)], meter)[0]!.note).toMatch(/lead/);
  });
});

test("STOP_ACTIONS: charger off before discharge, discharge and proof before touching", () => {
  const at = (word: RegExp) => STOP_ACTIONS.findIndex((action) => word.test(action));
  expect(at(/charger off/)).toBeLessThan(at(/Discharge/));
  expect(at(/Discharge/)).toBeLessThan(at(/every stage: a stage/));
  expect(at(/every stage: a stage/)).toBeLessThan(at(/stick/));
  expect(at(/stick/)).toBeLessThan(at(/hand/));
});
