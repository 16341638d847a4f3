// Limits of voltage, charge and time after switch-off, against the table of the methods page.
import { expect, test } from "vitest";
import { DECAY_RULES } from "../../src/hazard/decayRules.ts";

const said = (id: string) =>
  DECAY_RULES.find((rule) => rule.id === id)?.limits.map((one) => `${one.value} ${one.unit}`);

test.each([
  // Source: methods table 3.2, IEC 61010-1, 60335-1, 60204-1, 60831-1, 60871-1; NEC 460.
  ["iec-61010-touch", ["60 V"]],
  ["iec-61010-charge", ["0.000045 C"]],
  ["iec-61010-energy", ["0.35 J"]],
  ["iec-61010-plug", ["5 s"]],
  ["iec-60335-charge", ["1e-7 F", "0.000045 C", "0.35 J"]],
  ["iec-60204-residual", ["60 V", "5 s", "0.00006 C"]],
  ["iec-60831-decay", ["75 V", "180 s"]],
  ["iec-60871-decay", ["75 V", "600 s"]],
  ["nec-460-6", ["50 V", "60 s"]],
  ["nec-460-28", ["50 V", "300 s"]],
])("%s asks %j", (id, limits) => expect(said(id)).toEqual(limits));
