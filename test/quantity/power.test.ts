import { describe, expect, test } from "vitest";
import { power, tenTo } from "../../src/quantity/index.ts";
import fc from "../support/property.ts";

describe("power(base, exponent)", () => {
  test("edges: zero, one, infinite, below nought, beyond the range", () => {
    expect([power(0, 0), power(0, 3), power(0, 0.5), power(5, 0), power(0, -1)]).toEqual([
      1,
      0,
      0,
      1,
      Number.POSITIVE_INFINITY,
    ]);
    expect([power(-2, 3), power(-2, -2), power(-2, 0.5)]).toEqual([-8, 0.25, Number.NaN]);
    expect([power(10, 400), power(10, -400), power(Number.POSITIVE_INFINITY, -0.2)]).toEqual([
      Number.POSITIVE_INFINITY,
      0,
      0,
    ]);
    expect(power(2, Number.NaN)).toBeNaN();
  });

  test("whole exponents are the products themselves", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1e6, noNaN: true }), (x) => {
        expect(power(x, 1)).toBe(x);
        expect(power(x, 2)).toBe(x * x);
        expect(power(x, 3)).toBe(x * (x * x));
        expect(power(x, 4)).toBe(x * x * (x * x));
        expect(power(x, -1)).toBe(1 / x);
      }),
    );
  });

  test("others agree with the engine's own to 1e-13 of the value: rounding of exp and log, times the size of the exponent", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-6, max: 1e6, noNaN: true }),
        fc.double({ min: -10, max: 10, noNaN: true }),
        (x, y) => {
          expect(Math.abs(power(x, y) / x ** y - 1)).toBeLessThan(1e-13);
        },
      ),
    );
  });

  test("tenTo(k) is the literal, everywhere: 10^-5 and 10^23 too", () => {
    for (let k = -300; k <= 300; k++) expect(tenTo(k)).toBe(Number.parseFloat(`1e${k}`));
  });

  test("bits that every engine must give, as they were on releases 20, 22 and 24 of node", () => {
    let [state, sum] = [12345, 0n];
    for (let i = 0; i < 20_000; i++) {
      state = (state * 48271) % 2147483647;
      const x = (state / 2147483647) * 20 + 1e-9;
      const y = [3, -1, 1.5, -0.2, 0.2, 7.3][i % 6] as number;
      const [bits = 0n] = new BigUint64Array(new Float64Array([power(x, y)]).buffer);
      sum = (sum * 1_000_003n + bits) & 0xffff_ffff_ffff_ffffn;
    }
    expect(sum.toString(16)).toBe("dcb4a547488cfece");
  });
});
