// Long campaign of interrupted saves: the program is killed outright at random instants while it replaces a file, again and again.
// `node kills.mjs [KILLS] [SEED] [MAIN]`: builds nothing; MAIN is the built dist/main.js. Exit status 1 when a file was ever neither the old nor the new.
import { spawn, spawnSync } from "node:child_process";
import { mkdtempSync, readdirSync, readFileSync, rmSync, watch, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { chance } from "../support/random.ts";

const [kills, seed, main] = [
  Number(process.argv[2] ?? 500),
  Number(process.argv[3] ?? 1),
  process.argv[4] ?? "dist/main.js",
];
const folder = mkdtempSync(join(tmpdir(), "joulewright-"));
const output = join(folder, "bill.csv");
const bank = ["--part", "drawer-pf-330-360", "--series", "8", "--ties", "strings", "--catalog", "catalogs/drawer.csv"];
const argv = (parallel: number): readonly string[] => [
  main,
  "order",
  "catalogs/demo-brief.json",
  ...bank,
  "--parallel",
  String(parallel),
  "--output",
  output,
  "--force",
];

/** The file as each of the two commands writes it, and how long one takes. */
function whole(parallel: number): { readonly text: string; readonly seconds: number } {
  const begun = performance.now();
  const ran = spawnSync(process.execPath, argv(parallel), { encoding: "utf8" });
  if (ran.status !== 0 && ran.status !== 1) throw new Error(ran.stderr);
  return { text: readFileSync(output, "utf8"), seconds: (performance.now() - begun) / 1000 };
}

const [one, two] = [whole(3), whole(4)];
const c = chance(seed);
let [cut, changed, left, broken] = [0, 0, 0, 0];

for (let run = 0; run < kills; run++) {
  const parallel = run % 2 === 0 ? 3 : 4;
  const before = readFileSync(output, "utf8");
  const child = spawn(process.execPath, argv(parallel), { stdio: "ignore" });
  const ended = new Promise<NodeJS.Signals | null>((resolve) => child.on("exit", (_code, signal) => resolve(signal)));
  // Two in three as soon as something stirs in the folder, that is while the file is being written; the others anywhere.
  const watcher = run % 3 > 0 ? watch(folder, () => setTimeout(kill, c.maybe(0.5) ? 0 : c.between(0, 4))) : null;
  const kill = (): boolean => child.kill("SIGKILL");
  const timer = watcher === null ? setTimeout(kill, one.seconds * 1000 * c.next()) : undefined;
  if ((await ended) === "SIGKILL") cut++;
  clearTimeout(timer);
  watcher?.close();
  const after = readFileSync(output, "utf8");
  if (after !== one.text && after !== two.text) {
    broken++;
    writeFileSync(output, before);
  } else if (after !== before) changed++;
  for (const name of readdirSync(folder)) {
    if (name === "bill.csv") continue;
    left++;
    rmSync(join(folder, name));
  }
}
console.log(
  `${kills} runs, ${cut} killed before their end, ${changed} had replaced the file, ${left} left a temporary beside it, ${broken} broke it`,
);
rmSync(folder, { recursive: true });
process.exitCode = broken > 0 || cut === 0 || changed === 0 ? 1 : 0;
