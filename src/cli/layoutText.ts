// One layout in words: what it is, its figures, every finding with its verdict, and what was assumed.

import { type Capacitor, toBuy } from "../catalog/index.ts";
import { visible } from "../order/index.ts";
import { type Finding, formatQuantity } from "../quantity/index.ts";
import type { LayoutResult } from "../search/index.ts";
import { findingFigures, titleOf, VERDICTS } from "./findingWords.ts";
import { withoutBalanceWords } from "./restText.ts";
import { textTable } from "./table.ts";
import { pad, wrap } from "./wrap.ts";

/** Money as `12.30 EUR`; what has no price says so. */
export const money = (amount: number | null | undefined, currency: string | undefined): string =>
  amount === null || amount === undefined ? "no price" : `${amount.toFixed(2)} ${currency ?? ""}`.trim();

/** `369.60 EUR`, with a mark when lines are left out; `no price` when all are. */
export function costWords({ cost }: Pick<LayoutResult, "cost">): string {
  if (cost === null) return "no price";
  return `${money(cost.total, cost.currency)}${cost.unpriced.length > 0 ? " +" : ""}`;
}

const span = (layout: LayoutResult, key: "capacitance" | "energy"): string => {
  const { low, nominal, high } = layout[key];
  const show = (x: number | null, rounding: "up" | "down" | "nearest"): string => formatQuantity(x, key, { rounding });
  if (low === null || high === null) return `${show(nominal, "nearest")} nominal, tolerance unknown`;
  return `${show(low, "down")} low, ${show(nominal, "nearest")} nominal, ${show(high, "up")} high`;
};

function balanceWords({ balance, ties, series }: LayoutResult): string {
  if (series === 1) return "none needed: one in series";
  if (balance === null) return "none";
  const { resistance, tolerance, positions, elements, elementResistance, powerEach, powerTotal } = balance;
  const ohms = formatQuantity(resistance, "resistance", { digits: 6 });
  const each =
    elements === 1 ? "" : `, each ${elements} x ${formatQuantity(elementResistance, "resistance")} in series`;
  const watts = formatQuantity(powerEach, "power", { digits: 3, rounding: "up" });
  const all = formatQuantity(powerTotal, "power", { digits: 3, rounding: "up" });
  const where = ties === "cross-tied" ? "stage" : "unit";
  const family = `${visible(balance.family)}${balance.assumed ? ", assumed" : ""}`;
  return `${ohms} +-${formatQuantity(tolerance, "fraction")} across each ${where}, ${positions} positions${each}; at most ${watts} in one, ${all} in all (${family})`;
}

function bleedWords({ bleed }: LayoutResult): string {
  const safe = formatQuantity(bleed.toVoltage, "voltage");
  if (bleed.seconds === null) return `no chain drains this bank to ${safe}`;
  return `${formatQuantity(bleed.seconds, "time", { digits: 3, rounding: "up" })} to ${safe} through the balancing chain`;
}

/** The findings as a table, then the notes of all that did not pass. */
export function findingsText(findings: readonly Finding[], width: number, indent = "  "): string {
  const figures = findings.map(findingFigures);
  const table = textTable<Finding>(
    [
      { heading: "verdict", cell: (f) => VERDICTS[f.verdict] },
      { heading: "check", cell: (f) => titleOf(f.id), least: 22 },
      { heading: "value", cell: (_, i) => figures[i]?.value ?? "", side: "right" },
      { heading: "limit", cell: (_, i) => figures[i]?.limit ?? "", side: "right" },
      { heading: "margin", cell: (_, i) => figures[i]?.margin ?? "", side: "right", rank: 1 },
      { heading: "source", cell: (f) => f.source, rank: 2 },
    ],
    findings,
    width,
    indent,
  );
  const notes = findings
    .filter((f) => f.verdict !== "pass")
    .map((f) => wrap(`${VERDICTS[f.verdict]}, ${titleOf(f.id)}: ${visible(f.note)}`, width, indent));
  return [table, ...notes].join("\n");
}

