// The words that every way of computing a shot shares: the mesh that goes in, the figures and the course that come out.
import type { BusPath } from "./busPath.ts";
import type { Clamp, Switch } from "./load.ts";

/** One closed mesh with every number known: SI, constant. `lampConstant` [ohm A^0.5] is 0 without a lamp. */
export interface Mesh {
  readonly capacitance: number;
  readonly voltage: number;
  readonly bank: BusPath;
  readonly bus: BusPath;
  readonly load: BusPath;
  readonly switch: Switch;
  readonly lampConstant: number;
  readonly clamp: Clamp | null;
}

/** Where the stored energy went [J]; the parts add up to `stored`. `left` counts what still stands in the bank or its coil. */
export interface EnergySplit {
  readonly stored: number;
  readonly load: number;
  readonly bank: number;
  readonly bus: number;
  readonly switch: number;
  readonly clamp: number;
  readonly left: number;
}

/** One computed shot. */
export interface Shot {
  readonly method: "closed form" | "integrator" | "samples";
  readonly peakCurrent: number;
  readonly peakTime: number;
  /** Lowest capacitor voltage, as a positive fraction of the charge voltage; 0 when it never goes negative. */
  readonly reversal: number;
  /** Action of the load current [A^2 s]; null when it has no bound. */
  readonly action: number | null;
  /** Action of the bank's own current [A^2 s]; differs from `action` only while a clamp conducts. */
  readonly bankAction: number | null;
  readonly energy: EnergySplit;
  /** Time [s] after which nothing worth drawing happens. */
  readonly duration: number;
  /** Load current [A] and capacitor voltage [V] at a time [s] >= 0. */
  readonly at: (time: number) => { readonly current: number; readonly voltage: number };
}

/** Total series resistance [ohm] of a mesh, lamp and drop apart. */
export const resistanceOf = (mesh: Mesh): number =>
  mesh.bank.resistance + mesh.bus.resistance + mesh.load.resistance + mesh.switch.resistance;

/** Total series inductance [H] of a mesh. */
export const inductanceOf = (mesh: Mesh): number => mesh.bank.inductance + mesh.bus.inductance + mesh.load.inductance;

/** C V^2/2 [J]. */
export const storedIn = (mesh: Mesh): number => (mesh.capacitance * mesh.voltage * mesh.voltage) / 2;
