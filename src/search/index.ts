// Finds and ranks layouts: the brief, the search, the front, and one arrangement assessed.
export { type AssessInput, assess, type BalanceWish } from "./assess.ts";
export type { Band, BandRow } from "./band.ts";
export { assessBuiltBlend, type BuiltBlend } from "./blendAssess.ts";
export type { BuiltGroup } from "./blendCost.ts";
export { type BlendFault, blendFaults } from "./blendFaults.ts";
export type { SolveApart } from "./blendProof.ts";
export type {
  BlendFront,
  BlendLadder,
  BlendPlan,
  BlendResult,
  BlendString,
  CeilingWorth,
  EngineAnswer,
  FrontName,
  LimitedBlend,
  Loosen,
  NamedCertificate,
  PriceMove,
  Shipment,
  WinningPrice,
  WorstShare,
} from "./blendResult.ts";
export { FRONT_NAMES } from "./blendResult.ts";
export type { BlendInput, BlendStage } from "./blends.ts";
export { planBlends, solveWholeHere } from "./blendsLoader.ts";
export { BASES, BRIEF_KEYS, type Brief, type BriefInput, briefJsonSchema, readBrief } from "./brief.ts";
export { BUS_LENGTHS } from "./briefFaults.ts";
export { unitLimit } from "./candidate.ts";
export { planCurrency, pricedIn } from "./currency.ts";
export { faultBankOf, faultsOf } from "./faults.ts";
export { type FuseChoice, fittedFuse, fuseCount } from "./fuses.ts";
export { type ImproveInput, improve } from "./improve.ts";
export { type InductanceSweep, inductanceSweep, type SweepPoint } from "./inductanceSweep.ts";
export { idealLampCircuit } from "./lampDrive.ts";
export { type LampReport, lampReport } from "./lampReport.ts";
export type { LifeReport } from "./life.ts";
export { LIMIT_KEYS, type RatedLimit } from "./limitKeys.ts";
export { type PlanInput, plan } from "./plan.ts";
export { isProtected, sectionCount } from "./protection.ts";
export { RANKINGS, type Ranking } from "./rank.ts";
export type {
  Balance,
  Change,
  Cost,
  Found,
  Improve,
  Improvement,
  LayoutResult,
  PlanResult,
  Protection,
  RefusedPart,
  Shares,
  Span,
} from "./result.ts";
export { type Risk, type RiskCase, riskOf, tailCaseOf } from "./risk.ts";
export { type BankCourse, bankCourse, type CourseInstant, type CoursePeak } from "./sharing/bankCourse.ts";
export { type BankClamp, clampOf } from "./sharing/clamp.ts";
export { type BankCorners, type CornerFact, cornersOf, heldWords } from "./sharing/corners.ts";
export type { BalanceMends } from "./sharing/mends.ts";
export { type ShareSpread, shareSpread } from "./sharing/shareSpread.ts";
export type { WithoutBalance } from "./sharing/withoutBalance.ts";
export type { ShipmentWish } from "./shipmentTerms.ts";
export { type ShotInput, type ShotReport, shotOf } from "./shot.ts";
export type { Judge } from "./sweepKinds.ts";
