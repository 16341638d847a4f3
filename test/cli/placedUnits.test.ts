import { describe, expect, test } from "vitest";
import { placedBank } from "../../src/cli/placed.ts";
import { placesOf } from "../../src/cli/placedUnits.ts";
import { at, fakePorts } from "../support/fakePorts.ts";

const FLAGS = {
  series: "6",
  parallel: "5",
  ties: "cross-tied",
  measured: at("fixtures/units/lot-40-capacitance-only.csv"),
};

describe("placesOf(brief, flags, ports)", () => {
  test("the same placing as the command place with the same flags", () => {
    const own = placedBank(undefined, FLAGS, fakePorts());
    const found = placesOf(undefined, FLAGS, fakePorts());
    if (!own.ok || !found.ok) throw new Error("refused");
    const { placing, positions } = own.value;
    expect(found.value.placed).toEqual({
      positions,
      groups: placing.groups,
      spares: placing.spares,
      plusMinus: placing.charging.plusMinus,
      // Capacitance alone was measured.
      holding: null,
    });
    expect(found.value.lost).toEqual([]);
  });

  test("a unit that cannot be read is told as lost; too few units are refused", () => {
    const lot = "serial,capacitance [uF]\na,100\nb,101\nc,none\nd,99\ne,100\n";
    const of = (flags: object) =>
      placesOf(
        undefined,
        { series: "2", parallel: "2", ties: "strings", measured: "lot.csv", ...flags },
        fakePorts({ "lot.csv": lot }),
      );
    const found = of({});
    expect(found.ok && found.value.lost).toEqual([expect.stringMatching(/^Not placed, lot\.csv:4/)]);
    expect(of({ parallel: "3" })).toMatchObject({ ok: false, refusals: [{ code: "place.too-few" }] });
  });
});
