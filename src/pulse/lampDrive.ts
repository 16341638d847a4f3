/*
 * From a lamp, a pulse energy and a nominal pulse width to the one-mesh circuit that gives it.
 *
 *   symbol  name         unit        range
 *   K0      constant     ohm A^0.5   > 0
 *   E       energy       J           > 0, all that is stored
 *   t_p     width        s           > 0, nominal: 3 sqrt(LC), near the 10 % width at alpha = 0.8
 *   alpha   alpha        1           > 0, K0/sqrt(V Z0); 0.8 gives the fullest pulse without reversal worth the name
 *
 *   T = t_p/3,  C = (2 E alpha^4 T^2/K0^4)^(1/3),  L = T^2/C,  V = sqrt(2E/C)
 *
 * "exact" keeps the constant 2 alpha^4/9; "rounded 0.09" is the printed rule for alpha = 0.8, C lower by 0.376 %.
 * Source: [ME1966]; [lamp-faq] for the rounded rule.
 */
import { accepted, power, type Read, type Refusal, refused } from "../quantity/index.ts";
import { meshShot } from "./meshShot.ts";
import type { Shot } from "./shot.ts";
import { widthOf } from "./width.ts";

export interface LampBrief {
  readonly constant: number;
  readonly energy: number;
  readonly width: number;
  readonly alpha: number;
  readonly rule: "exact" | "rounded 0.09";
}

/** Circuit for the lamp: F, H, V, s, ohm, A. */
export interface LampCircuit {
  readonly rule: LampBrief["rule"];
  readonly capacitance: number;
  readonly inductance: number;
  readonly voltage: number;
  /** sqrt(LC). */
  readonly timeScale: number;
  readonly impedance: number;
}

/** C, L and V. Refused: a number not above zero (pulse.lampDrive.<field>), or the rounded rule away from alpha = 0.8. */
export function lampCircuit(brief: LampBrief): Read<LampCircuit> {
  const faults: Refusal[] = [];
  for (const field of ["constant", "energy", "width", "alpha"] as const) {
    if (Number.isFinite(brief[field]) && brief[field] > 0) continue;
    const want = "a number above zero";
    faults.push({ code: `pulse.lampDrive.${field}`, place: { field }, read: String(brief[field]), want });
  }
  if (brief.rule !== "exact" && Math.abs(brief.alpha - 0.8) > 1e-9) {
    const want = "the exact rule, or alpha = 0.8";
    faults.push({ code: "pulse.lampDrive.rule", place: { field: "rule" }, read: `alpha ${brief.alpha}`, want });
  }
  if (faults.length > 0) return refused(...faults);
  const { constant, energy, width, alpha, rule } = brief;
  const timeScale = width / 3;
  const factor = rule === "exact" ? (2 * power(alpha, 4)) / 9 : 0.09;
  const capacitance = Math.cbrt((factor * energy * width * width) / power(constant, 4));
  const inductance = (timeScale * timeScale) / capacitance;
  const voltage = Math.sqrt((2 * energy) / capacitance);
  return accepted({
    rule,
    capacitance,
    inductance,
    voltage,
    timeScale,
    impedance: Math.sqrt(inductance / capacitance),
  });
}

/** alpha = K0/sqrt(V Z0) [1] of any lamp mesh: its damping. Source: [ME1966]. */
export const alphaOf = (mesh: {
  readonly constant: number;
  readonly voltage: number;
  readonly capacitance: number;
  readonly inductance: number;
}): number => mesh.constant / Math.sqrt(mesh.voltage * Math.sqrt(mesh.inductance / mesh.capacitance));

/** A lamp's pulse in units of V/Z0 and sqrt(LC); widths null when the pulse has not fallen so far by its end. */
export interface NormalPulse {
  readonly peakCurrent: number;
  readonly peakTime: number;
  readonly halfWidth: number | null;
  readonly thirdWidth: number | null;
  readonly tenthWidth: number | null;
  readonly shot: Shot;
}

/** The pulse of a mesh of lamp, L and C alone. Refused as by `meshShot`. Source: [ME1966] normalised mesh. */
export function normalLampPulse(alpha: number, tolerance?: number): Read<NormalPulse> {
  const none = { resistance: 0, inductance: 0 };
  const read = meshShot(
    {
      capacitance: 1,
      voltage: 1,
      bank: none,
      bus: none,
      load: { resistance: 0, inductance: 1 },
      switch: { drop: 0, resistance: 0, oneWay: false },
      lampConstant: alpha,
      clamp: null,
    },
    tolerance,
  );
  if (!read.ok) return read;
  const shot = read.value;
  return accepted({
    peakCurrent: shot.peakCurrent,
    peakTime: shot.peakTime,
    halfWidth: widthOf(shot, 1 / 2),
    thirdWidth: widthOf(shot, 1 / 3),
    tenthWidth: widthOf(shot, 1 / 10),
    shot,
  });
}
