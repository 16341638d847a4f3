import { expect, test } from "vitest";
import { readWaveform } from "../../src/catalog/index.ts";
import { waveformCsv } from "../../src/cli/waveform.ts";
import { shotOf } from "../../src/search/index.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

test("waveformCsv(discharge): what is written reads back as a recorded current of the same action", () => {
  const brief = shotBrief();
  const shot = shotOf({ layout: shotLayout(brief), unit: FILM, brief });
  if (!shot.ok) throw new Error("the shot must be");
  const { discharge } = shot.value;
  const rows = waveformCsv(discharge)
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
