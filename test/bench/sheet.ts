// Speed of the paper: a sheet of a large bank with every chart against as many bytes of blanks through the same template engine.

import { type Sheet, sheetOf, sheetText, type Table } from "../../src/sheet/index.ts";
import { largeInput, placedIn } from "../support/sheet.ts";
import type { BenchRow } from "./row.ts";

function seconds(work: () => unknown): number {
  const start = performance.now();
  work();
  return (performance.now() - start) / 1e3;
}

/** The same page with nothing on it but rows of blanks: as many as make it as long. */
function blankSheet(sheet: Sheet, bytes: number): Sheet {
  const columns = Array.from({ length: 7 }, () => ({ heading: "blank" }));
  const row = columns.map(() => " ".repeat(8));
  const of = (count: number): Sheet => {
    const table: Table = {
      kind: "table",
      id: "blank",
      caption: "Blank",
      columns,
      rows: Array.from({ length: count }, () => row),
    };
    return { ...sheet, sections: [{ id: "blank", title: "Blank", blocks: [table] }] };
  };
  const [none, some] = [0, 1000].map((count) => sheetText(of(count), "html").length) as [number, number];
  return of(Math.ceil(((bytes - none) * 1000) / (some - none)));
}

/** All rows; takes some seconds. */
export function benchSheet(): readonly BenchRow[] {
  return (["cross-tied", "strings"] as const).flatMap((ties): readonly BenchRow[] => {
    const bare = largeInput(ties);
    const input = { ...bare, placed: placedIn(bare) };
    const whole = (): string => sheetText(sheetOf(input), "html");
    const bytes = whole().length;
    const blank = blankSheet(sheetOf(input), bytes);
    const blanks = (): string => sheetText(blank, "html");
    const times = { whole: Number.POSITIVE_INFINITY, blanks: Number.POSITIVE_INFINITY };
    for (let turn = 0; turn < 12; turn++) {
      times.whole = Math.min(times.whole, seconds(whole));
      times.blanks = Math.min(times.blanks, seconds(blanks));
    }
    return [
      {
        what: `sheet of 20s40p ${ties} with all charts, ${(bytes / 1e3).toFixed(0)} kB, against ${(blanks().length / 1e3).toFixed(0)} kB of blanks through the same engine, times as long`,
        value: times.whole / times.blanks,
        promise: { limit: 5, good: "at most" },
      },
      {
        what: `size of that sheet, MB`,
        value: bytes / 1e6,
        promise: { limit: 2, good: "at most" },
      },
    ];
  });
}
