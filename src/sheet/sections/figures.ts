// The ten figures that a reviewer or safety officer asks for first, each with its limit, or a blank that says what is missing.
//
// Source: [practice-5b] list of what settles a reviewer: common practice, no source.

import { energyClass, recovery } from "../../hazard/index.ts";
import { busForce } from "../busForce.ts";
import { cell, down, partOf, said, up, wait } from "../cells.ts";
import { factsOf, ruleName, waysDown } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import { type Cell, type Section, type Table, text } from "../model.ts";
import { clearWords } from "./bleedDown.ts";
import { pathCount } from "./hazard.ts";

type Row = readonly [number: string, figure: string, value: Cell, against: Cell];

function energies(input: SheetInput): readonly Row[] {
  const { voltage, stored, capacitance } = factsOf(input);
  const { charger } = input.brief;
  const highest = charger?.highest ?? charger?.supply ?? null;
  const ran = highest === null || capacitance === null ? null : (capacitance * Math.max(highest, voltage) ** 2) / 2;
  const found = stored === null ? null : energyClass({ energy: stored, voltage });
  return [
    [
      "1",
      "stored energy at the highest voltage",
      up(stored, "energy"),
      found === null
        ? null
        : `${found.hazardous ? "hazardous" : "not hazardous"} from ${cell(found.threshold, "energy")}, ${ruleName(found.ruleId)}`,
    ],
    [
      "1",
      "stored energy with the charger run on",
      up(ran, "energy"),
      highest === null ? "the charger's highest voltage is not known" : cell(highest, "voltage"),
    ],
  ];
}

function times(input: SheetInput): readonly Row[] {
  const facts = factsOf(input);
  const ways = waysDown(facts, { from: facts.voltage, to: facts.clear });
  const back =
    facts.capacitance === null
      ? null
      : recovery({ soak: facts.voltage, capacitance: facts.capacitance, polarised: input.unit.polarised !== false });
  const allowed = facts.allowed === null ? "the rule gives no time" : `${cell(facts.allowed, "time")} allowed`;
  const chains = (x: number | null): Cell => (facts.chain === null ? "no chain" : wait(x));
  return [
    ["2", `time to ${clearWords(facts)}: bleed chains alone`, chains(ways.chains), allowed],
    ["2", "the same with one bleeder open", chains(ways.oneOpen), allowed],
    ["2", "the same by the dump alone", wait(ways.dump), allowed],
    [
      "2",
      "voltage that may come back after a short",
      up(back?.high, "voltage"),
      cell(input.brief.touchSafe, "voltage"),
    ],
  ];
}

function stress({ layout, unit, faults }: SheetInput): readonly Row[] {
  const { share } = layout;
  const rated = (x: number | null): Cell => {
    const part = partOf(x, unit.voltage);
    return part === null ? null : `${up(part, "fraction")} of ${cell(unit.voltage, "voltage")} rated`;
  };
  const short = faults.find(({ id }) => id === "unit-short");
  return [
    ["3", "worst unit while charging", up(share.charging, "voltage"), rated(share.charging)],
    ["3", "worst unit while holding", up(share.holding, "voltage"), rated(share.holding)],
    [
      "3",
      "sound unit with one shorted",
      up(short?.worstVoltageSpread, "voltage"),
      rated(short?.worstVoltageSpread ?? null),
    ],
    [
      "4",
      "peak fault current, one unit shorted",
      up(short?.peakCurrent, "current"),
      short?.peakCurrent == null ? "ESR or ESL is not known, or no neighbour feeds it" : short.peakIs,
    ],
    [
      "4",
      "energy into the shorted unit",
      up(short?.energyIntoUnit, "energy"),
      unit.ruptureEnergy === undefined
        ? "what the case contains is not known: contain it by a screen"
        : `case contains ${down(unit.ruptureEnergy, "energy")}`,
    ],
  ];
}

function bus({ brief, faults, shot, fuse }: SheetInput): readonly Row[] {
  const amperes = faults.find(({ id }) => id === "load-short")?.peakCurrent ?? null;
  const force = amperes === null ? null : busForce(brief.bus, amperes);
  const voltage = brief.voltage * (1 + brief.overshoot);
  return [
    [
      "4",
      "action through a fault",
      fuse === null ? null : up(fuse.sees.faultAction, "action"),
      "known with the units' ESR and a fuse catalogue",
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
      up(shot?.envelope.reversal.high ?? shot?.discharge.reversal, "fraction"),
      shot === null ? "needs a load in the brief" : "high end of the spread",
    ],
  ];
}

function resistor({ layout, families }: SheetInput): readonly Row[] {
  const { balance } = layout;
  if (balance === null) return [["6", "balancing resistor", "none fitted", ""]];
  const family = families.find((one) => one.family === balance.family);
  const part = (x: number, rating: number | undefined): Cell => up(partOf(x, rating), "fraction");
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
      null,
      family?.pulseEnergy === undefined
        ? "the pulse rating is not known"
        : `pulse rating ${cell(family.pulseEnergy, "energy")}; a slow bleed-down is judged by watts`,
    ],
  ];
}

function units({ shot, unit }: SheetInput): readonly Row[] {
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

function compared(input: SheetInput): readonly Row[] {
  const { layout, shot, brief } = input;
  const facts = factsOf(input);
  const nominal = { ...facts, capacitance: layout.capacitance.nominal };
  const ways = waysDown(nominal, { from: brief.voltage, to: brief.touchSafe });
  const esl = shot === null || shot.bank.esl === null ? null : shot.bank.esl + (shot.bus.path?.inductance ?? 0);
  const row = (figure: string, value: Cell): Row => ["9", `${figure}, predicted`, value, "read: ______"];
  return [
    row("capacitance", cell(layout.capacitance.nominal, "capacitance")),
    row("inductance of bank and bus", cell(esl, "inductance")),
    row("resistance of the bank", cell(shot?.bank.esr, "resistance")),
    row("peak current", cell(shot?.discharge.peakCurrent, "current")),
    row(
      `bleed time to ${said(cell(brief.touchSafe, "voltage"))}, nominal capacitance`,
      facts.chain === null ? "no chain" : wait(ways.chains),
    ),
  ];
}

export function figuresSection(input: SheetInput): Section {
  const facts = factsOf(input);
  const paths = pathCount(facts);
  const rows: readonly Row[] = [
    ...energies(input),
    ...times(input),
    ...stress(input),
    ...bus(input),
    ...resistor(input),
    ...units(input),
    ["8", "independent ways to empty it without a hand", String(paths.count), paths.words],
    ["8", "each proven with the power off", null, "from the cold-test record"],
    ...compared(input),
    [
      "10",
      "rule that governs",
      facts.rule,
      input.rule === null ? "no rule was chosen" : "the user's choice; every other rule stands in the hazard file",
    ],
  ];
  const sorted = [...rows].sort((a, b) => Number(a[0]) - Number(b[0]));
  const table: Table = {
    kind: "table",
    id: "ten-figures",
    caption: "The ten figures",
    columns: [
      { heading: "no." },
      { heading: "figure" },
      { heading: "value" },
      { heading: "against, or what is missing" },
    ],
    rows: sorted,
  };
  return {
    id: "ten-figures",
    title: "Ten figures for the reviewer",
    blocks: [
      text(
        "A blank value is open, never passed. Predicted and read figures within 5 % to 10 % of each other are taken as understood (common practice, no source).",
      ),
      table,
    ],
  };
}
