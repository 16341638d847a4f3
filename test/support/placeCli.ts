// `place` and `commission` run as the program runs them, with files laid over their paths.
import { run } from "../../src/cli/program.ts";
import { fakePorts } from "./fakePorts.ts";

export async function cli(argv: readonly string[], texts: Readonly<Record<string, string>> = {}, columns = 80) {
  const ports = fakePorts(texts, columns);
  const status = await run(argv, ports);
  return { status, out: ports.printed(), err: ports.told(), written: ports.written };
}

/** Measured units as a file: capacitance in the unit of the heading, other columns as given. */
export function lotCsv(
  capacitances: readonly number[],
  unit = "uF",
  more: Readonly<Record<string, readonly (number | string)[]>> = {},
): string {
  const headings = ["serial", `capacitance [${unit}]`, ...Object.keys(more)];
  const rows = capacitances.map((c, i) => [`u${i}`, c, ...Object.values(more).map((column) => column[i])].join(","));
  return `${[headings.join(","), ...rows].join("\n")}\n`;
}

export const shape = (series: number, parallel: number, ties: string): readonly string[] => [
  "--series",
  String(series),
  "--parallel",
  String(parallel),
  "--ties",
  ties,
];

/** A small bank of 3 stages of 2: a lot with leakage, voltage, limit and resistor. */
export const SMALL = lotCsv([470, 472, 468, 475, 465, 471, 469], "uF", {
  "leakage [uA]": [90, 110, 100, 95, 105, 98, 120],
});
export const SMALL_ARGV = [
  "place",
  ...shape(3, 2, "cross-tied"),
  "--measured",
  "lot.csv",
  "--voltage",
  "1 kV",
  "--unit-limit",
  "360 V",
  "--leakage-at",
  "360 V",
  "--balance",
  "100 kohm",
] as const;

export async function smallBank(more: readonly string[] = []) {
  const made = await cli([...SMALL_ARGV, "--json", ...more], { "lot.csv": SMALL });
  return { ...made, bank: JSON.parse(made.out) };
}
