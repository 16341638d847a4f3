// Draws a bank face: a row a stage or string, a mark a unit by its capacitance within the lot, and how far the row is off even.
import { drawBar } from "../bar.ts";
import { type Row, rowOf, span } from "../row.ts";

/** The bank as it stands. Serials that the lot lacks, and places still empty, have no capacitance. */
export interface Face {
  readonly groups: readonly (readonly string[])[];
  /** Places in a row. */
  readonly size: number;
  readonly ties: "cross-tied" | "strings";
  /** F by serial. */
  readonly capacitances: ReadonlyMap<string, number>;
}

export interface FaceRoom {
  readonly columns: number;
  readonly ascii: boolean;
}

const MARKS = ["▁", "▂", "▃", "▄", "▅", "▆", "▇", "█"] as const;
const ASCII_MARKS = ["1", "2", "3", "4", "5", "6", "7", "8"] as const;
const OFF_WIDTH = 11;
const LABEL_WIDTH = 4;

/** What a row is off: a stage's capacitance over the mean of the stages, a string's worst unit over the even share; null when a place is empty. */
export function offEven({ groups, size, ties, capacitances }: Face): readonly (number | null)[] {
  const rows = groups.map((group) => group.flatMap((serial) => capacitances.get(serial) ?? []));
  const full = rows.map((row) => row.length === size);
  if (ties === "strings") {
    return rows.map((row, g) => {
      if (!full[g]) return null;
      const inverse = row.map((c) => 1 / c);
      return (size * Math.max(...inverse)) / inverse.reduce((sum, x) => sum + x, 0) - 1;
    });
  }
  const sums = rows.map((row) => row.reduce((sum, c) => sum + c, 0));
  const whole = sums.filter((_, g) => full[g]);
  const mean = whole.reduce((sum, c) => sum + c, 0) / whole.length;
  return sums.map((sum, g) => (full[g] ? sum / mean - 1 : null));
}

/** A relative value in per cent, or in parts per million where per cent would read 0. */
export function offWords(off: number | null): string {
  if (off === null) return "";
  const sign = off < 0 ? "-" : "+";
  const size = Math.abs(off);
  if (size >= 1e-3) return `${sign}${(size * 100).toFixed(2)} %`;
  return `${sign}${(size * 1e6).toFixed(size >= 1e-5 ? 0 : 2)} ppm`;
}

/** The mark of each unit of a row; what there is no room for is counted. */
function marks(serials: readonly string[], face: Face, { columns, ascii }: FaceRoom): string {
  const all = [...face.capacitances.values()];
  const [low, high] = [Math.min(...all), Math.max(...all)];
  const table = ascii ? ASCII_MARKS : MARKS;
  const one = (serial: string | undefined): string => {
    const value = serial === undefined ? undefined : face.capacitances.get(serial);
    if (value === undefined) return ascii ? "." : "·";
    const level = high > low ? Math.round(((value - low) / (high - low)) * (table.length - 1)) : 3;
    return table[level] as string;
  };
  const drawn = Array.from({ length: face.size }, (_, k) => one(serials[k]));
  if (drawn.length <= columns) return drawn.join("");
  const more = ` and ${drawn.length - Math.max(1, columns - 9)}`;
  return drawn.slice(0, Math.max(1, columns - 9)).join("") + more;
}

/** A row for each stage or string. */
export function faceRows(face: Face, room: FaceRoom): readonly Row[] {
  const off = offEven(face);
  const columns = Math.max(1, room.columns - LABEL_WIDTH - OFF_WIDTH);
  return face.groups.map((group, g) => {
    const words = offWords(off[g] ?? null);
    return rowOf(
      span(`${String(g + 1).padStart(LABEL_WIDTH - 1)} `, "quiet"),
      span(marks(group, face, { ...room, columns })),
      span(words.padStart(OFF_WIDTH)),
    );
  });
}

/** Decades of the scale that gaps are drawn on: from 0.01 ppm to the whole. */
const DECADES = 8;
const onScale = (gap: number): number => Math.max(0, Math.log10(Math.max(gap, 1e-300)) + DECADES);

/** A gap on a scale of decades, with the floor of the meter as the mark. */
export const gapBar = (gap: number, floor: number, { columns, ascii }: FaceRoom): string =>
  drawBar(onScale(gap), { columns, full: DECADES, limit: floor > 0 ? onScale(floor) : null, ascii });
