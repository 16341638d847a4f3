// samples: what is refused, then exact integrals of straight lines.
import { describe, expect, test } from "vitest";
import { checkSamples, integralsOf, sampleAt } from "../../src/pulse/samples.ts";
import { codesOf, near } from "./near.ts";

const of = (...rows: readonly (readonly [number, number])[]) => rows.map(([time, current]) => ({ time, current }));

describe("checkSamples(samples)", () => {
  test("too few, not a number", () => {
    expect(codesOf(checkSamples([]))).toEqual(["pulse.samples.few"]);
    expect(codesOf(checkSamples(of([0, 1])))).toEqual(["pulse.samples.few"]);
    expect(codesOf(checkSamples(of([0, 1], [Number.NaN, 2])))).toEqual(["pulse.samples.number"]);
  });

  test("time that stands still or falls, and a gap, each with the sample's number", () => {
    const read = checkSamples(of([0, 0], [1, 1], [1, 2], [0.5, 2], [1.5, 2], [2.5, 2], [3.5, 2], [30, 0]));
    expect(codesOf(read)).toEqual(["pulse.samples.order", "pulse.samples.order", "pulse.samples.gap"]);
    expect(read.ok ? [] : read.refusals.map(({ place }) => place.line)).toEqual([3, 4, 8]);
  });

  test("an uneven but gapless record is accepted", () => {
    expect(checkSamples(of([0, 0], [1, 1], [3, 1], [4, 0])).ok).toBe(true);
  });
});

describe("integralsOf(samples)", () => {
  test("a triangle of 10 A over 4 s: 20 C, 133.3 A^2 s", () => {
    const got = integralsOf(of([0, 0], [1, 10], [4, 0]));
    near(got.charge, 20, 1e-15);
    near(got.action, 400 / 3, 1e-15);
    expect(got.peakCurrent).toBe(10);
    expect(got.peakTime).toBe(1);
  });

  test("a line through zero: charge cancels, absolute charge and the greatest charge do not", () => {
    const got = integralsOf(of([2, 3], [4, -3]));
    expect(got.charge).toBe(0);
    near(got.absoluteCharge, 3, 1e-15);
    near(got.greatestCharge, 1.5, 1e-15);
    near(got.action, 6, 1e-15);
  });
});

describe("sampleAt(samples, integrals, time)", () => {
  test("between samples and outside them", () => {
    const samples = of([1, 0], [2, 10], [5, 0]);
    const integrals = integralsOf(samples);
    expect(sampleAt(samples, integrals, 0)).toEqual({ current: 0, charge: 0 });
    expect(sampleAt(samples, integrals, 0.5)).toEqual({ current: 5, charge: 1.25 });
    near(sampleAt(samples, integrals, 2.5).charge, 5 + 10 + (5 + 0) * 0.75 - 3.75, 0.2);
    expect(sampleAt(samples, integrals, 9)).toEqual({ current: 0, charge: 20 });
  });
});
