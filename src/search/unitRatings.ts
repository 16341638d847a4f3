// The shot's findings on the worst unit, judged at the worst end of the envelope and never passed on an unknown tolerance.

import type { Capacitor } from "../catalog/index.ts";
import { atMost, type Bound, type Discharge, type Envelope } from "../pulse/index.ts";
import { type Finding, formatQuantity } from "../quantity/index.ts";

/** By which figure of the envelope a finding grows. */
const GROWS: Readonly<Record<string, "peakCurrent" | "reversal" | "action">> = {
  "pulse.unit.current": "peakCurrent",
  "pulse.unit.slew": "peakCurrent",
  "pulse.unit.action": "action",
  "pulse.unit.reversal": "reversal",
  "pulse.polarity": "reversal",
};

/** Figures that rest on how the units share. */
const SHARED = ["pulse.unit.current", "pulse.unit.slew", "pulse.unit.action"];

/** What the findings are judged with. `clampDrop` is null without a clamp, V. */
export interface Rated {
  readonly unit: Capacitor;
  readonly envelope: Envelope;
  readonly series: number;
  readonly parallel: number;
  readonly clampDrop: number | null;
  /** Reversal of the unit worst placed on the bus, at the corner that damps least; 0 where no place is told. And what it is. */
  readonly placed: { readonly reversal: number; readonly bound: Bound };
}

/**
 * A polarised unit rated for no reversal at all still sees its part of the clamp's own drop, which no clamp can spare it:
 * told as a warning, with the volts, so long as the reversal is no more than that drop.
 */
function spared(finding: Finding, { unit, series, clampDrop }: Rated, voltage: number): Finding {
  const { id, verdict, value, limit } = finding;
  if (id !== "pulse.unit.reversal" || verdict !== "fail" || limit !== 0 || unit.polarised === false) return finding;
  if (clampDrop === null || value === null || value * voltage > clampDrop * 1.05) return finding;
  const volts = formatQuantity(clampDrop / series, "voltage", { digits: 3, rounding: "up" });
  const note = `What remains is the clamp's own drop, ${volts} on a unit by its even share; ask the maker whether it bears that.`;
  return { ...finding, verdict: "warn", note };
}

/** The discharge's findings, each value at the high end of its figure. */
export function unitRatingFindings(discharge: Discharge, of: Rated): readonly Finding[] {
  const { unit, parallel } = of;
  const voltage = Math.sqrt((2 * discharge.energy.stored) / (of.unit.capacitance * (of.parallel / of.series)));
  const alike = unit.tolerance === undefined && parallel > 1;
  return discharge.findings.map((finding) => {
    const raised = spared(atEnd(finding, discharge, of), of, voltage);
    if (!alike || !SHARED.includes(finding.id) || raised.verdict !== "pass") return raised;
    const note = `${raised.note} The tolerance is unknown, so the worst unit may carry more.`;
    return { ...raised, verdict: "not assessed", note };
  });
}

/** The finding with its value at the high end of the envelope. */
function atEnd(finding: Finding, discharge: Discharge, { envelope, placed }: Rated): Finding {
  const figure = GROWS[finding.id];
  if (figure === undefined || finding.value === null) return finding;
  const { high, nominal } = envelope[figure];
  if (high === null || nominal === null) return finding;
  const reversal = Math.max(high, placed.reversal, finding.value);
  const raised = figure === "reversal" ? reversal > finding.value : high > nominal;
  if (!raised) return finding;
  const value = figure === "reversal" ? reversal : (finding.value * high) / nominal;
  const { id, state, limit, unit, source, note, verdict } = finding;
  const bound = figure === "reversal" ? placed.bound : discharge.bounds[figure];
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
