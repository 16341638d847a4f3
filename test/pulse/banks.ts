// Banks for the tests: one of electrolytics and one of film, invented, from the teaching lab.

import type { Circuit } from "../../src/pulse/load.ts";
import { IDEAL_SWITCH } from "../../src/pulse/load.ts";
import { pulseBankOf } from "../../src/pulse/loopMesh.ts";
import type { PulseUnit } from "../../src/pulse/unitDuty.ts";

/** 3300 uF +-20 %, polarised, 20 mohm, 25 nH, no ratings known. */
export const can: PulseUnit = {
  capacitance: 3300e-6,
  toleranceLow: 0.2,
  toleranceHigh: 0.2,
  esr: 0.02,
  esl: 25e-9,
  polarised: true,
  ratings: { peakCurrent: null, slew: null, reversal: null, action: null },
};

/** Four stages of five cans, cross-tied. */
export const bank = pulseBankOf({ unit: can, series: 4, parallel: 5, ties: "cross-tied" });

/** A coil of 40 uH and 50 mohm on a bus of 60 nH and 1 mohm. */
export const coil: Circuit = {
  load: { kind: "coil", inductance: 40e-6, resistance: 0.05 },
  bus: { resistance: 1e-3, inductance: 60e-9 },
  switch: IDEAL_SWITCH,
  clamp: null,
};
