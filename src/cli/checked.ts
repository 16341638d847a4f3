// The bank that `check` and `order` are about: inputs read, part found, layout assessed.

import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import { accepted, type Read, refused } from "../quantity/index.ts";
import { assess, type BalanceWish, type LayoutResult, planCurrency } from "../search/index.ts";
import { type LayoutFlags, type LayoutInput, readLayout } from "./layoutInput.ts";
import type { Ports } from "./ports.ts";
import { type Flags, type Settings, settle } from "./settings.ts";
import { findPart, readStock, type Stock } from "./stock.ts";

export type BankFlags = Flags &
  LayoutFlags & { readonly catalog?: readonly string[]; readonly resistors?: string; readonly json?: boolean };

export interface Checked {
  readonly result: LayoutResult;
  readonly unit: Capacitor;
  readonly settings: Settings;
  readonly stock: Stock;
  readonly currency: string | null;
  /** Said beside the result: how the resistor came about where that is not plain. */
  readonly notes: readonly string[];
}

/** Reads everything and assesses; every fault of every input is told at once. */
export function checkedBank(brief: string | undefined, flags: BankFlags, ports: Ports): Read<Checked> {
  const settings = settle(brief, flags, ports.files);
  const stock = readStock(flags, ports.files);
  const families: readonly ResistorFamily[] = stock.ok ? stock.value.families : [];
  const input = readLayout(flags, ports.files, families[0]?.tolerance ?? 0.05);
  if (!settings.ok || !stock.ok || !input.ok) {
    return refused(...[settings, stock, input].flatMap((read) => (read.ok ? [] : read.refusals)));
  }
  const place = { field: flags.layout === undefined ? "--part" : `${flags.layout} part` };
  const unit = findPart(input.value.layout.part, stock.value.parts, place);
  if (!unit.ok) return unit;
  const currency = planCurrency(settings.value.brief, [unit.value], families);
  if (!currency.ok) return currency;
  const of = (balance: BalanceWish): LayoutResult =>
    assess({
      unit: unit.value,
      layout: input.value.layout,
      brief: settings.value.brief,
      families,
      currency: currency.value,
      balance,
    });
  const { result, notes } = balanced(input.value, flags, of);
  return accepted({
    result,
    unit: unit.value,
    settings: settings.value,
    stock: stock.value,
    currency: currency.value,
    notes,
  });
}

/** The flags decide; else a file's own resistor, which is the chosen one when the rule still gives the same; else the rule. */
function balanced(
  { balance, filed }: LayoutInput,
  flags: BankFlags,
  of: (wish: BalanceWish) => LayoutResult,
): { readonly result: LayoutResult; readonly notes: readonly string[] } {
  if (balance !== null) {
    const assumed = balance.kind === "fixed" && flags.balanceTolerance === undefined;
    const note = `The tolerance of the fixed resistor was not given: ${assumed ? `${balance.tolerance * 100} %` : ""} of the first family is assumed.`;
    return { result: of(balance), notes: assumed ? [note] : [] };
  }
  const chosen = of({ kind: "choose" });
  if (filed === undefined) return { result: chosen, notes: [] };
  const same = (a: number, b: number): boolean => Math.abs(a - b) <= 1e-9 * Math.abs(b);
  if (filed === null) {
    const note = "The layout's file has no balancing resistors, so none are counted.";
    return chosen.balance === null ? { result: chosen, notes: [] } : { result: of({ kind: "none" }), notes: [note] };
  }
  const kept =
    chosen.balance !== null &&
    same(chosen.balance.resistance, filed.resistance) &&
    same(chosen.balance.tolerance, filed.tolerance);
  if (kept) return { result: chosen, notes: [] };
  const note =
    "The resistor is the one of the layout's file; by this brief and these families another would be chosen.";
  return { result: of({ kind: "fixed", ...filed }), notes: [note] };
}
