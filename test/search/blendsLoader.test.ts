// The loaded search is the search.
import { expect, test } from "vitest";
import { planBlends as direct } from "../../src/search/blends.ts";
import { planBlends } from "../../src/search/index.ts";
import { partsOf } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

test("planBlends(input) gives what the search gives", async () => {
  const input = { brief: briefOf({ energy: 20, voltage: 400 }), parts: partsOf({}, { capacitance: 220, price: 9 }) };
  const loaded = await planBlends(input);
  expect(loaded.ok).toBe(true);
  expect(loaded).toEqual(await direct(input));
});
