// How light the terminal's ground is: from its environment, or from its own answer to the question.
import { luminance, type PaletteName } from "./palettes.ts";

export type Ground = "dark" | "light" | "unknown";

/** Asks the terminal for its ground; one that does not know the question says nothing. */
export const ASK_GROUND = "\x1b]11;?\x1b\\";

/** Grounds between these are neither: colours that are legible on both ends are not on them, and plain ink is. */
const DARK_UP_TO = 0.06;
const LIGHT_FROM = 0.7;

/** The ground that a terminal told, `rgb:` and hexadecimal parts of one to four digits; null for anything else. */
export function groundTold(report: string): Ground | null {
  const match = /^\x1b\]11;rgba?:([0-9a-f]{1,4})\/([0-9a-f]{1,4})\/([0-9a-f]{1,4})/i.exec(report);
  if (match === null) return null;
  const part = (hex: string): number => (Number.parseInt(hex, 16) / Number.parseInt("f".repeat(hex.length), 16)) * 255;
  const light = luminance([part(match[1] ?? "0"), part(match[2] ?? "0"), part(match[3] ?? "0")]);
  return light <= DARK_UP_TO ? "dark" : light >= LIGHT_FROM ? "light" : "unknown";
}

/** COLORFGBG is "ink;ground" in numbers of the sixteen, as some terminals set it. */
export function groundOf(env: Readonly<Record<string, string | undefined>>): Ground {
  const number = /;(\d{1,2})$/.exec(env.COLORFGBG ?? "")?.[1];
  if (number !== undefined) return number === "7" || number === "15" ? "light" : number === "0" ? "dark" : "unknown";
  return env.TERM === "linux" ? "dark" : "unknown";
}

/** Whether the terminal has the fixed colours beyond its own sixteen. */
export const isDeep = ({ TERM = "", COLORTERM = "" }: Readonly<Record<string, string | undefined>>): boolean =>
  /256color|direct/.test(TERM) || COLORTERM !== "";

export const paletteFor = (ground: Ground, deep: boolean): PaletteName =>
  `${ground === "unknown" ? "any" : ground}${deep ? "256" : "16"}`;
