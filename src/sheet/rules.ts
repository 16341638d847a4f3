// A published rule as it is named on paper: who sets it, where it stands, and how far its text was read.

import { type HowRead, type RuleId, ruleOf } from "../hazard/index.ts";

/** What a reader is told of how far the text was read. */
export const READ: Readonly<Record<HowRead, string>> = {
  read: "read",
  "second hand": "second hand",
  memory: "memory: confirm against the text",
};

/** The rule's name with where it stands: "NFPA 70E Article 360 (2021, 2024)". */
export const ruleName = (id: RuleId): string => {
  const { body, clause, edition } = ruleOf(id);
  return [body, clause, edition === "" ? "" : `(${edition})`].filter((part) => part !== "").join(" ");
};

/** The name, and how far its text was read where that is not the whole way. */
export function toldRule(id: RuleId): string {
  const { tag } = ruleOf(id);
  const read = { read: "", "second hand": ", second hand", memory: ", from memory: confirm against the text" }[tag];
  return `${ruleName(id)}${read}`;
}
