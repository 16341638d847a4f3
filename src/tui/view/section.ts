// Sections of a screen that looks closer at one bank: headings, what stands in while one is worked out, and the cautions at the end.
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import { paragraph } from "./words.ts";

/** From here on two columns. */
export const TWO_COLUMNS = 140;

export const heading = (text: string): Row => rowOf(span(text, "strong"));

/** What a section says until its piece is worked out. */
export const working = (columns: number): readonly Row[] => paragraph("Working it out ...", columns, "quiet");

/** Sections with an empty row between two. */
export const sections = (...parts: readonly (readonly Row[])[]): readonly Row[] =>
  parts.filter((part) => part.length > 0).flatMap((part, index) => (index === 0 ? part : [EMPTY_ROW, ...part]));

export const cautionRows = (cautions: readonly string[], columns: number): readonly Row[] => [
  heading("Cautions"),
  ...cautions.flatMap((text) => paragraph(`- ${text}`, columns, "caution")),
];
