// What differs between two states of the work, in words.
import { expect, test } from "vitest";
import { differenceWords, type Work } from "../../src/tui/work.ts";

const work: Work = {
  values: { voltage: "2.2 kV" },
  extra: {},
  pins: [],
  chosen: null,
  rank: "cost",
  frontOnly: false,
  overrides: {},
};

test("differenceWords(before, after): nothing, one field, a blank, and what is no field", () => {
  expect(differenceWords(work, work)).toBe("");
  expect(differenceWords(work, { ...work, values: { voltage: "2.4 kV" } })).toBe("Charge voltage 2.2 kV to 2.4 kV");
  expect(differenceWords(work, { ...work, values: {} })).toBe("Charge voltage 2.2 kV to blank");
  expect(differenceWords(work, { ...work, rank: "mass", pins: [...work.pins], frontOnly: true })).toBe(
    "the pins, order by cost to mass, which layouts are listed",
  );
});
