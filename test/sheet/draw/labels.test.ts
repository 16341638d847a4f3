import { describe, expect, test } from "vitest";
import { LABEL_PAPERS, type Label, labelFigures } from "../../../src/sheet/draw/index.ts";
import { WARNING } from "../../../src/sheet/draw/labelInk.ts";
import fc from "../../support/property.ts";
import { ATTACKS, brokenNumbers, countRole, outside, svgOf, textsOf, wellFormed } from "../../support/svg.ts";

const some = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: null });
const volts = fc.integer({ min: -1e8, max: 1e8 }).map((value) => value / 1e3);
const labelled: fc.Arbitrary<Label> = fc.record({
  kind: fc.constantFrom("unit" as const, "stage" as const, "string" as const, "spare" as const),
  position: some(fc.string({ maxLength: 12 })),
  serial: some(fc.string({ unit: "grapheme", maxLength: 60 })),
  part: fc.string({ unit: "grapheme", maxLength: 80 }),
  polarised: some(fc.boolean()),
  voltage: some(volts.map(Math.abs)),
  capacitance: some(fc.integer({ min: 1, max: 1e9 }).map((value) => value / 1e12)),
  toEarth: some(volts),
});

describe("labelFigures({ id, title, labels, paper })", () => {
  test("any labels on either paper: one frame each, well-formed, inside", () => {
    fc.assert(
      fc.property(fc.array(labelled, { maxLength: 70 }), fc.constantFrom(...LABEL_PAPERS), (labels, paper) => {
        const svgs = labelFigures({ id: "l", title: "t", labels, paper }).map(svgOf);
        expect(countRole(svgs.join(""), "label")).toBe(labels.length);
        for (const svg of svgs) {
          expect(wellFormed(svg)).toBe(true);
          expect(outside(svg)).toEqual([]);
          expect(brokenNumbers(svg)).toEqual([]);
        }
      }),
      { numRuns: 40 },
    );
  });

  test("a usual serial and the warning are whole on the label", () => {
    const serial = "LOT-2026-11-A-0042/07";
    const label: Label = {
      kind: "unit",
      position: "1.1",
      serial,
      part: "p",
      polarised: true,
      voltage: 1,
      capacitance: 1,
    };
    const [figure] = labelFigures({ id: "l", title: "t", labels: [label], paper: "A4" });
    const texts = textsOf(svgOf(figure!)).map(({ text }) => text);
    expect(texts).toEqual(expect.arrayContaining([`No. ${serial}`, ...WARNING]));
  });

  test.each(ATTACKS)("%j as serial, part and position stays text", (attack) => {
    const label: Label = {
      kind: "unit",
      position: attack,
      serial: attack,
      part: attack,
      polarised: true,
      voltage: 1,
      capacitance: 1,
    };
    const svg = svgOf(labelFigures({ id: "l", title: attack, labels: [label], paper: "Letter" })[0]!);
    expect(wellFormed(svg)).toBe(true);
    expect(
      [...svg.matchAll(/<([a-z!?]+)/gi)]
        .map(([, tag]) => tag)
        .filter((tag) => !/^(svg|title|desc|path|g|text)$/.test(tag!)),
    ).toEqual([]);
  });
});
