// Other parts that would do in the same place: same shape, same resistors, no check that fails, none open that was not.
//
// What is compared are the catalogues' figures; whether size and terminals fit is for the builder to see.

import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import { formatMoney } from "../quantity/index.ts";
import { assess, type BalanceWish, type Brief, type FuseChoice, type LayoutResult } from "../search/index.ts";
import type { LineKind } from "./bill.ts";

/** Names, the cheapest first, by kind of line. */
export type Alternates = Partial<Readonly<Record<LineKind, readonly string[]>>>;

export interface AlternatesInput {
  readonly layout: LayoutResult;
  readonly unit: Capacitor;
  readonly brief: Brief;
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  readonly currency: string | null;
  readonly fuse?: FuseChoice | null;
}

/** Named on a line. */
const MOST = 3;
/** Assessed at most: the nearest in capacitance. */
const TRIED = 60;

const openIds = (result: LayoutResult): readonly string[] =>
  result.findings.filter(({ verdict }) => verdict === "not assessed").map(({ id }) => id);

/** Nothing fails, and nothing is open that was not. */
function holds(result: LayoutResult, open: readonly string[]): boolean {
  const none = !result.findings.some(({ verdict }) => verdict === "fail");
  return none && result.purchase.capacitors !== null && openIds(result).every((id) => open.includes(id));
}

interface Priced {
  readonly name: string;
  /** Minor units; null when the price is not known. */
  readonly cost: number | null;
}

const named = (found: readonly Priced[], currency: string | null): readonly string[] =>
  [...found]
    .sort(
      (a, b) =>
        (a.cost ?? Number.POSITIVE_INFINITY) - (b.cost ?? Number.POSITIVE_INFINITY) || (a.name < b.name ? -1 : 1),
    )
    .slice(0, MOST)
    .map(({ name, cost }) => `${name} (${currency === null ? "no price" : formatMoney(cost, currency)})`);

function otherUnits({ layout, unit, brief, parts, families, currency }: AlternatesInput): readonly Priced[] {
  const { balance, series, parallel, ties } = layout;
  const wish: BalanceWish =
    balance === null
      ? { kind: "none" }
      : { kind: "fixed", resistance: balance.resistance, tolerance: balance.tolerance };
  const own = families.filter(({ family }) => family === balance?.family);
  const open = openIds(layout);
  const far = (part: Capacitor): number => Math.abs(Math.log(part.capacitance / unit.capacitance));
  return parts
    .filter((part) => part.part !== unit.part && part.polarised === unit.polarised && part.voltage >= layout.share.even)
    .sort((a, b) => far(a) - far(b) || (a.part < b.part ? -1 : 1))
    .slice(0, TRIED)
    .flatMap((part) => {
      const shape = { part: part.part, series, parallel, ties };
      const result = assess({ unit: part, layout: shape, brief, families: own, currency, balance: wish });
      return holds(result, open) ? [{ name: part.part, cost: result.purchase.capacitors?.cost ?? null }] : [];
    });
}

function otherResistors({ layout, unit, brief, families, currency }: AlternatesInput): readonly Priced[] {
  const { balance, series, parallel, ties } = layout;
  if (balance === null || balance.assumed) return [];
  const { resistance, elements, elementResistance } = balance;
  const open = openIds(layout);
  const makes = ({ values }: ResistorFamily): boolean =>
    values.some((ohms) => Math.abs(ohms - elementResistance) <= 1e-9 * ohms);
  return families
    .filter((family) => family.family !== balance.family && makes(family))
    .flatMap((family) => {
      const wish: BalanceWish = { kind: "fixed", resistance, tolerance: family.tolerance };
      const shape = { part: unit.part, series, parallel, ties };
      const result = assess({ unit, layout: shape, brief, families: [family], currency, balance: wish });
      const bought = result.purchase.resistors;
      const same = result.balance?.elements === elements && bought !== null;
      return same && holds(result, open) ? [{ name: family.family, cost: bought.cost }] : [];
    });
}

/** The fuses that were proven to do and were not the cheapest. */
function otherFuses(fuse: FuseChoice | null | undefined): readonly string[] {
  if (!fuse?.chosen) return [];
  const { tried, chosen } = fuse;
  return tried
    .filter((one) => one.fuse !== chosen.row.fuse && one.findings.every(({ verdict }) => verdict === "pass"))
    .map((one) => one.fuse)
    .slice(0, MOST);
}

/** Alternates of the lines that come from catalogues; kinds without any are left out. */
export function alternatesFor(input: AlternatesInput): Alternates {
  const units = named(otherUnits(input), input.currency);
  const found: Alternates = {
    units,
    spares: units,
    "balancing resistors": named(otherResistors(input), input.currency),
    fuses: otherFuses(input.fuse),
  };
  return Object.fromEntries(Object.entries(found).filter(([, names]) => names.length > 0));
}
