// The screen of the shot on a real grid, at three sizes: what it says, what it says where there is nothing, and that no colour is needed.
import { afterEach, describe, expect, test } from "vitest";
import { peakCurrentOf } from "../../../src/pulse/index.ts";
import type { State } from "../../../src/tui/state.ts";
import { shown, shownWorst } from "../../../src/tui/values.ts";
import { drawnSeconds } from "../../../src/tui/view/shotTrace.ts";
import { BANK, missing, type Opened, openCloser, SIZES } from "../../support/closer.ts";
import { detailed, LOAD, read } from "../../support/detailed.ts";
import { BRIEF } from "../../support/stock.ts";

let opened: Opened;
const open = (size: readonly [number, number], state: Partial<State> = {}, changes = {}): Opened => {
  opened = openCloser(size, { screen: "shot", ...state }, changes);
  return opened;
};
afterEach(() => opened?.close());

const LOADED = { ...BRIEF, ...LOAD };
const FAULTS = ["unit short", "unit open", "row short", "load short", "early fire", "bleeder open", "dump stuck"];

describe.each(SIZES)("%i by %i", (...size) => {
  test("no load: says how to give one; l goes to its field, and what is typed there is fired", async () => {
    const { until, type } = open(size);
    await until(
      (t) => t.includes("The brief has no load, so there is no shot to show.") && t.includes("l goes to the"),
    );
    type("l");
    await until((t) => t.includes("> Load resistance"));
    type("50 mohm\t20 uH");
    await until((t) => t.includes("> Load inductance") && t.includes("20 uH"));
    type("\x1b6");
    await until((t) => t.includes("Peak at most ") && t.includes("reversal"));
  });

  test("course with marks, figures, energies, faults, sweep, what is open, cautions are all there", async () => {
    const { until, all } = open(size, { values: LOADED });
    await until((t) => t.includes("Over time"));
    const text = await all();
    expect(
      missing(text, [
        ...FAULTS,
        "P peak",
        "R most reversed",
        "Figures and how far they spread",
        "low nominal high",
        "upper bound",
        "Low and high are the extremes",
        "damping",
        "Where the ",
        "Dots: lowest and highest",
        "L load",
        "unknown, and counted as none",
        ". left in the bank",
        "Nothing given stops it",
        "loop inductance, log",
        "the lossless bound",
        "H here: 20 µH",
        "Worst unit",
        "Not assessed",
        "No charger was given",
        "Checks of the shot",
        "Life of the worst unit",
        "Cautions",
      ]),
    ).toEqual([]);
    expect(text).toMatch(/[\u2801-\u28ff]P[\u2801-\u28ff]/);
    expect(text).toMatch(/[\u2801-\u28ff]R[\u2801-\u28ff]/);
    expect(text).toMatch(/[\u2801-\u28ff]H[\u2801-\u28ff]/);
    expect(text).toMatch(/\[L+\??\.?\]/);
  });

  test("NO_COLOR and ASCII: the same facts, nothing but ASCII, no colour", async () => {
    const { until, all, ports } = open(size, { values: LOADED }, { ascii: true, env: { NO_COLOR: "1" } });
    await until((t) => t.includes("Over time"));
    const text = await all();
    expect(missing(text, [...FAULTS, "*: peak current", "o: the lossless bound", "x fail"])).toEqual([]);
    expect(text).toMatch(/\*P\*/);
    expect(ports.screen.written.replace(/\x1b/g, "")).toMatch(/^[\x20-\x7e\r\n]*$/);
    expect(ports.screen.written).not.toMatch(/\x1b\[(?:\d+;)*(?:3[0-8]|4[0-8]|9[0-7])(?:;\d+)*m/);
  });

  test("empty states: no catalogue, a brief not whole, no bank", async () => {
    open(size, {}, { stock: { name: "", parts: 0, faults: 0, note: "" } });
    await opened.until((t) => t.includes("There is no catalogue yet"));
    await opened.close();
    open(size, { values: { ...BRIEF, "load.resistance": "-1" } });
    await opened.until((t) => t.includes("to be mended: Load resistance"));
    await opened.close();
    open(size, { chosen: null, values: LOADED });
    await opened.until((t) => t.includes("No bank is chosen yet."));
  });
});

describe("shot(state)", () => {
  const of = (changes: Partial<State>): State => detailed({ screen: "shot", chosen: BANK, columns: 120, ...changes });
  const reportOf = (state: State) => {
    const report = state.details?.shot?.report;
    if (report?.ok !== true) throw new Error("no report");
    return report.value;
  };

  test("its peak is that of the closed form, its faults those of the engine", () => {
    const state = of({ values: LOADED });
    const { faults, bank } = reportOf(state);
    // Series loop with nothing known of ESR and ESL: C of 7s4p of 470 uF, the load's 50 mohm and 20 uH. Source: [Cona].
    const loop = { capacitance: (470e-6 * 4) / 7, resistance: 0.05, inductance: 20e-6 };
    expect(bank.capacitance).toBeCloseTo(loop.capacitance, 12);
    expect(missing(read(state), [`Peak at most ${shown(peakCurrentOf(loop, 2200), "current")} after`])).toEqual([]);
    const rows = faults.map(
      ({ id, worstVoltageSpread }) =>
        `${id.replaceAll("-", " ")} ${worstVoltageSpread === null ? "unknown" : shownWorst(worstVoltageSpread, "voltage")}`,
    );
    expect(rows).toHaveLength(8);
    expect(missing(read(state), rows)).toEqual([]);
  });

  test("a load without inductance, a lossless loop, a steady current: each says what it is", () => {
    const resistor = read(of({ values: { ...BRIEF, "load.resistance": "50 mohm" } }));
    expect(missing(resistor, ["The voltage does not reverse.", "The loop's own inductance is unknown"])).toEqual([]);
    const coil = read(of({ values: { ...BRIEF, "load.inductance": "20 uH" } }));
    expect(missing(coil, ["no resistance in the loop: the lossless bound", "no bound"])).toEqual([]);
    const steady = read(of({ extra: { load: { current: 100, time: "1 ms" } } }));
    expect(missing(steady, ["The current is given, so inductance has no say."])).toEqual([]);
  });

  test("a lamp: alpha in place of damping, corners are no proof, the lamp's own block", () => {
    const lamp = { bore: "10 mm", arc: "150 mm", gas: "xenon", pressure: "60 kPa" };
    const text = read(of({ extra: { load: { lamp } }, values: { ...BRIEF, "load.inductance": "40 uH" } }));
    expect(missing(text, ["a lamp has no damping ratio", "that is no proof of the extremes"])).toEqual([]);
  });

  test("a loop with nothing in it is refused in words", () => {
    const text = read(of({ values: { ...BRIEF, "load.resistance": "0", "load.inductance": "0" } }));
    expect(missing(text, ["This shot cannot be reckoned:", "l goes to the load on the brief"])).toEqual([]);
  });

  test("a record named but not read is refused in words, and nothing is drawn", () => {
    const text = read(of({ extra: { load: { recorded: "shot.csv" } } }));
    expect(missing(text, ["This shot cannot be reckoned:", "the samples of the record"])).toEqual([]);
  });

  test("with charger, rate and switch known, less is open", () => {
    const extra = {
      charger: { current: 1 },
      rate: "0.01 Hz",
      switch: { drop: "2 V" },
      bus: { resistance: "1 mohm", inductance: "100 nH" },
    };
    const text = read(of({ values: LOADED, extra }));
    expect(missing(text, ["Charging", "highest rate", "S switch", "U bus"])).toEqual([]);
    expect(text).not.toMatch(/No charger was given|no rate was given/);
  });

  test("drawnSeconds(discharge): to the end of what is seen; a long ringing only its first periods", () => {
    const { discharge } = reportOf(
      of({ values: { ...BRIEF, "load.inductance": "20 uH", "load.resistance": "2 mohm" } }),
    );
    expect(drawnSeconds(discharge)).toBeCloseTo(16 * discharge.peakTime, 9);
    const damped = reportOf(
      of({ values: { ...BRIEF, "load.inductance": "20 uH", "load.resistance": "2 ohm" } }),
    ).discharge;
    const until = drawnSeconds(damped);
    expect(Math.abs(damped.at(until).current)).toBeLessThan(0.02 * damped.peakCurrent);
    expect(until).toBeGreaterThan(damped.peakTime);
    expect(until).toBeLessThanOrEqual(damped.duration);
  });

  test("not worked out yet: says so", () => {
    expect(missing(read({ ...of({ values: LOADED }), details: null }), ["Working it out ..."])).toEqual([]);
  });
});
