// What other layers say of a checked layout beside its findings: the fault table.

import type { Capacitor } from "../catalog/index.ts";
import { type Brief, faultsOf, type LayoutResult } from "../search/index.ts";

export interface BankFacts {
  readonly layout: LayoutResult;
  readonly unit: Capacitor;
  readonly brief: Brief;
}

/** Keys that `check --json` adds. The statistical risk is in the layout itself. */
export const joinedFacts = ({ layout, unit, brief }: BankFacts): { readonly faults: ReturnType<typeof faultsOf> } => ({
  faults: faultsOf({ result: layout, unit, brief }),
});
