// What the mouse says, in the numbered form (SGR, 1006), and how it is switched on and off.

export const MOUSE_ON = "\x1b[?1000h\x1b[?1006h";
export const MOUSE_OFF = "\x1b[?1006l\x1b[?1000l";

/** Rows that one turn of the wheel moves. */
const WHEEL = 3;

export type MouseSaid =
  | { readonly kind: "click"; readonly column: number; readonly row: number }
  | { readonly kind: "wheel"; readonly by: number };

/** A press of the first button or a turn of the wheel, places from 0; null for anything else. */
export function mouseTold(report: string): MouseSaid | null {
  const match = /^\x1b\[<(\d{1,3});(\d{1,4});(\d{1,4})M$/.exec(report);
  if (match === null) return null;
  const button = Number(match[1]);
  // Shift, Alt and Ctrl add 4, 8 and 16.
  const plain = button & ~28;
  if (plain === 64 || plain === 65) return { kind: "wheel", by: plain === 64 ? -WHEEL : WHEEL };
  if (button !== 0) return null;
  return { kind: "click", column: Number(match[2]) - 1, row: Number(match[3]) - 1 };
}
