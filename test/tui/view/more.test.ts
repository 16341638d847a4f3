// Map, catalogue, trail and the comparison's sentences on a real grid at three sizes, and in ASCII without colour.
import { describe, expect, test } from "vitest";
import { answerFor } from "../../../src/tui/engine.ts";
import { PaintStream } from "../../../src/tui/paint.ts";
import { arrangementOf, listed } from "../../../src/tui/pick.ts";
import { MOST_FRONT } from "../../../src/tui/ports.ts";
import type { Message, State } from "../../../src/tui/state.ts";
import { update } from "../../../src/tui/update/update.ts";
import { runsOf } from "../../../src/tui/view/mapCounts.ts";
import { drawScreen } from "../../../src/tui/view/screen.ts";
import { costStep } from "../../../src/tui/view/trail.ts";
import { detailed } from "../../support/detailed.ts";
import { Screen } from "../../support/screen.ts";
import { CATALOGUE_FACTS, engine, stateWith } from "../../support/stock.ts";

async function grid(state: State): Promise<string> {
  const screen = new Screen(state.columns, state.rows);
  screen.feed("\x1b[?7l");
  new PaintStream(state, (text) => screen.feed(text)).paint(drawScreen(state).rows);
  await screen.settle();
  const text = screen.text();
  screen.term.dispose();
  return text;
}
const pins = listed(detailed({}))
  .filter(({ part }, i, all) => all.findIndex((one) => one.part === part) === i)
  .slice(0, 2)
  .map(arrangementOf);
const SIZES = [
  [60, 20],
  [80, 24],
  [200, 50],
] as const;

describe.each(SIZES)("%i by %i", (columns, rows) => {
  const at = (changes: Partial<State>): State => detailed({ columns, rows, ...changes });

  test("the map: how many of the front, both axes in words, the cursor and the layout under it", async () => {
    const text = await grid(at({ screen: "map", map: { x: "mass", y: "stress", table: false } }));
    expect(text).toMatch(/\d+ of \d+ unbeaten layouts: worst of rating up, mass across/);
    expect(text).toMatch(/\d+ cannot be placed: mass or worst of rating is unknown\./);
    expect(text).toMatch(/│.*X/);
    expect(text).toMatch(/[\u2801-\u28ff]/);
    expect(text).toMatch(/X: worst of rating .* %, mass .* k?g/);
  });
  test("the counts: marks by series and parallel, the cursor in brackets, what a mark means", async () => {
    const state = at({ screen: "map", map: { x: "mass", y: "stress", table: true } });
    const text = await grid(state);
    expect(text).toContain("Marks: 1 to 9 layouts, + for more; [ ] is the cursor.");
    expect(text).toMatch(/\[[1-9+]\]/);
    expect(text).toMatch(/under the cursor: \d+ in series, \d+ in parallel/);
  });
  test("ASCII without colour: the same map of letters", async () => {
    const look = { colour: false, ascii: true };
    const text = await grid(at({ screen: "map", map: { x: "mass", y: "stress", table: false }, look }));
    expect(text).toMatch(/^[\n -~]*$/);
    expect(text).toMatch(/\|.*o/);
    expect(text).toMatch(/\|.*X/);
  });
  test("the catalogue: the value in hand, what is assumed and unknown, and what is set by hand", async () => {
    const overrides = { "flash-a": { esr: "20 mohm" } };
    const text = await grid(at({ screen: "parts", overrides }));
    expect(text).toContain("4 parts of 1 file, 0 faults, 0 notes, 1 value by hand");
    expect(text).toMatch(/> flash-a /);
    expect(text).toContain("> polarised: yes");
    expect(text).toContain("Set by hand, beside the file: esr 20 mohm.");
    expect(text.replace(/\s+/g, " ")).toMatch(/Unknown: .*reverse voltage/);
  });
  test("faults with their file, line and column", async () => {
    const place = { file: "a.csv", line: 7, column: 3, field: "voltage" };
    const faults = [{ code: "bad-value", place, read: '"x"', want: "a voltage such as 400 V" }];
    const catalogue = {
      ...CATALOGUE_FACTS,
      sources: [{ file: "a.csv", kind: "capacitors" as const, read: 4, faults, notes: [] }],
    };
    const text = await grid(at({ screen: "parts", showFaults: true, catalogue }));
    expect(text).toMatch(/a\.csv: capacitors, 4 understood, 1 fault *\n/);
    expect(text).toMatch(/x a\.csv.*7.*3/);
  });
  test("the trail: what changed, the best, what it cost more", async () => {
    const step: Message = { type: "nudge", up: true, coarse: false };
    let state = stateWith({ screen: "trail", columns, rows, field: 1 });
    const answer = (now: State): State =>
      update(now, { type: "answered", asked: now.asked, answer: answerFor(now, engine, true), slow: false }).state;
    state = answer(update(answer(state), step).state);
    const text = await grid(state);
    expect(text).toContain("Tried so far: 2 briefs");
    expect(text).toContain("2: Charge voltage 2.2 kV to 2.4 kV.");
    expect(text).toMatch(/> +2 Charge voltage/);
  });
  test("two side by side: the row under the cursor in full, and what the one buys for what", async () => {
    const text = (await grid(at({ screen: "compare", pins, scroll: { compare: 99 } }))).replace(/\s+/g, " ");
    expect(text).toMatch(/mass: A .* best; B .* worst \(\+.* k?g, \+.* %\)\.|mass: A .* worst .*; B .* best\./);
    expect(text).toMatch(/[AB] .*(less|fewer|more|sooner|limit)/);
  });
  test("values set by hand are said at the bank and its order", async () => {
    const overrides = { [pins[0]?.part ?? ""]: { esr: "20 mohm" } };
    for (const screen of ["bank", "order"] as const) {
      let text = "";
      for (let scroll = 0; scroll < 60; scroll += 8)
        text += await grid(at({ screen, chosen: pins[0] ?? null, overrides, scroll: { [screen]: scroll } }));
      expect(text).toContain("! Set by hand, not in the catalogue: esr 20 mohm.");
    }
  });
});

