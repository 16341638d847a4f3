// The exact course of the bank layer in the form that a diagnosis asks for: quick charge, charger left on.
import { courseOf } from "../bank/index.ts";
import type { Course } from "./diagnoseModel.ts";

/** Stage voltages and the charger's current at the given times, every stage by its exact exponentials. */
export const exactCourse: Course = (stages, bank, times) => {
  const chain = stages.map((stage) => ({ ...stage, leakageCurrent: 0 }));
  const last = Math.max(0, ...times);
  const course = courseOf(chain, {
    charge: { kind: "instant" },
    voltage: bank,
    hold: last > 0 ? last : 1,
    dump: null,
    rest: 0,
  });
  const held = course.phases.at(-1)!;
  return times.map((time) => ({ volts: Array.from(held.voltagesAt(time)), current: held.currentAt(time) }));
};
