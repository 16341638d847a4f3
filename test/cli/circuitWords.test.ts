import { expect, test } from "vitest";
import {
  busWords,
  chargerWords,
  clampWords,
  isolatingWords,
  limitWords,
  loadWords,
  sectionWords,
  switchWords,
} from "../../src/cli/circuitWords.ts";
import { shotBrief } from "../support/shotBank.ts";

test("loads in words", () => {
  const words = (load: unknown) => loadWords(shotBrief({ load }));
  expect(words({ resistance: 0.9, inductance: "25 uH" })).toBe("900 mohm, 25 µH");
  expect(words({ short: "yes" })).toBe("a dead short");
  expect(words({ current: "10 A", time: "1 ms" })).toBe("10 A for 1 ms");
  expect(
    words({
      recorded: [
        [0, 0],
        [1, 1],
      ],
    }),
  ).toBe("a recorded current of 2 samples");
  const lamp = { bore: "8 mm", arc: "100 mm", gas: "krypton", pressure: "60 kPa", count: 2 };
  expect(words({ lamp, width: "1 ms" })).toMatch(/^2 lamps in series, each bore 8 mm.*sized for a pulse of 1 ms/);
  expect(loadWords(shotBrief({ load: undefined }))).toBeNull();
});

test("switch, bus, clamp, charger and limits; null where not given", () => {
  const bare = shotBrief();
  for (const words of [switchWords, busWords, clampWords, chargerWords, limitWords]) expect(words(bare)).toBeNull();
  expect(switchWords(shotBrief({ switch: { drop: 2, oneWay: true } }))).toBe("drop 2 V, 0 ohm, blocks reverse current");
  expect(busWords(shotBrief({ bus: { resistance: 0.001, inductance: 1e-7 } }))).toBe("1 mohm, 100 nH");
  const coax = { shape: "coax", inner: 0.002, outer: 0.006, wall: 0.001, length: 1 };
  expect(busWords(shotBrief({ bus: coax }))).toBe("coax of copper, length 1 m, inner 2 mm, outer 6 mm, wall 1 mm");
  expect(clampWords(shotBrief({ clamp: { drop: 1 } }))).toBe("drop 1 V, 0 ohm");
  expect(chargerWords(shotBrief({ charger: { supply: "3 kV", resistance: "1 kohm" } }))).toBe("3 kV behind 1 kohm");
  expect(limitWords(shotBrief({ maxPeakCurrent: "80 %", maxFaultEnergy: "50 J" }))).toBe(
    "peak 80 % of its rating, into a shorted unit 50 J",
  );
});

test("protection and the place on the bus in words", () => {
  expect(isolatingWords(shotBrief())).toBeNull();
  expect(isolatingWords(shotBrief({ isolating: "50 mohm", isolatingPrice: 1.2 }))).toBe("50 mohm, 1.2 each");
  expect(sectionWords(shotBrief({ section: { inductance: "1 uH" } }))).toBe("1 µH");
  const step = { stepResistance: "50 uohm", stepInductance: "10 nH" };
  expect(busWords(shotBrief({ bus: { resistance: 0, inductance: 0, feed: "centre", ...step } }))).toMatch(
    /fed at the centre, 50 µohm and 10 nH from unit to unit/,
  );
  const pair = { shape: "wire pair", length: "1 m", radius: "1 mm", spacing: "10 mm", feed: "end", pitch: "80 mm" };
  expect(busWords(shotBrief({ bus: pair }))).toMatch(/fed at one end, pitch 80 mm$/);
});
