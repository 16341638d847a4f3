// The last word on a bank: how many checks failed or stayed open, and how many of the faults do; a fault warns and fails no check.

import type { Finding, Verdict } from "../quantity/index.ts";

type Judged = Pick<Finding, "verdict">;

const counted = (of: readonly Judged[], verdict: Verdict): number => of.filter((one) => one.verdict === verdict).length;

/** "No check failed; 1 could not be assessed. OF THE FAULTS 3 FAIL, 1 could not be assessed." The exit status is the checks' alone. */
export function lastLine(findings: readonly Judged[], faults: readonly Judged[]): string {
  const [fails, open] = [counted(findings, "fail"), counted(findings, "not assessed")];
  const checks =
    fails > 0
      ? `${fails} ${fails === 1 ? "CHECK" : "CHECKS"} FAILED.`
      : open > 0
        ? `No check failed; ${open} could not be assessed.`
        : "No check failed.";
  const [bad, unknown] = [counted(faults, "fail"), counted(faults, "not assessed")];
  const words = [
    ...(bad > 0 ? [`${bad} ${bad === 1 ? "FAILS" : "FAIL"}`] : []),
    ...(unknown > 0 ? [`${unknown} could not be assessed`] : []),
  ];
  return words.length === 0 ? checks : `${checks} OF THE FAULTS ${words.join(", ")}.`;
}
