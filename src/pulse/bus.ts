/*
 * Inductance and resistance of a bus from its geometry, go and return together.
 *
 *   flat bars  width w, gap g, thickness t, length l [m]: L = mu0 l/((w/g)(1 + (g/(pi w))(1 + ln(2 pi w/g)))), use w/g >= 5;
 *              inside each bar at low frequency mu0 t l/(3 w); R = 2 rho l/(w min(t, delta))
 *   wire pair  wire radius a, centre spacing D: L = (mu0 l/pi) acosh(D/2a), inside both together mu0 l/(4 pi);
 *              R = 2 rho l/(pi delta (2a - delta)), which at delta = a is the whole round
 *   coax       inner radius a, inside radius b of the shell, its wall s: L = (mu0 l/2pi) ln(b/a), inside the core mu0 l/(8 pi)
 *
 * At frequency f the field inside a conductor adds the lesser of its low-frequency value and R/(2 pi f). Bars and wires far
 * from anything else; unequal current over the bar is left out, so take it as an estimate.
 * Source: [Palmer-strip] edge term through L'C' = mu0 eps0; [Grover] (from memory) wires, coax and inner terms.
 */
import { accepted, type Finding, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { BusPath } from "./busPath.ts";
import { MU0, skinDepth } from "./skin.ts";
import { atLeast } from "./verdict.ts";

/** All lengths in m. */
export type BusGeometry =
  | {
      readonly kind: "flat bars";
      readonly width: number;
      readonly gap: number;
      readonly thickness: number;
      readonly length: number;
    }
  | { readonly kind: "wire pair"; readonly radius: number; readonly spacing: number; readonly length: number }
  | {
      readonly kind: "coax";
      readonly inner: number;
      readonly outer: number;
      readonly wall: number;
      readonly length: number;
    };

/** Resistivity [ohm m] and frequency [Hz]; frequency 0 is direct current. */
export interface BusUse {
  readonly resistivity: number;
  readonly frequency: number;
}

/** A computed bus. `outside` is the high-frequency limit, `direct` the direct-current one [H]; `ideal` leaves the edge out. */
export interface Bus extends BusPath {
  readonly outside: number;
  readonly direct: number;
  readonly ideal: number;
  readonly findings: readonly Finding[];
}

/** Least width over gap for which the flat-bar formula is used. Source: [Palmer-strip] as tested against a moment method. */
export const LEAST_WIDTH_OVER_GAP = 5;

interface Field {
  readonly outside: number;
  readonly ideal: number;
  readonly inside: number;
  readonly resistance: (depth: number) => number;
}

/** Part of a round of radius a that carries current at skin depth delta [m^2]. */
const roundArea = (radius: number, depth: number): number =>
  depth >= radius ? Math.PI * radius * radius : Math.PI * depth * (2 * radius - depth);

function fieldOf(bus: BusGeometry, rho: number): Field {
  const { length } = bus;
  if (bus.kind === "flat bars") {
    const { width, gap, thickness } = bus;
    const ideal = (MU0 * gap * length) / width;
    const edge = 1 + (gap / (Math.PI * width)) * (1 + Math.log((2 * Math.PI * width) / gap));
    return {
      outside: ideal / edge,
      ideal,
      inside: (2 * MU0 * thickness * length) / (3 * width),
      resistance: (depth) => (2 * rho * length) / (width * Math.min(thickness, depth)),
    };
  }
  if (bus.kind === "wire pair") {
    const outside = ((MU0 * length) / Math.PI) * Math.acosh(bus.spacing / (2 * bus.radius));
    return {
      outside,
      ideal: outside,
      inside: (MU0 * length) / (4 * Math.PI),
      resistance: (depth) => (2 * rho * length) / roundArea(bus.radius, depth),
    };
  }
  const outside = ((MU0 * length) / (2 * Math.PI)) * Math.log(bus.outer / bus.inner);
  const shell = (depth: number): number => Math.PI * ((bus.outer + Math.min(bus.wall, depth)) ** 2 - bus.outer ** 2);
  return {
    outside,
    ideal: outside,
    inside: (MU0 * length) / (8 * Math.PI),
    resistance: (depth) => rho * length * (1 / roundArea(bus.inner, depth) + 1 / shell(depth)),
  };
}

function faultsOf(bus: BusGeometry, { resistivity, frequency }: BusUse): readonly Refusal[] {
  const { kind, ...lengths } = bus;
  const wrong = (field: string, read: number, want: string): Refusal[] => [
    { code: `pulse.bus.${field}`, place: { field }, read: String(read), want },
  ];
  const positive = Object.entries({ ...lengths, resistivity }).flatMap(([field, value]) =>
    Number.isFinite(value) && value > 0 ? [] : wrong(field, value, "a number above zero"),
  );
  if (positive.length > 0) return positive;
  return [
    ...(frequency >= 0 && Number.isFinite(frequency) ? [] : wrong("frequency", frequency, "a number, zero or more")),
    ...(kind === "wire pair" && !(bus.spacing > 2 * bus.radius)
      ? wrong("spacing", bus.spacing, "more than the wire's diameter")
      : []),
    ...(kind === "coax" && !(bus.outer > bus.inner) ? wrong("outer", bus.outer, "more than the inner radius") : []),
  ];
}

/** Inductance and resistance of a bus at a frequency. Codes: pulse.bus.<field>. Source: file head. */
export function busOf(geometry: BusGeometry, use: BusUse): Read<Bus> {
  const faults = faultsOf(geometry, use);
  if (faults.length > 0) return refused(...faults);
  const { resistivity, frequency } = use;
  const field = fieldOf(geometry, resistivity);
  const depth = frequency === 0 ? Number.MAX_VALUE : skinDepth({ resistivity, frequency });
  const resistance = field.resistance(depth);
  const inside = frequency === 0 ? field.inside : Math.min(field.inside, resistance / (2 * Math.PI * frequency));
  const findings =
    geometry.kind === "flat bars"
      ? [
          atLeast({
            id: "pulse.bus.shape",
            value: geometry.width / geometry.gap,
            limit: LEAST_WIDTH_OVER_GAP,
            unit: "1",
            source: "Palmer-strip",
            note: "Narrower bars than this make the edge term a guess; measure the loop instead.",
          }),
        ]
      : [];
  return accepted({
    inductance: field.outside + inside,
    resistance,
    outside: field.outside,
    direct: field.outside + field.inside,
    ideal: field.ideal,
    findings: findings.map((one) => (one.verdict === "fail" ? { ...one, verdict: "warn" as const } : one)),
  });
}
