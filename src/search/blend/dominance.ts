// Drops options that enough others can always stand in for, whatever a blend asks of them.
import type { BlendModel, BlendOption } from "./model.ts";
import { usefulStrings } from "./pool.ts";

/** Whether `other` replaces any number of strings of `one`: no dearer, larger, heavier, no more units, no less capacitance. */
export function replaces(other: BlendOption, otherMost: number, one: BlendOption, oneMost: number): boolean {
  for (let x = oneMost; x >= 1; x -= 1) {
    let y = Math.ceil((one.capacity * x) / other.capacity);
    while (y * other.capacity < x * one.capacity) y += 1;
    if (
      y > otherMost ||
      other.costs[y]! > one.costs[x]! ||
      other.volume * y > one.volume * x ||
      other.mass * y > one.mass * x ||
      other.units * y > one.units * x
    ) {
      return false;
    }
  }
  return true;
}

/**
 * Places of the options that must be kept for some cheapest blend to be left. An option goes when `maxTypes` others, each
 * of another part, replace it: a blend with it uses at most maxTypes - 1 others, so one replacement is free to take its
 * place. One way of the same part suffices, for a blend uses a part in one way only. Being replaced by a single other part
 * is not enough: stock or a price break may already be used up there. Equals are ordered by place, so that no circle forms.
 */
export function undominated(model: BlendModel): readonly number[] {
  const most = model.options.map((option) => usefulStrings(model, option));
  const usable = model.options.flatMap((option, at) => (most[at]! > 0 ? [{ option, at }] : []));
  usable.sort((a, b) => b.option.capacity * most[b.at]! - a.option.capacity * most[a.at]!);
  return usable
    .filter(({ option, at }) => {
      const parts = new Set<number>();
      for (const rival of usable) {
        // Largest reach first: nothing further down brings as much as this option does.
        if (rival.option.capacity * most[rival.at]! < option.capacity * most[at]!) break;
        if (rival.at === at || (rival.option.partIndex !== option.partIndex && parts.has(rival.option.partIndex)))
          continue;
        if (!replaces(rival.option, most[rival.at]!, option, most[at]!)) continue;
        if (rival.at > at && replaces(option, most[at]!, rival.option, most[rival.at]!)) continue;
        if (rival.option.partIndex === option.partIndex) return false;
        parts.add(rival.option.partIndex);
        if (parts.size >= model.maxTypes) return false;
      }
      return true;
    })
    .map(({ at }) => at)
    .sort((a, b) => a - b);
}

/** The model with only the named options; `places` gives each its place in the old one. */
export function restrictedModel(model: BlendModel, places: readonly number[]): BlendModel {
  return { ...model, options: places.map((at) => model.options[at]!) };
}
