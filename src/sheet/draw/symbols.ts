// Circuit symbols as SVG path text: the shapes of IEC 60617 from memory, not read in the standard, drawn by ourselves.
//
// Each stands along its own axis from (0, 0) to (SPAN, 0), u along it and v to its right hand, and is turned to one of four ways.
// Turning never mirrors, so an arc bends the same way however it is laid.

import { at } from "./drawing.tsx";

/** Length of every two-ended symbol, points. */
export const SPAN = 16;

type Step =
  | readonly [command: "M" | "L", u: number, v: number]
  | readonly [command: "A", u: number, v: number, radius: number, clockwise: 0 | 1]
  | readonly [command: "Z"];
type Shape = readonly Step[];

const box = (from: number, to: number, half: number): Shape => [
  ["M", from, -half],
  ["L", to, -half],
  ["L", to, half],
  ["L", from, half],
  ["Z"],
];
const bar = (u: number, half: number): Shape => [
  ["M", u, -half],
  ["L", u, half],
];
const lead = (from: number, to: number): Shape => [
  ["M", from, 0],
  ["L", to, 0],
];
const ends = (from: number, to: number): Shape => [...lead(0, from), ...lead(to, SPAN)];

const RECTIFIER: Shape = [...lead(0, SPAN), ["M", 4.5, -4], ["L", 4.5, 4], ["L", 11.5, 0], ["Z"], ...bar(11.5, 4)];

export const SHAPES = {
  capacitor: [...ends(6.8, 9.2), ...bar(6.8, 5.5), ...bar(9.2, 5.5)],
  resistor: [...ends(2, 14), ...box(2, 14, 2.4)],
  fuse: [...lead(0, SPAN), ...box(2, 14, 2.4)],
  coil: [
    ...ends(2, 14),
    ["M", 2, 0],
    ["A", 5, 0, 1.5, 1],
    ["A", 8, 0, 1.5, 1],
    ["A", 11, 0, 1.5, 1],
    ["A", 14, 0, 1.5, 1],
  ],
  diode: RECTIFIER,
  thyristor: [...RECTIFIER, ["M", 11.5, 0], ["L", 14.5, 5], ["L", 16, 5]],
  gap: [
    ...ends(6.5, 9.5),
    ["M", 4, -2.5],
    ["L", 6.5, 0],
    ["L", 4, 2.5],
    ["M", 12, -2.5],
    ["L", 9.5, 0],
    ["L", 12, 2.5],
  ],
  make: [...ends(4, 12), ["M", 12, 0], ["L", 4, -5]],
  break: [...ends(4, 12), ["M", 4, 0], ["L", 4, -5], ["M", 12, 0], ["L", 2.5, -5.2]],
  lamp: [
    ...ends(4, 12),
    ...bar(4, 2.4),
    ...bar(12, 2.4),
    ["M", 4.5, -4.5],
    ["L", 11.5, -4.5],
    ["A", 11.5, 4.5, 4.5, 1],
    ["L", 4.5, 4.5],
    ["A", 4.5, -4.5, 4.5, 1],
    ["M", 7.4, 2.5],
    ["A", 8.6, 2.5, 0.6, 1],
    ["A", 7.4, 2.5, 0.6, 1],
  ],
  wire: lead(0, SPAN),
  earth: [...lead(0, 4), ...bar(4, 6), ...bar(6.2, 4), ...bar(8.4, 2)],
  plus: [...lead(-1.6, 1.6), ...bar(0, 1.6)],
} as const satisfies Record<string, Shape>;

export type SymbolName = keyof typeof SHAPES;

export interface Stand {
  readonly x: number;
  readonly y: number;
  readonly way: "right" | "down" | "left" | "up";
}

const TURNS = {
  right: (u, v) => [u, v],
  down: (u, v) => [-v, u],
  left: (u, v) => [-u, -v],
  up: (u, v) => [v, -u],
} as const satisfies Record<Stand["way"], (u: number, v: number) => readonly number[]>;

/** Steps as short as path text allows: from point to point, `h` and `v` where they do. */
function stepText(command: "m" | "l", dx: number, dy: number): string {
  if (command === "l" && dy === 0) return `h${dx}`;
  if (command === "l" && dx === 0) return `v${dy}`;
  return `${command}${dx}${dy < 0 ? "" : " "}${dy}`;
}

/** Path text of a symbol that starts at (x, y) and goes its way. */
export function symbolPath(name: SymbolName, { x, y, way }: Stand): string {
  const turn = TURNS[way];
  let here: readonly number[] = [0, 0];
  let open = here;
  const steps = (SHAPES[name] as Shape).map((step) => {
    if (step[0] === "Z") {
      here = open;
      return "z";
    }
    const to = turn(step[1], step[2]);
    const [dx, dy] = [at(to[0]! - here[0]!), at(to[1]! - here[1]!)];
    here = to;
    if (step[0] === "A") return `a${step[3]} ${step[3]} 0 0 ${step[4]} ${dx} ${dy}`;
    if (step[0] === "M") open = to;
    if (step[0] === "M" && dx === 0 && dy === 0) return "";
    return stepText(step[0] === "M" ? "m" : "l", dx, dy);
  });
  return `M${at(x)} ${at(y)}${steps.join("")}`;
}
