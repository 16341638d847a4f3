// State and message to state and effects: the one place where the screens change. Pure.

import { keyInForce } from "../blend/key.ts";
import type { BlendMessage } from "../blend/state.ts";
import { updateBlend } from "../blend/update.ts";
import { mostListed } from "../engine.ts";
import { FIELDS } from "../fields.ts";
import { type Ground, paletteFor } from "../ground.ts";
import { withHistory } from "../history.ts";
import { arrangementOf, selectedLayout } from "../pick.ts";
import { RANKS } from "../ranks.ts";
import { ask, type Change, type Message, type ScreenName, type State, still } from "../state.ts";
import { withTried } from "../trail.ts";
import type { UnitsMessage } from "../units/state.ts";
import { updateUnits } from "../units/update.ts";
import { mostScroll } from "../view/screen.ts";
import { clickMeans } from "./click.ts";
import { chooseField, editField, moveField } from "./form.ts";
import { nextAxis, toggleTable, walkMap } from "./map.ts";
import { askName, cancel, confirm, editName, saved } from "./order.ts";
import { askValue, confirmValue, moveHeading, moveParts } from "./parts.ts";
import { chooseBank, orderPins, togglePin } from "./pins.ts";
import { moveSelection, type Step, scrollScreen } from "./scroll.ts";
import { moveTrail, retry } from "./trail.ts";
import { nudge, takeInHand } from "./whatIf.ts";

function move(state: State, by: Step): Change {
  if (state.help) return scrollScreen(state, "help", by, mostScroll(state));
  if (state.screen === "brief") return moveField(state, by);
  if (state.screen === "layouts") return moveSelection(state, by);
  if (state.screen === "map") return walkMap(state, "y", by);
  if (state.screen === "parts") return moveParts(state, by, mostScroll(state));
  if (state.screen === "trail") return moveTrail(state, by);
  return scrollScreen(state, state.screen, by, mostScroll(state));
}

const OF_ONE_BANK: readonly ScreenName[] = ["bank", "sharing", "shot", "order", "units"];

/** The screen of measured units looks after itself; what it says is said with the rest. */
function changeUnits(state: State, message: UnitsMessage): Change {
  const { units, effects, notice } = updateUnits(state.units, message);
  return {
    state: { ...state, units, ...(notice === undefined ? {} : { notice }) },
    effects: effects.map((effect) => ({ type: "units", effect })),
  };
}

/** So does the screen of blends; it finds one for the brief in force. */
function changeBlend(state: State, message: BlendMessage): Change {
  const key = keyInForce(state);
  const { answer } = state;
  const wanted =
    answer?.kind !== "planned" || key === null ? null : { what: "find" as const, brief: answer.brief, key };
  const { blend, effects, notice } = updateBlend(state.blend, message, wanted);
  return {
    state: { ...state, blend, ...(notice === undefined ? {} : { notice }) },
    effects: effects.map((effect) => ({ type: "blend", effect })),
  };
}

/** Going to the bank before one was chosen chooses the one under the cursor. */
function goTo(state: State, screen: ScreenName): Change {
  const there: State = { ...state, screen, help: false, notice: null };
  const front = state.answer?.kind === "planned" ? state.answer.front : null;
  const asks = mostListed(there) > mostListed(state) || (screen === "map" && front === null) ? ask : still;
  const layout = selectedLayout(state);
  if (!OF_ONE_BANK.includes(screen) || state.chosen !== null || layout === null) return asks(there);
  return ask({ ...there, chosen: arrangementOf(layout) });
}

/** To the field where a load is given. */
function goToLoad(state: State): Change {
  const field = FIELDS.findIndex(({ key }) => key === "load.resistance");
  const there = goTo(state, "brief");
  return { ...there, state: { ...there.state, field, caret: (state.values["load.resistance"] ?? "").length } };
}

/** The next way of ordering layouts. */
const nextRank = (state: State): State => ({
  ...state,
  rank: RANKS[(RANKS.indexOf(state.rank) + 1) % RANKS.length] ?? "cost",
  selected: null,
  notice: null,
});

/** The catalogues were read, for the first time or again. Values set by hand that are the same stay the same object. */
function opened(state: State, { stock, words, catalogue, overrides }: Message & { readonly type: "opened" }): Change {
  const same = JSON.stringify(overrides) === JSON.stringify(state.overrides);
  return ask({
    ...state,
    stock,
    words,
    catalogue,
    reads: state.reads + 1,
    overrides: same ? state.overrides : overrides,
  });
}

