// Numbers with units, preferred values, component codes, money, and the shapes of refusals and findings.
export { DIMENSIONS, type Dimension, dimensionOf, type Scale, unitScale } from "./dimension.ts";
export { type FileVersion, versionFault } from "./fileVersion.ts";
export type { BankState, Finding, Verdict } from "./finding.ts";
export { type FormatOptions, formatQuantity, type Rounding, roundTo, toAscii } from "./format.ts";
export { type Claim, withinLeast, withinMost } from "./judge.ts";
export { formatMoney, isCurrency, lineCost, minorDigits, parsePrice, toMajor } from "./money.ts";
export { nearestWord } from "./nearest.ts";
export { example, type ParseOptions, parseQuantity } from "./parse.ts";
export { power, tenTo } from "./power.ts";
export { accepted, type Place, type Read, type Refusal, refused } from "./refusal.ts";
export {
  lastAtMost,
  preferredAtLeast,
  preferredAtMost,
  preferredNearest,
  SERIES,
  SERIES_NAMES,
  type SeriesName,
  seriesBetween,
} from "./series.ts";
export { parseTolerance, TOLERANCE_LETTERS, type Tolerance } from "./tolerance.ts";
