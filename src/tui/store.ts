// Holds the state: takes messages one at a time, runs their effects, and says when to draw. No closure sees an old state.
import type { Change, Effect, Message, State } from "./state.ts";

export interface Store {
  readonly state: () => State;
  readonly send: (message: Message) => void;
}

export interface StoreOptions {
  readonly initial: State;
  readonly update: (state: State, message: Message) => Change;
  readonly run: (effect: Effect, send: (message: Message) => void) => void;
  /** Called after each change; draws at most once a turn of the loop. */
  readonly changed: () => void;
}

export function createStore({ initial, update, run, changed }: StoreOptions): Store {
  let state = initial;
  const waiting: Message[] = [];
  let busy = false;

  const send = (message: Message): void => {
    waiting.push(message);
    // A message sent by an effect waits its turn, so that each update sees a finished state.
    if (busy) return;
    busy = true;
    try {
      for (let next = waiting.shift(); next !== undefined; next = waiting.shift()) {
        const change = update(state, next);
        if (change.state !== state) {
          state = change.state;
          changed();
        }
        for (const effect of change.effects) run(effect, send);
      }
    } finally {
      busy = false;
    }
  };
  return { state: () => state, send };
}
