/*
 * How close a lamp's pulse comes to bursting its envelope, and whether the lamp's law may be trusted for it.
 *
 *   symbol  name      unit  meaning
 *   E_x     explosion J     single-shot explosion energy of one lamp
 *   form 1  "90 d l"        90 d[mm] l[inch] sqrt(t_p[ms])            Source: [lamp-faq]
 *   form 2  "12000 d l"     12 000 d[cm] l[cm] sqrt(t_p[s])           Source: [Koechner] (from memory)
 *
 * The two differ by 7 %; the lower, form 1, is the one judged by, and both are told. Operate at or below 30 % [lamp-faq].
 * Silica wall near 1 mm, pulses of 10 us to 10 ms; the envelope, seal and cooling change the constant, so the lamp's
 * datasheet comes first. The law's current densities, 400 to 10 000 A/cm2, are from memory of [Goncz1965].
 */
import type { Finding } from "../quantity/index.ts";
import type { Lamp } from "./lamp.ts";
import { atLeast, atMost } from "./verdict.ts";

/** Explosion energies [J] of one lamp for a nominal width [s]; `used` is the lower. */
export interface Explosion {
  readonly form90: number;
  readonly form12000: number;
  readonly used: number;
  readonly usedForm: "90 d l" | "12000 d l";
}

export function explosionOf({ bore, arcLength }: Lamp, width: number): Explosion {
  const form90 = 90 * (bore * 1e3) * (arcLength / 0.0254) * Math.sqrt(width * 1e3);
  const form12000 = 12000 * (bore * 1e2) * (arcLength * 1e2) * Math.sqrt(width);
  const first = form90 <= form12000;
  return { form90, form12000, used: Math.min(form90, form12000), usedForm: first ? "90 d l" : "12000 d l" };
}

/** Largest part of the explosion energy to run at. Source: [lamp-faq]. */
export const EXPLOSION_PART = 0.3;
/** Pulse widths [s] and current densities [A/m2] within which the law and the explosion constants are quoted. */
export const LAW_WIDTHS = { least: 10e-6, most: 10e-3 } as const;
export const LAW_DENSITIES = { least: 4e6, most: 1e8 } as const;

/** Findings of one lamp of a chain: energy [J] into the whole chain, nominal width [s], peak current [A]. */
export function lampFindings(
  lamp: Lamp,
  shot: { readonly energy: number; readonly width: number; readonly peakCurrent: number },
): readonly Finding[] {
  const explosion = explosionOf(lamp, shot.width);
  const part = shot.energy / lamp.count / explosion.used;
  const density = shot.peakCurrent / ((Math.PI / 4) * lamp.bore * lamp.bore);
  const outOfRange = (finding: Finding): Finding =>
    finding.verdict === "fail" ? { ...finding, verdict: "warn" } : finding;
  const law = "Outside this range the lamp's law is an extrapolation; go by the lamp's datasheet.";
  return [
    atMost({
      id: "lamp.explosion",
      value: part,
      limit: EXPLOSION_PART,
      unit: "1",
      source: "lamp-faq",
      note: `Energy per lamp over its explosion energy by ${explosion.usedForm}; the lamp's datasheet comes first.`,
    }),
    outOfRange(
      atLeast({
        id: "lamp.width.least",
        value: shot.width,
        limit: LAW_WIDTHS.least,
        unit: "s",
        source: "lamp-faq",
        note: law,
      }),
    ),
    outOfRange(
      atMost({
        id: "lamp.width.most",
        value: shot.width,
        limit: LAW_WIDTHS.most,
        unit: "s",
        source: "lamp-faq",
        note: law,
      }),
    ),
    outOfRange(
      atLeast({
        id: "lamp.density.least",
        value: density,
        limit: LAW_DENSITIES.least,
        unit: "A/m2",
        source: "Goncz1965",
        note: law,
      }),
    ),
    outOfRange(
      atMost({
        id: "lamp.density.most",
        value: density,
        limit: LAW_DENSITIES.most,
        unit: "A/m2",
        source: "Goncz1965",
        note: law,
      }),
    ),
  ];
}
