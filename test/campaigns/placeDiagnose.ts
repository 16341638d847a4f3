// Long campaign for reading back a bank: 560 simulated faults and 280 sound banks, voltages from the exact course with meter noise.
// Build with esbuild and run with node; it prints a table and ends with exit status 1 when a claim fails.
import { diagnose } from "../../src/place/diagnose.ts";
import { FAULT_KINDS, type FaultKind } from "../../src/place/diagnoseFaults.ts";
import { seeded } from "../../src/place/random.ts";
import { trial } from "../place/faults.ts";

const random = seeded(2024);
let right = 0;
let agreed = 0;
let alarms = 0;
const EACH = 80;
const SOUND = 280;

for (const kind of FAULT_KINDS) {
  const named = new Map<string, number>();
  for (let k = 0; k < EACH; k++) {
    const { request, position } = trial(kind, random);
    const read = diagnose(request);
    if (!read.ok) throw new Error(read.refusals[0]!.code);
    const first = read.value.suspects[0];
    const name = first ? `${first.position === position ? "" : "elsewhere: "}${first.kind}` : "none";
    named.set(name, (named.get(name) ?? 0) + 1);
    if (read.value.verdict === "agrees") agreed++;
  }
  right += named.get(kind satisfies FaultKind) ?? 0;
  console.log(`${kind}: ${[...named].map(([name, count]) => `${name} ${count}`).join(", ")}`);
}
for (let k = 0; k < SOUND; k++) {
  const read = diagnose(trial(null, random).request);
  if (read.ok && read.value.verdict !== "agrees") alarms++;
}
const faults = EACH * FAULT_KINDS.length;
console.log(
  `right place and kind first: ${right} of ${faults} (${((100 * right) / faults).toFixed(1)} %), wanted 95 %`,
);
console.log(`false agreements: ${agreed} of ${faults}, wanted 0`);
console.log(`false alarms: ${alarms} of ${SOUND} sound banks`);
process.exitCode = right < 0.95 * faults || agreed > 0 ? 1 : 0;
