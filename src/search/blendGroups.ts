// The counts of an answer as groups of strings that can be built.

import { isFittingBlend } from "./blend/evaluate.ts";
import type { BlendCount } from "./blend/model.ts";
import type { Group } from "./blendAssess.ts";
import type { BlendWork } from "./blendOptions.ts";
import { sendersOf } from "./blendShipments.ts";
import { stringsCost } from "./blendString.ts";

/**
 * Where a cost table was levelled, the count that really has the cost is built, if it fits: the resistors of more strings
 * may be fewer, and so cheaper, than those of less.
 */
export function groupsOf({ model, types, senders }: BlendWork, counts: readonly BlendCount[]): readonly Group[] {
  const raised = counts.map(({ option, strings }) => {
    const { costs, maxStrings, suppliers = [] } = model.options[option]!;
    const type = types[option]!;
    const paid = suppliers.map((supplier) => senders[supplier]!);
    const meant = (count: number): boolean =>
      (stringsCost(type, count) ?? 0) <= costs[strings]! &&
      sendersOf(type, count, senders).every((name) => paid.includes(name));
    let built = strings;
    while (built < maxStrings && !meant(built)) built += 1;
    return { option, strings: built };
  });
  const chosen = isFittingBlend(model, raised) ? raised : counts;
  return chosen.map(({ option, strings }) => ({ type: types[option]!, strings }));
}
