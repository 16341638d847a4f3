// A bank of strings: each string a chain of its own between the two ends, each unit with its own balancing resistor and clamp diode.

import { type BlockPlan, besides, endOf, type Track } from "./blockPlan.ts";
import { axisOf, between, cellInk, unitTop } from "./cell.ts";
import { across, down, type Ink } from "./ink.ts";
import { foldText } from "./slots.ts";
import { SPAN } from "./symbols.ts";
import { type BlockGiven, isOne, numberOf } from "./tiedBlock.ts";

const STUB = 5;

/** One unit with what stands across it. */
function unitInk({ shape }: BlockPlan, row: Track, column: Track): readonly Ink[] {
  const place = { shape, x: column.from, y: row.from, height: row.size };
  const name = `C${numberOf(column)}.${numberOf(row)}`;
  const axis = axisOf(shape, column.from);
  const room = besides(shape);
  const top = unitTop(place) - 2;
  const span = { top, bottom: top + SPAN + 4 };
  const [balanceAt, clampAt] = [column.from + room.balance - 7, column.from + room.balance + room.clamp - 7];
  const beside = [
    ...(shape.balance ? [between({ role: "balance", name: "resistor", x: balanceAt, ...span })] : []),
    ...(shape.clamps ? [between({ role: "clamp", name: "diode", x: clampAt, ...span })] : []),
  ];
  const first = shape.balance ? balanceAt : clampAt;
  const joined =
    beside.length === 0
      ? []
      : [
          {
            wires: [across(first, axis, span.top), across(first, axis, span.bottom)],
            joints: [span.top, span.bottom].map((y) => ({ x: axis, y })),
          },
        ];
  return [cellInk(place, name), ...beside, ...joined];
}

/** The two ends where they are in this drawing; inside a bank cut across, the strings go on by themselves. */
function endInk({ plan, goesOn }: BlockGiven, ends: { readonly top: boolean; readonly bottom: boolean }): Ink {
  const { columns, left, right, top, body, bottom, shape } = plan;
  const hidden = columns.find((column) => !isOne(column));
  const axes = columns.filter(isOne).map(({ from }) => axisOf(shape, from));
  const rails = [...(ends.top ? [top] : []), ...(ends.bottom ? [bottom] : [])];
  const cut = [...(ends.top ? [] : [body]), ...(ends.bottom ? [] : [bottom])];
  return {
    wires: rails.flatMap((y) =>
      hidden ? [across(left, hidden.from, y), across(endOf(hidden), right, y)] : [across(left, right, y)],
    ),
    dashes: [
      ...rails.flatMap((y) => [
        ...(hidden ? [across(hidden.from, endOf(hidden), y)] : []),
        ...(goesOn ? [across(right, right + STUB, y)] : []),
      ]),
      ...cut.flatMap((y) => axes.map((x) => down(x, y - (y === body ? STUB : 0), y + (y === body ? 0 : STUB)))),
    ],
    joints: rails.flatMap((y) => axes.map((x) => ({ x, y }))),
    points: rails.map((y) => ({ x: left, y })),
    marks:
      ends.top && shape.stringFuse
        ? axes.map((x) => ({ role: "fuse", name: "fuse", x, y: top + 3, way: "down" }) as const)
        : [],
  };
}

function foldInk({ shape, columns, left, right }: BlockPlan, row: Track): Ink {
  const hidden = columns.find((column) => !isOne(column));
  const y = row.from + row.size / 2;
  if (!isOne(row)) {
    const axes = columns.filter(isOne).map(({ from }) => axisOf(shape, from));
    return {
      dashes: axes.map((x) => down(x, row.from, endOf(row))),
      plates: [{ x: (left + right) / 2, y, text: foldText(row.slot, "place"), room: right - left }],
    };
  }
  if (hidden === undefined) return {};
  return {
    plates: [{ x: hidden.from + hidden.size / 2, y, text: foldText(hidden.slot), room: hidden.size - 6 }],
  };
}

export function stringBlock(
  given: BlockGiven,
  ends: { readonly top: boolean; readonly bottom: boolean },
): readonly Ink[] {
  const { plan } = given;
  const { shape, columns, rows, top, body } = plan;
  const axes = columns.filter(isOne).map(({ from }) => axisOf(shape, from));
  const nodes = rows.slice(0, -1).flatMap((row) => axes.map((x) => ({ x, y: endOf(row) })));
  const fused = ends.top && shape.stringFuse;
  return [
    { wires: fused ? axes.flatMap((x) => [down(x, top, top + 3), down(x, top + 3 + SPAN, body)]) : [] },
    endInk(given, ends),
    ...rows.filter(isOne).flatMap((row) => columns.filter(isOne).flatMap((column) => unitInk(plan, row, column))),
    ...rows.map((row) => foldInk(plan, row)),
    { points: nodes },
  ];
}
