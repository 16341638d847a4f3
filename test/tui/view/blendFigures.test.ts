// Figures of blends as rows: the strings, the bank, the rivals, and the ladder with bars to the scale of the dearest.
import { expect, test } from "vitest";
import { drawRow, type Row } from "../../../src/tui/row.ts";
import { ladderRows, rivalRows, stringRows, wholeRows } from "../../../src/tui/view/blendFigures.ts";
import { foundFor, plannedOn } from "../../support/blendScreen.ts";

const found = await foundFor(plannedOn());
const plan = found.answer.plan.ok ? found.answer.plan.value : null;
const best = plan?.blends[0];
if (plan === null || best === undefined) throw new Error("no blend");
const lines = (rows: readonly Row[], columns = 80): readonly string[] =>
  rows.map((row) => drawRow(row, columns, { colour: false, ascii: false }).replace(/\x1b\[[\d;]*m/g, ""));
const flat = (rows: readonly Row[], columns = 80): string => lines(rows, columns).join(" ").replace(/\s+/g, " ");

test("stringRows(strings, columns): part, shape, ties, units, on hand, bought and cost of each, at 60 columns too", () => {
  for (const columns of [60, 80, 200]) {
    const text = flat(stringRows(best.strings, columns), columns);
    expect(text).toMatch(/part shape ties units on hand buy cost/);
    for (const { part, series, parallel, ties, units, fromHand, bought, cost } of best.strings)
      expect(text).toContain(
        `${part} ${series}s${parallel}p ${ties} ${units} ${fromHand} ${bought} ${cost?.total.toFixed(2)} EUR`,
      );
  }
});

test("a long name of a part is cut where there is no room, and whole where there is", () => {
  const long = best.strings.map((one) => ({ ...one, part: "a-very-long-name-of-an-invented-part" }));
  expect(flat(stringRows(long, 60), 60)).toContain("…");
  expect(flat(stringRows(long, 200), 200)).toContain("a-very-long-name-of-an-invented-part");
});

test("wholeRows(blend, columns): least and most, worst shares with their limits, a price that is missing", () => {
  const text = flat(wholeRows(best, 80));
  expect(text).toMatch(/Capacitance: 993 µF to 1\.49 mF, 1\.24 mF nominal\./);
  expect(text).toMatch(/Worst charging: 348 V of 360 V on a unit of flash-b/);
  expect(text).toContain("Without a price, and not in the cost: balancing resistors.");
  const bare = flat(wholeRows({ ...best, cost: null, share: { ...best.share, charging: null } }, 80));
  expect(bare).toContain("Worst charging: not assessed");
  expect(bare).not.toContain("Cost:");
  expect(flat(wholeRows({ ...best, bleed: { ...best.bleed, seconds: null, together: null } }, 80))).toContain(
    "a group cut off from the rest never empties.",
  );
});

test("rivalRows(plan, within, columns): each of another kind with what it costs more; none, and cut short, said", () => {
  const text = flat(rivalRows(plan, "10 %", 80));
  for (const { id, cost } of plan.blends.slice(1))
    expect(text).toContain(`${id} +${((cost?.total ?? 0) - (best.cost?.total ?? 0)).toFixed(2)} EUR`);
  const none = flat(rivalRows({ ...plan, blends: [best], alternativesComplete: false }, "10 %", 80));
  expect(none).toMatch(/No blend of another kind is up to 10 % dearer\. The search for them was cut short/);
  expect(rivalRows({ ...plan, blends: [] }, "10 %", 80)).toEqual([]);
});

test("ladderRows(plan, columns, ascii): a bar as long as its cost, the energy asked marked, dearer never shorter", () => {
  const rows = lines(ladderRows(plan, 80, false));
  const bars = rows.flatMap((row) => /EUR (█+)·*/.exec(row)?.[1]?.length ?? []);
  expect(bars).toHaveLength(plan.ladder?.steps.length ?? -1);
  expect(bars).toEqual([...bars].sort((a, b) => a - b));
  expect(bars.at(-1)).toBe(16);
  const asked = rows.filter((row) => row.startsWith("  > "));
  expect(asked).toHaveLength(1);
  expect(asked[0]).toContain(`${best.cost?.total.toFixed(2)} EUR`);
  expect(flat(ladderRows(plan, 80, true))).toMatch(/#+\.*/);
});

test("a ladder that ends below the energy asked, is not proven, or has no step says so", () => {
  const { ladder } = plan;
  const steps = ladder?.steps.map((step) => ({ ...step, asked: false, proven: false })) ?? [];
  expect(flat(ladderRows({ ...plan, ladder: { end: "cut", steps } }, 80, false))).toMatch(
    /Not every step is proven\. The energy asked lies above the last step told\. There are more steps/,
  );
  expect(flat(ladderRows({ ...plan, ladder: { end: "cut", steps: [] } }, 80, false))).toContain("No step was found.");
  expect(ladderRows({ ...plan, ladder: null }, 80, false)).toEqual([]);
});