test("long work on the rule: a bar, the part done, the time left, how to stop it; nothing before there is a pace", async () => {
  const row = async (work: State["work"]) => (await grid(stateWith({ work }))).split("\n")[2] ?? "";
  expect(await row({ words: "planning", done: null, secondsLeft: null })).toMatch(/^── planning; Esc stops it ─+$/);
  expect(await row({ words: "planning", done: 0.5, secondsLeft: 30.2 })).toContain(
    "planning ██████······ 50 %, about 31 s left; Esc stops it",
  );
  expect(await row({ words: "planning", done: 0.9, secondsLeft: 0.4 })).toContain("about a second left");
  expect(await row({ words: "planning", done: 0.1, secondsLeft: 200 })).toContain("about 4 min left");
});

test("a front beyond what is worked out is told; one that is not worked out yet too", async () => {
  const state = detailed({ screen: "map" });
  if (state.answer?.kind !== "planned") throw new Error("plan");
  const ids = Array.from({ length: MOST_FRONT + 5 }, (_, i) => `x${i} 1s1p strings`);
  const more = { ...state, answer: { ...state.answer, plan: { ...state.answer.plan, front: ids } } };
  expect(await grid(more)).toMatch(/beyond the first \d+ are left out\./);
  expect(await grid({ ...state, answer: { ...state.answer, front: null } })).toContain("Working out the front ...");
});

test("runsOf(values, most): rising, all kept, no more runs than asked", () => {
  expect(runsOf([3, 1, 2, 3], 9)).toEqual([[1], [2], [3]]);
  expect(runsOf([1, 2, 3, 4, 5], 2)).toEqual([
    [1, 2],
    [3, 4, 5],
  ]);
  expect(runsOf([5], 0)).toEqual([[5]]);
});

test("costStep(tried, before): sign, money and percent; the same; nothing across currencies or without a price", () => {
  const tried = {
    values: {},
    extra: {},
    words: "",
    best: "x",
    currency: "EUR",
    units: 1,
    load: null,
    chosenCost: null,
  };
  const of = (cost: number | null, currency = "EUR") => ({ ...tried, cost, currency });
  expect(costStep(of(118), of(100))).toBe("+18.00 EUR (+18.0 %)");
  expect(costStep(of(50), of(100))).toBe("-50.00 EUR (-50.0 %)");
  expect(costStep(of(100), of(100))).toBe("same");
  expect([costStep(of(1), null), costStep(of(null), of(1)), costStep(of(1, "USD"), of(1))]).toEqual(["", "", ""]);
});
