// A drawing as plain data before it is markup: wires, joints, points, symbols in their roles, words, and words on a white plate.

import type { Stand, SymbolName } from "./symbols.ts";

export interface Spot {
  readonly x: number;
  readonly y: number;
}

export interface Line extends Spot {
  readonly toX: number;
  readonly toY: number;
}

/** A symbol in its role; the role is what it is counted by. */
export interface Mark extends Stand {
  readonly role: string;
  readonly name: SymbolName;
}

/** An upright rectangle in its role, by its upper left corner. */
export interface Box extends Spot {
  readonly role: string;
  readonly width: number;
  readonly height: number;
}

export interface Said extends Spot {
  readonly text: string;
  readonly anchor?: "start" | "middle" | "end";
  readonly size?: number;
  readonly bold?: boolean;
  readonly room?: number;
  readonly lines?: number;
}

/** Words over lines, centred, within a width. */
export interface Plate extends Spot {
  readonly text: string;
  readonly room: number;
}

/** A line of a chart, as path text. */
export interface Curve {
  readonly role: string;
  readonly d: string;
  readonly dash?: string | undefined;
  readonly width?: number | undefined;
}

export interface Ink {
  readonly wires?: readonly Line[];
  readonly dashes?: readonly Line[];
  readonly rails?: readonly Line[];
  readonly joints?: readonly Spot[];
  readonly points?: readonly Spot[];
  /** Where the earthing stick is applied. */
  readonly sticks?: readonly Spot[];
  readonly boxes?: readonly Box[];
  readonly curves?: readonly Curve[];
  readonly marks?: readonly Mark[];
  readonly words?: readonly Said[];
  readonly plates?: readonly Plate[];
}

export const across = (x: number, toX: number, y: number): Line => ({ x, y, toX, toY: y });
export const down = (x: number, y: number, toY: number): Line => ({ x, y, toX: x, toY });

/** Several inks as one, in their order. */
export function together(inks: readonly Ink[]): Required<Ink> {
  const of = <Part>(pick: (ink: Ink) => readonly Part[] | undefined): readonly Part[] =>
    inks.flatMap((ink) => pick(ink) ?? []);
  return {
    wires: of((ink) => ink.wires),
    dashes: of((ink) => ink.dashes),
    rails: of((ink) => ink.rails),
    joints: of((ink) => ink.joints),
    points: of((ink) => ink.points),
    sticks: of((ink) => ink.sticks),
    boxes: of((ink) => ink.boxes),
    curves: of((ink) => ink.curves),
    marks: of((ink) => ink.marks),
    words: of((ink) => ink.words),
    plates: of((ink) => ink.plates),
  };
}

/** How often a role is drawn. */
export const countOf = ({ marks = [], boxes = [], curves = [] }: Ink, role: string): number =>
  [...marks, ...boxes, ...curves].filter((drawn) => drawn.role === role).length;
