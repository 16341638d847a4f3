// A small entry that joins the screens to the demo catalogues and real files, for trying them through a terminal.
import { existsSync, readdirSync, readFileSync, writeSync } from "node:fs";
import { join } from "node:path";
import {
  type Capacitor,
  DEFAULT_FAMILY,
  type ResistorFamily,
  readCapacitors,
  readResistors,
} from "../../src/catalog/index.ts";
import { filesOn } from "../../src/cli/index.ts";
import { startScreens } from "../../src/tui/index.ts";

const FOLDER = process.env["SCREENS_CATALOGS"] ?? "catalogs";

const parts: Capacitor[] = [];
const families: ResistorFamily[] = [];
for (const name of existsSync(FOLDER) ? readdirSync(FOLDER).sort() : []) {
  if (!name.endsWith(".csv") || name.startsWith("fuses")) continue;
  const text = readFileSync(join(FOLDER, name), "utf8");
  if (name.startsWith("resistors")) {
    const read = readResistors(text, name);
    if (read.ok) families.push(...read.value.families);
  } else {
    const read = readCapacitors(text, name);
    if (read.ok) parts.push(...read.value.parts);
  }
}

process.exit(
  await startScreens({
    parts,
    families: families.length > 0 ? families : [DEFAULT_FAMILY],
    stock: { name: FOLDER, parts: parts.length, faults: 0, note: "invented" },
    brief: { title: "Flash-lamp driver, bench 1", energy: "2.4 kJ", voltage: "2.2 kV", ripple: "100 %" },
    files: filesOn(),
    sessionFile: process.env["SCREENS_SESSION"] ?? null,
    terminal: {
      complain: (line) => process.stderr.write(`${line}\n`),
      stdin: process.stdin,
      stdout: process.stdout,
      writeSync: (text) => {
        writeSync(1, text);
      },
      process,
      env: process.env,
    },
  }).catch((fault: unknown) => {
    process.stderr.write(`${fault instanceof Error ? fault.stack : String(fault)}\n`);
    return 70;
  }),
);
