// What stands under a schematic: each short name with what it is and its value, a blank where the value is not known.

import { partNames, spanOf } from "./partNames.ts";
import type { DrawnResistor, SchematicProps } from "./schematicProps.ts";
import { BLANK, counted, shownOrBlank, wordsOrBlank } from "./valueWords.ts";

const SWITCHES = {
  thyristor: "switch, thyristor",
  gap: "switch, spark gap",
  contact: "switch, contact",
  unknown: "switch, kind to be chosen",
} as const;
const LOADS = {
  resistor: "load, resistor",
  coil: "load, coil",
  lamp: "load, flash lamp",
  short: "load, none: the output is shorted",
  unknown: "load, kind to be stated",
} as const;

const resistor = ({ resistance, words }: DrawnResistor): string =>
  `${shownOrBlank(resistance, "resistance")}${words === null ? "" : `, ${words}`}`;

function chargerLines(props: SchematicProps): readonly string[] {
  const names = partNames(props);
  const lines = props.isolation.map((one, index) => {
    const value = one.kind === "resistor" ? resistor(one) : wordsOrBlank(one.words);
    return `${names.isolation[index]}: charging isolation, ${one.kind}, ${value}`;
  });
  return [
    `G1: charger, ${wordsOrBlank(props.charger)}`,
    ...(lines.length > 0 ? lines : ["Charging isolation: none stated; a fault of the bank then reaches the charger."]),
  ];
}

function dischargeLines(props: SchematicProps): readonly string[] {
  const { dump, dumpRelay, bleeds } = partNames(props);
  return [
    ...(props.dump === null
      ? ["Dump resistor and relay: none stated; a bank needs a second way to discharge."]
      : [`${dumpRelay}: dump relay, closes when its power fails; ${dump}: dump resistor, ${resistor(props.dump)}`]),
    ...props.bleeds.map((bleed, index) => `${bleeds[index]}: bleed resistor across the ends, ${resistor(bleed)}`),
  ];
}

function balanceLine({ balance, ties, series, parallel }: SchematicProps): string {
  if (balance === null) return "Balancing resistors: none fitted.";
  const tied = ties === "cross-tied";
  const names = tied ? spanOf("RB", "1", `${series}`) : `RB, ${counted(series * parallel, "resistor")}`;
  const where = tied ? `one across each of ${counted(series, "stage")}` : "one across each unit";
  const value = shownOrBlank(balance.resistance, "resistance");
  const spread = balance.tolerance === null ? "" : ` ±${shownOrBlank(balance.tolerance, "fraction")}`;
  const made = balance.elements === 1 ? "" : `, each made of ${balance.elements} equal elements in series`;
  return `${names}: balancing resistors, ${where}, ${value}${spread}${made}`;
}

function unitLines(props: SchematicProps): readonly string[] {
  const { series, parallel, ties, unit, fuse, isolating, clamps } = props;
  const tied = ties === "cross-tied";
  const units = series * parallel;
  const last = tied ? `${series}.${parallel}` : `${parallel}.${series}`;
  const numbering = tied ? "stage, then place in it" : "string, then place in it";
  const polarity =
    unit.polarised === null ? ", polarity not known: drawn as polarised" : unit.polarised ? ", polarised" : "";
  const values = `${shownOrBlank(unit.capacitance, "capacitance")}, ${shownOrBlank(unit.voltage, "voltage")}`;
  return [
    `${spanOf("C", "1.1", last)}: ${counted(units, "unit")}, ${unit.part}, ${values}${polarity}. Numbered ${numbering}; 1 is at the negative end.`,
    ...(fuse === null
      ? []
      : [
          `Fuse in series with each ${fuse.at}, ${fuse.at === "unit" ? units : parallel} in all: ${wordsOrBlank(fuse.words)}`,
        ]),
    ...(fuse?.at === "unit" && tied
      ? ["A unit cut off by its own fuse is no longer drained by its stage's resistor: measure and short it by itself."]
      : []),
    ...(isolating === null
      ? []
      : [`Isolating resistor in series with each unit, ${units} in all: ${resistor(isolating)}`]),
    ...(clamps.positions
      ? [
          `Clamp diode across each ${tied ? "stage" : "unit"}, ${tied ? series : units} in all, cathode to the positive end`,
        ]
      : []),
  ];
}

function fireLines(props: SchematicProps): readonly string[] {
  const { load, clamps } = props;
  return [
    ...(clamps.bank ? [`${partNames(props).clamp}: clamp diode across the bank, cathode to the positive end`] : []),
    `S1: ${SWITCHES[props.switch.kind]}, ${wordsOrBlank(props.switch.words)}`,
    ...(load.coil ? ["L1: coil in series with the load, that shapes the pulse"] : []),
    load.kind === "short" ? `X1: ${LOADS.short}` : `X1: ${LOADS[load.kind]}, ${wordsOrBlank(load.words)}`,
  ];
}

function earthLines({ earth, ties, chargeVoltage }: SchematicProps): readonly string[] {
  const tied = ties === "cross-tied";
  const full = `Full charge: ${shownOrBlank(chargeVoltage, "voltage")}.`;
  const points = tied
    ? "TP: measuring and stick points, one at each tie"
    : "Open circles and both ends: measuring and stick points";
  const where = {
    negative: "E1: the one earth point, at the negative end",
    positive: "E1: the one earth point, at the positive end",
    none: "No end is earthed: the bank floats, treat every terminal as live to earth at full voltage",
    unknown: `The one earth point: ${BLANK}`,
  } as const;
  const shown = tied && (earth === "negative" || earth === "positive");
  return [
    `${where[earth]}.`,
    `${points}${shown ? ", with the potential to earth at full charge, shared evenly" : ""}. ${full}`,
  ];
}

export const SYMBOLS_NOTE = "Symbols after IEC 60617, drawn from memory and not checked against its text.";

/** Every line of the legend, in the order in which the current passes. */
export const legendLines = (props: SchematicProps): readonly string[] => [
  ...chargerLines(props),
  ...dischargeLines(props),
  balanceLine(props),
  ...unitLines(props),
  ...fireLines(props),
  ...earthLines(props),
  SYMBOLS_NOTE,
];
