// Which of many alike things are drawn: all of them, or the first two and the last with a fold between, told in words.

/** One that is drawn, by its number from 1; or a fold that stands for `from` to `to`. */
export type Slot =
  | { readonly kind: "one"; readonly number: number }
  | { readonly kind: "fold"; readonly from: number; readonly to: number };

const one = (number: number): Slot => ({ kind: "one", number });

/** Every number from `from` to `to`. */
export const slotsBetween = (from: number, to: number): readonly Slot[] =>
  Array.from({ length: to - from + 1 }, (_, index) => one(from + index));

/**
 * 1 to `count`. When there are more than `most`, the first two (with room for three, else the first) and the last are drawn
 * with a fold between, which takes the room of one. Range: count >= 1.
 */
export function slotsOf(count: number, most: number): readonly Slot[] {
  if (count <= Math.max(most, 2)) return slotsBetween(1, count);
  const first = most >= 4 ? 2 : 1;
  return [...slotsBetween(1, first), { kind: "fold", from: first + 1, to: count - 1 }, one(count)];
}

export const hidden = (slots: readonly Slot[]): number =>
  slots.reduce((sum, slot) => sum + (slot.kind === "fold" ? slot.to - slot.from + 1 : 0), 0);

/** Says the fold: "strings 1, 2 and 40 are drawn, 37 more alike are not"; null when nothing is folded. */
export function foldWords(slots: readonly Slot[], things: string): string | null {
  const left = hidden(slots);
  if (left === 0) return null;
  const numbers = slots.flatMap((slot) => (slot.kind === "one" ? [slot.number] : []));
  const drawn = `${things} ${numbers.slice(0, -1).join(", ")} and ${numbers.at(-1)} are drawn`;
  return `${drawn}, ${left} more alike between them ${left === 1 ? "is" : "are"} not`;
}

/** What stands in the fold itself: "37 more alike", with the thing's name when it is given. */
export function foldText(slot: Slot, thing?: string): string {
  const count = hidden([slot]);
  const named = thing === undefined ? "" : `${thing}${count === 1 ? "" : "s"} `;
  return `${count} more ${named}alike`;
}

/** Cuts 1 to `count` into pieces of at most `most`, as equal as they go, in order. */
export function piecesOf(count: number, most: number): readonly (readonly [from: number, to: number])[] {
  const pieces = Math.ceil(count / most);
  const edge = (index: number): number => Math.round((count * index) / pieces);
  return Array.from({ length: pieces }, (_, index) => [edge(index) + 1, edge(index + 1)] as const);
}
