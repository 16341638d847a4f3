// Every rule as a row: who sets it, how far it was read, what it asks in our words, and when this bank clears it for good.

import { clearingOf, RULES } from "../../hazard/index.ts";
import { cell, wait } from "../cells.ts";
import type { Facts } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import type { Cell, Table } from "../model.ts";
import { READ, ruleName } from "../rules.ts";
import { waysDown } from "../ways.ts";

export function ruleTable({ rule }: Pick<SheetInput, "rule">, facts: Facts): Table {
  const { capacitance, voltage, chain } = facts;
  return {
    kind: "table",
    id: "rules",
    caption: "Every rule, and when this bank clears it for good",
    columns: [
      { heading: "rule" },
      { heading: "read" },
      { heading: "what it asks" },
      { heading: "clears at", side: "right" },
      { heading: "bleed chains", side: "right" },
      { heading: "one open", side: "right" },
      { heading: "dump", side: "right" },
      { heading: "gives", side: "right" },
    ],
    rows: RULES.map((one): readonly Cell[] => {
      const clearing = capacitance === null ? null : clearingOf(one, capacitance);
      const level = clearing?.voltage ?? null;
      const ways = level === null ? null : waysDown(facts, { from: voltage, to: level });
      const none = clearing !== null && level === null ? "no level" : null;
      const seconds = clearingOf(one, capacitance ?? 1).seconds;
      return [
        `${ruleName(one.id)}${one.id === rule ? " (GOVERNS HERE)" : ""}`,
        READ[one.tag],
        one.words,
        none ?? (level === Number.POSITIVE_INFINITY ? "never over it" : cell(level, "voltage")),
        none ?? (chain === null ? "no chain" : wait(ways?.chains ?? null)),
        none ?? (chain === null ? "no chain" : wait(ways?.oneOpen ?? null)),
        none ?? wait(ways?.dump ?? null),
        seconds === null ? "no time" : cell(seconds, "time"),
      ];
    }),
  };
}
