// The dimensions we read and print, with the unit spellings each accepts: data, one row a dimension.
//
// A unit's scale is 10^exponent times factor to SI. Prefixes are those of the SI brochure that the trade uses.
// Source: [SI-brochure] sections 3 and 5.4 (read second hand); WV, VDC and R for ohm: common practice, no source.

export interface Scale {
  /** Power of ten to SI. */
  readonly exponent: number;
  /** Further factor to SI where a power of ten does not do (min, h). */
  readonly factor: number;
}

interface DimensionRow {
  /** Symbol printed after a number. */
  readonly symbol: string;
  /** Spellings that take an SI prefix, in lower case; `exponent` brings the bare symbol to SI. */
  readonly prefixed: readonly { readonly spelling: string; readonly exponent: number }[];
  /** Whole spellings with their scale, no prefix. */
  readonly fixed: Readonly<Record<string, Scale>>;
}

const ten = (exponent: number): Scale => ({ exponent, factor: 1 });
const si = (...spellings: readonly string[]) => spellings.map((spelling) => ({ spelling, exponent: 0 }));

export const DIMENSIONS = {
  capacitance: { symbol: "F", prefixed: si("f", "farad"), fixed: {} },
  voltage: { symbol: "V", prefixed: si("v", "vdc", "wv", "wvdc", "v dc", "volt"), fixed: {} },
  resistance: { symbol: "ohm", prefixed: si("ohm", "ohms", "ω", "r"), fixed: {} },
  inductance: { symbol: "H", prefixed: si("h"), fixed: {} },
  current: { symbol: "A", prefixed: si("a"), fixed: {} },
  energy: { symbol: "J", prefixed: si("j", "ws"), fixed: {} },
  power: { symbol: "W", prefixed: si("w"), fixed: {} },
  charge: { symbol: "C", prefixed: si("c"), fixed: {} },
  frequency: {
    symbol: "Hz",
    prefixed: si("hz"),
    fixed: { "1/s": ten(0), "/s": ten(0), "1/min": { exponent: 0, factor: 1 / 60 } },
  },
  time: {
    symbol: "s",
    prefixed: si("s"),
    fixed: { min: { exponent: 0, factor: 60 }, h: { exponent: 0, factor: 3600 }, d: { exponent: 0, factor: 86400 } },
  },
  length: { symbol: "m", prefixed: si("m"), fixed: {} },
  area: {
    symbol: "m2",
    prefixed: [],
    fixed: { m2: ten(0), cm2: ten(-4), mm2: ten(-6), "m²": ten(0), "cm²": ten(-4), "mm²": ten(-6) },
  },
  volume: {
    symbol: "m3",
    prefixed: [{ spelling: "l", exponent: -3 }],
    fixed: {
      m3: ten(0),
      dm3: ten(-3),
      cm3: ten(-6),
      mm3: ten(-9),
      "m³": ten(0),
      "dm³": ten(-3),
      "cm³": ten(-6),
      "mm³": ten(-9),
    },
  },
  mass: { symbol: "kg", prefixed: [{ spelling: "g", exponent: -3 }], fixed: { t: ten(3) } },
  fraction: { symbol: "%", prefixed: [], fixed: { "%": ten(-2), percent: ten(-2), ppm: ten(-6) } },
  temperature: { symbol: "degC", prefixed: [], fixed: { degC: ten(0), C: ten(0), "°C": ten(0) } },
  pressure: {
    symbol: "Pa",
    prefixed: [
      { spelling: "pa", exponent: 0 },
      { spelling: "bar", exponent: 5 },
    ],
    fixed: {
      torr: { exponent: 0, factor: 101325 / 760 },
      Torr: { exponent: 0, factor: 101325 / 760 },
      mmHg: { exponent: 0, factor: 101325 / 760 },
    },
  },
  field: {
    symbol: "V/m",
    prefixed: si("v/m"),
    fixed: { "kV/mm": ten(6), "V/mm": ten(3), "kV/cm": ten(5), "V/um": ten(6), "V/µm": ten(6), "MV/m": ten(6) },
  },
  slew: {
    symbol: "V/s",
    prefixed: si("v/s"),
    fixed: { "V/us": ten(6), "V/µs": ten(6), "kV/us": ten(9), "V/ms": ten(3) },
  },
  action: {
    symbol: "A2s",
    prefixed: [],
    fixed: { A2s: ten(0), "A²s": ten(0), "A^2s": ten(0), "A^2 s": ten(0), "A2 s": ten(0), kA2s: ten(3), MA2s: ten(6) },
  },
  count: { symbol: "", prefixed: [], fixed: {} },
} as const satisfies Readonly<Record<string, DimensionRow>>;

export type Dimension = keyof typeof DIMENSIONS;

/** SI prefixes, symbol to power of ten; the three spellings of micro and K for kilo included. */
export const PREFIXES: Readonly<Record<string, number>> = {
  f: -15,
  p: -12,
  n: -9,
  u: -6,
  µ: -6,
  μ: -6,
  U: -6,
  m: -3,
  "": 0,
  k: 3,
  K: 3,
  M: 6,
  G: 9,
  T: 12,
};

const row = (dimension: Dimension): DimensionRow => DIMENSIONS[dimension];

/** The scale of a unit spelling in a dimension, or null when it is no unit of that dimension. */
export function unitScale(written: string, dimension: Dimension): Scale | null {
  const { prefixed, fixed } = row(dimension);
  // The Greek letter mu to the micro sign, so that the whole spellings need only one of the two.
  const unit = written.replaceAll("\u03bc", "\u00b5");
  const exact = Object.hasOwn(fixed, unit) ? fixed[unit] : undefined;
  if (exact) return exact;
  for (const { spelling, exponent } of prefixed) {
    if (!unit.toLowerCase().endsWith(spelling)) continue;
    const prefix = unit.slice(0, unit.length - spelling.length).trimEnd();
    const power = Object.hasOwn(PREFIXES, prefix) ? PREFIXES[prefix] : undefined;
    if (power !== undefined) return { exponent: power + exponent, factor: 1 };
  }
  return null;
}

/** The dimension that a unit spelling belongs to, for saying "that is a voltage". */
export function dimensionOf(unit: string): Dimension | null {
  const names = Object.keys(DIMENSIONS) as Dimension[];
  return names.find((name) => unitScale(unit, name) !== null) ?? null;
}
