import { expect, test } from "vitest";
import { lotUncertainty } from "../../src/place/unit.ts";

test("lotUncertainty(units): root mean square of the rows that have one; undefined when none has", () => {
  const unit = (uncertainty?: number) => ({ serial: "a", capacitance: 1, ...(uncertainty ? { uncertainty } : {}) });
  expect(lotUncertainty([unit(0.003), unit(0.004), unit()])).toBeCloseTo(0.005 / Math.SQRT2, 12);
  expect(lotUncertainty([unit()])).toBeUndefined();
});
