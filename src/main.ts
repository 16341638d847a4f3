#!/usr/bin/env node
// Joins the commands and the screens; the only place that catches.

import { homedir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { bugText } from "./cli/bug.ts";
import { EXIT } from "./cli/exit.ts";
import { filesOn, writeNow } from "./cli/files.ts";
import { outputTrouble } from "./cli/output.ts";
import { type Ports, textWidth } from "./cli/ports.ts";
import { VERSION } from "./cli/version.ts";
import { type ScreenFlags, screenFlags } from "./tui/screenFlags.ts";

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

/** What the screens begin with: the catalogues and brief asked for, else the demo's. */
async function screenInput(flags: ScreenFlags, ports: Ports) {
  const { demoStock } = await import("./cli/demo.ts");
  // Resistors without capacitors are refused, not passed over.
  if (flags.catalog.length === 0 && flags.resistors === null) return demoStock(ports);
  const { readStock } = await import("./cli/stock.ts");
  const stock = readStock({ catalog: flags.catalog, resistors: flags.resistors ?? undefined }, ports.files);
  return stock.ok ? { ok: true as const, value: { ...stock.value, brief: {} as unknown } } : stock;
}

/** The screens; brief and pins are kept in the home folder. */
async function openScreens(flags: ScreenFlags, ports: Ports): Promise<number> {
  const { tell } = await import("./cli/tell.ts");
  const input = await screenInput(flags, ports);
  if (!input.ok) return tell(ports, input.refusals);
  const { parts, families, sources } = input.value;
  let { brief } = input.value;
  if (flags.brief !== null) {
    const { readJson } = await import("./cli/jsonText.ts");
    const text = ports.files.read(flags.brief);
    const json = text.ok ? readJson(text.value, flags.brief) : text;
    if (!json.ok) return tell(ports, json.refusals);
    brief = json.value.value;
  }
  const demo = flags.catalog.length === 0;
  const faults = sources.reduce((sum, source) => sum + source.faults.length, 0);
  const { startScreens } = await import("./tui/index.ts");
  return startScreens({
    parts,
    families,
    stock: {
      name: demo ? "demo catalogues" : flags.catalog.join(", "),
      parts: parts.length,
      faults,
      note: demo ? "invented parts" : "",
    },
    brief,
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
    },
  });
}

async function main(argv: readonly string[]): Promise<number> {
  const ports = portsOfProcess();
  const flags = screenFlags(argv);
  if (flags === null) return (await import("./cli/program.ts")).run(argv, ports);
  if (argv.length > 0 || isTerminal()) return openScreens(flags, ports);
  return (await import("./cli/demo.ts")).demoCommand(ports);
}

process.stdout.on("error", (error: NodeJS.ErrnoException) => {
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
  process.stderr.write(bugText(error, argv, VERSION));
  process.exitCode = EXIT.bug;
}
