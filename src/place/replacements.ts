// Which spare may stand in for which unit, and what the gap becomes.
import { bankGaps } from "./bankGaps.ts";
import type { Placing } from "./placing.ts";
import type { PlaceRequest } from "./request.ts";
import type { MeasuredUnit } from "./unit.ts";

export interface Replacement {
  readonly serial: string;
  readonly spare: string;
  /** Charging gap after the exchange, nothing else moved. */
  readonly charging: number;
  readonly holding: number | null;
  /** Charging gap after, minus before. */
  readonly change: number;
  /** False when the spare is of another polarity or size group, or its lot breaks a wish. */
  readonly allowed: boolean;
}

const sameKind = (a: MeasuredUnit, b: MeasuredUnit, lots: PlaceRequest["lots"]): boolean =>
  (a.group ?? "") === (b.group ?? "") && (lots === undefined || a.lot === b.lot);

/** For each fitted unit the spares that may replace it, best first. */
export function replacements(
  units: readonly MeasuredUnit[],
  request: PlaceRequest,
  placing: Placing,
): ReadonlyMap<string, readonly Replacement[]> {
  const bySerial = new Map(units.map((unit) => [unit.serial, unit]));
  const groups = placing.groups.map((group) => group.map((serial) => bySerial.get(serial)!));
  const before = bankGaps(groups, request).charging;
  const result = new Map<string, readonly Replacement[]>();
  for (const [g, group] of groups.entries()) {
    for (const [k, unit] of group.entries()) {
      const rows = placing.spares.map((serial): Replacement => {
        const spare = bySerial.get(serial)!;
        const after = bankGaps(
          groups.map((other, j) => (j === g ? other.with(k, spare) : other)),
          request,
        );
        const allowed = sameKind(unit, spare, request.lots);
        return { serial: unit.serial, spare: serial, ...after, change: after.charging - before, allowed };
      });
      result.set(
        unit.serial,
        rows.sort((a, b) => Number(b.allowed) - Number(a.allowed) || a.charging - b.charging),
      );
    }
  }
  return result;
}
