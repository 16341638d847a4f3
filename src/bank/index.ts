// An arrangement at rest: its name, energy, shares and balancing resistors.
export { type Choice, chooseBalance, elementPower } from "./balance.ts";
export {
  bankCapacitance,
  FIT,
  leastParallel,
  type Need,
  pulseEnergy,
  requiredCapacitance,
  storedEnergy,
} from "./energy.ts";
export { type FiniteHold, holdWorst, largestBalanceForHold } from "./finiteHold.ts";
export { type Layout, layoutId, plainTies, shapeOf, type Ties, unitCount } from "./layout.ts";
export {
  chargingLeast,
  chargingWorst,
  type HoldingChain,
  holdingWorst,
  type Leak,
  largestBalance,
  leftAfterDump,
} from "./share.ts";
