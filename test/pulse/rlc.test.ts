// rlc: refusals and limits first, then values at known times.
import { describe, expect, test } from "vitest";
import { checkLoop, dampingOf, dischargeAt, limitOf } from "../../src/pulse/rlc.ts";
import { codesOf, got, near } from "./near.ts";

const loop = { capacitance: 500e-6, inductance: 2e-6, resistance: 0.04 };

describe("checkLoop(loop, voltage)", () => {
  test("refuses every bad number at once, each by its own code", () => {
    const bad = checkLoop({ capacitance: 0, inductance: -1, resistance: Number.NaN }, Number.POSITIVE_INFINITY);
    expect(codesOf(bad)).toEqual([
      "pulse.loop.capacitance",
      "pulse.loop.inductance",
      "pulse.loop.resistance",
      "pulse.loop.voltage",
    ]);
  });

  test("refuses a loop with neither resistance nor inductance", () => {
    const bad = checkLoop({ capacitance: 1, inductance: 0, resistance: 0 }, 1);
    expect(codesOf(bad)).toEqual(["pulse.loop.none"]);
    expect(bad).toMatchObject({
      refusals: [{ place: { field: "inductance" }, read: "0 H and 0 ohm", want: expect.stringContaining("no bound") }],
    });
  });

  test("each refusal names its field, shows the number and says whether zero would do", () => {
    const bad = checkLoop({ capacitance: 0, inductance: -1, resistance: -2 }, 0);
    const [above, orMore] = ["a number above zero", "a number, zero or more"];
    expect(bad.ok ? [] : bad.refusals.map(({ place, read, want }) => [place.field, read, want])).toEqual([
      ["capacitance", "0", above],
      ["inductance", "-1", orMore],
      ["resistance", "-2", orMore],
      ["voltage", "0", above],
    ]);
    // A bad number is told alone: with it nothing can be said of the loop.
    expect(codesOf(checkLoop({ capacitance: -1, inductance: 0, resistance: 0 }, 1))).toEqual([
      "pulse.loop.capacitance",
    ]);
  });

  test("accepts a sound loop and both limits", () => {
    expect(got(checkLoop(loop, 3000))).toBe(loop);
    expect(checkLoop({ ...loop, inductance: 0 }, 1).ok).toBe(true);
    expect(checkLoop({ ...loop, resistance: 0 }, 1).ok).toBe(true);
  });
});

describe("limitOf(loop), dampingOf(loop)", () => {
  test("name the limits; a pure RC loop has no damping ratio", () => {
    expect(limitOf(loop)).toBe("general");
    expect(limitOf({ ...loop, resistance: 0 })).toBe("lossless");
    expect(limitOf({ ...loop, inductance: 0 })).toBe("pure RC");
    expect(limitOf({ ...loop, inductance: 0, resistance: 0 })).toBe("no impedance");
    expect(dampingOf({ ...loop, inductance: 0 })).toBeNull();
    near(dampingOf(loop), 0.316227766);
  });
});

describe("dischargeAt(loop, voltage, time)", () => {
  test("pure RC: V/R at once, then e^(-t/RC)", () => {
    const rc = { capacitance: 1e-3, inductance: 0, resistance: 2 };
    expect(dischargeAt(rc, 100, 0)).toEqual({ current: 50, voltage: 100 });
    near(dischargeAt(rc, 100, 2e-3).voltage, 100 / Math.E, 1e-14);
  });

  test("lossless: V/Z0 a quarter turn on, and back at full voltage after a turn", () => {
    const ring = { capacitance: 1e-4, inductance: 1e-6, resistance: 0 };
    near(dischargeAt(ring, 1000, (Math.PI / 2) * 1e-5).current, 10000, 1e-12);
    near(dischargeAt(ring, 1000, 2 * Math.PI * 1e-5).voltage, 1000, 1e-12);
  });

  test("the ring of 500 uF, 2 uH, 40 mohm at 3 kV peaks at 31 280.4767 A", () => {
    near(dischargeAt(loop, 3000, 4.16348591e-5).current, 31280.4767);
    expect(Math.abs(dischargeAt(loop, 3000, 1.04719755e-4).current)).toBeLessThan(1e-3);
    near(dischargeAt(loop, 3000, 1.04719755e-4).voltage, -3000 * 0.350919807);
  });
});
