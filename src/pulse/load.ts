// What hangs on the bank: the load, the bus, the switch and the clamp, as data; and the faults such data can have.
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { BusPath, BusPlace } from "./busPath.ts";
import type { Lamp } from "./lamp.ts";
import { checkLamp } from "./lamp.ts";
import { type CurrentSample, checkSamples } from "./samples.ts";

/** Resistances in ohm, inductances in H, currents in A, times in s. */
export type Load =
  | { readonly kind: "resistor"; readonly resistance: number }
  | { readonly kind: "coil"; readonly inductance: number; readonly resistance: number }
  | {
      readonly kind: "lamp";
      readonly lamp: Lamp;
      /** Of the coil that shapes the pulse, in series with the lamp; left out: none. */
      readonly inductance?: number;
      readonly resistance?: number;
    }
  | { readonly kind: "short" }
  | { readonly kind: "steady current"; readonly current: number; readonly seconds: number }
  | { readonly kind: "recorded"; readonly samples: readonly CurrentSample[] };

/** A closing switch: constant drop [V] against the current, resistance [ohm], and whether it opens at the first zero. */
export interface Switch {
  readonly drop: number;
  readonly resistance: number;
  /** true: blocks reverse current (thyristor); false: carries both ways (gap, contact). */
  readonly oneWay: boolean;
}

/** A diode across the bank that conducts when the bank's terminals go negative by `drop` [V]; `resistance` [ohm] is its slope. */
export interface Clamp {
  readonly drop: number;
  readonly resistance: number;
}

/** Everything outside the bank. `bus: null` is an unknown bus, which is not a bus of nothing. */
export interface Circuit {
  readonly load: Load;
  readonly bus: BusPath | null;
  readonly switch: Switch;
  readonly clamp: Clamp | null;
  /** Resistors in series with the units, as the loop sees them [ohm]: n/m of one. Left out: none. */
  readonly isolating?: number;
  /** Inductance in series with the units or strings, as the loop sees it [H]. Left out: none. */
  readonly section?: number;
  /** How the branches hang on the bus; left out or null: not told, so that place has no say. Its taper is in `bus` already. */
  readonly place?: BusPlace | null;
}

/** A switch without drop or resistance that carries both ways. */
export const IDEAL_SWITCH: Switch = { drop: 0, resistance: 0, oneWay: false };

/** Resistance [ohm] and inductance [H] of the load as the loop sees it; a lamp's law is not a resistance and counts as none. */
export function linearPartOf(load: Load): BusPath {
  if (load.kind === "resistor") return { resistance: load.resistance, inductance: 0 };
  if (load.kind === "lamp") return { resistance: load.resistance ?? 0, inductance: load.inductance ?? 0 };
  if (load.kind === "coil") return { resistance: load.resistance, inductance: load.inductance };
  return { resistance: 0, inductance: 0 };
}

/** The circuit, or every fault in its numbers. Codes: pulse.circuit.<field>, and those of lamps and samples. */
export function checkCircuit(circuit: Circuit): Read<Circuit> {
  const faults: Refusal[] = [];
  const need = (field: string, value: number, positive = false): void => {
    if (Number.isFinite(value) && (positive ? value > 0 : value >= 0)) return;
    const want = positive ? "a number above zero" : "a number, zero or more";
    faults.push({ code: `pulse.circuit.${field}`, place: { field }, read: String(value), want });
  };
  const { load, bus, clamp } = circuit;
  need("switchDrop", circuit.switch.drop);
  need("switchResistance", circuit.switch.resistance);
  if (bus !== null) {
    need("busResistance", bus.resistance);
    need("busInductance", bus.inductance);
  }
  if (clamp !== null) {
    need("clampDrop", clamp.drop);
    need("clampResistance", clamp.resistance);
  }
  need("isolatingResistance", circuit.isolating ?? 0);
  need("sectionInductance", circuit.section ?? 0);
  if (circuit.place) {
    need("segmentResistance", circuit.place.segment.resistance);
    need("segmentInductance", circuit.place.segment.inductance);
  }
  const part = linearPartOf(load);
  need("loadResistance", part.resistance);
  need("loadInductance", part.inductance);
  if (load.kind === "steady current") {
    need("steadyCurrent", load.current, true);
    need("steadySeconds", load.seconds, true);
  }
  const inner =
    load.kind === "lamp" ? checkLamp(load.lamp) : load.kind === "recorded" ? checkSamples(load.samples) : null;
  if (inner !== null && !inner.ok) faults.push(...inner.refusals);
  return faults.length > 0 ? refused(...faults) : accepted(circuit);
}
