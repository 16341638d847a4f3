import { describe, expect, test } from "vitest";
import { bankPieces } from "../../../src/sheet/draw/bankPieces.ts";
import { PAGE } from "../../../src/sheet/draw/drawing.tsx";
import { countOf, together } from "../../../src/sheet/draw/ink.ts";
import { schematicOf } from "../../support/drawn.ts";
import fc from "../../support/property.ts";

const words = (node: number) => ({ name: `TP${node}`, potential: null });

describe("bankPieces(props, nodeWords)", () => {
  test("20s40p cross-tied is four pieces of ten places each, the positive end in the first", () => {
    const pieces = bankPieces(schematicOf({ series: 20, parallel: 40 }), words);
    expect(pieces.map((piece) => piece.words)).toEqual([
      "stages 1 to 20, places 1 to 10",
      "stages 1 to 20, places 11 to 20",
      "stages 1 to 20, places 21 to 30",
      "stages 1 to 20, places 31 to 40",
    ]);
  });

  test("every unit, resistor, diode and fuse of any bank is drawn once, on pieces that fit a page", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 25 }),
        fc.integer({ min: 1, max: 25 }),
        fc.constantFrom("cross-tied" as const, "strings" as const),
        fc.boolean(),
        (series, parallel, ties, isolating) => {
          const tied = ties === "cross-tied";
          const pieces = bankPieces(
            schematicOf({
              series,
              parallel,
              ties,
              clamps: { bank: false, positions: true },
              fuse: { at: tied ? "unit" : "string", words: null },
              isolating: isolating ? { resistance: 1, words: null } : null,
            }),
            words,
          );
          const ink = together(pieces.flatMap(({ inks }) => inks));
          const units = series * parallel;
          expect(countOf(ink, "unit")).toBe(units);
          expect(pieces.reduce((sum, piece) => sum + piece.units, 0)).toBe(units);
          expect(countOf(ink, "balance")).toBe(tied ? series : units);
          expect(countOf(ink, "clamp")).toBe(tied ? series : units);
          expect(countOf(ink, "fuse")).toBe(tied ? units : parallel);
          expect(countOf(ink, "isolating")).toBe(isolating ? units : 0);
          const names = ink.words.map(({ text }) => text).filter((text) => text.startsWith("C"));
          expect(new Set(names).size).toBe(units);
          for (const { height } of pieces) expect(height).toBeLessThanOrEqual(PAGE.height);
        },
      ),
      { numRuns: 40 },
    );
  });
});
