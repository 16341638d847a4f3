import { describe, expect, test } from "vitest";
import type { SheetFlags } from "../../src/cli/sheetFlags.ts";
import { sheetInput } from "../../src/cli/sheetInput.ts";
import { at, fakePorts } from "../support/fakePorts.ts";

const BRIEF = at("fixtures/briefs/flash-lamp.json");
const FLAGS: SheetFlags = {
  catalog: [at("catalogs/electrolytic.csv")],
  resistors: at("catalogs/resistors.csv"),
  part: "lab-pf-330-360",
  series: "9",
  parallel: "31",
  ties: "cross-tied",
};
const of = (flags: SheetFlags = {}) => {
  const read = sheetInput(BRIEF, { ...FLAGS, ...flags }, fakePorts());
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
};

describe("sheetInput(brief, flags, ports)", () => {
  test("the bank as check has it, among the layouts of the same brief and catalogues", () => {
    const { input, failed } = of();
    expect(input.layout.id).toBe("lab-pf-330-360 9s31p cross-tied");
    expect(failed).toBe(false);
    expect(input.alternatives?.layouts).toHaveLength(20);
    expect(input.alternatives?.layouts.map(({ id }) => id)).toContain(input.layout.id);
    expect(input.alternatives?.count).toBeGreaterThan(1000);
    expect(input.words.findings.map(({ title }) => title)).toContain("worst unit while charging");
    expect(input.words.notes.at(-1)).toMatch(/negative end .* assumed/);
    expect(of({ earth: "positive" }).input.words.notes.join()).not.toMatch(/earth point/);
  });

  test("no load: no shot and why; with one, its findings and the fault table of the shot", () => {
    expect(of().input).toMatchObject({ shot: null, shotOpen: "no load is in the brief" });
    const { input } = of({
      loadResistance: "0.9 ohm",
      loadInductance: "25 uH",
      fuses: at("catalogs/fuses.csv"),
    } as SheetFlags);
    expect(input.shot?.discharge.peakCurrent).toBeGreaterThan(100);
    expect(input.words.findings.map(({ title }) => title)).toContain("peak current of a unit");
    expect(input.fuse?.count).toBe(279);
    expect(input.words.load).toMatch(/900 mohm, 25 µH/);
  });

  test("a load that cannot be reckoned with leaves the shot open and says why, and the rest of the sheet stands", () => {
    const { input } = of({ loadCurrent: "1 MA", loadTime: "1 s" } as SheetFlags);
    expect(input.shot).toBeNull();
    expect(input.shotOpen).toMatch(/cannot hold this current/);
  });

  test("measured units in their places; a brief and a catalogue from a pipe are read once", () => {
    const read = sheetInput(
      "-",
      { ...FLAGS, parallel: "4", measured: at("fixtures/units/lot-40-capacitance-only.csv") },
      fakePorts({ "-": '{"energy": "250 J", "voltage": "2.2 kV", "ripple": "100 %"}' }),
    );
    expect(read.ok && read.value.input.placed?.groups).toHaveLength(9);
    expect(read.ok && read.value.input.placed?.spares).toHaveLength(4);
  });

  test("faults of the flags and of the bank are told together", () => {
    const read = sheetInput(BRIEF, { ...FLAGS, part: "no-such", paper: "A0" }, fakePorts());
    expect(read).toMatchObject({ ok: false, refusals: [{ place: { field: "--paper" } }, { code: "unknown-part" }] });
    const other = sheetInput(BRIEF, { ...FLAGS, fuses: at("catalogs/film.csv"), measured: at("no.csv") }, fakePorts());
    expect(other).toMatchObject({ ok: false, refusals: [{ code: "wrong-kind" }, { code: "no-such-file" }] });
  });
});
