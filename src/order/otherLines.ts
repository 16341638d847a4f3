// The lines that builders forget: counted where the layout says how many, left to be chosen where it does not.
//
// Source: [practice-5b] the lines people forget; quantities follow from the layout, or are common practice, no source, and say so.

import { storedEnergy } from "../bank/index.ts";
import type { Capacitor } from "../catalog/index.ts";
import { dumpDuty } from "../hazard/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import type { Brief, LayoutResult } from "../search/index.ts";
import type { BillLine } from "./bill.ts";
import { toBeChosen, type Wish } from "./chosenLine.ts";
import { countsOf } from "./counts.ts";

export interface OtherInput {
  readonly layout: LayoutResult;
  readonly unit: Capacitor;
  readonly brief: Brief;
}

/** The resistor that empties the bank: its value and amperes where the brief states it. */
function dumpWish({ layout, brief }: OtherInput, stored: string, full: string): Wish {
  const { dumpResistance: resistance } = brief;
  const wish = { item: "dump resistor", line: "dump resistor", needed: 1 } as const;
  const note = "Choose by joules, not watts.";
  if (resistance === undefined) return { ...wish, rating: `${stored}, ${full}`, note };
  const { peakCurrent } = dumpDuty({
    capacitance: layout.capacitance.high ?? layout.capacitance.nominal,
    voltage: brief.voltage * (1 + brief.overshoot),
    resistance,
  });
  const amperes = `${formatQuantity(peakCurrent, "current", { digits: 3, rounding: "up" })} peak`;
  return { ...wish, value: formatQuantity(resistance, "resistance"), rating: `${stored}, ${full}, ${amperes}`, note };
}

/** Everything but what is bought from the catalogues, and the conductors. */
export function otherLines(input: OtherInput): readonly BillLine[] {
  const { layout, brief } = input;
  const counts = countsOf(layout);
  const volts = brief.voltage * (1 + brief.overshoot);
  const up = (value: number, dimension: "voltage" | "energy"): string =>
    formatQuantity(value, dimension, { digits: 3, rounding: "up" });
  const full = `at least ${up(volts, "voltage")} dc`;
  const stored = `at least ${up(storedEnergy(layout.capacitance.high ?? layout.capacitance.nominal, volts), "energy")} in one dump`;
  const wishes: (Wish | null)[] = [
    layout.balance === null && layout.series >= 1
      ? {
          item: "bleed resistor",
          line: "bleed resistor",
          needed: 1,
          rating: full,
          note: "No balancing chain drains this bank; wire it for good, on the bank's side of every switch.",
        }
      : null,
    counts.fuses > 0
      ? {
          item: "fuse",
          line: "fuses",
          needed: counts.fuses,
          rating: full,
          note: `One to each ${counts.fuses === layout.units ? "unit" : "string"}; must pass the shot and open on the neighbours' discharge: compare action integrals.`,
        }
      : null,
    counts.fuses > 0
      ? { item: "fuse holder", line: "fuse holders", needed: counts.fuses, rating: full, note: "One to each fuse." }
      : null,
    dumpWish(input, stored, full),
    { item: "dump relay", line: "dump relay", needed: 1, rating: full, note: "Closes when its power fails." },
    {
      item: "earthing stick with resistor and hook",
      line: "earthing stick",
      needed: 1,
      rating: full,
      note: `${counts.stickPoints} points to touch in turn on this bank.`,
    },
    {
      item: "shorting link",
      line: "shorting links",
      needed: counts.groups,
      value: "bare braid or wire",
      note: `One across each ${layout.ties === "cross-tied" ? "stage" : "unit"} while the bank is not in use; loose and spare units need theirs too.`,
    },
    counts.links > 0
      ? {
          item: "link between units",
          line: "unit links",
          needed: counts.links,
          note: "Between neighbours of a string.",
        }
      : null,
    layout.balance === null
      ? null
      : {
          item: "resistor mount",
          line: "resistor mounts",
          needed: layout.balance.positions,
          note: "One to each balancing position; keep the heat off the units.",
        },
    {
      item: "lug",
      line: "lugs",
      needed: counts.terminals,
      note: "Two to each unit.",
    },
    {
      item: "screw with plain and spring washer",
      line: "screws and washers",
      needed: counts.terminals,
      note: "Two to each unit, to its maker's torque; none where the terminals are soldered.",
    },
    {
      item: "label",
      line: "labels",
      needed: counts.labels,
      value: "position, polarity, rating",
      rating: "not applicable",
      note: `One to each unit, one to each ${layout.ties === "cross-tied" ? "stage" : "string"}, one for the door.`,
    },
    {
      item: "meter with divider",
      line: "meter with divider",
      needed: 1,
      rating: full,
      note: "Rated for the full voltage, fixed to the bank.",
    },
    {
      item: "screen against fragments",
      line: "screen",
      needed: null,
      note: "Size follows from how the bank is laid out.",
    },
    {
      item: "test resistor",
      line: "test resistor",
      needed: 1,
      rating: stored,
      note: "To prove the bank before the real load is connected.",
    },
  ];
  return wishes.filter((wish): wish is Wish => wish !== null).map(toBeChosen);
}
