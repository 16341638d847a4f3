// Finds and ranks layouts: the brief, the search, the front, and one arrangement assessed.
export { type AssessInput, assess, type BalanceWish } from "./assess.ts";
export type {
  BlendPlan,
  BlendResult,
  BlendString,
  CeilingWorth,
  EngineAnswer,
  Loosen,
  NamedCertificate,
  PriceMove,
  WinningPrice,
  WorstShare,
} from "./blendResult.ts";
export type { BlendInput } from "./blends.ts";
export { planBlends } from "./blendsLoader.ts";
export { BASES, BRIEF_KEYS, type Brief, type BriefInput, briefJsonSchema, readBrief } from "./brief.ts";
export { planCurrency, pricedIn } from "./currency.ts";
export { faultBankOf, faultsOf } from "./faults.ts";
export { type PlanInput, plan } from "./plan.ts";
export { RANKINGS, type Ranking } from "./rank.ts";
export type { Balance, Change, Cost, LayoutResult, PlanResult, RefusedPart, Shares, Span } from "./result.ts";
export { type Risk, type RiskCase, riskOf } from "./risk.ts";
