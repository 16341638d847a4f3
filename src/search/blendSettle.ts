// Has a blend model settled, its proof checked and a second engine asked; answers that contradict each other are all kept.

import { blendTotals, isFittingBlend } from "./blend/evaluate.ts";
import { type SettledBlend, settleBlend } from "./blend/fallback.ts";
import type { BlendLimits } from "./blend/findBlend.ts";
import { leastAmount } from "./blend/loosen.ts";
import type { BlendModel } from "./blend/model.ts";
import type { FoundBlend } from "./blend/singles.ts";
import type { BlendWork } from "./blendOptions.ts";
import { type Proof, proofOf, type SecondOpinion, type SolveApart, secondOpinion } from "./blendProof.ts";

export interface SettleWish {
  readonly currency: string | null;
  /** Time for the outside solver, s. */
  readonly seconds: number;
  /** A steady clock, ms; without it the second engine is not asked, for it cannot tell its own time-out. */
  readonly clock?: (() => number) | undefined;
  /** Where the second engine runs so that it can be ended. */
  readonly apart?: SolveApart | undefined;
  readonly stop?: (() => boolean) | undefined;
  /** Limits of each question beside the main one. */
  readonly side: BlendLimits;
  /** Another way to settle, as a test has it. */
  readonly settle?: typeof settleBlend | undefined;
}

export interface Settled {
  readonly provenBy: SettledBlend["provenBy"];
  /** True when nothing cheaper, or nothing at all, can exist by any engine's word and none says otherwise. */
  readonly proven: boolean;
  /** Minor units; null where no bound counts. */
  readonly lowerBound: number | null;
  readonly proof: Proof | null;
  readonly opinion: SecondOpinion["said"];
  /** Cheapest first; more than one only where engines disagree. */
  readonly found: readonly FoundBlend[];
  readonly disagreements: readonly { readonly engine: string; readonly blend: FoundBlend | null }[];
}

export async function settleWork(work: BlendWork, wish: SettleWish): Promise<Settled> {
  const { model } = work;
  const { currency, seconds, clock, apart, stop, side, settle = settleBlend } = wish;
  const answer = await settle(model, {
    ...(stop === undefined ? {} : { stop }),
    seconds,
  });
  const stopped = answer.status === "stopped";
  const proof = stopped ? null : proofOf(work, answer, currency);
  const second = proof === null ? null : await secondOpinion(model, proof, { clock, apart });
  const best = answer.best ?? (stopped ? anyBlend(model, side) : null);
  const rival = second?.blend ?? null;
  const disagreements = [
    ...answer.disagreements.map(({ engine, blend }) => ({ engine, blend })),
    ...(rival === null
      ? []
      : [
          { engine: answer.provenBy ?? "own search", blend: answer.best },
          { engine: "javascript-lp-solver", blend: rival },
        ]),
  ];
  const agreed = disagreements.length === 0;
  const all = [best, ...disagreements.map(({ blend }) => blend)].filter((one): one is FoundBlend => one !== null);
  all.sort((a, b) => a.cost - b.cost);
  const bounded = agreed && Number.isFinite(answer.lowerBound);
  return {
    provenBy: answer.provenBy,
    proven: agreed && !stopped && proof?.named.verdict !== "invalid",
    lowerBound: bounded ? answer.lowerBound : null,
    proof,
    opinion: second?.said ?? "not asked",
    found: all.filter((one, at) => at === 0 || one.cost !== all[at - 1]!.cost),
    disagreements,
  };
}

/** When the search for the cheapest was stopped with nothing in hand: the smallest or lightest blend may still be found. */
function anyBlend(model: BlendModel, limits: BlendLimits): FoundBlend | null {
  for (const row of ["volume", "mass", "units"] as const) {
    if (model.ceilings[row] === Number.POSITIVE_INFINITY) continue;
    const { counts } = leastAmount(model, row, limits);
    if (counts !== null && isFittingBlend(model, counts)) return { counts, cost: blendTotals(model, counts)!.cost };
  }
  return null;
}
