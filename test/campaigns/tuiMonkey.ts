// Random keys for as long as wanted: `node tuiMonkey.mjs KEYS SEED`, bundled with esbuild. Prints what did not hold.
import { runMonkey } from "../support/monkey.ts";

const keys = Number(process.argv[2] ?? 200_000);
const seed = Number(process.argv[3] ?? 1);
const begun = performance.now();
let done = 0;
let bad = 0;
for (let part = 0; done < keys; part += 1) {
  const { faults } = await runMonkey(seed + part, Math.min(5000, keys - done), 50);
  done += Math.min(5000, keys - done);
  bad += faults.length;
  for (const fault of faults) console.log(`seed ${seed + part}: ${fault}`);
}
console.log(`${done} keys, ${bad} faults, ${((performance.now() - begun) / 1000).toFixed(0)} s`);
process.exitCode = bad === 0 ? 0 : 1;
