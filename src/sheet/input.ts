// Everything that a build sheet is made from: the assessed bank, its shot, its faults, and what the user said and chose.

import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import type { RuleId } from "../hazard/index.ts";
import type { Position } from "../place/index.ts";
import type { Fault } from "../pulse/index.ts";
import type { Verdict } from "../quantity/index.ts";
import type { Brief, FuseChoice, LayoutResult, ShotReport } from "../search/index.ts";
import type { Earth } from "./draw/schematicProps.ts";

/** One line of the brief in words; `given` is false for a default. */
export interface AskedLine {
  readonly label: string;
  readonly value: string;
  readonly given: boolean;
}

/** A finding in words, figures rounded to the safe side. */
export interface FindingLine {
  readonly title: string;
  readonly verdict: Verdict;
  readonly value: string;
  readonly limit: string;
  readonly margin: string;
  readonly source: string;
  readonly note: string;
}

/** What a user reads of the bank that the engineering layers have no words for. */
export interface SheetWords {
  readonly asked: readonly AskedLine[];
  readonly findings: readonly FindingLine[];
  readonly cautions: readonly { readonly id: string; readonly text: string }[];
  /** Remarks on what was read and taken. */
  readonly notes: readonly string[];
  /** The parts of the circuit as the brief has them; null: the brief does not say. */
  readonly charger: string | null;
  readonly switch: string | null;
  readonly load: string | null;
}

/** The layouts that the same brief and catalogues give beside this one. */
export interface Alternatives {
  readonly layouts: readonly LayoutResult[];
  /** How many do the job in all, and what they are ordered by. */
  readonly count: number;
  readonly rank: string;
  /** Names of those that no other beats in everything. */
  readonly front: readonly string[];
}

/** Measured units in their places. */
export interface PlacedUnits {
  readonly positions: readonly Position[];
  /** Serials by stage (cross-tied) or string. */
  readonly groups: readonly (readonly string[])[];
  readonly spares: readonly string[];
  /** Two standard deviations of a stage (unit) voltage, relative. */
  readonly plusMinus: number;
  /** V of the worst at the end of the hold, as placed; null where leakage is not known. */
  readonly holding: number | null;
}

export interface SheetInput {
  readonly layout: LayoutResult;
  readonly unit: Capacitor;
  readonly brief: Brief;
  /** The families that the layout was assessed with. */
  readonly families: readonly ResistorFamily[];
  readonly currency: string | null;
  readonly words: SheetWords;
  /** null: no shot can be reckoned, and `shotOpen` says why. */
  readonly shot: ShotReport | null;
  readonly shotOpen: string | null;
  readonly faults: readonly Fault[];
  /** A fuse of the builder's catalogue; null: none was asked for. */
  readonly fuse: FuseChoice | null;
  /** null: not searched, and `alternativesOpen` says why. */
  readonly alternatives: Alternatives | null;
  readonly alternativesOpen: string | null;
  /** null: the units were not measured. */
  readonly placed: PlacedUnits | null;
  /** The rule that governs; null: the brief's own touch-safe voltage. */
  readonly rule: RuleId | null;
  readonly earth: Earth;
  readonly date: string | null;
  readonly revision: string | null;
  readonly program: string;
}
