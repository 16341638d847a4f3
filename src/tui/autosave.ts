// Keeps the brief and the pins saved: a moment after they change, and at the end.

import { savedText } from "./saved.ts";
import type { State } from "./state.ts";

const REST_MS = 1000;

export interface Autosave {
  readonly changed: () => void;
  /** Saves what is not saved yet; null when all is, else why not. */
  readonly finish: () => string | null;
}

export interface AutosaveOptions {
  readonly state: () => State;
  readonly save: (text: string) => string | null;
  /** Saving failed while the screens are up. */
  readonly onTrouble: (words: string) => void;
}

export function makeAutosave({ state, save, onTrouble }: AutosaveOptions): Autosave {
  let kept = savedText(state());
  let timer: ReturnType<typeof setTimeout> | undefined;
  /** A folder that cannot be written to is told once, not at every key. */
  let told = false;

  const saveNow = (): string | null => {
    clearTimeout(timer);
    timer = undefined;
    const text = savedText(state());
    if (text === kept) return null;
    const trouble = save(text);
    if (trouble === null) kept = text;
    return trouble;
  };
  return {
    changed: () => {
      timer ??= setTimeout(() => {
        const trouble = saveNow();
        if (trouble !== null && !told) {
          told = true;
          onTrouble(trouble);
        }
      }, REST_MS);
    },
    finish: saveNow,
  };
}
