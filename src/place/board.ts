// The state of a search over a cross-tied bank: which unit is in which slot, and the stage sums.

/** What may not be changed. Units of one class are interchangeable; a fixed unit stays where it is. */
export interface BoardRules {
  /** Class of each unit: 0, 1, ... */
  readonly classOf: Int32Array;
  readonly classes: number;
  /** 1 for a unit that is pinned to its stage. */
  readonly fixed: Uint8Array;
}

export interface Board {
  readonly stages: number;
  readonly size: number;
  readonly values: Float64Array;
  readonly rules: BoardRules;
  /** Unit in each slot: stage j holds slots j * size ... ; the spares follow. */
  readonly slots: Int32Array;
  readonly sums: Float64Array;
}

export const noRules = (units: number): BoardRules => ({
  classOf: new Int32Array(units),
  classes: 1,
  fixed: new Uint8Array(units),
});

/** A board from groups of unit indices; every unit not named is a spare. */
export function board(values: Float64Array, groups: readonly (readonly number[])[], rules: BoardRules): Board {
  const placed = new Set(groups.flat());
  const spares = Array.from(values, (_, i) => i).filter((i) => !placed.has(i));
  const made: Board = {
    stages: groups.length,
    size: groups[0]?.length ?? 0,
    values,
    rules,
    slots: Int32Array.from([...groups.flat(), ...spares]),
    sums: new Float64Array(groups.length),
  };
  recount(made);
  return made;
}

/** Sets the stage sums anew from the slots. */
export function recount(at: Board): void {
  for (let j = 0; j < at.stages; j++) {
    let sum = 0;
    for (let k = 0; k < at.size; k++) sum += at.values[at.slots[j * at.size + k]!]!;
    at.sums[j] = sum;
  }
}

/** Stage of a slot; the number of stages itself means the spares. */
export const stageOf = (at: Board, slot: number): number => Math.min(at.stages, Math.floor(slot / at.size));

/** Exchanges the units of two slots and keeps the sums right. */
export function exchange(at: Board, one: number, other: number): void {
  const a = at.slots[one]!;
  const b = at.slots[other]!;
  at.slots[one] = b;
  at.slots[other] = a;
  const gain = at.values[b]! - at.values[a]!;
  const from = stageOf(at, one);
  const to = stageOf(at, other);
  if (from < at.stages) at.sums[from] = at.sums[from]! + gain;
  if (to < at.stages) at.sums[to] = at.sums[to]! - gain;
}

/** May two slots exchange their units, as far as classes and pins go? */
export function mayExchange(at: Board, one: number, other: number): boolean {
  const { classOf, fixed } = at.rules;
  const a = at.slots[one]!;
  const b = at.slots[other]!;
  return classOf[a] === classOf[b] && fixed[a] === 0 && fixed[b] === 0;
}

/** Unit indices stage by stage. */
export const groupsOf = (at: Board): number[][] =>
  Array.from({ length: at.stages }, (_, j) => Array.from(at.slots.subarray(j * at.size, (j + 1) * at.size)));
