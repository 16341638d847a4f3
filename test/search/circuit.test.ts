import { describe, expect, test } from "vitest";
import { circuitOf, loadOf, pulseBankFor } from "../../src/search/circuit.ts";
import { FILM, shotBrief } from "../support/shotBank.ts";

const bank = pulseBankFor(FILM, { series: 1, parallel: 1, ties: "strings" });
const circuit = (more: Record<string, unknown>) => {
  const read = circuitOf(shotBrief(more), bank);
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
};

describe("loadOf(load)", () => {
  test("each kind of load", () => {
    const kind = (load: Record<string, unknown>) => loadOf(shotBrief({ load }).load)?.kind;
    expect(kind({ resistance: 1 })).toBe("resistor");
    expect(kind({ resistance: 1, inductance: 1e-6 })).toBe("coil");
    expect(kind({ short: true })).toBe("short");
    expect(kind({ current: "10 A", time: "1 ms" })).toBe("steady current");
    expect(
      kind({
        recorded: [
          [0, 0],
          [1e-3, 5],
        ],
      }),
    ).toBe("recorded");
    expect(loadOf(undefined)).toBeNull();
  });
});

describe("circuitOf(brief, bank)", () => {
  test("no bus: a load told whole stands for it all, else it is unknown", () => {
    expect(circuit({}).bus.note).toMatch(/No bus was given/);
    expect(circuit({ load: { inductance: 1e-6 } }).circuit.bus).toBeNull();
    expect(circuit({ load: { short: true } }).circuit.bus).toBeNull();
    expect(circuit({ bus: { resistance: "1 mohm", inductance: "50 nH" } }).circuit.bus).toEqual({
      resistance: 1e-3,
      inductance: 5e-8,
    });
  });

  test("units told to hang on the bus: segments by the pitch, and their taper on top of the run; a section inductance by ties", () => {
    const four = pulseBankFor(FILM, { series: 2, parallel: 4, ties: "cross-tied" });
    const of = (more: Record<string, unknown>, bankOf = four) => {
      const read = circuitOf(shotBrief(more), bankOf);
      if (!read.ok) throw new Error(JSON.stringify(read.refusals));
      return read.value.circuit;
    };
    const bus = { shape: "flat bars", width: "100 mm", gap: "3 mm", thickness: "1 mm", length: "0.4 m" };
    const run = of({ bus }).bus?.inductance as number;
    const { place, bus: whole } = of({ bus: { ...bus, feed: "end", pitch: "0.1 m" } });
    expect((place?.segment.inductance as number) / run).toBeCloseTo(0.25, 6);
    // (9 + 4 + 1)/16 of a segment
    expect((whole?.inductance as number) / run).toBeCloseTo(1 + (14 / 16) * 0.25, 6);
    const told = of({
      bus: { resistance: 0, inductance: 0, feed: "centre", stepResistance: 1e-4, stepInductance: 1e-8 },
    });
    expect(told.place).toEqual({ feed: "centre", segment: { resistance: 1e-4, inductance: 1e-8 } });
    expect(of({}).place).toBeNull();
    const section = { inductance: "1 uH" };
    expect(of({ section }).section).toBeCloseTo(0.5e-6, 15);
    expect(of({ section }, pulseBankFor(FILM, { series: 2, parallel: 4, ties: "strings" })).section).toBeCloseTo(
      0.25e-6,
      15,
    );
  });

  test("Source: methods A17: strip pair 100 mm by 3 mm gap, 0.4 m: 14.2182345 nH outside, more with the field inside", () => {
    const bus = { shape: "flat bars", width: "100 mm", gap: "3 mm", thickness: "1 mm", length: "0.4 m" };
    const { circuit: found, bus: ring } = circuit({ bus });
    expect(found.bus?.inductance).toBeGreaterThan(1.42182345e-8);
    // at most the direct-current field inside both bars, 2 mu0 t l/(3 w)
    const inside = (2 * 1.25663706127e-6 * 1e-3 * 0.4) / (3 * 0.1);
    expect(found.bus?.inductance).toBeLessThan((1.42182345e-8 + inside) * (1 + 1e-8));
    expect(ring.frequency).toBeGreaterThan(0);
    const steady = circuit({ bus, load: { current: "10 A", time: "1 ms" } });
    expect(steady.bus.frequency).toBe(0);
    // direct current fills the bars: 2 rho l/(w t)
    expect(steady.circuit.bus?.resistance).toBeCloseTo((2 * 1.7241e-8 * 0.4) / (0.1 * 1e-3), 12);
  });

  test("other shapes; impossible ones are refused by the bus's own checks", () => {
    const wires = { shape: "wire pair", radius: "2 mm", spacing: "20 mm", length: "1 m" };
    expect(circuit({ bus: wires }).circuit.bus?.inductance).toBeGreaterThan(9.16972668e-7);
    const coax = { shape: "coax", inner: "2 mm", outer: "6 mm", wall: "1 mm", length: "1 m" };
    expect(circuit({ bus: coax }).circuit.bus?.inductance).toBeGreaterThan(2e-7 * Math.log(3));
    const touching = circuitOf(shotBrief({ bus: { ...wires, spacing: "3 mm" } }), bank);
    expect(touching.ok ? [] : touching.refusals.map(({ code }) => code)).toEqual(["pulse.bus.spacing"]);
  });

  test("no load, and a record that nobody read, are refused", () => {
    const codes = (more: Record<string, unknown>) => {
      const read = circuitOf(shotBrief(more), bank);
      return read.ok ? [] : read.refusals.map(({ want }) => want);
    };
    expect(codes({ load: undefined })).toEqual(["a load, such as a resistance"]);
    expect(codes({ load: { recorded: "shot.csv" } })).toEqual(["the samples of the record, read from its file"]);
  });

  test("an isolating resistor counts n/p times", () => {
    const wide = pulseBankFor(FILM, { series: 2, parallel: 4, ties: "cross-tied" });
    const read = circuitOf(shotBrief({ isolating: 0.2 }), wide);
    expect(read.ok && read.value.circuit.isolating).toBeCloseTo(0.1, 12);
  });
});
