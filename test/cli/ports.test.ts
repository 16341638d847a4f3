import { expect, test } from "vitest";
import { textWidth } from "../../src/cli/index.ts";

test("textWidth(terminal, environment): the terminal, else COLUMNS, else 80, within 40 and 240", () => {
  expect([textWidth(100, "60"), textWidth(undefined, "60"), textWidth(undefined, undefined)]).toEqual([100, 60, 80]);
  expect([textWidth(10, ""), textWidth(1000, ""), textWidth(0, "x"), textWidth(undefined, "1e9")]).toEqual([
    40, 240, 80, 80,
  ]);
});
