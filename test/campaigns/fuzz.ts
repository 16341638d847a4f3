// Long campaign of mutated input: `node fuzz.mjs [RUNS] [SEED]`, a million by default, shared among the readers. Built with esbuild, run with node.
// Prints a line a reader; exit status 1 when a law broke, a read took longer than a second per 100 kB, or memory grew beyond bounds.
import { performance } from "node:perf_hooks";
import { TARGETS, type Target, tried } from "../support/fuzz.ts";
import { chance } from "../support/random.ts";

const [runs, seed] = [Number(process.argv[2] ?? 1_000_000), Number(process.argv[3] ?? 1)];
const each = Math.ceil(runs / TARGETS.length);
/** Inputs are at most 8 kB of characters; a pause of the machine is not a hang, so no read is judged below a fifth of a second. */
const SLOW = 200;
const MOST_MEMORY = 700e6;
let failed = false;

/** A slow read is read twice more and its least time counts: the machine may have been busy. */
function took(first: number, { read }: Target, text: string): number {
  let least = first;
  for (let turn = 0; turn < 2 && least > SLOW; turn++) {
    const begun = performance.now();
    read(text);
    least = Math.min(least, performance.now() - begun);
  }
  return least;
}

for (const target of TARGETS) {
  const c = chance(seed);
  let [accepted, slowest, broken] = [0, 0, 0];
  for (let run = 0; run < each; run++) {
    const begun = performance.now();
    const verdict = tried(target, c);
    slowest = Math.max(slowest, took(performance.now() - begun, target, verdict.text));
    if (verdict.accepted) accepted++;
    if (verdict.broken !== null && ++broken <= 3) console.log(`  ${verdict.broken}: ${JSON.stringify(verdict.text)}`);
  }
  const memory = process.memoryUsage().rss;
  failed ||= broken > 0 || slowest > SLOW || memory > MOST_MEMORY || accepted === 0;
  const figures = `${each} inputs, ${accepted} accepted, ${broken} broken, slowest ${slowest.toFixed(0)} ms, ${(memory / 1e6).toFixed(0)} MB`;
  console.log(`${target.name}: ${figures}`);
}
process.exitCode = failed ? 1 : 0;
