import { expect, test } from "vitest";
import { NO_UNITS } from "../../../src/tui/units/state.ts";

test("NO_UNITS: nothing is read, typed or placed, and a list would be saved under a name of its own", () => {
  expect(NO_UNITS).toMatchObject({ typing: null, lot: null, before: null, running: null, placed: null, refusals: [] });
  expect(NO_UNITS.save.text).toMatch(/\.csv$/);
});
