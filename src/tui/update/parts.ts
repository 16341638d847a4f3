// The catalogue screen: goes through parts and their values, and sets a value by hand.
import type { Capacitor } from "../../catalog/index.ts";
import { lineOf } from "../line.ts";
import { type Change, type Prompt, type State, still } from "../state.ts";
import { pageOf, type Step, scrollScreen, stepFrom } from "./scroll.ts";

/** Place of the part under the cursor; the last one when the catalogue has shrunk. */
export const partAt = ({ catalogue, partIndex }: State): number =>
  Math.max(0, Math.min((catalogue?.parts.length ?? 0) - 1, partIndex));

export const partUnder = (state: State): Capacitor | null => state.catalogue?.parts[partAt(state)] ?? null;

const headings = ({ words }: State): readonly string[] => words?.headings ?? [];

export const headingInHand = (state: State): string => {
  const all = headings(state);
  return all[Math.min(all.length - 1, state.headingIndex)] ?? "";
};

export function moveParts(state: State, by: Step, most: number): Change {
  if (state.showFaults) return scrollScreen(state, "parts", by, most);
  const last = (state.catalogue?.parts.length ?? 0) - 1;
  const partIndex = Math.max(0, Math.min(last, stepFrom(partAt(state), by, pageOf(state))));
  return still({ ...state, partIndex, notice: null });
}

/** The next or the last value; the ends join. */
export function moveHeading(state: State, by: number): Change {
  const count = Math.max(1, headings(state).length);
  return still({ ...state, headingIndex: (((state.headingIndex + by) % count) + count) % count, notice: null });
}

/** Asks for the value in hand, beginning with what is set already. */
export function askValue(state: State): Change {
  const unit = partUnder(state);
  const heading = headingInHand(state);
  if (unit === null || heading === "") return still(state);
  const text = state.overrides[unit.part]?.[heading] ?? "";
  const prompt: Prompt = { what: "value", line: lineOf(text), replace: false, part: unit.part, heading };
  return still({ ...state, prompt, notice: null });
}

/** Holds the value against its column, then has it saved beside the file. A blank takes back what was set. */
export function confirmValue(state: State, prompt: Prompt & { readonly what: "value" }): Change {
  const unit = state.catalogue?.parts.find(({ part }) => part === prompt.part);
  if (unit === undefined || state.words === null) return still({ ...state, prompt: null });
  const text = prompt.line.text.trim();
  const own = Object.fromEntries(
    Object.entries(state.overrides[prompt.part] ?? {}).filter(([heading]) => heading !== prompt.heading),
  );
  const texts = text === "" ? own : { ...own, [prompt.heading]: text };
  const trouble = text === "" ? null : state.words.overrideTrouble(unit, { [prompt.heading]: text });
  if (trouble !== null) return still({ ...state, notice: { tone: "bad", text: trouble } });
  const others = Object.fromEntries(Object.entries(state.overrides).filter(([part]) => part !== prompt.part));
  const overrides = Object.keys(texts).length === 0 ? others : { ...others, [prompt.part]: texts };
  const said =
    text === ""
      ? `${prompt.part}: ${prompt.heading} is the catalogue's again.`
      : `${prompt.part}: ${prompt.heading} ${text} is set by hand, beside the file.`;
  return {
    state: { ...state, overrides, prompt: null, notice: { tone: "good", text: said } },
    effects: [{ type: "overrides", overrides }],
  };
}
