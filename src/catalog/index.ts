// Parts as sold and units as measured: their types, their readers, and what it costs to have q of them.
export {
  CAPACITOR_COLUMNS,
  type Capacitor,
  type PurchaseTerms,
  unitVolume,
  type ValueState,
} from "./capacitor.ts";
export type { PriceBreak } from "./cell.ts";
export { type Column, PURCHASE_COLUMNS } from "./column.ts";
export { readRecords, separatorOf } from "./csv.ts";
export { type Fuse, type FuseCatalogue, readFuses } from "./fuse.ts";
export { type History, type HistoryRow, readHistory } from "./history.ts";
export { type MeasuredLot, type MeasuredUnit, readMeasured } from "./measured.ts";
export { OVERRIDABLE, type Overrides, overridden, readOverrides, withOverrides } from "./overrides.ts";
export { type ListedUnit, readPositions, type UnitList } from "./positions.ts";
export {
  breaksRise,
  cheapest,
  isPriced,
  leastBuyable,
  type Purchase,
  purchase,
  toBuy,
  unitPriceAt,
} from "./purchase.ts";
export { type Catalogue, readCapacitors } from "./readCapacitors.ts";
export { READING_COLUMNS, type Reading, type Readings, readReadings } from "./readings.ts";
export {
  DEFAULT_FAMILY,
  RESISTOR_COLUMNS,
  type ResistorCatalogue,
  type ResistorFamily,
  readResistors,
} from "./resistor.ts";
export { capacitorSchema, readCapacitorData } from "./schema.ts";
export { assumedLeakage, RULES, stateOf } from "./states.ts";
export { readWaveform, type WaveformRow } from "./waveform.ts";
