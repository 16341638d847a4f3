import { expect, test } from "vitest";
import { schematicFigures } from "../../../src/sheet/draw/index.ts";
import { LOAD_KINDS, SWITCH_KINDS } from "../../../src/sheet/draw/schematicProps.ts";
import { schematicOf } from "../../support/drawn.ts";
import { countRole, svgOf } from "../../support/svg.ts";

const drawn = (change: Parameters<typeof schematicOf>[0]) => svgOf(schematicFigures(schematicOf(change))[0]!);

test.each(LOAD_KINDS)("LOAD_KINDS: %s is drawn once and told", (kind) => {
  const svg = drawn({ load: { kind, words: null, coil: false } });
  expect(countRole(svg, "load")).toBe(1);
  expect(svg).toMatch(/X1: load, /);
});

test.each(SWITCH_KINDS)("SWITCH_KINDS: %s is drawn once and told", (kind) => {
  const svg = drawn({ switch: { kind, words: null } });
  expect(countRole(svg, "switch")).toBe(1);
  expect(svg).toMatch(/S1: switch, /);
});
