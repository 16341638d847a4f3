// Makers of limits and the range of voltage a limit speaks of.
import { expect, test } from "vitest";
import { applies, charge, energy, farads, seconds, share, volts } from "../../src/hazard/rule.ts";

test("applies(limit, voltage): from and upTo are inclusive, below is exclusive, absent is any voltage", () => {
  const tier = energy(1, { from: 100, below: 400 });
  expect([99.999, 100, 399.999, 400].map((v) => applies(tier, v))).toEqual([false, true, true, false]);
  const upTo = charge(45e-6, { upTo: 15e3 });
  expect([0, 15e3, 15001].map((v) => applies(upTo, v))).toEqual([true, true, false]);
  expect(applies(volts(60), 1e6)).toBe(true);
});

test("each maker gives its quantity its SI unit", () => {
  const made = [volts(60), seconds(5), charge(1), energy(1), farads(1, {}), share(0.1)];
  expect(made.map((limit) => limit.unit)).toEqual(["V", "s", "C", "J", "F", "1"]);
});
