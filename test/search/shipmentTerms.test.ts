// What somebody says of shipments, in whole minor units.
import { expect, test } from "vitest";
import { NO_SHIPMENTS, shipmentTerms } from "../../src/search/shipmentTerms.ts";

test("shipmentTerms(wish, minor): rounded to minor units; nothing said is nothing", () => {
  expect(shipmentTerms({ each: 4.999, named: { North: 7.5, West: 0 } }, 100)).toEqual({
    each: 500,
    named: new Map([
      ["North", 750],
      ["West", 0],
    ]),
  });
  expect(shipmentTerms({ each: 3 }, 1).each).toBe(3);
  expect(shipmentTerms(undefined, 100)).toEqual(NO_SHIPMENTS);
});
