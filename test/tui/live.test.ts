// When keys are live: on top of each other, help hides the question and the question hides the screen.
import { expect, test } from "vitest";
import { lineOf } from "../../src/tui/line.ts";
import * as live from "../../src/tui/live.ts";
import { stateWith } from "../support/stock.ts";

const question = { what: "order" as const, line: lineOf("a.csv"), replace: false };

test.each([
  ["open form", stateWith(), { isOpen: true, types: true, isFree: false, onChoice: false, asksName: false }],
  [
    "form on a choice",
    stateWith({ field: 3 }),
    { isOpen: true, types: false, isFree: false, onChoice: true, asksName: false },
  ],
  [
    "list",
    stateWith({ screen: "layouts" }),
    { isOpen: true, types: false, isFree: true, onChoice: false, asksName: false },
  ],
  [
    "question",
    stateWith({ screen: "order", prompt: question }),
    { isOpen: false, types: true, isFree: false, onChoice: false, asksName: true },
  ],
  [
    "help over a question",
    stateWith({ screen: "order", prompt: question, help: true }),
    { isOpen: false, types: false, isFree: false, onChoice: false, asksName: false },
  ],
  [
    "help over the form",
    stateWith({ help: true }),
    { isOpen: false, types: false, isFree: false, onChoice: false, asksName: false },
  ],
])("%s", (_name, state, want) => {
  const { isOpen, types, isFree, onChoice, asksName } = live;
  expect({
    isOpen: isOpen(state),
    types: types(state),
    isFree: isFree(state),
    onChoice: onChoice(state),
    asksName: asksName(state),
  }).toEqual(want);
});

test("all(...conditions) of none is live", () => {
  expect(live.all()(stateWith())).toBe(true);
});
