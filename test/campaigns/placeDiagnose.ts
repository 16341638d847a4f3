// Long campaign for reading back a bank: 560 simulated faults by the exact course and as many by a circuit simulator, and 280 sound
// banks of each, all with meter noise. Build with esbuild and run with node; it prints a table and ends with exit status 1 when a
// claim fails. `--each N` draws N faults of each kind in place of 80; the word exact or circuit runs one of the two.

import { diagnose } from "../../src/place/diagnose.ts";
import { FAULT_KINDS, type FaultKind } from "../../src/place/diagnoseFaults.ts";
import { seeded } from "../../src/place/random.ts";
import { startSimulator } from "../bank/simulate.ts";
import { simulatedTrial } from "../place/faultCircuit.ts";
import { type Trial, trial } from "../place/faults.ts";

type Maker = (kind: FaultKind | null, random: () => number) => Trial | Promise<Trial>;

const asked = process.argv.indexOf("--each");
const EACH = asked < 0 ? 80 : Number(process.argv[asked + 1]);
const SOUND = Math.ceil(3.5 * EACH);

async function campaign(name: string, make: Maker, seed: number): Promise<boolean> {
  const random = seeded(seed);
  let right = 0;
  let agreed = 0;
  let alarms = 0;
  console.log(`\nvoltages by ${name}`);
  for (const kind of FAULT_KINDS) {
    const named = new Map<string, number>();
    for (let k = 0; k < EACH; k++) {
      const { request, position } = await make(kind, random);
      const read = diagnose(request);
      if (!read.ok) throw new Error(read.refusals[0]!.code);
      const first = read.value.suspects[0];
      const said = first ? `${first.position === position ? "" : "elsewhere: "}${first.kind}` : "none";
      named.set(said, (named.get(said) ?? 0) + 1);
      if (read.value.verdict === "agrees") agreed++;
    }
    right += named.get(kind satisfies FaultKind) ?? 0;
    console.log(`${kind}: ${[...named].map(([said, count]) => `${said} ${count}`).join(", ")}`);
  }
  for (let k = 0; k < SOUND; k++) {
    const read = diagnose((await make(null, random)).request);
    if (read.ok && read.value.verdict !== "agrees") alarms++;
  }
  const faults = EACH * FAULT_KINDS.length;
  const share = ((100 * right) / faults).toFixed(1);
  console.log(`right place and kind first: ${right} of ${faults} (${share} %), wanted 95 %`);
  console.log(`false agreements: ${agreed} of ${faults}, wanted 0`);
  console.log(`false alarms: ${alarms} of ${SOUND} sound banks`);
  return right >= 0.95 * faults && agreed === 0;
}

const only = process.argv.find((word) => word === "exact" || word === "circuit");
const kept: boolean[] = [];
if (only !== "circuit") kept.push(await campaign("the exact course", trial, 2024));
if (only !== "exact") {
  const simulator = await startSimulator();
  kept.push(await campaign("a circuit simulator", (kind, random) => simulatedTrial(simulator, kind, random), 2025));
}
process.exitCode = kept.every((one) => one) ? 0 : 1;
