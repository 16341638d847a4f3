import { describe, expect, test } from "vitest";
import { PAGE } from "../../../src/sheet/draw/drawing.tsx";
import { countOf, together } from "../../../src/sheet/draw/ink.ts";
import { isWhole, mainCircuit } from "../../../src/sheet/draw/mainCircuit.ts";
import { schematicOf } from "../../support/drawn.ts";

const words = (node: number) => ({ name: `TP${node}`, potential: null });
const circuit = (change: Parameters<typeof schematicOf>[0] = {}) => {
  const main = mainCircuit(schematicOf(change), PAGE.width, words);
  return { main, ink: together(main.inks) };
};
const resistor = { resistance: 1, words: null };

describe("mainCircuit(props, width, nodeWords)", () => {
  test("draws each part once, and none that is not there", () => {
    const all = circuit({ bleeds: [resistor, resistor], load: { kind: "lamp", words: null, coil: true } }).ink;
    for (const role of ["isolation", "dump", "dump-relay", "bank-clamp", "switch", "load", "load-coil", "earth"])
      expect(countOf(all, role), role).toBe(1);
    expect(countOf(all, "bleed")).toBe(2);
    const bare = circuit({
      isolation: [],
      dump: null,
      bleeds: [],
      clamps: { bank: false, positions: false },
      earth: "none",
    }).ink;
    for (const role of ["isolation", "dump", "dump-relay", "bank-clamp", "bleed", "load-coil", "earth"])
      expect(countOf(bare, role), role).toBe(0);
  });

  test("the fullest circuit fits the page's width, whatever the ties", () => {
    for (const ties of ["cross-tied", "strings"] as const) {
      const { main } = circuit({
        ties,
        series: 40,
        parallel: 50,
        bleeds: [resistor, resistor, resistor],
        clamps: { bank: true, positions: true },
      });
      expect(main.width).toBeLessThanOrEqual(PAGE.width);
    }
  });

  test("isWhole(circuit): only where no unit is hidden", () => {
    expect(isWhole(circuit().main)).toBe(true);
    expect(isWhole(circuit({ parallel: 40 }).main)).toBe(false);
    expect(isWhole(circuit({ series: 20, parallel: 1 }).main)).toBe(false);
  });
});
