// A bank as its builder lists it: positions kept as they are, gaps worked out anew, against the same bound as a free placing.
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import { bankGaps, gapOfGroups } from "./bankGaps.ts";
import { gapFinding, mixedParts } from "./flags.ts";
import { worstShare } from "./gap.ts";
import { toLattice } from "./lattice.ts";
import { place } from "./place.ts";
import type { Placing } from "./placing.ts";
import type { PlaceRequest } from "./request.ts";
import { isOptimal } from "./solution.ts";
import type { MeasuredUnit } from "./unit.ts";

const fault = (code: string, read: string, want: string): Refusal => ({
  code,
  place: { field: "positions" },
  read,
  want,
});

function faultsOf(units: readonly MeasuredUnit[], request: PlaceRequest, groups: readonly (readonly string[])[]) {
  const cross = request.ties === "cross-tied";
  const [count, size] = cross ? [request.series, request.parallel] : [request.parallel, request.series];
  const known = new Set(units.map((unit) => unit.serial));
  const faults: Refusal[] = [];
  if (groups.length !== count) faults.push(fault("place.list-shape", `${groups.length} groups`, `${count}`));
  for (const [g, group] of groups.entries()) {
    if (group.length !== size)
      faults.push(fault("place.list-shape", `${group.length} units in ${g + 1}`, `${size} in each`));
  }
  const seen = new Set<string>();
  for (const serial of groups.flat()) {
    if (!known.has(serial)) faults.push(fault("place.list-unknown", serial, "the serial of a measured unit"));
    if (seen.has(serial)) faults.push(fault("place.duplicate-serial", serial, "each serial once"));
    seen.add(serial);
  }
  return faults;
}

/** The builder's own groups of serials as a placing. Refused when they do not fit the shape or the measured units. */
export function asBuilt(
  units: readonly MeasuredUnit[],
  request: PlaceRequest,
  groups: readonly (readonly string[])[],
): Read<Placing> {
  const faults = faultsOf(units, request, groups);
  if (faults.length > 0) return refused(...faults);
  // The list is what was built: wishes of the search no longer count, and no unit of it is set aside.
  const { pins: _, rooms: __, lots: ___, ...free } = request;
  const best = place(units, { ...free, outliers: "keep", goal: "charging" });
  if (!best.ok) return best;
  const bySerial = new Map(units.map((unit) => [unit.serial, unit]));
  const fitted = new Set(groups.flat());
  const standing = groups.map((group) => group.map((serial) => bySerial.get(serial)!));
  const { holding } = bankGaps(standing, request);
  // On the same whole numbers as the search, so that the best list read back is the best to the last digit.
  const { values } = toLattice(units.map((unit) => unit.capacitance));
  const value = new Map(units.map((unit, i) => [unit.serial, values[i]!]));
  const gap = gapOfGroups(
    request.ties,
    groups.map((group) => group.map((serial) => value.get(serial)!)),
  );
  const { charging, floor } = best.value;
  const lowerBound = Math.min(charging.lowerBound, gap);
  const holdingFloor = best.value.holding?.floor ?? 0;
  const unknown = best.value.findings.filter((f) => f.id.startsWith("place.leakage-"));
  return accepted({
    ...best.value,
    groups,
    spares: units.map((unit) => unit.serial).filter((serial) => !fitted.has(serial)),
    rejected: [],
    charging: {
      ...charging,
      worst: worstShare(gap, request.series),
      gap,
      lowerBound,
      certified: gap - lowerBound,
      proof: isOptimal({ gap, lowerBound }) ? "optimal" : "within",
      attained: charging.gap,
    },
    holding:
      holding === null ? null : { worst: worstShare(holding, request.series), gap: holding, floor: holdingFloor },
    findings: [
      gapFinding("charging", gap, floor),
      ...(holding === null ? unknown : [gapFinding("holding", holding, holdingFloor)]),
      ...mixedParts(
        standing.flat(),
        groups.map((group, g) => group.map((_, k) => g * group.length + k)),
      ),
    ],
  });
}
