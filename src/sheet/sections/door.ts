// One page to hang at the door: what is behind it, how long to wait, where to put the stick, whom to call.

import { countsOf } from "../../order/index.ts";
import { afterDump, afterDumpWords } from "../afterDump.ts";
import { said, up, wait } from "../cells.ts";
import { factsOf } from "../facts.ts";
import { governedLines } from "../governed.ts";
import type { SheetInput } from "../input.ts";
import { list, type Section, type Table, text } from "../model.ts";
import { barsOf } from "../names.ts";
import { clearWords, waysDown } from "../ways.ts";

export function doorSection(input: SheetInput): Section {
  const { layout } = input;
  const facts = factsOf(input);
  const ways = waysDown(facts, { from: facts.voltage, to: facts.clear });
  const points = countsOf(layout).stickPoints;
  const bars = barsOf(layout);
  const inner =
    layout.ties === "strings" && layout.series > 1 ? ` and the ${points - bars.length} nodes inside the strings` : "";
  const table: Table = {
    kind: "table",
    id: "door",
    caption: "Capacitor bank behind this door",
    columns: [{ heading: "what" }, { heading: "value" }],
    rows: [
      ["highest voltage", up(facts.voltage, "voltage")],
      ["most stored energy", up(facts.stored, "energy")],
      [
        `wait for ${clearWords(facts)}, bleed chains alone`,
        facts.chain === null ? "no chain: NEVER by itself" : wait(ways.chains),
      ],
      ["with one bleeder open", facts.chain === null ? "no chain: NEVER by itself" : wait(ways.oneOpen)],
      ["by the dump resistor alone, at its nominal resistance", afterDump(ways.dump, input, facts)],
      ["stick points, touched in turn", `${points}: bars ${bars[0]} to ${bars[bars.length - 1]}${inner}`],
      ["responsible person", null],
      ["second person", null],
      ["emergency call", null],
      ["where the supply is cut", null],
      ["where the stick hangs", null],
    ],
  };
  return {
    id: "door",
    title: "Danger: stored energy",
    ownPage: true,
    blocks: [
      text("Stored energy kills with the supply switched off and unplugged. Nobody enters alone."),
      table,
      list([
        ...governedLines(input),
        "Cut the supply, take the key, wait. A short wait by the dump is no leave to touch: it may not have closed.",
        `Dump, ${afterDumpWords(input, facts)}.`,
        "Measure across the ends and across every stage with a meter rated for the full voltage.",
        "Discharge through the stick with its resistor, at every point above; measure again; then the solid short, and leave the straps on.",
        facts.stored === null
          ? "The most stored energy is not known, because the unit's tolerance is not."
          : `All of ${said(up(facts.stored, "energy"))} must be thought of as there until the meter says otherwise.`,
      ]),
    ],
  };
}
