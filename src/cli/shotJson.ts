// One shot as the plain data of `pulse --json`: the figures asked for at the top, the rest by its own name.

import type { InductanceSweep, LayoutResult, ShotReport } from "../search/index.ts";
import { waveformTimes } from "./waveform.ts";

/** Rows of the band that are printed; the waveform file has more. */
const BAND_ROWS = 101;

/** The course with its lowest and highest, row by row; null when nothing spreads. A sample of so many shots, not a proof. */
function bandJson({ band, discharge }: ShotReport) {
  if (band === null) return null;
  return { kind: band.kind, courses: band.courses, rows: waveformTimes(discharge, BAND_ROWS).map(band.at) };
}

/** SI values; null is unknown or without bound, and `bounds` says what a figure is when parts of the loop are unknown. */
export function shotJson(
  layout: LayoutResult,
  report: ShotReport,
  sweep: InductanceSweep | null,
): Readonly<Record<string, unknown>> {
  const { bank, discharge, bus, charge, highestRate, heating } = report;
  const { damping, lampAlpha, peakCurrent, peakTime, reversal, action, unitPeakCurrent, energy } = discharge;
  const { id, part, series, parallel, ties, units } = layout;
  return {
    id,
    part,
    series,
    parallel,
    ties,
    units,
    damping,
    lampAlpha,
    peakCurrent,
    peakTime,
    reversal,
    action,
    unitPeakCurrent,
    energy,
    bounds: discharge.bounds,
    method: discharge.method,
    voltage: report.voltage,
    bank: { capacitance: bank.capacitance, resistance: bank.esr, inductance: bank.esl },
    bus: { ...bus.path, known: bus.path !== null, frequency: bus.frequency, place: bus.place },
    unit: discharge.unit,
    envelope: report.envelope,
    band: bandJson(report),
    charging: charge,
    highestRate,
    heating,
    drift: report.drift,
    ripple: report.ripple,
    life: report.life,
    lamp: report.lamp,
    stated: report.stated,
    sweep,
    faults: report.faults,
    findings: report.findings,
  };
}
