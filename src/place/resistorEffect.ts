// What balancing resistors do to the holding gap of a placing, and to the best that re-placing could do beside them.
import { accepted, type Read } from "../quantity/index.ts";
import { bankGaps } from "./bankGaps.ts";
import { place } from "./place.ts";
import type { Placing } from "./placing.ts";
import type { PlaceRequest } from "./request.ts";
import type { MeasuredUnit } from "./unit.ts";

export interface ResistorEffect {
  /** R per stage (cross-tied) or unit (strings), ohm; infinite for none. */
  readonly resistance: number;
  /** Holding gap of the placing as it stands; null when it cannot be judged. */
  readonly asPlaced: number | null;
  /** Holding gap after placing anew beside these resistors; that of the placing at hand where the search found no better. */
  readonly replaced: number | null;
}

const leastOf = (asPlaced: number | null, anew: number | null): number | null =>
  asPlaced === null || anew === null ? anew : Math.min(asPlaced, anew);

/** One row for no resistor and one for each resistance (ohm, > 0). `units` are those of the placing. */
export function resistorEffect(
  units: readonly MeasuredUnit[],
  request: PlaceRequest,
  { placing, resistances }: { readonly placing: Placing; readonly resistances: readonly number[] },
): Read<readonly ResistorEffect[]> {
  const bySerial = new Map(units.map((unit) => [unit.serial, unit]));
  const groups = placing.groups.map((group) => group.map((serial) => bySerial.get(serial)!));
  const rows: ResistorEffect[] = [];
  for (const resistance of [Number.POSITIVE_INFINITY, ...resistances]) {
    const asked = { ...request, balanceConductance: 1 / resistance };
    const anew = place(units, asked);
    if (!anew.ok) return anew;
    const asPlaced = bankGaps(groups, asked).holding;
    rows.push({
      resistance,
      asPlaced,
      replaced: leastOf(asPlaced, anew.value.holding?.gap ?? null),
    });
  }
  return accepted(rows);
}
