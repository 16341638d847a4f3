// Flags of a blend: ranges, and no flag without --blend.
import { expect, test } from "vitest";
import { readBlendFlags, wantsBlend } from "../../src/cli/blendFlags.ts";

const wish = (flags: object) => {
  const read = readBlendFlags({ blend: true, ...flags });
  return read.ok ? read.value : read.refusals.map(({ place }) => place.field);
};

test("readBlendFlags(flags): what is wished, and nothing when nothing is", () => {
  expect(readBlendFlags({})).toEqual({ ok: true, value: null });
  expect(wish({})).toEqual({ explain: false });
  expect(wish({ explain: true, maxTypes: "7", within: "2 %", lineCost: "2.50", solverTime: "500 ms" })).toEqual({
    explain: true,
    maxTypes: 7,
    within: 0.02,
    lineCost: 2.5,
    seconds: 0.5,
  });
});
test("every wrong one is refused, all at once", () => {
  for (const maxTypes of ["0", "101", "-1", "two", "1.5", ""]) expect(wish({ maxTypes })).toEqual(["--max-types"]);
  for (const within of ["-1 %", "200 %", "much", "2 kg"]) expect(wish({ within })).toEqual(["--within"]);
  for (const lineCost of ["-2", "1,50", "2.50 EUR", "1e3"]) expect(wish({ lineCost })).toEqual(["--line-cost"]);
  for (const solverTime of ["0 s", "2 days", "soon", "25 h"]) expect(wish({ solverTime })).toEqual(["--solver-time"]);
  expect(wish({ maxTypes: "x", within: "y" })).toEqual(["--max-types", "--within"]);
});
test("a flag of blends without --blend is refused by name", () => {
  const read = readBlendFlags({ within: "2 %" });
  expect(read).toMatchObject({ ok: false, refusals: [{ code: "missing-option", place: { field: "--within" } }] });
  expect([wantsBlend({}), wantsBlend({ blend: true }), wantsBlend({ explain: true })]).toEqual([false, true, true]);
});

test("--shipment-cost: one amount for all, by supplier, or both; nothing twice", () => {
  const shipments = (text: string) => wish({ shipmentCost: text });
  expect(shipments("6.50")).toEqual({ explain: false, shipments: { each: 6.5, named: {} } });
  expect(shipments("North: 4.90; South & Co: 12; 0")).toEqual({
    explain: false,
    shipments: { each: 0, named: { North: 4.9, "South & Co": 12 } },
  });
  for (const bad of ["", "-1", "North", "North: ", ": 4", "1; 2", "North: 1; North: 2", "North: 1;"])
    expect(shipments(bad), bad).toEqual(["--shipment-cost"]);
});

test("--front and --ladder: names once each, a fraction below one", () => {
  expect(wish({ front: "volume, stress", ladder: "50 %" })).toMatchObject({
    fronts: ["volume", "stress"],
    ladder: 0.5,
  });
  for (const front of ["", "life", "volume,volume", "volume;mass"]) expect(wish({ front })).toEqual(["--front"]);
  for (const ladder of ["0 %", "100 %", "much"]) expect(wish({ ladder })).toEqual(["--ladder"]);
});
