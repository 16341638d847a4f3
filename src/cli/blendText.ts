// Blends as text for people: the strings to build, the bank they make, what was proven, the rivals, and what stayed out.

import { visible } from "../order/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import type { BlendPlan, BlendResult, BlendString, LayoutResult, WorstShare } from "../search/index.ts";
import { besideWords } from "./blendBeside.ts";
import { frontText, ladderText } from "./blendFrontText.ts";
import { loosenWords, proofSentence } from "./blendWords.ts";
import { titleOf, VERDICTS } from "./findingWords.ts";
import { findingsText, hanging, money } from "./layoutText.ts";
import { reasonWords } from "./reasonWords.ts";
import { textTable } from "./table.ts";
import { bullet, wrap } from "./wrap.ts";

export interface BlendText {
  readonly plan: BlendPlan;
  /** The best layout of one part, to compare with. */
  readonly single: LayoutResult | undefined;
  readonly width: number;
}

const LISTED = 40;

export function blendText({ plan, single, width }: BlendText): string {
  const [best, ...others] = plan.blends;
  const kept = others.slice(0, plan.disagreements.length > 0 ? 1 : 0);
  const rivals = others.slice(kept.length);
  const blocks = [
    `Blends: mixes of whole strings of at most ${plan.maxTypes} ${plan.maxTypes === 1 ? "part" : "parts"}\n${wrap(proofSentence(plan), width, "  ")}`,
    ...disagreementText(plan, width),
    ...(best === undefined
      ? nothing(plan, width)
      : [wholeText("Cheapest blend", best, width), ...besideSingle(best, single, width)]),
    ...kept.map((one) => wholeText("The other engine's blend", one, width)),
    ...rivalText(plan, rivals, width),
    ...plan.fronts.map((front) => frontText(front, plan.currency, width)),
    ...(plan.ladder === null ? [] : [ladderText(plan.ladder, plan.currency, width)]),
    ...priceText(plan, width),
    leftOutText(plan, width),
    ...plan.notes.map((note) => wrap(`Note: ${note}`, width)),
  ];
  return `${blocks.filter((block) => block !== "").join("\n\n")}\n`;
}

function stringsTable(strings: readonly BlendString[], width: number): string {
  return textTable<BlendString>(
    [
      { heading: "part", cell: (one) => one.part, least: 14 },
      { heading: "shape", cell: (one) => `${one.series}s${one.parallel}p` },
      { heading: "ties", cell: (one) => one.ties },
      { heading: "units", cell: (one) => String(one.units), side: "right" },
      { heading: "on hand", cell: (one) => String(one.fromHand), side: "right", rank: 3 },
      { heading: "buy", cell: (one) => String(one.bought), side: "right" },
      { heading: "cost", cell: (one) => (one.cost === null ? "no price" : one.cost.total.toFixed(2)), side: "right" },
      {
        heading: "charge",
        cell: (one) => formatQuantity(one.chargeShare.nominal, "fraction", { digits: 3 }),
        side: "right",
        rank: 2,
      },
      { heading: "supplier", cell: (one) => one.supplier ?? "", rank: 4 },
    ],
    strings,
    width,
    "  ",
  );
}

/** One blend with its groups, its figures and its findings. */
export function wholeText(title: string, blend: Omit<BlendResult, "certificate">, width: number): string {
  const { cost, bleed, capacitance, energy } = blend;
  const span = (of: BlendResult["capacitance"], dimension: "capacitance" | "energy"): string => {
    const show = (x: number, rounding: "up" | "down" | "nearest"): string => formatQuantity(x, dimension, { rounding });
    const { low, nominal, high } = of;
    if (low === null || high === null) return `${show(nominal, "nearest")} nominal, a tolerance is unknown`;
    return `${show(low, "down")} low, ${show(nominal, "nearest")} nominal, ${show(high, "up")} high`;
  };
  const seconds = (x: number): string => formatQuantity(x, "time", { digits: 3, rounding: "up" });
  const safe = formatQuantity(bleed.toVoltage, "voltage");
  const alone =
    bleed.seconds === null
      ? "a group cut off from the rest never empties"
      : `${seconds(bleed.seconds)} for the slowest group alone`;
  const together = bleed.together === null ? "" : `; ${seconds(bleed.together)} together`;
  const left = cost !== null && cost.unpriced.length > 0 ? `; without a price: ${cost.unpriced.join(", ")}` : "";
  const lines = cost !== null && cost.lines > 0 ? `, lines ${cost.lines.toFixed(2)}` : "";
  const sent = cost !== null && cost.shipments > 0 ? `, shipments ${cost.shipments.toFixed(2)}` : "";
  const facts: readonly (readonly [string, string])[] = [
    ["units", `${blend.units} in ${blend.strings.length} ${blend.strings.length === 1 ? "group" : "groups"}`],
    ["capacitance", span(capacitance, "capacitance")],
    ["energy of a pulse", span(energy, "energy")],
    ["worst charging", worstWords(blend.share.charging)],
    ["worst holding", worstWords(blend.share.holding)],
    ["bleed", `to ${safe}: ${alone}${together}`],
    [
      "cost",
      cost === null
        ? "no price"
        : `${money(cost.total, cost.currency)} (capacitors ${(cost.capacitors ?? 0).toFixed(2)}, resistors ${cost.resistors === null ? "no price" : cost.resistors.toFixed(2)}${lines}${sent})${left}`,
    ],
    ...(blend.shipments.length === 0 ? [] : [["shipments", shipmentWords(blend)] as const]),
    ["volume", formatQuantity(blend.volume, "volume", { digits: 3, rounding: "up" })],
    ["mass", formatQuantity(blend.mass, "mass", { digits: 3, rounding: "up" })],
  ];
  const groups = blend.strings.flatMap((one) =>
    one.findings
      .filter(({ verdict }) => verdict !== "pass")
      .map((f) => bullet(`${visible(one.part)}: ${VERDICTS[f.verdict]}, ${titleOf(f.id)}: ${visible(f.note)}`, width)),
  );
  return [
    `${title}: ${wrap(visible(blend.id), width - title.length - 2)}`,
    stringsTable(blend.strings, width),
    "",
    ...facts.map(([label, text]) => hanging(label, text, width)),
    "",
    findingsText(blend.findings, width),
    ...(groups.length > 0 ? ["", "  Group by group", ...groups] : []),
  ].join("\n");
}

