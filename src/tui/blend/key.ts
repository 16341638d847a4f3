// Names the brief in force and the catalogues as they were read: what was found for another holds no more.
import { textOf } from "../detail.ts";
import type { State } from "../state.ts";

/** Null while no brief is whole, or the one planned is not the one in force. */
export const blendKey = ({ answer, asked, answered, reads }: State): string | null =>
  answer?.kind === "planned" && asked === answered ? `${reads}\n${textOf(answer.brief)}` : null;
