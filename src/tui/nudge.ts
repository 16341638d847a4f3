// The next value of a brief's field up or down: the next preferred one, a step of percent, one more of a count, the next choice.
import {
  formatQuantity,
  parseQuantity,
  preferredAtLeast,
  preferredAtMost,
  type SeriesName,
} from "../quantity/index.ts";
import type { Field } from "./fields.ts";

export interface Nudge {
  readonly up: boolean;
  /** A leap: E6 in place of E24, five percent in place of one. */
  readonly coarse: boolean;
}

/** How a field steps; a field that is absent steps through preferred values. Fractions step evenly, counts by whole numbers. */
type Kind =
  | {
      readonly kind: "even";
      readonly fine: number;
      readonly coarse: number;
      readonly low: number;
      readonly high: number;
    }
  | { readonly kind: "preferred"; readonly low: number; readonly high: number; readonly whole?: boolean };

const percent = (low: number, high: number): Kind => ({ kind: "even", fine: 0.01, coarse: 0.05, low, high });
const count = (low: number, high: number): Kind => ({ kind: "even", fine: 1, coarse: 5, low, high });

const KINDS: Readonly<Record<string, Kind>> = {
  ripple: percent(0.01, 1),
  derating: percent(0.05, 1),
  overshoot: percent(0, 0.5),
  ageing: percent(0, 0.9),
  maxSeries: count(1, 10_000),
  spares: count(0, 100_000),
  maxUnits: { kind: "preferred", low: 1, high: 1e6, whole: true },
  risk: { kind: "preferred", low: 1e-12, high: 0.5 },
};
const USUAL: Kind = { kind: "preferred", low: 1e-12, high: 1e12 };

/** Above this a hold is as good as one for ever, whose step down comes back to it. */
const LONGEST_HOLD = 86_400;

/** A step that does not move is within this of where it was. */
const SAME = 1e-6;

function preferred(value: number, { up, coarse }: Nudge, whole: boolean): number {
  const series: SeriesName = coarse ? "E6" : "E24";
  const next = up ? preferredAtLeast(series, value * (1 + SAME)) : preferredAtMost(series, value * (1 - SAME));
  if (!whole) return next;
  return up ? Math.max(value + 1, Math.round(next)) : Math.min(value - 1, Math.round(next));
}

function even(value: number, { up, coarse }: Nudge, { fine, coarse: leap }: { fine: number; coarse: number }): number {
  const step = coarse ? leap : fine;
  // To the next whole step, so that an odd value comes onto the even ones.
  const steps = up ? Math.floor(value / step + 1 + SAME) : Math.ceil(value / step - 1 - SAME);
  return Number((steps * step).toPrecision(12));
}

/** The text of a number in a field, which reads back as that number. */
function textOf(field: Field, value: number): string {
  if (field.dimension === "count" || field.dimension === null) return String(Number(value.toPrecision(12)));
  const texts = [1, 2, 3, 4, 5].map((digits) => formatQuantity(value, field.dimension ?? "count", { digits }));
  const reads = (text: string): boolean => Math.abs((numberIn(field, text) ?? Number.NaN) - value) <= 1e-9 * value;
  return texts.find(reads) ?? formatQuantity(value, field.dimension, { digits: 6 });
}

/** The number that a field's text says; null when it says none. */
export function numberIn(field: Field, text: string): number | null {
  if (text.trim() === "" || field.dimension === null) return null;
  if (field.key === "hold" && /^\s*for ?ever\s*$/i.test(text)) return Number.POSITIVE_INFINITY;
  const read = parseQuantity(text, field.dimension);
  return read.ok ? read.value : null;
}

/** The field's text one step on; null at its end, or where there is nothing to step. `value`: what the text, or its blank, stands for. */
export function nudged(field: Field, value: number, nudge: Nudge): string | null {
  if (field.dimension === null || Number.isNaN(value) || value < 0) return null;
  if (field.key === "hold") {
    if (value === Number.POSITIVE_INFINITY) return nudge.up ? null : textOf(field, LONGEST_HOLD);
    if (nudge.up && value >= LONGEST_HOLD) return "for ever";
  }
  if (!Number.isFinite(value)) return null;
  const kind = KINDS[field.key] ?? USUAL;
  const { low, high } = kind;
  if (kind.kind === "preferred" && value < low) return nudge.up ? textOf(field, low) : null;
  const next = kind.kind === "even" ? even(value, nudge, kind) : preferred(value, nudge, kind.whole === true);
  const kept = Math.min(high, Math.max(low, next));
  return Math.abs(kept - value) <= SAME * Math.max(Math.abs(value), 1e-300) ? null : textOf(field, kept);
}
