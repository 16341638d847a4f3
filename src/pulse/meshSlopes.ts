/*
 * The equations of a mesh with a lamp, a switch drop and a clamp, in numbers of one and without the square root.
 *
 * Scales: voltage V, current V/Z0, time sqrt(LC), with L all the inductance of the mesh and Z0 = sqrt(L/C).
 *   u       root of the load current, i = u|u|         dt = 2|u| ds: s is the independent variable
 *   v       capacitor voltage                          k = K0/sqrt(V Z0), d = drop/V, f, r_d = clamp drop and slope
 *   series  du/ds = v - k u - (r_b + r_e) u|u| - side d            dv/ds = -2|u| u|u|
 *   clamped du/ds = (w - k u - r_e u|u| - side d)/l_e, w = -f - r_d (i - i_b); the bank's own loop sees the same w
 *   asleep  once the bank's branch (l_b = 0, r_b + r_d small) has settled it only follows the clamp: i_b = r_d di/dt
 *   tail    late in a lamp's pulse the coil hardly matters: v = G(a) = d + k a + r a^2 - 2 a^3/(k + 2 r a), a = |u|,
 *           and the state runs in x = -ln a; the next term is of the order of (2 a^2/(k + 2 r a)^2)^2
 *
 * In t the lamp's sqrt|i| has no slope at i = 0; in s every slope is a polynomial. Source: [ME1966] the mesh; the rest [methods-derived].
 */
import type { Slope } from "./dormandPrince.ts";

/** A mesh in numbers of one. `clampDrop` is null without a clamp. */
export interface NormalMesh {
  readonly bankR: number;
  readonly bankL: number;
  readonly outerR: number;
  readonly outerL: number;
  readonly lamp: number;
  readonly drop: number;
  readonly clampDrop: number | null;
  readonly clampR: number;
}

/** Direction of the load current: which way the switch drop points. */
export type Side = 1 | -1;

/** Places in the state: root and voltage, time, then integrals of i^2, |i|, |i|^1.5, then the bank's branch and the clamp's. */
export const ROOT = 0;
export const VOLTAGE = 1;
export const TIME = 2;
export const ACTION = 3;
export const CHARGE = 4;
export const LAMP = 5;
export const BANK_CURRENT = 6;
export const BANK_ACTION = 7;
export const CLAMP_CHARGE = 8;
export const CLAMP_ACTION = 9;
export const STATES = 10;

/** du/ds while the clamp blocks. */
export function seriesRise(m: NormalMesh, side: Side, y: Float64Array): number {
  const u = y[ROOT]!;
  return y[VOLTAGE]! - m.lamp * u - (m.bankR + m.outerR) * u * Math.abs(u) - side * m.drop;
}

/** Voltage at the bank's terminals while the clamp blocks. */
export function terminalVoltage(m: NormalMesh, side: Side, y: Float64Array): number {
  const current = y[ROOT]! * Math.abs(y[ROOT]!);
  return y[VOLTAGE]! - m.bankR * current - m.bankL * seriesRise(m, side, y);
}

/** Current of the bank's branch while the clamp conducts; without inductance of its own it follows from the voltages. */
export function bankCurrent(m: NormalMesh, y: Float64Array): number {
  if (m.bankL > 0) return y[BANK_CURRENT]!;
  const path = m.bankR + m.clampR;
  if (path === 0) return 0;
  return (y[VOLTAGE]! + m.clampDrop! + m.clampR * y[ROOT]! * Math.abs(y[ROOT]!)) / path;
}

export const seriesSlope =
  (m: NormalMesh, side: Side): Slope =>
  (_s, y, out) => {
    const a = Math.abs(y[ROOT]!);
    const cube = a * a * a;
    out[ROOT] = seriesRise(m, side, y);
    out[VOLTAGE] = -2 * y[ROOT]! * a * a;
    out[TIME] = 2 * a;
    out[ACTION] = 2 * cube * a * a;
    out[CHARGE] = 2 * cube;
    out[LAMP] = 2 * cube * a;
    out[BANK_ACTION] = out[ACTION]!;
  };

