import { describe, expect, test } from "vitest";
import { type PulseFlags, pulseCommand } from "../../../src/cli/commands/pulse.ts";
import { at, fakePorts } from "../../support/fakePorts.ts";

/** 100 uF of methods A8, with every rating known, and one of which little is known. */
const CATALOG = `part,capacitance [uF],voltage [V],tolerance [%],polarised,leakage [uA],esr [mohm],esl [nH],peak current [A],slew [V/us],reversal [%],life exponent,ripple current [A],thermal resistance
film,100,2500,0,no,10,100,0.001,2000,20,20,6,5,2
bare,100,2500,,,,,,,,,,,
can,100,2500,20,yes,10,100,0.001,9000,,,,,
ring,500,4000,0,no,10,10,0.001,90000,,90,,,
`;
const FLAGS: PulseFlags = {
  catalog: ["c.csv"],
  voltage: "2 kV",
  part: "film",
  series: "1",
  parallel: "1",
  loadResistance: "0.9 ohm",
  loadInductance: "25 uH",
};
function pulse(flags: PulseFlags, texts: Record<string, string> = {}, brief?: string) {
  const ports = fakePorts({ "c.csv": CATALOG, ...texts });
  const status = pulseCommand(brief, flags, ports);
  return { status, out: ports.printed(), err: ports.told(), written: ports.written };
}
const json = (flags: PulseFlags, texts: Record<string, string> = {}, brief?: string) => {
  const { status, out } = pulse({ ...flags, json: true }, texts, brief);
  expect(out).not.toMatch(/NaN|Infinity/);
  return { status, ...JSON.parse(out) };
};

describe("pulse --json", () => {
  test("Source: methods A8: critical damping through the whole program", () => {
    const shot = json(FLAGS);
    expect(shot.status).toBe(0);
    expect(shot.damping).toBeCloseTo(1, 6);
    expect(shot.peakCurrent / 1471.51776).toBeCloseTo(1, 6);
    expect(shot.peakTime).toBeCloseTo(5e-5, 9);
    expect(shot.action).toBeCloseTo(200, 6);
    expect(shot.energy).toMatchObject({ stored: 200, left: 0 });
    expect(shot.energy.load).toBeCloseTo(180, 6);
    expect(shot.unitPeakCurrent).toBe(shot.peakCurrent);
    expect(shot.faults).toHaveLength(8);
    expect(shot).toMatchObject({ cautions: expect.any(Array), inputs: expect.any(Object), brief: { energy: null } });
  });

  test("Source: methods A7: ringing, and the reversal over the unit's rating ends with 1", () => {
    const flags = { ...FLAGS, part: "ring", voltage: "3 kV", loadResistance: "30 mohm", loadInductance: "2 uH" };
    const shot = json(flags);
    expect(shot.damping).toBeCloseTo(0.316227766, 6);
    expect(shot.peakCurrent / 31280.4767).toBeCloseTo(1, 6);
    expect(shot.reversal).toBeCloseTo(0.350919807, 6);
    expect(shot.status).toBe(0);
    expect(json({ ...flags, part: "film" }).status).toBe(1);
  });

  test("unknown ESR, ESL and ratings: bounds, null and not assessed, never zero or pass", () => {
    const shot = json({ ...FLAGS, part: "bare" });
    expect(shot.bounds.peakCurrent).toBe("upper bound");
    expect(shot.energy.bank).toBeNull();
    const verdicts = shot.findings.map((one: { id: string; verdict: string }) => [one.id, one.verdict]);
    expect(Object.fromEntries(verdicts)).toMatchObject({
      "pulse.unit.current": "not assessed",
      "pulse.unit.slew": "not assessed",
      "pulse.unit.reversal": "not assessed",
    });
  });

  test("a flag beats the brief file; the file's load is read", () => {
    const brief = JSON.stringify({
      energy: "100 J",
      voltage: "2 kV",
      ripple: "100 %",
      load: { resistance: 5, inductance: "25 uH" },
    });
    const { voltage: _, loadResistance: __, loadInductance: ___, ...bare } = FLAGS;
    expect(json(bare, { "b.json": brief }, "b.json").damping).toBeCloseTo(5.1, 6);
    expect(json({ ...bare, loadResistance: "0.9 ohm" }, { "b.json": brief }, "b.json").damping).toBeCloseTo(1, 6);
  });

  test("the briefs that come with the program fire", () => {
    const catalog = [at("catalogs/electrolytic.csv"), at("catalogs/double-layer.csv")];
    const shape = { catalog, part: "lab-pf-680-360", series: "4", parallel: "8", ties: "cross-tied" };
    expect(json(shape, {}, at("fixtures/briefs/pulsed-magnet.json")).damping).toBeGreaterThan(0);
    expect(json(shape, {}, at("fixtures/briefs/spot-welder.json")).peakCurrent).toBeGreaterThan(0);
  });

  test("no load, a wrong load, and a bank that cannot hold a steady current are refused with 2", () => {
    const { loadResistance: _, loadInductance: __, ...none } = FLAGS;
    expect(pulse(none)).toMatchObject({ status: 2, err: expect.stringMatching(/load/) });
    expect(pulse({ ...FLAGS, loadResistance: "5 V" }).err).toMatch(/--load-resistance/);
    expect(pulse({ ...none, loadCurrent: "100 A", loadTime: "1 s" }).err).toMatch(/cannot hold this current/);
    expect(pulse({ ...FLAGS, loadShort: true }).status).toBe(2);
    expect(pulse({ ...FLAGS, loadInductance: "0 H", loadResistance: "0 ohm", part: "bare" }).status).toBe(2);
  });

  test("a short on the bus needs nothing but the bank", () => {
    const { loadResistance: _, loadInductance: __, ...none } = FLAGS;
    expect(json({ ...none, loadShort: true }).bounds.peakCurrent).toBe("upper bound");
  });

  test("limits are judged here as in the search", () => {
    const over = json({ ...FLAGS, maxPeakCurrent: "1400 A" });
    expect(over.status).toBe(1);
    expect(over.findings.find(({ id }: { id: string }) => id === "limit-peak-current")).toMatchObject({
      verdict: "fail",
      limit: 1400,
    });
    expect(json({ ...FLAGS, maxPeakCurrent: "80 %" }).status).toBe(0);
  });
});

