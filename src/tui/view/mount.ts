// Gives the rows to ink: one Text a row in one Box. The only file that knows ink and React.
import { Box, render, Text } from "ink";
import { createElement, type ReactElement } from "react";
import type { PaintStream, StyledRow } from "../paint.ts";

/** An empty Text takes no row in ink's layout, so an empty row is one blank. */
const rowElement = ({ plain }: StyledRow, index: number): ReactElement =>
  createElement(Text, { key: index, wrap: "truncate" }, plain === "" ? " " : plain);

const frame = (rows: readonly StyledRow[], columns: number): ReactElement =>
  createElement(Box, { flexDirection: "column", width: columns }, ...[rows.map(rowElement)]);

const STYLES = /\x1b\[[\d;]*m/g;

const styledRow = (text: string): StyledRow => ({
  plain: text.includes("\x1b") ? text.replace(STYLES, "") : text,
  text,
});

export interface Mounted {
  readonly show: (rows: readonly string[]) => void;
  readonly unmount: () => void;
}

/** Draws by way of ink onto a paint stream, which keeps ink from ever writing to the terminal itself. */
export function mount(paint: PaintStream, stdin: NodeJS.ReadStream, rows: readonly string[]): Mounted {
  const laid = (given: readonly string[]): ReactElement => {
    paint.styled = given.map(styledRow);
    return frame(paint.styled, paint.columns);
  };
  const instance = render(laid(rows), {
    stdout: paint as unknown as NodeJS.WriteStream,
    stdin,
    debug: true,
    patchConsole: false,
    exitOnCtrlC: false,
  });
  /** What ink finds nothing new in may still have other styles. */
  const show = (next: readonly string[]): void => {
    const before = paint.styled;
    instance.rerender(laid(next));
    const plainChanged =
      paint.styled.length !== before.length || paint.styled.some(({ plain }, i) => plain !== before[i]?.plain);
    if (!plainChanged) paint.paint(next);
  };
  return { show, unmount: () => instance.unmount() };
}
