import { expect, test } from "vitest";
import { lampFits } from "../../src/cli/lampFits.ts";
import { plan, readBrief } from "../../src/search/index.ts";
import { FAMILIES } from "../support/bank.ts";
import { FILM } from "../support/shotBank.ts";

const lamp = { bore: "8 mm", arc: "100 mm", gas: "xenon", pressure: "450 torr" };
function planned(load: unknown, more: Record<string, unknown> = {}) {
  const brief = readBrief({ energy: "200 J", load, ...more });
  const read = brief.ok ? plan({ brief: brief.value, parts: [FILM], families: FAMILIES }) : brief;
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
}

test("lampFits(result, parts): a report for each layout, with the unit's own inductance counted", () => {
  const result = planned({ lamp, width: "500 us" });
  const { lampDrive } = lampFits(result, [FILM]);
  expect(lampDrive?.ideal.voltage).toBeCloseTo(986.48483, 5);
  expect(lampDrive?.fits.map(({ id }) => id)).toEqual(result.layouts.map(({ id }) => id));
  expect(lampDrive?.fits[0]?.report.coil).toBeCloseTo(6.75800222e-5, 10);
});

test("nothing when no lamp's circuit is sized", () => {
  expect(lampFits(planned({ resistance: 1 }, { voltage: 900, ripple: 1 }), [FILM])).toEqual({});
});
