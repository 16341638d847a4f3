// Which format a command writes: the one named, else that of the file's ending, else the command's own.

import { accepted, nearestWord, type Read, refused } from "../quantity/index.ts";

export interface FormatFlags {
  readonly format?: string;
  readonly json?: boolean;
  readonly output?: string;
}

/** Other endings of the same format. */
const ENDINGS: Readonly<Record<string, string>> = { htm: "html", markdown: "md" };

/** --json is the format json. Refused: a name that is none of the formats, with the nearest. */
export function chosenFormat<F extends string>(
  { format, json, output }: FormatFlags,
  formats: readonly F[],
  own: F,
): Read<F> {
  const written = /\.([a-z]+)$/i.exec(output ?? "")?.[1]?.toLowerCase() ?? "";
  const ending = formats.find((one) => one === (ENDINGS[written] ?? written));
  const wanted = format?.toLowerCase() ?? (json ? "json" : (ending ?? own));
  const found = formats.find((one) => one === wanted);
  if (found !== undefined) return accepted(found);
  const near = nearestWord(wanted, formats);
  const want = `${near === null ? "" : `perhaps ${JSON.stringify(near)}; `}one of ${formats.join(", ")}`;
  return refused({ code: "bad-choice", place: { field: "--format" }, read: JSON.stringify(wanted), want });
}
