import { describe, expect, test } from "vitest";
import { readWaveform } from "../../src/catalog/waveform.ts";

describe("readWaveform(source, file)", () => {
  test("time and current in the heading's units, negative current too", () => {
    const read = readWaveform("time [us],current [kA]\n0,0\n1,2.5\n2,-0.5\n", "w.csv");
    expect(read.ok && read.value).toEqual([
      { time: 0, current: 0 },
      { time: 1e-6, current: 2500 },
      { time: 2e-6, current: -500 },
    ]);
  });

  test("one bad row refuses the record: it would be a gap", () => {
    const read = readWaveform("time [s],current [A]\n0,0\n1,x\n2,1\n", "w.csv");
    expect(read.ok ? [] : read.refusals.map(({ place }) => place.line)).toEqual([3]);
    expect(readWaveform("time [s]\n0\n", "w.csv").ok).toBe(false);
  });
});
