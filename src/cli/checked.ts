// The bank that `check` and `order` are about: inputs read, part found, layout assessed.

import { MOST_ELEMENTS } from "../bank/index.ts";
import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import { accepted, formatQuantity, type Read, type Refusal, refused } from "../quantity/index.ts";
import { assess, type BalanceWish, type LayoutResult, planCurrency } from "../search/index.ts";
import { type LayoutFlags, type LayoutInput, readLayout } from "./layoutInput.ts";
import { readLot } from "./measuredLot.ts";
import type { Ports } from "./ports.ts";
import { type Flags, type Nest, type Settings, settle } from "./settings.ts";
import { findPart, readStock, type Stock } from "./stock.ts";
import { refusalWords } from "./words.ts";

export type BankFlags = Flags &
  LayoutFlags & {
    readonly catalog?: readonly string[];
    readonly resistors?: string;
    readonly json?: boolean;
    readonly measured?: string;
  };

export interface Checked {
  readonly result: LayoutResult;
  readonly unit: Capacitor;
  readonly settings: Settings;
  readonly stock: Stock;
  readonly currency: string | null;
  /** Measured capacitances, F, that the chance is reckoned from. */
  readonly lot?: readonly number[];
  /** Said beside the result: how the resistor came about where that is not plain. */
  readonly notes: readonly string[];
}

/** Reads everything and assesses; every fault of every input is told at once. */
export function checkedBank(
  brief: string | undefined,
  flags: BankFlags,
  ports: Ports,
  fill?: (input: Nest) => Nest,
): Read<Checked> {
  const settings = settle(brief, flags, ports.files, fill);
  const stock = readStock(flags, ports.files);
  const families: readonly ResistorFamily[] = stock.ok ? stock.value.families : [];
  const input = readLayout(flags, ports.files, families[0]?.tolerance ?? 0.05);
  if (!settings.ok || !stock.ok || !input.ok) {
    return refused(...[settings, stock, input].flatMap((read) => (read.ok ? [] : read.refusals)));
  }
  if (settings.value.brief.basis === "measured") {
    // Without the units it would be a promise that nobody checked.
    const want = "plan or place with --measured, where the units judge; here another --basis, which beats the brief's";
    return refused({ code: "contradiction", place: { field: "basis" }, read: "measured", want });
  }
  const place = { field: flags.layout === undefined ? "--part" : `${flags.layout} part` };
  const unit = findPart(input.value.layout.part, stock.value.parts, place);
  if (!unit.ok) return unit;
  const currency = planCurrency(settings.value.brief, [unit.value], families);
  if (!currency.ok) return currency;
  const lot = flags.measured === undefined ? undefined : lotFor(flags.measured, unit.value.part, settings.value, ports);
  if (lot?.ok === false) return lot;
  const values = lot === undefined ? {} : { lot: lot.value };
  const of: Assess = (balance, among = families) =>
    assess({
      unit: unit.value,
      layout: input.value.layout,
      brief: settings.value.brief,
      families: among,
      currency: currency.value,
      balance,
      ...values,
    });
  const { result, notes } = balanced(input.value, families, flags.balanceTolerance !== undefined, of);
  const absurd = tooManyElements(result, flags);
  if (absurd !== null) return refused(absurd);
  return accepted({
    result,
    unit: unit.value,
    settings: settings.value,
    stock: stock.value,
    currency: currency.value,
    ...values,
    notes,
  });
}

/** Only the statistical basis draws from a lot; rows that were lost are told at once. */
function lotFor(path: string, part: string, { brief }: Settings, ports: Ports): Read<readonly number[]> {
  if (brief.basis !== "statistical") {
    const want = "--basis statistical beside it: a lot says how likely an excess is";
    return refused({ code: "contradiction", place: { field: "--measured" }, read: `basis ${brief.basis}`, want });
  }
  const lot = readLot(path, part, ports.files);
  if (!lot.ok) return lot;
  if (lot.value.faults.length > 0) ports.err(`${lot.value.faults.map(refusalWords).join("\n")}\n`);
  return accepted(lot.value.values);
}

type Assess = (balance: BalanceWish, among?: readonly ResistorFamily[]) => LayoutResult;
type Fixed = BalanceWish & { readonly kind: "fixed" };

/** A fixed resistor made of the family named, else of the one that takes the fewest elements. */
function fixedAmong(wish: Fixed, families: readonly ResistorFamily[], named: string | null, of: Assess): LayoutResult {
  const own = families.filter((family) => family.family === named);
  const results = (own.length > 0 ? own : families).map((family) => of(wish, [family]));
  const elements = (result: LayoutResult): number => result.balance?.elements ?? Number.POSITIVE_INFINITY;
  return results.reduce((best, next) => (elements(next) < elements(best) ? next : best));
}

/**
 * The flags decide; else a file's own resistor, which is the chosen one when the rule still gives the same; else the rule.
 * A file's resistor of the assumed family was nobody's decision, so the rule chooses again.
 */
function balanced(
  { balance, filed }: LayoutInput,
  families: readonly ResistorFamily[],
  toleranceGiven: boolean,
  of: Assess,
): { readonly result: LayoutResult; readonly notes: readonly string[] } {
  if (balance !== null) {
    if (balance.kind !== "fixed") return { result: of(balance), notes: [] };
    const percent = Number((balance.tolerance * 100).toPrecision(6));
    const note = `The tolerance of the fixed resistor was not given: ${percent} % is assumed, as of the first family.`;
    return { result: fixedAmong(balance, families, null, of), notes: toleranceGiven ? [] : [note] };
  }
  const chosen = of({ kind: "choose" });
  if (filed === undefined) return { result: chosen, notes: [] };
  if (filed === null) {
    const note = "The layout's file has no balancing resistors, so none are counted.";
    return chosen.balance === null ? { result: chosen, notes: [] } : { result: of({ kind: "none" }), notes: [note] };
  }
  const { resistance, tolerance, family, assumed } = filed;
  const same = (a: number, b: number): boolean => Math.abs(a - b) <= 1e-9 * Math.abs(b);
  const now = chosen.balance;
  if (now !== null && same(now.resistance, resistance) && same(now.tolerance, tolerance))
    return { result: chosen, notes: [] };
  if (assumed) {
    const note = "The layout's file has an assumed resistor; it was chosen again from the families given.";
    return { result: chosen, notes: [note] };
  }
  const note =
    "The resistor is the one of the layout's file; by this brief and these families another would be chosen.";
  return { result: fixedAmong({ kind: "fixed", resistance, tolerance }, families, family, of), notes: [note] };
}

/** A resistor that nobody can build: so low that its watts take more elements than any position has. */
function tooManyElements({ balance }: LayoutResult, { balance: given, layout }: BankFlags): Refusal | null {
  if (balance === null || balance.elements <= MOST_ELEMENTS) return null;
  // At so low a resistance the voltage across it is the even share, and the count goes as 1/R.
  const least = formatQuantity((balance.resistance * balance.elements) / MOST_ELEMENTS, "resistance", {
    digits: 3,
    rounding: "up",
  });
  const field = given === undefined && layout !== undefined ? `${layout} balance` : "--balance";
  const read = `${given === undefined ? `${balance.resistance} ohm` : JSON.stringify(given)}, more than ${MOST_ELEMENTS} elements in one position`;
  return { code: "bad-balance", place: { field }, read, want: `${least} or more here, or none` };
}
