// Limits of energy, of charge through a body and of recovery, against the figures of the methods page.
import { expect, test } from "vitest";
import { ENERGY_RULES } from "../../src/hazard/energyRules.ts";

const said = (id: string) =>
  ENERGY_RULES.find((rule) => rule.id === id)?.limits.map((one) => [
    one.value,
    one.at?.from ?? 0,
    one.at?.below ?? null,
  ]);

test.each([
  // Source: methods 3.2 (IEC 60479-2, vehicle criterion), 3.3 (NFPA 70E Article 360, LBNL tables), 3.5 (absorption).
  [
    "nfpa-70e-360",
    [
      [100, 0, 100],
      [1, 100, 400],
      [0.25, 400, null],
    ],
  ],
  ["lbnl-shock", [[10, 100, null]]],
  ["lbnl-thermal", [[100, 0, 100]]],
  ["lbnl-arc-blast", [[10000, 100, null]]],
  ["vehicle-low-energy", [[0.2, 0, null]]],
  [
    "iec-60479-fibrillation",
    [
      [0.003, 0, null],
      [0.005, 0, null],
    ],
  ],
  [
    "absorption-electrolytic",
    [
      [0.1, 0, null],
      [0.15, 0, null],
    ],
  ],
])("%s: value, from, below = %j", (id, limits) => expect(said(id)).toEqual(limits));
