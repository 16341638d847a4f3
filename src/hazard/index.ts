// What can hurt: stored energy, bleed, dump, what comes back, and the words that go with every result.
export {
  type Bleed,
  type BleedPaths,
  bleedPaths,
  bleedTime,
  energyAtSafe,
  largestBleed,
  timeToEnergy,
  voltageAfter,
} from "./bleed.ts";
export { CAUTIONS, type Caution, cautionsFor, DEFERENCE, type Traits } from "./cautions.ts";
export { type ChargeCheck, chargeChecks, voltageForCharge } from "./charge.ts";
export { clearingVoltage, timeUntilClear } from "./clear.ts";
export {
  ALTITUDES,
  altitudeFactor,
  BENCH_RULES,
  CLEARANCES,
  type ClearanceAdvice,
  clearanceAdvice,
  POLLUTION_FLOORS,
} from "./clearance.ts";
export { type DumpDuty, type DumpUse, dumpDuty, dumpUse, dumpWindow, SPECIFIC_HEATS } from "./dump.ts";
export { ARTICLE_360, type EnergyClass, energyClass, type Tier, tierAt } from "./energyClass.ts";
export { type HazardOf, hazardFindings } from "./findings.ts";
export { type Governed, governedFindings, inScope, TOUCH_SAFE } from "./governed.ts";
export { type Clearing, clearingOf } from "./governing.ts";
export { type Recovery, recovery } from "./recovery.ts";
export type { HowRead, Limit, Rule, VoltageRange } from "./rule.ts";
export { RULES, type RuleId, ruleOf } from "./rules.ts";
