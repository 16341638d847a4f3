// The figures of the screen of measured units: gaps against the floor, what is proven, the bank face before and after.
import { formatQuantity } from "../../quantity/index.ts";
import type { LayoutResult } from "../../search/index.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { type Face, type FaceRoom, faceRows, gapBar, offWords } from "../units/face.ts";
import type { Placed } from "../units/state.ts";
import { RULE, sideBySide } from "./beside.ts";
import { paragraph } from "./words.ts";

/** What is drawn in: the look of the screen. */
type Look = Pick<State, "look">;

/** How sure the placing is, and what it cannot tell. */
export function proofRows({ placing, stopped }: Placed, bank: LayoutResult, columns: number): readonly Row[] {
  const { charging, holding, floor } = placing;
  const proof =
    charging.proof === "optimal"
      ? "proven optimal"
      : `within ${offWords(charging.certified).slice(1)} of the best possible, by the bound of ${charging.boundKind}`;
  const hold =
    holding === null
      ? "Holding is not assessed: leakage was not measured on every unit."
      : `Holding ${offWords(holding.gap)} over even, by leakage.`;
  const { findings } = placing;
  const volts = formatQuantity(charging.worst * bank.share.even * bank.series, "voltage", { digits: placing.digits });
  const given =
    charging.gap > charging.attained * (1 + 1e-9)
      ? ` Charging alone could come to ${offWords(charging.attained).slice(1)}; the rest was given up, within what the meter can tell, for holding.`
      : "";
  return [
    ...paragraph(
      `Worst while charging ${volts}, ${offWords(charging.gap)} over even, ${proof}; the meter tells nothing below ${offWords(floor).slice(1)}.${given} ${hold}`,
      columns,
    ),
    ...(stopped ? paragraph("Stopped before its end: more may be had.", columns, "warn") : []),
    ...findings
      .filter(({ verdict }) => verdict === "warn" || verdict === "fail")
      .flatMap(({ note, verdict }) => paragraph(`${verdict}: ${note}`, columns, verdict === "fail" ? "bad" : "warn")),
  ];
}

/** A gap drawn on decades; the mark is the floor. */
export const gapRow = (name: string, gap: number, floor: number, room: FaceRoom): Row =>
  rowOf(
    span(name.padEnd(11), "quiet"),
    span(gapBar(gap, floor, { ...room, columns: Math.max(8, Math.min(48, room.columns - 24)) })),
    span(offWords(gap).slice(1).padStart(12)),
  );

/** Before and after side by side where there is room, else one below the other, the later first. */
export function faces(
  before: Face,
  after: Face,
  { columns, look, done }: Look & { readonly columns: number; readonly done: boolean },
): readonly Row[] {
  const titled = (name: string, face: Face, width: number): readonly Row[] => [
    rowOf(span(name, "strong")),
    ...faceRows(face, { columns: width, ascii: look.ascii }),
  ];
  const name = done ? "Placed" : "So far";
  const half = Math.floor((columns - RULE) / 2);
  if (after.size + 15 <= half)
    return sideBySide(titled("As listed", before, half), titled(name, after, half), half, { look });
  return [...titled(name, after, columns), EMPTY_ROW, ...titled("As listed", before, columns)];
}
