import { expect, test } from "vitest";
import { countsOf } from "../../../src/order/index.ts";
import { blockPlan, cellShape } from "../../../src/sheet/draw/blockPlan.ts";
import { countOf, together } from "../../../src/sheet/draw/ink.ts";
import { slotsOf } from "../../../src/sheet/draw/slots.ts";
import { stringBlock } from "../../../src/sheet/draw/stringBlock.ts";
import { schematicOf } from "../../support/drawn.ts";

const words = (node: number) => ({ name: `TP${node}`, potential: null });
const props = schematicOf({
  ties: "strings",
  clamps: { bank: false, positions: true },
  fuse: { at: "string", words: null },
});
const inkOf = (series: number, parallel: number, ends = { top: true, bottom: true }) => {
  const plan = blockPlan({
    shape: cellShape(props),
    columns: slotsOf(parallel, 9),
    rows: slotsOf(series, 9),
    head: ends.top,
    x: 0,
    y: 0,
  });
  return { plan, ink: together(stringBlock({ plan, nodeWords: words, goesOn: false }, ends)) };
};

test("stringBlock(given, ends): each unit has its resistor and diode, each string its fuse, each node its point", () => {
  const { ink } = inkOf(4, 3);
  expect(countOf(ink, "unit")).toBe(12);
  expect(countOf(ink, "balance")).toBe(12);
  expect(countOf(ink, "clamp")).toBe(12);
  expect(countOf(ink, "fuse")).toBe(3);
  expect(ink.points).toHaveLength(countsOf({ series: 4, parallel: 3, ties: "strings" }).stickPoints);
  expect(ink.words.map(({ text }) => text)).toEqual(expect.arrayContaining(["C1.1", "C3.4"]));
});

test("stringBlock(given, ends): strings meet nowhere but at the ends", () => {
  const { plan, ink } = inkOf(3, 2);
  const wide = ink.wires.filter(({ x, toX, y, toY }) => y === toY && Math.abs(toX - x) > plan.columns[0]!.size);
  expect(wide.map(({ y }) => y)).toEqual([plan.top, plan.bottom]);
});

test("stringBlock(given, ends): a piece from the middle has no ends and no fuses, and says that the strings go on", () => {
  const { plan, ink } = inkOf(3, 2, { top: false, bottom: false });
  expect(countOf(ink, "fuse")).toBe(0);
  expect(ink.wires.filter(({ x, toX }) => toX - x > plan.columns[0]!.size)).toEqual([]);
  expect(ink.dashes).toHaveLength(4);
});
