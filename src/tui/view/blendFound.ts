// What was found of blends as a screen: the blend with its proof and figures, its rivals, the ladder, and what stayed out; or what to loosen.
import { formatQuantity } from "../../quantity/index.ts";
import type { BlendPlan } from "../../search/index.ts";
import type { FoundBlends } from "../blend/state.ts";
import { type Row, span } from "../row.ts";
import type { State } from "../state.ts";
import { grouped, shownMoney } from "../values.ts";
import { ladderRows, rivalRows, stringRows, wholeRows } from "./blendFigures.ts";
import { findingRows } from "./findings.ts";
import { type Page, pageOf, type Room, scrolled } from "./page.ts";
import { cautionRows, heading, sections } from "./section.ts";
import { paragraph } from "./words.ts";

const WITHIN = "10 %";
/** Parts left out that are told by name. */
const LISTED = 20;

const secondsWords = (seconds: number): string => formatQuantity(seconds, "time", { digits: 2 });

/** Every part stayed out, at least one for want of a price. */
const isWithoutPrices = ({ blends, compared, leftOut }: BlendPlan): boolean =>
  blends.length === 0 && compared === 0 && leftOut.some(({ reason }) => reason === "price-missing");

function nothingRows(plan: BlendPlan, state: State, columns: number): readonly Row[] {
  const { words } = state;
  if (isWithoutPrices(plan))
    return [
      ...paragraph("No part that could be used has a price, so none is the cheapest.", columns, "strong"),
      ...paragraph("Give prices in the catalogue, or by hand on the parts screen (9).", columns),
    ];
  const head =
    plan.status === "infeasible" ? "No blend fits within the limits." : "No blend was found, and none was ruled out.";
  const able = plan.loosen.filter(({ to }) => to !== null);
  const loose = able.flatMap((one) => paragraph(`- ${words?.loosenWords(one, plan.currency) ?? one.field}`, columns));
  return [
    ...paragraph(head, columns, "strong"),
    ...(able.length > 0 ? paragraph("Each of these alone would do, the least change first:", columns) : []),
    ...loose,
  ];
}

function leftOutRows({ leftOut, currency }: BlendPlan, { words }: State, columns: number): readonly Row[] {
  if (leftOut.length === 0) return [];
  const more = leftOut.length - LISTED;
  return [
    heading(`Left out of the blends: ${grouped(leftOut.length)}`),
    ...leftOut
      .slice(0, LISTED)
      .flatMap((one) => paragraph(`- ${one.part}: ${words?.reasonWords(one, currency) ?? one.reason}`, columns)),
    ...(more > 0
      ? paragraph(`and ${grouped(more)} more; joulewright plan BRIEF --blend tells all.`, columns, "quiet")
      : []),
  ];
}

/** All that is told of a plan whose search has ended. */
function planRows(
  plan: BlendPlan,
  { answer, seconds, stopped }: FoundBlends,
  state: State,
  columns: number,
): readonly Row[] {
  const { words, look } = state;
  const [best] = plan.blends;
  const alone =
    answer.single === null ? "No layout of one part fits, or none that does has a price to compare with." : null;
  const beside = best === undefined ? null : (words?.besideWords(best, answer.single ?? undefined) ?? alone);
  const ended = stopped ? "by the time it was stopped" : "in the time allowed";
  const took = stopped
    ? `Stopped after ${secondsWords(seconds)}; Enter begins again.`
    : `Took ${secondsWords(seconds)}.`;
  const proof = isWithoutPrices(plan) ? "" : `${words?.proofSentence(plan, ended) ?? ""} `;
  const isProven = plan.status !== "stopped";
  const disagree =
    plan.disagreements.length === 0
      ? []
      : paragraph(
          "! Two engines disagree, so nothing is proven. joulewright plan BRIEF --blend tells both answers; please report it.",
          columns,
          "bad",
        );
  return sections(
    best === undefined ? nothingRows(plan, state, columns) : stringRows(best.strings, columns),
    [
      ...disagree,
      ...paragraph(`${proof}${took}`, columns, isProven ? "good" : "warn"),
      ...(beside === null ? [] : paragraph(beside, columns)),
    ],
    best === undefined ? [] : wholeRows(best, columns),
    rivalRows(plan, WITHIN, columns),
    best === undefined ? [] : ladderRows(plan, columns, look.ascii),
    best === undefined ? [] : [heading("Checks of the whole bank"), ...findingRows(best.findings, columns, words)],
    ...(best?.strings ?? []).map(({ part, findings }) => {
      const open = findings.filter(({ verdict }) => verdict !== "pass");
      return open.length === 0
        ? []
        : [heading(`Checks of the strings of ${part}`), ...findingRows(open, columns, words)];
    }),
    leftOutRows(plan, state, columns),
    plan.notes.flatMap((note) => paragraph(note, columns, "quiet")),
    cautionRows(answer.cautions, columns),
  );
}

export function foundPage(found: FoundBlends, state: State, room: Room): Page {
  const { plan } = found.answer;
  const { columns } = room;
  if (!plan.ok)
    return pageOf(
      plan.refusals.flatMap((refusal) =>
        paragraph(`! ${state.words?.refusalWords(refusal) ?? refusal.want}`, columns, "warn"),
      ),
    );
  const [best] = plan.value.blends;
  const title = plan.value.status === "optimal" ? "Cheapest blend" : "Best blend found";
  const groups = best?.strings.length ?? 0;
  const head: readonly Row[] =
    best === undefined
      ? []
      : [
          {
            left: [
              span(title, "strong"),
              span(`, ${grouped(best.units)} units in ${groups} ${groups === 1 ? "group" : "groups"}`),
            ],
            right: [span(shownMoney(best.cost?.total ?? null, best.cost?.currency ?? ""), "strong")],
          },
        ];
  return scrolled(state, "blend", head, planRows(plan.value, found, state, columns), room);
}
