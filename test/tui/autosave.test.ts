// Saving a moment after a change and at the end; trouble is told once.
import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { makeAutosave } from "../../src/tui/autosave.ts";
import { stateWith } from "../support/stock.ts";

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

function open(trouble: string | null = null) {
  let state = stateWith();
  const saves: string[] = [];
  const told: string[] = [];
  const autosave = makeAutosave({
    state: () => state,
    save: (text) => {
      saves.push(text);
      return trouble;
    },
    onTrouble: (words) => told.push(words),
  });
  const type = (energy: string) => {
    state = { ...state, values: { ...state.values, energy } };
    autosave.changed();
  };
  return { autosave, saves, told, type, scroll: () => autosave.changed() };
}

test("many changes are saved once, a second after the first", () => {
  const { saves, type } = open();
  type("1 J");
  type("2 J");
  vi.advanceTimersByTime(999);
  expect(saves).toHaveLength(0);
  vi.advanceTimersByTime(1);
  expect(saves).toHaveLength(1);
  expect(saves[0]).toContain("2 J");
});

test("what is not kept, such as scrolling, saves nothing", () => {
  const { saves, scroll, autosave } = open();
  scroll();
  vi.advanceTimersByTime(5000);
  expect([saves.length, autosave.finish()]).toEqual([0, null]);
});

test("finish() saves what is not saved yet, at once", () => {
  const { saves, type, autosave } = open();
  type("3 J");
  expect(autosave.finish()).toBeNull();
  expect(saves).toHaveLength(1);
  vi.advanceTimersByTime(5000);
  expect(saves).toHaveLength(1);
});

test("trouble is told once while the screens are up, and again by finish()", () => {
  const { told, type, autosave } = open("read-only folder");
  type("1 J");
  vi.advanceTimersByTime(1000);
  type("2 J");
  vi.advanceTimersByTime(1000);
  expect(told).toEqual(["read-only folder"]);
  expect(autosave.finish()).toBe("read-only folder");
});
