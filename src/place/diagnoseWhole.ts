// Readings wrong as a whole: no fault of one place makes them, so the meter, its leads or the charge voltage are in doubt first.
import type { Finding } from "../quantity/index.ts";
import type { MeterModel, PriorDoubt, ReadingRow } from "./diagnoseEvidence.ts";
import { faultyCourse, type Hypothesis, hypotheses } from "./diagnoseFaults.ts";
import type { Course, StageModel } from "./diagnoseModel.ts";

/** More standard deviations than this away, readings do not add up to the charge voltage. */
const APART = 4;
/** A reading below this part of its prediction reads nothing. Common practice, no source. */
const NOTHING = 0.05;

export interface WholeQuestion {
  readonly stages: readonly StageModel[];
  readonly rows: readonly ReadingRow[];
  readonly meter: MeterModel;
  readonly doubt: PriorDoubt;
  readonly course: Course;
  readonly polarised: boolean;
}

interface Sums {
  readonly least: number;
  readonly most: number;
}

const sizesOf = ({ sizes }: Hypothesis): readonly number[] =>
  sizes.kind === "none" ? [1] : sizes.kind === "one" ? [sizes.at] : [sizes.from, sizes.to];

const sumOf = (volts: readonly number[]): number => volts.reduce((total, v) => total + Math.abs(v), 0);

/** V that all stages together hold, under a sound bank and under each single fault at the ends of its size. */
function sums({ stages, course, polarised }: WholeQuestion, { bank, seconds }: ReadingRow): Sums {
  const courses = [
    course,
    ...hypotheses(stages, polarised).flatMap((one) => sizesOf(one).map((size) => faultyCourse(course, one, size))),
  ];
  const all = courses.map((each) => sumOf(each(stages, bank, [seconds])[0]!.volts));
  return { least: Math.min(...all), most: Math.max(...all) };
}

/** What the readings of a row look like when they are wrong together; null when they may be the bank's. */
function reasonOf(question: WholeQuestion, row: ReadingRow): { readonly sum: number; readonly why: string } | null {
  const { meter, doubt } = question;
  const seen = row.volts.filter((v) => v !== null);
  const every = seen.length === row.volts.length;
  const whole = row.total ?? null;
  const readings = whole === null ? seen : [...seen, whole];
  const predicted = question.course(question.stages, row.bank, [row.seconds])[0]!.volts;
  const shares = row.volts.flatMap((v, i) => (v === null ? [] : [predicted[i]!]));
  const expected = whole === null ? shares : [...shares, sumOf(predicted)];
  const sum = seen.reduce((total, v) => total + v, 0);
  const none = readings.every((v, k) => Math.abs(v) <= Math.max(APART * meter.absolute, NOTHING * expected[k]!));
  // One place alone may be shorted; a row of nothing is no single fault.
  if (none && (readings.length > 1 || question.stages.length === 1))
    return {
      sum,
      why: "the meter is dead, on a wrong range or not connected (a blown fuse in its lead), or the bank was never charged",
    };
  if (readings.length > 1 && readings.every((v) => v < 0))
    return { sum, why: "the meter's leads are reversed, or the whole bank is charged backwards" };
  const sound = sumOf(predicted);
  const outside = (value: number): boolean => {
    const spread = Math.hypot(
      value * meter.common,
      row.bank * doubt.bank,
      ...seen.map((v) => v * meter.relative),
      ...seen.map(() => meter.absolute),
    );
    if (Math.abs(value - sound) <= APART * spread) return false;
    const { least, most } = sums(question, row);
    return value < least - APART * spread || value > most + APART * spread;
  };
  // A lead swapped at one place changes its sign alone.
  if (every && seen.length > 0 && outside(sumOf(seen))) {
    const ends = seen.every((v) => v > 0.9 * row.bank);
    const risen =
      seen.every((v, i) => i === 0 || v > seen[i - 1]!) || seen.every((v, i) => i === 0 || v < seen[i - 1]!);
    const common = seen.length > 1 && (ends || (risen && Math.max(...seen) > 0.9 * row.bank));
    const likely = common ? "each reading was taken to a common end of the bank and not across its stage" : "";
    const wrong = "the charge voltage given is wrong, or the meter or its range is";
    return { sum: sumOf(seen), why: likely === "" ? wrong : `${likely}; or ${wrong}` };
  }
  if (whole !== null && outside(Math.abs(whole)))
    return { sum: whole, why: "the charge voltage given is wrong, or the meter or its range is" };
  return null;
}

/** One finding for each row whose readings are wrong as a whole. */
export function wholeFindings(question: WholeQuestion): Finding[] {
  return question.rows.flatMap((row): Finding[] => {
    const found = reasonOf(question, row);
    if (found === null) return [];
    return [
      {
        id: "commission.whole",
        state: row.seconds > 0 ? "holding" : "charging",
        verdict: "fail",
        value: found.sum,
        limit: row.bank,
        margin: null,
        unit: "V",
        source: "common-practice",
        note: `The readings together are not those of a bank charged to ${row.bank} V: ${found.why}. Treat the bank as charged.`,
      },
    ];
  });
}
