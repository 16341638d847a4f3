// What other layers say of a checked layout beside its findings: faults, corners, time course, clamp diodes, what to improve.

import type { Capacitor } from "../catalog/index.ts";
import {
  type Brief,
  bankCourse,
  clampOf,
  cornersOf,
  faultsOf,
  improve,
  type LayoutResult,
  shareSpread,
} from "../search/index.ts";
import type { Checked } from "./checked.ts";

export interface BankFacts {
  readonly layout: LayoutResult;
  readonly unit: Capacitor;
  readonly brief: Brief;
}

/** Keys that `check --json` adds. The statistical risk is in the layout itself. */
export const joinedFacts = ({ layout, unit, brief }: BankFacts): { readonly faults: ReturnType<typeof faultsOf> } => ({
  faults: faultsOf({ result: layout, unit, brief }),
});

/** Banks drawn for the spread of the worst unit, and the seed they are drawn from. */
const DRAWN = { banks: 65_536, seed: 1 };

/** What `check` adds about the states at rest; null is not assessed, or not needed (clamp). */
export function restFacts({ result, unit, settings, stock, currency, lot }: Checked) {
  const { brief } = settings;
  const bank = { result, unit, brief };
  return {
    corners: cornersOf(bank),
    course: bankCourse(bank),
    clamp: clampOf({ ...bank, share: result.share }),
    /** Only the statistical basis asks how the worst unit is spread. */
    spread:
      brief.basis === "statistical" ? shareSpread({ ...bank, ...(lot === undefined ? {} : { lot }) }, DRAWN) : null,
    improve: improve({ ...bank, families: stock.families, currency }),
  };
}
