// An arrangement at rest: its name, energy, shares and balancing resistors.
export { type Choice, chooseBalance, elementPower, leastHolding, MOST_ELEMENTS, surelyChooses } from "./balance.ts";
export {
  type Chain,
  type ChainUnit,
  chainCapacitance,
  chargingShares,
  crossTiedChain,
  endOfHold,
  leftAfterDump as leftOnStages,
  type Stage,
} from "./chain.ts";
export { type ClampCase, type ClampDiode, clampDiode } from "./clampDiode.ts";
export { type Corner, chargingCorners, dumpedCorners, holdingCorners } from "./corners.ts";
export { type HoldCase, type HoldWorst, worstAtHold } from "./cornersHold.ts";
export { holdCornerWords } from "./cornersHoldWords.ts";
export { cornerWords, type Sides, type StageRange, stageRange } from "./cornersRange.ts";
export { type Course, courseOf, type Program } from "./course.ts";
export { type Phase, phaseFrom } from "./coursePhase.ts";
export {
  bankCapacitance,
  FIT,
  leastParallel,
  type Need,
  pulseEnergy,
  requiredCapacitance,
  storedEnergy,
} from "./energy.ts";
export { type FiniteHold, holdHighest, holdWorst, largestBalanceForHold } from "./finiteHold.ts";
export { type Layout, layoutId, plainTies, shapeOf, type Ties, unitCount } from "./layout.ts";
export { type Cause, type CauseShare, type MarginCase, type Margins, marginCauses } from "./margins.ts";
export { CHUNK, type Counts, countedRisk, mergedCounts, monteCarlo, monteCarloChunk } from "./monteCarlo.ts";
export { type Residual, residualAfterDump } from "./residual.ts";
export { type ReversedHold, reversedByHold, reversedMix } from "./reversedHold.ts";
export {
  chargingLeast,
  chargingWorst,
  type HoldingChain,
  holdingWorst,
  type Leak,
  largestBalance,
  leftAfterDump,
} from "./share.ts";
export { shortedHold } from "./shortedHold.ts";
export { exceedRisk, type Tail } from "./tail.ts";
export { riskBound } from "./tailBound.ts";
export { LEAST_LOT, type TailCase, type UnitLaw } from "./tailLaw.ts";
