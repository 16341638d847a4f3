import { describe, expect, test } from "vitest";
import { blockPlan, cellShape } from "../../../src/sheet/draw/blockPlan.ts";
import { countOf, together } from "../../../src/sheet/draw/ink.ts";
import { slotsOf } from "../../../src/sheet/draw/slots.ts";
import { isOne, nodesOf, numberOf, tiedBlock } from "../../../src/sheet/draw/tiedBlock.ts";
import { schematicOf } from "../../support/drawn.ts";

const words = (node: number) => ({ name: `TP${node}`, potential: node === 0 ? null : `${node} V` });
const planOf = (series: number, parallel: number, most = 9) =>
  blockPlan({
    shape: cellShape(schematicOf({ clamps: { bank: false, positions: true } })),
    columns: slotsOf(parallel, most),
    rows: slotsOf(series, most),
    head: true,
    x: 0,
    y: 0,
  });
const inkOf = (plan: ReturnType<typeof planOf>) => together(tiedBlock({ plan, nodeWords: words, goesOn: false }));

describe("tiedBlock(given)", () => {
  test("a unit at each crossing, one resistor and one diode to a stage, one point to a node", () => {
    const ink = inkOf(planOf(4, 3));
    expect(countOf(ink, "unit")).toBe(12);
    expect(countOf(ink, "balance")).toBe(4);
    expect(countOf(ink, "clamp")).toBe(4);
    expect(ink.points).toHaveLength(5);
    expect(ink.joints).toHaveLength(15);
    expect(ink.words.map(({ text }) => text)).toEqual(expect.arrayContaining(["TP0", "TP4", "4 V", "RB1", "C4.3"]));
  });

  test("units of a stage hang between the same two heights, which are its ties", () => {
    const plan = planOf(2, 2);
    const ink = inkOf(plan);
    for (const { y } of nodesOf(plan))
      expect(ink.wires.some((wire) => wire.y === y && wire.toY === y && wire.toX === plan.right)).toBe(true);
  });

  test("a fold of stages and of units is told where it is", () => {
    const ink = inkOf(planOf(20, 40, 4));
    expect(countOf(ink, "unit")).toBe(9);
    expect(ink.plates.map(({ text }) => text)).toEqual(
      expect.arrayContaining(["17 more stages alike", "37 more alike"]),
    );
  });
});

test("nodesOf(plan), isOne(track), numberOf(track): nodes from the top, past a fold to the number under it", () => {
  const plan = planOf(20, 1, 4);
  expect(nodesOf(plan).map(({ node }) => node)).toEqual([20, 19, 2, 1, 0]);
  expect(plan.rows.map(isOne)).toEqual([true, false, true, true]);
  expect(plan.rows.map(numberOf)).toEqual([20, 3, 2, 1]);
});
