// Speed of the screens: a key to its painted frame against the layout of as many plain rows by ink, bytes against changed cells, memory.
import { setImmediate as turn } from "node:timers/promises";
import { setFlagsFromString } from "node:v8";
import { runInNewContext } from "node:vm";
import { rowCells, sameCell } from "../../src/tui/cells.ts";
import { answerFor } from "../../src/tui/engine.ts";
import { PaintStream } from "../../src/tui/paint.ts";
import type { Message, State } from "../../src/tui/state.ts";
import { update } from "../../src/tui/update/update.ts";
import { drawScreen } from "../../src/tui/view/screen.ts";
import { engine, stateWith } from "../support/stock.ts";
import { atMost, type BenchRow } from "./row.ts";

const stdin = Object.assign(Object.create(process.stdin), { isTTY: false });

/** Ink as it ships: its development form keeps a record of every frame. Chosen when it is loaded, so it is loaded only now. */
async function load() {
  process.env.NODE_ENV = "production";
  const [{ Box, render, Text }, { createElement }, { mount }] = await Promise.all([
    import("ink"),
    import("react"),
    import("../../src/tui/view/mount.ts"),
  ]);
  return { Box, render, Text, createElement, mount };
}

type Loaded = Awaited<ReturnType<typeof load>>;

/** Ways to and fro on the list: what one does all day. */
const WALK: readonly Message[] = [
  { type: "move", by: 1 },
  { type: "move", by: 1 },
  { type: "move", by: 1 },
  { type: "move", by: -1 },
  { type: "move", by: "page" },
  { type: "move", by: "first" },
];

const planned = (columns: number, rows: number): State => {
  const state = stateWith({ screen: "layouts", columns, rows, look: { colour: true, ascii: false } });
  return { ...state, answer: answerFor(state, engine, true), answered: state.asked };
};

const least = (values: readonly number[]): number => Math.min(...values);

/** Milliseconds of a message to its painted frame; and bytes written over cells that changed. */
function ourFrames({ mount }: Loaded, columns: number, rows: number, turns: number) {
  let written = 0;
  const paint = new PaintStream({ columns, rows }, (text) => {
    written += Buffer.byteLength(text);
  });
  let state = planned(columns, rows);
  let shown = drawScreen(state).rows;
  const mounted = mount(paint, stdin, shown);
  const times: number[] = [];
  let bytes = 0;
  let cells = 0;
  for (let i = 0; i < turns; i += 1) {
    const message = WALK[i % WALK.length] as Message;
    const before = shown;
    written = 0;
    const begun = performance.now();
    state = update(state, message).state;
    const drawn = drawScreen(state);
    paint.caret = drawn.caret;
    mounted.show(drawn.rows);
    paint.settle();
    times.push(performance.now() - begun);
    shown = drawn.rows;
    bytes += written;
    for (let row = 0; row < rows; row += 1) {
      const [was, is] = [rowCells(before[row] ?? "", columns), rowCells(shown[row] ?? "", columns)];
      for (let column = 0; column < columns; column += 1) {
        const blank = { text: " ", style: "" };
        if (!sameCell(was[column] ?? blank, is[column] ?? blank)) cells += 1;
      }
    }
  }
  paint.close();
  mounted.unmount();
  return { times, perCell: bytes / Math.max(1, cells) };
}

/** Milliseconds of ink to lay out as many plain rows, as wide, all of them changed, as all change when a list scrolls. */
function inkFrames({ Box, render, Text, createElement }: Loaded, columns: number, rows: number, turns: number) {
  const paint = new PaintStream({ columns, rows }, () => {});
  const plain = "plain row of text ".repeat(20).slice(0, columns - 8);
  const frame = (turn: number) =>
    createElement(
      Box,
      { flexDirection: "column", width: columns },
      ...Array.from({ length: rows }, (_, row) =>
        createElement(Text, { key: row, wrap: "truncate" }, `${String(turn * rows + row).padStart(7)} ${plain}`),
      ),
    );
  const instance = render(frame(0), {
    stdout: paint as never,
    stdin,
    debug: true,
    patchConsole: false,
    exitOnCtrlC: false,
  });
  const times: number[] = [];
  for (let i = 0; i < turns; i += 1) {
    const begun = performance.now();
    instance.rerender(frame(i + 1));
    times.push(performance.now() - begun);
  }
  paint.close();
  instance.unmount();
  return times;
}

/** Heap after collection at the first and the last quarter of many frames, as a ratio. */
async function memory({ mount }: Loaded, frames: number): Promise<number> {
  setFlagsFromString("--expose-gc");
  const collect = runInNewContext("gc") as () => void;
  const paint = new PaintStream({ columns: 80, rows: 24 }, () => {});
  let state = planned(80, 24);
  const mounted = mount(paint, stdin, drawScreen(state).rows);
  const used: number[] = [];
  for (let i = 0; i < frames; i += 1) {
    state = update(state, WALK[i % WALK.length] as Message).state;
    mounted.show(drawScreen(state).rows);
    if (i % 500 === 0) await turn();
    if (i === frames >> 2 || i === frames - 1) {
      collect();
      used.push(process.memoryUsage().heapUsed);
    }
  }
  paint.close();
  mounted.unmount();
  return (used[1] as number) / (used[0] as number);
}

export async function benchTuiFrames(turns = 120, frames = 20_000): Promise<readonly BenchRow[]> {
  const loaded = await load();
  const rows: BenchRow[] = [];
  for (const [columns, height] of [
    [80, 24],
    [200, 50],
  ] as const) {
    const ours: number[] = [];
    const ink: number[] = [];
    let perCell = 0;
    // In turns, so that both meet the same machine.
    for (let round = 0; round < 4; round += 1) {
      const own = ourFrames(loaded, columns, height, turns >> 2);
      perCell = own.perCell;
      ours.push(...own.times);
      ink.push(...inkFrames(loaded, columns, height, turns >> 2));
    }
    const size = `${columns} by ${height}`;
    rows.push(
      {
        what: `key to painted frame over ink's plain rows, ${size}`,
        value: least(ours) / least(ink),
        promise: atMost(1.3),
      },
      { what: `bytes per changed cell, ${size}`, value: perCell, promise: atMost(2) },
    );
  }
  rows.push({
    what: `heap after ${frames} frames over that at a quarter of them`,
    value: await memory(loaded, frames),
    promise: atMost(1.1),
  });
  return rows;
}
