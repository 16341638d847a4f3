// The axes of the map: figures of a layout, none of them made up.
import { expect, test } from "vitest";
import type { LayoutResult } from "../../src/search/index.ts";
import { AXES, AXIS_NAMES } from "../../src/tui/axes.ts";
import { BRIEF, engine } from "../support/stock.ts";

const read = engine.readBrief(BRIEF);
if (!read.ok) throw new Error("brief");
const brief = read.value;
const at = (part: string, series: number, parallel: number) => ({
  layout: engine.check(brief, { part, series, parallel, ties: "strings" }) as LayoutResult,
  life: null,
});

test("AXES: each value is the layout's own, and a margin is over the energy asked for", () => {
  const point = at("flash-a", 8, 22);
  const { layout } = point;
  const values = AXIS_NAMES.map((name) => AXES[name].value(point, brief));
  expect(values).toEqual([
    null,
    layout.volume,
    layout.mass,
    layout.stress,
    (layout.energy.low ?? 0) / 2400 - 1,
    layout.bleed.seconds,
    null,
  ]);
  expect(layout.cost?.unpriced).toEqual(["balancing resistors"]);
});

test("unknown stays unknown; every value has a text", () => {
  const film = at("film-d", 3, 60);
  expect([AXES.mass.value(film, brief), AXES.volume.value(film, brief)]).toEqual([null, null]);
  for (const name of AXIS_NAMES) expect(AXES[name].text(1, at("flash-a", 8, 22))).toMatch(/1/);
});
