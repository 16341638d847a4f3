#!/usr/bin/env node
// Joins the commands and the screens; the only place that catches.

import { homedir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { DEMO_CATALOGS, DEMO_RESISTORS, demoBrief, demoFile } from "./cli/demoFiles.ts";
import { EXIT } from "./cli/exit.ts";
import { filesOn, writeNow } from "./cli/files.ts";
import { readJson } from "./cli/jsonText.ts";
import { outputTrouble } from "./cli/output.ts";
import { type Ports, textWidth } from "./cli/ports.ts";
import { openThread } from "./cli/thread.ts";
import { VERSION } from "./cli/version.ts";
import type { Read, Refusal } from "./quantity/index.ts";
import { type ScreenFlags, type StockFacts, screenFlags, startScreens } from "./tui/index.ts";

const isTerminal = (): boolean =>
  process.stdin.isTTY === true && process.stdout.isTTY === true && process.env.TERM !== "dumb";

function portsOfProcess(): Ports {
  return {
    out: (text) => void process.stdout.write(text),
    err: (text) => void process.stderr.write(text),
    columns: textWidth(process.stdout.columns, process.env.COLUMNS),
    files: filesOn(),
    catalogs: fileURLToPath(new URL("../catalogs/", import.meta.url)),
    background: {
      entry: new URL("./worker.js", import.meta.url),
      terminal: process.stderr.isTTY === true,
      onInterrupt: (stop) => {
        process.once("SIGINT", stop);
        return () => void process.removeListener("SIGINT", stop);
      },
    },
  };
}

/** Reads the catalogues that the screens were asked for, else the demo's. */
async function readAsked({ catalog, resistors }: ScreenFlags, ports: Ports, stock: StockFacts) {
  const { readStock } = await import("./cli/stock.ts");
  const at = (name: string): string => demoFile(ports, name);
  // Resistors without capacitors are refused, not passed over.
  const isDemo = catalog.length === 0 && resistors === null;
  const asked = isDemo
    ? { catalog: DEMO_CATALOGS.map(at), resistors: at(DEMO_RESISTORS) }
    : { catalog, resistors: resistors ?? undefined };
  const read = readStock(asked, ports.files);
  if (!read.ok) return read;
  const { parts, families, sources } = read.value;
  const faults = sources.reduce((sum, source) => sum + source.faults.length, 0);
  return { ok: true as const, value: { parts, families, sources, stock: { ...stock, parts: parts.length, faults } } };
}

/** The brief asked for, else the demo's beside the demo's catalogues. */
function briefFor({ brief, catalog }: ScreenFlags, ports: Ports): Read<unknown> {
  if (brief === null && catalog.length > 0) return { ok: true, value: {} };
  const text = brief === null ? null : ports.files.read(brief);
  if (text !== null && !text.ok) return text;
  const json = text === null ? demoBrief(ports) : readJson(text.value, brief ?? "");
  return json.ok ? { ok: true, value: json.value.value } : json;
}

/** The screens; brief and pins are kept in the home folder. */
async function openScreens(flags: ScreenFlags, ports: Ports): Promise<number> {
  const brief = briefFor(flags, ports);
  const tellAll = async (refusals: readonly Refusal[]): Promise<number> =>
    (await import("./cli/tell.ts")).tell(ports, refusals);
  if (!brief.ok) return tellAll(brief.refusals);
  const isDemo = flags.catalog.length === 0;
  const stock = {
    name: isDemo ? "demo catalogues" : flags.catalog.join(", "),
    parts: 0,
    faults: 0,
    note: isDemo ? "invented parts" : "",
  };
  // Resistors alone are refused before anything is opened, whatever stands at the other end.
  const alone = isDemo && flags.resistors !== null ? await readAsked(flags, ports, stock) : null;
  if (alone !== null && !alone.ok) return tellAll(alone.refusals);
  let lost: readonly Refusal[] = [];
  const entry = ports.background?.entry;
  screensAreUp = true;
  const status = await startScreens({
    read: async () => {
      const read = await readAsked(flags, ports, stock);
      if (!read.ok) lost = read.refusals;
      return read;
    },
    watch: (changed) => {
      const watched = [...flags.catalog, ...(flags.resistors === null ? [] : [flags.resistors])].filter(
        (one) => one !== "-",
      );
      const stops = watched.map((path) => ports.files.watch(path, changed));
      return () => {
        for (const stop of stops) stop();
      };
    },
    thread: entry === undefined ? undefined : () => openThread(entry),
    stock,
    brief: brief.value,
    briefFirst: flags.brief !== null,
    files: ports.files,
    sessionFile: process.env.JOULEWRIGHT_SESSION ?? join(homedir(), ".joulewright.json"),
    terminal: {
      complain: (line) => ports.err(`${line}\n`),
      stdin: process.stdin,
      stdout: process.stdout,
      writeSync: writeNow,
      process,
      env: process.env,
      ...(flags.ascii ? { ascii: true } : {}),
      ...(flags.ground === null ? {} : { ground: flags.ground }),
    },
  });
  screensAreUp = false;
  return lost.length > 0 ? tellAll(lost) : status;
}

async function main(argv: readonly string[]): Promise<number> {
  const ports = portsOfProcess();
  const flags = screenFlags(argv);
  if (flags !== null && "missing" in flags) {
    ports.err(`${flags.missing} needs a file after it, and there is none: joulewright ${flags.missing} FILE\n`);
    return EXIT.wrongUse;
  }
  if (flags === null) return (await import("./cli/program.ts")).run(argv, ports);
  if (argv.length > 0 || isTerminal()) return openScreens(flags, ports);
  return (await import("./cli/demo.ts")).demoCommand(ports);
}

/** The screens own the terminal: they see its loss themselves, and save before they end. */
let screensAreUp = false;

process.stdout.on("error", (error: NodeJS.ErrnoException) => {
  if (screensAreUp) return;
  const { status, words } = outputTrouble(error);
  if (words !== "") process.stderr.write(words);
  process.exit(status);
});
// With the error stream gone too there is nobody left to tell.
process.stderr.on("error", () => {});

/** What the screens end with when the terminal is gone. */
const HANG_UP = 129;

const argv = process.argv.slice(2);
try {
  process.exitCode = await main(argv);
  // The terminal is gone: node would stumble over it on its way out, so the signal's own end is taken.
  if (process.exitCode === HANG_UP) process.kill(process.pid, "SIGHUP");
} catch (error) {
  // Loaded only now: no run that goes well waits for it.
  const { bugText } = await import("./cli/bug.ts");
  process.stderr.write(bugText(error, argv, VERSION));
  process.exitCode = EXIT.bug;
}
