// What the screen of blends begins with.
import { expect, test } from "vitest";
import { NO_BLEND } from "../../../src/tui/blend/state.ts";

test("NO_BLEND: nothing is sought, found or ended", () => {
  expect(NO_BLEND).toEqual({ running: null, found: null, ended: null });
});
