// The drift of every unit of a bank, and what the lot did as a whole: a common change may be the meter's or the temperature's.
import { type Drift, type DriftKind, drift, type LifeLimits, type Remeasured } from "./drift.ts";

export interface UnitReadings {
  readonly serial: string;
  /** In order of time. */
  readonly readings: Readonly<Record<DriftKind, readonly Remeasured[]>>;
}

export interface UnitDrift extends Drift {
  readonly serial: string;
}

export interface LotDrift {
  /** Those nearest their end of life first; where no end was given, those changed most for the worse by the meter's doubt. */
  readonly units: readonly UnitDrift[];
  /** Median change of each kind among the units measured more than once; null for fewer than three. */
  readonly median: Readonly<Record<DriftKind, number | null>>;
}

const KINDS: readonly DriftKind[] = ["capacitance", "esr", "leakage"];
const RANK = { fail: 0, warn: 1, pass: 2, "not assessed": 3 } as const;
/** Fewer units say nothing about the lot. */
const LOT = 3;

function median(values: readonly number[]): number | null {
  if (values.length < LOT) return null;
  const sorted = [...values].sort((a, b) => a - b);
  const half = sorted.length / 2;
  return half % 1 === 0 ? (sorted[half - 1]! + sorted[half]!) / 2 : sorted[Math.floor(half)]!;
}

/** The change for the worse over its doubt. */
const worse = ({ kind, change, plusMinus, readings }: Drift): number =>
  readings < 2 ? Number.NEGATIVE_INFINITY : (kind === "capacitance" ? -change : change) / plusMinus;

/** Kinds that were never read of a unit have no row. */
export function lotDrift(units: readonly UnitReadings[], limits: LifeLimits): LotDrift {
  const all = units.flatMap(({ serial, readings }) =>
    KINDS.flatMap((kind): UnitDrift[] =>
      readings[kind].length === 0 ? [] : [{ serial, ...drift(kind, readings[kind], limits[kind]) }],
    ),
  );
  const mid = (kind: DriftKind): number | null =>
    median(all.flatMap((one) => (one.kind === kind && one.readings > 1 ? [one.change] : [])));
  return {
    units: [...all].sort(
      (a, b) => RANK[a.verdict] - RANK[b.verdict] || (b.used ?? 0) - (a.used ?? 0) || worse(b) - worse(a),
    ),
    median: { capacitance: mid("capacitance"), esr: mid("esr"), leakage: mid("leakage") },
  };
}
