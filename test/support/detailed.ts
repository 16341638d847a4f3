// A state of the screens with every piece that its screens want worked out, as after the frames that would do it.
import { wantedPiece, withPiece } from "../../src/tui/detail.ts";
import { answerFor } from "../../src/tui/engine.ts";
import type { EnginePort } from "../../src/tui/ports.ts";
import type { ScreenName, State } from "../../src/tui/state.ts";
import { drawScreen } from "../../src/tui/view/screen.ts";
import { engine, stateWith } from "./stock.ts";

/** A load as the form holds it. */
export const LOAD = { "load.resistance": "50 mohm", "load.inductance": "20 uH" };

/** The state planned, and all pieces of `screens` (at least its own) worked out. */
export function detailed(changes: Partial<State>, screens: readonly ScreenName[] = [], by: EnginePort = engine): State {
  const begun = stateWith(changes);
  let state: State = { ...begun, answer: answerFor(begun, by, true) };
  for (const screen of [...screens, state.screen])
    for (let piece = wantedPiece({ ...state, screen }); piece !== null; piece = wantedPiece({ ...state, screen }))
      state = { ...state, details: withPiece(state, piece, by) };
  return state;
}

/** All that a screen has to say, scrolled through, without styles and with single blanks. */
export const read = (state: State): string =>
  drawScreen({ ...state, rows: 400 })
    .rows.join("\n")
    .replace(/\x1b\[[\d;]*m/g, "");
