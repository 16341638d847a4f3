/** @jsxImportSource preact */
import { XMLValidator } from "fast-xml-parser";
import { describe, expect, test } from "vitest";
import { Drawn } from "../../../src/sheet/html/drawn.tsx";
import { sheetOf } from "../../../src/sheet/index.ts";
import { rendered } from "../../../src/sheet/render.ts";
import { LOAD, placedIn, sheetInput } from "../../support/sheet.ts";

describe("Drawn({ drawn })", () => {
  const input = sheetInput({ brief: { ...LOAD, dumpResistance: "1 kohm" } });
  const sheet = sheetOf({ ...input, placed: placedIn(input) });
  const drawings = sheet.sections.flatMap(({ blocks }) => blocks).filter((block) => block.kind === "drawing");

  test("schematic, face and the four charts are all drawn", () => {
    expect(drawings.map(({ drawn }) => drawn.kind).sort()).toEqual([
      "bleed",
      "cost",
      "face",
      "schematic",
      "shot",
      "voltages",
    ]);
  });

  test.each(drawings.map(({ drawn }) => [drawn.kind, drawn] as const))(
    "%s: figures with captions, well-formed SVG",
    (_, drawn) => {
      const text = rendered(<Drawn drawn={drawn} />);
      const figures = [
        ...text.matchAll(/<figure>(<svg[\s\S]*?<\/svg>)<figcaption>([\s\S]*?)<\/figcaption><\/figure>/g),
      ];
      expect(figures.length).toBeGreaterThan(0);
      expect(figures.map((figure) => figure[0]).join("")).toBe(text);
      for (const [, svg, caption] of figures) {
        expect(XMLValidator.validate(svg as string)).toBe(true);
        expect(caption).not.toBe("");
      }
    },
  );
});
