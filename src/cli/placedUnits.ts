// Measured units in the places of a bank, for its paper: as `place` would put them, or as the builder's own list says.

import { accepted, type Read } from "../quantity/index.ts";
import type { PlacedUnits } from "../sheet/index.ts";
import { placedBank } from "./placed.ts";
import type { PlaceFlags } from "./placeFlags.ts";
import type { Ports } from "./ports.ts";
import { refusalWords } from "./words.ts";

export interface PlacesFound {
  readonly placed: PlacedUnits;
  readonly notes: readonly string[];
  /** Units that could not be read. */
  readonly lost: readonly string[];
}

/** The same placing as `place` with the same flags. */
export function placesOf(brief: string | undefined, flags: PlaceFlags, ports: Ports): Read<PlacesFound> {
  const found = placedBank(brief, flags, ports);
  if (!found.ok) return found;
  const { placing, positions, notes, input, course } = found.value;
  return accepted({
    placed: {
      positions,
      groups: placing.groups,
      spares: placing.spares,
      plusMinus: placing.charging.plusMinus,
      holding: course?.holding.voltage ?? null,
    },
    notes,
    lost: input.measured.faults.map((fault) => `Not placed, ${refusalWords(fault)}`),
  });
}
