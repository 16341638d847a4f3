// All benches in one table: what, measured, promised, kept or not. `npm run bench -- search bank` runs some of the groups.
import { cpus } from "node:os";
import { benchBank } from "./bank.ts";
import { benchBlend } from "./blend.ts";
import { benchPlace } from "./place.ts";
import { benchPlaceRival } from "./placeRival.ts";
import { benchPulse } from "./pulse.ts";
import { type BenchRow, keptOf, TABLE_HEAD, tableLine } from "./row.ts";
import { benchSearch } from "./search.ts";
import { benchSheet } from "./sheet.ts";
import { benchTui } from "./tui.ts";
import { benchTuiFrames } from "./tuiFrames.ts";

const GROUPS: Readonly<Record<string, () => readonly BenchRow[] | Promise<readonly BenchRow[]>>> = {
  search: () => benchSearch(),
  bank: benchBank,
  pulse: benchPulse,
  place: async () => [...benchPlace(), ...(await benchPlaceRival())],
  sheet: benchSheet,
  blend: () => benchBlend(),
  tui: async () => [...(await benchTui()), ...(await benchTuiFrames())],
};

const asked = process.argv.slice(2);
const names = asked.length > 0 ? asked : Object.keys(GROUPS);
const unknown = names.filter((name) => GROUPS[name] === undefined);
if (unknown.length > 0) {
  console.error(`no group ${unknown.join(", ")}; there are ${Object.keys(GROUPS).join(", ")}`);
  process.exit(2);
}
console.log(`node ${process.version}, ${cpus().length} cores; ratios within this run\n\n${TABLE_HEAD}`);
const count = { kept: 0, "NOT KEPT": 0, "for scale": 0 };
for (const name of names)
  for (const row of (await GROUPS[name]?.()) ?? []) {
    count[keptOf(row)]++;
    console.log(tableLine(name, row));
  }
console.log(`\n${count.kept} kept, ${count["NOT KEPT"]} not kept, ${count["for scale"]} for scale`);
