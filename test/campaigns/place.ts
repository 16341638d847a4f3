// Long campaign for placing: 1,000 seeded lots against the published rules, some 400 against full enumeration of up to 1e5 placings.
// Build with esbuild and run with node; it prints one line a claim and ends with exit status 1 when one fails.
import { arrangements } from "../../src/place/enumerate.ts";
import { place } from "../../src/place/place.ts";
import type { PlaceRequest } from "../../src/place/request.ts";
import { bestGap, stagesGap, stringsGap } from "../place/brute.ts";
import { capacitances, KINDS, wholes } from "../place/lots.ts";
import { cutRival, differencingRival, largestFirstRival, snakeRival } from "../place/rivals.ts";

const gapOf = (lot: readonly number[], request: PlaceRequest) => {
  const read = place(
    lot.map((capacitance, i) => ({ serial: String(i), capacitance })),
    request,
  );
  if (!read.ok) throw new Error(read.refusals[0]!.code);
  return read.value.charging;
};

let failed = false;
const claim = (what: string, count: number, faults: number): void => {
  console.log(`${faults === 0 ? "holds" : "FAILS"}  ${what}: ${count} lots, ${faults} against it`);
  failed ||= faults > 0;
};

let beaten = 0;
let boundAbove = 0;
const shapes = [
  [4, 4],
  [6, 10],
  [8, 12],
  [10, 40],
  [7, 4],
  [5, 3],
  [12, 2],
  [20, 5],
  [3, 8],
  [2, 12],
] as const;
for (let seed = 1; seed <= 1000; seed++) {
  const [series, parallel] = shapes[seed % shapes.length]!;
  const lot = capacitances(KINDS[seed % 4]!, series * parallel, seed);
  const made = gapOf(lot, { series, parallel, ties: "cross-tied", moves: 2e6 });
  const rival = Math.min(
    ...[snakeRival, largestFirstRival, differencingRival].map((rule) => stagesGap(lot, rule(lot, series))),
  );
  if (made.gap > rival + 1e-12) beaten++;
  if (made.lowerBound > rival + 1e-12 || made.lowerBound > made.gap) boundAbove++;
}
claim("snake, largest first and largest differencing never do better", 1000, beaten);
claim("no rival stands below the lower bound", 1000, boundAbove);

let cutBetter = 0;
for (let seed = 1; seed <= 1000; seed++) {
  const [parallel, series] = shapes[seed % shapes.length]!;
  const lot = capacitances(KINDS[seed % 4]!, series * parallel, seed);
  const made = gapOf(lot, { series, parallel, ties: "strings", moves: 1e6 });
  if (made.gap > stringsGap(lot, cutRival(lot, series)) + 1e-12) cutBetter++;
}
claim("sort-and-cut never does better", 1000, cutBetter);

let wrong = 0;
let unproven = 0;
let compared = 0;
const tiny = [
  [2, 6, 1],
  [3, 4, 1],
  [4, 3, 0],
  [5, 2, 1],
  [6, 2, 0],
  [3, 3, 2],
  [2, 5, 2],
  [7, 1, 4],
  [3, 4, 0],
  [1, 8, 3],
] as const;
for (let seed = 1; seed <= 400; seed++) {
  const [series, parallel, spares] = tiny[seed % tiny.length]!;
  const ties = seed % 2 === 0 ? "cross-tied" : "strings";
  const [groups, size] = ties === "cross-tied" ? [series, parallel] : [parallel, series];
  const count = series * parallel + spares;
  if (arrangements(count, groups, size) > 1e5) continue;
  compared++;
  const lot = wholes(count, seed, 900, 1100);
  const made = gapOf(lot, { series, parallel, ties, outliers: "keep" });
  const best = bestGap(lot, { groups, size }, ties === "cross-tied" ? stagesGap : stringsGap);
  if (Math.abs(made.gap - best) > 1e-11) wrong++;
  if (made.proof !== "optimal") unproven++;
}
claim("equal to full enumeration of at most 1e5 placings", compared, wrong);
claim("and proven so", compared, unproven);
process.exitCode = failed ? 1 : 0;
