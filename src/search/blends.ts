// The front door of blends: brief and parts to the cheapest mix of strings, its proof, its rivals, and what would change it.

import { FIT, requiredCapacitance } from "../bank/index.ts";
import { type Capacitor, DEFAULT_FAMILY, type ResistorFamily } from "../catalog/index.ts";
import { accepted, minorDigits, type Read, toMajor } from "../quantity/index.ts";
import { findAlternatives } from "./blend/alternatives.ts";
import { isFittingBlend } from "./blend/evaluate.ts";
import { settleBlend } from "./blend/fallback.ts";
import type { BlendLimits } from "./blend/findBlend.ts";
import type { BlendCount } from "./blend/model.ts";
import { rowWorth } from "./blend/rowWorth.ts";
import type { FoundBlend } from "./blend/singles.ts";
import { assessBlend, type Group, kindOf } from "./blendAssess.ts";
import { loosenBlend } from "./blendLoosen.ts";
import { type BlendWork, blendWork } from "./blendOptions.ts";
import { priceMoves, winningPrices } from "./blendPrices.ts";
import { type Proof, proofOf, secondOpinion } from "./blendProof.ts";
import type { BlendPlan, BlendResult, CeilingWorth, EngineAnswer, Loosen } from "./blendResult.ts";
import { stringsCost } from "./blendString.ts";
import type { Brief } from "./brief.ts";
import { planCurrency, pricedIn } from "./currency.ts";
import { distinct } from "./plan.ts";

export interface BlendInput {
  readonly brief: Brief;
  readonly parts: readonly Capacitor[];
  /** Default: the assumed family. */
  readonly families?: readonly ResistorFamily[];
  /** Most string types in one bank; default 4. */
  readonly maxTypes?: number;
  /** What ordering each part costs as such, major money; default 0. */
  readonly lineCost?: number;
  /** List other kinds of blend up to so much dearer; 0.02 is 2 %. */
  readonly within?: number;
  /** Also work out what prices and ceilings are worth. */
  readonly explain?: boolean;
  /** Time for the outside solver, s; default 10. */
  readonly seconds?: number;
  /** A steady clock, ms. Without it no engine that cannot tell its own time-out is asked. */
  readonly clock?: () => number;
  readonly stop?: () => boolean;
  /** Settles the model; another may be put in its place, as a test does. */
  readonly settle?: typeof settleBlend;
}

const MOST_TYPES = 4;
const MOST_ALTERNATIVES = 9;
/** Steps of work for each question beside the main one. */
const SIDE_WORK = 2e6;
/** Parts beside those of the blend whose prices are asked about. */
const OTHERS_ASKED = 8;

/** Refuses only what cannot be understood (two currencies); that nothing fits is an answer, with what to loosen. */
export async function planBlends(input: BlendInput): Promise<Read<BlendPlan>> {
  const { brief, maxTypes = MOST_TYPES, explain = false } = input;
  const given = input.families ?? [DEFAULT_FAMILY];
  const money = planCurrency(brief, input.parts, given);
  if (!money.ok) return money;
  const currency = money.value;
  const minor = 10 ** minorDigits(currency ?? "");
  const terms = {
    brief,
    families: pricedIn(given, currency, brief),
    lineCost: Math.round((input.lineCost ?? 0) * minor),
  };
  const parts = pricedIn(distinct(input.parts), currency, brief);
  const demand = { parts, terms, required: requiredCapacitance(brief), maxTypes };
  const work = blendWork(demand);
  const { model, types } = work;
  const stop = input.stop === undefined ? {} : { stop: input.stop };
  const side: BlendLimits = { work: SIDE_WORK, ...stop };

  const answer = await (input.settle ?? settleBlend)(model, { ...stop, seconds: input.seconds ?? 10 });
  const proof = answer.status === "stopped" ? null : proofOf(model, types, answer, currency);
  const opinion = proof === null ? null : secondOpinion(model, proof, input.clock);
  const nameOf = ({ counts }: FoundBlend): string =>
    assessBlend({ groups: groupsOf(work, counts), terms, currency }).id;
  const contradicted = opinion?.blend ?? null;
  const disagreements: EngineAnswer[] = [
    ...answer.disagreements.map(({ engine, blend }) => ({
      engine,
      cost: blend?.cost ?? null,
      id: blend === null ? null : nameOf(blend),
    })),
    ...(contradicted === null
      ? []
      : [
          {
            engine: answer.provenBy ?? "own search",
            cost: answer.best?.cost ?? null,
            id: answer.best === null ? null : nameOf(answer.best),
          },
          { engine: "javascript-lp-solver", cost: contradicted.cost, id: nameOf(contradicted) },
        ]),
  ];
  const both = [contradicted, ...answer.disagreements.map(({ blend }) => blend), answer.best];
  const found = both
    .filter((one): one is FoundBlend => one !== null)
    .sort((a, b) => a.cost - b.cost)
    .filter((one, at, all) => at === 0 || (disagreements.length > 0 && one.cost !== all[at - 1]!.cost));
  const cheapest = found[0] ?? null;
  const dear = cheapest !== null && brief.maxCost !== undefined && cheapest.cost > brief.maxCost * minor * (1 + FIT);
  // Contradicted or dearer than the ceiling while cheaper ones are not ruled out: nothing is proven.
  const proven = disagreements.length === 0 && answer.status !== "stopped";
  const beyond = dear && (proven || answer.lowerBound > brief.maxCost! * minor * (1 + FIT));
  const sure = proven && proof?.named.verdict !== "invalid";
  const certified = (made: Omit<BlendResult, "certificate">, cost: number): NamedOrNull =>
    sure && Math.round((made.cost?.total ?? 0) * minor) === cost ? (proof?.named ?? null) : null;
  const made = dear ? [] : found.map((one) => assessed(one));
  function assessed(one: FoundBlend): BlendResult {
    const whole = assessBlend({ groups: groupsOf(work, one.counts), terms, currency });
    return { ...whole, certificate: one === cheapest ? certified(whole, one.cost) : null };
  }
  const asked = input.within !== undefined && cheapest !== null && !dear;
  const others = asked
    ? findAlternatives(
        model,
        {
          cheapest: cheapest.cost,
          within: input.within ?? 0,
          most: MOST_ALTERNATIVES,
          kindOf: (counts) => kindOf(groupsOf(work, counts)),
        },
        side,
      )
    : null;
  const kinds = new Set(made.map(({ kind }) => kind));
  const rivals = (others?.blends ?? [])
    .filter(({ cost }) => brief.maxCost === undefined || cost <= brief.maxCost * minor * (1 + FIT))
    .map((one) => assessed(one))
    .filter(({ kind }) => !kinds.has(kind));
  const question = { model, types, cheapest, currency: currency ?? "", limits: side };
  const nothing = made.length === 0;
  const loosen = !nothing
    ? []
    : dear
      ? [costLoosened(brief, cheapest!.cost / minor, proven)]
      : loosenBlend(demand, currency, side);
  const status =
    nothing && (beyond || (proven && cheapest === null))
      ? "infeasible"
      : sure && !nothing && made[0]!.certificate !== null
        ? "optimal"
        : "stopped";
  const lower = Number.isFinite(answer.lowerBound) && disagreements.length === 0 ? answer.lowerBound : null;
  return accepted({
    currency,
    maxTypes,
    compared: types.length,
    status,
    provenBy: status === "stopped" ? null : answer.provenBy,
    lowerBound: lower === null || currency === null ? null : toMajor(lower, currency),
    gap: cheapest === null ? null : status === "optimal" ? 0 : lower === null ? null : gapOf(cheapest.cost, lower),
    blends: [...made, ...rivals],
    certificate: nothing && sure ? (proof?.named ?? null) : null,
    secondOpinion: opinion?.said ?? "not asked",
    disagreements,
    alternativesComplete: others?.complete ?? null,
    leftOut: work.leftOut,
    loosen,
    winningPrices: currency === null ? [] : winningPrices(question, work.unpriced),
    priceMoves:
      explain && currency !== null && !nothing ? priceMoves(question, nearOptions(proof, cheapest!), nameOf) : [],
    worth: explain && currency !== null && !nothing ? worthOf(work, proof, cheapest!, minor) : null,
    notes: notesOf(input, work),
  });
}

