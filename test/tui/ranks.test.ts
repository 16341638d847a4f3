// The orders a key goes through are those of the search, each once.
import { expect, test } from "vitest";
import { RANKINGS } from "../../src/search/index.ts";
import { RANKS } from "../../src/tui/ranks.ts";

test("RANKS are the search's rankings, in its order", () => {
  expect(RANKS).toEqual(RANKINGS);
});
