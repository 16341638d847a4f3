// The colours of the screens by what the terminal has and how light its ground is. Each is legible on its grounds: contrast at least 4.5 to 1.
//
// Contrast (L1 + 0.05) / (L2 + 0.05) of relative luminances, as WCAG 2.2 has them (1.4.3 and "relative luminance", from memory).
// Numbers from 16 on are fixed the world over (a cube of six levels and 24 greys); the first sixteen are the terminal's own, so
// few are used, and on an unknown ground none.
import { power } from "../quantity/index.ts";

/** Meanings that have a colour; the rest of the styles live by bold and inverse alone. */
export type Hue = "title" | "quiet" | "good" | "warn" | "bad" | "accent";

/** Numbers of the 256 by meaning; null is the terminal's own ink. */
export type Palette = Readonly<Record<Hue, number | null>>;

export type PaletteName = "dark256" | "light256" | "any256" | "dark16" | "light16" | "any16";

const INK: Palette = { title: null, quiet: null, good: null, warn: null, bad: null, accent: null };

export const PALETTES: Readonly<Record<PaletteName, Palette>> = {
  dark256: { title: 117, quiet: 248, good: 114, warn: 221, bad: 210, accent: 117 },
  light256: { title: 24, quiet: 240, good: 22, warn: 90, bad: 124, accent: 24 },
  // Six of the 240 are legible on black and on white alike.
  any256: { title: 63, quiet: 243, good: 29, warn: 163, bad: 131, accent: 63 },
  dark16: { title: 14, quiet: null, good: 10, warn: 11, bad: 9, accent: 14 },
  light16: { title: 4, quiet: null, good: null, warn: 5, bad: 1, accent: 4 },
  any16: INK,
};

/** The codes that set a colour as ink. */
export function inkCode(number: number): string {
  if (number >= 16) return `38;5;${number}`;
  return String(number < 8 ? 30 + number : 82 + number);
}

const LEVELS = [0, 95, 135, 175, 215, 255] as const;

export type Rgb = readonly [number, number, number];

/** Red, green and blue, 0 to 255, of a number from 16 to 255. */
export function rgbOf(number: number): Rgb {
  if (number >= 232) {
    const grey = 8 + 10 * (number - 232);
    return [grey, grey, grey];
  }
  const at = number - 16;
  const level = (index: number): number => LEVELS[index % 6] ?? 0;
  return [level(Math.floor(at / 36)), level(Math.floor(at / 6)), level(at)];
}

const linear = (part: number): number => {
  const share = part / 255;
  return share <= 0.04045 ? share / 12.92 : power((share + 0.055) / 1.055, 2.4);
};

/** Relative luminance, 0 black to 1 white. */
export const luminance = ([red, green, blue]: Rgb): number =>
  0.2126 * linear(red) + 0.7152 * linear(green) + 0.0722 * linear(blue);

/** Contrast of two colours, 1 to 21. */
export function contrast(one: Rgb, other: Rgb): number {
  const [low, high] = [luminance(one), luminance(other)].sort((a, b) => a - b) as [number, number];
  return (high + 0.05) / (low + 0.05);
}
