import { expect, test } from "vitest";
import { potentialOf } from "../../../src/sheet/draw/potential.ts";

test("potentialOf(bank, node): from the earthed end, and not told where it is not fixed", () => {
  const bank = { series: 4, chargeVoltage: 1600 };
  const along = (earth: "negative" | "positive" | "none" | "unknown") =>
    [0, 1, 2, 3, 4].map((node) => potentialOf({ ...bank, earth }, node));
  expect(along("negative")).toEqual([0, 400, 800, 1200, 1600]);
  expect(along("positive")).toEqual([-1600, -1200, -800, -400, 0]);
  expect(along("none")).toEqual([null, null, null, null, null]);
  expect(along("unknown")).toEqual([null, null, null, null, null]);
  expect(potentialOf({ series: 4, chargeVoltage: null, earth: "negative" }, 2)).toBeNull();
});
