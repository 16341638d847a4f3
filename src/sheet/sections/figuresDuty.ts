// Of the ten figures those on what the parts bear: units, fault currents, the bus, resistors, reversal.

import { DEFAULT_FAMILY } from "../../catalog/index.ts";
import { worstOfFault } from "../../pulse/index.ts";
import { fittedFuse } from "../../search/index.ts";
import { busForce } from "../busForce.ts";
import { cell, down, partOf, up } from "../cells.ts";
import type { SheetInput } from "../input.ts";
import type { Cell } from "../model.ts";
import type { FigureRow } from "./figuresDanger.ts";
import { bledInElement } from "./resistors.ts";

function stress({ layout, unit, faults }: SheetInput): readonly FigureRow[] {
  const { share } = layout;
  const rated = (x: number | null): Cell => {
    const part = partOf(x, unit.voltage);
    return part === null ? null : `${up(part, "fraction")} of ${cell(unit.voltage, "voltage")} rated`;
  };
  const short = faults.find(({ id }) => id === "unit-short");
  const shorted = short === undefined ? null : worstOfFault(short);
  const parts = `at high capacitance; nominally its own ${cell(short?.energyOwn, "energy") ?? "unknown"}, from others ${cell(short?.energyIntoUnit, "energy") ?? "unknown"}`;
  return [
    ["3", "worst unit while charging", up(share.charging, "voltage"), rated(share.charging)],
    ["3", "worst unit while holding", up(share.holding, "voltage"), rated(share.holding)],
    ["3", "sound unit with one shorted", up(shorted, "voltage"), rated(shorted)],
    [
      "4",
      "peak fault current, one unit shorted",
      up(short?.peakCurrentWorst ?? short?.peakCurrent, "current"),
      short?.peakCurrent == null ? "ESR or ESL is not known, or no neighbour feeds it" : short.peakIs,
    ],
    [
      "4",
      "energy into the shorted unit",
      up(short?.energyWorst, "energy"),
      unit.ruptureEnergy === undefined
        ? `${parts}; what the case contains is not known: contain it by a screen`
        : `${parts}; case contains ${down(unit.ruptureEnergy, "energy")}`,
    ],
  ];
}

function bus({ layout, unit, brief, faults, shot, fuse }: SheetInput): readonly FigureRow[] {
  const loadShort = faults.find(({ id }) => id === "load-short");
  const amperes = loadShort?.peakCurrentWorst ?? loadShort?.peakCurrent ?? null;
  const force = amperes === null ? null : busForce(brief.bus, amperes);
  const voltage = brief.voltage * (1 + brief.overshoot);
  // What a fuse would see, also where no catalogue of fuses was given.
  const { faultAction, leastFaultAction } = (fuse ?? fittedFuse({ layout, unit, brief }, [])).sees;
  return [
    [
      "4",
      "action integral through a shorted unit",
      up(faultAction, "action"),
      faultAction === null
        ? "needs the units' ESR, and neighbours that feed it"
        : `at most; a fuse of the unit must clear on the least, ${leastFaultAction === null ? "which needs the tolerance" : down(leastFaultAction, "action")}`,
    ],
    [
      "5",
      "force on the bus, load shorted",
      force === null ? null : `${Number(force.toPrecision(3))} N/m`,
      force === null
        ? "needs the bus by its shape, and ESR or ESL"
        : `at ${cell(amperes, "current")}, go and return pushed apart`,
    ],
    [
      "5",
      "spacing at the highest voltage",
      null,
      `for ${cell(voltage, "voltage")}: measured on the built bank, against the hazard file's advice`,
    ],
    [
      "7",
      "reversal",
      up(reversalOf(shot), "fraction"),
      shot === null ? "needs a load in the brief" : "high end of the spread, or of the unit worst placed on the bus",
    ],
  ];
}

function resistor(input: SheetInput): readonly FigureRow[] {
  const { balance } = input.layout;
  if (balance === null) return [["6", "balancing resistor", "none fitted", ""]];
  const family = [...input.families, DEFAULT_FAMILY].find((one) => one.family === balance.family);
  const part = (x: number | null, rating: number | undefined): Cell => up(partOf(x, rating), "fraction");
  return [
    [
      "6",
      "balancing element, watts of rated",
      part(balance.powerEach, family?.power),
      family === undefined
        ? "the family's ratings are not known"
        : `${cell(family.power, "power")}, ${cell(family.derating, "fraction")} used`,
    ],
    [
      "6",
      "balancing element, volts of rated",
      part(balance.voltageEach, family?.voltage),
      cell(family?.voltage, "voltage"),
    ],
    [
      "6",
      "balancing element, joules of rated",
      part(bledInElement(input, balance.elements), family?.pulseEnergy),
      family?.pulseEnergy === undefined
        ? "the pulse rating is not known"
        : `pulse rating ${cell(family.pulseEnergy, "energy")}, one whole bleed-down; it is slow, so watts judge it`,
    ],
  ];
}

function units({ shot, unit }: SheetInput): readonly FigureRow[] {
  const peak = shot?.discharge.unit.peakCurrent ?? null;
  return [
    [
      "7",
      "peak current of a unit",
      up(peak, "current"),
      unit.peakCurrent === undefined ? "the unit's limit is not known" : `limit ${cell(unit.peakCurrent, "current")}`,
    ],
    [
      "7",
      "shots used of rated",
      null,
      unit.ratedShots === undefined ? "the rated shots are not known" : `${unit.ratedShots} rated; from the shot log`,
    ],
  ];
}

/** Figures 3 to 7. */
export const dutyFigures = (input: SheetInput): readonly FigureRow[] => [
  ...stress(input),
  ...bus(input),
  ...resistor(input),
  ...units(input),
];

/** The bank's over all that spreads, or that of the unit which its place on the bus reverses more. */
const reversalOf = (shot: SheetInput["shot"]): number | null =>
  shot === null ? null : Math.max(shot.envelope.reversal.high ?? shot.discharge.reversal, shot.discharge.unit.reversal);
