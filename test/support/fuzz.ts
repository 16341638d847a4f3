// Mutated input for every reader, and what must hold whatever was read: no throw, every accepted number inside its schema, every fault placed.
import { readdirSync, readFileSync } from "node:fs";
import { join, resolve } from "node:path";
import {
  type Capacitor,
  readCapacitorData,
  readCapacitors,
  readFuses,
  readMeasured,
  readPositions,
  readReadings,
  readResistors,
  readWaveform,
} from "../../src/catalog/index.ts";
import { readJson } from "../../src/cli/jsonText.ts";
import { readEditedBill } from "../../src/order/index.ts";
import type { Read, Refusal } from "../../src/quantity/index.ts";
import { readBrief } from "../../src/search/index.ts";
import { readSaved, savedText } from "../../src/tui/saved.ts";
import type { Chance } from "./random.ts";

const ROOT = resolve(import.meta.dirname, "../..");
const FILE = "given";

/** What came of one input: what broke a law, or null; and whether anything was accepted, so that a fuzz of nothing but refusals shows. */
export interface Verdict {
  readonly broken: string | null;
  readonly accepted: boolean;
}

export interface Target {
  readonly name: string;
  readonly seeds: readonly string[];
  readonly read: (text: string) => Verdict;
}

function texts(folder: string, ending: string): readonly string[] {
  const names = readdirSync(join(ROOT, folder), { recursive: true, encoding: "utf8" }).filter((n) =>
    n.endsWith(ending),
  );
  return names.sort().map((name) => readFileSync(join(ROOT, folder, name), "utf8").slice(0, 4000));
}

/** A number that is none, anywhere inside; `lasting` may be for ever. */
function oddNumber(value: unknown, path = "", lasting: readonly string[] = []): string | null {
  if (typeof value === "number") {
    if (Number.isFinite(value) || (value === Number.POSITIVE_INFINITY && lasting.includes(path))) return null;
    return `${path} is ${value}`;
  }
  if (typeof value !== "object" || value === null) return null;
  for (const [key, inner] of Object.entries(value)) {
    const found = oddNumber(inner, path === "" ? key : `${path}.${key}`, lasting);
    if (found !== null) return found;
  }
  return null;
}

/** A refusal without its file, or of one row without its line. */
function badPlace(faults: readonly Refusal[], text: string): string | null {
  const lines = text.split(/\r\n|\r|\n/).length;
  for (const { code, place, read, want } of faults) {
    if (place.file !== FILE) return `${code} without its file`;
    if (place.line !== undefined && !(place.line >= 1 && place.line <= lines + 1))
      return `${code} at line ${place.line} of ${lines}`;
    if (place.column !== undefined && !(place.column >= 1)) return `${code} at column ${place.column}`;
    if (place.line === undefined && !WHOLE.has(code)) return `${code} without its line`;
    if (read === "" || want === "") return `${code} without words`;
  }
  return null;
}

/** Faults of a file as a whole, which stand on no line. */
const WHOLE = new Set(["empty-file", "no-rows", "more-faults", "binary-file", "row-too-wide"]);

interface Table {
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
}

/** Judges a reader of tables; `odd` looks at what was accepted. */
const table =
  <T extends Table>(read: (text: string, file: string) => Read<T>, odd: (value: T) => string | null) =>
  (text: string): Verdict => {
    const got = read(text, FILE);
    if (!got.ok) return { broken: badPlace(got.refusals, text), accepted: false };
    const { faults, notes } = got.value;
    return { broken: badPlace([...faults, ...notes], text) ?? odd(got.value), accepted: true };
  };

/** Every row through the schema that guards capacitors given as data; a leakage that the rule assumed has no range, only one that was written. */
function oddParts({ parts }: { readonly parts: readonly Capacitor[] }): string | null {
  for (const part of parts) {
    const known = Object.fromEntries(
      Object.entries(part).filter(
        ([key, value]) => value !== undefined && !(key === "leakage" && part.states[key]?.state === "assumed"),
      ),
    );
    const checked = readCapacitorData(known);
    if (!checked.ok) return JSON.stringify(checked.refusals[0]);
  }
  return null;
}

function brief(text: string): Verdict {
  const json = readJson(text, FILE);
  if (!json.ok) return { broken: badPlace(json.refusals, text), accepted: false };
  const read = readBrief(json.value.value, FILE);
  if (!read.ok) {
    const bare = read.refusals.find(({ place }) => place.file !== FILE);
    return { broken: bare === undefined ? null : `${bare.code} without its file`, accepted: false };
  }
  const { energy, voltage, ripple } = read.value;
  const outside = !(energy > 0 && voltage > 0 && ripple > 0 && ripple <= 1);
  return {
    broken: outside ? "energy, voltage or ripple outside their ranges" : oddNumber(read.value, "", ["hold"]),
    accepted: true,
  };
}

function saved(text: string): Verdict {
  const read = readSaved(text);
  if (read === null) return { broken: null, accepted: false };
  const again = readSaved(savedText(read as Parameters<typeof savedText>[0]));
  const same = JSON.stringify(again) === JSON.stringify(read);
  return { broken: same ? null : "what was read does not come back the same", accepted: true };
}

