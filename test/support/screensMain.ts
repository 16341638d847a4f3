// A small entry that joins the screens to the demo catalogues and real files, for trying them through a terminal.
import { existsSync, readdirSync, readFileSync, renameSync, writeFileSync, writeSync } from "node:fs";
import { join } from "node:path";
import {
  type Capacitor,
  DEFAULT_FAMILY,
  type ResistorFamily,
  readCapacitors,
  readResistors,
} from "../../src/catalog/index.ts";
import { catalogEngine, openScreens } from "../../src/tui/index.ts";

const FOLDER = process.env.SCREENS_CATALOGS ?? "catalogs";
const SESSION = process.env.SCREENS_SESSION ?? "";

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
// One currency only: the demo price lists are asked for by themselves.
const [first] = parts.flatMap(({ currency }) => (currency === undefined ? [] : [currency]));
const oneCurrency = parts.filter(({ currency }) => currency === undefined || currency === first);

const status = await openScreens({
  engine: catalogEngine({ parts: oneCurrency, families: families.length > 0 ? families : [DEFAULT_FAMILY] }),
  stock: { name: FOLDER, parts: oneCurrency.length, faults: 0, note: "invented" },
  brief: { title: "Flash-lamp driver, bench 1", energy: "2.4 kJ", voltage: "2.2 kV", ripple: "100 %" },
  loadSession: () => (SESSION !== "" && existsSync(SESSION) ? readFileSync(SESSION, "utf8") : null),
  saveSession: (text) => {
    try {
      if (SESSION !== "") writeFileSync(SESSION, text);
      return null;
    } catch (error) {
      return (error as Error).message;
    }
  },
  keepSession: () => {
    renameSync(SESSION, `${SESSION}.unread`);
    return `${SESSION}.unread`;
  },
  exportBill: (_brief, layout, path, replace) => {
    if (!replace && existsSync(path)) return { kind: "exists", path };
    try {
      writeFileSync(path, `${layout.id}\n`);
      return { kind: "saved", path };
    } catch (error) {
      return { kind: "trouble", words: (error as Error).message };
    }
  },
  complain: (line) => process.stderr.write(`${line}\n`),
  stdin: process.stdin,
  stdout: process.stdout,
  writeSync: (text) => {
    writeSync(1, text);
  },
  process,
  env: process.env,
}).catch((fault: unknown) => {
  process.stderr.write(`${fault instanceof Error ? fault.stack : String(fault)}\n`);
  return 70;
});
process.exit(status);
