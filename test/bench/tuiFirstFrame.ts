// First frame of the screens against a hello-world of the same ink: both bundled alike, on a pseudo-terminal, taking turns.
// Run it bundled: it prints the least and the median time of each, and their ratios. Target: 1.5, later 1.2.
import { rmSync } from "node:fs";
import { join } from "node:path";
import { spawn } from "@lydell/node-pty";
import { bundle } from "../support/bundle.ts";

const RUNS = Number(process.argv[2] ?? 15);

/** Milliseconds from the start of a process until it has written a text. */
function timeTo(file: string, text: string, env: Record<string, string>): Promise<number> {
  return new Promise((done) => {
    const begun = performance.now();
    let seen = "";
    const terminal = spawn(process.execPath, [file], { cols: 80, rows: 24, env });
    const listener = terminal.onData((data) => {
      seen += data;
      if (!seen.includes(text)) return;
      const took = performance.now() - begun;
      listener.dispose();
      terminal.onExit(() => done(took));
      terminal.kill("SIGKILL");
    });
  });
}

const folder = await bundle({ main: "src/main.ts", hello: "test/bench/tuiHello.ts" });
const env = {
  PATH: process.env.PATH ?? "",
  TERM: "xterm-256color",
  JOULEWRIGHT_SESSION: join(folder, "none.json"),
};
const cases = [
  { name: "hello", file: join(folder, "dist/hello.js"), text: "hello, world" },
  { name: "first frame", file: join(folder, "dist/main.js"), text: "Energy of one pulse" },
  { name: "first plan", file: join(folder, "dist/main.js"), text: "layouts fit" },
] as const;
const times = new Map<string, number[]>(cases.map(({ name }) => [name, []]));
for (let run = 0; run < RUNS; run += 1)
  for (const { name, file, text } of cases) times.get(name)?.push(await timeTo(file, text, env));
rmSync(folder, { recursive: true, force: true });

const least = (name: string): number => Math.min(...(times.get(name) ?? []));
const median = (name: string): number => (times.get(name) ?? []).sort((a, b) => a - b)[RUNS >> 1] ?? Number.NaN;
for (const { name } of cases) {
  const ratios = `${(least(name) / least("hello")).toFixed(2)} / ${(median(name) / median("hello")).toFixed(2)}`;
  console.log(`${name}: ${least(name).toFixed(0)} / ${median(name).toFixed(0)} ms, ratio to hello ${ratios}`);
}
