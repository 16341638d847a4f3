/*
 * The voltage of a fired flash lamp, v = K0 sqrt|i| with the sign of i, and how hard its pulse presses on the envelope.
 *
 *   symbol  name        unit         range
 *   d       bore        m            > 0
 *   l       arcLength   m            > 0, of one lamp
 *   P       pressure    Pa           > 0, cold fill (450 torr = 59 995 Pa)
 *   N       count       1            lamps in series, whole, >= 1
 *   K0      constant    ohm A^0.5    N 1.28 (l/d) (P/450 torr)^0.2 xenon, 805 torr krypton
 *
 * Holds for a wall-filled arc of some hundred to ten thousand A/cm2, silica envelope, pulses of 10 us to 10 ms; below and
 * above it is an extrapolation, and the lamp's datasheet comes first. Source: [lamp-faq] the constant; [Goncz1965] (from
 * memory) resistivity 1.13/sqrt(j) ohm cm, which gives 1.2751 l/d and so agrees to 0.4 %.
 */
import { accepted, power, type Read, type Refusal, refused } from "../quantity/index.ts";

/** Lamps in series: bore and arc length of one [m], fill pressure [Pa], count. */
export interface Lamp {
  readonly bore: number;
  readonly arcLength: number;
  readonly gas: "xenon" | "krypton";
  readonly pressure: number;
  readonly count: number;
}

/** One torr [Pa]. Source: [SI-brochure] as 101 325/760 Pa. */
export const TORR = 101325 / 760;

/** Fill pressure at which the constant is 1.28 l/d [Pa]. Source: [lamp-faq]. */
export const REFERENCE_PRESSURE = { xenon: 450 * TORR, krypton: 805 * TORR } as const;

/** The lamp, or every fault in its numbers. Codes: pulse.lamp.bore, .arcLength, .pressure, .count, .gas. */
export function checkLamp(lamp: Lamp): Read<Lamp> {
  const faults: Refusal[] = [];
  const fault = (field: string, read: unknown, want: string): void => {
    faults.push({ code: `pulse.lamp.${field}`, place: { field }, read: String(read), want });
  };
  for (const field of ["bore", "arcLength", "pressure"] as const) {
    if (!(Number.isFinite(lamp[field]) && lamp[field] > 0)) fault(field, lamp[field], "a number above zero");
  }
  if (!(Number.isInteger(lamp.count) && lamp.count >= 1)) fault("count", lamp.count, "a whole number, 1 or more");
  if (!Object.hasOwn(REFERENCE_PRESSURE, lamp.gas)) fault("gas", lamp.gas, "xenon or krypton");
  return faults.length > 0 ? refused(...faults) : accepted(lamp);
}

/** K0 of the whole chain [ohm A^0.5]. Source: [lamp-faq]. */
export const lampConstant = ({ bore, arcLength, gas, pressure, count }: Lamp): number =>
  count * 1.28 * (arcLength / bore) * power(pressure / REFERENCE_PRESSURE[gas], 0.2);
