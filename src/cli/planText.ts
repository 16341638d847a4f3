// A plan as text for people: what was asked, what was searched, the ranking, the best explained, the front, the refused, the cautions.

import type { Capacitor } from "../catalog/index.ts";
import { visible } from "../order/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import type { LayoutResult, PlanResult, Ranking } from "../search/index.ts";
import { askedText } from "./askedText.ts";
import { cautionsOf } from "./cautions.ts";
import { changeWords } from "./changeWords.ts";
import { improveText } from "./improveText.ts";
import { lampFits } from "./lampFits.ts";
import { layoutText, money } from "./layoutText.ts";
import { rankedTable } from "./rankedTable.ts";
import { mendsWords, reasonWords } from "./reasonWords.ts";
import { lampText } from "./shotRateText.ts";
import { worstCaseText } from "./worstCaseText.ts";
import { bullet, wrap } from "./wrap.ts";

export interface PlanText {
  readonly result: PlanResult;
  readonly parts: readonly Capacitor[];
  readonly given: ReadonlySet<string>;
  readonly rank: Ranking;
  readonly width: number;
  /** Sentences about what was read. */
  readonly inputs: readonly string[];
  /** Count of the measured units that the statistical basis draws from. */
  readonly lot?: number | null;
  /** J of the units that would be fitted, by layout; with the measured basis. */
  readonly placedEnergy?: ReadonlyMap<string, number>;
}

/** The lamp's ideal circuit, and how far the best bank lands from it. */
function lampPlanText({ result, parts, width }: PlanText): string {
  const { lampDrive } = lampFits(result, parts);
  if (lampDrive === undefined) return "";
  const { ideal, fits } = lampDrive;
  const show = (x: number, dimension: "capacitance" | "inductance" | "voltage"): string => formatQuantity(x, dimension);
  const best = fits[0]?.report;
  const wish = `Lamp's ideal circuit: ${show(ideal.capacitance, "capacitance")}, ${show(ideal.inductance, "inductance")}, ${show(ideal.voltage, "voltage")}.`;
  return [wrap(wish, width), ...(best ? [`${lampText(best, width)}`] : [])].join("\n");
}

/** Refused parts and members of the front that are listed one by one. */
const LISTED = 40;

export function planText(of: PlanText): string {
  const { result, width } = of;
  const title = visible(result.brief.title ?? "Capacitor bank");
  const { parts, layouts, proof } = result.searched;
  const need = formatQuantity(result.required.capacitance, "capacitance", { rounding: "up" });
  const how = proof === "exhaustive" ? "every part, series count and tie was tried" : `proof: ${proof}`;
  const blocks = [
    `${title}\n\nAsked\n${askedText(result.brief, of.given, width, of.lot ?? null)}`,
    wrap(
      `Capacitance needed: ${need}. Searched ${parts} ${parts === 1 ? "part" : "parts"}; ${layouts} ${layouts === 1 ? "layout does" : "layouts do"} it; ${proof}: ${how}.`,
      width,
    ),
    ...of.inputs.map((text) => wrap(text, width)),
    lampPlanText(of),
    ...(result.layouts.length > 0 ? fitting(of) : nothing(of)),
    refusedText(result, width),
    ...result.notes.map((note) => wrap(`Note: ${note}`, width)),
    cautionText(of),
  ];
  return `${blocks.filter((block) => block !== "").join("\n\n")}\n`;
}

function fitting({ result, parts, rank, width, placedEnergy }: PlanText): readonly string[] {
  const best = result.layouts[0] as LayoutResult;
  const unit = parts.find((part) => part.part === best.part) as Capacitor;
  const shown = result.layouts.length;
  const all = result.searched.layouts;
  const more = shown < all ? ` (first ${shown} of ${all}; --limit 0 for all)` : "";
  const unpriced = result.layouts.some((one) => (one.cost?.unpriced.length ?? 0) > 0);
  const legend = `worst: highest voltage of a unit over its limit; open: something is not assessed${unpriced ? "; +: lines without a price are left out" : ""}`;
  return [
    `Layouts by ${rank}${more}\n${rankedTable(result.layouts, width, placedEnergy)}\n${wrap(legend, width, "  ")}`,
    `Best: ${visible(best.id)}\n${wrap(whyBest(result, rank), width, "  ")}\n${layoutText(best, unit, width)}`,
    ...(result.worstCase === undefined ? [] : [wrap(worstCaseText(result), width)]),
    ...(result.improve ? [`What eats its margin\n${improveText(result.improve, result.currency, width)}`] : []),
    frontText(result, width),
  ];
}

function whyBest(result: PlanResult, rank: Ranking): string {
  const [best, second] = result.layouts;
  const words: Readonly<Record<Ranking, string>> = {
    cost: "lowest cost of what is priced",
    units: "fewest units",
    volume: "least volume",
    mass: "least mass",
    stress: "lowest worst unit voltage against its rating",
  };
  const order = "equal ones by cost, units, volume and name; layouts whose sharing is not assessed come last";
  const next =
    second?.cost && best?.cost && second.cost.currency === best.cost.currency
      ? ` The next, ${visible(second.id)}, costs ${money(second.cost.total, second.cost.currency)}.`
      : "";
  const tops = best !== undefined && result.front.includes(best.id) ? " No other layout beats it in everything." : "";
  return `Why this one: ${words[rank]} (${order}).${next}${tops}`;
}

function frontText({ front }: PlanResult, width: number): string {
  const listed = front.slice(0, LISTED).map(visible).join("; ");
  const more = front.length > LISTED ? `; and ${front.length - LISTED} more (all with --json)` : "";
  const head = `Front: ${front.length} that no other beats in cost, volume, mass, units and worst stress together`;
  return `${wrap(head, width)}\n${wrap(listed + more, width, "  ")}`;
}

function nothing({ result, width }: PlanText): readonly string[] {
  const changes =
    result.changes.length > 0
      ? [
          "Any one of these changes would do:",
          ...result.changes.map((one) => bullet(changeWords(one, result.currency), width)),
        ]
      : ["No single change of the brief or the stock that was tried would do."];
  return ["NOTHING FITS. No part gives a layout that does what was asked within its limits.", changes.join("\n")];
}

function refusedText({ refused, currency }: PlanResult, width: number): string {
  if (refused.length === 0) return "";
  const rows = refused
    .slice(0, LISTED)
    .map((one) =>
      bullet(
        `${visible(one.part)}: ${reasonWords(one, currency)}${one.mends ? `. ${mendsWords(one.mends)}` : ""}`,
        width,
      ),
    );
  const more = refused.length > LISTED ? `\n  and ${refused.length - LISTED} more (all with --json)` : "";
  return `Refused parts: ${refused.length}\n${rows.join("\n")}${more}`;
}

function cautionText({ result, parts, width }: PlanText): string {
  const layout = result.layouts[0];
  const unit = layout && parts.find((part) => part.part === layout.part);
  const lines = cautionsOf(result.brief, layout && unit ? { layout, unit } : undefined);
  return ["Cautions", ...lines.map(({ text }) => bullet(text, width))].join("\n");
}
