// The classes of one bank: stored energy by the stricter tier with the arc-blast flag apart, voltage, and the charge that it holds.

import { chargeChecks, type EnergyClass, energyClass } from "../../hazard/index.ts";
import { cell, up } from "../cells.ts";
import type { Facts } from "../facts.ts";
import type { Cell, Table } from "../model.ts";
import { ruleName } from "../rules.ts";

const UNITS = {
  V: "voltage",
  C: "charge",
  J: "energy",
  s: "time",
  F: "capacitance",
  A: "current",
  "1": "fraction",
} as const;

/** Arc blast adds to the tier; it does not replace it. */
const classWords = ({ hazardous, arcBlast }: EnergyClass): string =>
  `${hazardous ? "HAZARDOUS by stored energy" : "below the threshold"}${arcBlast ? ", ARC BLAST" : ""}`;

/** Energy, voltage and charge at the highest voltage, each against its limit. */
export function classTable({ voltage, stored, capacitance, highest, ranOn }: Facts): Table {
  const none = "not assessed: the tolerance is unknown";
  const found = stored === null ? null : energyClass({ energy: stored, voltage });
  const charges = capacitance === null ? [] : chargeChecks({ capacitance, voltage });
  const tier =
    found === null
      ? none
      : `${cell(found.threshold, "energy")} from ${cell(found.tier.fromVoltage, "voltage")} (${ruleName(found.ruleId)}; at or over counts)`;
  return {
    kind: "table",
    id: "classes",
    caption: "Classes at the highest voltage",
    columns: [{ heading: "what" }, { heading: "value", side: "right" }, { heading: "limit" }, { heading: "class" }],
    rows: [
      ["stored energy, highest voltage", up(stored, "energy"), tier, found === null ? none : classWords(found)],
      [
        "arc blast, a flag apart",
        up(stored, "energy"),
        `10 kJ at 100 V and more (${ruleName("lbnl-arc-blast")})`,
        found === null ? none : found.arcBlast ? "ARC BLAST: remote control, exclusion, hearing" : "no flag",
      ],
      [
        "shock, the laxer figure",
        up(stored, "energy"),
        `10 J at 100 V and more (${ruleName("lbnl-shock")})`,
        found === null ? none : `${found.shockByTenJoule ? "over" : "under"}; the stricter tier above is what holds`,
      ],
      [
        "stored energy, charger run on",
        up(ranOn, "energy"),
        highest === null ? "the charger's highest voltage is not known" : `at ${cell(highest, "voltage")}`,
        ranOn === null || highest === null ? null : classWords(energyClass({ energy: ranOn, voltage: highest })),
      ],
      [
        "voltage",
        up(voltage, "voltage"),
        `${cell(60, "voltage")} (${ruleName("iec-61010-touch")})`,
        voltage > 60 ? "over touch-safe" : "touch-safe",
      ],
      ...charges.map((one): readonly Cell[] => [
        `${one.quantity} held`,
        up(one.value, UNITS[one.unit]),
        `${cell(one.limit, UNITS[one.unit])} (${ruleName(one.ruleId)}${one.tag === "memory" ? "; confirm against the text" : ""})`,
        one.exceeded ? "over" : "within",
      ]),
    ],
  };
}
