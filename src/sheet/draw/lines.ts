// Sentences under a drawing, broken to its width.

import { LINE_HEIGHT, PAGE, SIZES } from "./drawing.tsx";
import type { Ink } from "./ink.ts";
import { fitted } from "./textWidth.ts";

const MARGIN = 8;
const STEP = SIZES.plain * LINE_HEIGHT;
/** A sentence longer than this is cut: the words of a user have no bound. */
const MOST_LINES = 4;

export interface LinesInk {
  readonly ink: Ink;
  /** Down to the end of the last line. */
  readonly bottom: number;
}

/** The sentences from a height on, each on lines of its own, `indent` to the right of the margin. */
export function linesInk(sentences: readonly string[], top: number, indent = 0): LinesInk {
  const rows = sentences.flatMap((text) =>
    fitted(text, { size: SIZES.plain, room: PAGE.width - 2 * MARGIN - indent, lines: MOST_LINES }),
  );
  const words = rows.map((text, index) => ({ x: MARGIN + indent, y: top + SIZES.plain + index * STEP, text }));
  return { ink: { words }, bottom: top + SIZES.plain + rows.length * STEP };
}
