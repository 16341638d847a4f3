// load: every fault of a circuit by its code, and the linear part of each kind of load.
import { describe, expect, test } from "vitest";
import { type Circuit, checkCircuit, IDEAL_SWITCH, linearPartOf } from "../../src/pulse/load.ts";
import { codesOf } from "./near.ts";

const circuit: Circuit = {
  load: { kind: "resistor", resistance: 1 },
  bus: { resistance: 0, inductance: 0 },
  switch: IDEAL_SWITCH,
  clamp: null,
};

describe("checkCircuit(circuit)", () => {
  test("tells every bad number at once", () => {
    const bad: Circuit = {
      load: { kind: "coil", resistance: -1, inductance: Number.NaN },
      bus: { resistance: -1, inductance: -1 },
      switch: { drop: -1, resistance: Number.POSITIVE_INFINITY, oneWay: false },
      clamp: { drop: -1, resistance: -1 },
    };
    expect(codesOf(checkCircuit(bad))).toEqual([
      "pulse.circuit.switchDrop",
      "pulse.circuit.switchResistance",
      "pulse.circuit.busResistance",
      "pulse.circuit.busInductance",
      "pulse.circuit.clampDrop",
      "pulse.circuit.clampResistance",
      "pulse.circuit.loadResistance",
      "pulse.circuit.loadInductance",
    ]);
  });

  test("passes on the faults of a lamp, of a record, of a steady current", () => {
    const lamp = { bore: 0, arcLength: 0.1, gas: "xenon", pressure: 6e4, count: 1 } as const;
    expect(codesOf(checkCircuit({ ...circuit, load: { kind: "lamp", lamp } }))).toEqual(["pulse.lamp.bore"]);
    expect(codesOf(checkCircuit({ ...circuit, load: { kind: "recorded", samples: [] } }))).toEqual([
      "pulse.samples.few",
    ]);
    expect(codesOf(checkCircuit({ ...circuit, load: { kind: "steady current", current: 0, seconds: -1 } }))).toEqual([
      "pulse.circuit.steadyCurrent",
      "pulse.circuit.steadySeconds",
    ]);
  });

  test("an unknown bus is not a fault, and neither is a dead short", () => {
    expect(checkCircuit({ ...circuit, bus: null, load: { kind: "short" } }).ok).toBe(true);
  });
});

describe("linearPartOf(load)", () => {
  test("a coil is both, a resistor has no inductance, a short and a lamp have neither", () => {
    expect(linearPartOf({ kind: "coil", resistance: 1, inductance: 2 })).toEqual({ resistance: 1, inductance: 2 });
    expect(linearPartOf({ kind: "resistor", resistance: 3 })).toEqual({ resistance: 3, inductance: 0 });
    expect(linearPartOf({ kind: "short" })).toEqual({ resistance: 0, inductance: 0 });
  });
});
