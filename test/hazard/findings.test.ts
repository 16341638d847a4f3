// Hazards of whole banks as findings: the demo bank, a harmless one, and one that is safe by volts but not by joules.
import { describe, expect, test } from "vitest";
import { type HazardOf, hazardFindings } from "../../src/hazard/findings.ts";

const demo: HazardOf = {
  capacitance: (2 * 2400) / 2200 ** 2,
  voltage: 2200,
  safeVoltage: 60,
  polarised: true,
  bleedSeconds: 200,
  bleedLimit: 300,
};
const verdicts = (bank: HazardOf) => Object.fromEntries(hazardFindings(bank).map((one) => [one.id, one.verdict]));
const one = (bank: HazardOf, id: string) => hazardFindings(bank).find((finding) => finding.id === id)!;

describe("hazardFindings(bank)", () => {
  test("the demo bank, 2.4 kJ at 2.2 kV: hazardous, no blast, 330 V may come back", () => {
    expect(verdicts(demo)).toEqual({
      "energy-class": "warn",
      "arc-blast": "pass",
      "energy-at-safe": "pass",
      recovery: "warn",
      "bleed-time": "pass",
    });
    expect(one(demo, "energy-class").value).toBeCloseTo(2400, 9);
    expect(one(demo, "energy-class").limit).toBe(0.25);
    expect(one(demo, "recovery").value).toBeCloseTo(330, 9);
    expect(one(demo, "bleed-time").margin).toBeCloseTo(1 / 3, 12);
  });

  test("0.1 uF at 12 V: nothing to warn of", () =>
    expect(Object.values(verdicts({ ...demo, capacitance: 1e-7, voltage: 12 }))).toEqual(Array(4).fill("pass")));

  test("0.667 F at 40 V: touch-safe all the time, yet 533 J burn", () => {
    const welder = { ...demo, capacitance: 2 / 3, voltage: 40 };
    expect(verdicts(welder)).toMatchObject({ "energy-class": "warn", "energy-at-safe": "warn" });
    expect(one(welder, "energy-at-safe").value).toBeCloseTo(533.333, 2);
  });

  test("12 kJ at 2.2 kV is a blast hazard, from 10 kJ on", () =>
    expect(verdicts({ ...demo, capacitance: 5 * demo.capacitance })).toMatchObject({ "arc-blast": "warn" }));

  test("no limit given for the bleed: not assessed, never passed", () => {
    const { bleedLimit: _, ...unlimited } = demo;
    expect(one(unlimited, "bleed-time")).toMatchObject({
      verdict: "not assessed",
      limit: null,
      margin: null,
      note: expect.stringMatching(/no limit was given/),
    });
  });

  test("no bleed at all: fails a limit, and says so even without one", () => {
    const never = { ...demo, bleedSeconds: Number.POSITIVE_INFINITY };
    expect(one(never, "bleed-time").verdict).toBe("fail");
    expect(one({ ...never, bleedLimit: undefined }, "bleed-time").note).toMatch(/never empties/);
  });

  test("film is judged by the other recovery figure, with its own source", () =>
    expect(one({ ...demo, polarised: false }, "recovery")).toMatchObject({
      value: 220,
      source: "Moore-electrostatics",
    }));

  test("each says of which state of the bank it speaks, in which unit and by which source", () =>
    expect(hazardFindings(demo).map(({ id, state, unit, source }) => [id, state, unit, source])).toEqual([
      ["energy-class", "holding", "J", "NFPA-70E"],
      ["arc-blast", "holding", "J", "LBNL-hazard"],
      ["energy-at-safe", "dumped", "J", "NFPA-70E"],
      ["recovery", "stored", "V", "absorption-notes"],
      ["bleed-time", "dumped", "s", "methods-derived"],
    ]));

  test("a warning says what to do about it, a pass what it is a pass of", () => {
    const small = { ...demo, capacitance: 1e-9, voltage: 150 };
    const notes = (bank: HazardOf) => hazardFindings(bank).map((found) => [found.id, found.verdict, found.note]);
    expect(notes({ ...demo, capacitance: 1, bleedSeconds: 301 })).toEqual([
      ["energy-class", "warn", expect.stringMatching(/interlock.*two ways to discharge/)],
      ["arc-blast", "warn", expect.stringMatching(/remote control/)],
      ["energy-at-safe", "warn", expect.stringMatching(/discharge to zero/)],
      ["recovery", "warn", expect.stringMatching(/over the touch-safe voltage: leave the strap on/)],
      ["bleed-time", "fail", expect.stringMatching(/slower than allowed/)],
    ]);
    expect(notes(small)).toEqual([
      ["energy-class", "pass", expect.stringMatching(/below the threshold of stored energy at this voltage/)],
      ["arc-blast", "pass", expect.stringMatching(/not an arc-blast hazard/)],
      ["energy-at-safe", "pass", expect.stringMatching(/below the threshold/)],
      ["recovery", "pass", expect.stringMatching(/^(?!.*Here that is over).*Leave the strap on\.$/)],
      ["bleed-time", "pass", "within the time allowed"],
    ]);
  });

  test("at the limit itself: the bleed is in time, the recovery just safe, the arc rule speaks from 100 V on", () => {
    expect(one({ ...demo, bleedSeconds: 300 }, "bleed-time").verdict).toBe("pass");
    expect(one({ ...demo, safeVoltage: one(demo, "recovery").value! }, "recovery").verdict).toBe("pass");
    expect(verdicts({ ...demo, voltage: 100 })).toHaveProperty("arc-blast");
    expect(verdicts({ ...demo, voltage: 99.99 })).not.toHaveProperty("arc-blast");
  });

  test("margin is (limit - value)/limit", () => {
    for (const { value, limit, margin } of hazardFindings(demo))
      expect(margin).toBeCloseTo((limit! - value!) / limit!, 12);
  });
});

test("volts that the brief calls touch-safe and are not: no word of safe to touch", () => {
  const note = (safeVoltage: number) => one({ ...demo, safeVoltage, capacitance: 0.1 }, "energy-at-safe").note;
  expect(note(5000)).toMatch(/^not safe to touch/);
  expect(note(60)).toMatch(/^safe to touch by voltage/);
});
