// The proof of a blend by part names, checked by the separate verifier; and a second engine's word on what the proof left open.

import { allPairs, optionForm } from "./blend/blendPrograms.ts";
import { type BlendCertificate, certificatePairs, certify } from "./blend/certificate.ts";
import { blendTotals, isFittingBlend, tidyCounts } from "./blend/evaluate.ts";
import type { BlendAnswer } from "./blend/findBlend.ts";
import type { BlendModel } from "./blend/model.ts";
import { usefulStrings } from "./blend/pool.ts";
import type { Program } from "./blend/program.ts";
import type { FoundBlend } from "./blend/singles.ts";
import { verifyCertificate } from "./blend/verify.ts";
import type { BlendWork } from "./blendOptions.ts";
import type { NamedCertificate } from "./blendResult.ts";
import { solveWhole, type WholeAnswer } from "./solve.ts";

export interface Proof {
  readonly plain: BlendCertificate;
  readonly named: NamedCertificate;
}

/** The certificate of a settled answer, or null when the search was stopped. */
export function proofOf(
  { model, types, senders }: Pick<BlendWork, "model" | "types" | "senders">,
  answer: BlendAnswer,
  currency: string | null,
): Proof | null {
  const plain = certify(model, answer);
  if (plain === null) return null;
  const verdict = verifyCertificate(model, plain);
  const named: NamedCertificate = {
    claim: plain.cost === null ? "no blend exists" : "cheapest",
    cost: plain.cost,
    currency,
    maxTypes: model.maxTypes,
    compared: types.length,
    prices: plain.prices,
    bound: plain.bound,
    survivors: plain.survivors.map(({ option, strings }) => {
      const { unit, series } = types[option]!;
      const suppliers = (model.options[option]!.suppliers ?? []).map((at) => senders[at]!);
      return { part: unit.part, series, strings, ...(senders.length === 0 ? {} : { suppliers }) };
    }),
    ...(senders.length === 0
      ? {}
      : { shipments: Object.fromEntries(senders.map((name, at) => [name, model.shipments![at]!])) }),
    verdict: verdict.verdict,
    why: verdict.verdict === "invalid" ? verdict.why : null,
  };
  return { plain, named };
}

/** Cores up to this many pairs are also given to javascript-lp-solver: within a thread of its own, which can be ended, and without. */
const MOST_PAIRS = { apart: 250, here: 120 } as const;
const MILLISECONDS = 2000;

/** Has a whole-number programme solved where it can be ended: apart from this thread, within so many milliseconds. */
export type SolveApart = (program: Program, milliseconds: number) => Promise<WholeAnswer>;

export interface Asking {
  /** A steady clock, ms, for an engine in this thread, which cannot tell its own time-out. */
  readonly clock?: (() => number) | undefined;
  readonly apart?: SolveApart | undefined;
}

export interface SecondOpinion {
  readonly said: "agrees" | "disagrees" | "no answer" | "not asked";
  /** What it found, when that contradicts the proof. */
  readonly blend: FoundBlend | null;
}

/**
 * Asks the second engine for the cheapest blend of the survivors (of everything, where the claim is that no blend exists).
 * It contradicts the proof only with a blend that is cheaper and fits by our own count.
 */
export async function secondOpinion(model: BlendModel, proof: Proof, { clock, apart }: Asking): Promise<SecondOpinion> {
  const { plain } = proof;
  const notAsked: SecondOpinion = { said: "not asked", blend: null };
  if (clock === undefined && apart === undefined) return notAsked;
  const most = apart === undefined ? MOST_PAIRS.here : MOST_PAIRS.apart;
  if (plain.cost === null) {
    const pairs = model.options.reduce((sum, option) => sum + usefulStrings(model, option), 0);
    if (pairs === 0 || pairs > most) return notAsked;
  }
  const pairs = plain.cost === null ? allPairs(model) : certificatePairs(plain);
  // Without survivors arithmetic alone has settled it: there is nothing left to ask.
  if (pairs.length === 0 || pairs.length > most) return notAsked;
  const { program, read } = optionForm(model, pairs);
  const answer =
    apart !== undefined
      ? await apart(program, MILLISECONDS)
      : solveWhole(program, { milliseconds: MILLISECONDS, ...(clock === undefined ? {} : { clock }) });
  if (answer.status === "unknown") return { said: "no answer", blend: null };
  if (answer.status === "claimed infeasible") return { said: "agrees", blend: null };
  const counts = tidyCounts(read(answer.values));
  if (!isFittingBlend(model, counts)) return { said: "no answer", blend: null };
  const cost = blendTotals(model, counts)!.cost;
  return plain.cost === null || cost < plain.cost
    ? { said: "disagrees", blend: { counts, cost } }
    : { said: "agrees", blend: null };
}
