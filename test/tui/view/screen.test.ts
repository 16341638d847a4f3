// Whole screens as rows, without a terminal: never wider or taller than asked, every empty state worded, every mark with a word.
import { describe, expect, test } from "vitest";
import { DEFAULT_FAMILY } from "../../../src/catalog/index.ts";
import { catalogEngine } from "../../../src/tui/catalogEngine.ts";
import { rowCells } from "../../../src/tui/cells.ts";
import { answerFor } from "../../../src/tui/engine.ts";
import { FIELDS } from "../../../src/tui/fields.ts";
import { lineOf } from "../../../src/tui/line.ts";
import { arrangementOf, listed } from "../../../src/tui/pick.ts";
import { SCREENS, type State } from "../../../src/tui/state.ts";
import { drawScreen, LEAST_COLUMNS, LEAST_ROWS, mostScroll } from "../../../src/tui/view/screen.ts";
import { detailed, LOAD } from "../../support/detailed.ts";
import { BRIEF, CATALOGUE, engine, parts, stateWith } from "../../support/stock.ts";

const planned = (changes: Partial<State> = {}, whole = false, by = engine): State => {
  const state = stateWith(changes);
  return { ...state, answer: answerFor(state, by, !whole), ...(whole ? { asked: 1, answered: 1 } : {}) };
};
const some = listed(planned()).map(arrangementOf);
const pins = [some[0], some[2], some[5], some[9]].filter((pin) => pin !== undefined);
/** Without the styles: what is read. */
const text = (state: State): string =>
  drawScreen(state)
    .rows.join("\n")
    .replace(/\x1b\[[\d;]*m/g, "");
const has = (state: State, ...words: readonly string[]): void => {
  const drawn = text(state).replace(/\s+/g, " ");
  expect(words.filter((word) => !drawn.includes(word))).toEqual([]);
};

/** Names that try to break a row: wide, controlling, turning, joined, long. */
const ODD = CATALOGUE.replace("flash-a", "漢字\x1b[2J\u202eab")
  .replace("flash-b", "x".repeat(300))
  .replace("snap-c", "e\u0301👩‍🔬\u200b");
const oddEngine = catalogEngine({ parts: parts(ODD), families: [DEFAULT_FAMILY] });
const oddPins = listed(planned({}, false, oddEngine))
  .slice(0, 3)
  .map(arrangementOf);

describe("drawScreen(state): never outside the terminal", () => {
  const sizes = [
    [1, 1],
    [59, 24],
    [60, 16],
    [60, 20],
    [80, 24],
    [81, 25],
    [149, 40],
    [150, 40],
    [200, 50],
    [400, 100],
  ] as const;
  const looks = [
    { colour: true, ascii: false },
    { colour: false, ascii: true },
  ];
  const variants: readonly State[] = [
    stateWith(),
    planned({ pins, chosen: pins[1] ?? null }),
    detailed({ chosen: pins[1] ?? null, spread: true }, ["sharing", "shot"]),
    detailed({ chosen: pins[1] ?? null, values: { ...BRIEF, ...LOAD } }, ["sharing", "shot"]),
    detailed(
      {
        chosen: { part: "film-d", series: 3, parallel: 10, ties: "strings" },
        spread: true,
        values: { ...BRIEF, ...LOAD },
      },
      ["sharing", "shot"],
    ),
    detailed(
      {
        chosen: { part: "film-d", series: 1, parallel: 9, ties: "strings" },
        spread: true,
        values: { ...BRIEF, ...LOAD },
      },
      ["sharing", "shot"],
    ),
    planned({ pins: oddPins, chosen: oddPins[0] ?? null, unfolded: true }, false, oddEngine),
    planned({ help: true }),
    planned({ chosen: pins[0] ?? null, prompt: { what: "order", line: lineOf("x".repeat(200)), replace: false } }),
    planned({ field: FIELDS.length - 1, values: { ...BRIEF, title: "漢".repeat(90) }, caret: 90 }),
    planned({ values: { energy: "1 GJ", voltage: "9 MV", ripple: "1 %" } }, true),
  ];
  test.each(sizes)(
    "%i by %i: no more rows, none wider, the caret inside, nothing that is not drawn",
    (columns, rows) => {
      for (const variant of variants)
        for (const screen of SCREENS)
          for (const look of looks) {
            const drawn = drawScreen({ ...variant, columns, rows, screen, look });
            expect(drawn.rows.length).toBeLessThanOrEqual(rows);
            expect(drawn.rows.filter((row) => rowCells(row, 10_000).length > columns)).toEqual([]);
            if (drawn.caret !== null) {
              expect(drawn.caret.row).toBeLessThan(rows);
              expect(drawn.caret.column).toBeLessThan(columns);
            }
            const plain = drawn.rows.join("").replace(/\x1b\[[\d;]*m/g, "");
            expect(plain).not.toMatch(/[\p{Cc}\p{Cf}]/u);
            if (look.ascii) expect(plain).toMatch(/^[ -~]*$/);
          }
    },
  );

  test("too small: one sentence with both sizes and the way out", () => {
    has(
      stateWith({ columns: LEAST_COLUMNS - 1, rows: 24 }),
      `needs ${LEAST_COLUMNS} columns by ${LEAST_ROWS} rows and has 59 by 24`,
      "Ctrl-Q",
    );
    has(stateWith({ columns: 80, rows: LEAST_ROWS - 1 }), "has 80 by 15");
    expect(text(stateWith({ columns: LEAST_COLUMNS, rows: LEAST_ROWS }))).not.toContain("needs 60 columns");
  });
});

describe("empty states", () => {
  const none = { stock: { name: "", parts: 0, faults: 0, note: "" } };
  test.each(SCREENS)("no catalogue, on %s", (screen) => {
    has(
      stateWith({ screen, ...none }),
      "There is no catalogue yet",
      "joulewright --catalog FILE.csv",
      "part, capacitance [uF] and voltage [V]",
    );
  });
  test.each(SCREENS.filter((screen) => screen !== "parts"))("a brief that is not whole, on %s", (screen) => {
    has(
      planned({ screen, values: { energy: "x", ripple: "20" } }),
      "No plan yet; to be mended: Energy of one pulse, Allowed fall; still needed: Charge voltage.",
    );
  });
  test.each(["layouts", "compare", "bank", "sharing", "shot", "order"] as const)(
    "nothing fits, on %s: the least changes, each with what it lets in",
    (screen) => {
      has(
        planned({ screen, values: { ...BRIEF, energy: "1 GJ" } }, true),
        "Nothing fits: none of the 4 parts",
        "Any one of these would let something in:",
        "in place of 1 GJ, for ",
      );
    },
  );
  test("nothing fits and the changes are not known yet, or too many to look for", () => {
    const values = { ...BRIEF, energy: "1 GJ" };
    has(planned({ values }), "Looking for the least change");
    has({ ...planned({ values }), slow: true }, "The catalogue is too large to look for the least change");
  });
  test("nothing pinned, one pinned", () => {
    has(planned({ screen: "compare" }), "Nothing is pinned yet.", "Pin two to four layouts with Space");
    has(planned({ screen: "compare", pins: pins.slice(0, 1), rows: 50 }), "Pin another layout to set beside this one.");
  });
  test("no bank chosen, being worked out, gone from the catalogue", () => {
    has(planned({ screen: "bank" }), "No bank is chosen yet.", "Enter on the layouts screen");
    has(
      { ...planned({ screen: "bank", chosen: pins[0] ?? null }), asked: 9, answer: planned().answer },
      "Working out this bank.",
    );
    has(
      planned({ screen: "order", chosen: { part: "gone", series: 2, parallel: 3, ties: "strings" } }),
      "The catalogue no longer has gone 2s3p strings",
    );
  });
});

describe("the form", () => {
  test("each field says how it was read, what is wrong, or what a blank means", () => {
    has(planned({ values: { ...BRIEF, energy: "2400" } }), "[2400 ] = 2.4 kJ", "[ ] 90 % of rated voltage");
    has(planned({ values: { ...BRIEF, derating: "9" } }), "! not 9, that is");
  });
  test("a percentage without its sign is told how it was read, in full beneath", () => {
    has(planned({ field: 2, values: { ...BRIEF, ripple: "20" }, columns: 120 }), 'write "20 %"');
  });
  test("the focused field is always in sight, and its mark is text", () => {
    for (let field = 0; field < FIELDS.length; field += 1) {
      const rows = drawScreen(planned({ field, rows: 16, columns: 60 })).rows;
      expect(rows.filter((row) => row.includes("> "))).toHaveLength(1);
    }
  });
});

describe("the comparison", () => {
  test("best and worst by word and mark, the difference in percent where there is room", () => {
    has(
      planned({ screen: "compare", pins: pins.slice(0, 2), rows: 50, columns: 120 }),
      "^ best",
      "v worst (",
      "Same in all: ",
    );
  });
  test("four in 60 columns: three in sight, the cursor's among them, no value cut, the marks explained above", () => {
    for (let column = 0; column < 4; column += 1) {
      const drawn = text(planned({ screen: "compare", pins, rows: 40, columns: 60, column }));
      const rows = drawn.split("\n");
      expect(rows[3]).toContain("^ best  v worst");
      expect(rows[3]?.match(/>/g)).toHaveLength(1);
      expect(rows[4]).toContain(column === 3 ? "2-4 of 4" : "1-3 of 4");
      const body = rows.slice(6, 28).map((row) => row.slice(16));
      expect(body.filter((row) => row.includes("…"))).toEqual([]);
      expect(drawn).toMatch(/units .*\d \^/);
    }
  });
  test("unfolded shows every row, folded names in one sentence what agrees", () => {
    const state = planned({ screen: "compare", pins: pins.slice(0, 2), rows: 50, columns: 120 });
    expect(text({ ...state, unfolded: true })).not.toContain("Same in all");
    has({ ...state, unfolded: true }, "in series", "checks");
  });
});

describe("the bank", () => {
  test("one row a stage, its bar and its number, and over the limit by word", () => {
    const over = { part: "flash-a", series: 4, parallel: 2, ties: "cross-tied" } as const;
    const drawn = text(planned({ screen: "bank", chosen: over, rows: 40 }));
    expect(drawn.split("\n").filter((row) => /^ {2}\d ┤├─┤├ x2 {2}█+·* .* over$/.test(row))).toHaveLength(4);
    has(planned({ screen: "bank", chosen: over, rows: 40 }), "x fail", "4 stages of 2 tied units");
  });
  test("a check that could not be made is said so, and is not a pass", () => {
    const film = { part: "film-d", series: 3, parallel: 10, ties: "strings" } as const;
    has(
      planned({ screen: "bank", chosen: film, rows: 60 }),
      "? not assessed",
      "10 strings of 3, not tied",
      "at least ",
    );
    const over = { part: "film-d", series: 1, parallel: 10, ties: "strings" } as const;
    has(planned({ screen: "bank", chosen: over, rows: 60 }), "2.2 kV of 1.08 kV", " over");
  });
  test("scrolls to its end and no further", () => {
    const state = planned({ screen: "bank", chosen: pins[0] ?? null, rows: 18 });
    const most = mostScroll(state);
    expect(most).toBeGreaterThan(0);
    expect(text({ ...state, scroll: { bank: most } })).toContain(`(${most} above)`);
    expect(text({ ...state, scroll: { bank: most + 99 } })).toBe(text({ ...state, scroll: { bank: most } }));
  });
});

describe("order and help", () => {
  test("a line without a price says so and is named beneath the sum", () => {
    has(
      planned({ screen: "order", chosen: pins[0] ?? null, rows: 50 }),
      "to be chosen",
      "Not in that sum, for want of a price or a choice: ",
      "Money to spend: 545.60 EUR for 1 line; 18 without a price",
    );
    has(planned({ screen: "order", chosen: pins[0] ?? null, rows: 16 }), "Money to spend: 545.60 EUR");
  });
  test("a bank that fails a check is not to be bought, said above its order", () => {
    has(
      planned({ screen: "order", chosen: { part: "flash-a", series: 4, parallel: 2, ties: "cross-tied" } }),
      "a check of this bank fails. Do not buy it.",
    );
  });
  test("the help names the keys live on the screen behind it, and no other", () => {
    has(planned({ screen: "layouts", help: true, rows: 40 }), "Keys on layouts", "Space pin", "r order by");
    expect(text(planned({ screen: "bank", help: true, rows: 40 }))).not.toContain("order by");
  });
});