type NamedOrNull = Proof["named"] | null;

const gapOf = (cost: number, lower: number): number => (cost === 0 ? 0 : Math.max(0, cost - lower) / cost);

const costLoosened = (brief: Brief, to: number, proven: boolean): Loosen => ({
  field: "maxCost",
  from: brief.maxCost!,
  to,
  change: brief.maxCost === 0 ? null : to / brief.maxCost! - 1,
  cost: to,
  proven,
});

/**
 * Counts as groups. Where a table was levelled, the count that really has the cost is built, if it fits: a resistor of few
 * elements for more strings may be cheaper than one for fewer.
 */
function groupsOf({ model, types }: BlendWork, counts: readonly BlendCount[]): readonly Group[] {
  const raised = counts.map(({ option, strings }) => {
    const { costs, maxStrings } = model.options[option]!;
    let x = strings;
    while (x < maxStrings && (stringsCost(types[option]!, x) ?? 0) > costs[strings]!) x += 1;
    return { option, strings: x };
  });
  const chosen = isFittingBlend(model, raised) ? raised : counts;
  return chosen.map(({ option, strings }) => ({ type: types[option]!, strings }));
}

/** Options that the proof could not rule out by arithmetic alone, the blend's own left out. */
function nearOptions(proof: Proof | null, cheapest: FoundBlend): readonly number[] {
  const used = new Set(cheapest.counts.map(({ option }) => option));
  const open = proof?.plain.survivors.map(({ option }) => option) ?? [];
  return open.filter((option) => !used.has(option)).slice(0, OTHERS_ASKED);
}

function worthOf({ model }: BlendWork, proof: Proof | null, cheapest: FoundBlend, minor: number): CeilingWorth | null {
  const open = proof?.plain.survivors.map(({ option }) => option) ?? [];
  const among = [...new Set([...open, ...cheapest.counts.map(({ option }) => option)])].sort((a, b) => a - b);
  const worth = rowWorth(model, among);
  if (worth === null) return null;
  const { volume, mass, units, types } = worth;
  return { volume: volume / minor, mass: mass / minor, units: units / minor, types: types / minor };
}

function notesOf({ brief, lineCost }: BlendInput, { types }: BlendWork): readonly string[] {
  const notes = [
    "A blend is made of whole strings, each part in its least safe series count; resistors are bought for each group on its own.",
  ];
  if (brief.spares > 0)
    notes.push("Spares are bought for every part of a blend: one part cannot stand in for another.");
  if (brief.basis === "statistical")
    notes.push("Strings of a blend share safely in the worst case, also under the statistical basis.");
  if ((lineCost ?? 0) > 0) notes.push("The cost of a line is counted once for every part of which any must be bought.");
  if (types.some(({ terms }) => terms.families.every((family) => family.price === undefined && !family.priceBreaks)))
    notes.push("Balancing resistors have no price and count nothing in the comparison.");
  return notes;
}
