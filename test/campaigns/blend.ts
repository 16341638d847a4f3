// A long run, started by hand: 300 catalogues of 20 to 1,000 parts, own search against HiGHS with zero gap, and the bench.
// Bundle and run: npx esbuild test/campaigns/blend.ts --bundle --platform=node --format=esm --packages=external
//   --outfile=blend-campaign.mjs && node blend-campaign.mjs [first seed]
import { allPairs, optionForm } from "../../src/search/blend/blendPrograms.ts";
import { certificatePairs, certify } from "../../src/search/blend/certificate.ts";
import { findBlend } from "../../src/search/blend/findBlend.ts";
import { verifyCertificate } from "../../src/search/blend/verify.ts";
import { solveWithHighs } from "../../src/search/highs.ts";
import { solveWhole } from "../../src/search/solve.ts";
import { benchBlend } from "../bench/blend.ts";
import { bruteForce } from "../support/blendBrute.ts";
import { inventInstance } from "../support/blendInstances.ts";
import { tierProgram } from "../support/blendTiers.ts";

const first = Number(process.argv[2] ?? 31_000);
const only = process.argv[3] ?? "all";
const tally: Record<string, number> = {};
const count = (what: string): void => {
  tally[what] = (tally[what] ?? 0) + 1;
};

/** Own answer against one other cost: null where nothing fits. */
const same = (status: string, cost: number | null, other: number | null): boolean =>
  other === null ? status === "infeasible" : cost === other;

if (only === "all" || only === "brute") {
  for (let seed = first; seed < first + 1440; seed += 1) {
    const parts = seed % 36 === 0 ? 40 : seed % 3 === 0 ? 20 : 5;
    const { model } = inventInstance({
      parts,
      seed,
      mostStrings: parts > 5 ? 12 : 60,
      ...(parts > 5 ? { maxTypes: 3 } : {}),
    });
    const answer = findBlend(model);
    const best = bruteForce(model);
    count(best === null ? "brute force: infeasible" : "brute force: feasible");
    if (!same(answer.status, answer.best?.cost ?? null, best)) count(`brute force: DIFFERS, seed ${seed}`);
  }
}

if (only === "all" || only === "highs") {
  for (let at = 0; at < 300; at += 1) {
    const parts = at % 30 === 0 ? 1000 : at % 10 === 0 ? 400 : [20, 50, 100][at % 3]!;
    const instance = inventInstance({ parts, seed: first + at });
    const answer = findBlend(instance.model);
    const other = await solveWithHighs(tierProgram(instance, at % 2 === 0), { seconds: 120 });
    if (other.status === "unknown") count(`HiGHS: unknown (${other.why})`);
    else if (same(answer.status, answer.best?.cost ?? null, other.status === "optimal" ? Math.round(other.cost) : null))
      count(`HiGHS: same, ${other.status}`);
    else count(`HiGHS: DIFFERS, seed ${first + at}`);

    const certificate = certify(instance.model, answer)!;
    count(`certificate: ${verifyCertificate(instance.model, certificate).verdict}`);
    const pairs = answer.best === null ? allPairs(instance.model) : certificatePairs(certificate);
    if (pairs.length === 0 || pairs.length > 250) continue;
    const claim = solveWhole(optionForm(instance.model, pairs).program, {
      milliseconds: 5000,
      clock: () => performance.now(),
    });
    // A core holds every blend that costs less than the best, and as a rule the best itself.
    if (claim.status === "unknown") count(`javascript-lp-solver: unknown (${claim.why})`);
    else if (claim.status === "claimed" && answer.best !== null && claim.cost === answer.best.cost)
      count("javascript-lp-solver: same");
    else if (claim.status === "claimed" && (answer.best === null || claim.cost < answer.best.cost))
      count(`javascript-lp-solver: DIFFERS, seed ${first + at}`);
    else count(`javascript-lp-solver: nothing cheaper in the core (${claim.status})`);
  }
}
console.table(tally);
if (only === "all" || only === "bench") {
  const size = { seed: first + 10_000, thousands: 15, hundreds: 40, hard: 80 };
  console.table((await benchBlend(size)).map((row) => ({ ...row, value: Number(row.value.toPrecision(4)) })));
}
