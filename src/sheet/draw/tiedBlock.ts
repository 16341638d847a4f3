// A cross-tied bank: stages of parallel units between ties, each stage with its one balancing resistor and clamp diode.

import { type BlockPlan, besides, endOf, type Track } from "./blockPlan.ts";
import { axisOf, between, cellInk } from "./cell.ts";
import { SIZES } from "./drawing.tsx";
import { across, down, type Ink, type Line } from "./ink.ts";
import { foldText } from "./slots.ts";

/** What is said at a node: its name, and its potential when that is fixed. */
export type NodeWords = (node: number) => { readonly name: string; readonly potential: string | null };

export interface BlockGiven {
  readonly plan: BlockPlan;
  readonly nodeWords: NodeWords;
  /** Units go on beside this drawing, in another piece. */
  readonly goesOn: boolean;
}

const STUB = 5;

interface Node {
  readonly y: number;
  readonly node: number;
}

/** From the top down. */
export function nodesOf({ rows, body }: Pick<BlockPlan, "rows" | "body">): readonly Node[] {
  const highest = rows[0]!.slot;
  return [
    { y: body, node: highest.kind === "one" ? highest.number : highest.to },
    ...rows.map((row) => ({
      y: endOf(row),
      node: (row.slot.kind === "one" ? row.slot.number : row.slot.from) - 1,
    })),
  ];
}

export const isOne = ({ slot }: Track): boolean => slot.kind === "one";
export const numberOf = ({ slot }: Track): number => (slot.kind === "one" ? slot.number : slot.from);

function tieInk({ plan, nodeWords, goesOn }: BlockGiven): Ink {
  const { shape, columns, ties, right } = plan;
  const hidden = columns.find((column) => !isOne(column));
  const nodes = nodesOf(plan);
  return {
    wires: nodes.flatMap(({ y }) =>
      hidden ? [across(ties, hidden.from, y), across(endOf(hidden), right, y)] : [across(ties, right, y)],
    ),
    dashes: nodes.flatMap(({ y }) => [
      ...(hidden ? [across(hidden.from, endOf(hidden), y)] : []),
      ...(goesOn ? [across(right, right + STUB, y)] : []),
    ]),
    joints: nodes.flatMap(({ y }) => columns.filter(isOne).map(({ from }) => ({ x: axisOf(shape, from), y }))),
    points: nodes.map(({ y }) => ({ x: ties, y })),
    words: nodes.flatMap(({ y, node }) => {
      const { name, potential } = nodeWords(node);
      const end = { x: ties - 4, anchor: "end", size: SIZES.small } as const;
      if (potential === null) return [{ ...end, y: y + 2.5, text: name }];
      return [
        { ...end, y: y - 1.5, text: name },
        { ...end, y: y + 6.5, text: potential },
      ];
    }),
  };
}

function besideInk({ shape, ties }: BlockPlan, row: Track): Ink[] {
  const room = besides(shape);
  const [balanceAt, clampAt] = [ties + room.balance - 7, ties + room.balance + room.clamp - 7];
  const span = { top: row.from, bottom: endOf(row) };
  if (!isOne(row)) {
    const axes = [...(shape.balance ? [balanceAt] : []), ...(shape.clamps ? [clampAt] : [])];
    return [{ dashes: axes.map((x): Line => down(x, span.top, span.bottom)) }];
  }
  const name = { x: balanceAt - 4, y: row.from + row.size / 2 + 2.5, anchor: "end", size: SIZES.small } as const;
  return [
    ...(shape.balance
      ? [
          between({ role: "balance", name: "resistor", x: balanceAt, ...span }),
          { words: [{ ...name, text: `RB${numberOf(row)}` }] },
        ]
      : []),
    ...(shape.clamps ? [between({ role: "clamp", name: "diode", x: clampAt, ...span })] : []),
  ];
}

function foldInk({ shape, columns, ties, right }: BlockPlan, row: Track): Ink {
  const hidden = columns.find((column) => !isOne(column));
  const y = row.from + row.size / 2;
  if (!isOne(row)) {
    const axes = columns.filter(isOne).map(({ from }) => axisOf(shape, from));
    return {
      dashes: axes.map((x) => down(x, row.from, endOf(row))),
      plates: [{ x: (ties + right) / 2, y, text: foldText(row.slot, "stage"), room: right - ties }],
    };
  }
  if (hidden === undefined) return {};
  return { plates: [{ x: hidden.from + hidden.size / 2, y, text: foldText(hidden.slot), room: hidden.size - 6 }] };
}

export function tiedBlock(given: BlockGiven): readonly Ink[] {
  const { shape, columns, rows } = given.plan;
  const cells = rows.filter(isOne).flatMap((row) =>
    columns.filter(isOne).map((column) => {
      const place = { shape, x: column.from, y: row.from, height: row.size };
      return cellInk(place, `C${numberOf(row)}.${numberOf(column)}`);
    }),
  );
  return [
    tieInk(given),
    ...cells,
    ...rows.flatMap((row) => besideInk(given.plan, row)),
    ...rows.map((row) => foldInk(given.plan, row)),
  ];
}
