// What a blend's proof says, in words: one sentence for everybody, step by step for those who ask, and what to loosen.

import { visible } from "../order/index.ts";
import { type Dimension, formatMoney, formatQuantity } from "../quantity/index.ts";
import type { BlendPlan, Loosen, NamedCertificate } from "../search/index.ts";
import { movesText, stockText, worthText } from "./blendMoveWords.ts";
import { money } from "./layoutText.ts";
import { wrap } from "./wrap.ts";

/** How sure it is. `ended`: what kept it from being settled, where it is not. */
export function proofSentence(plan: BlendPlan, ended = "in the time allowed (--solver-time)"): string {
  const { status, compared, provenBy, lowerBound, gap, currency, blends } = plan;
  const among = `${compared} ${compared === 1 ? "kind" : "kinds"} of string compared.`;
  if (status === "optimal" && plan.limited !== null)
    return `${among} The cheapest that keeps the limits on shot and faults is proven by trying: ${triedWords(plan)}`;
  if (status === "optimal") {
    const check =
      blends[0]?.certificate?.verdict === "valid"
        ? "its proof was checked by a separate verifier"
        : "its proof was too long to be checked again here";
    return `${among} The cheapest is proven (${provenBy ?? "own search"}): ${check}.`;
  }
  if (status === "infeasible" && plan.limited !== null)
    return `${among} It is proven by trying that no blend keeps the limits on shot and faults: ${triedWords(plan)}`;
  if (plan.limited !== null)
    return `${among} Not settled: no blend was found that keeps the limits on shot and faults, and not all could be tried. ${triedWords(plan)}`;
  if (status === "infeasible")
    return `${among} ${plan.loosen.some(({ field }) => field === "maxCost") ? "The cheapest costs more than the limit" : "It is proven that none meets the need within the limits"} (${provenBy ?? "own search"}).`;
  if (plan.certificate?.verdict === "invalid")
    return `${among} NOT PROVEN: the separate verifier rejects the proof (${plan.certificate.why}). Please report this with the catalogue and the brief.`;
  if (blends.length === 0 || gap === null) return `${among} Not settled ${ended}.`;
  const least = lowerBound === null ? "" : ` No blend costs less than ${money(lowerBound, currency ?? undefined)}:`;
  return `${among} NOT PROVEN: the best found ${ended}.${least} it is at most ${formatQuantity(gap, "fraction", { digits: 3, rounding: "up" })} too dear.`;
}

/** How many were turned down, and what the cheapest of all broke. */
function triedWords({ limited, currency }: BlendPlan): string {
  if (limited === null) return "";
  const { rejected, cheapest } = limited;
  const count = `${rejected} cheaper ${rejected === 1 ? "one breaks one of them, or is" : "ones each break one of them, or are"} not proven to keep it.`;
  const { broken, id, cost } = cheapest;
  if (broken === null) return count;
  const show = (x: number | null): string =>
    x === null ? "unknown" : `${Number(x.toPrecision(4))} ${broken.unit === "1" ? "" : broken.unit}`.trim();
  const price = cost === null ? "" : ` at ${money(cost, currency ?? undefined)}`;
  const how = broken.open ? "is not proven to keep" : "breaks";
  return `${count} The cheapest of all, ${visible(id)}${price}, ${how} the limit on ${broken.limit.replaceAll("-", " ")}: ${show(broken.value)} on a unit of ${visible(broken.part)}, allowed ${show(broken.allowed)}.`;
}

const LIMITS: Readonly<Record<Loosen["field"], readonly [name: string, dimension: Dimension | "money"]>> = {
  maxCost: ["the most it may cost", "money"],
  maxVolume: ["the most room", "volume"],
  maxMass: ["the most mass", "mass"],
  maxUnits: ["the most units", "count"],
  "all ceilings": ["all limits on room, mass and units together", "count"],
  maxTypes: ["the most parts in one bank", "count"],
  energy: ["the energy of a pulse", "energy"],
};

