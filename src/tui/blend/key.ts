// Names the brief that was planned and the catalogues as they were read: what was found for another holds no more.
import { textOf } from "../detail.ts";
import type { State } from "../state.ts";

/** Null while no brief is planned. While a newer one is being planned it is, as on the other screens, the one before. */
export const blendKey = ({ answer, reads }: State): string | null =>
  answer?.kind === "planned" ? `${reads}\n${textOf(answer.brief)}` : null;

/** The key of the brief in force; null while it is not planned yet. */
export const keyInForce = (state: State): string | null => (state.asked === state.answered ? blendKey(state) : null);
