// What the limits cost, and whose prices are worth asking about: read from what a proof could not rule out.

import type { BlendModel } from "./blend/model.ts";
import { rowWorth } from "./blend/rowWorth.ts";
import type { FoundBlend } from "./blend/singles.ts";
import type { Proof } from "./blendProof.ts";
import type { CeilingWorth } from "./blendResult.ts";

/** Parts beside those of the blend whose prices are asked about. */
const OTHERS_ASKED = 6;

const openOptions = (proof: Proof | null): readonly number[] =>
  proof?.plain.survivors.map(({ option }) => option) ?? [];

/** Options that the proof could not rule out by arithmetic alone, the blend's own left out. */
export function nearOptions(proof: Proof | null, cheapest: FoundBlend): readonly number[] {
  const used = new Set(cheapest.counts.map(({ option }) => option));
  return openOptions(proof)
    .filter((option) => !used.has(option))
    .slice(0, OTHERS_ASKED);
}

/** Shadow prices of the ceilings in major money, over those options and the blend's own; null when not settled. */
export function worthOf(
  model: BlendModel,
  proof: Proof | null,
  cheapest: FoundBlend,
  minor: number,
): CeilingWorth | null {
  const among = new Set([...openOptions(proof), ...cheapest.counts.map(({ option }) => option)]);
  const worth = rowWorth(
    model,
    [...among].sort((a, b) => a - b),
  );
  if (worth === null) return null;
  const { volume, mass, units, types } = worth;
  return { volume: volume / minor, mass: mass / minor, units: units / minor, types: types / minor };
}
