// What a refusal of the program names: the flag or the file that mends it, never a word of the inside.
import { describe, expect, test } from "vitest";
import { cli, lotCsv, shape } from "../support/placeCli.ts";

const PART = "part,capacitance [uF],voltage [V],tolerance [%],polarised,leakage [uA]\np,1000,400,20,yes,100\n";
const CHOSEN = JSON.stringify({
  part: "p",
  series: 4,
  parallel: 2,
  ties: "cross-tied",
  balance: null,
  capacitance: { nominal: 5e-4 },
});
const TEXTS = { "c.csv": PART, "l.csv": lotCsv([330, 331]), "chosen.json": CHOSEN, "sheet.json": '{"title":"x"}' };
const BANK = ["--voltage", "1 kV", "--catalog", "c.csv", "--part", "p", ...shape(4, 2, "cross-tied")];
const told = async (...argv: string[]): Promise<string> => {
  const { status, err } = await cli(argv, TEXTS);
  expect(status).toBe(2);
  return err;
};

describe("refusals name what was given", () => {
  test("pulse without a load names the flags of a load", async () => {
    expect(await told("pulse", ...BANK)).toMatch(/^--load-resistance: .*--load-current with --load-time.*--lamp-bore/);
  });
  test("a current that the bank cannot hold names --load-time", async () => {
    expect(await told("pulse", ...BANK, "--load-current", "100 A", "--load-time", "10 s")).toMatch(/^--load-time: /);
  });
  test("too few measured units name their file", async () => {
    expect(await told("place", ...shape(2, 2, "cross-tied"), "--measured", "l.csv")).toMatch(
      /^l\.csv: there are too few units/,
    );
  });
  test("--pins with a serial alone says how a pin is written", async () => {
    expect(await told("place", ...shape(2, 1, "strings"), "--measured", "l.csv", "--pins", "K001")).toMatch(
      /^--pins: .*SERIAL=PLACE/,
    );
  });
  test("commission: another file says which is wanted; a layout alone says that a log would do too", async () => {
    expect(await told("commission", "sheet.json", "--readings", "r.csv")).toMatch(/accepted: the JSON of place/);
    expect(await told("commission", "chosen.json")).toMatch(/--readings FILE; or a log of the bank: --history FILE/);
  });
  test("an endless number of seconds says the most; one part is no choice of parts", async () => {
    const check = ["check", "--energy", "1 J", "--ripple", "100 %", ...BANK];
    expect(await told(...check, "--hold", "1e20 s")).toMatch(/to 1e9 s/);
    expect(await told(...check.map((text) => (text === "p" ? "zzz" : text)))).toMatch(/"p", the only part/);
  });
});
