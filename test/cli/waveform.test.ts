import { expect, test } from "vitest";
import { readWaveform } from "../../src/catalog/index.ts";
import { waveformCsv, waveformTimes } from "../../src/cli/waveform.ts";
import { shotOf } from "../../src/search/index.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

test("waveformCsv(report): what is written reads back as a recorded current of the same action", () => {
  const brief = shotBrief();
  const shot = shotOf({ layout: shotLayout(brief), unit: FILM, brief });
  if (!shot.ok) throw new Error("the shot must be");
  const { discharge } = shot.value;
  const rows = waveformCsv(shot.value)
    .split("\r\n")
    .map((line) => line.split(",").slice(0, 2).join(","));
  const record = readWaveform(rows.join("\n"), "w.csv");
  if (!record.ok) throw new Error("the record must read");
  const load = { recorded: record.value.map(({ time, current }) => [time, current]) };
  const again = shotBrief({ load });
  const replay = shotOf({ layout: shotLayout(again), unit: FILM, brief: again });
  expect(replay.ok && replay.value.discharge.peakCurrent).toBeCloseTo(discharge.peakCurrent, 9);
  expect(replay.ok && (replay.value.discharge.action as number) / (discharge.action as number)).toBeCloseTo(1, 3);
});

test("waveformCsv(report): the band stands beside the course and holds it; without a spread there is none", () => {
  const brief = shotBrief({ load: { resistance: "20 mohm", inductance: "25 uH" } });
  const shot = shotOf({ layout: shotLayout(brief), unit: FILM, brief });
  if (!shot.ok) throw new Error("the shot must be");
  const [head = "", ...rows] = waveformCsv(shot.value).trim().split("\r\n");
  expect(head).toBe(
    "time [s],current [A],voltage [V],current lowest sampled [A],current highest sampled [A],voltage lowest sampled [V],voltage highest sampled [V]",
  );
  let wide = 0;
  for (const row of rows) {
    const [, current = 0, voltage = 0, low = 0, high = 0, down = 0, up = 0] = row.split(",").map(Number);
    expect(low <= current && current <= high && down <= voltage && voltage <= up).toBe(true);
    wide = Math.max(wide, high - low);
  }
  expect(wide).toBeGreaterThan(0.1 * shot.value.discharge.peakCurrent);
  expect(rows.length).toBe(waveformTimes(shot.value.discharge, 1001).length);
  const exact = { ...FILM, tolerance: { low: 0, high: 0 } };
  const one = shotOf({ layout: shotLayout(brief, undefined, exact), unit: exact, brief });
  expect(one.ok && waveformCsv(one.value).split("\r\n")[0]).toBe("time [s],current [A],voltage [V]");
});
