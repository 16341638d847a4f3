// Briefs: every bad one refused with the key, what stood there and what would be accepted; every good one in SI.
import { readdirSync, readFileSync } from "node:fs";
import { resolve } from "node:path";
import { describe, expect, test } from "vitest";
import { BRIEF_KEYS, type Brief, briefJsonSchema, readBrief } from "../../src/search/brief.ts";

const FOLDER = resolve(import.meta.dirname, "../../fixtures/briefs");
const load = (file: string): unknown => JSON.parse(readFileSync(resolve(FOLDER, file), "utf8"));
const brief = (over: object = {}): Brief => {
  const read = readBrief({ energy: "2.4 kJ", voltage: "2.2 kV", ripple: "100 %", ...over });
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
};
const codes = (input: unknown): readonly string[] => {
  const read = readBrief(input);
  return read.ok ? [] : read.refusals.map((r) => `${r.code} ${r.place.field ?? "-"}`);
};

describe("readBrief(input): good", () => {
  test("the three needed keys in SI, and every default", () =>
    expect(brief()).toEqual({
      energy: 2400,
      voltage: 2200,
      ripple: 1,
      basis: "worst case",
      risk: 1e-4,
      distribution: "uniform",
      derating: 0.9,
      overshoot: 0,
      ageing: 0,
      hold: Number.POSITIVE_INFINITY,
      touchSafe: 60,
      maxSeries: 40,
      maxUnits: 2000,
      spares: 0,
    }));
  test("flash-lamp.json and flash-lamp-si.json are the same but for the title", () => {
    const [text, si] = ["flash-lamp.json", "flash-lamp-si.json"].map((f) => readBrief(load(f)));
    expect(text).toEqual(si);
  });
  test.each(readdirSync(FOLDER).filter((f) => f.endsWith(".json")))("%s is read", (file) =>
    expect(readBrief(load(file)).ok).toBe(true),
  );
  test.each(readdirSync(resolve(FOLDER, "impossible")))("impossible/%s is read: it is not nonsense", (file) =>
    expect(readBrief(load(`impossible/${file}`)).ok).toBe(true),
  );
  test("numbers as text, as flags are", () =>
    expect(
      brief({
        maxSeries: "12",
        spares: " 3 ",
        hold: "30 s",
        basis: "Worst_Case",
        derating: "85 %",
        maxVolume: "5 L",
        maxMass: "60 kg",
      }),
    ).toMatchObject({
      maxSeries: 12,
      spares: 3,
      hold: 30,
      basis: "worst case",
      derating: 0.85,
      maxVolume: 5e-3,
      maxMass: 60,
    }));
});

