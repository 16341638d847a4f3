// What a bank face is drawn from: every position with the serial that stands there, in pieces that fit the paper.

import type { Ties } from "../../bank/index.ts";
import type { Earth } from "./schematicProps.ts";

/** Most cells that one piece of a face may hold, across and down. */
export interface PieceSize {
  readonly columns: number;
  readonly rows: number;
}

export interface FaceProps {
  /** Starts every id inside the drawing: letters, digits, hyphens. */
  readonly id: string;
  readonly title: string;
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  /** Serials by stage (cross-tied) or by string, as a placing gives them; null, or what is missing, is a line to fill in. */
  readonly groups: readonly (readonly (string | null)[])[] | null;
  /** Serials of the spares; null is a line to fill in. */
  readonly spares: readonly (string | null)[];
  readonly polarised: boolean | null;
  /** V with overshoot; potentials are even shares of it. */
  readonly chargeVoltage: number | null;
  readonly earth: Earth;
  readonly piece: PieceSize;
}
