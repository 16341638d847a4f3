// One shot as the plain data of `pulse --json`: the figures asked for at the top, the rest by its own name.

import type { InductanceSweep, LayoutResult, ShotReport } from "../search/index.ts";

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
