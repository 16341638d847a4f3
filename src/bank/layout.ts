// An arrangement of equal units as plain data, and its name.

export type Ties = "cross-tied" | "strings";

/** `series` stages (or units a string) and `parallel` units a stage (or strings). Whole numbers from 1. */
export interface Layout {
  readonly part: string;
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
}

export const unitCount = (layout: Pick<Layout, "series" | "parallel">): number => layout.series * layout.parallel;

/** With one in series or one in parallel both ties are the same bank; it is called `strings`. */
export const plainTies = (layout: Layout): Layout =>
  layout.series === 1 || layout.parallel === 1 ? { ...layout, ties: "strings" } : layout;

/** Short name of the shape: `6s10p`. */
export const shapeOf = (layout: Pick<Layout, "series" | "parallel">): string => `${layout.series}s${layout.parallel}p`;

/** The layout's name, unique within a plan: `part 6s10p cross-tied`. */
export const layoutId = (layout: Layout): string => `${layout.part} ${shapeOf(layout)} ${layout.ties}`;
