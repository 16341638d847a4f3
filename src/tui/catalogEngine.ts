// The engine behind the screens: the search on one set of parts and resistors, each answer pure.
import type { Capacitor, Purchase, ResistorFamily } from "../catalog/index.ts";
import { accepted, toMajor } from "../quantity/index.ts";
import { assess, type Brief, type LayoutResult, plan, planCurrency, readBrief } from "../search/index.ts";
import type { Arrangement, BillLine, BillView, EnginePort } from "./ports.ts";

/** Layouts worked out in full for the list. */
const LISTED = 200;

export interface Stock {
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
}

/** A layout's own name taken apart; the part may hold any text. */
const ID = /^(.*) (\d+)s(\d+)p (cross-tied|strings)$/su;

export function arrangementNamed(id: string): Arrangement | null {
  const match = ID.exec(id);
  if (match === null) return null;
  const [, part = "", series = "", parallel = "", ties] = match;
  return {
    part,
    series: Number(series),
    parallel: Number(parallel),
    ties: ties === "strings" ? "strings" : "cross-tied",
  };
}

function lineOf(item: string, bought: Purchase, currency: string, orderCode: string): BillLine {
  const money = (minor: number | null): number | null => (minor === null ? null : toMajor(Math.round(minor), currency));
  return {
    item,
    needed: bought.needed,
    onHand: bought.fromHand,
    packs: bought.packs,
    bought: bought.bought,
    surplus: bought.surplus,
    consumed: money(bought.consumed),
    cost: money(bought.cost),
    orderCode,
  };
}

export function catalogEngine({ parts, families }: Stock): EnginePort {
  const byName = new Map(parts.map((unit) => [unit.part, unit]));
  const currencyOf = (brief: Brief): string | null => {
    const read = planCurrency(brief, parts, families);
    return read.ok ? read.value : null;
  };
  const assessed = (brief: Brief, currency: string | null, layout: Arrangement): LayoutResult | null => {
    const unit = byName.get(layout.part);
    return unit === undefined ? null : assess({ unit, layout, brief, families, currency });
  };
  return {
    readBrief: (values) => readBrief(values),
    plan: (brief, { rank, frontOnly, quick }) => {
      const planned = plan({ brief, parts, families, limit: LISTED, rank, quick });
      if (!planned.ok || !frontOnly) return planned;
      const given = new Map(planned.value.layouts.map((layout) => [layout.id, layout]));
      const layouts = planned.value.front.map((id) => {
        const named = arrangementNamed(id);
        return given.get(id) ?? (named && assessed(brief, planned.value.currency, named));
      });
      return accepted({ ...planned.value, layouts: layouts.filter((layout) => layout !== null) });
    },
    check: (brief, arrangement) => assessed(brief, currencyOf(brief), arrangement),
    bill: (brief, layout): BillView => {
      const currency = layout.cost?.currency ?? currencyOf(brief) ?? "";
      const { capacitors, resistors } = layout.purchase;
      const family = families.find(({ family: name }) => name === layout.balance?.family);
      const lines = [
        ...(capacitors === null
          ? []
          : [lineOf(layout.part, capacitors, currency, byName.get(layout.part)?.orderCode ?? "")]),
        ...(layout.balance === null || resistors === null
          ? []
          : [lineOf(`balancing resistor, ${layout.balance.family}`, resistors, currency, family?.orderCode ?? "")]),
      ];
      return { lines, total: layout.cost?.total ?? null, currency, unpriced: layout.cost?.unpriced ?? [] };
    },
  };
}
