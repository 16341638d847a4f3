// First frame of the screens against a hello-world of the same ink: both bundled alike, on a pseudo-terminal, taking turns.
import { rmSync } from "node:fs";
import { join } from "node:path";
import { spawn } from "@lydell/node-pty";
import { bundle } from "../support/bundle.ts";
import { atMost, type BenchRow } from "./row.ts";

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

const CASES = [
  { name: "hello", file: "hello.js", text: "hello, world" },
  { name: "frame", file: "main.js", text: "Energy of one pulse" },
  { name: "plan", file: "main.js", text: "layouts fit" },
] as const;

/** All rows. The median is judged, as what a user sees; the least is the least disturbed by whatever else the machine does. */
export async function benchTui(runs = 15): Promise<readonly BenchRow[]> {
  const folder = await bundle({ main: "src/main.ts", hello: "test/bench/tuiHello.ts" });
  try {
    const env = {
      PATH: process.env.PATH ?? "",
      TERM: "xterm-256color",
      JOULEWRIGHT_SESSION: join(folder, "none.json"),
    };
    const times: Record<(typeof CASES)[number]["name"], number[]> = { hello: [], frame: [], plan: [] };
    for (let run = 0; run < runs; run += 1)
      for (const { name, file, text } of CASES) times[name].push(await timeTo(join(folder, "dist", file), text, env));
    const least = (name: keyof typeof times): number => Math.min(...times[name]);
    const median = (name: keyof typeof times): number => times[name].sort((a, b) => a - b)[runs >> 1] ?? Number.NaN;
    const what = "a hello-world of the same ink";
    return [
      {
        what: `first frame of the screens, times ${what}, least`,
        value: least("frame") / least("hello"),
        promise: null,
      },
      {
        what: `first frame of the screens, times ${what}, median`,
        value: median("frame") / median("hello"),
        promise: atMost(1.2),
      },
      { what: `first plan on the screens, times ${what}, least`, value: least("plan") / least("hello"), promise: null },
      { what: "hello-world of the same ink, least", value: least("hello"), unit: "ms", promise: null },
    ];
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
