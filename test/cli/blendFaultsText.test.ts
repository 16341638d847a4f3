// The fault table of a blend: every group named, each way of stopping once.
import { expect, test } from "vitest";
import { blendFaultsText } from "../../src/cli/blendFaultsText.ts";
import { assessBuiltBlend, blendFaults } from "../../src/search/index.ts";
import { partsOf, priced } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

test("blendFaultsText(faults, width): eight rows a group, no line too wide, no way of stopping twice", () => {
  const brief = briefOf({ energy: 100, voltage: 1200 });
  const units = partsOf({ part: "one" }, { part: "two", voltage: 1600 });
  const shapes = [4, 1];
  const groups = units.map((unit, at) => ({
    unit,
    layout: { part: unit.part, series: shapes[at]!, parallel: 2, ties: "strings" as const },
    families: priced,
  }));
  const blend = assessBuiltBlend({ groups, brief, currency: "EUR", minor: 100 });
  const text = blendFaultsText(blendFaults(blend, units, brief), 80);
  expect(text.match(/ one {2,}/g)).toHaveLength(8);
  expect(text.match(/ two {2,}/g)).toHaveLength(8);
  expect(Math.max(...text.split("\n").map((line) => line.length))).toBeLessThanOrEqual(80);
  const stops = text.split("\n").filter((line) => line.startsWith("  - "));
  expect(new Set(stops).size).toBe(stops.length);
});
