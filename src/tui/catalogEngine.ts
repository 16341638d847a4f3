// The engine behind the screens: the search on one set of parts and resistors, each answer pure.
import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import { cautionsOf, type Files } from "../cli/index.ts";
import { cautionsFor, DEFERENCE } from "../hazard/index.ts";
import { billOf } from "../order/index.ts";
import { accepted } from "../quantity/index.ts";
import {
  assess,
  type Brief,
  bankCourse,
  clampOf,
  cornersOf,
  improve,
  inductanceSweep,
  type LayoutResult,
  type PlanResult,
  plan,
  planCurrency,
  readBrief,
  shareSpread,
  shotOf,
} from "../search/index.ts";
import { type Arrangement, type EnginePort, MOST_FRONT } from "./ports.ts";
import { recordReader } from "./record.ts";

/** Said on every copy of an order: the standing cautions, and to whom this program defers. */
const BILL_CAUTIONS: readonly string[] = [...cautionsFor({}), ...DEFERENCE].map(({ short }) => short);

/** Banks drawn for the spread of the worst unit, always from the same seed: the picture of one bank never changes. */
const DRAWN = { banks: 65_536, seed: 1 };
/** Points of the sweep over the loop's inductance. */
const SWEPT = 41;

export interface Stock {
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  /** Where the file of a recorded current is read; null or left out: such a load stays unread. */
  readonly files?: Pick<Files, "read"> | null;
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

export function catalogEngine({ parts, families, files = null }: Stock): EnginePort {
  const recorded = files === null ? null : recordReader(files);
  const byName = new Map(parts.map((unit) => [unit.part, unit]));
  const currencyOf = (brief: Brief): string | null => {
    const read = planCurrency(brief, parts, families);
    return read.ok ? read.value : null;
  };
  const assessed = (brief: Brief, currency: string | null, layout: Arrangement): LayoutResult | null => {
    const unit = byName.get(layout.part);
    return unit === undefined ? null : assess({ unit, layout, brief, families, currency });
  };
  const ofUnit = <T>({ part }: LayoutResult, of: (unit: Capacitor) => T): T | null => {
    const unit = byName.get(part);
    return unit === undefined ? null : of(unit);
  };
  /** Layouts by their names, each worked out unless the plan has it so already. */
  const inFull = (brief: Brief, planned: PlanResult, ids: readonly string[]): readonly LayoutResult[] => {
    const given = new Map(planned.layouts.map((layout) => [layout.id, layout]));
    return ids
      .map((id) => {
        const named = arrangementNamed(id);
        return given.get(id) ?? (named && assessed(brief, planned.currency, named));
      })
      .filter((layout) => layout !== null);
  };
  return {
    readBrief: (values) => {
      const whole = recorded === null ? accepted(values) : recorded(values);
      return whole.ok ? readBrief(whole.value) : whole;
    },
    plan: (brief, { rank, most, frontOnly, quick, progress }) => {
      const planned = plan({ brief, parts, families, limit: most, rank, quick, progress });
      if (!planned.ok || !frontOnly) return planned;
      return accepted({ ...planned.value, layouts: inFull(brief, planned.value, planned.value.front) });
    },
    front: (brief, planned) => inFull(brief, planned, planned.front.slice(0, MOST_FRONT)),
    life: (brief, layout) =>
      ofUnit(layout, (unit) => {
        const report = brief.load === undefined ? null : shotOf({ layout, unit, brief });
        return report?.ok ? report.value.life.ratio : null;
      }),
    check: (brief, arrangement) => assessed(brief, currencyOf(brief), arrangement),
    bill: (brief, layout) => {
      const unit = byName.get(layout.part);
      if (unit === undefined) return null;
      const currency = currencyOf(brief);
      return billOf({ layout, unit, families, brief, currency, cautions: BILL_CAUTIONS });
    },
    rest: (brief, layout) =>
      ofUnit(layout, (unit) => {
        const bank = { result: layout, unit, brief };
        return {
          rating: unit.voltage,
          tolerance: unit.tolerance ?? null,
          corners: cornersOf(bank),
          course: bankCourse(bank),
          clamp: clampOf({ ...bank, share: layout.share }),
          cautions: cautionsOf(brief, { layout, unit }).map(({ text }) => text),
        };
      }),
    margin: (brief, layout) =>
      ofUnit(layout, (unit) => improve({ result: layout, unit, brief, families, currency: currencyOf(brief) })),
    spread: (brief, layout) => ofUnit(layout, (unit) => shareSpread({ result: layout, unit, brief }, DRAWN)),
    shot: (brief, layout) =>
      ofUnit(layout, (unit) => ({
        report: shotOf({ layout, unit, brief }),
        sweep: inductanceSweep({ layout, unit, brief }, SWEPT),
        cautions: cautionsOf(brief, { layout, unit }).map(({ text }) => text),
      })),
  };
}
