// Goes along the trail of what was tried, and back to a brief of it.
import { fieldAt } from "../fields.ts";
import { ask, type Change, type State, still } from "../state.ts";
import { pageOf, type Step, stepFrom } from "./scroll.ts";

/** Place of the cursor on the trail, from its oldest. */
export const trailIndex = ({ trail, trailBack }: State): number => Math.max(0, trail.length - 1 - trailBack);

export function moveTrail(state: State, by: Step): Change {
  const last = state.trail.length - 1;
  const at = Math.max(0, Math.min(last, stepFrom(trailIndex(state), by, pageOf(state))));
  return still({ ...state, trailBack: Math.max(0, last - at), notice: null });
}

/** The brief of the entry under the cursor holds again, as a new step: nothing is lost by it. */
export function retry(state: State): Change {
  const entry = state.trail[trailIndex(state)];
  if (entry === undefined) return still(state);
  const { values, extra } = entry;
  const caret = (values[fieldAt(state.field).key] ?? "").length;
  const text = "This brief holds again; the step is on the trail too.";
  return ask({ ...state, values, extra, caret, trailBack: 0, notice: { tone: "good", text } });
}
