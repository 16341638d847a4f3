import { describe, expect, test } from "vitest";
import { legendLines, SYMBOLS_NOTE } from "../../../src/sheet/draw/legend.ts";
import { schematicOf } from "../../support/drawn.ts";

const text = (change: Parameters<typeof schematicOf>[0] = {}) => legendLines(schematicOf(change)).join("\n");

describe("legendLines(props)", () => {
  test("names every part with its value and its count", () => {
    expect(text()).toBe(
      [
        "G1: charger, constant current, 50 mA",
        "R1: charging isolation, resistor, 1 kohm",
        "K1: dump relay, closes when its power fails; R2: dump resistor, 100 ohm",
        "R3: bleed resistor across the ends, 100 kohm",
        "RB1 to RB4: balancing resistors, one across each of 4 stages, 24 kohm ±5 %, each made of 2 equal elements in series",
        "C1.1 to C4.3: 12 units, DEMO 470/450, 470 µF, 450 V, polarised. Numbered stage, then place in it; 1 is at the negative end.",
        "D1: clamp diode across the bank, cathode to the positive end",
        "S1: switch, thyristor, ________",
        "X1: load, coil, magnet, 80 µH",
        "E1: the one earth point, at the negative end.",
        "TP: measuring and stick points, one at each tie, with the potential to earth at full charge, shared evenly. Full charge: 1.6 kV.",
        SYMBOLS_NOTE,
      ].join("\n"),
    );
  });

  test("what is not known is a blank, what is not there is said", () => {
    const bare = text({
      charger: null,
      isolation: [],
      dump: null,
      balance: null,
      chargeVoltage: null,
      earth: "unknown",
      unit: { part: "DEMO", capacitance: null, voltage: null, polarised: null },
    });
    for (const words of [
      "G1: charger, ________",
      "Charging isolation: none stated",
      "Dump resistor and relay: none stated",
      "Balancing resistors: none fitted",
      "________ F, ________ V, polarity not known: drawn as polarised",
      "The one earth point: ________",
      "Full charge: ________ V",
    ])
      expect(bare).toContain(words);
  });
});
