import { describe, expect, test } from "vitest";
import { accepted, refused } from "../../../src/quantity/index.ts";
import { lineOf } from "../../../src/tui/line.ts";
import { NO_UNITS, type UnitsLot, type UnitsState } from "../../../src/tui/units/state.ts";
import { updateUnits } from "../../../src/tui/units/update.ts";

const bank = { part: "p", series: 2, parallel: 1, ties: "cross-tied" } as const;
const lot: UnitsLot = { path: "l.csv", units: [{ serial: "a", capacitance: 1e-3 }], faults: [] };
const fault = { code: "no-such-file", place: { file: "l.csv" }, read: "x", want: "y" };
const running = { phase: "exchange", gap: 0.1, part: 0.5, groups: [] } as const;
const placing = { groups: [["a"]] } as never;

describe("updateUnits(units, message)", () => {
  test("a name is typed, then read; a blank one is asked for again", () => {
    const typing = updateUnits(NO_UNITS, { type: "name" }).units;
    expect(updateUnits(typing, { type: "confirm" })).toMatchObject({ effects: [], notice: { tone: "warn" } });
    const typed = updateUnits(typing, { type: "edit", edit: { edit: "insert", text: " l.csv " } }).units;
    expect(updateUnits(typed, { type: "confirm" }).effects).toEqual([{ what: "read", path: "l.csv" }]);
    expect(updateUnits(typed, { type: "cancel" }).units).toMatchObject({ typing: null, path: { text: " l.csv " } });
  });

  test("a refused file leaves the field open with why, and the lot read before; a good one is placed at once", () => {
    const before: UnitsState = { ...NO_UNITS, lot, typing: "path" };
    const bad = updateUnits(before, { type: "read", path: "x", read: refused(fault) });
    expect(bad).toMatchObject({ effects: [], units: { typing: "path", refusals: [fault], lot } });
    const good = updateUnits(bad.units, { type: "read", path: "l.csv", read: accepted(lot) });
    expect(good).toMatchObject({
      effects: [{ what: "place", lot }],
      units: { typing: null, refusals: [], placed: null },
    });
  });

  test("begun, on the way, placed; Esc on the way stops the search, and the best so far is told as such", () => {
    const begun = updateUnits(
      { ...NO_UNITS, lot },
      { type: "begun", before: { bank, groups: [["a"]], gap: 0.2 }, running },
    );
    expect(begun.units).toMatchObject({ before: { gap: 0.2 }, running });
    expect(updateUnits(begun.units, { type: "cancel" }).effects).toEqual([{ what: "stop" }]);
    const placed = updateUnits(begun.units, { type: "placed", bank, read: accepted(placing), stopped: true });
    expect(placed).toMatchObject({
      units: { running: null, placed: { bank, stopped: true } },
      notice: { tone: "warn" },
    });
    const refusedOne = updateUnits(begun.units, { type: "placed", bank, read: refused(fault), stopped: false });
    expect(refusedOne.units).toMatchObject({ running: null, placed: null, refusals: [fault] });
  });

  test("Enter without a lot asks for its name; with one it places anew", () => {
    expect(updateUnits(NO_UNITS, { type: "place" }).units.typing).toBe("path");
    expect(updateUnits({ ...NO_UNITS, lot }, { type: "place" }).effects).toEqual([{ what: "place", lot }]);
  });

  test("a list is saved only when there is one; a file that is there is asked about, and kept on no", () => {
    expect(updateUnits({ ...NO_UNITS, lot }, { type: "list" }).units.typing).toBeNull();
    const placed = { bank, placing, stopped: false };
    const asked = updateUnits({ ...NO_UNITS, lot, placed, save: lineOf("o.csv") }, { type: "list" }).units;
    expect(updateUnits(asked, { type: "confirm" }).effects).toEqual([
      { what: "save", lot, placed, path: "o.csv", replace: false },
    ]);
    const there = updateUnits(asked, { type: "listed", answer: { kind: "exists", path: "o.csv" } }).units;
    expect(there.replace).toBe(true);
    expect(updateUnits(there, { type: "edit", edit: { edit: "insert", text: "x" } }).units.save.text).toBe("o.csv");
    expect(updateUnits(there, { type: "confirm" }).effects).toMatchObject([{ replace: true }]);
    expect(updateUnits(there, { type: "cancel" }).units).toMatchObject({ typing: "save", replace: false });
    expect(updateUnits(there, { type: "listed", answer: { kind: "saved", path: "o.csv" } })).toMatchObject({
      units: { typing: null, replace: false },
      notice: { tone: "good", text: expect.stringContaining("o.csv") },
    });
    expect(updateUnits(there, { type: "listed", answer: { kind: "trouble", words: "disk full" } })).toMatchObject({
      units: { typing: "save" },
      notice: { tone: "bad", text: expect.stringContaining("disk full") },
    });
  });
});
