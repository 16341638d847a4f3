// The screen of sharing on a real grid, at three sizes: what it says, what it says where there is nothing, and that no colour is needed.
import { afterEach, describe, expect, test } from "vitest";
import { type Capacitor, DEFAULT_FAMILY } from "../../../src/catalog/index.ts";
import { bankCourse, cornersOf, improve, riskOf } from "../../../src/search/index.ts";
import { catalogEngine } from "../../../src/tui/catalogEngine.ts";
import type { State } from "../../../src/tui/state.ts";
import { shown, shownWorst } from "../../../src/tui/values.ts";
import { chanceWords } from "../../../src/tui/view/sharingSpread.ts";
import { BANK, missing, type Opened, openCloser, SIZES } from "../../support/closer.ts";
import { detailed, read } from "../../support/detailed.ts";
import { BRIEF, parts } from "../../support/stock.ts";

let opened: Opened;
const open = (size: readonly [number, number], state: Partial<State> = {}, changes = {}): Opened => {
  opened = openCloser(size, { screen: "sharing", ...state }, changes);
  return opened;
};
afterEach(() => opened?.close());

const STATISTICAL = { ...BRIEF, basis: "statistical", risk: "1 %" };

describe.each(SIZES)("%i by %i", (...size) => {
  test("bars against L and R, corners, course, causes and cautions are all there", async () => {
    const { until, all } = open(size);
    await until((t) => /worst, holding +█/.test(t) && t.includes("R its full"));
    const text = await all();
    expect(
      missing(text, [
        "One stage of 7; any may be the worst. L is the limit 405 V, R its full rating 450 V.",
        "at its start, and at most",
        "stage 1 at -20 %, the rest at +20 %",
        "from equal sharing",
        "Without balancing resistors: not safe",
        "Time course at the worst corner",
        "safe 60 V │",
        "limit 405 V │",
        "charged, hold",
        "dump, instant",
        "P highest:",
        "N lowest:",
        "What eats the margin",
        "capacitance tolerance",
        "resistor tolerance",
        "full rating;",
        "c draws it",
        "Cautions",
        "A charged bank can kill",
      ]),
    ).toEqual([]);
    expect(text).toMatch(/even +█+·+L·*R·* 31[45] V/);
    expect(text).toMatch(/[\u2801-\u28ff]{5}/);
  });

  test("the spread comes when it is asked for, and at once on the statistical basis", async () => {
    const { until, type, all } = open(size);
    await until((t) => t.includes("c shows it"));
    type("c");
    await until((t) => /likely worst +█+·*L/.test(t));
    const text = await all();
    expect(
      missing(text, ["65,536 banks drawn from seed 1", "M likely:", "L limit 405 V: chance of a bank over it"]),
    ).toEqual([]);
    await opened.close();
    const statistical = open(size, { values: STATISTICAL });
    await statistical.until((t) => /likely worst +█/.test(t));
    expect(missing(await statistical.all(), ["the brief allows 1 %"])).toEqual([]);
  });

  test("NO_COLOR and ASCII: the same facts, nothing but ASCII, no colour", async () => {
    const { until, type, all, ports } = open(size, { spread: true }, { ascii: true, env: { NO_COLOR: "1" } });
    await until((t) => /worst, holding +#+.*L.*R/.test(t));
    type("c");
    await until((t) => /likely worst +#/.test(t));
    expect(missing(await all(), ["*: tight stage. o: each other (6)", "safe 60 V |", "M likely:"])).toEqual([]);
    expect(ports.screen.written.replace(/\x1b/g, "")).toMatch(/^[\x20-\x7e\r\n]*$/);
    expect(ports.screen.written).not.toMatch(/\x1b\[(?:\d+;)*(?:3[0-8]|4[0-8]|9[0-7])(?:;\d+)*m/);
  });

  test("empty states: no catalogue, a brief not whole, no bank", async () => {
    open(size, {}, { stock: { name: "", parts: 0, faults: 0, note: "" } });
    await opened.until((t) => t.includes("There is no catalogue yet"));
    await opened.close();
    open(size, { values: { energy: "x" } });
    await opened.until((t) => t.includes("No plan yet; to be mended"));
    await opened.close();
    open(size, { chosen: null });
    await opened.until((t) => t.includes("No bank is chosen yet."));
  });
});

describe("sharing(state)", () => {
  const unit = parts()[0] as Capacitor;
  const state = detailed({ screen: "sharing", chosen: BANK, columns: 120, spread: true });
  const found = state.answer?.kind === "planned" ? state.answer.chosen : null;
  const brief = state.answer?.kind === "planned" ? state.answer.brief : null;
  if (found === null || brief === null) throw new Error("the bank is not assessed");

  test("its figures are those of the engine", () => {
    const bank = { result: found, unit, brief };
    const corners = cornersOf(bank);
    const course = bankCourse(bank);
    const margin = improve({ ...bank, families: [DEFAULT_FAMILY], currency: "EUR" });
    const given = { tolerance: unit.tolerance ?? { low: 0, high: 0 }, ...BANK, share: found.share.limit / 2200 };
    const { exceed } = riskOf(given, brief);
    const text = read(state);
    expect(
      missing(text, [
        `charging ${shownWorst(corners.charging?.voltage ?? null, "voltage")}: ${corners.charging?.words}`,
        `holding ${shownWorst(corners.holding?.voltage ?? null, "voltage")} at its start, and at most ${shownWorst(found.share.holding, "voltage")} later`,
        `P highest: ${shownWorst(course?.peak.voltage ?? null, "voltage")} on ${course?.stages[course.peak.kind]?.words}`,
        ...(margin?.causes ?? []).map(({ cause, volts }) => `${cause} ${shown(volts, "voltage")}`),
      ]),
    ).toEqual([]);
    // Bonferroni: at most seven times the chance that one given stage of four is so low beside the others; far below one in a million.
    expect(exceed).toBeGreaterThan(0);
    expect(exceed).toBeLessThan(1e-6);
    expect(missing(text, [`chance of a bank over it ${chanceWords(exceed)}`])).toEqual([]);
    const eight = read(detailed({ screen: "sharing", chosen: { ...BANK, series: 8 }, columns: 120, spread: true }));
    expect(missing(eight, ["chance of a bank over it 0: even the worst corner is below"])).toEqual([]);
  });

  test("the causes stand in the order of what they eat", () => {
    const volts = (state.details?.margin?.causes ?? []).map((one) => one.volts ?? -1);
    expect(volts).toEqual([...volts].sort((a, b) => b - a));
    const lines = read(state).split("\n");
    const at = (state.details?.margin?.causes ?? []).map(({ cause }) =>
      lines.findIndex((line) => line.startsWith(`${cause} `)),
    );
    expect(at).toEqual([...at].sort((a, b) => a - b));
    expect(at[0]).toBeGreaterThan(0);
  });

  test("over the limit, and over the rating, by word and beyond the letter", () => {
    const over = read(detailed({ screen: "sharing", chosen: { ...BANK, series: 6 }, columns: 100 }));
    expect(over).toMatch(/worst, charging █+L█+R█+·* 508 V over R/);
    const far = read(detailed({ screen: "sharing", chosen: { ...BANK, series: 4 }, columns: 100 }));
    expect(far).toMatch(/even +█+L█*R█+·* 550 V over R/);
  });

  test("a risk above the brief's is said so", () => {
    const values = { ...BRIEF, basis: "statistical", risk: "1e-9" };
    const text = read(
      detailed({ screen: "sharing", chosen: { ...BANK, series: 6, parallel: 2 }, columns: 100, values }),
    );
    expect(missing(text, ["the brief allows 1.00e-9: over", "Reckoned, not counted"])).toEqual([]);
  });

  test("one in series: nothing shared, nothing spread, no margin to divide", () => {
    const one = { part: "film-d", series: 1, parallel: 4, ties: "strings" } as const;
    const text = read(
      detailed({ screen: "sharing", chosen: one, values: { ...BRIEF, voltage: "1 kV" }, spread: true }),
    );
    expect(
      missing(text, [
        "The one stage.",
        "one stage: none",
        "nothing is shared, so there is no course",
        "nothing is shared, so nothing is spread",
        "there is no margin to divide",
      ]),
    ).toEqual([]);
  });

  test("unknown leakage and unknown tolerance are not assessed, each by name", () => {
    const film = { part: "film-d", series: 3, parallel: 10, ties: "strings" } as const;
    const leak = read(detailed({ screen: "sharing", chosen: film, spread: true }));
    expect(missing(leak, ["not assessed: the leakage of the unit is unknown", "leakage unknown"])).toEqual([]);
    expect(leak).toMatch(/worst, holding +·+L·*R· not assessed/);
    const bare = parts("part,capacitance [uF],voltage [V],polarised\nbare,470,450,yes\n");
    const text = read(
      detailed(
        { screen: "sharing", chosen: { ...BANK, part: "bare" }, spread: true },
        [],
        catalogEngine({ parts: bare, families: [DEFAULT_FAMILY] }),
      ),
    );
    expect(
      missing(text, [
        "not assessed: the tolerance of the unit is unknown",
        "Not assessed: the tolerance of the unit is unknown, or there is none.",
        "Not assessed: the tolerance of the unit is unknown.",
      ]),
    ).toEqual([]);
  });

  test("a stated dump and a short hold are drawn as they are, with their times", () => {
    const text = read(
      detailed({
        screen: "sharing",
        chosen: BANK,
        values: { ...BRIEF, hold: "30 s" },
        extra: { dumpResistance: "2 kohm" },
      }),
    );
    expect(missing(text, ["charged, hold 30 s", "Dump through 2 kohm", "dump 4"])).toEqual([]);
    expect(text).not.toContain("The hold is for ever");
  });

  test("chanceWords(chance): never smaller than it is", () => {
    expect([0, 1.001e-9, 0.00123, 0.01001, 0.5, 1, 5e-324].map(chanceWords)).toEqual([
      "0",
      "1.01e-9",
      "1.23e-3",
      "1.01 %",
      "50 %",
      "100 %",
      "4.94e-324",
    ]);
  });

  test("pieces not worked out yet say so", () => {
    const { details: _, ...bare } = state;
    const text = read({ ...bare, details: null, spread: true });
    expect(missing(text, ["Working it out ...", "Drawing banks ..."])).toEqual([]);
  });
});
