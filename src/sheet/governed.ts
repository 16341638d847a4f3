// What is found of the bank by the rule chosen to govern its sheet, and what of it belongs on the door.

import { governedFindings, inScope, ruleOf, TOUCH_SAFE } from "../hazard/index.ts";
import type { Finding } from "../quantity/index.ts";
import { cell, said } from "./cells.ts";
import { factsOf } from "./facts.ts";
import type { SheetInput } from "./input.ts";
import { waysDown } from "./ways.ts";

type Asked = Pick<SheetInput, "layout" | "brief" | "rule">;

/** Whether the rule speaks of this bank, whether its time is kept, and a touch-safe voltage that is too high. */
export function governedOf({ layout, brief, rule }: Asked): readonly Finding[] {
  const facts = factsOf({ layout, brief, rule });
  const { voltage, level, allowed, chain, dump } = facts;
  const ways = waysDown(facts, { from: voltage, to: level });
  const none = facts.capacitance === null ? null : Number.POSITIVE_INFINITY;
  return [
    ...(rule === null
      ? []
      : governedFindings({
          rule,
          voltage,
          allowed,
          chains: chain === null ? none : ways.chains,
          dump: dump === null ? null : ways.dump,
        })),
    ...(brief.touchSafe > TOUCH_SAFE
      ? [
          {
            id: "touch-safe-high",
            state: "stored",
            verdict: "warn",
            value: brief.touchSafe,
            limit: TOUCH_SAFE,
            margin: (TOUCH_SAFE - brief.touchSafe) / TOUCH_SAFE,
            unit: "V",
            source: "IEC61010-1",
            note: `The brief calls a voltage touch-safe that is not, by the rule held to here. ${ruleOf("iec-61010-touch").words} Waits go down to that.`,
          } as const,
        ]
      : []),
  ];
}

/** What the door says of a rule that does not speak of this bank. */
export function governedLines(input: Asked): readonly string[] {
  const { voltage, rule } = factsOf(input);
  return input.rule === null || inScope(input.rule, voltage)
    ? []
    : [
        `The rule chosen, ${rule}, does not speak of a bank at ${said(cell(voltage, "voltage"))}: it is out of its scope.`,
      ];
}
