// How the screen of measured units changes. Pure; what is to be done outside comes back as effects.
import { editLine } from "../line.ts";
import type { Notice } from "../state.ts";
import type { UnitsEffect, UnitsMessage, UnitsState } from "./state.ts";

export interface UnitsChange {
  readonly units: UnitsState;
  readonly effects: readonly UnitsEffect[];
  /** Absent: what was said before stays. Null: it is taken back. */
  readonly notice?: Notice | null;
}

const still = (units: UnitsState, notice: Notice | null = null): UnitsChange => ({ units, effects: [], notice });
const say = (tone: Notice["tone"], text: string): Notice => ({ tone, text });

function confirm(units: UnitsState): UnitsChange {
  if (units.typing === "path") {
    const path = units.path.text.trim();
    if (path === "") return still(units, say("warn", "A name is needed, such as units.csv."));
    return { units, effects: [{ what: "read", path }], notice: null };
  }
  const { lot, placed, save, replace } = units;
  const path = save.text.trim();
  if (units.typing !== "save" || lot === null || placed === null) return still({ ...units, typing: null });
  if (path === "") return still(units, say("warn", "A name is needed, such as positions.csv."));
  return { units, effects: [{ what: "save", lot, placed, path, replace }], notice: null };
}

/** Stops the search, takes back the question, or closes the field. */
function cancel(units: UnitsState): UnitsChange {
  if (units.typing === null && units.running !== null) return { units, effects: [{ what: "stop" }] };
  if (units.replace) return still({ ...units, replace: false });
  return still({ ...units, typing: null });
}

export function updateUnits(units: UnitsState, message: UnitsMessage): UnitsChange {
  switch (message.type) {
    case "name":
      return still({ ...units, typing: "path" });
    case "edit": {
      if (units.typing === null || units.replace) return still(units);
      const field = units.typing;
      return still({ ...units, [field]: editLine(units[field], message.edit) });
    }
    case "confirm":
      return confirm(units);
    case "cancel":
      return cancel(units);
    case "place":
      if (units.lot === null) return still({ ...units, typing: "path" });
      return { units, effects: [{ what: "place", lot: units.lot }], notice: null };
    case "list":
      if (units.placed === null) return still(units);
      return still({ ...units, typing: "save", replace: false });
    case "read": {
      const { read } = message;
      // A refused file leaves the field open: the name is mended where it stands.
      if (!read.ok) return still({ ...units, refusals: read.refusals, typing: "path" });
      const lot = read.value;
      return {
        units: { ...units, lot, refusals: [], typing: null, before: null, placed: null, running: null },
        effects: [{ what: "place", lot }],
        notice: null,
      };
    }
    case "begun":
      return { units: { ...units, before: message.before, running: message.running, placed: null }, effects: [] };
    case "progress":
      return { units: { ...units, running: message.running }, effects: [] };
    case "placed": {
      const { bank, read, stopped } = message;
      if (!read.ok) return still({ ...units, running: null, placed: null, refusals: read.refusals });
      const words = stopped ? "Stopped: this is the best found by then." : "Placed.";
      return still(
        { ...units, running: null, refusals: [], placed: { bank, placing: read.value, stopped } },
        say(stopped ? "warn" : "good", words),
      );
    }
    case "listed": {
      const { answer } = message;
      if (answer.kind === "saved")
        return still({ ...units, typing: null, replace: false }, say("good", `The list is saved in ${answer.path}.`));
      if (answer.kind === "exists") return still({ ...units, replace: true });
      return still({ ...units, replace: false }, say("bad", `Not saved: ${answer.words}`));
    }
  }
}
