// What a builder's wishes (pins, lots, polarity and size) leave free: classes of units, and what may form a group.
import type { BoardRules } from "./board.ts";
import type { PlaceRequest } from "./request.ts";
import type { MeasuredUnit } from "./unit.ts";

export interface Constraints {
  /** False when any unit may go anywhere. */
  readonly any: boolean;
  readonly groups: number;
  readonly size: number;
  /** Group that each unit is pinned to, -1 for none. */
  readonly pinnedTo: Int32Array;
  /** What must be the same throughout a group: polarity or size, and the lot when lots are kept apart. */
  readonly label: readonly string[];
  /** What is spread evenly: the lot when lots are mixed, else "". */
  readonly lot: readonly string[];
  /** Polarity or size group of each unit, "" when none is given. */
  readonly kind: readonly string[];
  /** What a group takes, by group; undefined: anything. */
  readonly takes: readonly (string | undefined)[];
  readonly rules: BoardRules;
}

const SEPARATOR = "\u0000";

export function constraintsOf(units: readonly MeasuredUnit[], request: PlaceRequest): Constraints {
  const cross = request.ties === "cross-tied";
  const groups = cross ? request.series : request.parallel;
  const size = cross ? request.parallel : request.series;
  const kind = units.map((unit) => unit.group ?? "");
  const label = units.map((unit, i) => kind[i]! + SEPARATOR + (request.lots === "apart" ? (unit.lot ?? "") : ""));
  const lot = units.map((unit) => (request.lots === "mix" ? (unit.lot ?? "") : ""));
  const pinnedTo = new Int32Array(units.length).fill(-1);
  for (const pin of request.pins ?? []) pinnedTo[units.findIndex((unit) => unit.serial === pin.serial)] = pin.group;
  const takes: (string | undefined)[] = new Array(groups).fill(undefined);
  for (const room of request.rooms ?? []) if (room.group < groups) takes[room.group] = room.takes;
  const names = new Map<string, number>();
  const classOf = Int32Array.from(units, (_, i) => {
    const name = label[i]! + SEPARATOR + lot[i]!;
    const found = names.get(name) ?? names.size;
    if (found === names.size) names.set(name, found);
    return found;
  });
  const rules: BoardRules = {
    classOf,
    classes: names.size,
    fixed: Uint8Array.from(pinnedTo, (group) => (group >= 0 ? 1 : 0)),
  };
  const any = names.size > 1 || pinnedTo.some((group) => group >= 0) || takes.some((t) => t !== undefined);
  return { any, groups, size, pinnedTo, label, lot, kind, takes, rules };
}

/** Least and greatest count of a lot in one group, when `ofLot` of `among` units are of that lot. */
export function lotRange(size: number, ofLot: number, among: number): readonly [number, number] {
  const share = (size * ofLot) / among;
  return [Math.floor(share + 1e-9), Math.ceil(share - 1e-9)];
}

/**
 * May these units (indices) form one group? Used where groups are still unnumbered, so what a numbered group takes is not asked;
 * pinned units of one group must come all together.
 */
export function mayFormGroup(rule: Constraints, ranges: ReadonlyMap<string, readonly [number, number]>) {
  const pinsOf = new Map<number, number>();
  for (const group of rule.pinnedTo) if (group >= 0) pinsOf.set(group, (pinsOf.get(group) ?? 0) + 1);
  return (members: readonly number[]): boolean => {
    const first = rule.label[members[0]!];
    const pins = new Set<number>();
    let pinned = 0;
    const counts = new Map<string, number>();
    for (const i of members) {
      if (rule.label[i] !== first) return false;
      if (rule.pinnedTo[i]! >= 0) {
        pins.add(rule.pinnedTo[i]!);
        pinned++;
      }
      counts.set(rule.lot[i]!, (counts.get(rule.lot[i]!) ?? 0) + 1);
    }
    if (pins.size > 1 || (pins.size === 1 && pinned !== pinsOf.get([...pins][0]!))) return false;
    for (const [lot, [least, most]] of ranges) {
      const count = counts.get(lot) ?? 0;
      if (count < least || count > most) return false;
    }
    return true;
  };
}