describe("pulse, a recorded current", () => {
  const { loadResistance: _, loadInductance: __, ...none } = FLAGS;
  test("is followed; its action and peak are its own", () => {
    const shot = json({ ...none, loadRecorded: "w.csv" }, { "w.csv": "time [us],current [A]\n0,0\n50,1000\n100,0\n" });
    expect(shot).toMatchObject({ peakCurrent: 1000, damping: null, method: "samples" });
    expect(shot.action).toBeCloseTo((1000 ** 2 * 1e-4) / 3, 9);
  });

  test.each([
    ["decreasing time", "time [us],current [A]\n0,0\n50,10\n40,10\n"],
    ["a gap", `time [us],current [A]\n${[0, 1, 2, 3, 4, 900].map((t) => `${t},1`).join("\n")}\n`],
    ["one row", "time [us],current [A]\n0,0\n"],
    ["no such column", "when,current [A]\n0,0\n"],
  ])("%s is refused with 2", (_name, text) => {
    expect(pulse({ ...none, loadRecorded: "w.csv" }, { "w.csv": text }).status).toBe(2);
  });

  test("a file that is not there", () => {
    expect(pulse({ ...none, loadRecorded: "nowhere.csv" }).err).toMatch(/no such file/);
  });
});

describe("pulse --waveform FILE", () => {
  test("time, current, voltage, with the peak among the rows; - prints it", () => {
    const { written } = pulse({ ...FLAGS, waveform: "shot.csv" });
    const lines = (written.get("shot.csv") ?? "").split("\r\n");
    expect(lines[0]).toBe("time [s],current [A],voltage [V]");
    const peak = Math.max(...lines.slice(1, -1).map((line) => Number(line.split(",")[1])));
    expect(peak / 1471.51776).toBeCloseTo(1, 6);
    expect(pulse({ ...FLAGS, waveform: "-" }).out).toMatch(/^time \[s\]/);
  });
});

