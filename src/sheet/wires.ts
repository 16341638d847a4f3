/*
 * The joints of a bank, one row each: what is joined to what, and the conductor where it follows from the shot.
 *
 *   symbol  unit   meaning
 *   A       A^2 s  action integral of one shot through the conductor
 *   S       m^2    least area that one shot heats from 20 degC to 90 degC with no time to cool
 *
 * Bars and the leads of switch and load carry the bank's action, a unit's leads its own share at worst. Charging, balancing and
 * dump leads carry little: their area is a matter of strength, and is left blank. 90 degC is an assumed limit (common practice, no
 * source: what ordinary insulation bears). Source: [IEC60949] adiabatic heating.
 */

import { leastArea } from "../pulse/index.ts";
import type { ShotReport } from "../search/index.ts";
import { squareMillimetres } from "./cells.ts";
import type { Cell } from "./model.ts";
import { balanceSpots, barsOf, nodesOf, type Shape, spotsOf, unitName } from "./names.ts";

/** One joint. Terminals are written "C3.7 +"; a bar or node is one point. */
export interface Wire {
  readonly from: string;
  readonly to: string;
  readonly conductor: Cell;
}

export interface WiringInput {
  readonly shape: Shape;
  /** Elements of a balancing position; 0: none fitted. */
  readonly balanceElements: number;
  readonly shot: ShotReport | null;
  /** In series with each unit: a fuse, a resistor. */
  readonly unitFuse: boolean;
  readonly isolating: boolean;
  /** In series with each string, at its positive end. */
  readonly stringFuse: boolean;
  readonly earth: "negative" | "positive" | "none" | "unknown";
}

const RISE = { from: 293.15, to: 363.15 } as const;

const copper = (action: number | null | undefined): Cell =>
  action === null || action === undefined
    ? null
    : `copper, at least ${squareMillimetres(leastArea("copper", action, RISE))}`;

/** Every joint of the bank and of what hangs on it, in the order that it is wired. */
export const wiresOf = (input: WiringInput): readonly Wire[] => [
  ...unitRows(input),
  ...balanceRows(input),
  ...outsideRows(input),
];

/** What the bars are made of at least; null where no action integral is known. */
export const barConductor = (shot: ShotReport | null): Cell => copper(shot?.discharge.action);

/** From the negative node through unit, fuse and resistor to the positive one. */
function unitRows({ shape, shot, unitFuse, isolating, stringFuse }: WiringInput): readonly Wire[] {
  const conductor = copper(shot?.discharge.unit.action);
  const plain = { conductor };
  return spotsOf(shape).flatMap((spot) => {
    const { low, high } = nodesOf(shape, spot);
    const name = unitName(spot);
    const at = `${spot.group}.${spot.place}`;
    const top = stringFuse && spot.place === shape.series;
    const between = [
      ...(unitFuse ? [`F${at}`] : []),
      ...(top ? [`F${spot.group}`] : []),
      ...(isolating ? [`RI${at}`] : []),
    ];
    const wires: Wire[] = [{ from: low, to: `${name} -`, ...plain }];
    let from = `${name} +`;
    for (const part of between) {
      wires.push({ from, to: `${part} a`, ...plain });
      from = `${part} b`;
    }
    return [...wires, { from, to: high, ...plain }];
  });
}

/** k equal elements in series in each position: RB3:1, RB3:2 ... joined end to end. */
function balanceRows({ shape, balanceElements }: WiringInput): readonly Wire[] {
  if (balanceElements === 0) return [];
  const plain = { conductor: null };
  return balanceSpots(shape).flatMap(({ name, low, high }) => {
    const wires: Wire[] = [];
    let from = low;
    for (let k = 1; k <= balanceElements; k++) {
      const element = balanceElements === 1 ? name : `${name}:${k}`;
      wires.push({ from, to: `${element} a`, ...plain });
      from = `${element} b`;
    }
    return [...wires, { from, to: high, ...plain }];
  });
}

/** Charger, dump, meter, switch and load; the earth point. Bleeders of their own where no chain empties the bank. */
function outsideRows({ shape, shot, balanceElements, earth }: WiringInput): readonly Wire[] {
  const bars = barsOf(shape);
  const [minus, plus] = [bars[0] as string, bars[bars.length - 1] as string];
  const thin = { conductor: null };
  const thick = { conductor: barConductor(shot) };
  const wire = (from: string, to: string, by: typeof thin | typeof thick = thin): Wire => ({ from, to, ...by });
  return [
    wire("charger +", "isolation a"),
    wire("isolation b", plus),
    wire("charger -", minus),
    ...(balanceElements === 0 ? [wire(minus, "bleed resistor a"), wire("bleed resistor b", plus)] : []),
    wire(plus, "dump resistor a"),
    wire("dump resistor b", "dump relay a"),
    wire("dump relay b", minus),
    wire(plus, "meter divider a"),
    wire("meter divider b", minus),
    wire(plus, "switch a", thick),
    wire("switch b", "load a", thick),
    wire("load b", minus, thick),
    ...(earth === "none"
      ? []
      : [wire(earth === "positive" ? plus : earth === "negative" ? minus : "the end to be decided", "earth point")]),
  ];
}
