// Decides from the environment whether the screens can be shown, and in which colours and glyphs.

import { type Ground, groundOf, isDeep, paletteFor } from "./ground.ts";
import type { PaletteName } from "./palettes.ts";

export interface TerminalFacts {
  readonly env: Readonly<Record<string, string | undefined>>;
  readonly inputIsTerminal: boolean;
  readonly outputIsTerminal: boolean;
  /** Asked for on the command line. */
  readonly ascii?: boolean;
  readonly ground?: Ground;
}

export interface Look {
  readonly colour: boolean;
  /** Only letters and marks of ASCII. */
  readonly ascii: boolean;
  /** Which colours; absent: those for any ground. */
  readonly palette?: PaletteName;
}

/** Why the screens cannot be shown here, as one line with the way out; null when they can. */
export function screenTrouble({ env, inputIsTerminal, outputIsTerminal }: TerminalFacts): string | null {
  const way = "use a command such as `joulewright plan`, which prints plain text";
  if (!inputIsTerminal) return `The screens need a keyboard, and standard input is not a terminal: ${way}.`;
  if (!outputIsTerminal) return `The screens need a terminal, and standard output is not one: ${way}.`;
  if (env.TERM === "dumb") return `The screens need a terminal that can place text, and TERM is "dumb": ${way}.`;
  return null;
}

/**
 * NO_COLOR (set and not empty) takes colours away; FORCE_COLOR beats it, and FORCE_COLOR=0 or =false takes them away too.
 * A locale that is not UTF-8 gets ASCII; with no locale at all UTF-8 is assumed, as most terminals now do.
 */
export function terminalLook({ env, ascii, ground }: TerminalFacts): Look {
  const force = env.FORCE_COLOR;
  const forced = force === undefined ? null : force !== "0" && force !== "false";
  const colour = forced ?? !(env.NO_COLOR ?? "");
  const locale = env.LC_ALL || env.LC_CTYPE || env.LANG || "";
  const old = locale !== "" && !/utf-?8/i.test(locale) && !/^(C|POSIX)$/.test(locale);
  const palette = paletteFor(ground ?? groundOf(env), isDeep(env));
  return { colour, ascii: ascii ?? (old || env.TERM === "linux"), palette };
}
