import { describe, expect, test } from "vitest";
import { driftLine } from "../../src/place/driftFit.ts";

describe("driftLine(readings)", () => {
  test("fewer than two readings apart have no line", () => {
    expect(driftLine([])).toBeNull();
    expect(driftLine([{ at: 3, value: 1, sigma: 1 }])).toBeNull();
    expect(
      driftLine([
        { at: 3, value: 1, sigma: 1 },
        { at: 3, value: 2, sigma: 1 },
      ]),
    ).toBeNull();
  });

  test("two readings: the line through both, doubts as by hand", () => {
    const line = driftLine([
      { at: 10, value: 5, sigma: 0.3 },
      { at: 20, value: 4, sigma: 0.4 },
    ]);
    expect(line).toMatchObject({ from: 10, scatter: 1 });
    expect(line?.start).toBeCloseTo(5, 12);
    expect(line?.slope).toBeCloseTo(-0.1, 12);
    // The start is the first reading itself; the slope their difference over ten: (0.09 + 0.16)/100.
    expect(line?.startVariance).toBeCloseTo(0.09, 12);
    expect(line?.slopeVariance).toBeCloseTo(0.0025, 12);
    expect(line?.covariance).toBeCloseTo(-0.009, 12);
  });

  // The worked calibration line of a thermometer: y1 = -0.1712 degC, y2 = 0.00218, s(y1) = 0.0029, s(y2) = 0.00067, r = -0.930.
  // Source: [JCGM100] annex H.3, table H.6 (data from memory; they give back its printed results); there t_0 = 20 degC, so the start is carried from 21.521 to it.
  test("the worked line of a published guide", () => {
    const t = [21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.01, 26.511];
    const b = [-0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.16];
    const line = driftLine(t.map((at, k) => ({ at, value: b[k] ?? 0, sigma: 1e-6 })));
    if (line === null) throw new Error();
    const back = 20 - line.from;
    expect(line.slope).toBeCloseTo(0.00218, 5);
    expect(line.start + back * line.slope).toBeCloseTo(-0.1712, 4);
    expect(Math.sqrt(line.slopeVariance)).toBeCloseTo(0.00067, 5);
    const variance = line.startVariance + 2 * back * line.covariance + back ** 2 * line.slopeVariance;
    expect(Math.sqrt(variance)).toBeCloseTo(0.0029, 4);
    const correlation = (line.covariance + back * line.slopeVariance) / Math.sqrt(variance * line.slopeVariance);
    expect(correlation).toBeCloseTo(-0.93, 2);
  });
});
