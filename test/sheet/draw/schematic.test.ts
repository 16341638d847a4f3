import { describe, expect, test } from "vitest";
import { MOST_UNITS, PAGE, schematicFigures } from "../../../src/sheet/draw/index.ts";
import { schematicOf } from "../../support/drawn.ts";
import fc from "../../support/property.ts";
import { ATTACKS, brokenNumbers, countRole, outside, svgOf, wellFormed } from "../../support/svg.ts";

const svgsOf = (change: Parameters<typeof schematicOf>[0]) => schematicFigures(schematicOf(change)).map(svgOf);

describe("schematicFigures(props)", () => {
  test("a small bank is one drawing with every unit in it", () => {
    const svgs = svgsOf({ series: 1, parallel: 1, ties: "strings" });
    expect(svgs).toHaveLength(1);
    expect(countRole(svgs[0]!, "unit")).toBe(1);
    expect(countRole(svgs[0]!, "balance")).toBe(1);
  });

  test.each(["cross-tied", "strings"] as const)("20s40p %s is drawn unit by unit after the folded circuit", (ties) => {
    const [main = "", ...bank] = svgsOf({ series: 20, parallel: 40, ties });
    expect(main).toContain("37 more alike");
    expect(main).toContain("17 more");
    const all = bank.join("");
    expect(countRole(all, "unit")).toBe(800);
    expect(countRole(all, "balance")).toBe(ties === "cross-tied" ? 20 : 800);
  });

  test("a larger bank is folded only, and says so", () => {
    const svgs = svgsOf({ series: 21, parallel: 40 });
    expect(21 * 40).toBeGreaterThan(MOST_UNITS);
    expect(svgs).toHaveLength(1);
    expect(svgs[0]).toContain("too large to be drawn unit by unit");
    expect(countRole(svgs[0]!, "unit")).toBe(3 * 3);
  });

  test("any bank: well-formed, no text outside, no number missing, no id twice, on the page", () => {
    const some = fc.constantFrom("cross-tied" as const, "strings" as const);
    const size = fc.integer({ min: 1, max: 45 });
    fc.assert(
      fc.property(
        size,
        size,
        some,
        fc.boolean(),
        fc.integer({ min: 0, max: 4 }),
        (series, parallel, ties, full, count) => {
          const part = { resistance: full ? 1e3 : null, words: full ? "on the lid" : null };
          const svgs = svgsOf({
            series,
            parallel,
            ties,
            isolation: Array.from({ length: count }, () => ({ kind: "resistor", ...part }) as const),
            bleeds: Array.from({ length: count }, () => part),
            clamps: { bank: full, positions: full },
            fuse: full ? { at: ties === "cross-tied" ? "unit" : "string", words: null } : null,
            isolating: full ? part : null,
            chargeVoltage: full ? 1e5 / 3 : null,
            earth: full ? "positive" : "none",
          });
          for (const svg of svgs) {
            expect(wellFormed(svg)).toBe(true);
            expect(outside(svg)).toEqual([]);
            expect(brokenNumbers(svg)).toEqual([]);
            const height = Number(/viewBox="0 0 510 ([\d.]+)"/.exec(svg)?.[1]);
            expect(height).toBeLessThanOrEqual(PAGE.height);
          }
          const ids = svgs.flatMap((svg) => [...svg.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id));
          expect(new Set(ids).size).toBe(ids.length);
        },
      ),
      { numRuns: 30 },
    );
  });

  test.each(ATTACKS)("%j as title, part and words stays text", (attack) => {
    for (const svg of svgsOf({
      title: attack,
      charger: attack,
      unit: { ...schematicOf().unit, part: attack },
      load: { kind: "lamp", words: attack, coil: false },
    })) {
      expect(wellFormed(svg)).toBe(true);
      expect(new Set([...svg.matchAll(/<([a-z!?]+)/gi)].map(([, tag]) => tag))).toEqual(
        new Set(["svg", "title", "desc", "path", "g", "text"]),
      );
    }
  });
});
