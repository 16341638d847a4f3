// The counts of an answer as groups of strings that can be built.

import { isFittingBlend } from "./blend/evaluate.ts";
import type { BlendCount } from "./blend/model.ts";
import type { Group } from "./blendAssess.ts";
import type { BlendWork } from "./blendOptions.ts";
import { stringsCost } from "./blendString.ts";

/**
 * Where a cost table was levelled, the count that really has the cost is built, if it fits: the resistors of more strings
 * may be fewer, and so cheaper, than those of less.
 */
export function groupsOf({ model, types }: BlendWork, counts: readonly BlendCount[]): readonly Group[] {
  const raised = counts.map(({ option, strings }) => {
    const { costs, maxStrings } = model.options[option]!;
    let built = strings;
    while (built < maxStrings && (stringsCost(types[option]!, built) ?? 0) > costs[strings]!) built += 1;
    return { option, strings: built };
  });
  const chosen = isFittingBlend(model, raised) ? raised : counts;
  return chosen.map(({ option, strings }) => ({ type: types[option]!, strings }));
}