/** The terminal said how light its ground is. */
function withGround(state: State, ground: Ground): State {
  const deep = state.look.palette?.endsWith("256") ?? true;
  return { ...state, look: { ...state.look, palette: paletteFor(ground, deep) } };
}

function toggleMouse(state: State): Change {
  const mouse = !state.mouse;
  const text = mouse
    ? "The mouse is on: click a screen's name or a row, turn the wheel. F12 leaves it to the terminal."
    : "The mouse is the terminal's again.";
  return { state: { ...state, mouse, notice: { tone: "plain", text } }, effects: [{ type: "mouse", on: mouse }] };
}

/** Stops long work. What is shown stays, and is said to be of another brief where it is. */
function stopWork(state: State): Change {
  const isPlan = state.asked !== state.answered;
  const text = isPlan
    ? "Stopped: what is listed is of the brief before. Ctrl-R plans this one."
    : "Stopped; Ctrl-R begins it again.";
  const next: State = { ...state, work: null, stopped: state.asked, notice: { tone: "warn", text } };
  return { state: next, effects: [{ type: "stop" }] };
}

function changed(state: State, message: Message): Change {
  switch (message.type) {
    case "resized":
      return still({ ...state, columns: message.columns, rows: message.rows });
    case "go":
      return goTo(state, message.screen);
    case "help":
      return still({ ...state, help: !state.help, scroll: { ...state.scroll, help: 0 } });
    case "quit":
    case "suspend":
    case "redraw":
      return { state, effects: [{ type: message.type }] };
    case "edit":
      if (state.prompt === null && state.units.typing !== null && state.screen === "units")
        return changeUnits(state, { type: "edit", edit: message.edit });
      return state.prompt === null ? editField(state, message.edit) : editName(state, message.edit);
    case "choice":
      return chooseField(state, message.by);
    case "move":
      return move(state, message.by);
    case "axis":
      return nextAxis(state, message.which);
    case "table":
      return toggleTable(state);
    case "column": {
      if (state.screen === "map") return walkMap(state, "x", message.by);
      if (state.screen === "parts") return moveHeading(state, message.by);
      const last = Math.max(0, state.pins.length - 1);
      return still({ ...state, column: Math.max(0, Math.min(last, state.column + message.by)), notice: null });
    }
    case "nudge":
      return nudge(state, message);
    case "hand":
      return takeInHand(state, message.by);
    case "retry":
      return retry(state);
    case "undo":
    case "redo":
      return still(state);
    case "pin":
      return togglePin(state);
    case "choose":
      return chooseBank(state);
    case "rank":
      return ask(nextRank(state));
    case "front":
      return ask({ ...state, frontOnly: !state.frontOnly, selected: null, notice: null });
    case "fold":
      return still({ ...state, unfolded: !state.unfolded, scroll: { ...state.scroll, compare: 0 } });
    case "orderPins":
      return orderPins(state);
    case "spread":
      return still({ ...state, spread: !state.spread, notice: null });
    case "load":
      return goToLoad(state);
    case "detailed":
      return still({ ...state, details: message.details });
    case "export":
      return askName(state);
    case "confirm":
      return state.prompt?.what === "value" ? confirmValue(state, state.prompt) : confirm(state);
    case "cancel":
      return cancel(state);
    case "answered":
      // A late answer to an older question would show a bank that the brief no longer means.
      if (message.asked !== state.asked) return still(state);
      return still(withTried({ ...state, answer: message.answer, answered: message.asked, slow: message.slow }));
    case "opened":
      return opened(state, message);
    case "work":
      return still({ ...state, work: message.work });
    case "stop":
      return stopWork(state);
    case "again":
      return ask({ ...state, notice: null });
    case "ground":
      return still(withGround(state, message.ground));
    case "mouse":
      return toggleMouse(state);
    case "click": {
      const means = clickMeans(state, message);
      return means === null ? still(state) : changed(state, means);
    }
    case "value":
      return askValue(state);
    case "faults":
      return still({ ...state, showFaults: !state.showFaults, scroll: { ...state.scroll, parts: 0 } });
    case "saved":
      return saved(state, message.answer);
    case "units":
      return changeUnits(state, message.message);
    case "blend":
      return changeBlend(state, message.message);
    case "say":
      return still({ ...state, notice: message.notice });
  }
}

/** The one place where the screens change, with all that was done before. */
export const update = withHistory(changed);
