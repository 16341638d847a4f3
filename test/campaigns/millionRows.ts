// Long campaign for reading: a catalogue of a million rows, and one ruined in every row, through the built program.
// Build with esbuild, run with node and the path of the built main.js; one line a claim, exit status 1 when one fails.
import { spawnSync } from "node:child_process";
import { appendFileSync, mkdtempSync, rmSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { bigCatalogue } from "../support/bigCatalogue.ts";

const ROWS = 1_000_000;
const PIECE = 50_000;
const main = process.argv[2] ?? "dist/main.js";
const folder = mkdtempSync(join(tmpdir(), "joulewright-"));
let failed = false;

function claim(what: string, holds: boolean, figures: string): void {
  console.log(`${holds ? "holds" : "FAILS"}  ${what}: ${figures}`);
  failed ||= !holds;
}

function run(argv: readonly string[]) {
  const begin = performance.now();
  const ran = spawnSync(process.execPath, [main, ...argv], { encoding: "utf8", maxBuffer: 1 << 28 });
  return { status: ran.status, out: ran.stdout, err: ran.stderr, seconds: (performance.now() - begin) / 1000 };
}

/** Pieces of one catalogue, each row with a name of its own; `ruin` spoils every row. */
function write(path: string, ruin: boolean): void {
  for (let done = 0; done < ROWS; done += PIECE) {
    const [heading, ...rows] = bigCatalogue(PIECE, 1).trimEnd().split("\n");
    const named = rows.map((row, i) => `p${done + i}-${ruin ? row.replace(/\d/g, "?") : row}`);
    appendFileSync(path, `${done === 0 ? `${heading}\n` : ""}${named.join("\n")}\n`);
  }
}

const good = join(folder, "good.csv");
write(good, false);
const size = `${Math.round(statSync(good).size / 2 ** 20)} MiB`;
const told = run(["parts", good, "--limit", "5"]);
claim(
  "parts reads a million rows",
  told.status === 0 && told.out.includes(`${ROWS} rows understood`),
  `${size}, ${told.seconds.toFixed(1)} s, status ${told.status}`,
);
const brief = ["--energy", "2.4 kJ", "--voltage", "2.2 kV", "--ripple", "100 %"];
const planned = run(["plan", ...brief, "--catalog", good, "--limit", "3"]);
claim(
  "plan searches a million parts, or says in words why it cannot",
  planned.status === 0 && planned.out.includes(`Searched ${ROWS} parts`),
  `${planned.seconds.toFixed(1)} s, status ${planned.status} ${planned.err.slice(-300)}`,
);
const ruined = join(folder, "ruined.csv");
write(ruined, true);
const lost = run(["parts", ruined]);
claim(
  "a million ruined rows are counted, not listed, and end with 2",
  lost.status === 2 && lost.out.length < 1e6 && /more faults/.test(lost.out),
  `${lost.seconds.toFixed(1)} s, status ${lost.status}, ${lost.out.length} characters`,
);
rmSync(folder, { recursive: true, force: true });
process.exitCode = failed ? 1 : 0;
