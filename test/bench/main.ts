// All benches in one table: what, measured, promised, kept or not. `npm run bench -- search bank` runs some of the groups.
import { cpus } from "node:os";
import { benchBank } from "./bank.ts";
import { benchBlend } from "./blend.ts";
import { benchPlace } from "./place.ts";
import { benchPlaceRival } from "./placeRival.ts";
import { benchPulse } from "./pulse.ts";
import { benchSearch } from "./search.ts";

interface Row {
  readonly what: string;
  readonly value: number | string;
  readonly promise: string | { readonly limit: number; readonly good: "at least" | "at most" };
}

const GROUPS: Readonly<Record<string, () => readonly Row[] | Promise<readonly Row[]>>> = {
  search: benchSearch,
  bank: benchBank,
  pulse: benchPulse,
  place: async () => [...benchPlace(), ...(await benchPlaceRival())],
  blend: () => benchBlend() as Promise<readonly Row[]>,
};

const figure = (value: number | string): string => (typeof value === "string" ? value : value.toPrecision(3));

function kept({ value, promise }: Row): string {
  if (typeof promise === "string" || typeof value === "string") return "see the promise";
  return (promise.good === "at least" ? value >= promise.limit : value <= promise.limit) ? "kept" : "NOT KEPT";
}

const asked = process.argv.slice(2);
const names = asked.length > 0 ? asked : Object.keys(GROUPS);
console.log(`node ${process.version}, ${cpus().length} cores; ratios within this run`);
console.log("| group | what | measured | promised | |\n| --- | --- | --- | --- | --- |");
for (const name of names) {
  const group = GROUPS[name];
  if (group === undefined) {
    console.error(`no group ${name}; there are ${Object.keys(GROUPS).join(", ")}`);
    process.exitCode = 2;
    continue;
  }
  for (const row of await group()) {
    const { promise } = row;
    const words = typeof promise === "string" ? promise : `${promise.good} ${promise.limit}`;
    console.log(`| ${name} | ${row.what} | ${figure(row.value)} | ${words} | ${kept(row)} |`);
  }
}
