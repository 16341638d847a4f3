/*
 * What is found about a bank by the rule that was chosen to govern it: whether the rule speaks of this voltage at all, and its time.
 *
 *   symbol  name         unit  range
 *   V       voltage      V     > 0, highest
 *   t       chains,dump  s     >= 0 to the rule's own level, each way alone; null where not known, or there is no such way
 *
 * Scope: the rule's own range of voltage, else those of its limits; outside all of them the rule says nothing of this bank.
 * Time: the chains within it pass; the dump alone within it warns, because it must be switched; neither fails.
 * Source: [methods-derived] 3.1.
 */

import type { Finding } from "../quantity/index.ts";
import { applies } from "./rule.ts";
import { type RuleId, ruleOf } from "./rules.ts";

export interface Governed {
  readonly rule: RuleId;
  readonly voltage: number;
  /** s that the rule gives; null when it gives none. */
  readonly allowed: number | null;
  readonly chains: number | null;
  readonly dump: number | null;
}

/** V dc that a wait goes down to whichever rule governs. Source: [IEC61010-1] 6.3.1, second hand. */
export const TOUCH_SAFE = Math.min(...ruleOf("iec-61010-touch").limits.map(({ value }) => value));

/** Whether a rule speaks of a bank at this voltage. Range: voltage >= 0. */
export function inScope(id: RuleId, voltage: number): boolean {
  const { scope, limits } = ruleOf(id);
  return scope === undefined ? limits.some((limit) => applies(limit, voltage)) : applies({ at: scope }, voltage);
}

/** The edge of the scope that the voltage is beyond, V. */
function edgeOf(id: RuleId, voltage: number): number | null {
  const { scope, limits } = ruleOf(id);
  const ranges = scope === undefined ? limits.map(({ at }) => at ?? {}) : [scope];
  const edges = ranges.flatMap(({ from, upTo, below }) => [from, upTo, below].filter((x) => x !== undefined));
  return edges.reduce<number | null>(
    (best, edge) => (best === null || Math.abs(edge - voltage) < Math.abs(best - voltage) ? edge : best),
    null,
  );
}

/** Findings on the scope and the time of the governing rule. Range: voltage > 0. Source: file head. */
export function governedFindings({ rule, voltage, allowed, chains, dump }: Governed): readonly Finding[] {
  const found: Finding[] = [];
  if (!inScope(rule, voltage)) {
    const limit = edgeOf(rule, voltage);
    found.push({
      id: "rule-scope",
      state: "stored",
      verdict: "warn",
      value: voltage,
      limit,
      margin: null,
      unit: "V",
      source: "joulewright-design",
      note: `OUT OF ITS SCOPE: the rule chosen does not speak of a bank at this voltage. ${ruleOf(rule).words} Choose one that does.`,
    });
  }
  return allowed === null ? found : [...found, timeFinding({ allowed, chains, dump })];
}

function timeFinding({ allowed, chains, dump }: { allowed: number } & Pick<Governed, "chains" | "dump">): Finding {
  const within = (seconds: number | null): boolean => seconds !== null && seconds <= allowed;
  const verdict = chains === null ? "not assessed" : within(chains) ? "pass" : within(dump) ? "warn" : "fail";
  const never = "Never trust it: dump, measure, short.";
  const words = {
    pass: `The bleed chains alone reach the rule's level in its time. ${never}`,
    warn: `The bleed chains alone are over the rule's time; the dump resistor alone is within it, if it closes. ${never}`,
    fail: "The bleed chains alone are over the rule's time, and no dump resistor that is stated is within it: lower resistors or a dump would mend it.",
    "not assessed": "The longest time is not known.",
  };
  return {
    id: "rule-time",
    state: "stored",
    verdict,
    value: chains,
    limit: allowed,
    margin: chains === null ? null : (allowed - chains) / allowed,
    unit: "s",
    source: "joulewright-design",
    note: words[verdict],
  };
}
