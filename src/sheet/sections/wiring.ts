// The wiring list: every joint with its conductor, and room for length, lug, torque and the initials of who made it.

import { sectionWords, shotSection, WARMING } from "../../order/index.ts";
import { up } from "../cells.ts";
import type { SheetInput } from "../input.ts";
import { list, type Section, type Table, text } from "../model.ts";
import { barsOf, groupWord } from "../names.ts";
import { type Carried, type Wire, wiresOf } from "../wires.ts";
import { schematicOf } from "./drawings.ts";

/** What the conductors must carry; null without a shot whose action has a bound. */
function carriedOf({ layout, unit, brief, shot }: SheetInput): Carried | null {
  const section = shot === null ? null : shotSection({ layout, unit, brief });
  return shot === null || section === null ? null : { section, unitShare: shot.discharge.unit.share };
}

/** The bars, each with the joints that it takes. */
function barTable({ layout, unit }: SheetInput, wires: readonly Wire[], carried: Carried | null): Table {
  const bars = barsOf(layout);
  const pitch = unit.diameter ?? unit.width;
  const joints = new Map<string, number>();
  for (const end of wires.flatMap(({ from, to }) => [from, to])) joints.set(end, (joints.get(end) ?? 0) + 1);
  const ends = (i: number): string =>
    i === 0 ? "negative end" : i === bars.length - 1 ? "positive end" : "between stages";
  return {
    kind: "table",
    id: "bars",
    caption: "Bars to be made",
    columns: [
      { heading: "bar" },
      { heading: "where" },
      { heading: "joints", side: "right" },
      { heading: "conductor" },
      { heading: "length" },
      { heading: "section chosen", written: true },
    ],
    rows: bars.map((bar, i) => [
      bar,
      ends(i),
      String(joints.get(bar) ?? 0),
      carried === null ? null : sectionWords(carried.section),
      pitch === undefined ? null : `at least ${up(pitch * layout.parallel, "length")}`,
      null,
    ]),
  };
}

export function wiringSection(input: SheetInput): Section {
  const carried = carriedOf(input);
  const schematic = schematicOf(input);
  const wires = wiresOf(schematic, carried);
  const { layout } = input;
  const bars = barsOf(layout);
  const elements = layout.balance?.elements ?? 0;
  const inside = layout.ties === "strings" ? ", TP2.3 the point of string 2 above its unit 3" : "";
  const table: Table = {
    kind: "table",
    id: "wiring",
    caption: `Wiring list: ${wires.length} joints`,
    columns: [
      { heading: "from" },
      { heading: "to" },
      { heading: "conductor" },
      { heading: "length", written: true },
      { heading: "lug", written: true },
      { heading: "torque", written: true },
      { heading: "initials", written: true },
    ],
    rows: wires.map(({ from, to, conductor }) => [from, to, conductor, null, null, null, null]),
  };
  return {
    id: "wiring",
    title: "Wiring list",
    ownPage: true,
    blocks: [
      text(
        `TP0 is the bar of the negative end, ${bars[bars.length - 1]} that of the positive end; C3.7 is unit 7 of ${groupWord(layout)} 3${inside}. Terminals are + and - of a unit, a and b of a part without polarity. Names are those of the schematic.`,
      ),
      list([
        carried === null
          ? "Conductor of bars and unit leads: blank, because no action integral is known without a load in the brief. It blocks the choice of section."
          : `Conductor: the least copper that warms by ${WARMING} K in one whole shot, as on the order (common practice, no source). A fault may carry more; repeated shots need more. Blank: chosen by strength, insulated for the full voltage.`,
        ...(schematic.fuse === null
          ? [
              "No fuse stands in this list: none is chosen. Where fuses are fitted, each goes between the + of its unit (or the top unit of its string) and the point above: put them in a new list with --fuses before anything is joined.",
            ]
          : []),
        ...(elements > 1
          ? [
              `Each RB is made beforehand of ${elements} equal elements, joined end to end on its mount: ${elements - 1} joints in each.`,
            ]
          : []),
        "A bar's length is for units side by side in one row; other lengths and the lugs are blank until the bank is laid out. Torque: the unit maker's figure for its terminal; without it no joint is signed off.",
      ]),
      barTable(input, wires, carried),
      table,
    ],
  };
}
