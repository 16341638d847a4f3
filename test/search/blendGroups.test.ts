// Where a table was levelled, the count that has the cost is built.
import { expect, test } from "vitest";
import { blendTotals } from "../../src/search/blend/evaluate.ts";
import { findBlend } from "../../src/search/blend/findBlend.ts";
import { groupsOf } from "../../src/search/blendGroups.ts";
import { stringsCost } from "../../src/search/blendString.ts";
import { draw } from "../support/blendDraw.ts";
import { workOf } from "../support/blendLab.ts";

test("groupsOf(work, counts): what is built costs what the model says, also where a table falls", () => {
  let falling = 0;
  let raised = 0;
  for (let seed = 1; seed <= 250; seed += 1) {
    const { brief, parts, families, maxTypes } = draw(seed);
    const work = workOf(parts, brief, maxTypes, families);
    work.types.forEach((type, option) => {
      const { maxStrings, costs } = work.model.options[option]!;
      for (let strings = 1; strings <= maxStrings; strings += 1) {
        if (stringsCost(type, strings)! === costs[strings]!) continue;
        falling += 1;
        const [group] = groupsOf({ ...work, model: { ...work.model, requirement: 1e-12 } }, [{ option, strings }]);
        if (group!.strings === strings) continue;
        raised += 1;
        expect(stringsCost(type, group!.strings), `seed ${seed}`).toBe(costs[strings]);
      }
    });
    const best = findBlend(work.model).best;
    if (best === null) continue;
    const cost = groupsOf(work, best.counts).reduce((sum, { type, strings }) => sum + stringsCost(type, strings)!, 0);
    expect(cost, `seed ${seed}`).toBe(blendTotals(work.model, best.counts)!.cost);
  }
  expect(falling).toBeGreaterThan(0);
  expect(raised).toBeGreaterThan(0);
});
