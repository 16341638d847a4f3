/*
 * The resistors of the bank, each with the watts, volts and joules that it bears against what it is rated for.
 *
 *   balancing element  W: worst power at the worst voltage, all the time; J: its part of what its own stage or unit holds at most,
 *                      the larger of C_hi v_hold^2/2 and C_lo v_charge^2/2, which empties through it alone in one bleed-down
 *   dump               J: the whole stored energy in one go; W: V^2/R for a moment; A: V/R
 *   isolating          J: its part of one shot, n p of them alike; into a shorted unit its leg takes far more (see the fault table)
 *
 * A bleed-down lasts many seconds: its joules are set against a pulse rating only to show how far below they are.
 * Source: [methods-derived] 2.6, 3.1.
 */

import { DEFAULT_FAMILY } from "../../catalog/index.ts";
import { dumpDuty } from "../../hazard/index.ts";
import { cell, partOf, said, up } from "../cells.ts";
import { factsOf } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import { type Cell, list, type Section, type Table, text } from "../model.ts";

interface Resistor {
  readonly name: string;
  readonly count: Cell;
  readonly value: Cell;
  readonly watts: number | null;
  readonly ratedWatts: number | null;
  readonly volts: number | null;
  readonly ratedVolts: number | null;
  readonly joules: number | null;
  readonly ratedJoules: number | null;
}

/** "1.2 W of 2 W, 60 %"; the rating is a blank to fill in when it is not known. */
function use(value: number | null, rating: number | null, dimension: "power" | "voltage" | "energy"): Cell {
  if (value === null) return null;
  const share = partOf(value, rating);
  const of = rating === null ? "of ______" : `of ${cell(rating, dimension)}`;
  return `${up(value, dimension)} ${of}${share === null ? "" : `, ${up(share, "fraction")}`}`;
}

function balancing(input: SheetInput): readonly Resistor[] {
  const { layout, families } = input;
  const { balance } = layout;
  if (balance === null) return [];
  const family = [...families, DEFAULT_FAMILY].find((one) => one.family === balance.family);
  const pieces = balance.positions * balance.elements;
  return [
    {
      name: `balancing element (${balance.family}${balance.assumed ? ", assumed" : ""})`,
      count: `${pieces}: ${balance.elements} in series in each of ${balance.positions} positions`,
      value: `${cell(balance.elementResistance, "resistance")} +-${cell(balance.tolerance, "fraction")}`,
      watts: balance.powerEach,
      ratedWatts: family === undefined ? null : family.power * family.derating,
      volts: balance.voltageEach,
      ratedVolts: family?.voltage ?? null,
      joules: bledInElement(input, balance.elements),
      ratedJoules: family?.pulseEnergy ?? null,
    },
  ];
}

/** J in one element when its stage (cross-tied) or unit empties through it; null when tolerance or leakage is unknown. */
export function bledInElement({ layout, unit }: SheetInput, elements: number): number | null {
  const { charging, holding } = layout.share;
  if (unit.tolerance === undefined || charging === null || holding === null) return null;
  const capacitance = (layout.ties === "cross-tied" ? layout.parallel : 1) * unit.capacitance;
  const held = capacitance * (1 + unit.tolerance.high) * holding ** 2;
  const charged = capacitance * (1 - unit.tolerance.low) * charging ** 2;
  return Math.max(held, charged) / 2 / elements;
}

function others(input: SheetInput): readonly Resistor[] {
  const { layout, brief, shot } = input;
  const { voltage, stored, dump } = factsOf(input);
  const unrated = { ratedWatts: null, ratedVolts: null, ratedJoules: null };
  const own =
    layout.balance === null
      ? [{ name: "bleed resistor", count: "1", value: null, watts: null, volts: voltage, joules: stored, ...unrated }]
      : [];
  const isolating = brief.isolating;
  return [
    ...own,
    {
      name: "dump resistor",
      count: "1",
      value: cell(dump, "resistance"),
      watts: dump === null ? null : voltage ** 2 / dump,
      volts: voltage,
      joules: stored,
      ...unrated,
    },
    ...(isolating === undefined
      ? []
      : [
          {
            name: "isolating resistor",
            count: String(layout.units),
            value: cell(isolating, "resistance"),
            watts: null,
            volts: null,
            joules: shot === null ? null : shot.discharge.energy.isolating / layout.units,
            ...unrated,
          },
        ]),
  ];
}

export function resistorSection(input: SheetInput): Section {
  const { voltage, dump, capacitance } = factsOf(input);
  const rows = [...balancing(input), ...others(input)];
  const table: Table = {
    kind: "table",
    id: "resistors",
    caption: "Resistors: what they bear, of what they are rated for",
    columns: [
      { heading: "resistor" },
      { heading: "pieces" },
      { heading: "value", side: "right" },
      { heading: "watts", side: "right" },
      { heading: "volts", side: "right" },
      { heading: "joules", side: "right" },
      { heading: "measured", written: true },
    ],
    rows: rows.map((r) => [
      r.name,
      r.count,
      r.value,
      use(r.watts, r.ratedWatts, "power"),
      use(r.volts, r.ratedVolts, "voltage"),
      use(r.joules, r.ratedJoules, "energy"),
      null,
    ]),
  };
  const duty = dump === null || capacitance === null ? null : dumpDuty({ capacitance, voltage, resistance: dump });
  return {
    id: "resistors",
    title: "Resistors",
    blocks: [
      text(
        "Watts of a balancing element are those that last, against its derated rating. Joules of a balancing element are all that its own worst stage or unit holds, bled through it; those of other resistors are of one bleed-down or dump of the whole bank from the highest voltage. A blank rating is not a passed check.",
      ),
      table,
      list([
        duty === null
          ? "Dump resistor: its resistance is not stated, or the tolerance is not known. Blocked: its peak current, the dump time, the surge of clamp diodes."
          : `Dump resistor: ${said(up(duty.peakCurrent, "current"))} at its first moment, time constant ${said(up(duty.timeConstant, "time"))}.`,
        ...(input.layout.balance === null
          ? [
              "No balancing chain empties this bank: a bleed resistor of its own is wired for good, on the bank's side of every switch. Its resistance is blank; it sets the time to touch-safe.",
            ]
          : []),
      ]),
    ],
  };
}
