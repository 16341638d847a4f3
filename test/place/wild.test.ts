import { describe, expect, test } from "vitest";
import { wildEffect } from "../../src/place/wild.ts";
import { units } from "./lots.ts";

const asked = { series: 3, parallel: 3, ties: "cross-tied" } as const;
const wild = (count: number) =>
  units("normal", count, 6).map((unit, i) => (i === 4 ? { ...unit, capacitance: 1.6e-3 } : unit));

describe("wildEffect(units, request, facts)", () => {
  test("fitted for want of a spare: without it a median unit is supposed, and the gap falls at least tenfold", () => {
    const lot = wild(9);
    const order = lot.map((_, i) => i);
    const effect = wildEffect(lot, asked, { serial: "U005", gap: 0.05, fitted: true, order })!;
    expect(effect).toMatchObject({ withUnit: 0.05, supposed: true });
    expect(effect.without).toBeLessThan(0.005);
  });
  test("set aside: the gap with it forced in is worse", () => {
    const lot = wild(10);
    const order = lot.map((_, i) => i);
    const effect = wildEffect(lot, asked, { serial: "U005", gap: 0.001, fitted: false, order })!;
    expect(effect).toMatchObject({ without: 0.001, supposed: false });
    expect(effect.withUnit).toBeGreaterThan(0.02);
  });
});
