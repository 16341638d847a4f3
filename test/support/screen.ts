// A terminal without a window: what is written to it becomes a grid of cells to assert on.
import xterm from "@xterm/headless";

export interface ScreenCell {
  readonly text: string;
  readonly width: number;
  readonly bold: boolean;
  readonly inverse: boolean;
  /** Foreground colour number, -1 for the default. */
  readonly colour: number;
}

export class Screen {
  readonly term: InstanceType<typeof xterm.Terminal>;
  /** Everything written, for counting bytes and seeking sequences. */
  written = "";
  #busy: Promise<void> = Promise.resolve();

  constructor(columns: number, rows: number) {
    this.term = new xterm.Terminal({ cols: columns, rows, allowProposedApi: true, scrollback: 200 });
  }

  feed(text: string): void {
    this.written += text;
    this.#busy = new Promise((done) => this.term.write(text, done));
  }

  async settle(): Promise<void> {
    await this.#busy;
  }

  line(y: number): string {
    const buffer = this.term.buffer.active;
    // The limit matters: cells past the edge are kept after a shrink.
    return buffer.getLine(buffer.viewportY + y)?.translateToString(true, 0, this.term.cols) ?? "";
  }

  lines(): readonly string[] {
    return Array.from({ length: this.term.rows }, (_, y) => this.line(y));
  }

  text(): string {
    return this.lines().join("\n");
  }

  cell(x: number, y: number): ScreenCell {
    const buffer = this.term.buffer.active;
    const cell = buffer.getLine(buffer.viewportY + y)?.getCell(x);
    return {
      text: cell?.getChars() || " ",
      width: cell?.getWidth() ?? 1,
      bold: !!cell?.isBold(),
      inverse: !!cell?.isInverse(),
      colour: cell?.isFgDefault() ? -1 : (cell?.getFgColor() ?? -1),
    };
  }

  /** Every cell as it looks, for comparing two screens whole: bold and colour of a blank that is not inverse cannot be seen. */
  dump(): readonly string[] {
    return Array.from({ length: this.term.rows }, (_, y) =>
      Array.from({ length: this.term.cols }, (_, x) => {
        const c = this.cell(x, y);
        if (c.text === " " && !c.inverse) return " ";
        return c.width === 0
          ? ""
          : `${c.text}${c.bold ? "!" : ""}${c.inverse ? "~" : ""}${c.colour < 0 ? "" : c.colour}`;
      }).join(","),
    );
  }

  get isAlternate(): boolean {
    return this.term.buffer.active.type === "alternate";
  }

  /** Waits until the text of the screen satisfies `seen`; fails with the whole screen. */
  async until(seen: (text: string) => boolean, milliseconds = 3000): Promise<void> {
    const end = Date.now() + milliseconds;
    for (;;) {
      await this.settle();
      if (seen(this.text())) return;
      if (Date.now() > end) throw new Error(`not seen within ${milliseconds} ms; the screen was:\n${this.text()}`);
      await new Promise((again) => setTimeout(again, 5));
    }
  }
}
