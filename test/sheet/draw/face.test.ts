import { describe, expect, test } from "vitest";
import { FACE_PIECE, faceFigures, PAGE, schematicFigures } from "../../../src/sheet/draw/index.ts";
import { schematicOf } from "../../support/drawn.ts";
import { faceOf, serialsOf } from "../../support/faces.ts";
import fc from "../../support/property.ts";
import { ATTACKS, brokenNumbers, countRole, outside, svgOf, textsOf, wellFormed } from "../../support/svg.ts";

const svgsOf = (change: Parameters<typeof faceOf>[0]) => faceFigures(faceOf(change)).map(svgOf);

describe("faceFigures(props)", () => {
  test("each position with its number, serial and potential; spares aside", () => {
    const [face = "", spares = ""] = svgsOf({ groups: serialsOf(4, 3), spares: ["SP-7", null] });
    const texts = textsOf(face).map(({ text }) => text);
    for (let stage = 1; stage <= 4; stage += 1)
      for (let place = 1; place <= 3; place += 1)
        expect(texts).toEqual(expect.arrayContaining([`${stage}.${place}`, `N${stage}-${place}`]));
    expect(countRole(face, "cell")).toBe(12);
    expect(countRole(face, "stick")).toBe(5);
    expect(countRole(spares, "spare")).toBe(2);
    expect(spares).toContain("SP-7");
  });

  test("serials of a string stand in the string", () => {
    const texts = textsOf(svgsOf({ ties: "strings", groups: serialsOf(3, 4) })[0]!);
    const position = texts.find(({ text }) => text === "3.4")!;
    const serial = texts.find(({ text }) => text === "N3-4")!;
    expect(serial.x).toBe(position.x);
    expect(serial.y - position.y).toBeLessThan(30);
  });

  test("20s40p with schematic stays under 800 kB, every position once", () => {
    for (const ties of ["cross-tied", "strings"] as const) {
      const groups = ties === "cross-tied" ? serialsOf(20, 40) : serialsOf(40, 20);
      const faces = svgsOf({ series: 20, parallel: 40, ties, groups });
      const shape = { series: 20, parallel: 40, ties, clamps: { bank: true, positions: true } };
      const schematic = schematicFigures(schematicOf(shape)).map(svgOf);
      expect(countRole(faces.join(""), "cell")).toBe(800);
      expect(
        new Set(
          textsOf(faces.join(""))
            .map(({ text }) => text)
            .filter((text) => text.startsWith("N")),
        ).size,
      ).toBe(801);
      expect([...faces, ...schematic].join("").length).toBeLessThan(800e3);
    }
  });

  test("any bank and serials: well-formed, no text outside, on the page, ids once", () => {
    const size = fc.integer({ min: 1, max: 30 });
    fc.assert(
      fc.property(
        size,
        size,
        fc.constantFrom("cross-tied" as const, "strings" as const),
        fc.string({ unit: "grapheme", maxLength: 40 }),
        fc.integer({ min: 0, max: 100 }),
        (series, parallel, ties, serial, spares) => {
          const groups = Array.from({ length: 30 }, () => Array.from({ length: 30 }, () => serial));
          const svgs = svgsOf({
            series,
            parallel,
            ties,
            groups,
            spares: Array.from({ length: spares }, () => serial),
            chargeVoltage: 98765.4,
            earth: "positive",
          });
          expect(countRole(svgs.join(""), "cell")).toBe(series * parallel);
          expect(countRole(svgs.join(""), "spare")).toBe(spares);
          for (const svg of svgs) {
            expect(wellFormed(svg)).toBe(true);
            expect(outside(svg)).toEqual([]);
            expect(brokenNumbers(svg)).toEqual([]);
            expect(Number(/viewBox="0 0 510 ([\d.]+)"/.exec(svg)?.[1])).toBeLessThanOrEqual(PAGE.height);
          }
          const ids = svgs.flatMap((svg) => [...svg.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id));
          expect(new Set(ids).size).toBe(ids.length);
        },
      ),
      { numRuns: 25 },
    );
  });

  test("one cell to a piece, as asked; more than the paper holds is cut down to it", () => {
    expect(svgsOf({ piece: { columns: 1, rows: 1 } })).toHaveLength(12);
    expect(
      svgsOf({ series: FACE_PIECE.rows, parallel: FACE_PIECE.columns, piece: { columns: 99, rows: 99 } }),
    ).toHaveLength(1);
    expect(svgsOf({ series: FACE_PIECE.rows + 1, piece: { columns: 99, rows: 99 } })).toHaveLength(2);
  });

  test.each(ATTACKS)("%j as serial and title stays text", (attack) => {
    for (const svg of svgsOf({ title: attack, groups: [[attack, attack, attack]], spares: [attack] })) {
      expect(wellFormed(svg)).toBe(true);
      expect(
        [...svg.matchAll(/<([a-z!?]+)/gi)]
          .map(([, tag]) => tag)
          .filter((tag) => !/^(svg|title|desc|path|circle|g|text)$/.test(tag!)),
      ).toEqual([]);
    }
  });
});
