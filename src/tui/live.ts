// When a key is live: questions about the state, for the table of keys.
import { keyInForce } from "./blend/key.ts";
import { fieldAt } from "./fields.ts";
import { planOf, shownBank } from "./pick.ts";
import type { ScreenName, State } from "./state.ts";

export type Live = (state: State) => boolean;

/** All of several conditions. */
export const all =
  (...conditions: readonly Live[]): Live =>
  (state) =>
    conditions.every((live) => live(state));

export const always: Live = () => true;
export const inHelp: Live = (state) => state.help;
/** No question and no help lies on top of the screen. */
export const isOpen: Live = (state) => state.prompt === null && !state.help;
export const noQuestion: Live = (state) => state.prompt === null;
export const asksName: Live = (state) => state.prompt?.replace === false && !state.help;
export const asksReplace: Live = (state) => state.prompt?.replace === true && !state.help;

export const on =
  (...screens: readonly ScreenName[]): Live =>
  (state) =>
    isOpen(state) && screens.includes(state.screen);

export const onBrief = on("brief");
const hasChoices: Live = (state) => fieldAt(state.field).choices !== undefined;
export const onChoice: Live = all(onBrief, hasChoices);
/** A line of the screen of measured units is open: the name of a file, or the question whether to replace one. */
const onUnitsLine: Live = (state) => on("units")(state) && state.units.typing !== null;
export const typesUnits: Live = (state) => onUnitsLine(state) && !state.units.replace;
export const asksUnits: Live = (state) => onUnitsLine(state) && state.units.replace;
export const onUnits: Live = (state) => on("units")(state) && state.units.typing === null;
export const placesUnits: Live = (state) => onUnits(state) && state.units.running !== null;
export const hasUnits: Live = (state) =>
  onUnits(state) && state.units.lot !== null && state.units.running === null && hasBank(state);
export const hasPlaced: Live = (state) => onUnits(state) && state.units.placed !== null;
export const seeksBlend: Live = (state) => on("blend")(state) && state.blend.running !== null;
/** There is a brief in force whose blend is neither found nor being sought. */
export const mayFindBlend: Live = (state) => {
  const key = keyInForce(state);
  const { running, found } = state.blend;
  const has = running?.key === key || (found?.key === key && !found.stopped);
  return on("blend")(state) && state.words !== null && key !== null && !has;
};
/** Keys type: a field of the form, or the name of a file. */
export const types: Live = (state) => asksName(state) || typesUnits(state) || (onBrief(state) && !hasChoices(state));
/** Letters are keys, because nothing is typed here. */
export const isFree: Live = (state) => isOpen(state) && state.screen !== "brief" && !onUnitsLine(state);

export const hasLayouts: Live = (state) => (planOf(state)?.layouts.length ?? 0) > 0;
export const works: Live = (state) => isOpen(state) && state.work !== null;
export const hasParts: Live = (state) => !state.showFaults && (state.catalogue?.parts.length ?? 0) > 0;
export const hasTrail: Live = (state) => state.trail.length > 0;
export const hasPins: Live = (state) => state.pins.length > 0;
/** The spread is shown unasked on the statistical basis, and one in series has none. */
export const mayAskSpread: Live = (state) => {
  const bank = shownBank(state);
  const statistical = state.answer?.kind === "planned" && state.answer.brief.basis === "statistical";
  return on("sharing")(state) && bank !== null && bank.series > 1 && !statistical;
};
export const hasBank: Live = (state) => shownBank(state) !== null;
