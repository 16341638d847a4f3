// Gives the rows to ink: one Text a row in one Box. The only file that knows ink and React.
import { Box, render, Text } from "ink";
import { createElement, type ReactElement } from "react";
import type { PaintStream } from "../paint.ts";

/** An empty Text takes no row in ink's layout, so an empty row is one blank. */
const rowElement = (text: string, index: number): ReactElement =>
  createElement(Text, { key: index, wrap: "truncate" }, text === "" ? " " : text);

const frame = (rows: readonly string[], columns: number): ReactElement =>
  createElement(Box, { flexDirection: "column", width: columns }, ...[rows.map(rowElement)]);

export interface Mounted {
  readonly show: (rows: readonly string[]) => void;
  readonly unmount: () => void;
}

/** Draws by way of ink onto a paint stream, which keeps ink from ever writing to the terminal itself. */
export function mount(paint: PaintStream, stdin: NodeJS.ReadStream, rows: readonly string[]): Mounted {
  const instance = render(frame(rows, paint.columns), {
    stdout: paint as unknown as NodeJS.WriteStream,
    stdin,
    debug: true,
    patchConsole: false,
    exitOnCtrlC: false,
  });
  return {
    show: (next) => instance.rerender(frame(next, paint.columns)),
    unmount: () => instance.unmount(),
  };
}
