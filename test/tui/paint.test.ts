// The painter: after any run of frames the terminal shows what a full repaint would.

import { describe, expect, test } from "vitest";
import { PaintStream } from "../../src/tui/paint.ts";
import { ENTER } from "../../src/tui/session.ts";
import fc from "../support/property.ts";
import { Screen } from "../support/screen.ts";

function open(columns: number, rows: number) {
  const screen = new Screen(columns, rows);
  screen.feed(ENTER);
  const paint = new PaintStream({ columns, rows }, (text) => screen.feed(text));
  return { screen, paint };
}

describe("paint(rows)", () => {
  test("the first frame clears, the same frame again writes nothing", async () => {
    const { screen, paint } = open(20, 3);
    paint.write("one\ntwo");
    await screen.settle();
    expect(screen.lines()).toEqual(["one", "two", ""]);
    const before = screen.written.length;
    paint.write("one\ntwo");
    paint.write("one\ntwo\n");
    expect(screen.written.length).toBe(before);
  });

  test("one changed digit costs a jump, the digit and the two marks of a synchronised update", () => {
    const { screen, paint } = open(80, 24);
    paint.write("Energy 2400 J");
    const before = screen.written.length;
    paint.write("Energy 2500 J");
    expect(screen.written.slice(before)).toBe("\x1b[?2026h\x1b[1;9H5\x1b[?2026l");
  });

  test("a row that gets shorter is erased to its end, a full one keeps its last cell", async () => {
    const { screen, paint } = open(6, 2);
    paint.write("abcdef\nabcdef");
    paint.write("ab\nABCDEF");
    await screen.settle();
    expect(screen.lines()).toEqual(["ab", "ABCDEF"]);
  });

  test("rows past the bottom are not written, and the bottom right cell does not scroll", async () => {
    const { screen, paint } = open(4, 2);
    paint.write("aaaa\nbbbb\ncccc");
    await screen.settle();
    expect(screen.lines()).toEqual(["aaaa", "bbbb"]);
  });

  test("forget() draws all again over whatever stands there", async () => {
    const { screen, paint } = open(10, 2);
    paint.write("one\ntwo");
    screen.feed("\x1b[1;1Hrubbish\x1b[2;4Hmore");
    paint.forget();
    paint.write("one\ntwo");
    await screen.settle();
    expect(screen.lines()).toEqual(["one", "two"]);
  });

  test("resize(size) repaints all at the new size", async () => {
    const { screen, paint } = open(10, 2);
    paint.write("0123456789\nx");
    screen.term.resize(5, 3);
    paint.resize({ columns: 5, rows: 3 });
    paint.write("01234\nx\ny");
    await screen.settle();
    expect(screen.lines()).toEqual(["01234", "x", "y"]);
  });

  test("redraw() draws the last frame again without ink, settle() only the caret", async () => {
    const { screen, paint } = open(10, 2);
    paint.settle();
    paint.write("one\ntwo");
    screen.feed("\x1b[1;1Hrubbish");
    paint.redraw();
    await screen.settle();
    expect(screen.lines()).toEqual(["one", "two"]);
    const before = screen.written.length;
    paint.settle();
    paint.caret = { row: 0, column: 2 };
    paint.settle();
    paint.settle();
    expect(screen.written.slice(before)).toBe("\x1b[1;3H\x1b[?25h");
  });

  test("close() ends all writing", () => {
    const { screen, paint } = open(10, 2);
    paint.close();
    const before = screen.written;
    paint.write("late");
    expect(screen.written).toBe(before);
  });

  test("the caret is placed and shown, moved, then hidden", async () => {
    const { screen, paint } = open(10, 2);
    paint.caret = { row: 1, column: 3 };
    paint.write("a\nb");
    await screen.settle();
    expect([screen.term.buffer.active.cursorX, screen.term.buffer.active.cursorY]).toEqual([3, 1]);
    expect(screen.written.endsWith("\x1b[2;4H\x1b[?25h\x1b[?2026l")).toBe(true);
    paint.write("A\nb");
    await screen.settle();
    expect([screen.term.buffer.active.cursorX, screen.term.buffer.active.cursorY]).toEqual([3, 1]);
    paint.caret = null;
    paint.write("A\nb");
    expect(screen.written.endsWith("\x1b[?2026h\x1b[?25l\x1b[?2026l")).toBe(true);
  });
});

describe("random frames", () => {
  const piece = fc.oneof(
    fc.constantFrom(" ", "  ", "a", "bc", "漢", "字字", "·", "⣿", "        "),
    fc.constantFrom("\x1b[1m", "\x1b[22m", "\x1b[7m", "\x1b[27m", "\x1b[31m", "\x1b[39m", "\x1b[0m", "\x1b[38;5;12m"),
  );
  const row = fc.array(piece, { maxLength: 14 }).map((parts) => parts.join(""));
  const frame = fc.array(row, { maxLength: 6 });

  test("every cell equals a full repaint, wide characters and styles included", async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(frame, { minLength: 2, maxLength: 6 }), async (frames) => {
        const { screen, paint } = open(17, 5);
        for (const rows of frames) {
          paint.write(rows.join("\n"));
          await screen.settle();
          const fresh = open(17, 5);
          fresh.paint.write(rows.join("\n"));
          await fresh.screen.settle();
          expect(screen.dump()).toEqual(fresh.screen.dump());
        }
      }),
      { numRuns: 120, seed: 11 },
    );
  }, 20_000);

  test("a full repaint itself equals the rows written plainly one by one", async () => {
    await fc.assert(
      fc.asyncProperty(frame, async (rows) => {
        const { screen, paint } = open(40, 6);
        paint.write(rows.join("\n"));
        await screen.settle();
        const plain = new Screen(40, 6);
        plain.feed("\x1b[?7l");
        rows.forEach((text, y) => {
          plain.feed(`\x1b[${y + 1};1H${text}\x1b[0m`);
        });
        await plain.settle();
        expect(screen.dump()).toEqual(plain.dump());
      }),
      { numRuns: 120, seed: 12 },
    );
  }, 20_000);
});
