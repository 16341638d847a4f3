// Does what the screen of measured units asks for, and sends back what came of it.
import { arrangementOf, shownBank } from "../pick.ts";
import type { Message, State } from "../state.ts";
import { makePlacer } from "./placer.ts";
import type { UnitsEffect, UnitsMessage } from "./state.ts";
import type { UnitsPort } from "./work.ts";

export interface UnitsRunner {
  readonly run: (effect: UnitsEffect, port: UnitsPort) => void;
  readonly stop: () => void;
}

export interface UnitsRunnerOptions {
  readonly state: () => State;
  readonly send: (message: Message) => void;
  readonly now: () => number;
}

export function makeUnitsRunner({ state, send, now }: UnitsRunnerOptions): UnitsRunner {
  const tell = (message: UnitsMessage): void => send({ type: "units", message });
  let bank = shownBank(state());
  const placer = makePlacer({
    now,
    progress: (running) => tell({ type: "progress", running }),
    done: (read, stopped) => {
      if (bank !== null) tell({ type: "placed", bank: arrangementOf(bank), read, stopped });
    },
  });
  const begin = (lot: Extract<UnitsEffect, { readonly what: "place" }>["lot"], port: UnitsPort): void => {
    bank = shownBank(state());
    if (bank === null) return;
    const before = port.listed(lot, bank);
    const empty = {
      phase: "first",
      gap: before?.gap ?? 0,
      part: 0,
      groups: before?.groups.map(() => []) ?? [],
    } as const;
    // A lot that is too small is refused by the search itself, with the counts.
    if (before !== null) tell({ type: "begun", before, running: empty });
    const chosen = bank;
    placer.begin((goOn) => port.begin(lot, chosen, goOn));
  };
  return {
    run: (effect, port) => {
      switch (effect.what) {
        case "read":
          placer.drop();
          tell({
            type: "read",
            path: effect.path,
            read: port.read(effect.path, shownBank(state())?.part ?? ""),
          });
          break;
        case "place":
          begin(effect.lot, port);
          break;
        case "stop":
          placer.stop();
          break;
        case "save":
          tell({
            type: "listed",
            answer: port.save(effect.lot, effect.placed, shownBank(state()), effect),
          });
      }
    },
    stop: placer.drop,
  };
}
