// Results as JSON: no number that JSON lacks ever gets in, and no hidden character; an endless hold is said in the brief's own words.

import { visibleJson } from "../order/index.ts";

/** Pretty JSON ending in a line break. Infinity under `hold` is "for ever"; any other number that is not finite is null, unknown. */
export function toJson(value: unknown): string {
  const text = JSON.stringify(
    value,
    (key, field: unknown) => {
      if (typeof field !== "number" || Number.isFinite(field)) return field;
      return key === "hold" ? "for ever" : null;
    },
    2,
  );
  return `${visibleJson(text)}\n`;
}
