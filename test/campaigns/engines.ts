// The same bytes on every engine: `node engines.mjs NODE...` runs the built program (dist) on this node and on each named one, command by
// command, and compares. Exit status 1 when anything differs, or when a command that should answer does not.
import { spawnSync } from "node:child_process";

const ASKED =
  "--energy|2.4 kJ|--voltage|2.2 kV|--ripple|100 %|--catalog|catalogs/drawer.csv|catalogs/electrolytic.csv|--resistors|catalogs/resistors.csv";
const BANK = `${ASKED}|--part|drawer-sc-4700-450|--series|8|--parallel|2|--ties|cross-tied`;
const COIL = "--load-resistance|0.4 ohm|--load-inductance|25 uH";
const LAMP = "--lamp-bore|8 mm|--lamp-arc|100 mm|--lamp-gas|xenon|--lamp-pressure|450 torr|--load-inductance|30 uH";
const BUS = "--bus-shape|flat bars|--bus-length|1.2 m|--bus-width|40 mm|--bus-gap|3 mm|--bus-thickness|3 mm";
const LINES: readonly string[] = [
  `plan|${ASKED}|--limit|0|--json`,
  `plan|${ASKED}|--basis|statistical|--risk|1e-4|--json`,
  `plan|${ASKED}|--blend|--explain|--json`,
  "plan|--energy|900 kJ|--voltage|2.2 kV|--ripple|100 %|--catalog|catalogs/drawer.csv|--json",
  `check|${BANK}|--json`,
  `check|${BANK}|--basis|statistical|--witness|20000|--json`,
  `pulse|${BANK}|${COIL}|--json`,
  `pulse|${BANK}|${LAMP}|--json`,
  `pulse|${BANK}|--load-short|${BUS}|--json`,
  "place|--series|6|--parallel|6|--ties|cross-tied|--measured|fixtures/units/lot-40-capacitance-only.csv|--json",
  "place|--series|6|--parallel|6|--ties|strings|--measured|fixtures/units/lot-200.csv|--json",
  `order|${BANK}|${COIL}|${BUS}|--json`,
  `order|${BANK}|--edited|fixtures/versions/bill-1.csv`,
  `sheet|${BANK}|${COIL}`,
  `labels|${BANK}`,
  "parts|catalogs/film.csv|--json",
  "completion|bash",
  "manual",
];

const run = (node: string, line: string) => {
  const { status, stdout, stderr } = spawnSync(node, ["dist/main.js", ...line.split("|")], {
    encoding: "utf8",
    maxBuffer: 1 << 29,
  });
  return { status, stdout, stderr };
};

const others = process.argv.slice(2);
if (others.length === 0) throw new Error("name at least one other node to compare with");
let failed = false;
for (const line of LINES) {
  const here = run(process.execPath, line);
  const bad = (here.status ?? 2) > 1 || here.stdout === "";
  const differ = others.filter((node) => JSON.stringify(run(node, line)) !== JSON.stringify(here));
  failed ||= bad || differ.length > 0;
  const verdict = bad
    ? `NO ANSWER (${here.status}) ${here.stderr.slice(0, 200)}`
    : differ.length > 0
      ? `DIFFERS on ${differ.join(", ")}`
      : "same";
  console.log(`${verdict}: ${line.replaceAll("|", " ").slice(0, 100)}, ${here.stdout.length} characters`);
}
process.exitCode = failed ? 1 : 0;
