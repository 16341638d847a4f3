import { expect, test } from "vitest";
import { CELL, faceCell } from "../../../src/sheet/draw/faceCell.ts";
import { countOf } from "../../../src/sheet/draw/ink.ts";

const cell = { role: "cell", x: 0, y: 0, width: 57, name: "20.40", ends: ["+", "−"], potential: "1.83 kV" } as const;

test("faceCell(cell): a serial is written, an unknown one is a line to write on", () => {
  const known = faceCell({ ...cell, serial: "A1" });
  expect(countOf(known, "cell")).toBe(1);
  expect(known.wires).toEqual([]);
  expect(known.words!.map(({ text }) => text)).toEqual(["20.40", "+", "−", "1.83 kV", "A1"]);
  const blank = faceCell({ ...cell, serial: null });
  expect(blank.wires).toHaveLength(1);
  expect(blank.words!.map(({ text }) => text)).toEqual(["20.40", "+", "−", "1.83 kV"]);
});

test("faceCell(cell): without polarity no marks; all words begin inside the cell", () => {
  const ink = faceCell({ ...cell, ends: ["", ""], serial: "A1" });
  expect(ink.words!.map(({ text }) => text)).toEqual(["20.40", "1.83 kV", "A1"]);
  for (const { x, y } of faceCell({ ...cell, serial: "A1" }).words!) {
    expect(x).toBeGreaterThanOrEqual(0);
    expect(x).toBeLessThanOrEqual(57);
    expect(y).toBeGreaterThan(6);
    expect(y).toBeLessThanOrEqual(CELL.height);
  }
});
