// What the drawings of the tests are drawn from: an invented bench, with what a test changes.
import type { SchematicProps } from "../../src/sheet/draw/index.ts";

export const schematicOf = (change: Partial<SchematicProps> = {}): SchematicProps => ({
  id: "s",
  title: "Pulsed magnet bench (invented)",
  series: 4,
  parallel: 3,
  ties: "cross-tied",
  unit: { part: "DEMO 470/450", capacitance: 470e-6, voltage: 450, polarised: true },
  chargeVoltage: 1600,
  charger: "constant current, 50 mA",
  isolation: [{ kind: "resistor", resistance: 1000, words: null }],
  balance: { resistance: 24000, tolerance: 0.05, elements: 2 },
  bleeds: [{ resistance: 100e3, words: null }],
  dump: { resistance: 100, words: null },
  switch: { kind: "thyristor", words: null },
  load: { kind: "coil", words: "magnet, 80 µH", coil: false },
  clamps: { bank: true, positions: false },
  fuse: null,
  isolating: null,
  earth: "negative",
  ...change,
});
