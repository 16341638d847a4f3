/*
 * The capacitance and voltage of a home-made capacitor of flat plates, with its edge correction and where that holds.
 *
 *   symbol  name            unit  range          meaning
 *   A       plateArea       m2    > 0            facing area of one plate
 *   d       gap             m     > 0            thickness of the dielectric between two plates
 *   er      permittivity    1     >= 1           relative permittivity of the dielectric
 *   N       plates          1     whole, >= 2    interleaved plates; N - 1 gaps
 *   R       radius          m                    radius of a disc; of the disc of area A where the shape is not known
 *   eo      -               1                    er of what surrounds the edges: 1 for air, er where all lies in the dielectric
 *
 *   ideal            C = eps0 er A (N - 1)/d                                    Source: [textbook] parallel plates
 *   disc, N = 2      + eps0 eo R (ln(16 pi R/d) - 1)                            Source: [Kirchhoff-disc]
 *   strip, N = 2     + eps0 eo (l/pi)(1 + ln(2 pi w/d)), for its two long edges Source: [Palmer-strip]
 *   rectangle, N = 2 the strip's term for each pair of edges, added, without the product of the two
 *   stack, N > 2     + eps0 eo (ln 2/pi) (edge of one plate)(N - 1)             Source: [methods-derived] edge of a stack
 *
 * The disc is low by 0.06 % at d/R = 0.02, 0.8 % at 0.1, 2.3 % at 0.2 and 7.7 % at 0.5 (against Love's integral equation).
 * The rectangle is high by 1.7 % at d/a = 0.1 for a square (against a moment method); the product form would be 3.8 % high.
 * In a stack, neighbours hide each other's edges: the pair's term times N - 1 would be far too much. The stack's term is the
 * limit for many plates and a lower estimate for few (moment method, strips, 3 to 11 plates).
 * Not known shape: the disc, because no shape of that area has a shorter edge: a lower estimate. Not known surroundings:
 * air, again the lower one. So a bank is never credited with joules that the edges may not give.
 */

import { accepted, type Place, type Read, refused } from "../quantity/index.ts";

/** Electric constant eps0, F/m; standard uncertainty 1.4e-21. Source: [CODATA-2022] vacuum electric permittivity. */
export const ELECTRIC_CONSTANT = 8.8541878188e-12;
/** Field at which air between flat plates about a centimetre apart breaks down, V/m. From memory; common practice, no source. */
export const AIR_STRENGTH = 3e6;

/** Relative permittivities for a first try. Common practice, no source; a sheet of the stuff in hand knows better. */
export const PERMITTIVITIES = { air: 1.0006, polythene: 2.1 } as const;

export type PlateShape =
  | { readonly kind: "disc" }
  | { readonly kind: "rectangle"; readonly length: number; readonly width: number };

/** One row of plates as read; SI values, blank is undefined. */
export interface PlateRow {
  readonly plateArea?: number | undefined;
  readonly gap?: number | undefined;
  readonly permittivity?: number | undefined;
  readonly plates?: number | undefined;
  readonly breakdownField?: number | undefined;
  /** Default: a disc of that area, the lower estimate. */
  readonly shape?: PlateShape | undefined;
  /** What lies around the edges. Default `air`, the lower estimate. */
  readonly outside?: "air" | "same" | undefined;
}

export interface PlateCapacitor {
  /** F, edge included. */
  readonly capacitance: number;
  /** F, without the edge. */
  readonly ideal: number;
  /** F, what the edge adds. */
  readonly edge: number;
  /** `good`: edge formula within 1 %; `rough`: within 8 %; `outside`: the gap is too wide for it, so no edge is added. */
  readonly validity: "good" | "rough" | "outside";
  /** V, breakdown field times gap with NO safety factor; the derating of row and brief comes on top. Absent when unknown. */
  readonly voltage?: number;
  /** V above which a thin film of air beside the dielectric may glow; null for air, where breakdown itself is the limit. */
  readonly coronaVoltage: number | null;
  /** True when the voltage allowed by breakdown lies above the corona voltage: dry stacks are then limited by the air. */
  readonly coronaLimited: boolean;
}

