// Contrast of every colour on every ground it may stand on, computed: at least 4.5 to 1 (WCAG 2.2, 1.4.3).
import { describe, expect, test } from "vitest";
import { contrast, inkCode, luminance, PALETTES, type PaletteName, type Rgb, rgbOf } from "../../src/tui/palettes.ts";

/** What the first sixteen look like: the defaults of xterm and of the text mode of PC hardware (both from memory). */
const SIXTEEN: Readonly<Record<string, readonly Rgb[]>> = {
  xterm: [
    [0, 0, 0],
    [205, 0, 0],
    [0, 205, 0],
    [205, 205, 0],
    [0, 0, 238],
    [205, 0, 205],
    [0, 205, 205],
    [229, 229, 229],
    [127, 127, 127],
    [255, 0, 0],
    [0, 255, 0],
    [255, 255, 0],
    [92, 92, 255],
    [255, 0, 255],
    [0, 255, 255],
    [255, 255, 255],
  ],
  hardware: [
    [0, 0, 0],
    [170, 0, 0],
    [0, 170, 0],
    [170, 85, 0],
    [0, 0, 170],
    [170, 0, 170],
    [0, 170, 170],
    [170, 170, 170],
    [85, 85, 85],
    [255, 85, 85],
    [85, 255, 85],
    [255, 255, 85],
    [85, 85, 255],
    [255, 85, 255],
    [85, 255, 255],
    [255, 255, 255],
  ],
};
const BLACK: Rgb = [0, 0, 0];
const WHITE: Rgb = [255, 255, 255];
/** Grounds that people have: pure ones, and soft ones for the palettes that know the side. */
const GROUNDS: Readonly<Record<PaletteName, readonly Rgb[]>> = {
  dark256: [BLACK, [30, 30, 30], [40, 42, 54], [0, 43, 54]],
  light256: [WHITE, [245, 245, 245], [253, 246, 227]],
  any256: [BLACK, WHITE],
  dark16: [BLACK],
  light16: [WHITE],
  any16: [BLACK, WHITE],
};

describe("contrast(one, other)", () => {
  test("black on white is 21, a colour on itself 1, and the order does not matter", () => {
    expect(contrast(BLACK, WHITE)).toBeCloseTo(21, 10);
    expect(contrast(WHITE, BLACK)).toBeCloseTo(21, 10);
    expect(contrast([1, 2, 3], [1, 2, 3])).toBe(1);
  });
  test("the grey that is known to be the lightest at 4.5 on white, #767676; one lighter is under it", () => {
    expect(contrast([0x76, 0x76, 0x76], WHITE)).toBeGreaterThanOrEqual(4.5);
    expect(contrast([0x77, 0x77, 0x77], WHITE)).toBeLessThan(4.5);
    expect(luminance(WHITE)).toBeCloseTo(1, 12);
  });
});

describe("PALETTES", () => {
  const pairs = Object.entries(PALETTES).flatMap(([name, palette]) =>
    Object.entries(palette).flatMap(([hue, number]) =>
      number === null
        ? []
        : GROUNDS[name as PaletteName].flatMap((ground) =>
            (number < 16 ? Object.values(SIXTEEN).map((table) => table[number] as Rgb) : [rgbOf(number)]).map(
              (ink) => [name, hue, number, ground, ink] as const,
            ),
          ),
    ),
  );
  test("there are pairs of every palette but the one that has no colours", () => {
    expect(new Set(pairs.map(([name]) => name)).size).toBe(5);
  });
  test.each(pairs)("%s %s (%i) on %j", (_name, _hue, _number, ground, ink) => {
    expect(contrast(ink, ground)).toBeGreaterThanOrEqual(4.5);
  });
  test("good, warn and bad are never one colour", () => {
    for (const { good, warn, bad } of Object.values(PALETTES)) {
      const set = [good, warn, bad].filter((number) => number !== null);
      expect(new Set(set).size).toBe(set.length);
    }
  });
});

test("rgbOf(number): the cube's ends, its middle, the greys; inkCode(number)", () => {
  expect([16, 231, 67, 232, 255].map(rgbOf)).toEqual([BLACK, WHITE, [95, 135, 175], [8, 8, 8], [238, 238, 238]]);
  expect([1, 9, 114].map(inkCode)).toEqual(["31", "91", "38;5;114"]);
});