describe("readBrief(input): bad", () => {
  // Codes are stable; words are not compared.
  test.each([
    ["absurd-voltage", ["bad-value voltage"]],
    ["array", ["bad-brief -"]],
    ["basis-word", ["bad-value basis"]],
    ["derating-over-one", ["bad-value derating"]],
    ["infinite", ["bad-value energy"]],
    ["missing-energy", ["missing-value energy"]],
    ["negative-energy", ["bad-value energy"]],
    ["null-energy", ["bad-value energy"]],
    ["ripple-bare-20", ["bad-value ripple"]],
    ["ripple-over-100", ["bad-value ripple"]],
    ["ripple-zero", ["bad-value ripple"]],
    ["series-fraction", ["bad-value maxSeries"]],
    ["thousands-comma", ["bad-value voltage"]],
    ["unknown-key", ["missing-value voltage", "unknown-key volage"]],
    ["wrong-unit", ["bad-value energy"]],
    ["zero-voltage", ["bad-value voltage"]],
  ])("bad/%s.json: %j", (file, told) => expect([...codes(load(`bad/${file}.json`))].sort()).toEqual(told));

  test("a risk of 0, of 1, beyond a half or below nought is refused, and told what it would mean", () => {
    const want = (risk: unknown): string => {
      const read = readBrief({ energy: 1, voltage: 1, ripple: 1, risk });
      return read.ok ? "" : (read.refusals[0]?.want ?? "");
    };
    expect(want(0)).toMatch(/worst case/);
    expect(want("0 %")).toMatch(/worst case/);
    expect(want(1)).toMatch(/every bank would do/);
    for (const risk of [0.6, -1, "often"]) expect(want(risk)).toMatch(/above 0 and at most 0\.5/);
    expect(brief({ risk: "0.1 %" }).risk).toBe(1e-3);
    expect(brief({ risk: 0.5 }).risk).toBe(0.5);
  });
  test("bad/statistical-without-risk.json takes the default risk of one in ten thousand, which every output states", () => {
    const read = readBrief(load("bad/statistical-without-risk.json"));
    expect(read.ok && read.value.risk).toBe(1e-4);
  });

  test("every bad file of the folder is covered; those that are no JSON, or repeat a key, are for the reader of files", () => {
    const covered =
      "absurd-voltage array basis-word derating-over-one infinite missing-energy negative-energy null-energy ripple-bare-20 ripple-over-100 ripple-zero series-fraction statistical-without-risk thousands-comma unknown-key wrong-unit zero-voltage".split(
        " ",
      );
    const elsewhere = ["empty", "not-json", "twice-the-key"];
    expect(
      readdirSync(resolve(FOLDER, "bad"))
        .map((f) => f.replace(".json", ""))
        .sort(),
    ).toEqual([...covered, ...elsewhere].sort());
  });

  test("no object at all", () => {
    for (const input of [null, undefined, 5, "x", true, []]) expect(codes(input)).toEqual(["bad-brief -"]);
  });
  test("every fault at once, each with its key", () =>
    expect(
      [
        ...codes({ energy: "x", voltage: -1, ripple: 2, colour: 1, steady: { current: 0, frequency: 1, phase: 2 } }),
      ].sort(),
    ).toEqual(
      [
        "bad-value energy",
        "bad-value ripple",
        "bad-value steady.current",
        "bad-value voltage",
        "unknown-key colour",
        "unknown-key steady.phase",
      ].sort(),
    ));
  test("20 without the sign: said how it was read, and how to write 20 %", () => {
    for (const ripple of ["20", 20]) {
      const read = readBrief({ energy: 1, voltage: 1, ripple });
      expect(!read.ok && read.refusals[0]?.read).toBe("20, that is 2000 %");
      expect(!read.ok && read.refusals[0]?.want).toContain('"20 %"');
    }
  });
  test("a mistyped key is told the nearest known one", () => {
    const read = readBrief({ energy: 1, volage: 1, voltage: 1, ripple: 1 });
    expect(!read.ok && read.refusals[0]?.want).toBe('perhaps "voltage"');
  });
  test.each([
    [{ energy: Number.NaN }, "bad-value energy"],
    [{ energy: 1e13 }, "bad-value energy"],
    [{ voltage: "1e300 V" }, "bad-value voltage"],
    [{ hold: "-1 s" }, "bad-value hold"],
    [{ hold: "a while" }, "bad-value hold"],
    [{ maxUnits: 0 }, "bad-value maxUnits"],
    [{ maxSeries: 1001 }, "bad-value maxSeries"],
    [{ spares: -1 }, "bad-value spares"],
    [{ ageing: 0.95 }, "bad-value ageing"],
    [{ overshoot: "-5 %" }, "bad-value overshoot"],
    [{ currency: "euro" }, "bad-value currency"],
    [{ exchange: { USD: 0 } }, "bad-value exchange.USD"],
    [{ steady: { current: 1 } }, "missing-value steady.frequency"],
    [{ title: "x".repeat(300) }, "bad-value title"],
    [{ ambient: "5000 degC" }, "bad-value ambient"],
  ])("%j: %s", (over, told) => expect(codes({ energy: 1, voltage: 1, ripple: 1, ...over })).toEqual([told]));
  test("edges: derating 1, overshoot 0, ageing 0.9, hold 0, one unit, one stage are allowed", () =>
    expect(
      codes({
        energy: 1e12,
        voltage: 1e7,
        ripple: 1,
        derating: 1,
        overshoot: 0,
        ageing: 0.9,
        hold: 0,
        maxUnits: 1,
        maxSeries: 1,
        maxCost: 0,
      }),
    ).toEqual([]));
});

describe("readBrief(input): version", () => {
  const whole = { energy: "500 J", voltage: "1 kV", ripple: "20 %" };

  test("of a later version nothing else is said; what is no version is a bad value", () => {
    const read = readBrief({ ...whole, version: 2, watts: 3 }, "a.json");
    expect(read.ok ? [] : read.refusals).toEqual([
      {
        code: "newer-version",
        place: { file: "a.json", field: "version" },
        read: "version 2",
        want: "version 1; a later program reads this file",
      },
    ]);
    expect(readBrief({ ...whole, version: "1" })).toMatchObject({ ok: false, refusals: [{ code: "bad-value" }] });
  });

  test("the first version is the brief without one, and is no part of it", () => {
    expect(readBrief({ version: 1, ...whole })).toEqual(readBrief(whole));
  });
});

describe("briefJsonSchema()", () => {
  test("names every key and needs the three", () => {
    const schema = briefJsonSchema() as { properties: object; required: readonly string[] };
    expect(Object.keys(schema.properties)).toEqual(["version", ...BRIEF_KEYS]);
    expect(schema.required).toEqual(["energy", "voltage", "ripple"]);
  });
});
