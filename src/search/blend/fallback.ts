// The own search with a share of work, then HiGHS for what it left open; two engines that disagree are both heard.
import { solveWithHighs } from "../highs.ts";
import { runForm } from "./blendPrograms.ts";
import { blendTotals, isFittingBlend, tidyCounts } from "./evaluate.ts";
import { type BlendAnswer, type BlendLimits, findBlend } from "./findBlend.ts";
import type { BlendModel } from "./model.ts";
import { coreUnder } from "./searchUnder.ts";
import type { FoundBlend } from "./singles.ts";
import { thinCore } from "./thinCore.ts";

export interface SettledBlend extends BlendAnswer {
  /** Who proved it; null when nobody did. A proof by HiGHS is its word, checked only for the blend itself. */
  readonly provenBy: "own search" | "HiGHS" | null;
  /** Answers that contradict each other, in words a builder can act on; empty as a rule. */
  readonly disagreements: readonly {
    readonly engine: "own search" | "HiGHS";
    readonly blend: FoundBlend | null;
    readonly lowerBound: number;
  }[];
}

/**
 * Work of the own search before HiGHS is asked, some tenths of a second to a second or two. A count of steps and not of time, so that
 * the same input ends in the same bytes. Asking sooner was tried: on the cost tables HiGHS takes several times as long as on
 * a price list, so that less was won than lost.
 */
export const SHARE_OF_WORK = 1e6;
/** Work of the own search when HiGHS had no answer either. */
const LAST_WORK = 4e6;

export interface SettleLimits extends BlendLimits {
  /** Time for HiGHS, s. */
  readonly seconds?: number;
}

/** The cheapest blend by whichever engine proves it, each in its share. `seconds` bounds HiGHS. */
export async function settleBlend(model: BlendModel, limits: SettleLimits = {}): Promise<SettledBlend> {
  const own = findBlend(model, { ...limits, work: limits.work ?? SHARE_OF_WORK });
  if (own.status !== "stopped") return { ...own, provenBy: "own search", disagreements: [] };
  if (limits.stop?.()) return { ...own, provenBy: null, disagreements: [] };
  // Only options that could beat the best blend known are passed on; without one, all are.
  const among =
    own.best === null ? null : thinCore(coreUnder(model, own.best.cost)).columns.map(({ option }) => option);
  const { program, read } = runForm(model, among);
  const answer = await solveWithHighs(program, { seconds: limits.seconds ?? 10 });
  const counts = answer.status !== "infeasible" && answer.values !== null ? tidyCounts(read(answer.values)) : null;
  const blend =
    counts !== null && isFittingBlend(model, counts) ? { counts, cost: blendTotals(model, counts)!.cost } : null;
  const best = blend !== null && (own.best === null || blend.cost < own.best.cost) ? blend : own.best;
  const gap = (lower: number): number | null =>
    best === null ? null : best.cost === 0 ? 0 : Math.max(0, best.cost - lower) / best.cost;
  if (blend !== null && blend.cost < own.lowerBound) {
    const disagreements = [
      { engine: "own search" as const, blend: own.best, lowerBound: own.lowerBound },
      { engine: "HiGHS" as const, blend, lowerBound: blend.cost },
    ];
    return { ...own, best, lowerBound: 0, gap: gap(0), provenBy: null, disagreements };
  }
  if (answer.status === "unknown" || (answer.status === "optimal" && blend === null)) {
    // The bound of a pass over fewer options says nothing about the others below it, but none of those beats the best known.
    const bound = answer.status === "unknown" && answer.bound !== null ? Math.ceil(answer.bound - 1e-3) : 0;
    const lowerBound = Math.max(own.lowerBound, Math.min(bound, own.best?.cost ?? bound));
    const met = best !== null && lowerBound >= best.cost;
    // A caller who set the work has said how much is enough.
    const last = met || limits.work !== undefined ? null : findBlend(model, { ...limits, work: LAST_WORK });
    if (last !== null && last.status !== "stopped") return { ...last, provenBy: "own search", disagreements: [] };
    return {
      ...own,
      best,
      lowerBound,
      gap: gap(lowerBound),
      status: met ? "optimal" : "stopped",
      provenBy: met ? "HiGHS" : null,
      disagreements: [],
    };
  }
  // Without anything cheaper among the options that could bring it, the blend in hand is the cheapest.
  const status = best === null ? "infeasible" : "optimal";
  const lowerBound = best?.cost ?? Number.POSITIVE_INFINITY;
  return { ...own, best, lowerBound, gap: best === null ? null : 0, status, provenBy: "HiGHS", disagreements: [] };
}
