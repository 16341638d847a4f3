// The one blend that a command is about: `A 6s10p cross-tied + B 2s3p strings`, as a plan prints it, or an element of its blends.

import { type Layout, layoutId, plainTies, type Ties } from "../bank/index.ts";
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { Files } from "./files.ts";
import { readJson } from "./jsonText.ts";
import { type LayoutFlags, MOST_COUNT } from "./layoutInput.ts";

export interface GroupInput {
  readonly layout: Layout;
  /** Family of the resistors that the file's group has; null where it has none or nothing is said. */
  readonly family: string | null;
}

const WANT = '"PART 6s10p cross-tied + PART 2s3p strings", each part once';

const refuse = (code: string, field: string, read: string, want = WANT): Read<never> =>
  refused({ code, place: { field }, read, want });

/** Part, shape and ties; the ties may be left out where there is one in series or in parallel. */
const GROUP = /^(.+?)\s+(\d{1,7})s(\d{1,7})p(?:\s+(cross-tied|strings))?(?:\s*\+\s*|\s*$)/;

/** Reads the text of a blend: names of parts may hold spaces and plus signs. */
export function readBlendText(text: string): Read<readonly GroupInput[]> {
  const groups: GroupInput[] = [];
  for (let rest = text.trim(); rest !== ""; ) {
    const found = GROUP.exec(rest);
    if (found === null) return refuse("bad-blend", "--blend", JSON.stringify(rest));
    const [whole, part = "", series, parallel, ties] = found;
    const layout = groupOf(part, Number(series), Number(parallel), ties);
    if (layout === null) return refuse("bad-blend", "--blend", JSON.stringify(whole.trim()));
    groups.push({ layout, family: null });
    rest = rest.slice(whole.length);
    if (rest === "" && /\+\s*$/.test(whole)) return refuse("bad-blend", "--blend", JSON.stringify(text));
  }
  return groups.length === 0 ? refuse("bad-blend", "--blend", JSON.stringify(text)) : eachOnce(groups, "--blend");
}

function groupOf(part: string, series: number, parallel: number, ties: unknown): Layout | null {
  const counts = [series, parallel].every((n) => Number.isInteger(n) && n >= 1 && n <= MOST_COUNT);
  const alone = series === 1 || parallel === 1;
  const known = ties === "cross-tied" || ties === "strings" || (ties === undefined && alone);
  if (part === "" || !counts || !known) return null;
  return plainTies({ part, series, parallel, ties: (ties ?? "strings") as Ties });
}

/** A part in two groups would share its stock between them. */
function eachOnce(groups: readonly GroupInput[], field: string): Read<readonly GroupInput[]> {
  const names = groups.map(({ layout }) => layout.part);
  const twice = names.find((name, at) => names.indexOf(name) !== at);
  return twice === undefined
    ? accepted(groups)
    : refuse("bad-blend", field, `${JSON.stringify(twice)} twice`, "each part in one group");
}

/** True when the flags speak of a blend; a file is looked into. */
export function readBlendGroups(
  flags: LayoutFlags & { readonly blend?: string },
  files: Files,
): Read<readonly GroupInput[] | null> {
  if (flags.blend !== undefined) {
    const extra = (["part", "series", "parallel", "ties", "layout", "balance", "balanceTolerance"] as const).filter(
      (name) => flags[name] !== undefined,
    );
    if (extra.length === 0) return readBlendText(flags.blend);
    return refuse("contradiction", "--blend", `also --${extra[0]}`, "either --blend or the flags of one layout");
  }
  // Standard input is read once, by whoever reads layouts.
  if (flags.layout === undefined || flags.layout === "-") return accepted(null);
  const text = files.read(flags.layout);
  if (!text.ok) return accepted(null);
  const json = readJson(text.value, flags.layout);
  if (!json.ok) return accepted(null);
  const value = json.value.value as { readonly strings?: unknown } | null;
  const strings = typeof value === "object" && value !== null ? value.strings : undefined;
  if (!Array.isArray(strings)) return accepted(null);
  if (flags.balance !== undefined) {
    return refuse(
      "contradiction",
      "--balance",
      "a blend in --layout",
      "no --balance: each group has its own resistors",
    );
  }
  return fromStrings(strings, flags.layout);
}

function fromStrings(strings: readonly unknown[], file: string): Read<readonly GroupInput[]> {
  const faults: Refusal[] = [];
  const groups = strings.flatMap((one, at): GroupInput[] => {
    const { part, series, parallel, ties, balance } = (one ?? {}) as Readonly<Record<string, unknown>>;
    const layout = groupOf(typeof part === "string" ? part : "", Number(series), Number(parallel), ties);
    const family = (balance as { readonly family?: unknown } | null | undefined)?.family;
    if (layout !== null) return [{ layout, family: typeof family === "string" ? family : null }];
    const want = "part, series, parallel and ties of a group";
    faults.push({ code: "bad-layout", place: { file, field: `strings[${at}]` }, read: "something else", want });
    return [];
  });
  if (faults.length > 0) return refused(...faults);
  if (groups.length === 0) return refuse("bad-layout", file, "no groups", "at least one group of strings");
  return eachOnce(groups, file);
}

/** The blend's name, as a plan prints it. */
export const blendName = (groups: readonly GroupInput[]): string =>
  groups.map(({ layout }) => layoutId(layout)).join(" + ");