/** Values of the part that are assumed, each with its rule. */
export function assumptionsOf(unit: Capacitor, layout: LayoutResult): readonly string[] {
  const named = Object.entries(unit.states).flatMap(([key, state]) =>
    state.state === "assumed" ? [`${key} of ${unit.part}: ${state.rule}`] : [],
  );
  if (layout.balance?.assumed === true)
    named.push(`balancing resistors: family "${layout.balance.family}", because no resistor catalogue was given`);
  if (unit.polarised === undefined) named.push(`polarity of ${unit.part}: unknown, so it is treated as polarised`);
  return named;
}

/** What the brief asks for between a failed unit and the others, each with its count and cost. */
function protectionFacts({ protection = [], cost }: LayoutResult): readonly (readonly [string, string])[] {
  const names = { fuse: "fuse", "isolating resistor": "isolating", "section inductance": "section" } as const;
  return protection.map(({ kind, item, count, cost: price }) => {
    const what = kind === "fuse" ? visible(item) : kind;
    return [
      names[kind],
      `${count} x ${what}, ${price === null ? "no price, so not in the cost" : `${money(price, cost?.currency)}, in the cost`}`,
    ] as const;
  });
}

/** Of units that cannot be bought as the catalogue stands; empty when they can. */
function tooFew({ purchase, units }: LayoutResult, unit: Capacitor): string {
  if (purchase.capacitors !== null || unit.available === undefined) return "";
  const hand = Math.min(unit.onHand ?? 0, units);
  const least = toBuy(unit, units);
  const spares = least <= unit.available ? ", spares not counted" : "";
  const beside = hand > 0 ? ` beside ${hand} on hand` : "";
  return `not enough can be had: ${least} needed${beside}${spares}, ${unit.available} available`;
}

function costText(layout: LayoutResult, unit: Capacitor): string {
  const { cost } = layout;
  const few = tooFew(layout, unit);
  if (cost === null) return few === "" ? "no price" : few;
  const without = cost.unpriced.map((line) => (few !== "" && line === "capacitors" ? `capacitors, ${few}` : line));
  const left = without.length > 0 ? `; without a price: ${without.join(", ")}` : "";
  return `${money(cost.total, cost.currency)}${left}`;
}

/** The layout in full, as `check` and the best of a plan print it. */
export function layoutText(layout: LayoutResult, unit: Capacitor, width: number): string {
  const without = withoutBalanceWords(layout);
  const facts: readonly (readonly [string, string])[] = [
    ["shape", `${layout.series} in series, ${layout.parallel} in parallel, ${layout.ties}, ${layout.units} units`],
    ["capacitance", span(layout, "capacitance")],
    ["energy of a pulse", span(layout, "energy")],
    ["even share", `${formatQuantity(layout.share.even, "voltage")} on each`],
    ["balancing", balanceWords(layout)],
    ...(without === "" ? [] : [["without resistors", without] as const]),
    ["bleed", bleedWords(layout)],
    ...protectionFacts(layout),
    ["cost", costText(layout, unit)],
    [
      "volume",
      layout.volume === null
        ? "unknown"
        : `${formatQuantity(layout.volume, "volume", { digits: 3, rounding: "up" })}, units side by side`,
    ],
    [
      "mass",
      layout.mass === null
        ? "unknown"
        : `${formatQuantity(layout.mass, "mass", { digits: 3, rounding: "up" })}, units alone`,
    ],
  ];
  const lines = facts.map(([label, text]) => hanging(label, text, width));
  const assumed = assumptionsOf(unit, layout).map((text) => wrap(visible(`assumed, ${text}`), width, "  "));
  return [...lines, "", findingsText(layout.findings, width), ...(assumed.length > 0 ? ["", ...assumed] : [])].join(
    "\n",
  );
}

/** A label and a text beside it that wraps under itself. */
export function hanging(label: string, text: string, width: number): string {
  const [first = "", ...rest] = wrap(text, width - 21).split("\n");
  return [`  ${pad(label, 18)} ${first}`.trimEnd(), ...rest.map((line) => `${" ".repeat(21)}${line}`)].join("\n");
}
