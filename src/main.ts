#!/usr/bin/env node
// Joins the commands and the screens; the only place that catches.

import { fileURLToPath } from "node:url";
import { bugText } from "./cli/bug.ts";
import { EXIT, filesOn, type Ports, textWidth } from "./cli/index.ts";
import { outputTrouble } from "./cli/output.ts";
import { VERSION } from "./cli/version.ts";

/** Opens the screens and ends with their exit status; null until there are screens to load. */
const openScreens: ((ports: Ports) => Promise<number>) | null = null;

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

async function main(argv: readonly string[]): Promise<number> {
  const ports = portsOfProcess();
  if (argv.length > 0) return (await import("./cli/program.ts")).run(argv, ports);
  const open = openScreens as ((ports: Ports) => Promise<number>) | null;
  if (open !== null && isTerminal()) return open(ports);
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
