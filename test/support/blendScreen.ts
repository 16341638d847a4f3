// The screen of blends with a search that has ended, for tests of what is drawn.
import { type Capacitor, DEFAULT_FAMILY } from "../../src/catalog/index.ts";
import { blendKey } from "../../src/tui/blend/key.ts";
import { type BlendState, type FoundBlends, NO_BLEND } from "../../src/tui/blend/state.ts";
import { blendAnswer } from "../../src/tui/blend/work.ts";
import { catalogEngine } from "../../src/tui/catalogEngine.ts";
import { answerFor } from "../../src/tui/engine.ts";
import type { State } from "../../src/tui/state.ts";
import { drawScreen } from "../../src/tui/view/screen.ts";
import { parts, stateWith } from "./stock.ts";

/** The screen with its brief planned on these parts. */
export function plannedOn(stock: readonly Capacitor[] = parts(), changes: Partial<State> = {}): State {
  const state = stateWith({ screen: "blend", rows: 200, ...changes });
  return { ...state, answer: answerFor(state, catalogEngine({ parts: stock, families: [DEFAULT_FAMILY] }), true) };
}

export const withBlend = (state: State, blend: Partial<BlendState>): State => ({
  ...state,
  blend: { ...NO_BLEND, ...blend },
});

/** What the thread would answer for the brief of the state. */
export async function foundFor(
  state: State,
  stock: readonly Capacitor[] = parts(),
  stop = () => false,
): Promise<FoundBlends> {
  const key = blendKey(state);
  if (state.answer?.kind !== "planned" || key === null) throw new Error("the brief is not planned");
  const { brief } = state.answer;
  const ask = { brief, parts: stock, families: [DEFAULT_FAMILY], told: () => {}, stop, now: () => 0 };
  return { key, answer: await blendAnswer(ask), seconds: 1.234, stopped: stop() };
}

export const linesOf = (state: State): readonly string[] =>
  drawScreen(state).rows.map((row) => row.replace(/\x1b\[[\d;]*m/g, ""));
export const flatOf = (state: State): string => linesOf(state).join(" ").replace(/\s+/g, " ");
