// The layout: its figures, its margins check by check, and why it won over the others that would do.

import { minorDigits } from "../../quantity/index.ts";
import type { LayoutResult } from "../../search/index.ts";
import { cell, down, said, up, wait } from "../cells.ts";
import { factsOf } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import { type Block, type Cell, type Section, type Table, text } from "../model.ts";

/** Alternatives listed beside the layout. */
const LISTED = 6;

const cost = ({ cost: of }: LayoutResult): Cell =>
  of === null
    ? null
    : `${of.total.toFixed(minorDigits(of.currency))} ${of.currency}${of.unpriced.length > 0 ? ` without ${of.unpriced.join(", ")}` : ""}`;

/** Worst unit voltage over its limit; not assessed is said. */
function worst({ share }: LayoutResult): string {
  const { charging, holding, limit } = share;
  return charging === null || holding === null
    ? "not assessed"
    : said(up(Math.max(charging, holding) / limit, "fraction"));
}

const checks = ({ findings }: LayoutResult): string => {
  const ranked = (["fail", "not assessed", "warn"] as const).find((v) => findings.some(({ verdict }) => verdict === v));
  return ranked ?? "pass";
};

function figures(input: SheetInput): Table {
  const { layout } = input;
  const { voltage, stored } = factsOf(input);
  const { capacitance: c, energy: e, share, balance } = layout;
  const tied = layout.ties === "cross-tied";
  return {
    kind: "table",
    id: "figures",
    caption: "The bank",
    columns: [{ heading: "figure" }, { heading: "value" }],
    rows: [
      ["shape", `${layout.series} in series, ${layout.parallel} in parallel, ${layout.ties}, ${layout.units} units`],
      ["highest charge voltage, overshoot in it", cell(voltage, "voltage")],
      [
        "capacitance: low, nominal, high",
        `${said(down(c.low, "capacitance"))}, ${cell(c.nominal, "capacitance")}, ${said(up(c.high, "capacitance"))}`,
      ],
      [
        "energy of one pulse: low, nominal, high",
        `${said(down(e.low, "energy"))}, ${cell(e.nominal, "energy")}, ${said(up(e.high, "energy"))}`,
      ],
      ["most stored energy", up(stored, "energy")],
      [`even share of a ${tied ? "stage" : "unit"}`, cell(share.even, "voltage")],
      ["worst unit while charging", up(share.charging, "voltage")],
      ["worst unit while holding", up(share.holding, "voltage")],
      ["limit of a unit, derating in it", down(share.limit, "voltage")],
      ["left by a dump, reverse", up(share.leftAfterDump, "voltage")],
      [
        "balancing",
        balance === null
          ? "none"
          : `${cell(balance.resistance, "resistance")} across each ${tied ? "stage" : "unit"}, ${balance.positions} positions`,
      ],
      [
        `bleed to ${said(cell(layout.bleed.toVoltage, "voltage"))} by the chains`,
        balance === null ? "no chain empties it" : wait(layout.bleed.seconds),
      ],
      ["volume and mass of the units", `${said(cell(layout.volume, "volume"))}, ${said(cell(layout.mass, "mass"))}`],
      ["purchase cost of units and resistors", cost(layout)],
    ],
  };
}

function checksTable({ words }: SheetInput): Table {
  return {
    kind: "table",
    id: "checks",
    caption: "Checks, each with its margin",
    columns: [
      { heading: "check" },
      { heading: "verdict" },
      { heading: "value", side: "right" },
      { heading: "limit", side: "right" },
      { heading: "margin", side: "right" },
      { heading: "source" },
      { heading: "what it means" },
    ],
    rows: words.findings.map((f) => [f.title, f.verdict, f.value, f.limit, f.margin, f.source, f.note]),
  };
}

function why({ layout, alternatives, alternativesOpen }: SheetInput): readonly Block[] {
  if (alternatives === null)
    return [text(`No alternatives are shown: ${alternativesOpen ?? "they were not searched"}.`)];
  const { layouts, count, rank, front } = alternatives;
  const place = layouts.findIndex(({ id }) => id === layout.id);
  const tops = front.includes(layout.id);
  const stand =
    place < 0
      ? `It is not among the first ${layouts.length} of ${count} layouts of the same brief and catalogues by ${rank}: it was chosen for other reasons, which belong here in writing.`
      : place === 0
        ? `It is the first of ${count} layouts of the same brief and catalogues by ${rank}.`
        : `It is number ${place + 1} of ${count} layouts of the same brief and catalogues by ${rank}: it was chosen over the ones before it for reasons that belong here in writing.`;
  const shown = layouts.slice(0, LISTED);
  const rows = shown.some(({ id }) => id === layout.id) ? shown : [layout, ...shown];
  const table: Table = {
    kind: "table",
    id: "alternatives",
    caption: `This layout and the first others by ${rank}`,
    columns: [
      { heading: "layout" },
      { heading: "units", side: "right" },
      { heading: "energy, low", side: "right" },
      { heading: "worst unit over limit", side: "right" },
      { heading: "cost", side: "right" },
      { heading: "checks" },
      { heading: "unbeaten" },
    ],
    rows: rows.map((one) => [
      one.id === layout.id ? `${one.id} (this one)` : one.id,
      String(one.units),
      down(one.energy.low, "energy"),
      worst(one),
      cost(one),
      checks(one),
      front.includes(one.id) ? "yes" : "no",
    ]),
  };
  const unbeaten = tops
    ? "No other layout beats it in cost, volume, mass, units and worst stress together."
    : "Some other layout beats it in cost, volume, mass, units and worst stress together; the table marks those that none beats.";
  return [
    text(`${stand} ${unbeaten}`),
    table,
    text("Reason for the choice, if it is not the order above: ______________________________"),
  ];
}

/** A bank that fails is not to be built: it is said before anything else. */
function verdict({ words, faults }: SheetInput): string {
  const fails = words.findings.filter((f) => f.verdict === "fail").map((f) => f.title);
  const open = words.findings.filter((f) => f.verdict === "not assessed").map((f) => f.title);
  const failed =
    fails.length > 0 ? `DO NOT BUILD: ${fails.length} checks fail (${fails.join("; ")}). ` : "No check failed. ";
  const blank =
    open.length > 0 ? `Not assessed, which is not a pass: ${open.join("; ")}.` : "Every check was assessed.";
  const bad = faults.filter((f) => f.verdict === "fail").map((f) => f.id.replaceAll("-", " "));
  const faulted =
    bad.length > 0 ? ` OF THE FAULTS ${bad.length} FAIL (${bad.join("; ")}): see Faults for what stops each.` : "";
  return `${failed}${blank}${faulted}`;
}

export function layoutSection(input: SheetInput): Section {
  return {
    id: "layout",
    title: "The layout and why it won",
    blocks: [text(verdict(input)), figures(input), ...why(input), checksTable(input)],
  };
}
