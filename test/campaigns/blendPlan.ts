// A long run, started by hand: `plan --blend --json` against every mix tried, on thousands of small random catalogues.
// Bundle and run: npx esbuild test/campaigns/blendPlan.ts --bundle --platform=node --format=esm --packages=external
//   --outfile=blend-plan.mjs && node blend-plan.mjs [first seed] [count]
import { handBlend, handTypes } from "../support/blendByHand.ts";
import { draw, planned } from "../support/blendDraw.ts";

const first = Number(process.argv[2] ?? 50_000);
const count = Number(process.argv[3] ?? 3000);
const tally: Record<string, number> = {};
const tell = (what: string): void => {
  tally[what] = (tally[what] ?? 0) + 1;
};
for (let seed = first; seed < first + count; seed += 1) {
  const drawn = draw(seed);
  const types = handTypes(drawn.brief, drawn.parts, drawn.families);
  const best = handBlend(drawn.brief, types, drawn.maxTypes);
  const { blends, blendSearch } = await planned(drawn);
  const cost = blends.length === 0 ? null : Math.round((blends[0].cost?.total ?? 0) * 100);
  tell(best === null ? "nothing fits" : best.counts.length > 1 ? "a mix" : "one part");
  tell(`status: ${blendSearch.status}`);
  if (types.some(({ costs }) => costs.some((one, x) => x > 1 && one < costs[x - 1]!))) tell("a table that falls");
  if (cost !== (best?.cost ?? null)) tell(`DIFFERS, seed ${seed}: ${cost} for ${best?.cost ?? null}`);
}
console.table(tally);
