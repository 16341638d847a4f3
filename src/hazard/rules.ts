// All the published limits a bank is held against, found by id.

import { DECAY_RULES } from "./decayRules.ts";
import { ENERGY_RULES } from "./energyRules.ts";
import type { Rule } from "./rule.ts";

export const RULES = [...DECAY_RULES, ...ENERGY_RULES] as const;

export type RuleId = (typeof RULES)[number]["id"];

/** The row of that id. Range: every id of RULES. */
export const ruleOf = (id: RuleId): Rule => RULES.find((rule) => rule.id === id) as Rule;
