// One label as ink: position, serial, rating, polarity, potential, and the warning that goes with every charged part.
//
// The warning sign is a triangle with a flash, as signs for electrical danger have it; our own drawing, common practice, no source.

import { SIZES } from "./drawing.tsx";
import type { Curve, Ink, Said, Spot } from "./ink.ts";
import { LABEL_SIZE, type Label } from "./label.ts";
import { BLANK, shownOrBlank } from "./valueWords.ts";

const TITLE = 11;
const END = 12;
/** Right of the words: the signs of polarity. */
const ENDS_ROOM = 18;
const INSIDE = 6;

export const WARNING = ["Danger: stored charge.", "Measure, discharge, short."] as const;

const TITLES = { unit: "Unit", stage: "Stage", string: "String", spare: "Spare" } as const;

/** "Unit 3.7"; the position of a spare is its number. */
export const labelTitle = ({ kind, position }: Pick<Label, "kind" | "position">): string =>
  `${TITLES[kind]} ${position ?? "____"}`;

/** "470 µF, 450 V", with the polarity where it is not known. */
export function ratingWords({
  capacitance,
  voltage,
  polarised,
}: Pick<Label, "capacitance" | "voltage" | "polarised">): string {
  const asked = polarised === null ? `, polarity ${BLANK}` : "";
  return `${shownOrBlank(capacitance, "capacitance")}, ${shownOrBlank(voltage, "voltage", { digits: 4, rounding: "down" })}${asked}`;
}

function signs({ x, y }: Spot): readonly Curve[] {
  const flash = `M${x + 9} ${y + 4.5}l-2.5 4.5h3.4l-2.6 4.5`;
  return [
    { role: "warning", d: `M${x + 8.5} ${y}L${x + 17} ${y + 15}H${x}Z`, width: 1.2 },
    { role: "flash", d: flash, width: 1 },
  ];
}

/** A label whose upper left corner is at the spot; its frame is a line to cut along. */
export function labelInk(label: Label, { x, y }: Spot): Ink {
  const { width, height } = LABEL_SIZE;
  const left = x + INSIDE;
  const room = width - INSIDE - ENDS_ROOM;
  const right = x + width - INSIDE;
  const small = { size: SIZES.small } as const;
  const { serial } = label;
  const words: Said[] = [
    {
      x: left,
      y: y + 14,
      text: labelTitle(label),
      size: TITLE,
      bold: true,
      room: label.toEarth === undefined ? room : 76,
    },
    { x: left, y: y + 43, text: ratingWords(label), room, ...small },
    { x: left, y: y + 51, text: label.part, room: room - 2, ...small },
  ];
  if (label.toEarth !== undefined) {
    const volts = label.toEarth === null ? null : Math.abs(label.toEarth);
    const text = `to earth ${shownOrBlank(volts, "voltage", { digits: 3, rounding: "up" })}`;
    words.push({ x: right - 10, y: y + 13, text, anchor: "end", ...small });
  }
  if (serial !== undefined && serial !== null)
    words.push({ x: left, y: y + 25, text: `No. ${serial}`, room, lines: 2, ...small });
  if (serial === null) words.push({ x: left, y: y + 28, text: "No.", ...small });
  if (label.polarised === true) {
    words.push(
      { x: right, y: y + 15, text: "+", anchor: "end", size: END, bold: true },
      { x: right, y: y + height - 6, text: "−", anchor: "end", size: END, bold: true },
    );
  }
  const foot = y + height - 17.5;
  return {
    boxes: [{ role: "label", x, y, width, height }],
    wires: serial === null ? [{ x: left + 16, y: y + 29, toX: left + room, toY: y + 29 }] : [],
    curves: signs({ x: left, y: foot }),
    words: [
      ...words,
      { x: left + 23, y: foot + 6, text: WARNING[0], bold: true, ...small },
      { x: left + 23, y: foot + 14.5, text: WARNING[1], room: width - 48, ...small },
    ],
  };
}
