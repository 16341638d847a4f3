// skin: depths with published values.
import { describe, expect, test } from "vitest";
import { pulseFrequency, RESISTIVITY, skinDepth } from "../../src/pulse/skin.ts";
import { near } from "./near.ts";

describe("skinDepth({ resistivity, frequency })", () => {
  test("worked: copper at 8761.19127 Hz is 0.706 mm, at 50 Hz 9.3458 mm", () => {
    near(skinDepth({ resistivity: RESISTIVITY.copper, frequency: 8761.19127 }), 7.06024508e-4);
    near(skinDepth({ resistivity: RESISTIVITY.copper, frequency: 50 }), 9.34579726e-3);
  });

  // A skin-depth page gives 0.46 mm for copper at 20 kHz, to its two digits.
  test("published: 0.46 mm at 20 kHz, and 503.29 sqrt(rho/f)", () => {
    near(skinDepth({ resistivity: 1.7e-8, frequency: 20e3 }), 0.46e-3, 0.01);
    near(skinDepth({ resistivity: 1, frequency: 1 }), 503.29, 1e-5);
  });
});

describe("pulseFrequency(peaks)", () => {
  test("the ring, else a quarter over the peak time, else none", () => {
    expect(pulseFrequency({ ringFrequency: 4774, peakTime: 1 })).toBe(4774);
    expect(pulseFrequency({ ringFrequency: null, peakTime: 5e-5 })).toBe(5000);
    expect(pulseFrequency({ ringFrequency: null, peakTime: 0 })).toBeNull();
  });
});
