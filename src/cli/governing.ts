// The rules that may govern a sheet: those that say when a bank counts as discharged.

import { clearingOf, RULES, type RuleId } from "../hazard/index.ts";

/** They set a level or a time; a rule on what comes back does neither. */
export const GOVERNING: readonly RuleId[] = RULES.filter((rule) => {
  const { voltage, seconds } = clearingOf(rule, 1);
  return voltage !== null || seconds !== null;
}).map(({ id }) => id);
