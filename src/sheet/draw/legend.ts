// What stands under a schematic: each short name with what it is and its value, a blank where the value is not known.

import { bankLines, resistor } from "./legendBank.ts";
import { partNames } from "./partNames.ts";
import type { SchematicProps } from "./schematicProps.ts";
import { BLANK, shownOrBlank, wordsOrBlank } from "./valueWords.ts";

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

function fireLines(props: SchematicProps): readonly string[] {
  const { load, clamps } = props;
  return [
    ...(clamps.bank ? [`${partNames(props).clamp}: clamp diode across the bank, cathode to the positive end`] : []),
    `S1: ${SWITCHES[props.switch.kind]}, ${wordsOrBlank(props.switch.words)}`,
    ...(load.coil ? ["L1: coil in series with the load, that shapes the pulse"] : []),
    load.kind === "short" ? `X1: ${LOADS.short}` : `X1: ${LOADS[load.kind]}, ${wordsOrBlank(load.words)}`,
  ];
}

function earthLines({ earth, ties, series, chargeVoltage }: SchematicProps): readonly string[] {
  const tied = ties === "cross-tied";
  const full = `Full charge: ${shownOrBlank(chargeVoltage, "voltage")}.`;
  const points = tied
    ? "TP: measuring and stick points, one at each tie"
    : `Open circles: measuring and stick points, TP0 and TP${series} at the ends${series > 1 ? "; TP1.1 is above C1.1" : ""}`;
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
  ...bankLines(props),
  ...fireLines(props),
  ...earthLines(props),
  SYMBOLS_NOTE,
];
