// What stands on a label of a unit, a stage, a string or a spare, as plain data.

export interface Label {
  readonly kind: "unit" | "stage" | "string" | "spare";
  /** "3.7": stage or string, then the place in it; "3" for a stage or a string; null: a blank to fill in. */
  readonly position: string | null;
  /** null: a line to fill in. A stage or a string has none: left out. */
  readonly serial?: string | null;
  readonly part: string;
  /** true: "+" and "-" ends are printed; null: not known, and a box asks for it. */
  readonly polarised: boolean | null;
  /** Of one unit, or of the stage or string as a whole: V, F; null: a blank. */
  readonly voltage: number | null;
  readonly capacitance: number | null;
  /** V to earth that its most distant terminal may stand at; null: a blank. */
  readonly toEarth: number | null;
}

export const LABEL_PAPERS = ["A4", "Letter"] as const;

export interface LabelsProps {
  readonly id: string;
  readonly title: string;
  readonly labels: readonly Label[];
  readonly paper: (typeof LABEL_PAPERS)[number];
}