const shipmentWords = ({ shipments, cost }: Pick<BlendResult, "shipments" | "cost">): string =>
  shipments
    .map(({ supplier, cost: each }) => `${visible(supplier ?? "not named")} ${money(each, cost?.currency)}`)
    .join(", ");

function worstWords(worst: WorstShare | null): string {
  if (worst === null) return "not assessed";
  const show = (x: number, rounding: "up" | "down"): string => formatQuantity(x, "voltage", { digits: 4, rounding });
  return `${show(worst.value, "up")} of ${show(worst.limit, "down")} on a unit of ${visible(worst.part)}`;
}

function besideSingle(best: BlendResult, single: LayoutResult | undefined, width: number): readonly string[] {
  const words = besideWords(best, single);
  return words === null ? [] : [wrap(words, width)];
}

function nothing({ loosen, currency, status }: BlendPlan, width: number): readonly string[] {
  const head =
    status === "infeasible" ? "NO BLEND FITS within the limits." : "No blend was found, and none was ruled out.";
  const able = loosen.filter(({ to }) => to !== null);
  if (able.length === 0) return [head];
  const lines = able.map((one) => bullet(loosenWords(one, currency), width));
  return [`${head} Each of these alone would do, the least change first:\n${lines.join("\n")}`];
}

function rivalText(plan: BlendPlan, rivals: readonly BlendResult[], width: number): readonly string[] {
  if (plan.alternativesComplete === null) return [];
  const end = plan.alternativesComplete ? "" : " The search for them was cut short: there may be others.";
  if (rivals.length === 0) return [wrap(`No blend of another kind is within the percentage asked.${end}`, width)];
  const best = plan.blends[0]?.cost?.total ?? 0;
  const table = textTable<BlendResult>(
    [
      { heading: "blend of another kind", cell: (one) => one.id, least: 24 },
      { heading: "cost", cell: (one) => money(one.cost?.total, one.cost?.currency), side: "right" },
      { heading: "more", cell: (one) => ((one.cost?.total ?? 0) - best).toFixed(2), side: "right" },
      { heading: "units", cell: (one) => String(one.units), side: "right", rank: 2 },
      { heading: "suppliers", cell: (one) => String(one.suppliers), side: "right", rank: 3 },
    ],
    rivals,
    width,
    "  ",
  );
  return [`Others that differ in parts or ties\n${table}${end === "" ? "" : `\n${wrap(end.trim(), width, "  ")}`}`];
}

function priceText({ winningPrices, currency }: BlendPlan, width: number): readonly string[] {
  if (winningPrices.length === 0) return [];
  const lines = winningPrices.map(({ part, below, computed, proven }) => {
    const what = !computed
      ? "the price at which it would win was not worked out"
      : below === null
        ? "no price would make it win"
        : `a price below ${below.toFixed(2)} ${currency ?? ""} a unit would win${proven ? "" : ", and a higher one may too"}`;
    return bullet(`${visible(part)}: ${what}`, width);
  });
  return [`Parts without a price\n${lines.join("\n")}`];
}

function leftOutText({ leftOut, currency }: BlendPlan, width: number): string {
  if (leftOut.length === 0) return "";
  const rows = leftOut
    .slice(0, LISTED)
    .map((one) => bullet(`${visible(one.part)}: ${reasonWords(one, currency)}`, width));
  const more = leftOut.length > LISTED ? `\n  and ${leftOut.length - LISTED} more (all with --json)` : "";
  return `Left out of the blends: ${leftOut.length}\n${rows.join("\n")}${more}`;
}

function disagreementText({ disagreements, currency }: BlendPlan, width: number): readonly string[] {
  if (disagreements.length === 0) return [];
  const lines = disagreements.map(({ engine, cost, id }) =>
    bullet(
      `${engine}: ${id === null ? "no blend" : `${visible(id)}, ${cost} minor units of ${currency ?? "money"}`}`,
      width,
    ),
  );
  return [
    `${wrap("TWO ENGINES DISAGREE. Both answers are kept; nothing is proven. Please report this with the catalogue and the brief.", width)}\n${lines.join("\n")}`,
  ];
}
