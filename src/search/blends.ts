// The front door of blends: brief and parts to the cheapest mix of strings, its proof, its rivals, and what would change it.

import { FIT, requiredCapacitance } from "../bank/index.ts";
import { breaksRise, type Capacitor, DEFAULT_FAMILY, isPriced, type ResistorFamily } from "../catalog/index.ts";
import { accepted, minorDigits, type Read, tenTo, toMajor } from "../quantity/index.ts";
import { findAlternatives } from "./blend/alternatives.ts";
import type { settleBlend } from "./blend/fallback.ts";
import type { FoundBlend } from "./blend/singles.ts";
import { assessBlend, kindOf } from "./blendAssess.ts";
import { blendFronts, blendLadder } from "./blendFronts.ts";
import { groupsOf } from "./blendGroups.ts";
import { keepingLimits } from "./blendKept.ts";
import { brokenLimit } from "./blendLimits.ts";
import { costLoosened, loosenBlend } from "./blendLoosen.ts";
import { type BlendDemand, type BlendWork, blendWork } from "./blendOptions.ts";
import { priceMoves, winningPrices } from "./blendPrices.ts";
import type { SolveApart } from "./blendProof.ts";
import type { BlendPlan, BlendResult, FrontName } from "./blendResult.ts";
import { settleWork } from "./blendSettle.ts";
import { UNNAMED } from "./blendShipments.ts";
import { stockMoves } from "./blendStock.ts";
import { nearOptions, worthOf } from "./blendWorth.ts";
import type { Brief } from "./brief.ts";
import { planCurrency, pricedIn } from "./currency.ts";
import { hasLimits } from "./limits.ts";
import { distinct } from "./plan.ts";
import { type ShipmentWish, shipmentTerms } from "./shipmentTerms.ts";

/** What is being worked out: the cheapest blend, those of another kind, the cost ladder. */
export type BlendStage = "cheapest" | "kinds" | "ladder";

export interface BlendInput {
  readonly brief: Brief;
  readonly parts: readonly Capacitor[];
  /** Default: the assumed family. */
  readonly families?: readonly ResistorFamily[];
  /** Most string types in one bank; default 4. */
  readonly maxTypes?: number;
  /** What ordering each part costs as such, major money; default 0. */
  readonly lineCost?: number;
  /** What a shipment costs, major money: by supplier where named, else `each`; default 0. */
  readonly shipments?: ShipmentWish;
  /** List other kinds of blend up to so much dearer; 0.02 is 2 %. */
  readonly within?: number;
  /** Fronts of cost against these. */
  readonly fronts?: readonly FrontName[];
  /** The cost ladder from so much less energy to so much more: 0.5 is from half to half more. */
  readonly ladder?: number;
  /** Also work out what prices and ceilings are worth. */
  readonly explain?: boolean;
  /** Time for the outside solver, s; default 10. */
  readonly seconds?: number;
  /** A steady clock, ms. Without it no engine that cannot tell its own time-out is asked. */
  readonly clock?: () => number;
  /** Where the second engine runs so that it can be ended; without it, in this thread, on smaller cores. */
  readonly apart?: SolveApart;
  readonly stop?: () => boolean;
  /** Called as each stage begins. */
  readonly told?: (stage: BlendStage) => void;
  /** Settles the model; another may be put in its place, as a test does. */
  readonly settle?: typeof settleBlend;
}

const MOST_TYPES = 4;
const MOST_ALTERNATIVES = 9;
const SECONDS = 10;
/** Steps of work for each question beside the main one. */
const SIDE_WORK = 1e6;

