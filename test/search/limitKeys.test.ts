import { describe, expect, test } from "vitest";
import { z } from "zod";
import { LIMIT_KEYS, limitKeys } from "../../src/search/limitKeys.ts";

const schema = z.strictObject(limitKeys);

describe("limitKeys", () => {
  test("a limit in its own unit, or a part of the unit's rating", () => {
    expect(schema.parse({ maxPeakCurrent: "400 A" }).maxPeakCurrent).toEqual({ kind: "absolute", value: 400 });
    expect(schema.parse({ maxPeakCurrent: 400 }).maxPeakCurrent).toEqual({ kind: "absolute", value: 400 });
    expect(schema.parse({ maxPeakCurrent: "80 %" }).maxPeakCurrent).toEqual({ kind: "part", value: 0.8 });
    expect(schema.parse({ maxSlew: "20 V/us" }).maxSlew).toEqual({ kind: "absolute", value: 2e7 });
  });

  test.each([
    { maxPeakCurrent: "400 V" },
    { maxPeakCurrent: "120 %" },
    { maxPeakCurrent: 0 },
    { maxReversal: 2 },
    { minLife: 0 },
  ])("%j is refused", (input) => {
    expect(schema.safeParse(input).success).toBe(false);
  });

  test("LIMIT_KEYS names each once", () => {
    expect(LIMIT_KEYS).toHaveLength(7);
  });
});
