import { describe, expect, test } from "vitest";
import { readReadings } from "../../src/catalog/readings.ts";

describe("readReadings(text, file)", () => {
  test("SI, signs kept, no time is at once", () => {
    const text = "time [min],charge voltage [kV],stage,voltage [V],current [uA]\n5,1.5,1,-250.2,\n,1.5,2,249.8,120\n";
    const read = readReadings(text, "r.csv");
    expect(read.ok && read.value.readings).toEqual([
      { time: 300, bank: 1500, stage: 1, voltage: -250.2, line: 2 },
      { time: 0, bank: 1500, stage: 2, voltage: 249.8, current: expect.closeTo(120e-6, 12), line: 3 },
    ]);
  });

  test("without the charge voltage there is nothing to compare with", () => {
    expect(readReadings("stage,voltage [V]\n1,250\n", "r")).toMatchObject({
      ok: false,
      refusals: [{ code: "missing-heading", place: { field: "charge voltage" } }],
    });
    expect(readReadings("charge voltage [V],stage,voltage [V]\n,1,250\n", "r")).toMatchObject({
      ok: true,
      value: { readings: [], faults: [{ code: "missing-value" }] },
    });
  });
});
