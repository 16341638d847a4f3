// What the bank faces of the tests are drawn from: an invented bench, with what a test changes.
import { FACE_PIECE, type FaceProps } from "../../src/sheet/draw/index.ts";

export const faceOf = (change: Partial<FaceProps> = {}): FaceProps => ({
  id: "f",
  title: "Pulsed magnet bench (invented)",
  series: 4,
  parallel: 3,
  ties: "cross-tied",
  groups: null,
  spares: [],
  polarised: true,
  chargeVoltage: 1600,
  earth: "negative",
  piece: FACE_PIECE,
  ...change,
});

/** Serials of a whole bank, each its own. */
export const serialsOf = (groups: number, members: number): readonly (readonly string[])[] =>
  Array.from({ length: groups }, (_, group) =>
    Array.from({ length: members }, (_, place) => `N${group + 1}-${place + 1}`),
  );