/** Slope of the load current in t while the clamp conducts and the bank's branch carries `own`. */
const clampedRise = (m: NormalMesh, side: Side, u: number, terminal: number): number =>
  (terminal - m.lamp * u - m.outerR * u * Math.abs(u) - side * m.drop) / m.outerL;

/** The integrals that every clamped stage keeps, from the load's root and the bank's current. */
function clampedSums(u: number, own: number, out: Float64Array): void {
  const a = Math.abs(u);
  const current = u * a;
  const through = current - own;
  out[VOLTAGE] = -2 * a * own;
  out[TIME] = 2 * a;
  out[ACTION] = 2 * a * current * current;
  out[CHARGE] = 2 * a * a * a;
  out[LAMP] = 2 * a * a * a * a;
  out[BANK_ACTION] = 2 * a * own * own;
  out[CLAMP_CHARGE] = 2 * a * through;
  out[CLAMP_ACTION] = 2 * a * through * through;
}

export const clampedSlope =
  (m: NormalMesh, side: Side): Slope =>
  (_s, y, out) => {
    const u = y[ROOT]!;
    const own = bankCurrent(m, y);
    const terminal = -m.clampDrop! - m.clampR * (u * Math.abs(u) - own);
    clampedSums(u, own, out);
    out[ROOT] = clampedRise(m, side, u, terminal);
    out[BANK_CURRENT] = m.bankL > 0 ? (2 * Math.abs(u) * (y[VOLTAGE]! - m.bankR * own - terminal)) / m.bankL : 0;
  };

/** Bank current of the settled branch, r_d di/dt, with di/dt from the load's loop: (l_e - r_d^2) di/dt = -f - r_d i - load. */
export function sleepingCurrent(m: NormalMesh, side: Side, y: Float64Array): number {
  const u = y[ROOT]!;
  const plain = clampedRise(m, side, u, -m.clampDrop! - m.clampR * u * Math.abs(u));
  return (m.clampR * plain) / (1 - (m.clampR * m.clampR) / m.outerL);
}

export const asleepSlope =
  (m: NormalMesh, side: Side): Slope =>
  (_s, y, out) => {
    const own = sleepingCurrent(m, side, y);
    const u = y[ROOT]!;
    clampedSums(u, own, out);
    out[ROOT] = clampedRise(m, side, u, -m.clampDrop! - m.clampR * (u * Math.abs(u) - own));
    out[BANK_CURRENT] = 0;
  };

/** How little the coil matters at |u| = a: the ratio of its voltage to the load's. */
export function coilShare(m: NormalMesh, a: number): number {
  const slope = m.lamp + 2 * (m.bankR + m.outerR) * a;
  return (2 * a * a) / (slope * slope);
}

/** G(a) and its slope. */
export function tailVoltage(m: NormalMesh, a: number): { readonly value: number; readonly slope: number } {
  const r = m.bankR + m.outerR;
  const load = m.lamp + 2 * r * a;
  return {
    value: m.drop + m.lamp * a + r * a * a - (2 * a * a * a) / load,
    slope: load - (6 * a * a * load - 4 * r * a * a * a) / (load * load),
  };
}

export const tailSlope =
  (m: NormalMesh, side: Side): Slope =>
  (_x, y, out) => {
    const a = Math.abs(y[ROOT]!);
    const { slope } = tailVoltage(m, a);
    out[ROOT] = -y[ROOT]!;
    out[VOLTAGE] = -side * a * slope;
    out[TIME] = slope / a;
    out[ACTION] = slope * a * a * a;
    out[CHARGE] = slope * a;
    out[LAMP] = slope * a * a;
    out[BANK_ACTION] = out[ACTION]!;
  };
