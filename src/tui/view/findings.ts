// Findings as rows: the verdict by mark and word, what it is about, its figure against its limit, and what would mend it.
import { type Finding, formatQuantity } from "../../quantity/index.ts";
import type { SharedWords } from "../ports.ts";
import { type Row, rowOf, span } from "../row.ts";
import { fitText } from "../text.ts";
import { bySeverity, type shown, VERDICT_STYLE } from "../values.ts";
import { paragraph } from "./words.ts";

export const VERDICT_MARK: Readonly<Record<Finding["verdict"], string>> = {
  fail: "x fail",
  warn: "! warn",
  "not assessed": "? not assessed",
  pass: "  pass",
};

const DIMENSION_OF_UNIT: Readonly<Record<string, Parameters<typeof shown>[1]>> = {
  V: "voltage",
  J: "energy",
  A: "current",
  W: "power",
  s: "time",
  ohm: "resistance",
  F: "capacitance",
  "V/s": "slew",
  A2s: "action",
  Hz: "frequency",
  "1": "count",
};

/** A finding's number in its unit; a unit not in the table is printed as it stands. */
function findingValue(value: number | null, unit: string): string {
  if (value === null) return "unknown";
  const dimension = DIMENSION_OF_UNIT[unit];
  // One figure more than elsewhere: rounded to the nearest, it then never contradicts a worst case rounded up.
  if (dimension !== undefined) return formatQuantity(value, dimension, { digits: 4 });
  return `${Number(value.toPrecision(4))}${unit === "" ? "" : ` ${unit}`}`;
}

/** The worst first; only what did not pass says its note. */
export function findingRows(findings: readonly Finding[], columns: number, words: SharedWords | null): readonly Row[] {
  return bySeverity(findings).flatMap((finding): readonly Row[] => {
    const limit = finding.limit === null ? "" : ` of ${findingValue(finding.limit, finding.unit)}`;
    const value =
      finding.value === null && finding.limit === null ? "" : `: ${findingValue(finding.value, finding.unit)}${limit}`;
    const line = rowOf(
      span(fitText(VERDICT_MARK[finding.verdict], 15), VERDICT_STYLE[finding.verdict]),
      span(`${finding.state}, ${words?.titleOf(finding.id) ?? finding.id}${value}`),
    );
    const notes =
      finding.verdict === "pass" || finding.note === "" ? [] : paragraph(finding.note, columns - 15, "quiet");
    return [line, ...notes.map((note) => ({ left: [span(" ".repeat(15)), ...note.left] }))];
  });
}
