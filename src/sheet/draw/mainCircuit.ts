// The whole circuit from charger to load as ink: the bank between its rails, folded where it must be, and what stands beside it.

import { type BlockPlan, blockPlan, type CellShape, cellHeight, cellShape, columnsIn } from "./blockPlan.ts";
import { axisOf } from "./cell.ts";
import { bleedNames, branchInk, CHARGER, chargerInk, dumpInk, earthInk, fireInk, ROOM, STEP } from "./circuitSides.ts";
import { across, down, type Ink } from "./ink.ts";
import { partNames } from "./partNames.ts";
import type { SchematicProps } from "./schematicProps.ts";
import { hidden, type Slot, slotsOf } from "./slots.ts";
import { stringBlock } from "./stringBlock.ts";
import { type NodeWords, tiedBlock } from "./tiedBlock.ts";

/** Points: the upper rail, the height that the stages may take before they are folded, the air between a rail and the bank. */
const RAIL = 34;
const MOST_HEIGHT = 300;
const AIR = 14;

export interface MainCircuit {
  readonly inks: readonly Ink[];
  readonly width: number;
  readonly height: number;
  readonly columns: readonly Slot[];
  readonly rows: readonly Slot[];
}

/** How wide everything but the bank is. */
const besideBank = (props: SchematicProps): number =>
  ROOM.charger +
  (props.dump === null ? 0 : ROOM.dump) +
  ROOM.bleed * bleedNames(props).length +
  6 +
  (props.clamps.bank ? ROOM.clamp : 0) +
  ROOM.switch +
  ROOM.load;

function bankInk(plan: BlockPlan, nodeWords: NodeWords): readonly Ink[] {
  const given = { plan, nodeWords, goesOn: false };
  return plan.shape.tied ? tiedBlock(given) : stringBlock(given, { top: true, bottom: true });
}

function planOf(props: SchematicProps, shape: CellShape, x: number, width: number): BlockPlan {
  const columns = slotsOf(props.parallel, columnsIn(shape, width - besideBank(props)));
  const rows = slotsOf(props.series, Math.floor(MOST_HEIGHT / cellHeight(shape)));
  return blockPlan({ shape, columns, rows, head: true, x, y: RAIL + AIR });
}

/** The whole circuit in a width, the bank folded where it must be. */
export function mainCircuit(props: SchematicProps, width: number, nodeWords: NodeWords): MainCircuit {
  const bleeds = bleedNames(props);
  const bankAt = ROOM.charger + (props.dump === null ? 0 : ROOM.dump) + ROOM.bleed * bleeds.length;
  const shape = cellShape(props);
  const plan = planOf(props, shape, bankAt, width);
  const least = RAIL + 6 + STEP * props.isolation.length + 12 + CHARGER.height + 22;
  const rails = { top: RAIL, bottom: Math.max(plan.bottom + AIR, least, RAIL + 110) };
  const fireAt = plan.right + 6 + (props.clamps.bank ? ROOM.clamp : 0);
  const riser = axisOf(shape, plan.columns[0]!.from);
  return {
    inks: [
      {
        rails: [
          across(CHARGER.axis, fireAt + 8, rails.top),
          across(CHARGER.axis, fireAt + ROOM.switch + 10, rails.bottom),
        ],
        wires: [down(riser, rails.top, plan.top), down(riser, plan.bottom, rails.bottom)],
        joints: [rails.top, rails.bottom].map((y) => ({ x: riser, y })),
      },
      ...chargerInk(props, rails),
      ...(props.dump === null ? [] : dumpInk(props, ROOM.charger, rails)),
      ...bleeds.flatMap((text, index) => {
        const x = bankAt - ROOM.bleed * (bleeds.length - index) + 8;
        return branchInk({ role: "bleed", symbol: "resistor", x, text }, rails);
      }),
      ...bankInk(plan, nodeWords),
      ...(props.clamps.bank
        ? branchInk({ role: "bank-clamp", symbol: "diode", x: plan.right + 16, text: partNames(props).clamp }, rails)
        : []),
      ...fireInk(props, fireAt, rails),
      earthInk(props, riser + 24, rails),
    ],
    width: fireAt + ROOM.switch + ROOM.load,
    height: rails.bottom + 18,
    columns: plan.columns.map(({ slot }) => slot),
    rows: plan.rows.map(({ slot }) => slot).reverse(),
  };
}

/** Whether every unit of the bank is in the drawing. */
export const isWhole = ({ columns, rows }: Pick<MainCircuit, "columns" | "rows">): boolean =>
  hidden(columns) === 0 && hidden(rows) === 0;
