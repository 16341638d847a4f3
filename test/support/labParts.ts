// The invented catalogues that come with the program, read once.
import { readFileSync } from "node:fs";
import { resolve } from "node:path";
import { type Capacitor, type ResistorFamily, readCapacitors, readResistors } from "../../src/catalog/index.ts";
import { type Brief, readBrief } from "../../src/search/index.ts";

const ROOT = resolve(import.meta.dirname, "../..");
const load = (path: string): string => readFileSync(resolve(ROOT, path), "utf8");

/** The value of a reading, or an error that shows why there is none. */
export function must<T>(read: { readonly ok: boolean; readonly value?: T }): T {
  if (!read.ok) throw new Error(JSON.stringify(read));
  return read.value as T;
}

export const labParts: readonly Capacitor[] = [
  "electrolytic",
  "film",
  "oil-and-paper",
  "double-layer",
  "home-made",
  "drawer",
].flatMap((file) => must(readCapacitors(load(`catalogs/${file}.csv`), `${file}.csv`)).parts);
export const labResistors: readonly ResistorFamily[] = must(
  readResistors(load("catalogs/resistors.csv"), "resistors.csv"),
).families;
export const fixtureBrief = (file: string): Brief => must(readBrief(JSON.parse(load(`fixtures/briefs/${file}.json`))));
export const briefOf = (over: object): Brief => must(readBrief({ energy: 1, voltage: 400, ripple: 1, ...over }));
