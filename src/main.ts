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

/** The screens, on the demo's catalogues; brief and pins are kept in the home folder. */
async function openScreens(ports: Ports): Promise<number> {
  const { demoStock } = await import("./cli/demo.ts");
  const { tell } = await import("./cli/tell.ts");
  const demo = demoStock(ports);
  if (!demo.ok) return tell(ports, demo.refusals);
  const { parts, families, sources, brief } = demo.value;
  const faults = sources.reduce((sum, source) => sum + source.faults.length, 0);
  const { startScreens } = await import("./tui/index.ts");
  return startScreens({
    parts,
    families,
    stock: { name: "demo catalogues", parts: parts.length, faults, note: "invented parts" },
    brief,
    files: ports.files,
    sessionFile: process.env.JOULEWRIGHT_SESSION ?? join(homedir(), ".joulewright.json"),
    terminal: {
      complain: (line) => ports.err(`${line}\n`),
      stdin: process.stdin,
      stdout: process.stdout,
      writeSync: writeNow,
      process,
      env: process.env,
    },
  });
}

async function main(argv: readonly string[]): Promise<number> {
  const ports = portsOfProcess();
  if (argv.length > 0) return (await import("./cli/program.ts")).run(argv, ports);
  if (isTerminal()) return openScreens(ports);
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
