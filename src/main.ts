#!/usr/bin/env node
// Joins the commands and the screens; the only place that catches.

import { homedir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { bugText } from "./cli/bug.ts";
import { EXIT } from "./cli/exit.ts";
import { filesOn } from "./cli/files.ts";
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
  };
}

/** Where the screens keep brief and pins between runs. */
const sessionFile = (): string => process.env.JOULEWRIGHT_SESSION || join(homedir(), ".joulewright-screens.json");

/** The screens, on the catalogues asked for or those that come with the program. Loaded only here: no command waits for them. */
async function openScreens(flags: ScreenFlags, ports: Ports): Promise<number> {
  const demo = flags.catalog.length === 0;
  const [{ readStock }, { DEMO_CATALOGS }, { tell }, { startScreens }] = await Promise.all([
    import("./cli/stock.ts"),
    import("./cli/demo.ts"),
    import("./cli/tell.ts"),
    import("./tui/index.ts"),
  ]);
  const shipped = (name: string): string => join(ports.catalogs, name);
  const catalog = demo ? DEMO_CATALOGS.map(shipped) : flags.catalog;
  const resistors = flags.resistors ?? (demo ? shipped("resistors.csv") : undefined);
  const stock = readStock({ catalog, resistors }, ports.files);
  const briefPath = flags.brief ?? shipped("demo-brief.json");
  const brief = ports.files.read(briefPath);
  if (!stock.ok || !brief.ok) {
    return tell(
      ports,
      [stock, brief].flatMap((read) => (read.ok ? [] : read.refusals)),
      false,
    );
  }
  const json = (await import("./cli/jsonText.ts")).readJson(brief.value, briefPath);
  if (!json.ok) return tell(ports, json.refusals, false);
  const { parts, families, sources } = stock.value;
  const faults = sources.reduce((sum, source) => sum + source.faults.length, 0);
  return startScreens({
    parts,
    families,
    stock: { name: catalog.join(", "), parts: parts.length, faults, note: demo ? "invented" : "" },
    brief: json.value.value,
    files: ports.files,
    sessionFile: sessionFile(),
    terminal: {
      stdin: process.stdin,
      stdout: process.stdout,
      // A terminal is written to at once on POSIX; elsewhere the process ends by itself, after all is written.
      writeSync: (text) => void process.stdout.write(text),
      process,
      env: process.env,
      complain: (line) => ports.err(`${line}\n`),
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

const argv = process.argv.slice(2);
try {
  process.exitCode = await main(argv);
} catch (error) {
  process.stderr.write(bugText(error, argv, VERSION));
  process.exitCode = EXIT.bug;
}
