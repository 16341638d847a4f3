// How long the bank takes to become harmless, from full and from each fault, by each way of emptying it alone.

import { afterDumpWords } from "../afterDump.ts";
import { cell, said, up, wait } from "../cells.ts";
import { type Facts, factsOf } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import { type Cell, list, type Section, type Table, text } from "../model.ts";
import { positionWord } from "../names.ts";
import { rangeWords, recoveryOf } from "../recovery.ts";
import { againstRule, clearWords, NO_WAYS, shortedWays, type Ways, waysDown } from "../ways.ts";

interface Start {
  readonly state: string;
  readonly from: number | null;
  readonly ways: Ways;
  readonly note: string;
}

/** With two chains gone; never where there were no more than two. */
function secondOpen(facts: Facts): number | null {
  const { capacitance, chains, voltage, clear } = facts;
  if (capacitance === null) return null;
  return chains <= 2
    ? Number.POSITIVE_INFINITY
    : waysDown({ ...facts, chains: chains - 2 }, { from: voltage, to: clear }).chains;
}

function starts(input: SheetInput, facts: Facts): readonly Start[] {
  const { layout, shot } = input;
  const { voltage, clear, highest } = facts;
  const at = (from: number | null): Ways => (from === null ? NO_WAYS : waysDown(facts, { from, to: clear }));
  const left = shot === null ? null : Math.sqrt((2 * shot.discharge.energy.left) / shot.bank.capacitance);
  const full = at(voltage);
  const rows: Start[] = [
    { state: "full", from: voltage, ways: full, note: full.dump === null ? "" : afterDumpWords(input, facts) },
    {
      state: "charger ran on",
      from: highest,
      ways: at(highest),
      note:
        highest === null
          ? "the charger's highest voltage is not known: this row stays open"
          : "the charger's highest voltage",
    },
    layout.series > 1
      ? {
          state: "one unit shorted, charger on",
          from: voltage,
          ways: shortedWays(input, facts, { from: voltage, to: clear }),
          note: "the others stand higher, the ends at V",
        }
      : { state: "one unit shorted", from: 0, ways: at(0), note: "the whole bank has emptied into it" },
    {
      state: "one unit open",
      from: voltage,
      ways: full,
      note:
        layout.ties === "strings" && layout.series > 1
          ? "upper bound; its string is cut off from the ends: only resistors across its own units empty them"
          : "upper bound",
    },
    {
      state: "dump stuck open",
      from: voltage,
      ways: { ...full, dump: Number.POSITIVE_INFINITY },
      note: "chains alone",
    },
    {
      state: "after a shot, or fired early",
      from: left,
      ways: at(left),
      note:
        left === null
          ? "no load in the brief: what a shot leaves is not known"
          : `what the shot leaves at the ends; ${afterDumpWords(input, facts)}`,
    },
  ];
  return layout.balance === null
    ? rows
    : [
        ...rows,
        {
          state: `balancing resistor of one ${positionWord(layout)} open`,
          from: voltage,
          // The column of one bleeder open is then a second one, of another chain or of none.
          ways: { ...full, chains: full.oneOpen, oneOpen: secondOpen(facts) },
          note: "one open already, so one more in the column beside it; that position keeps its charge while the ends read zero: short it by hand",
        },
      ];
}

export function bleedDownSection(input: SheetInput): Section {
  const facts = factsOf(input);
  const { allowed, chains, chain, voltage, level } = facts;
  const back = recoveryOf(input, facts);
  const rows = starts(input, facts).map(({ state, from, ways, note }): readonly Cell[] => [
    state,
    up(from, "voltage"),
    chain === null ? "no chain" : wait(ways.chains),
    chain === null ? "no chain" : wait(ways.oneOpen),
    wait(ways.dump),
    note,
  ]);
  const table: Table = {
    kind: "table",
    id: "bleed-down",
    caption: `Time to ${clearWords(facts)}, each way alone`,
    columns: [
      { heading: "from" },
      { heading: "voltage", side: "right" },
      { heading: "bleed chains", side: "right" },
      { heading: "one bleeder open", side: "right" },
      { heading: "dump resistor", side: "right" },
      { heading: "remark" },
    ],
    rows,
  };
  return {
    id: "bleed-down",
    title: "Bleed-down",
    blocks: [
      text(
        `The rule that governs here: ${facts.rule}.${allowed === null ? "" : ` It allows ${cell(allowed, "time")}.`} Times are the longest: high capacitance, balancing resistors at their high end, the dump resistor at its nominal resistance (no tolerance of it is stated), none of the units' own leakage.`,
      ),
      table,
      list([
        ...againstRule(facts, waysDown(facts, { from: voltage, to: level })),
        chains === 0
          ? "No balancing chain: until a bleed resistor is wired in, nothing but the dump empties this bank."
          : chains === 1
            ? "There is one chain: with any one of its resistors open the ends are not emptied by it at all."
            : `There are ${chains} chains side by side; with one resistor open the others still empty the ends, and the unit under the open one keeps its charge.`,
        ...(facts.dump === null ? ["Dump resistor: its resistance is not stated, so its times are blank."] : []),
        ...(facts.capacitance === null
          ? ["The tolerance of the unit is unknown: no longest time can be given, and none is."]
          : []),
      ]),
      ...(back === null
        ? []
        : [
            text(
              `After a short has been taken off, ${rangeWords(back)} may come back within minutes (${said(up(back.energy, "energy"))} at the most; ${back.tag}). Leave the strap on.`,
            ),
          ]),
    ],
  };
}
