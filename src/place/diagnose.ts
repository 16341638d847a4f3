// Reads back a bank that was built: do the voltages agree with the prediction, and if not, which unit or resistor is it and how?
import { accepted, type Read, refused } from "../quantity/index.ts";
import { COUNTS, gather, likely, worstOf } from "./diagnoseAnswer.ts";
import type { MeterModel, PriorDoubt } from "./diagnoseEvidence.ts";
import { chargerOn } from "./diagnoseModel.ts";
import { nextMeasurement } from "./diagnoseNext.ts";
import { checkDiagnosis, type Diagnosis, type DiagnosisRequest } from "./diagnoseRequest.ts";
import { limitFindings, STOP_ACTIONS, sumFindings } from "./diagnoseSafety.ts";
import { weigh } from "./diagnoseWeigh.ts";
import { wholeFindings } from "./diagnoseWhole.ts";

/** A chi-squared this many standard deviations up does not agree: one sound bank in a thousand. */
const TOO_FAR = 3.1;
/** Beyond this even the best single fault does not explain the readings. */
const UNEXPLAINED = 4;
/** Chance of a sound bank where nothing explains the readings, at most: the tail beyond `UNEXPLAINED`, rounded up. */
const UNLIKELY = 5e-4;
const DEFAULT_DOUBT: PriorDoubt = { capacitance: 0.003, leakage: 0.3, resistance: 0.05, bank: 0.02 };

/**
 * The verdict on one chain of stages.
 *
 * Readings that are wrong as a whole name no suspect: the meter is checked first.
 *
 * @returns `stop` when a reading is over the limit or a polarised unit stands backwards; `differs` when the readings do not fit the
 *   prediction, or when an explanation still likely would put a stage over the limit; `agrees` otherwise. Refusals for readings that
 *   do not match the stages in number, or without a meter uncertainty.
 */
export function diagnose(request: DiagnosisRequest): Read<Diagnosis> {
  const faults = checkDiagnosis(request);
  if (faults.length > 0) return refused(...faults);
  const { stages, rows, limit = null, polarised = true, course = chargerOn } = request;
  const meter: MeterModel = { common: 0.01, current: 0.05, ...request.meter };
  const doubt = { ...DEFAULT_DOUBT, ...request.doubt };
  const { sound, faults: weighed } = weigh({ stages, rows, meter, doubt }, course, polarised);

  const top = Math.max(sound.weight, ...weighed.map((w) => w.weight));
  const scale = Math.exp(sound.weight - top) + weighed.reduce((sum, w) => sum + Math.exp(w.weight - top), 0);
  const chance = (weight: number): number => Math.exp(weight - top) / scale;
  const soundChance = chance(sound.weight);
  const suspects = gather(weighed, chance);
  const leastExcess = Math.min(sound.excess, ...weighed.map((w) => w.excess));

  const explanations = likely(weighed, chance, { chance: soundChance });
  const bank = Math.max(...rows.map((row) => row.bank));
  const latest = Math.max(...rows.map((row) => row.seconds));
  const here = worstOf(explanations, { stages, course, bank, seconds: latest });
  const goOn = request.next ? worstOf(explanations, { stages, course, ...request.next }) : null;
  const over = limitFindings(rows, limit);
  const reversed = suspects.find((s) => s.kind === "reversed unit" && s.likelihood > 0.5);
  const fits = sound.excess <= TOO_FAR && soundChance >= 0.5;
  const mayMatter = limit !== null && here.worst > limit;
  const whole = wholeFindings({ stages, rows, meter, doubt, course, polarised });
  const distrusted = whole.length > 0;
  const agrees = fits && !mayMatter && !distrusted;
  const verdict = over.length > 0 || (reversed && !distrusted) ? "stop" : agrees ? "agrees" : "differs";
  const unexplained = distrusted || leastExcess > UNEXPLAINED;
  return accepted({
    verdict,
    // Where nothing weighed explains the readings, being the likeliest of it is no chance of being sound: the tail is, at most.
    sound: unexplained ? Math.min(soundChance, Math.exp(-(Math.max(0, sound.excess) ** 2) / 2), UNLIKELY) : soundChance,
    suspects: distrusted ? [] : verdict === "agrees" ? suspects.filter((s) => s.likelihood >= COUNTS) : suspects,
    unexplained,
    next: distrusted
      ? { action: "check the meter" }
      : nextMeasurement(explanations, { stages, course, meter, bank, latest }),
    goOn: goOn ? { ...goOn, safe: limit === null ? null : verdict === "agrees" && goOn.worst <= limit } : null,
    actions: verdict === "stop" ? STOP_ACTIONS : [],
    findings: [...whole, ...over, ...sumFindings(rows, meter)],
  });
}
