// The form under the keys.
import { expect, test } from "vitest";
import { FIELDS } from "../../../src/tui/fields.ts";
import { chooseField, editField, moveField } from "../../../src/tui/update/form.ts";
import { stateWith } from "../../support/stock.ts";

test("moveField goes round at both ends and puts the caret behind the text", () => {
  expect(moveField(stateWith(), -1).state.field).toBe(FIELDS.length - 1);
  expect(moveField(stateWith({ field: FIELDS.length - 1 }), 1).state.field).toBe(0);
  expect(moveField(stateWith(), 1).state).toMatchObject({ field: 1, caret: 6 });
  expect(moveField(stateWith(), "last").state.field).toBe(FIELDS.length - 1);
  expect(moveField(stateWith({ field: 5 }), "first").state.field).toBe(0);
  expect(moveField(stateWith(), 1).effects).toEqual([]);
});

test("editField asks the engine when the text changed, and not when only the caret did", () => {
  const state = stateWith({ caret: 6 });
  const typed = editField(state, { edit: "insert", text: "x" });
  expect(typed.state.values.energy).toBe("2.4 kJx");
  expect(typed.effects).toEqual([{ type: "ask", asked: 1 }]);
  const moved = editField(state, { edit: "left" });
  expect([moved.state.caret, moved.effects]).toEqual([5, []]);
  expect(editField(stateWith({ caret: 0 }), { edit: "back" }).effects).toEqual([]);
});

test("editField with a caret beyond the text (a shorter one was restored) works at its end", () => {
  expect(editField(stateWith({ caret: 99 }), { edit: "back" }).state.values.energy).toBe("2.4 k");
});

test("chooseField goes round the choices; a blank is the first, a stranger gives way to the first", () => {
  const basis = (text?: string) => stateWith({ field: 3, values: text === undefined ? {} : { basis: text } });
  expect(chooseField(basis(), 1).state.values.basis).toBe("nominal");
  expect(chooseField(basis(), -1).state.values.basis).toBe("statistical");
  expect(chooseField(basis("statistical"), 1).state.values.basis).toBe("worst case");
  expect(chooseField(basis("Nominal!"), 1).state.values.basis).toBe("worst case");
  expect(chooseField(stateWith({ field: 0 }), 1).effects).toEqual([]);
});
