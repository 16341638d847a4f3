// Of the ten figures those on what can hurt: stored energy, the time until it is gone, and the ways to empty the bank.

import { energyClass } from "../../hazard/index.ts";
import { afterDump } from "../afterDump.ts";
import { cell, said, up, wait } from "../cells.ts";
import { factsOf } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import type { Cell } from "../model.ts";
import { recoveryOf } from "../recovery.ts";
import { ruleName } from "../rules.ts";
import { clearWords, pathCount, waysDown } from "../ways.ts";

/** Number, figure, its value, and what it stands against or what is missing. */
export type FigureRow = readonly [number: string, figure: string, value: Cell, against: Cell];

function energies(input: SheetInput): readonly FigureRow[] {
  const { voltage, stored, highest, ranOn } = factsOf(input);
  const found = stored === null ? null : energyClass({ energy: stored, voltage });
  return [
    [
      "1",
      "stored energy at the highest voltage",
      up(stored, "energy"),
      found === null
        ? null
        : `${found.hazardous ? "hazardous" : "not hazardous"} from ${cell(found.threshold, "energy")}, ${ruleName(found.ruleId)}`,
    ],
    [
      "1",
      "stored energy with the charger run on",
      up(ranOn, "energy"),
      highest === null ? "the charger's highest voltage is not known" : cell(highest, "voltage"),
    ],
  ];
}

function times(input: SheetInput): readonly FigureRow[] {
  const facts = factsOf(input);
  const ways = waysDown(facts, { from: facts.voltage, to: facts.clear });
  const back = recoveryOf(input, facts);
  const allowed =
    facts.allowed === null
      ? "the rule gives no time"
      : `${cell(facts.allowed, "time")} allowed by the rule for ${said(cell(facts.level, "voltage"))}`;
  const chains = (x: number | null): Cell => (facts.chain === null ? "no chain" : wait(x));
  return [
    ["2", `time to ${clearWords(facts)}: bleed chains alone`, chains(ways.chains), allowed],
    ["2", "the same with one bleeder open", chains(ways.oneOpen), allowed],
    ["2", "the same by the dump alone, nominal resistance", afterDump(ways.dump, input, facts), allowed],
    [
      "2",
      "voltage that may come back after a short",
      up(back?.high, "voltage"),
      cell(input.brief.touchSafe, "voltage"),
    ],
  ];
}

function means(input: SheetInput): readonly FigureRow[] {
  const { count, words } = pathCount(factsOf(input));
  return [
    ["8", "independent ways to empty it without a hand", String(count), words],
    ["8", "each proven with the power off", null, "from the cold-test record"],
  ];
}

/** Figures 1, 2 and 8. */
export const dangerFigures = (input: SheetInput): readonly FigureRow[] => [
  ...energies(input),
  ...times(input),
  ...means(input),
];