const SAVED = JSON.stringify({
  version: 1,
  values: { energy: "2.4 kJ", voltage: "2.2 kV", ripple: "100 %" },
  extra: { hold: "30 s" },
  pins: [{ part: "drawer-pf-330-360", series: 7, parallel: 3, ties: "strings" }],
  chosen: { part: "drawer-pf-330-360", series: 7, parallel: 3, ties: "cross-tied" },
  rank: "cost",
  frontOnly: false,
  screen: "layouts",
  selected: 3,
});
const READINGS =
  "time [s],charge voltage [V],stage,voltage [V],current [mA]\n0,220,1,55.1,\n0,220,2,54.9,1.2\n30,220,3,55,\n";
const WAVEFORM = "time [us];current [A]\n0;0\n1,5;1200\n3;2400\n9;-20\n";
const LIST = "serial,stage,string\nu1,1,1\nu2,2,1\nu3,spare,\n";

/** Every reader of files, with good and bad seeds. */
export const TARGETS: readonly Target[] = [
  {
    name: "capacitors",
    seeds: [...texts("fixtures/catalogs", ".csv"), ...texts("catalogs", ".csv")],
    read: table(readCapacitors, oddParts),
  },
  {
    name: "resistors",
    seeds: texts("catalogs", "resistors.csv"),
    read: table(readResistors, ({ families }) => oddNumber(families)),
  },
  { name: "fuses", seeds: texts("catalogs", "fuses.csv"), read: table(readFuses, ({ fuses }) => oddNumber(fuses)) },
  {
    name: "measured units",
    seeds: texts("fixtures/units", ".csv"),
    read: table(readMeasured, ({ units }) => oddNumber(units)),
  },
  { name: "readings", seeds: [READINGS], read: table(readReadings, ({ readings }) => oddNumber(readings)) },
  { name: "positions", seeds: [LIST], read: table(readPositions, (list) => oddNumber(list)) },
  {
    name: "waveform",
    seeds: [WAVEFORM],
    read: table(
      (text, file) => {
        const got = readWaveform(text, file);
        return got.ok ? { ok: true, value: { rows: got.value, faults: [], notes: [] } } : got;
      },
      ({ rows }) => oddNumber(rows),
    ),
  },
  { name: "brief", seeds: texts("fixtures/briefs", ".json"), read: brief },
  { name: "saved screens", seeds: [SAVED], read: saved },
  {
    name: "edited bill",
    seeds: texts("fixtures/versions", ".csv"),
    read: table(
      (text, file) => {
        const got = readEditedBill(text, file);
        return got.ok ? { ok: true, value: { rows: got.value.rows, faults: [], notes: [] } } : got;
      },
      ({ rows }) => oddNumber(rows.flatMap(({ cells }) => [...cells.values()].map(({ value }) => value))),
    ),
  },
];

/** Pieces that readers stumble over. */
const TOKENS = [
  '"',
  '""',
  ",",
  ";",
  "\t",
  "\n",
  "\r",
  "\r\n",
  "\u0000",
  "\u202e",
  "\u200b",
  "\ufeff",
  "\u2028",
  "\ud800",
  "-",
  "+",
  ".",
  "e",
  "1e999",
  "1e-999",
  "-0",
  "NaN",
  "Infinity",
  "٣",
  "µ",
  "μ",
  "kV",
  "m",
  "%",
  "±20 %",
  "-10/+50 %",
  "__proto__",
  "constructor",
  "toString",
  "=1+1",
  "<script>",
  "{",
  "}",
  "[",
  "]",
  "null",
  "true",
  "[V]",
  "[uF]",
  "part",
  "9".repeat(400),
  "0x10",
  "1_000",
  "1,500",
  "1.500",
  "4m7",
] as const;

/** Values of a brief, some of them good ones. */
const VALUES = [
  '"2.2 kV"',
  '"1 J"',
  '"50 %"',
  '"for ever"',
  '"3 s"',
  '"statistical"',
  "1e-3",
  "0.5",
  "1",
  "-5",
  "1e400",
  "null",
  "{}",
  "[1]",
];

/** One to six changes: cut, doubled, overwritten, a stumbling piece, another seed's end. */
export function mutated(seeds: readonly string[], c: Chance): string {
  let text = c.pick(seeds);
  for (let left = c.whole(1, 6); left > 0; left--) {
    const at = c.whole(0, text.length);
    const to = Math.min(text.length, at + c.whole(0, c.maybe(0.2) ? 400 : 8));
    switch (c.whole(0, 6)) {
      case 0:
        text = text.slice(0, at) + text.slice(to);
        break;
      case 1:
        text = text.slice(0, to) + text.slice(at);
        break;
      case 2:
        text = text.slice(0, at) + String.fromCharCode(c.whole(0, c.maybe(0.1) ? 0xffff : 0x7e)) + text.slice(at + 1);
        break;
      case 3:
        text = text.slice(0, at) + c.pick(TOKENS) + text.slice(c.maybe(0.5) ? at : to);
        break;
      case 4:
        text = text.slice(0, at) + c.pick(seeds).slice(c.whole(0, 4000));
        break;
      case 5:
        text = text.replace(/[0-9]+/, c.pick(TOKENS));
        break;
      default:
        text = c.maybe(0.1)
          ? text.slice(0, at)
          : text.slice(0, at) + text.slice(at).replace(/: *("[^"]*"|[-0-9.e]+)/, `: ${c.pick(VALUES)}`);
    }
  }
  return text.slice(0, 8000);
}

/** Reads one mutated input; a throw is a broken law. */
export function tried({ read, seeds }: Target, c: Chance): Verdict & { readonly text: string } {
  const text = mutated(seeds, c);
  try {
    return { ...read(text), text };
  } catch (error) {
    return { broken: `threw ${error instanceof Error ? error.message : String(error)}`, accepted: false, text };
  }
}