/** Refuses only what cannot be understood (two currencies); that nothing fits is an answer, with what to loosen. */
export async function planBlends(input: BlendInput): Promise<Read<BlendPlan>> {
  const { brief, maxTypes = MOST_TYPES, explain = false, stop, told } = input;
  const given = input.families ?? [DEFAULT_FAMILY];
  const money = planCurrency(brief, input.parts, given);
  if (!money.ok) return money;
  const currency = money.value;
  const minor = tenTo(minorDigits(currency ?? ""));
  const lineCost = Math.round((input.lineCost ?? 0) * minor);
  const shipments = shipmentTerms(input.shipments, minor);
  const terms = { brief, families: pricedIn(given, currency, brief), lineCost, shipments };
  const parts = pricedIn(distinct(input.parts), currency, brief);
  const demand = { parts, terms, required: requiredCapacitance(brief), maxTypes };
  const work = blendWork(demand);
  const side = { work: SIDE_WORK, ...(stop === undefined ? {} : { stop }) };
  told?.("cheapest");
  const settled = await settleWork(work, { ...input, currency, side, seconds: input.seconds ?? SECONDS });

  const made = (one: FoundBlend): Omit<BlendResult, "certificate"> =>
    assessBlend({ groups: groupsOf(work, one.counts), terms, currency });
  const kept = keepingLimits(work, settled, { brief, made, stop });
  const { proof, lowerBound: lower, proven, limited } = kept;
  const [cheapest = null] = kept.found;
  const most = brief.maxCost === undefined ? Number.POSITIVE_INFINITY : brief.maxCost * minor * (1 + FIT);
  const dear = cheapest !== null && cheapest.cost > most;
  const blends = kept.found
    .filter(({ cost }) => cost <= most)
    .map((one): BlendResult => {
      const whole = made(one);
      // What the assessment adds up must be what the proof is about.
      const same = Math.round((whole.cost?.total ?? 0) * minor) === one.cost;
      return { ...whole, certificate: proven && same ? (proof?.named ?? null) : null };
    });
  const none = blends.length === 0;
  const ruledOut = none && (proven || (dear && lower !== null && lower > most));
  const certain = limited === null ? blends[0]?.certificate !== null : proven;
  const status = ruledOut ? "infeasible" : !none && certain ? "optimal" : "stopped";
  if (input.within !== undefined && !none) told?.("kinds");
  const others =
    input.within === undefined || none
      ? null
      : findAlternatives(
          work.model,
          {
            cheapest: cheapest!.cost,
            within: input.within,
            most: MOST_ALTERNATIVES,
            kindOf: (counts) => kindOf(groupsOf(work, counts)),
          },
          side,
        );
  const kinds = new Set(blends.map(({ kind }) => kind));
  const rivals = (others?.blends ?? [])
    .filter(({ cost }) => cost <= most)
    .map((one): BlendResult => ({ ...made(one), certificate: null }))
    .filter((one) => !kinds.has(one.kind) && (!hasLimits(brief) || brokenLimit(one, brief) === null));
  const nameOf = (one: FoundBlend, of: BlendWork): string =>
    assessBlend({ groups: groupsOf(of, one.counts), terms, currency }).id;
  const sweeps = {
    demand,
    currency: currency ?? "",
    limits: side,
    made: (one: FoundBlend, of: BlendWork, its: BlendDemand) =>
      assessBlend({ groups: groupsOf(of, one.counts), terms: its.terms, currency }),
  };
  const asked = { ...work, cheapest, currency: currency ?? "", limits: side };
  if (input.ladder !== undefined) told?.("ladder");
  const ladder = currency === null || input.ladder === undefined ? null : blendLadder(input.ladder, sweeps);
  // What a price or a limit is worth is reckoned without the limits on the shot, so not where those decide.
  const detailed = explain && currency !== null && !none && limited === null;
  return accepted({
    currency,
    maxTypes,
    compared: work.types.length,
    status,
    provenBy: status === "stopped" ? null : settled.provenBy,
    lowerBound: lower === null || currency === null ? null : toMajor(lower, currency),
    gap: none ? null : status === "optimal" ? 0 : gapOf(cheapest!.cost, lower),
    blends: [...blends, ...rivals],
    certificate:
      (none && proven && limited === null) || proof?.named.verdict === "invalid" ? (proof?.named ?? null) : null,
    limited,
    secondOpinion: settled.opinion,
    disagreements: settled.disagreements.map(({ engine, blend }) => ({
      engine,
      cost: blend?.cost ?? null,
      id: blend === null ? null : made(blend).id,
    })),
    alternativesComplete: others?.complete ?? null,
    leftOut: work.leftOut,
    loosen: !none
      ? []
      : dear
        ? [costLoosened(brief, cheapest.cost / minor, proven)]
        : limited !== null
          ? []
          : loosenBlend(demand, currency, side),
    winningPrices: currency === null ? [] : winningPrices(asked, work.unpriced),
    priceMoves: detailed ? priceMoves(asked, nearOptions(proof, cheapest!), (blend) => made(blend).id) : [],
    stockMoves: detailed ? stockMoves({ work, demand, cheapest: cheapest!, currency, limits: side, nameOf }) : [],
    fronts: currency === null ? [] : blendFronts(input.fronts ?? [], sweeps),
    ladder,
    worth: detailed ? worthOf(work.model, proof, cheapest!, minor) : null,
    notes: notesOf(input, work),
  });
}

function gapOf(cost: number, lower: number | null): number | null {
  if (cost === 0) return 0;
  return lower === null ? null : Math.max(0, cost - lower) / cost;
}

function notesOf(
  { brief, lineCost = 0, fronts, ladder }: BlendInput,
  { types, senders }: BlendWork,
): readonly string[] {
  const notes = [
    "A blend is made of whole strings, each part in its least safe series count; resistors are bought for each group on its own.",
  ];
  if (brief.spares > 0)
    notes.push("Spares are bought for every part of a blend: one part cannot stand in for another.");
  if (brief.basis === "statistical")
    notes.push("Strings of a blend share safely in the worst case, also under the statistical basis.");
  if (lineCost > 0) notes.push("The cost of a line is counted once for every part of which any must be bought.");
  if (hasLimits(brief))
    notes.push(
      "A mix is kept only where its shot can be reckoned: a resistor, a coil or a short as the load, and the ESR and ESL of every part. At most twice the strings of a part that would meet the need alone are looked at.",
    );
  if (hasLimits(brief) && ((fronts?.length ?? 0) > 0 || ladder !== undefined))
    notes.push("Fronts and ladder leave the limits on the shot out of account.");
  const rising = types
    .map(({ unit }) => unit)
    .filter(breaksRise)
    .map(({ part }) => part);
  if (rising.length > 0)
    notes.push(
      `A larger quantity has a higher unit price in the list of ${[...new Set(rising)].slice(0, 5).join(", ")}${rising.length > 5 ? " and others" : ""}: legal, and taken as it stands.`,
    );
  if (senders.length > 0)
    notes.push(
      "A shipment is charged once for every supplier of whom capacitors, or resistors with a price, must be bought.",
    );
  if (senders.includes(UNNAMED))
    notes.push("What has no supplier in the catalogue is taken to come in one shipment of its own.");
  if (types.some(({ series, terms }) => series > 1 && !terms.families.some(isPriced)))
    notes.push("Balancing resistors have no price and count nothing in the comparison.");
  return notes;
}
