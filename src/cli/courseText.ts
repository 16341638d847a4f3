// The time course of the worst corner as a short table: who stands where, when, and the highest of all.

import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { BankCourse, CourseInstant } from "../search/index.ts";
import { textTable } from "./table.ts";
import { wrap } from "./wrap.ts";

/** Instants of a phase that are shown; all are in the JSON. */
const SHOWN = 4;

const show = (x: number, dimension: Dimension): string => formatQuantity(x, dimension, { digits: 4 });

/** Some of each phase's instants, its last among them. */
function shown(course: BankCourse): readonly CourseInstant[] {
  return course.phases.flatMap(({ name }) => {
    const all = course.instants.filter(({ phase }) => phase === name);
    const step = Math.max(1, (all.length - 1) / (SHOWN - 1));
    const kept = new Set(Array.from({ length: SHOWN }, (_, k) => Math.min(all.length - 1, Math.round(k * step))));
    return all.filter((_, i) => kept.has(i));
  });
}

/** The table, the corner, the peak and what was taken for granted. */
export function courseText(course: BankCourse, width: number): string {
  const { stages, peak, lowest, corner, dumpResistance, endlessHold } = course;
  const name = (kind: number): string => stages[kind]?.words ?? "";
  const table = textTable<CourseInstant>(
    [
      { heading: "state", cell: ({ phase }) => phase },
      { heading: "after", cell: ({ seconds }) => show(seconds, "time"), side: "right" },
      ...stages.map(({ words, count }, i) => ({
        heading: count === 1 ? words : `${words} (${count})`,
        cell: ({ volts }: CourseInstant) => show(volts[i] ?? 0, "voltage"),
        side: "right" as const,
      })),
    ],
    shown(course),
    width,
    "  ",
  );
  const up = (x: number): string => formatQuantity(x, "voltage", { digits: 4, rounding: "up" });
  const facts = [
    `Corner: ${corner}.`,
    `Highest: ${up(peak.voltage)} on ${name(peak.kind)}, in ${peak.phase}, after ${show(peak.seconds, "time")}.`,
    lowest.voltage < 0
      ? `Lowest in this corner: ${show(lowest.voltage, "voltage")}, reversed, on ${name(lowest.kind)}, in ${lowest.phase}, with no clamp fitted.`
      : "",
    endlessHold ? "The hold is for ever: it is shown until it has settled." : "",
    dumpResistance === null
      ? "No dump resistance was stated: the dump is taken as instant."
      : `Dump through ${show(dumpResistance, "resistance")}.`,
  ];
  return [table, wrap(facts.filter((text) => text !== "").join(" "), width, "  ")].join("\n");
}