describe("pulse --fuses FILE", () => {
  const FUSES =
    "fuse,voltage [V],melting action [A2s],clearing action [A2s],price,currency\ngood,3000,900,9000,9,EUR\nsmall,3000,9,90,1,EUR\n";
  test("the cheapest that does, its findings among the checks", () => {
    const shot = json({ ...FLAGS, parallel: "4", fuses: "f.csv" }, { "f.csv": FUSES });
    expect(shot.fuse.chosen.row.fuse).toBe("good");
    expect(shot.findings.map((one: { id: string }) => one.id)).toContain("pulse.fuse.clears");
    const text = pulse({ ...FLAGS, parallel: "4", fuses: "f.csv" }, { "f.csv": FUSES }).out;
    expect(text).toMatch(/good, 4 of them/);
  });

  test("another kind of table is refused", () => {
    expect(pulse({ ...FLAGS, fuses: "c.csv" }).status).toBe(2);
  });
});

describe("pulse as text", () => {
  test("says bounds, lossless limits, unknown ratings and the inconsistent in words", () => {
    expect(pulse({ ...FLAGS, part: "bare" }).out).toMatch(/upper bound/);
    const lossless = pulse({ ...FLAGS, part: "bare", loadResistance: "0 ohm" });
    expect(lossless.out).toMatch(/lossless bound/);
    expect(lossless.out).toMatch(/no bound/);
    expect(pulse({ ...FLAGS, part: "bare", loadInductance: "0 H" }).out).toMatch(/starts at its peak/);
  });

  test("ringing into polarised units fails without a clamp and says how to mend it", () => {
    const flags = { ...FLAGS, part: "can", loadResistance: "10 mohm" };
    const { status, out } = pulse(flags);
    expect(status).toBe(1);
    expect(out).toMatch(/FAIL, reversal of a polarised unit.*clamp diode/s);
    expect(pulse({ ...flags, clampDrop: "1 V" }).out).not.toMatch(/FAIL, reversal/);
  });

  test("a rate that the charger cannot keep up with fails", () => {
    const flags = { ...FLAGS, rate: "10 Hz", chargerCurrent: "50 mA" };
    expect(pulse(flags).out).toMatch(/FAIL, shots a second/);
    expect(pulse({ ...flags, rate: "0.1 Hz" }).status).toBe(0);
  });

  test("fits the width", () => {
    for (const line of pulse(FLAGS).out.split("\n")) expect(line.length).toBeLessThanOrEqual(80);
  });
});

describe("pulse of a lamp", () => {
  const LAMP = { lampBore: "8 mm", lampArc: "100 mm", lampGas: "xenon", lampPressure: "450 torr", lampWidth: "500 us" };
  const { loadResistance: _, loadInductance: __, voltage: ___, ...none } = FLAGS;
  test("Source: methods A11: the circuit that is sized, and how far the bank lands from it", () => {
    const shot = json({ ...none, ...LAMP, energy: "200 J", part: "ring" });
    expect(shot.voltage).toBeCloseTo(986.48483, 5);
    expect(shot.lamp.fit.capacitanceRatio).toBeCloseTo(5e-4 / 4.11035346e-4, 6);
    expect(shot.lamp.explosion.form12000).toBeCloseTo(2146.62526, 4);
    expect(pulse({ ...none, ...LAMP, energy: "200 J", part: "ring" }).out).toMatch(/datasheet comes first/);
  });

  test("a width needs its energy; a width outside the law warns", () => {
    expect(pulse({ ...none, ...LAMP }).status).toBe(2);
    const long = json({ ...none, ...LAMP, lampWidth: "50 ms", energy: "200 J", part: "ring" });
    expect(long.findings.find(({ id }: { id: string }) => id === "lamp.width.most")?.verdict).toBe("warn");
  });
});
