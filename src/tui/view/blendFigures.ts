// The figures of blends as rows: the strings to build, the bank that they make, the others of another kind, the cost ladder as bars.
import type { BlendLadder, BlendPlan, BlendResult, BlendString } from "../../search/index.ts";
import { drawBar } from "../bar.ts";
import { type Column, columnsFor, headingRow, snug, tableRow, widen } from "../columns.ts";
import { type Row, span } from "../row.ts";
import { safeText } from "../text.ts";
import { grouped, shapeOf, shown, shownLimit, shownMoney, shownSpan, shownWorst } from "../values.ts";
import { textWidth } from "../width.ts";
import { heading } from "./section.ts";
import { paragraph } from "./words.ts";

const INDENT = 2;
const LADDER_BAR = 16;

function column<T>(title: string, width: number, priority: number, text: (item: T) => string): Column<T> {
  return { title, width, priority, side: "right", cell: (item) => span(text(item)) };
}
const named = <T>(title: string, width: number, text: (item: T) => string): Column<T> => ({
  ...column(title, width, 0, text),
  side: "left",
});

/** Headings and rows, as many columns as there is room for; of what is left over `wide` gets what its longest text needs. */
function table<T>(columns: readonly Column<T>[], items: readonly T[], room: number, wide: string): readonly Row[] {
  const space = room - INDENT;
  const own = columns.find(({ title }) => title === wide);
  const longest = Math.max(0, ...items.map((item) => textWidth(safeText(own?.cell(item).text ?? ""))));
  const kept = widen(columnsFor(snug(columns, items), space), wide, space, longest);
  const inset = (row: Row): Row => ({ left: [span(" ".repeat(INDENT)), ...row.left] });
  return [inset(headingRow(kept)), ...items.map((item) => inset(tableRow(kept, item)))];
}

const STRINGS: readonly Column<BlendString>[] = [
  named("part", 18, ({ part }) => part),
  column("shape", 9, 0, shapeOf),
  column("ties", 10, 1, ({ ties }) => ties),
  column("units", 6, 0, ({ units }) => grouped(units)),
  column("on hand", 7, 3, ({ fromHand }) => grouped(fromHand)),
  column("buy", 6, 0, ({ bought }) => grouped(bought)),
  column("cost", 14, 0, ({ cost }) => (cost === null ? "no price" : shownMoney(cost.total, cost.currency))),
  column("charge", 7, 4, ({ chargeShare }) => shown(chargeShare.nominal, "fraction")),
  column("supplier", 20, 5, ({ supplier }) => supplier ?? ""),
];

export const stringRows = (strings: readonly BlendString[], columns: number): readonly Row[] =>
  table(STRINGS, strings, columns, "part");

function worstWords(worst: BlendResult["share"]["charging"]): string {
  if (worst === null) return "not assessed";
  return `${shownWorst(worst.value, "voltage")} of ${shownLimit(worst.limit, "voltage")} on a unit of ${worst.part}`;
}

/** The bank as a whole, a fact to a line. */
export function wholeRows({ capacitance, energy, share, bleed, cost }: BlendResult, columns: number): readonly Row[] {
  const alone =
    bleed.seconds === null
      ? "a group cut off from the rest never empties"
      : `${shownWorst(bleed.seconds, "time")} for the slowest group alone`;
  const together = bleed.together === null ? "" : `; ${shownWorst(bleed.together, "time")} together`;
  const money = (amount: number | null): string => shownMoney(amount, cost?.currency ?? "");
  const facts: readonly string[] = [
    `Capacitance: ${shownSpan(capacitance, "capacitance")}.`,
    `Energy of a pulse: ${shownSpan(energy, "energy")}.`,
    `Worst charging: ${worstWords(share.charging)}; holding: ${worstWords(share.holding)}.`,
    `Bleeds to ${shown(bleed.toVoltage, "voltage")}: ${alone}${together}.`,
    ...(cost === null
      ? []
      : [
          `Cost: capacitors ${money(cost.capacitors)}, resistors ${money(cost.resistors)}; in all ${money(cost.total)}.`,
        ]),
  ];
  const open =
    cost === null || cost.unpriced.length === 0
      ? []
      : [`Without a price, and not in the cost: ${cost.unpriced.join(", ")}.`];
  return [
    ...facts.flatMap((text) => paragraph(text, columns)),
    ...open.flatMap((text) => paragraph(text, columns, "warn")),
  ];
}

/** Blends that differ in parts or ties, the cheapest first. */
export function rivalRows(
  { blends, alternativesComplete }: BlendPlan,
  within: string,
  columns: number,
): readonly Row[] {
  const [best, ...rivals] = blends;
  if (best === undefined || alternativesComplete === null) return [];
  const more = ({ cost }: BlendResult): string =>
    cost === null || best.cost === null ? "" : `+${shownMoney(cost.total - best.cost.total, cost.currency)}`;
  const cut = alternativesComplete
    ? []
    : paragraph("The search for them was cut short: there may be others.", columns, "warn");
  if (rivals.length === 0)
    return [...paragraph(`No blend of another kind is up to ${within} dearer.`, columns, "quiet"), ...cut];
  const list: readonly Column<BlendResult>[] = [
    named("blend of another kind", 40, ({ id }) => id),
    column("more", 14, 0, more),
    column("cost", 14, 1, ({ cost }) => shownMoney(cost?.total ?? null, cost?.currency ?? "")),
    column("units", 6, 2, ({ units }) => grouped(units)),
  ];
  return [
    heading(`Others that differ in parts or ties, up to ${within} dearer`),
    ...table(list, rivals, columns, "blend of another kind"),
    ...cut,
  ];
}

const ENDS: Readonly<Record<BlendLadder["end"], string>> = {
  complete: "",
  "out of reach": " No blend gives more than the last step: stock or a limit ends it.",
  cut: " There are more steps than are told.",
};

/** What each step of energy costs, bars to the scale of the dearest. */
export function ladderRows({ ladder, currency }: BlendPlan, columns: number, ascii: boolean): readonly Row[] {
  if (ladder === null) return [];
  const { steps, end } = ladder;
  const title = heading("Cost ladder: what each step of energy costs");
  if (steps.length === 0) return [title, ...paragraph(`No step was found.${ENDS[end]}`, columns, "quiet")];
  const dearest = Math.max(...steps.map(({ cost }) => cost), 1e-9);
  type Step = BlendLadder["steps"][number];
  const bar = ({ cost }: Step): string => drawBar(cost, { columns: LADDER_BAR, full: dearest, limit: null, ascii });
  const list: readonly Column<Step>[] = [
    named("", 1, ({ asked }) => (asked ? ">" : "")),
    column("up to", 9, 0, ({ energy }) => shownLimit(energy.to, "energy")),
    column("cost", 14, 0, ({ cost }) => shownMoney(cost, currency ?? "")),
    {
      ...column("", LADDER_BAR, 0, bar),
      side: "left",
      cell: (step: Step) => span(bar(step), step.asked ? "accent" : "good"),
    },
    { ...column("blend", 24, 1, ({ id }: Step) => id), side: "left" },
  ];
  const proof = steps.every(({ proven }) => proven) ? "Each step is proven" : "Not every step is proven";
  const where = steps.some(({ asked }) => asked)
    ? "; > is the energy asked."
    : ". The energy asked lies above the last step told.";
  const from = `From ${shownWorst(steps[0]?.energy.from ?? null, "energy")}. `;
  return [
    title,
    ...table(list, steps, columns, "blend"),
    ...paragraph(from + proof + where + ENDS[end], columns, "quiet"),
  ];
}
