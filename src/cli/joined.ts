// What other layers add to a checked layout: the seam where the fault table and the statistical risk are joined in.

import type { Capacitor } from "../catalog/index.ts";
import { type Brief, faultsOf, type LayoutResult } from "../search/index.ts";

export interface BankFacts {
  readonly layout: LayoutResult;
  readonly unit: Capacitor;
  readonly brief: Brief;
}

/** Each adds one key to `check --json` when it is there; null until its layer has it. */
export const JOINED: {
  readonly faults: ((bank: BankFacts) => readonly unknown[]) | null;
  readonly risk: ((bank: BankFacts) => unknown) | null;
} = {
  faults: ({ layout, unit, brief }) => faultsOf({ result: layout, unit, brief }),
  risk: ({ layout }) => layout.risk ?? null,
};

/** The joined keys of one bank; `risk` belongs to the statistical basis alone. */
export function joinedFacts(bank: BankFacts, joined = JOINED): Readonly<Record<string, unknown>> {
  const { faults, risk } = joined;
  return {
    ...(faults === null ? {} : { faults: faults(bank) }),
    ...(risk === null || bank.brief.basis !== "statistical" ? {} : { risk: risk(bank) }),
  };
}
