import { describe, expect, test } from "vitest";
import { diagnose } from "../../src/place/diagnose.ts";
import { chargerOff, chargerOn } from "../../src/place/diagnoseModel.ts";
import { wholeFindings } from "../../src/place/diagnoseWhole.ts";

const stages = [1, 2, 3, 4].map(() => ({ capacitance: 1e-2, conductance: 2e-6, resistance: 47e3 }));
const meter = { relative: 0.005, absolute: 0.1, common: 0.01, current: 0.05 };
const doubt = { capacitance: 0.003, leakage: 0.3, resistance: 0.05, bank: 0.02 };
const row = (volts: readonly (number | null)[], more: object = {}) => ({ seconds: 2, bank: 275, volts, ...more });
const whole = (volts: readonly (number | null)[], more: object = {}, course = chargerOn) =>
  wholeFindings({ stages, rows: [row(volts, more)], meter, doubt, course, polarised: true }).map(({ note }) => note);

describe("wholeFindings(question): what no fault of one place makes", () => {
  test("readings that are the bank's, sound or with one fault, are not found fault with", () => {
    for (const volts of [
      [68.9, 68.6, 68.8, 68.7],
      [68.9, -68.6, 68.8, 68.7],
      [0.2, 91.7, 91.6, 91.5],
      [137.5, 45.8, 45.8, 45.9],
      [72, 71.8, 71.9, 72.1],
      [0, null, null, null],
    ])
      expect(whole(volts)).toEqual([]);
    // With the charger off one leaky stage empties by itself.
    expect(whole([0.1, 68.7, 68.7, 68.7], { seconds: 60 }, chargerOff)).toEqual([]);
  });
  test("dead, reversed, across the bank, to a common end, another charge voltage: each is named", () => {
    expect(whole([0, 0, 0, 0])[0]).toMatch(/meter is dead.*Treat the bank as charged/);
    expect(whole([0.3, null, 0.2, null])[0]).toMatch(/meter is dead/);
    expect(whole([-68.7, -68.7, -68.7, -68.7])[0]).toMatch(/reversed/);
    expect(whole([275, 275, 275, 275])[0]).toMatch(/common end/);
    expect(whole([68.7, 137.5, 206.2, 275])[0]).toMatch(/common end/);
    expect(whole([137, 138, 137, 138])[0]).toMatch(/^(?!.*common end).*charge voltage given is wrong/);
    expect(whole([null, null, null, 68.7], { total: 550 })[0]).toMatch(/charge voltage given is wrong/);
  });
});

test("diagnose(request): such readings are never likely sound, name no suspect, and the meter is checked next", () => {
  for (const volts of [
    [0, 0, 0, 0],
    [-68.7, -68.7, -68.7, -68.7],
    [275, 275, 275, 275],
    [137, 138, 137, 138],
  ]) {
    const read = diagnose({ stages, rows: [row(volts)], meter: { relative: 0.005, absolute: 0.1 } });
    if (!read.ok) throw new Error("refused");
    const { verdict, sound, suspects, unexplained, next, findings } = read.value;
    expect({ verdict, suspects, unexplained, next }).toEqual({
      verdict: "differs",
      suspects: [],
      unexplained: true,
      next: { action: "check the meter" },
    });
    expect(sound).toBeLessThan(1e-3);
    expect(findings[0]?.id).toBe("commission.whole");
  }
  const limited = diagnose({ stages, rows: [row([275, 275, 275, 275])], meter, limit: 100 });
  expect(limited).toMatchObject({
    ok: true,
    value: { verdict: "stop", findings: [{ id: "commission.whole" }, {}, {}, {}, {}] },
  });
});

test("diagnose(request): two stages dead at once is no likely sound bank either", () => {
  const read = diagnose({ stages, rows: [row([137.5, 137.5, 0.1, 0.1])], meter });
  expect(read).toMatchObject({ ok: true, value: { verdict: "differs", unexplained: true } });
  if (read.ok) expect(read.value.sound).toBeLessThan(1e-3);
});
