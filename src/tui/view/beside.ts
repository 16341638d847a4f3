// Sets two columns of rows side by side where there is room, a rule between them.
import { type Row, type Span, span } from "../row.ts";
import type { State } from "../state.ts";
import { drawnText, fitText } from "../text.ts";
import { textWidth } from "../width.ts";

/** What the rule between two columns takes. */
export const RULE = 3;

/** Two rows side by side, the left one cut or filled to its width. */
export function besideRow(left: Row, right: Row, width: number, { look }: Pick<State, "look">): Row {
  const spans: Span[] = [];
  let used = 0;
  for (const piece of left.left) {
    const text = drawnText(piece.text, look.ascii);
    const cut = fitText(text, Math.min(textWidth(text), width - used), "left", look.ascii ? "~" : "…");
    spans.push({ text: cut, style: piece.style });
    used += textWidth(cut);
  }
  spans.push(span(" ".repeat(Math.max(0, width - used))), span(" │ ", "quiet"));
  return { left: [...spans, ...right.left] };
}

/** Two columns, the shorter one filled with empty rows. */
export const sideBySide = (
  left: readonly Row[],
  right: readonly Row[],
  width: number,
  state: Pick<State, "look">,
): readonly Row[] =>
  Array.from({ length: Math.max(left.length, right.length) }, (_, i) =>
    besideRow(left[i] ?? { left: [] }, right[i] ?? { left: [] }, width, state),
  );