/** Edge term over eps0 of two discs, m. Source: [Kirchhoff-disc] as checked against Love's equation. */
export const discEdge = (size: { readonly radius: number; readonly gap: number }): number =>
  size.radius * (Math.log((16 * Math.PI * size.radius) / size.gap) - 1);

/** Edge term over eps0 of the two long edges of a strip pair, m. Source: [Palmer-strip]. */
export const stripEdge = (size: { readonly length: number; readonly width: number; readonly gap: number }): number =>
  (size.length / Math.PI) * (1 + Math.log((2 * Math.PI * size.width) / size.gap));

/** Edge term over eps0 of a stack of more than two plates, m. Source: [methods-derived] conformal map of a periodic stack. */
export const stackEdge = (stack: { readonly perimeter: number; readonly plates: number }): number =>
  (Math.LN2 / Math.PI) * stack.perimeter * (stack.plates - 1);

/**
 * The capacitor that a row of plates makes.
 * Refuses (`missing-value`) a row without area, gap, permittivity or plates: unknown is not one; and (`out-of-range`) one that
 * no plates can have. Source: [textbook], [Kirchhoff-disc], [Palmer-strip], [methods-derived].
 */
export function plateCapacitor(row: PlateRow, place: Place = {}): Read<PlateCapacitor> {
  const { plateArea, gap, permittivity, plates, breakdownField } = row;
  const missing = (field: string) =>
    refused({ code: "missing-value", place: { ...place, field }, read: "nothing", want: `${field} of the plates` });
  if (plateArea === undefined) return missing("plate area");
  if (gap === undefined) return missing("gap");
  if (permittivity === undefined) return missing("permittivity");
  if (plates === undefined) return missing("plates");
  const wrong = (field: string, read: number, want: string) =>
    refused({ code: "out-of-range", place: { ...place, field }, read: String(read), want });
  if (!(plateArea > 0 && plateArea < Infinity)) return wrong("plate area", plateArea, "an area above zero");
  if (!(gap > 0 && gap < Infinity)) return wrong("gap", gap, "a gap above zero");
  if (!(permittivity >= 1 && permittivity < Infinity)) return wrong("permittivity", permittivity, "1 or more");
  if (!(Number.isInteger(plates) && plates >= 2)) return wrong("plates", plates, "a whole number, 2 or more");
  if (breakdownField !== undefined && !(breakdownField > 0 && breakdownField < Infinity))
    return wrong("breakdown field", breakdownField, "a field above zero");

  const ideal = (ELECTRIC_CONSTANT * permittivity * plateArea * (plates - 1)) / gap;
  const shape = row.shape ?? { kind: "disc" };
  const radius = shape.kind === "disc" ? Math.sqrt(plateArea / Math.PI) : Math.min(shape.length, shape.width) / 2;
  const validity = gap <= 0.1 * radius ? "good" : gap <= 0.5 * radius ? "rough" : "outside";
  const around = row.outside === "same" ? permittivity : 1;
  const edge = validity === "outside" ? 0 : ELECTRIC_CONSTANT * around * edgeLength(shape, radius, gap, plates);
  const coronaVoltage = permittivity > 1.01 ? (AIR_STRENGTH / permittivity) * gap : null;
  const voltage = breakdownField === undefined ? undefined : breakdownField * gap;
  return accepted({
    capacitance: ideal + edge,
    ideal,
    edge,
    validity,
    ...(voltage === undefined ? {} : { voltage }),
    coronaVoltage,
    coronaLimited: coronaVoltage !== null && voltage !== undefined && voltage > coronaVoltage,
  });
}

function edgeLength(shape: PlateShape, radius: number, gap: number, plates: number): number {
  if (shape.kind === "disc")
    return plates === 2 ? discEdge({ radius, gap }) : stackEdge({ perimeter: 2 * Math.PI * radius, plates });
  const { length, width } = shape;
  if (plates > 2) return stackEdge({ perimeter: 2 * (length + width), plates });
  return stripEdge({ length, width, gap }) + stripEdge({ length: width, width: length, gap });
}
