/** @jsxImportSource preact */
// Words of a drawing as markup: what looks alike stands in one group, so that each text carries its place and nothing else.

import { visible } from "../../order/index.ts";
import { at, LINE_HEIGHT, SIZES } from "./drawing.tsx";
import type { Said } from "./ink.ts";
import { fitted } from "./textWidth.ts";

interface Row {
  readonly x: number;
  readonly y: number;
  readonly row: string;
}

/** What does not fit its room is broken into lines, then cut where the cut is seen. */
function rowsOf({ x, y, text, size = SIZES.plain, room, lines = 1 }: Said): readonly Row[] {
  const shown = visible(text);
  const rows = room === undefined ? [shown] : fitted(shown, { size, room, lines });
  return rows.map((row, index) => ({ x: at(x), y: at(y + index * size * LINE_HEIGHT), row }));
}

const styleOf = ({ size = SIZES.plain, bold = false, anchor = "start" }: Said): string => `${size} ${bold} ${anchor}`;

/** Every text, in groups of one look. */
export function AllWords({ words }: { readonly words: readonly Said[] }) {
  if (words.length === 0) return null;
  const styles = [...new Set(words.map(styleOf))];
  return (
    <g fill="#000" stroke="none">
      {styles.map((style) => {
        const alike = words.filter((said) => styleOf(said) === style);
        const { size, bold, anchor } = alike[0]!;
        return (
          <g
            key={style}
            font-size={size === SIZES.plain ? undefined : size}
            font-weight={bold ? "bold" : undefined}
            text-anchor={anchor === "start" ? undefined : anchor}
          >
            {alike.flatMap(rowsOf).map(({ x, y, row }) => (
              <text key={`${x} ${y} ${row}`} x={x} y={y}>
                {row}
              </text>
            ))}
          </g>
        );
      })}
    </g>
  );
}
