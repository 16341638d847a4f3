// What the finished bank may be used at: the figures that nobody on shift may pass.

import { cell, down, up, wait } from "../cells.ts";
import { factsOf } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import { type Cell, type Section, type Table, text } from "../model.ts";
import { waysDown } from "../ways.ts";

/** Shots an hour that the charger keeps up with, rounded down; null without a charger or a load. */
const hourly = ({ shot }: SheetInput): Cell =>
  shot?.highestRate == null ? null : `${Math.floor(shot.highestRate * 3600)} an hour`;

export function limitRows(input: SheetInput): readonly (readonly [string, Cell, string])[] {
  const { layout, brief, unit, shot } = input;
  const facts = factsOf(input);
  const ways = waysDown(facts, { from: facts.voltage, to: facts.clear });
  const life = shot?.life.reference.shots ?? unit.ratedShots ?? null;
  return [
    ["highest charge voltage, with overshoot", cell(facts.voltage, "voltage"), "charger's trip set no higher"],
    ["highest voltage of any unit", down(layout.share.limit, "voltage"), "derating in it"],
    ["longest hold", Number.isFinite(brief.hold) ? cell(brief.hold, "time") : "for ever", "as asked"],
    [
      "reversal of the voltage, predicted",
      up(shot?.discharge.unit.reversal, "fraction"),
      unit.reversal === undefined ? "the unit's limit is not known" : `unit's limit ${cell(unit.reversal, "fraction")}`,
    ],
    [
      "peak current, predicted",
      up(shot?.envelope.peakCurrent.high ?? shot?.discharge.peakCurrent, "current"),
      "high end of the spread",
    ],
    [
      "fastest rate by the charger",
      hourly(input),
      shot?.highestRate == null ? "needs a load and a charger in the brief" : "heat of the units apart",
    ],
    ["rate asked", brief.rate === undefined ? null : `${Number((brief.rate * 3600).toPrecision(4))} an hour`, ""],
    ["ambient", brief.ambient === undefined ? null : cell(brief.ambient, "temperature"), ""],
    ["rated shots of a unit", life === null ? null : String(life), "at its ratings; replace by then"],
    ["wait before approach, bleed chains alone", facts.chain === null ? "no chain" : wait(ways.chains), "then measure"],
    ["wait before approach, dump alone", wait(ways.dump), "then measure"],
  ];
}

export function limitsSection(input: SheetInput): Section {
  const table: Table = {
    kind: "table",
    id: "limits",
    caption: "Operating limits",
    columns: [{ heading: "limit" }, { heading: "value" }, { heading: "remark" }],
    rows: limitRows(input),
  };
  return {
    id: "limits",
    title: "Operating limits",
    blocks: [
      text("A blank limit is not no limit: it is settled by the person responsible before the bank is used."),
      table,
    ],
  };
}
