// Compares a number with its expected value to a relative tolerance, and says both when they differ.
import { expect } from "vitest";
import type { Read } from "../../src/quantity/index.ts";

/** |actual - expected| <= relative * |expected|; 1e-8 suits nine printed digits. */
export function near(actual: number | null | undefined, expected: number, relative = 1e-8): void {
  if (typeof actual !== "number") throw new Error(`expected ${expected}, got ${actual}`);
  const off = Math.abs(actual - expected);
  expect(off, `${actual} against ${expected}`).toBeLessThanOrEqual(relative * Math.abs(expected));
}

/** The value of an accepted read; a refusal fails the test with its codes. */
export function got<T>(read: Read<T>): T {
  if (!read.ok) throw new Error(read.refusals.map(({ code }) => code).join(", "));
  return read.value;
}

/** Codes of a refused read; an accepted one gives none. */
export const codesOf = (read: Read<unknown>): readonly string[] =>
  read.ok ? [] : read.refusals.map(({ code }) => code);
