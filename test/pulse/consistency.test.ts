// consistency: the published pair, one plausible and one not, and numbers made by the closed form itself.

import { describe, expect, test } from "vitest";
import { checkStated, frequencyGain } from "../../src/pulse/consistency.ts";
import { peaksOf } from "../../src/pulse/peaks.ts";
import fc from "../support/property.ts";
import { got, near } from "./near.ts";

const stated = { capacitance: 66e-6, voltage: 2200, peakCurrent: null, ringFrequency: null, loss: null };

describe("checkStated(stated)", () => {
  test("nothing stated is not assessed", () => expect(checkStated(stated).verdict).toBe("not assessed"));

  // Two stimulator sources of a review table (PMC7610606, table II), as its authors state them.
  test("published, first source: 66 uF, 2.2 kV, 5 kA, 20.2 J lost is plausible", () => {
    const check = checkStated({ ...stated, peakCurrent: 5000, loss: 20.2 });
    expect(check.verdict).toBe("plausible");
    near(check.stored, 159.72, 1e-12);
    near(check.largestInductance, 12.8e-6, 3e-3);
    near(check.leastFrequency, 5.5e3, 5e-3); // printed as about 5.5 kHz
    near(check.lossFraction, 0.13, 0.03);
  });

  test("published, second source: 66 uF, 720 V, 1.66 kA at 4.97 kHz, 10.8 J lost is inconsistent", () => {
    const check = checkStated({ ...stated, voltage: 720, peakCurrent: 1660, ringFrequency: 4970, loss: 10.8 });
    expect(check.verdict).toBe("inconsistent");
    near(check.losslessPeak, 1484, 1e-3);
    expect(check.findings.find(({ verdict }) => verdict === "fail")?.id).toBe("pulse.stated.peak");
  });

  test("more lost than was stored is inconsistent, with no frequency at all", () => {
    expect(checkStated({ ...stated, loss: 170 }).verdict).toBe("inconsistent");
  });

  test("what a real ring states of itself, up to a damping of 0.9, is never called inconsistent", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.001, max: 0.9, noNaN: true }), fc.boolean(), (damping, told) => {
        const peaks = got(peaksOf({ capacitance: 1e-4, inductance: 1e-6, resistance: 0.2 * damping }, 1000));
        const check = checkStated({
          capacitance: 1e-4,
          voltage: 1000,
          peakCurrent: peaks.peakCurrent,
          ringFrequency: peaks.ringFrequency,
          loss: told ? peaks.stored * (1 - peaks.reversal ** 2) : null,
        });
        expect(check.verdict).toBe("plausible");
      }),
    );
  });
});

describe("frequencyGain(lossFraction)", () => {
  test("one without a loss and for any loss short of nearly all", () => {
    expect(frequencyGain(null)).toBe(1);
    expect(frequencyGain(0)).toBe(1);
    expect(frequencyGain(0.63)).toBe(1);
    expect(frequencyGain(1 - 1e-9)).toBeGreaterThan(1);
  });
});
