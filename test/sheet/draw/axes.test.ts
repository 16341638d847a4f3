import { expect, test } from "vitest";
import { apart, axesInk } from "../../../src/sheet/draw/axes.ts";
import { linearScale } from "../../../src/sheet/draw/scales.ts";
import fc from "../../support/property.ts";

test("axesInk(given): a tick and its words at each round value, a title to each axis", () => {
  const horizontal = linearScale({ low: 0, high: 10, from: 50, to: 150 });
  const vertical = linearScale({ low: 0, high: 4, from: 100, to: 20 });
  const ink = axesInk({
    left: 50,
    right: 150,
    top: 20,
    bottom: 100,
    horizontal: { scale: horizontal, ticks: [0, 5, 10], words: (value) => `${value} s`, title: "Time" },
    vertical: { scale: vertical, ticks: [0, 4], words: (value) => `${value} V`, title: "Voltage" },
  });
  expect(ink.wires).toHaveLength(2 + 3 + 2);
  expect(ink.words!.map(({ text }) => text)).toEqual(["Voltage", "Time", "0 s", "5 s", "10 s", "0 V", "4 V"]);
  expect(ink.words!.find(({ text }) => text === "5 s")!.x).toBe(100);
  expect(ink.curves![0]!.d).toBe("M50 100.0H150M50 20.0H150");
});

test("apart(heights, least): none nearer than least, order kept, untouched where there is room", () => {
  expect(apart([10, 40], 9)).toEqual([10, 40]);
  expect(apart([40, 38, 10], 9)).toEqual([47, 38, 10]);
  fc.assert(
    fc.property(fc.array(fc.integer({ min: 0, max: 300 }), { maxLength: 12 }), (heights) => {
      const moved = apart(heights, 9).toSorted((a, b) => a - b);
      for (let index = 1; index < moved.length; index += 1)
        expect(moved[index]! - moved[index - 1]!).toBeGreaterThanOrEqual(9);
    }),
  );
});
