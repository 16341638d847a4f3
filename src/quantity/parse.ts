// Text to a number in SI: "470 uF", "4m7", "2.2kV", "4R7", "2,2 kV", "20 %".
//
// The decimal number and the unit's power of ten are joined before conversion, so that 470 uF is the double nearest to 0.00047.
// Codes with a letter for the decimal point follow IEC 60062. Source: [IEC60062] (letters read second hand; T from memory).

import { type Dimension, dimensionOf, PREFIXES, type Scale, unitScale } from "./dimension.ts";
import { accepted, type Read, refused } from "./refusal.ts";

export interface ParseOptions {
  /** Scale of a number without a unit (a table heading's unit); null refuses such a number. Default: SI. */
  readonly bare?: Scale | null;
  /**
   * A comma is known to be the decimal mark here, so "1,500" is 1.5 and not a question; and then "1.500" is one.
   * "never": a comma is never a decimal mark (a table separated by commas).
   */
  readonly decimalComma?: boolean | "never";
}

const SI: Scale = { exponent: 0, factor: 1 };
const NUMBER =
  /^([+\-−]?)(\d+(?:[\u0020\u00a0\u2009\u202f]\d{3})*|(?=[.,]\d))([.,]\d*)?(?:[eE]([+-]?\d+))?(?![\d.,])\s*(.*)$/u;
const CODE = /^(\d*)([A-Za-zµμΩ])(\d+)\s*([A-Za-zΩ]*)$/u;
const PLAIN = /^-?\d+(\.\d+)?$/;

/** Letters that stand for the decimal point, IEC 60062, by dimension; other dimensions take the SI prefixes. */
const CODE_LETTERS: Partial<Record<Dimension, Readonly<Record<string, number>>>> = {
  resistance: { L: -3, R: 0, K: 3, k: 3, M: 6, G: 9, T: 12, m: -3 },
  capacitance: { p: -12, n: -9, u: -6, µ: -6, μ: -6, m: -3, F: 0 },
};

const scaled = (digits: string, exponent: number, scale: Scale): number =>
  Number(`${digits}e${exponent + scale.exponent}`) * scale.factor;

/** A plausible value of each dimension, to show what would be accepted. */
const EXAMPLES: Readonly<Record<Dimension, string>> = {
  capacitance: "470 uF",
  voltage: "2.2 kV",
  resistance: "24 kohm",
  inductance: "30 uH",
  current: "50 mA",
  energy: "2.4 kJ",
  power: "2 W",
  charge: "45 uC",
  frequency: "0.1 Hz",
  time: "30 s",
  length: "35 mm",
  area: "120 cm2",
  volume: "5 L",
  mass: "2 kg",
  fraction: "20 %",
  temperature: "25 degC",
  pressure: "450 torr",
  field: "30 kV/mm",
  slew: "50 V/us",
  action: "400 A2s",
  count: "12",
};

/** What would be accepted for a dimension, in words. */
export const example = (dimension: Dimension): string =>
  dimension === "count"
    ? `a number such as ${EXAMPLES.count}`
    : `a number with a unit such as "${EXAMPLES[dimension]}"`;

/**
 * Reads a quantity. Result: SI number, finite. Refuses, with what was read and what would be accepted: empty text, no number,
 * a unit of another dimension, a thousands comma that could be a decimal comma, NaN and infinity, a bare number where a unit is needed.
 */
export function parseQuantity(text: string, dimension: Dimension, options: ParseOptions = {}): Read<number> {
  const bare = options.bare === undefined ? SI : options.bare;
  if (bare !== null && options.decimalComma !== true && PLAIN.test(text))
    return finite(scaled(text, 0, bare), text, dimension);
  const cell = text.trim();
  const no = (code: string, want: string): Read<never> =>
    refused({ code, place: {}, read: JSON.stringify(text), want });
  if (cell === "") return no("empty", example(dimension));
  const coded = codeValue(cell, dimension);
  if (coded !== null) return finite(coded, text, dimension);
  const match = NUMBER.exec(cell);
  if (match === null) return no("not-a-number", example(dimension));
  const [, sign = "", whole = "", fraction = "", power = "0", unit = ""] = match;
  const integer = whole.replace(/[^\d]/g, "");
  if (
    fraction.startsWith(options.decimalComma === true ? "." : ",") &&
    fraction.length === 4 &&
    !/^0*$/.test(integer) &&
    integer.length <= 3
  ) {
    const plain = `${integer}${fraction.slice(1)}`;
    const mark = options.decimalComma === true ? "point" : "comma";
    const want = `${plain} if the ${mark} groups thousands, ${integer}${options.decimalComma === true ? "," : "."}${fraction.slice(1)} if it is the decimal mark`;
    return no("ambiguous-comma", want);
  }
  if (fraction.startsWith(",") && options.decimalComma === "never") {
    return no(
      "ambiguous-comma",
      `${integer || "0"}.${fraction.slice(1)}, with a point: commas separate the cells of this table`,
    );
  }
  const digits = `${sign === "" || sign === "+" ? "" : "-"}${integer}.${fraction.slice(1)}`;
  let scale: Scale | null = bare;
  if (unit !== "") {
    scale = unitScale(unit, dimension) ?? barePrefix(unit, dimension);
    if (scale === null) {
      const other = dimensionOf(unit);
      return other === null
        ? no("unknown-unit", `${example(dimension)}; the unit ${JSON.stringify(unit)} is not known`)
        : no("wrong-unit", `${example(dimension)}; ${JSON.stringify(unit)} is a unit of ${other}`);
    }
  }
  if (scale === null) return no("missing-unit", `${example(dimension)}, or a unit in the heading, in square brackets`);
  return finite(scaled(digits, Number(power), scale), text, dimension);
}

function finite(value: number, text: string, dimension: Dimension): Read<number> {
  if (Number.isFinite(value)) return accepted(value);
  return refused({ code: "not-finite", place: {}, read: JSON.stringify(text), want: example(dimension) });
}

/**
 * Quantities that are written with a prefix alone, as on parts and their diagrams. A hold of "5 m" or "1m30" is minutes to one reader
 * and not to another, a height of "1m50" metres; so those take no prefix without its unit. The bare unit of every one of these is SI.
 */
const MARKED: readonly Dimension[] = [
  "capacitance",
  "resistance",
  "inductance",
  "voltage",
  "current",
  "energy",
  "power",
];

/** "470u": a prefix without its unit. */
function barePrefix(unit: string, dimension: Dimension): Scale | null {
  const exponent = MARKED.includes(dimension) && Object.hasOwn(PREFIXES, unit) ? PREFIXES[unit] : undefined;
  return exponent === undefined ? null : { exponent, factor: 1 };
}

/** "4m7", "R47", "47K3": the letter is the decimal point and the multiplier. Null when the text is no such code. */
function codeValue(cell: string, dimension: Dimension): number | null {
  const match = CODE.exec(cell);
  if (match === null) return null;
  const [, before = "", letter = "", after = "", unit = ""] = match;
  const letters = CODE_LETTERS[dimension] ?? PREFIXES;
  const power = MARKED.includes(dimension) && Object.hasOwn(letters, letter) ? letters[letter] : undefined;
  if (power === undefined) return null;
  if (unit !== "" && unitScale(unit, dimension)?.exponent !== 0) return null;
  return Number(`${before}.${after}e${power}`);
}
