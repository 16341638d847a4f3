// One row of the benches: what, the figure, what was promised of it; and how it is printed and judged. One shape for every group.

export interface Promised {
  readonly limit: number;
  readonly good: "at least" | "at most";
}

export interface BenchRow {
  readonly what: string;
  /** A ratio within one run unless `unit` says otherwise. */
  readonly value: number;
  readonly unit?: string;
  /** null: nothing was promised; the row is there for scale. */
  readonly promise: Promised | null;
}

export const atMost = (limit: number): Promised => ({ limit, good: "at most" });
export const atLeast = (limit: number): Promised => ({ limit, good: "at least" });

export type Kept = "kept" | "NOT KEPT" | "for scale";

/** A figure that is none keeps no promise. */
export function keptOf({ value, promise }: BenchRow): Kept {
  if (promise === null) return "for scale";
  return (promise.good === "at least" ? value >= promise.limit : value <= promise.limit) ? "kept" : "NOT KEPT";
}

/** Three figures; whole numbers as they are. */
const figure = (value: number): string => {
  if (Number.isInteger(value) || !Number.isFinite(value)) return String(value);
  const digits = Number(value.toPrecision(3));
  return Math.abs(digits) >= 1e-3 && Math.abs(digits) < 1e7 ? String(digits) : digits.toExponential();
};

export const TABLE_HEAD = "| group | what | measured | promised | |\n| --- | --- | ---: | --- | --- |";

export function tableLine(group: string, row: BenchRow): string {
  const { what, value, unit, promise } = row;
  const behind = unit === undefined ? "" : ` ${unit}`;
  const words = promise === null ? "" : `${promise.good} ${promise.limit}${behind}`;
  return `| ${group} | ${what} | ${figure(value)}${behind} | ${words} | ${keptOf(row)} |`;
}
