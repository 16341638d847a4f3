import { describe, expect, test } from "vitest";
import { bankLines, resistor } from "../../../src/sheet/draw/legendBank.ts";
import { schematicOf } from "../../support/drawn.ts";

const text = (change: Parameters<typeof schematicOf>[0] = {}) => bankLines(schematicOf(change)).join("\n");
const wire = { resistance: 0.1, words: "wire" };

describe("bankLines(props)", () => {
  test("parts of a cross-tied bank are numbered by stage or by unit, as they are fitted", () => {
    const tied = text({
      fuse: { at: "unit", words: "50 A" },
      isolating: wire,
      clamps: { bank: false, positions: true },
    });
    for (const words of [
      "RB1 to RB4: balancing resistors, one across each of 4 stages",
      "C1.1 to C4.3: 12 units",
      "F1.1 to F4.3: fuse in series with each unit, 50 A",
      "RI1.1 to RI4.3: isolating resistor in series with each unit, 100 mohm, wire",
      "DC1 to DC4: clamp diodes, one across each stage",
      "no longer drained by its stage's resistor",
    ])
      expect(tied).toContain(words);
    expect(tied).not.toContain("at its own terminals");
  });

  test("parts of strings are numbered by string or by unit, and stand inside the fuse", () => {
    const strings = text({
      ties: "strings",
      fuse: { at: "string", words: null },
      clamps: { bank: false, positions: true },
    });
    for (const words of [
      "RB1.1 to RB3.4: balancing resistors, one across each unit",
      "C1.1 to C3.4: 12 units",
      "F1 to F3: fuse in series with each string, ________",
      "DC1.1 to DC3.4: clamp diodes, one across each unit",
      "at its own terminals",
    ])
      expect(strings).toContain(words);
    expect(text({ ties: "strings" })).not.toContain("at its own terminals");
  });

  test("none fitted is said; one of a kind has no span", () => {
    expect(text({ balance: null })).toContain("Balancing resistors: none fitted.");
    expect(text({ series: 1, parallel: 1, ties: "strings" })).toContain("C1.1: 1 unit, DEMO");
  });
});

test("resistor(part): value and words, or a blank", () => {
  expect(resistor(wire)).toBe("100 mohm, wire");
  expect(resistor({ resistance: null, words: null })).toBe("________ ohm");
});
