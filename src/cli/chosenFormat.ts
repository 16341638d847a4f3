// Which format a command writes: the one named, else that of the file's ending, else the command's own.

import { accepted, nearestWord, type Read, type Refusal, refused } from "../quantity/index.ts";

export interface FormatFlags {
  readonly format?: string;
  readonly json?: boolean;
  readonly output?: string;
}

/** Other endings of the same format. */
const ENDINGS: Readonly<Record<string, string>> = { htm: "html", markdown: "md" };

/** The ending of a file's name, small; null where it has none, or is no file. */
export const endingOf = (output: string | undefined): string | null =>
  /[^/]\.([a-z][a-z0-9]*)$/i.exec(output ?? "")?.[1]?.toLowerCase() ?? null;

/** An ending that the command does not write: a file that says what it is not. */
export const strangeEnding = (output: string | undefined, formats: readonly string[]): Refusal => ({
  code: "bad-choice",
  place: { field: "--output" },
  read: JSON.stringify(output),
  want: `an ending of ${formats.map((one) => `.${one}`).join(", ")}; or --format beside it, whatever the name`,
});

/**
 * --json is the format json. Refused: a name that is none of the formats, with the nearest; --json beside another format; an
 * ending of none of the formats, unless a format is named.
 */
export function chosenFormat<F extends string>(
  { format, json, output }: FormatFlags,
  formats: readonly F[],
  own: F,
): Read<F> {
  const written = endingOf(output);
  const ending = formats.find((one) => one === (ENDINGS[written ?? ""] ?? written));
  if (format === undefined && !json && written !== null && ending === undefined)
    return refused(strangeEnding(output, formats));
  const wanted = format?.toLowerCase() ?? (json ? "json" : (ending ?? own));
  const found = formats.find((one) => one === wanted);
  if (found !== undefined && json && found !== "json") {
    const want = "one of the two: --json is --format json";
    return refused({ code: "contradiction", place: { field: "--format" }, read: `${found} beside --json`, want });
  }
  if (found !== undefined) return accepted(found);
  const near = nearestWord(wanted, formats);
  const want = `${near === null ? "" : `perhaps ${JSON.stringify(near)}; `}one of ${formats.join(", ")}`;
  return refused({ code: "bad-choice", place: { field: "--format" }, read: JSON.stringify(wanted), want });
}
