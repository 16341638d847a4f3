import { describe, expect, test } from "vitest";
import { cli, smallBank } from "../../support/placeCli.ts";

const HEAD = "time [s],charge voltage [V],stage,voltage [V]\n";

async function commission(rows: (volts: readonly number[]) => readonly number[], more: readonly string[] = []) {
  const { bank, out } = await smallBank();
  const sums = (bank.groups as string[][]).map((group) =>
    group.reduce((sum, s) => sum + bank.units.find((unit: { serial: string }) => unit.serial === s).capacitance, 0),
  );
  const inverse = sums.reduce((sum, c) => sum + 1 / c, 0);
  const volts = rows(sums.map((c) => 900 / c / inverse));
  const text = HEAD + volts.map((v, i) => `0,900,${i + 1},${v.toFixed(1)}`).join("\n");
  return cli(["commission", "bank.json", "--readings", "r.csv", "--meter", "0.2 %", ...more], {
    "bank.json": out,
    "r.csv": text,
  });
}

describe("commission SHEET --readings FILE", () => {
  test("what the units should show agrees: 0, and the JSON as agreed", async () => {
    const { status, out } = await commission((volts) => volts, ["--json"]);
    expect(status).toBe(0);
    const found = JSON.parse(out);
    expect(found).toMatchObject({ verdict: "agrees", suspects: [], bank: { limit: 360 } });
    expect("next" in found && out).not.toMatch(/NaN|Infinity/);
  });

  test("a swapped lead differs: 1, named first, and how to go on", async () => {
    const { status, out } = await commission((volts) => volts.map((v, i) => (i === 1 ? -v : v)));
    expect(status).toBe(1);
    expect(out).toMatch(/^DIFFERS/);
    expect(out).toMatch(/- +(100|99\.\d) % +stage 2 \(.*\): meter lead swapped/);
  });

  test("over the limit stops: 1, the safe order before anything else", async () => {
    const { status, out } = await commission(() => [361, 270, 269]);
    expect(status).toBe(1);
    expect(out).toMatch(/^STOP\.\n\nIn this order\n {2}1\. Stop charging/);
    expect(out).toMatch(/FAIL +a reading over its limit +361 V +<= 360 V/);
  });

  test("readings that do not add up to the bank's are flagged", async () => {
    const { bank, out } = await smallBank();
    expect(bank.series).toBe(3);
    const text = "charge voltage [V],stage,voltage [V],total [V]\n900,1,300,800\n900,2,300,\n900,3,300,\n";
    const found = await cli(["commission", "b", "--readings", "r", "--json"], { b: out, r: text });
    expect(JSON.parse(found.out).findings).toMatchObject([{ id: "commission.whole" }, { id: "commission.sum" }]);
  });

  test("unreadable sheet or readings end with 2", async () => {
    const { out } = await smallBank();
    expect((await cli(["commission", "b", "--readings", "r"], { b: out, r: "stage\n1\n" })).status).toBe(2);
    const bad = await cli(["commission", "b", "--readings", "r"], { b: "{}", r: HEAD });
    expect([bad.status, bad.err]).toEqual([2, expect.stringMatching(/no sheet of a placed bank/)]);
    expect((await cli(["commission"])).status).toBe(2);
  });
});
