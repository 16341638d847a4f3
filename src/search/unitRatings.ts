// The shot's findings on the worst unit, judged at the worst end of the envelope and never passed on an unknown tolerance.

import type { Capacitor } from "../catalog/index.ts";
import { atMost, type Discharge, type Envelope } from "../pulse/index.ts";
import type { Finding } from "../quantity/index.ts";

/** By which figure of the envelope a finding grows. */
const GROWS: Readonly<Record<string, "peakCurrent" | "reversal" | "action">> = {
  "pulse.unit.current": "peakCurrent",
  "pulse.unit.slew": "peakCurrent",
  "pulse.unit.reversal": "reversal",
  "pulse.polarity": "reversal",
};

/** Figures that rest on how the units share. */
const SHARED = ["pulse.unit.current", "pulse.unit.slew", "pulse.unit.action"];

/** The discharge's findings, each value at the high end of its figure; no finding on a rating that no catalogue has. */
export function unitRatingFindings(
  discharge: Discharge,
  of: { readonly unit: Capacitor; readonly envelope: Envelope; readonly parallel: number },
): readonly Finding[] {
  const { unit, envelope, parallel } = of;
  const alike = unit.tolerance === undefined && parallel > 1;
  return discharge.findings
    .filter(({ id }) => id !== "pulse.unit.action")
    .map((finding) => {
      const raised = atEnd(finding, discharge, envelope);
      if (!alike || !SHARED.includes(finding.id) || raised.verdict !== "pass") return raised;
      const note = `${raised.note} The tolerance is unknown, so the worst unit may carry more.`;
      return { ...raised, verdict: "not assessed", note };
    });
}

/** The finding with its value at the high end of the envelope. */
function atEnd(finding: Finding, discharge: Discharge, envelope: Envelope): Finding {
  const figure = GROWS[finding.id];
  if (figure === undefined || finding.value === null) return finding;
  const { high, nominal } = envelope[figure];
  if (high === null || nominal === null || !(high > nominal)) return finding;
  const value = figure === "reversal" ? high : (finding.value * high) / nominal;
  const { id, state, limit, unit, source, note, verdict } = finding;
  const bound = figure === "reversal" ? discharge.bounds.reversal : discharge.bounds.peakCurrent;
  const told = note.replace(/ \((?:upper|lower) bound\)$| \(side unknown\)$/, "");
  const judged = atMost({
    id,
    state,
    value,
    limit,
    unit,
    source,
    bound,
    note: `${told} At the worst end of the tolerance.`,
  });
  // a clamp's small remaining reversal stays a warning
  return verdict === "warn" && judged.verdict === "fail" ? { ...judged, verdict: "warn" } : judged;
}
