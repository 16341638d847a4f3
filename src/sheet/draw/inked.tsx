/** @jsxImportSource preact */
// Ink as markup: one path for all wires of a kind, one for each symbol.

import { at, LINE_HEIGHT, SIZES } from "./drawing.tsx";
import { type Ink, type Line, type Mark, type Plate, type Said, type Spot, together } from "./ink.ts";
import { symbolPath } from "./symbols.ts";
import { fitted, textWidth } from "./textWidth.ts";
import { AllWords } from "./words.tsx";

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

/** Measuring points, as one path. */
function Rings({ spots }: { readonly spots: readonly Spot[] }) {
  const d = spots.map(({ x, y }) => `M${at(x - 1.8)} ${at(y)}a1.8 1.8 0 1 1 0 .1z`).join("");
  return d === "" ? null : <path class="points" d={d} fill="#fff" />;
}

/** Signs of polarity are part of their symbol: all in one path, counted by nobody. */
const isCounted = ({ role }: Mark): boolean => role !== "plus";
const pathOf = ({ name, ...stand }: Mark): string => symbolPath(name, stand);

const PLATE_LINES = 6;

/** The white ground of a plate, and its words. */
function plateParts({ x, y, text, room }: Plate): { readonly ground: string; readonly said: Said } {
  const size = SIZES.small;
  const rows = fitted(text, { size, room, lines: PLATE_LINES });
  const width = Math.max(...rows.map((row) => textWidth(row, size))) + 3;
  const height = rows.length * size * LINE_HEIGHT + 2;
  return {
    ground: `M${at(x - width / 2)} ${at(y - height / 2)}h${at(width)}v${at(height)}h${at(-width)}Z`,
    said: { x, y: y - height / 2 + size + 1, text, anchor: "middle", size, room, lines: PLATE_LINES },
  };
}

export function Inked({ inks }: { readonly inks: readonly Ink[] }) {
  const { wires, dashes, rails, joints, points, sticks, boxes, curves, marks, words, plates } = together(inks);
  const signs = marks.filter((mark) => !isCounted(mark));
  const plated = plates.map(plateParts);
  return (
    <>
      <Strokes lines={wires} />
      <Strokes lines={dashes} dash="2 2" />
      <Strokes lines={rails} width={1.6} />
      <Joints spots={joints} />
      {curves
        .filter(({ d }) => d !== "")
        .map(({ role, d, dash, width }) => (
          <path key={d} class={role} d={d} stroke-dasharray={dash} stroke-width={width} />
        ))}
      {marks.filter(isCounted).map(({ role, name, ...stand }) => (
        <path key={`${role} ${stand.x} ${stand.y}`} class={role} d={symbolPath(name, stand)} />
      ))}
      {boxes.map(({ role, x, y, width, height }) => (
        <path key={`${x} ${y}`} class={role} d={`M${at(x)} ${at(y)}h${at(width)}v${at(height)}h${at(-width)}Z`} />
      ))}
      {sticks.map(({ x, y }) => (
        <circle key={`${x} ${y}`} class="stick" cx={at(x)} cy={at(y)} r="3.2" fill="#fff" />
      ))}
      <Joints spots={sticks} />
      {signs.length > 0 && <path d={signs.map(pathOf).join("")} />}
      <Rings spots={points} />
      {plated.length > 0 && <path d={plated.map(({ ground }) => ground).join("")} fill="#fff" stroke="none" />}
      <AllWords words={[...words, ...plated.map(({ said }) => said)]} />
    </>
  );
}
