// What stands under a schematic about the bank's own parts: units, balancing resistors, fuses, isolating resistors, clamp diodes.
//
// A part that stands at each unit has the unit's number, one that stands at each stage or string the number of that.

import { spanOf } from "./partNames.ts";
import type { DrawnResistor, SchematicProps } from "./schematicProps.ts";
import { counted, shownOrBlank, wordsOrBlank } from "./valueWords.ts";

export const resistor = ({ resistance, words }: DrawnResistor): string =>
  `${shownOrBlank(resistance, "resistance")}${words === null ? "" : `, ${words}`}`;

const isTied = ({ ties }: Pick<SchematicProps, "ties">): boolean => ties === "cross-tied";

/** "3.7 is the last": stage and place, or string and place. */
const lastUnit = (props: SchematicProps): string =>
  isTied(props) ? `${props.series}.${props.parallel}` : `${props.parallel}.${props.series}`;

/** Names of what stands at each unit, and of what stands once to a stage (cross-tied) but at each unit of a string. */
const unitSpan = (letters: string, props: SchematicProps): string => spanOf(letters, "1.1", lastUnit(props));
const positionSpan = (letters: string, props: SchematicProps): string =>
  isTied(props) ? spanOf(letters, "1", `${props.series}`) : unitSpan(letters, props);

function balanceLine(props: SchematicProps): string {
  const { balance, series } = props;
  if (balance === null) return "Balancing resistors: none fitted.";
  const where = isTied(props) ? `one across each of ${counted(series, "stage")}` : "one across each unit";
  const value = shownOrBlank(balance.resistance, "resistance");
  const spread = balance.tolerance === null ? "" : ` ±${shownOrBlank(balance.tolerance, "fraction")}`;
  const made = balance.elements === 1 ? "" : `, each made of ${balance.elements} equal elements in series`;
  return `${positionSpan("RB", props)}: balancing resistors, ${where}, ${value}${spread}${made}`;
}

function unitLine(props: SchematicProps): string {
  const { series, parallel, unit } = props;
  const numbering = isTied(props) ? "stage, then place in it" : "string, then place in it";
  const polarity =
    unit.polarised === null ? ", polarity not known: drawn as polarised" : unit.polarised ? ", polarised" : "";
  const values = `${shownOrBlank(unit.capacitance, "capacitance")}, ${shownOrBlank(unit.voltage, "voltage")}`;
  return `${unitSpan("C", props)}: ${counted(series * parallel, "unit")}, ${unit.part}, ${values}${polarity}. Numbered ${numbering}; 1 is at the negative end.`;
}

function seriesLines(props: SchematicProps): readonly string[] {
  const { parallel, fuse, isolating, balance, clamps } = props;
  const lines: string[] = [];
  if (fuse !== null) {
    const names = fuse.at === "unit" ? unitSpan("F", props) : spanOf("F", "1", `${parallel}`);
    lines.push(`${names}: fuse in series with each ${fuse.at}, ${wordsOrBlank(fuse.words)}`);
  }
  if (isolating !== null)
    lines.push(`${unitSpan("RI", props)}: isolating resistor in series with each unit, ${resistor(isolating)}`);
  if (fuse?.at === "unit" && isTied(props))
    lines.push(
      "A unit cut off by its own fuse is no longer drained by its stage's resistor: measure and short it by itself.",
    );
  const inside = lines.length > 0 && !isTied(props) && (balance !== null || clamps.positions);
  if (inside)
    lines.push("What stands across a unit is at its own terminals, so that a fuse that opens does not cut it off.");
  return lines;
}

/** Units, what stands across them, and what is in series with them. */
export const bankLines = (props: SchematicProps): readonly string[] => [
  balanceLine(props),
  unitLine(props),
  ...seriesLines(props),
  ...(props.clamps.positions
    ? [
        `${positionSpan("DC", props)}: clamp diodes, one across each ${isTied(props) ? "stage" : "unit"}, cathode to the positive end`,
      ]
    : []),
];
