// Long campaign: the tail against 1e7 counted banks each, both ties, every law. Prints one line a case and ends non-zero on a miss.
import { countedRisk, monteCarlo } from "../../src/bank/monteCarlo.ts";
import { exceedRisk } from "../../src/bank/tail.ts";
import type { TailCase, UnitLaw } from "../../src/bank/tailLaw.ts";

const BANKS = 1e7;
const LAWS: Readonly<Record<string, UnitLaw>> = {
  uniform: { kind: "uniform", low: 0.8, high: 1.2 },
  lopsided: { kind: "normal", nominal: 1, tLow: 0.1, tHigh: 0.5 },
  normal: { kind: "normal", nominal: 1, tLow: 0.2, tHigh: 0.2 },
  lot: { kind: "lot", values: [0.9, 0.93, 0.95, 0.97, 1, 1.01, 1.03, 1.04, 1.08] },
};
const SHAPES = [
  ["cross-tied", 3, 2],
  ["cross-tied", 8, 12],
  ["strings", 4, 3],
] as const;

/** The limit, as a multiple of the even share, at which the chance is about `target`. */
function limitFor(given: Omit<TailCase, "share">, target: number): number {
  let low = 1;
  let high = given.n;
  for (let k = 0; k < 30; k++) {
    const middle = (low + high) / 2;
    if (exceedRisk({ ...given, share: middle / given.n }).exceed > target) low = middle;
    else high = middle;
  }
  return low;
}

/** Runs all cases; true when every difference is within five standard errors and the error stated. */
export function bankTailCampaign(print: (line: string) => void): boolean {
  let good = true;
  for (const [name, law] of Object.entries(LAWS))
    for (const [ties, n, p] of SHAPES)
      for (const target of [0.1, 1e-3, 1e-5]) {
        const over = limitFor({ law, ties, n, p }, target);
        const given: TailCase = { law, ties, n, p, share: over / n };
        const tail = exceedRisk(given);
        const runs = monteCarlo(given, { seed: 2024, banks: BANKS });
        let step = runs.next();
        while (!step.done) step = runs.next();
        const counted = countedRisk(step.value);
        const off = (tail.exceed - counted.exceed) / counted.error;
        const within = Math.abs(tail.exceed - counted.exceed) <= 5 * counted.error + tail.error;
        good &&= within;
        print(
          `${name} ${ties} ${n}s${p}p over ${over.toFixed(4)}: tail ${tail.exceed.toExponential(4)} +- ${tail.error.toExponential(1)}, counted ${counted.exceed.toExponential(4)} +- ${counted.error.toExponential(1)}, ${off.toFixed(1)} sigma ${within ? "ok" : "MISS"}`,
        );
      }
  return good;
}

if (process.argv[1]?.includes("bankTail")) process.exitCode = bankTailCampaign((line) => console.log(line)) ? 0 : 1;
