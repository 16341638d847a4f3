import { describe, expect, test } from "vitest";
import { finish } from "../../../src/place/charging.ts";
import { answerFor } from "../../../src/tui/engine.ts";
import type { State } from "../../../src/tui/state.ts";
import { NO_UNITS, type UnitsState } from "../../../src/tui/units/state.ts";
import { unitsOn } from "../../../src/tui/units/work.ts";
import { drawScreen } from "../../../src/tui/view/screen.ts";
import { unitsPage } from "../../../src/tui/view/units.ts";
import { textWidth } from "../../../src/tui/width.ts";
import { fakePorts } from "../../support/fakePorts.ts";
import { lotCsv } from "../../support/placeCli.ts";
import { engine, stateWith } from "../../support/stock.ts";

const chosen = { part: "flash-a", series: 8, parallel: 3, ties: "cross-tied" } as const;
const port = unitsOn(
  [],
  fakePorts({ "l.csv": lotCsv(Array.from({ length: 26 }, (_, i) => 460 + ((i * 7) % 23))) }).files,
);

const withUnits = (units: Partial<UnitsState>, changes: Partial<State> = {}): State => {
  const asked = stateWith({ chosen, screen: "units", rows: 40, ...changes });
  return { ...asked, units: { ...NO_UNITS, ...units }, answer: answerFor(asked, engine, true) };
};
const text = (state: State): string =>
  drawScreen(state)
    .rows.join("\n")
    .replace(/\x1b\[[\d;]*m/g, "");

const read = port.read("l.csv", "flash-a");
const at = withUnits({}).answer;
const bank = at?.kind === "planned" ? at.chosen : null;
if (!read.ok || bank === null) throw new Error();
const before = port.listed(read.value, bank);
const placed = finish(port.begin(read.value, bank, () => true).steps);
if (before === null || !placed.ok) throw new Error();
const done: Partial<UnitsState> = {
  lot: read.value,
  before,
  placed: { bank: chosen, placing: placed.value, stopped: false },
};

describe("unitsPage(state, room)", () => {
  test("before anything is read: what the file is, and the key for it", () => {
    expect(text(withUnits({}))).toMatch(
      /No units were read yet\. m names their file[\s\S]*headings serial and capacitance/,
    );
    expect(text(withUnits({}))).toMatch(/\nm file of units/);
  });

  test("without a bank the file can be named all the same, and is seen to be", () => {
    const state = { ...withUnits({ typing: "path", path: { text: "x.csv", caret: 5 } }), answer: null };
    expect(text(state)).toContain("Measured units: x.csv");
    expect(unitsPage(state, { columns: 80, rows: 30 }).caret?.column).toBe("Measured units: x.csv".length);
    expect(text({ ...state, units: { ...state.units, typing: null, lot: done.lot ?? null } })).not.toMatch(
      /Enter place/,
    );
  });

  test("typing: the caret stands behind the name; refused: why, below it", () => {
    const state = withUnits({
      typing: "path",
      path: { text: "x.csv", caret: 5 },
      refusals: [{ code: "no-such-file", place: { file: "x.csv" }, read: "r", want: "w" }],
    });
    const { caret } = unitsPage(state, { columns: 80, rows: 30 });
    expect(caret).toEqual({ row: 2, column: "Measured units: x.csv".length });
    expect(text(state)).toMatch(/! x\.csv: there is no such file/);
  });

  test("placed: both faces, gap, bound and what the meter can tell; nothing wider than the screen", () => {
    for (const columns of [60, 80, 140]) {
      for (const ascii of [true, false]) {
        const state = withUnits(done, { columns, look: { colour: false, ascii } });
        for (const row of drawScreen(state).rows)
          expect(textWidth(row.replace(/\x1b\[[\d;]*m/g, ""))).toBeLessThanOrEqual(columns);
        const shown = text(state).replace(/\s+/g, " ");
        for (const word of ["As listed", "Placed", "bound", "meter", "over even"]) expect(shown).toContain(word);
      }
    }
  });

  test("on the way: the phase, the part of the effort, the face so far and the key that stops it", () => {
    const running = { phase: "holding", gap: 1e-4, part: 0.5, groups: before.groups } as const;
    expect(text(withUnits({ ...done, placed: null, running }))).toMatch(
      /levelling the hold[\s\S]*So far[\s\S]*Esc stop with the best so far/,
    );
  });

  test("placed for another bank: said, and not shown", () => {
    const other = withUnits(done, { chosen: { ...chosen, parallel: 4 } });
    expect(text(other)).toMatch(/placed for another bank/);
    expect(text(other)).not.toMatch(/As listed/);
  });

  test("a list that is there already is asked about", () => {
    expect(text(withUnits({ ...done, typing: "save", replace: true }))).toMatch(
      /! Replace the file that is there\? positions\.csv[\s\S]*y replace the file/,
    );
  });
});
