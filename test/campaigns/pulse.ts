// A long run of random meshes: worst energy imbalance and refusals of each kind. Not part of the quick tests.

import { linearShot } from "../../src/pulse/linearShot.ts";
import { meshShot } from "../../src/pulse/meshShot.ts";
import type { Mesh, Shot } from "../../src/pulse/shot.ts";
import type { Read } from "../../src/quantity/index.ts";
import { anyMesh, imbalance } from "../pulse/meshes.ts";
import fc from "../support/property.ts";

export interface CampaignRow {
  readonly kind: string;
  readonly runs: number;
  readonly worstImbalance: number;
  readonly refused: Readonly<Record<string, number>>;
}

const KINDS: readonly (readonly [string, fc.Arbitrary<Mesh>, (mesh: Mesh) => Read<Shot>])[] = [
  ["linear", anyMesh(false, false), linearShot],
  ["lamp", anyMesh(true, false), meshShot],
  ["clamp", anyMesh(false, true), meshShot],
  ["lamp and clamp", anyMesh(true, true), meshShot],
];

/** Runs `runs` meshes of each kind from a seed. */
export function pulseCampaign(runs: number, seed: number): readonly CampaignRow[] {
  return KINDS.map(([kind, meshes, shotOf]) => {
    let worstImbalance = 0;
    const refused: Record<string, number> = {};
    for (const mesh of fc.sample(meshes, { numRuns: runs, seed })) {
      const read = shotOf(mesh);
      if (read.ok) worstImbalance = Math.max(worstImbalance, Math.abs(imbalance(read.value.energy)));
      else for (const { code } of read.refusals) refused[code] = (refused[code] ?? 0) + 1;
    }
    return { kind, runs, worstImbalance, refused };
  });
}
