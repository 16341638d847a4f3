import { describe, expect, test } from "vitest";
import {
  blockPlan,
  cellHeight,
  cellShape,
  columnsIn,
  columnWidth,
  endOf,
  leftWidth,
} from "../../../src/sheet/draw/blockPlan.ts";
import { slotsOf } from "../../../src/sheet/draw/slots.ts";
import { schematicOf } from "../../support/drawn.ts";

describe("blockPlan(given)", () => {
  const shape = cellShape(schematicOf());
  const plan = blockPlan({ shape, columns: slotsOf(40, 4), rows: slotsOf(6, 9), head: true, x: 10, y: 20 });

  test("stage 1 is at the bottom; tracks follow each other without gap or overlap", () => {
    expect(plan.rows.map(({ slot }) => (slot.kind === "one" ? slot.number : 0))).toEqual([6, 5, 4, 3, 2, 1]);
    for (const list of [plan.rows, plan.columns])
      for (const [index, track] of list.entries()) if (index > 0) expect(track.from).toBe(endOf(list[index - 1]!));
    expect(plan.rows[0]!.from).toBe(20);
    expect(plan.bottom).toBe(endOf(plan.rows.at(-1)!));
    expect(plan.right).toBe(endOf(plan.columns.at(-1)!));
  });

  test("string fuses take a head of their own, where the positive end is", () => {
    const fused = cellShape(schematicOf({ ties: "strings", fuse: { at: "string", words: null } }));
    const rest = { shape: fused, columns: slotsOf(2, 4), rows: slotsOf(2, 4), x: 0, y: 0 };
    expect(blockPlan({ ...rest, head: true }).body).toBeGreaterThan(0);
    expect(blockPlan({ ...rest, head: false }).body).toBe(0);
  });
});

test("columnsIn(shape, width): so many columns and no more fit", () => {
  for (const ties of ["cross-tied", "strings"] as const) {
    const shape = cellShape(schematicOf({ ties }));
    const count = columnsIn(shape, 400);
    expect(leftWidth(shape) + count * columnWidth(shape)).toBeLessThanOrEqual(400);
    expect(leftWidth(shape) + (count + 1) * columnWidth(shape)).toBeGreaterThan(400);
  }
});

test("cellShape(props): what each position holds", () => {
  const shape = cellShape(
    schematicOf({ fuse: { at: "unit", words: null }, isolating: { resistance: 0.1, words: null }, balance: null }),
  );
  expect(shape).toEqual({
    tied: true,
    inSeries: ["fuse", "isolating"],
    balance: false,
    clamps: false,
    stringFuse: false,
    polarised: true,
  });
  expect(cellHeight(shape)).toBeGreaterThan(cellHeight(cellShape(schematicOf())));
  const unit = { ...schematicOf().unit, polarised: null };
  expect(cellShape(schematicOf({ unit })).polarised).toBe(true);
  expect(cellShape(schematicOf({ unit: { ...unit, polarised: false } })).polarised).toBe(false);
});
