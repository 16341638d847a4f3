// What is asked of a diagnosis, what it answers, and what is wrong with the asking.
import type { Finding, Refusal } from "../quantity/index.ts";
import { type MeterModel, observed, type PriorDoubt, type ReadingRow } from "./diagnoseEvidence.ts";
import type { FaultKind } from "./diagnoseFaults.ts";
import type { Course, StageModel } from "./diagnoseModel.ts";
import type { NextMeasurement } from "./diagnoseNext.ts";

export interface DiagnosisRequest {
  /** Cross-tied: each stage as measured. Strings: the units of one string; ask once for each string. */
  readonly stages: readonly StageModel[];
  readonly rows: readonly ReadingRow[];
  /** Relative uncertainty of a voltage reading, and V of resolution and zero error. */
  readonly meter: { readonly relative: number; readonly absolute: number } & Partial<MeterModel>;
  /** Relative uncertainties of the stages as measured; defaults 0.003, 0.3 (of ln leakage), 0.05, 0.02. */
  readonly doubt?: Partial<PriorDoubt>;
  /** V that no stage may exceed; absent: not assessed. */
  readonly limit?: number;
  readonly polarised?: boolean;
  /** How the voltages go in time; default: quick charge, charger left on. */
  readonly course?: Course;
  /** The step of the hot test that would come next. */
  readonly next?: { readonly bank: number; readonly seconds: number };
}

export interface Suspect {
  /** Stage (or unit of the string), from 0. */
  readonly position: number;
  readonly kind: FaultKind;
  /** Probability, given the readings. */
  readonly likelihood: number;
  /** Size of the fault: part of C lost or gained, extra leakage over what flowed, R over its value, V of a reversed unit over its even share; 1 where it has none. */
  readonly size: number;
}

export interface GoOn {
  readonly safe: boolean | null;
  /** V, the worst stage at the next step under any explanation that is still likely. */
  readonly worst: number;
  readonly position: number;
}

export interface Diagnosis {
  readonly verdict: "agrees" | "differs" | "stop";
  /** Probability that nothing is wrong, given the readings and that at most one thing is. */
  readonly sound: number;
  readonly suspects: readonly Suspect[];
  /** True when no single fault explains the readings: more than one thing is wrong, or the prediction is. */
  readonly unexplained: boolean;
  readonly next: NextMeasurement | null;
  readonly goOn: GoOn | null;
  /** What to do, in order, when the verdict is stop. */
  readonly actions: readonly string[];
  readonly findings: readonly Finding[];
}

const fault = (code: string, read: string, want: string): Refusal => ({
  code,
  place: { field: "readings" },
  read,
  want,
});

/** Every fault of the request. */
export function checkDiagnosis({ stages, rows, meter }: DiagnosisRequest): Refusal[] {
  const faults: Refusal[] = [];
  if (stages.length === 0) faults.push(fault("commission.no-stages", "0 stages", "1 or more"));
  if (observed(rows).length === 0) faults.push(fault("commission.no-readings", "no readings", "1 or more"));
  for (const [k, row] of rows.entries()) {
    if (row.volts.length !== stages.length) {
      faults.push(
        fault(
          "commission.count",
          `row ${k + 1}: ${row.volts.length} readings`,
          `${stages.length}, blank where not read`,
        ),
      );
    }
    if (!(row.seconds >= 0) || !(row.bank > 0) || observed([row]).some((v) => !Number.isFinite(v))) {
      faults.push(
        fault("commission.number", `row ${k + 1}`, "finite readings, a time of 0 or more, a bank voltage above 0"),
      );
    }
  }
  if (!(meter.relative > 0 || meter.absolute > 0)) {
    faults.push(fault("commission.meter", "no uncertainty", "the meter's uncertainty, above 0"));
  }
  return faults;
}
