// How far each printed layout of a plan lands from the lamp's ideal circuit.

import type { Capacitor } from "../catalog/index.ts";
import type { LampCircuit } from "../pulse/index.ts";
import { idealLampCircuit, type LampReport, lampReport, type PlanResult } from "../search/index.ts";

/** The part of `plan --json` on a lamp: the ideal circuit, and a report for each layout it could be worked out for. */
export interface LampFits {
  readonly lampDrive?: {
    readonly ideal: LampCircuit;
    readonly fits: readonly { readonly id: string; readonly report: LampReport }[];
  };
}

/** Nothing when the brief sizes no lamp's circuit. */
export function lampFits({ brief, layouts }: PlanResult, parts: readonly Capacitor[]): LampFits {
  const ideal = idealLampCircuit(brief);
  if (ideal === null) return {};
  const fits = layouts.flatMap(({ id, part, series, parallel, capacitance }) => {
    const esl = parts.find((one) => one.part === part)?.esl;
    const bus = brief.bus?.inductance ?? 0;
    const own = esl === undefined ? null : (esl * series) / parallel + bus;
    const read = lampReport(brief, { capacitance: capacitance.nominal, own });
    return read.ok && read.value !== null ? [{ id, report: read.value }] : [];
  });
  return { lampDrive: { ideal, fits } };
}
