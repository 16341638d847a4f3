// Lattices: convolution keeps relative precision, reciprocals keep mass, the distribution is read between nodes.
import { describe, expect, test } from "vitest";
import { below, convolve, power, reciprocal, sigmasAcross, trimmed } from "../../src/bank/tailLattice.ts";

const die = { first: 1, step: 1, masses: new Float64Array(6).fill(1 / 6) };

describe("convolve(a, b), power(base, count)", () => {
  test("two dice make 7 in 6 of 36 ways, three make 18 in 1 of 216", () => {
    const two = convolve(die, die);
    expect(two.first).toBe(2);
    expect(two.masses[5]).toBeCloseTo(6 / 36, 15);
    const three = power(die, 3);
    expect(three.first).toBe(3);
    expect(three.masses.at(-1)! * 216).toBeCloseTo(1, 13);
  });

  test("the end of 30 dice, 6^-30 = 4.5e-24, keeps 12 digits: a transform would have lost it at 1e-16", () => {
    const many = power(die, 30);
    expect(many.masses[0]! * 6 ** 30).toBeCloseTo(1, 12);
    expect(many.masses[1]! * 6 ** 30).toBeCloseTo(30, 10);
  });
});

describe("trimmed(lattice)", () => {
  test("drops ends of nothing and keeps its place", () => {
    const cut = trimmed({ first: 5, step: 2, masses: Float64Array.of(0, 1e-60, 0.5, 0.5, 0) });
    expect(cut.first).toBe(9);
    expect([...cut.masses]).toEqual([0.5, 0.5]);
  });
  test("two nodes always stay, so that there is a step to speak of", () => {
    const at = (...masses: number[]) => {
      const cut = trimmed({ first: 5, step: 2, masses: Float64Array.from(masses) });
      return [cut.first, ...cut.masses];
    };
    expect(at(1, 0, 0, 0)).toEqual([5, 1, 0]);
    expect(at(0, 0, 0, 1)).toEqual([9, 0, 1]);
    expect(at(0, 0, 0).length).toBe(3);
    expect(at(0, 3)).toEqual([5, 0, 3]);
  });
});

describe("reciprocal(lattice, cells)", () => {
  test("mass and mean of 1/x are kept", () => {
    const turned = reciprocal(die, 50);
    let mass = 0;
    let mean = 0;
    for (const [k, m] of turned.masses.entries()) {
      mass += m;
      mean += m * (turned.first + k * turned.step);
    }
    expect(mass).toBeCloseTo(1, 13);
    expect(mean).toBeCloseTo((1 + 1 / 2 + 1 / 3 + 1 / 4 + 1 / 5 + 1 / 6) / 6, 13);
  });
});

describe("a lattice of another step", () => {
  const half = { first: 2, step: 0.5, masses: Float64Array.of(0.1, 0.2, 0.3, 0.2, 0.2) };
  test("reciprocal: from 1/4 to 1/2, all of the mass, the mean of 1/x", () => {
    const turned = reciprocal(half, 40);
    expect(turned.first).toBe(0.25);
    expect(turned.first + 40 * turned.step).toBeCloseTo(0.5, 14);
    expect(turned.masses).toHaveLength(41);
    expect([turned.masses[0], turned.masses[40]]).toEqual([expect.closeTo(0.2, 12), expect.closeTo(0.1, 12)]);
    const mean = turned.masses.reduce((sum, mass, k) => sum + mass * (turned.first + k * turned.step), 0);
    expect(mean).toBeCloseTo(0.1 / 2 + 0.2 / 2.5 + 0.3 / 3 + 0.2 / 3.5 + 0.2 / 4, 13);
  });
  test("below: each mass is spread over its own step", () => {
    const chance = below(half);
    expect([1.75, 2, 2.25, 2.625, 3, 4, 4.25].map(chance)).toEqual(
      [0, 0.05, 0.1, 0.25, 0.45, 0.9, 1].map((p) => expect.closeTo(p, 12)),
    );
  });
  test("width in sigmas does not depend on how much mass there is; sums keep the step", () => {
    const triple = { ...half, masses: half.masses.map((mass) => 3 * mass) };
    expect(sigmasAcross(triple)).toBeCloseTo(sigmasAcross(half), 12);
    expect(convolve(half, half)).toMatchObject({ first: 4, step: 0.5 });
    const long = { ...half, masses: Float64Array.from({ length: 9 }, () => 1 / 9) };
    expect([...convolve(half, long).masses]).toEqual(
      [...convolve(long, half).masses].map((m) => expect.closeTo(m, 15)),
    );
  });
});

describe("below(lattice)(value)", () => {
  test("0 before, 1 after, half a mass at its node", () => {
    const chance = below(die);
    expect(chance(0)).toBe(0);
    expect(chance(9)).toBeCloseTo(1, 14);
    expect(chance(1)).toBeCloseTo(1 / 12, 14);
    expect(chance(3.5)).toBeCloseTo(0.5, 14);
  });
});

describe("sigmasAcross(lattice)", () => {
  test("five faces over sqrt(35/12); one value alone counts as 1", () => {
    expect(sigmasAcross(die)).toBeCloseTo(5 / Math.sqrt(35 / 12), 12);
    expect(sigmasAcross({ first: 0, step: 1, masses: Float64Array.of(0, 1, 0) })).toBe(1);
  });
});
