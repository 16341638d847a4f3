// The cautions that go with every result: those the bank calls for, and to whom this program defers.

import { storedEnergy } from "../bank/index.ts";
import type { Capacitor } from "../catalog/index.ts";
import { cautionsFor, DEFERENCE, energyClass } from "../hazard/index.ts";
import type { Brief, LayoutResult } from "../search/index.ts";

export interface CautionLine {
  readonly id: string;
  readonly text: string;
}

const DEFER: CautionLine = {
  id: "local-codes",
  text: "Follow the codes in force where you work and leave to licensed people what is theirs to do.",
};

/** The standing cautions, and those of one bank when there is one. */
export function cautionsOf(
  brief: Pick<Brief, "voltage" | "overshoot">,
  bank?: { readonly layout: LayoutResult; readonly unit: Capacitor },
): readonly CautionLine[] {
  const traits = bank === undefined ? {} : traitsOf(brief, bank);
  const standing = cautionsFor(traits).map(({ id, short }) => ({ id, text: short }));
  const defer = DEFERENCE.map(({ id, short }) => ({ id, text: short }));
  return [...standing, ...defer, DEFER];
}

function traitsOf(
  { voltage, overshoot }: Pick<Brief, "voltage" | "overshoot">,
  { layout, unit }: { readonly layout: LayoutResult; readonly unit: Capacitor },
) {
  const volts = voltage * (1 + overshoot);
  const energy = storedEnergy(layout.capacitance.high ?? layout.capacitance.nominal, volts);
  const technology = unit.technology ?? "";
  return {
    polarised: unit.polarised !== false,
    seriesUnits: layout.series > 1,
    arcBlast: energyClass({ energy, voltage: volts }).arcBlast,
    oilFilled: /oil/i.test(technology),
    homeMade: /home-made|plate/i.test(technology),
    doubleLayer: /double[- ]layer|supercap/i.test(technology),
  };
}
