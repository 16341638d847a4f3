// What the screens that look closer at one bank need worked out, piece by piece: which piece is missing, and for which brief and bank it holds.
import { shownBank } from "./pick.ts";
import type { Details, EnginePort, Piece } from "./ports.ts";
import type { State } from "./state.ts";

/** Texts of objects that never change once made, so that a long record in a brief is written out once. */
const texts = new WeakMap<object, string>();
export function textOf(value: object): string {
  const known = texts.get(value) ?? JSON.stringify(value);
  texts.set(value, known);
  return known;
}

/** Names the brief and the chosen bank; null while none is chosen. */
export const detailKey = ({
  values,
  extra,
  chosen,
  reads,
}: Pick<State, "values" | "extra" | "chosen" | "reads">): string | null =>
  chosen === null ? null : `${reads}\n${textOf(values)}\n${textOf(extra)}\n${textOf(chosen)}`;

/** The pieces that hold for what is shown now; null when there are none. */
export const detailsOf = (state: State): Details | null =>
  state.details !== null && state.details.key === detailKey(state) ? state.details : null;

/** The spread is wanted: on the statistical basis, or because it was asked for. */
export const wantsSpread = (state: State): boolean =>
  state.spread || (state.answer?.kind === "planned" && state.answer.brief.basis === "statistical");

/** The next piece that the screen in sight needs and has not; null for none. The quick ones come first. */
export function wantedPiece(state: State): Piece | null {
  const { answer, screen } = state;
  if (answer?.kind !== "planned" || state.asked !== state.answered || shownBank(state) === null) return null;
  // What was stopped is not begun again by itself.
  if (state.stopped === state.asked) return null;
  const wanted: readonly Piece[] =
    screen === "sharing"
      ? ["rest", "margin", ...(wantsSpread(state) ? (["spread"] as const) : [])]
      : screen === "shot" && answer.brief.load !== undefined
        ? ["shot"]
        : [];
  const has = detailsOf(state);
  return wanted.find((piece) => has?.[piece] === undefined) ?? null;
}

/** What is known of the shown bank, with one piece more. Call with what `wantedPiece` said. */
export function withPiece(state: State, piece: Piece, engine: EnginePort): Details | null {
  const bank = shownBank(state);
  const key = detailKey(state);
  if (state.answer?.kind !== "planned" || bank === null || key === null) return null;
  return { ...detailsOf(state), key, [piece]: engine[piece](state.answer.brief, bank) };
}
