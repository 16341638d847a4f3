/*
 * The spread of a shot's figures when capacitance, ESR, inductance and outer resistance each lie anywhere in a range.
 *
 * All corners of the ranges are computed. For a linear loop each figure moves one way with each part (peak current: up with C,
 * down with R and L; reversal: down with zeta; peak time: up with C and L, down with R; action: up with C, down with R), so
 * the corners are the extremes. With a lamp or a clamp the corners are corners, not a proof; `proven` says which.
 * Source: [methods-derived], tested against random points inside the ranges.
 */
import { accepted, type Read } from "../quantity/index.ts";

/** Low, nominal, high of one part, SI; low <= nominal <= high. */
export interface Spread {
  readonly low: number;
  readonly nominal: number;
  readonly high: number;
}

/** Parts that spread. `esr` inside the bank, `resistance` all the rest; `inductance` of the whole loop. */
export interface LoopSpread {
  readonly capacitance: Spread;
  readonly esr: Spread;
  readonly inductance: Spread;
  readonly resistance: Spread;
}

/** One corner: a value for each part. */
export type Corner = { readonly [part in keyof LoopSpread]: number };

/** Figures of one corner that are enveloped; a null (no bound) makes that end null. */
export interface Figures {
  readonly peakCurrent: number;
  readonly peakTime: number;
  readonly reversal: number;
  readonly action: number | null;
}

/** Low, nominal and high of each figure; null where a corner has no bound. */
export type Envelope = {
  readonly [figure in keyof Figures]: {
    readonly low: number | null;
    readonly nominal: number | null;
    readonly high: number | null;
  };
} & { readonly proven: boolean };

/** Sixteen corners. */
function cornersOf({ capacitance, esr, inductance, resistance }: LoopSpread): readonly Corner[] {
  const ends = ({ low, high }: Spread): readonly number[] => (low === high ? [low] : [low, high]);
  return ends(capacitance).flatMap((c) =>
    ends(esr).flatMap((e) =>
      ends(inductance).flatMap((l) =>
        ends(resistance).map((r) => ({ capacitance: c, esr: e, inductance: l, resistance: r })),
      ),
    ),
  );
}

/**
 * The envelope of whatever `figuresOf` computes at a corner; the first refusal of a corner is the refusal of the whole.
 * `linear`: whether the loop has constant R, L and C only, so that the corners are proven extremes.
 */
export function envelopeOf(
  spread: LoopSpread,
  linear: boolean,
  figuresOf: (corner: Corner) => Read<Figures>,
): Read<Envelope> {
  const { capacitance, esr, inductance, resistance } = spread;
  const middle = figuresOf({
    capacitance: capacitance.nominal,
    esr: esr.nominal,
    inductance: inductance.nominal,
    resistance: resistance.nominal,
  });
  if (!middle.ok) return middle;
  const all: Figures[] = [middle.value];
  for (const corner of cornersOf(spread)) {
    const read = figuresOf(corner);
    if (!read.ok) return read;
    all.push(read.value);
  }
  const ends = (figure: keyof Figures) => {
    const values = all.map((one) => one[figure]);
    const known = values.filter((value) => value !== null);
    // no bound is above every number: it can only be the high end
    const high = known.length < values.length ? null : Math.max(...known);
    return { low: known.length > 0 ? Math.min(...known) : null, nominal: middle.value[figure], high };
  };
  return accepted({
    peakCurrent: ends("peakCurrent"),
    peakTime: ends("peakTime"),
    reversal: ends("reversal"),
    action: ends("action"),
    proven: linear,
  });
}
