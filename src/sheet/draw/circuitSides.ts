// What stands beside the bank in the circuit, as ink between the two rails: charger, dump, bleeders, clamp, switch, load, earth.

import { between } from "./cell.ts";
import { SIZES } from "./drawing.tsx";
import { across, down, type Ink, type Said } from "./ink.ts";
import { partNames } from "./partNames.ts";
import type { SchematicProps } from "./schematicProps.ts";
import { SPAN, type SymbolName } from "./symbols.ts";

/** Points: the charger's own line and its box, and the rooms of what stands beside the bank. */
export const CHARGER = { axis: 30, halfWidth: 22, height: 36 } as const;
export const ROOM = { charger: 62, dump: 50, bleed: 36, clamp: 28, switch: 34, load: 34 } as const;
/** Of the isolation's parts, one below the other. */
export const STEP = 22;
const MOST_BLEEDS = 2;

const name = (x: number, y: number, text: string, anchor: Said["anchor"] = "start"): Said => ({
  x,
  y,
  text,
  anchor,
  size: SIZES.small,
});

export interface Rails {
  readonly top: number;
  readonly bottom: number;
}

export function chargerInk(props: SchematicProps, { top, bottom }: Rails): readonly Ink[] {
  const { axis, halfWidth, height } = CHARGER;
  const symbols = { resistor: "resistor", relay: "make", diode: "diode" } as const;
  const box = bottom - 22 - height;
  const names = partNames(props).isolation;
  const chain = props.isolation.flatMap(({ kind }, index): Ink[] => {
    const from = top + 6 + STEP * index;
    // Current goes up, from the charger to the rail: so does the diode.
    return [
      { marks: [{ role: "isolation", name: symbols[kind], x: axis, y: from + SPAN, way: "up" }] },
      { wires: [down(axis, from + SPAN, from + STEP)], words: [name(axis + 8, from + SPAN / 2 + 2.5, names[index]!)] },
    ];
  });
  const end = top + 6 + STEP * props.isolation.length;
  return [
    { wires: [down(axis, top, top + 6), down(axis, end, box), down(axis, box + height, bottom)] },
    ...chain,
    {
      boxes: [{ role: "charger", x: axis - halfWidth, y: box, width: 2 * halfWidth, height }],
      words: [
        name(axis, box + 16, "G1", "middle"),
        name(axis, box + 26, "charger", "middle"),
        name(axis + 4, box - 3, "+"),
        name(axis + 4, box + height + 8, "−"),
      ],
    },
  ];
}

export function dumpInk(props: SchematicProps, x: number, { top, bottom }: Rails): readonly Ink[] {
  const { dumpRelay, dump } = partNames(props);
  const axis = x + 30;
  const contact = top + 26;
  const half = (contact + SPAN + bottom) / 2;
  const link = contact + SPAN / 2;
  return [
    {
      wires: [down(axis, top, contact), down(x + 9, link - 10, link - 5), down(x + 9, link + 5, link + 10)],
      boxes: [{ role: "relay-coil", x: x + 2, y: link - 5, width: 14, height: 10 }],
      dashes: [across(x + 16, axis + 1, link)],
      joints: [top, bottom].map((y) => ({ x: axis, y })),
      marks: [{ role: "dump-relay", name: "break", x: axis, y: contact, way: "down" }],
      words: [name(axis + 8, link + 2.5, dumpRelay), name(axis + 6, half + 2.5, dump)],
    },
    between({ role: "dump", name: "resistor", x: axis, top: contact + SPAN, bottom }),
  ];
}

export function branchInk(
  given: { readonly role: string; readonly symbol: SymbolName; readonly x: number; readonly text: string },
  { top, bottom }: Rails,
): readonly Ink[] {
  const { role, symbol, x, text } = given;
  return [
    between({ role, name: symbol, x, top, bottom }),
    { joints: [top, bottom].map((y) => ({ x, y })), words: [name(x + 6, (top + bottom) / 2 + 2.5, text)] },
  ];
}

/** The bleeders that are drawn: all of them, or the first and one for the rest. */
export function bleedNames(props: SchematicProps): readonly string[] {
  const { bleeds } = partNames(props);
  if (bleeds.length <= MOST_BLEEDS) return bleeds;
  return [bleeds[0]!, `${bleeds[1]}${bleeds.length === 3 ? "," : " to"} ${bleeds.at(-1)}`];
}

const SWITCH_SYMBOLS = { thyristor: "thyristor", gap: "gap", contact: "make", unknown: "make" } as const;
const LOAD_SYMBOLS = { resistor: "resistor", coil: "coil", lamp: "lamp", short: "wire", unknown: "resistor" } as const;

export function fireInk(props: SchematicProps, x: number, { top, bottom }: Rails): readonly Ink[] {
  const axis = x + ROOM.switch + 10;
  const middle = (top + bottom) / 2;
  const split = props.load.coil ? middle : top;
  return [
    {
      rails: [across(x + 8 + SPAN, axis, top)],
      marks: [{ role: "switch", name: SWITCH_SYMBOLS[props.switch.kind], x: x + 8, y: top, way: "right" }],
      words: [name(x + 16, top - 9, "S1", "middle")],
    },
    ...(props.load.coil
      ? [
          between({ role: "load-coil", name: "coil", x: axis, top, bottom: middle }),
          { words: [name(axis + 6, (top + middle) / 2 + 2.5, "L1")] },
        ]
      : []),
    between({ role: "load", name: LOAD_SYMBOLS[props.load.kind], x: axis, top: split, bottom }),
    { words: [name(axis + 7, (split + bottom) / 2 + 2.5, "X1")] },
  ];
}

export function earthInk({ earth }: SchematicProps, x: number, { top, bottom }: Rails): Ink {
  if (earth !== "negative" && earth !== "positive") return {};
  const low = earth === "negative";
  const y = low ? bottom : top;
  return {
    marks: [{ role: "earth", name: "earth", x, y, way: low ? "down" : "up" }],
    joints: [{ x, y }],
    words: [name(x + 9, low ? y + 8 : y - 5, "E1")],
  };
}
