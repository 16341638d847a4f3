/** @jsxImportSource preact */
// Ink as markup: one path for all wires of a kind, one for each symbol.

import { at, LINE_HEIGHT, SIZES, Words } from "./drawing.tsx";
import { type Ink, type Line, type Plate, type Spot, together } from "./ink.ts";
import { symbolPath } from "./symbols.ts";
import { fitted, textWidth } from "./textWidth.ts";

function lineText({ x, y, toX, toY }: Line): string {
  if (toY === y) return `M${at(x)} ${at(y)}H${at(toX)}`;
  return toX === x ? `M${at(x)} ${at(y)}V${at(toY)}` : `M${at(x)} ${at(y)}L${at(toX)} ${at(toY)}`;
}

interface StrokesProps {
  readonly lines: readonly Line[];
  readonly width?: number;
  readonly dash?: string;
}

function Strokes({ lines, width, dash }: StrokesProps) {
  return lines.length === 0 ? null : (
    <path d={lines.map(lineText).join("")} stroke-width={width} stroke-dasharray={dash} />
  );
}

function Joints({ spots }: { readonly spots: readonly Spot[] }) {
  const d = spots.map(({ x, y }) => `M${at(x)} ${at(y)}h0`).join("");
  return d === "" ? null : <path d={d} stroke-width="2.6" stroke-linecap="round" />;
}

const PLATE_LINES = 6;

function PlateWords({ x, y, text, room }: Plate) {
  const size = SIZES.small;
  const rows = fitted(text, { size, room, lines: PLATE_LINES });
  const width = Math.max(...rows.map((row) => textWidth(row, size))) + 3;
  const height = rows.length * size * LINE_HEIGHT + 2;
  return (
    <>
      <path
        d={`M${at(x - width / 2)} ${at(y - height / 2)}h${at(width)}v${at(height)}h${at(-width)}Z`}
        fill="#fff"
        stroke="none"
      />
      <Words
        x={x}
        y={y - height / 2 + size + 1}
        text={text}
        anchor="middle"
        size={size}
        room={room}
        lines={PLATE_LINES}
      />
    </>
  );
}

export function Inked({ inks }: { readonly inks: readonly Ink[] }) {
  const { wires, dashes, rails, joints, points, marks, words, plates } = together(inks);
  return (
    <>
      <Strokes lines={wires} />
      <Strokes lines={dashes} dash="2 2" />
      <Strokes lines={rails} width={1.6} />
      <Joints spots={joints} />
      {marks.map(({ role, name, ...stand }) => (
        <path key={`${role} ${stand.x} ${stand.y}`} class={role} d={symbolPath(name, stand)} />
      ))}
      {points.map(({ x, y }) => (
        <circle key={`${x} ${y}`} class="point" cx={at(x)} cy={at(y)} r="1.8" fill="#fff" />
      ))}
      {plates.map((plate) => (
        <PlateWords key={`${plate.x} ${plate.y}`} {...plate} />
      ))}
      {words.map((said) => (
        <Words key={`${said.x} ${said.y}`} {...said} />
      ))}
    </>
  );
}
