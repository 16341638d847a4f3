/*
 * Whether a fuse in series with each unit lives through every shot and clears the fault of that unit.
 *
 *   symbol  name            unit    meaning
 *   A_u     normalAction    A^2 s   action of one shot through the worst unit
 *   A_f     leastFaultAction A^2 s  least that the neighbours drive through it: least share, low capacitance, energy over resistance
 *   A_m A_c melting, clearing   A^2 s   of the fuse; both from its maker
 *
 * Lives when A_u <= part A_m (part 0.25 when the user gives none: common practice, no source); clears when A_f >= A_c and the
 * fuse is rated to break the direct voltage across it. A_f counts the loop's resistance without the arc's own. Source: [methods-derived].
 */
import type { Finding } from "../quantity/index.ts";
import { atLeast, atMost } from "./verdict.ts";

/** One fuse: A^2 s, A^2 s, V dc; null when the maker does not say. */
export interface Fuse {
  readonly meltingAction: number | null;
  readonly clearingAction: number | null;
  readonly dcVoltage: number | null;
}

/** What the fuse sees; null when unknown. */
export interface FuseDuty {
  readonly normalAction: number | null;
  readonly leastFaultAction: number | null;
  readonly voltage: number | null;
}

/** Part of the melting action that a shot may use, shot after shot. Common practice, no source. */
export const SHOT_PART = 0.25;

/** The three findings of a fuse. `part`: the user's own part of melting for a shot. */
export function fuseFindings(fuse: Fuse, duty: FuseDuty, part: number = SHOT_PART): readonly Finding[] {
  const state = "faulted";
  return [
    atMost({
      id: "pulse.fuse.lives",
      state: "pulse",
      value: duty.normalAction,
      limit: fuse.meltingAction === null ? null : part * fuse.meltingAction,
      unit: "A2s",
      source: "common-practice",
      note: `Action of a normal shot against ${part} of melting, so that the fuse does not tire; take a larger fuse if over.`,
    }),
    atLeast({
      id: "pulse.fuse.clears",
      state,
      value: duty.leastFaultAction,
      limit: fuse.clearingAction,
      unit: "A2s",
      source: "methods-derived",
      note: "Least action that the neighbours drive into a shorted unit, least share and low capacitance, against what the fuse needs to clear.",
    }),
    atMost({
      id: "pulse.fuse.voltage",
      state,
      value: duty.voltage,
      limit: fuse.dcVoltage,
      unit: "V",
      source: "methods-derived",
      note: "Direct voltage that the fuse must break against its dc rating; an ac rating does not count.",
    }),
  ];
}
