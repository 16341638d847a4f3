// Mouse reports: a press of the first button, the wheel with and without held keys; the rest means nothing.
import { expect, test } from "vitest";
import { MOUSE_OFF, MOUSE_ON, mouseTold } from "../../src/tui/mouse.ts";
import { LEAVE } from "../../src/tui/session.ts";

test.each([
  ["\x1b[<0;3;4M", { kind: "click", column: 2, row: 3 }],
  ["\x1b[<0;3;4m", null],
  ["\x1b[<2;3;4M", null],
  ["\x1b[<64;3;4M", { kind: "wheel", by: -3 }],
  ["\x1b[<65;3;4M", { kind: "wheel", by: 3 }],
  ["\x1b[<81;3;4M", { kind: "wheel", by: 3 }],
  ["\x1b[<32;3;4M", null],
  ["\x1b[I", null],
  ["", null],
])("mouseTold(%j)", (report, want) => {
  expect(mouseTold(report)).toEqual(want);
});

test("leaving always gives the mouse back", () => {
  expect(LEAVE).toContain(MOUSE_OFF);
  expect(MOUSE_OFF.replaceAll("l", "h")).not.toBe(MOUSE_ON);
});
