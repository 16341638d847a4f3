// The tables of key sequences: names that fit together, and modifiers by the number that terminals send (1 + shift 1, alt 2, ctrl 4).
import { expect, test } from "vitest";
import { CONTROL_KEYS, FINAL_LETTERS, modifierPrefix, PAD_LETTERS, TILDE_NUMBERS } from "../../src/tui/keycodes.ts";

test.each([
  [Number.NaN, ""],
  [0, ""],
  [-1, ""],
  [1.5, ""],
  [1, ""],
  [2, "shift+"],
  [3, "alt+"],
  [4, "alt+shift+"],
  [5, "ctrl+"],
  [6, "ctrl+shift+"],
  [7, "ctrl+alt+"],
  [8, "ctrl+alt+shift+"],
  // caps lock and the like (16 and up) change no name
  [65, ""],
])("modifierPrefix(%d) is %j", (parameter, want) => {
  expect(modifierPrefix(parameter)).toBe(want);
});

test("a key has one name, however a terminal spells it", () => {
  const names = [...Object.values(FINAL_LETTERS), ...Object.values(TILDE_NUMBERS)];
  expect(
    names.filter(
      (name) => !/^(up|down|left|right|home|end|begin|insert|delete|pageup|pagedown|f([1-9]|1[0-2]))$/.test(name),
    ),
  ).toEqual([]);
  expect(Object.values(PAD_LETTERS).filter((typed) => typed.length !== 1)).toEqual([]);
  expect(Object.keys(CONTROL_KEYS).filter((char) => char >= " " && char !== "\x7f")).toEqual([]);
});
