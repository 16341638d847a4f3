// The build sheet as plain data: sections of paragraphs, lists, tables and drawings, from which every format is written.

import type {
  BleedChartProps,
  CostChartProps,
  FaceProps,
  SchematicProps,
  ShotChartProps,
  VoltageChartProps,
} from "./draw/index.ts";

/** Text, or null: a blank to fill in by hand. */
export type Cell = string | null;

export interface Column {
  readonly heading: string;
  /** Numbers stand on the right. */
  readonly side?: "right";
  /** A hand writes here: the column is given room. */
  readonly written?: true;
}

/** The first cell of a row names it. */
export interface Table {
  readonly kind: "table";
  readonly id: string;
  readonly caption: string;
  readonly columns: readonly Column[];
  readonly rows: readonly (readonly Cell[])[];
}

export type Drawn =
  | { readonly kind: "schematic"; readonly props: SchematicProps }
  | { readonly kind: "face"; readonly props: FaceProps }
  | { readonly kind: "voltages"; readonly props: VoltageChartProps }
  | { readonly kind: "bleed"; readonly props: BleedChartProps }
  | { readonly kind: "shot"; readonly props: ShotChartProps }
  | { readonly kind: "cost"; readonly props: CostChartProps };

/** A drawing and what it shows in words, for the formats and readers that have no pictures. */
export interface Drawing {
  readonly kind: "drawing";
  readonly drawn: Drawn;
  readonly words: string;
}

export type Block =
  | { readonly kind: "text"; readonly text: string }
  | { readonly kind: "list"; readonly items: readonly string[] }
  | Table
  | Drawing;

export interface Section {
  /** Names the section in links: letters and hyphens. */
  readonly id: string;
  readonly title: string;
  /** Begins a page of its own on paper. */
  readonly ownPage?: true;
  readonly blocks: readonly Block[];
}

export interface Sheet {
  readonly title: string;
  readonly layout: string;
  /** The rule that the builder chose to govern, in words. */
  readonly rule: string;
  /** Given by the user; null is a blank to fill in. */
  readonly date: string | null;
  readonly revision: string | null;
  readonly program: string;
  /** Said at the head. */
  readonly cautions: readonly string[];
  /** Said on every page. */
  readonly footer: readonly string[];
  readonly sections: readonly Section[];
}

export const text = (words: string): Block => ({ kind: "text", text: words });
export const list = (items: readonly string[]): Block => ({ kind: "list", items });
