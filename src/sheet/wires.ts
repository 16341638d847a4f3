/*
 * The joints of a bank as its schematic has it, one row each: what is joined to what, and the conductor where it follows.
 *
 *   symbol  unit  meaning
 *   S       m^2   least section that carries the whole shot (order's own reckoning)
 *   s       1     the worst unit's part of the bank's current
 *
 * Bars and the leads of switch and load carry the whole shot; a unit's leads s of it, so s S: heat goes with (current/section)^2.
 * Charging, balancing and dump leads carry little: their section is a matter of strength, and is left blank.
 * Source: [methods-derived] the scaling; the section as in the order.
 */

import { sectionWords } from "../order/index.ts";
import { partNames } from "./draw/partNames.ts";
import type { SchematicProps } from "./draw/schematicProps.ts";
import type { Cell } from "./model.ts";
import { barsOf, pointsOf, positionsOf, type Spot, spotsOf, unitName } from "./names.ts";

/** One joint. A terminal is written "C3.7 +"; a bar or point is one place. */
export interface Wire {
  readonly from: string;
  readonly to: string;
  readonly conductor: Cell;
}

/** Section that carries the whole shot, m^2, and the worst unit's part of the current; null without a shot. */
export interface Carried {
  readonly section: number;
  readonly unitShare: number;
}

/** Every joint of the bank and of what hangs on it, in the order that it is wired. */
export function wiresOf(props: SchematicProps, carried: Carried | null): readonly Wire[] {
  const words = (part: number): Cell => (carried === null ? null : sectionWords(carried.section * part));
  return [
    ...unitWires(props, words(carried?.unitShare ?? 1)),
    ...balanceWires(props),
    ...clampWires(props),
    ...outsideWires(props, words(1)),
  ];
}

const joint = (from: string, to: string, conductor: Cell = null): Wire => ({ from, to, conductor });

/** Parts with terminals a and b, in a row between two places. */
function chain(from: string, parts: readonly string[], to: string, conductor: Cell = null): readonly Wire[] {
  const starts = [from, ...parts.map((part) => `${part} b`)];
  const ends = [...parts.map((part) => `${part} a`), to];
  return starts.map((start, i) => joint(start, ends[i] as string, conductor));
}

/** What stands between a unit's positive terminal and the point above it. */
function partsAbove({ series, fuse, isolating }: SchematicProps, { group, place }: Spot): readonly string[] {
  return [
    ...(fuse?.at === "unit" ? [`F${group}.${place}`] : []),
    ...(isolating === null ? [] : [`RI${group}.${place}`]),
    ...(fuse?.at === "string" && place === series ? [`F${group}`] : []),
  ];
}

/** From the negative point through unit, fuse and isolating resistor to the positive one. */
function unitWires(props: SchematicProps, conductor: Cell): readonly Wire[] {
  return spotsOf(props).flatMap((spot) => {
    const { low, high } = pointsOf(props, spot);
    const name = unitName(spot);
    return [joint(low, `${name} -`, conductor), ...chain(`${name} +`, partsAbove(props, spot), high, conductor)];
  });
}

/**
 * What stands across each stage or unit. In a string it goes to the unit's own terminals: joined outside the fuse or isolating
 * resistor it would be cut off by the fuse that opens, and the unit would keep its charge.
 */
const acrossOf = (props: SchematicProps, letters: string): ReturnType<typeof positionsOf> => {
  const spots = spotsOf(props);
  return positionsOf(props, letters).map((position, i) => {
    const spot = props.ties === "strings" ? spots[i] : undefined;
    return spot !== undefined && partsAbove(props, spot).length > 0
      ? { ...position, high: `${unitName(spot)} +` }
      : position;
  });
};

/** A position as a whole: its elements are joined end to end on their mount beforehand. */
const balanceWires = (props: SchematicProps): readonly Wire[] =>
  props.balance === null ? [] : acrossOf(props, "RB").flatMap(({ name, low, high }) => chain(low, [name], high));

/** Cathodes to the positive side. */
function clampWires(props: SchematicProps): readonly Wire[] {
  if (!props.clamps.positions) return [];
  return acrossOf(props, "DC").flatMap(({ name, low, high }) => [
    joint(low, `${name} anode`),
    joint(`${name} cathode`, high),
  ]);
}

/** Charger, dump, bleed, meter, switch and load; the earth point. */
function outsideWires(props: SchematicProps, thick: Cell): readonly Wire[] {
  const bars = barsOf(props);
  const [minus, plus] = [bars[0] as string, bars[bars.length - 1] as string];
  const { isolation, dump, dumpRelay, bleeds, clamp } = partNames(props);
  const earthed = { negative: minus, positive: plus, unknown: "the end to be decided", none: null }[props.earth];
  return [
    ...chain("G1 +", isolation, plus),
    joint("G1 -", minus),
    ...(props.dump === null ? [] : chain(plus, [dumpRelay, dump], minus)),
    ...bleeds.flatMap((name) => chain(plus, [name], minus)),
    ...(props.clamps.bank ? [joint(minus, `${clamp} anode`), joint(`${clamp} cathode`, plus)] : []),
    ...chain(plus, ["meter divider"], minus),
    ...chain(plus, ["S1", ...(props.load.coil ? ["L1"] : []), "X1"], minus, thick),
    ...(earthed === null ? [] : [joint(earthed, "E1")]),
  ];
}