/** `raise the most room from 3 L to 3.4 L (12 %): then the cheapest costs 210.00 EUR`. */
export function loosenWords({ field, from, to, change, cost, proven }: Loosen, currency: string | null): string {
  const [name, dimension] = LIMITS[field];
  const show = (x: number, rounding: "up" | "down" | "nearest"): string =>
    dimension === "money"
      ? money(x, currency ?? undefined)
      : formatQuantity(x, dimension, { digits: dimension === "count" ? 8 : 4, rounding });
  const lower = field === "energy";
  const percent =
    change === null || !Number.isFinite(change)
      ? ""
      : ` (${formatQuantity(change, "fraction", { digits: 3, rounding: "up" })})`;
  const then =
    cost === null || field === "maxCost" ? "" : `: then the cheapest costs ${money(cost, currency ?? undefined)}`;
  const least = proven ? "" : "; less may do";
  if (field === "all ceilings")
    return `raise ${name} by ${formatQuantity(change ?? 0, "fraction", { digits: 3, rounding: "up" })}${then}${least}`;
  return `${lower ? "lower" : "raise"} ${name} from ${show(from, "nearest")} to ${show(to ?? from, lower ? "down" : "up")}${percent}${then}${least}`;
}

/** The proof step by step, what prices would change it, and what more room is worth. */
export function explainText(plan: BlendPlan, width: number): string {
  const certificate = plan.blends[0]?.certificate ?? plan.certificate;
  const steps =
    certificate === null
      ? ["There is no proof to explain: the search was stopped before one."]
      : proofSteps(certificate, plan);
  const numbered = steps.map((step, at) => wrap(`${at + 1}. ${step}`, width, "  "));
  return `${[`How this is known\n${numbered.join("\n")}`, ...movesText(plan, width), ...stockText(plan, width), ...worthText(plan, width)].join("\n\n")}\n`;
}

function proofSteps(proof: NamedCertificate, plan: BlendPlan): readonly string[] {
  const show = (minor: number): string => formatMoney(minor, proof.currency ?? "XXX");
  const { prices, bound, survivors, cost } = proof;
  const sent =
    proof.shipments === undefined
      ? ""
      : ` A shipment is paid once for each supplier (${Object.entries(proof.shipments)
          .map(([name, minor]) => `${visible(name === "" ? "not named" : name)} ${show(minor)}`)
          .join(
            ", ",
          )}); in the bound each kind of string bears only the share that is left if as many as may be mixed come in it.`;
  const compared = `${proof.compared} kinds of string were compared, each part in its least safe series count. For every count of strings the cheapest purchase was worked out whole: stock, packs, minimum order, price breaks, resistors.${sent} At most ${proof.maxTypes} parts may be mixed.`;
  const ceilings = (["volume", "mass", "units"] as const)
    .filter((name) => Math.round(prices[name]) > 0)
    .map((name) => `${show(prices[name])} on using up the whole limit on ${name}`);
  const second =
    plan.secondOpinion === "agrees"
      ? " A second engine (javascript-lp-solver), given the same ones, found nothing better."
      : plan.secondOpinion === "no answer"
        ? " A second engine (javascript-lp-solver) was asked and gave no answer that counts."
        : "";
  const verdict =
    proof.verdict === "valid"
      ? "A separate verifier worked all of this out again from the catalogue alone and found it true."
      : proof.verdict === "unsettled"
        ? "The separate verifier ran out of work before it had tried all that is left; what it checked holds."
        : `THE VERIFIER REJECTS THIS PROOF: ${proof.why}.`;
  if (prices.cost === 0)
    return [
      compared,
      `Weigh what the limits on volume, mass and units leave of the capacitance needed: even the best parts together fall short, whatever they cost. That is arithmetic, and no blend escapes it.`,
      verdict + second,
    ];
  const bar = `Put a price of ${show(prices.capacity)} on the whole capacitance needed${ceilings.length > 0 ? ` and ${ceilings.join(", ")}` : ""}. Then any mix that meets the need within the limits costs at least ${show(bound)}: each part's gain over its cost counts at its best, for the best ${proof.maxTypes} parts.`;
  const open = survivors.reduce((sum, { strings }) => sum + strings.length, 0);
  const parts = new Set(survivors.map(({ part }) => part)).size;
  const target = cost === null ? "than any blend could cost" : `than ${show(cost)}`;
  const rest =
    open === 0
      ? `Costs are whole, so nothing cheaper ${target} is left to try.`
      : `By the same arithmetic only ${open} ${open === 1 ? "count" : "counts"} of ${parts} ${parts === 1 ? "part" : "parts"} could be in a mix cheaper ${target}: ${named(survivors)}. Every mix of these was tried, and none is.`;
  return [compared, bar, rest, verdict + second];
}

function named(survivors: NamedCertificate["survivors"]): string {
  const names = [...new Set(survivors.map(({ part }) => visible(part)))];
  const first = names.slice(0, 6);
  return names.length > 6 ? `${first.join(", ")} and ${names.length - 6} more` : first.join(", ");
}
