import { describe, expect, test } from "vitest";
import { run } from "../../src/cli/program.ts";
import { OPTIONS } from "../support/commandTree.ts";
import { at, fakePorts } from "../support/fakePorts.ts";

const BANK = ["--energy", "500 J", "--voltage", "1 kV", "--ripple", "1", "--catalog", at("catalogs/drawer.csv")];
const LAYOUT = ["--part", "drawer-sc-4700-450", "--series", "4", "--parallel", "2", "--ties", "strings"];
const LOT = [
  "--series",
  "2",
  "--parallel",
  "2",
  "--ties",
  "strings",
  "--measured",
  at("fixtures/units/lot-40-capacitance-only.csv"),
];
const REST: Readonly<Record<string, readonly string[]>> = {
  plan: BANK,
  check: [...BANK, ...LAYOUT],
  pulse: [...BANK, ...LAYOUT],
  order: [...BANK, ...LAYOUT],
  place: LOT,
  sheet: [...BANK, ...LAYOUT],
  labels: [...BANK, ...LAYOUT],
  commission: [at("catalogs/drawer.csv"), "--readings", at("catalogs/drawer.csv")],
};
/** Beside a free value, or told by the command only once all else is right. */
const FREE = ["--balance", "--hold"];

const cases = OPTIONS.filter(({ option }) => option.words.length > 0 && !FREE.includes(option.long));

describe("wordsOf(command, option)", () => {
  test("there are some, and no word is another's", () => {
    expect(cases.length).toBeGreaterThan(20);
    for (const { option } of cases) expect(new Set(option.words).size).toBe(option.words.length);
  });

  test.each(cases.map(({ command, option }) => [command, option.long, option.words] as const))(
    "%s %s: the command's own refusal names every word, and takes each",
    async (command, long, words) => {
      const told = async (word: string): Promise<string> => {
        const rest = [...(REST[command] ?? [])];
        const there = rest.indexOf(long);
        if (there >= 0) rest.splice(there, 2);
        const ports = fakePorts();
        await run([command, ...rest, long, word], ports);
        return ports.told();
      };
      const refused = await told("zzz");
      expect(refused).toContain("zzz");
      for (const word of words) {
        expect(refused).toContain(word);
        expect(await told(word), word).not.toContain(`read ${JSON.stringify(word)}`);
      }
    },
  );

  test("the words beside free values are taken", async () => {
    for (const [long, word] of [
      ["--balance", "none"],
      ["--hold", "for ever"],
    ] as const) {
      const ports = fakePorts();
      expect(await run(["check", ...BANK, ...LAYOUT, long, word], ports), ports.told()).toBeLessThan(2);
    }
  });
});
