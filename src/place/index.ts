// Measured units into positions, and what a built bank then reads: what the layers above may use.
export { attainableGap, relativeSpread, type ShapeOfLot } from "./attainable.ts";
export { type BankGaps, bankGaps, gapOfGroups, shares } from "./bankGaps.ts";
export type { BoundKind } from "./boundMatrix.ts";
export { expectedLargest, gapFloor, honestDigits, voltageUncertainty } from "./floor.ts";
export { type Front, type FrontPoint, placingFront } from "./front.ts";
export { type Mend, type Mending, mend } from "./mend.ts";
export { OUTLIER_RULE, type Outlier, outliersOf } from "./outliers.ts";
export { place, placing } from "./place.ts";
export type { ChargingShare, HoldingShare, Placing } from "./placing.ts";
export { type Replacement, replacements } from "./replacements.ts";
export { DEFAULTS, type Pin, type PlaceRequest, type Room } from "./request.ts";
export { type ResistorEffect, resistorEffect } from "./resistorEffect.ts";
export type { SearchStep } from "./solution.ts";
export { keepOrder, SPARE_RULE } from "./spareOrder.ts";
export type { MeasuredUnit, Ties } from "./unit.ts";
