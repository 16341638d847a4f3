import { describe, expect, test } from "vitest";
import { type BankSheet, readSheet } from "../../src/cli/bankSheet.ts";
import { commissioned } from "../../src/cli/commissioned.ts";
import { readCommissionFlags } from "../../src/cli/commissionFlags.ts";
import { exactCourse } from "../../src/place/index.ts";
import { fakePorts } from "../support/fakePorts.ts";
import { cli, lotCsv, shape } from "../support/placeCli.ts";

async function sheetOf(ties: string): Promise<BankSheet> {
  const lot = lotCsv([470, 472, 468, 475, 465, 471], "uF", { "leakage [uA]": [90, 110, 100, 95, 105, 98] });
  const argv = [
    "place",
    ...shape(3, 2, ties),
    "--measured",
    "l.csv",
    "--voltage",
    "900 V",
    "--unit-limit",
    "340 V",
    "--json",
  ];
  const { out } = await cli([...argv, "--balance", "100 kohm", "--leakage-at", "360 V"], { "l.csv": lot });
  const sheet = readSheet("s", {}, fakePorts({ s: out }).files);
  if (!sheet.ok) throw new Error();
  return sheet.value;
}
const { choices } = readCommissionFlags({ meter: "0.1 %" });
const rowOf = (sheet: BankSheet, chain: number, bank = 600) => {
  const [first] = exactCourse(sheet.chains[chain] ?? [], bank, [0]);
  return { seconds: 0, bank, volts: first?.volts ?? [] };
};

describe("commissioned(sheet, chains, choices)", () => {
  test("strings: the wrong string and unit are named, by place from 1 and by serial", async () => {
    const sheet = await sheetOf("strings");
    const wrong = rowOf(sheet, 1);
    const [a = 0, b = 0, c = 0] = wrong.volts;
    // The middle unit has lost a fifth: its voltage rises to 1/0.8 of its share before the sum is shared anew.
    const scale = 600 / (a + b / 0.8 + c);
    const found = commissioned(
      sheet,
      [[rowOf(sheet, 0)], [{ ...wrong, volts: [a * scale, (b / 0.8) * scale, c * scale] }]],
      choices,
    );
    if (!found.ok) throw new Error();
    expect(found.value.verdict).toBe("differs");
    expect(found.value.suspects[0]).toMatchObject({
      string: 2,
      position: 2,
      kind: "low capacitance",
      serials: [sheet.groups[1]?.[1]],
    });
    expect(found.value.suspects[0]?.size).toBeCloseTo(0.2, 1);
    expect(found.value.next).toMatchObject({ action: "with the bank dead", string: 2, position: 2 });
  });

  test("sound agrees; a string without readings is said to be not judged; no readings at all are refused", async () => {
    const sheet = await sheetOf("strings");
    const found = commissioned(sheet, [[rowOf(sheet, 0)], []], choices);
    expect(found).toMatchObject({ value: { verdict: "agrees", suspects: [] } });
    expect(found.ok && found.value.notes.join()).toMatch(/Strings without a reading, not judged: 2/);
    expect(commissioned(sheet, [[], []], choices)).toMatchObject({
      ok: false,
      refusals: [{ code: "commission.no-readings" }],
    });
  });

  test("over the limit: stop, actions in order, and nobody is sent to the charged bank", async () => {
    const sheet = await sheetOf("cross-tied");
    const found = commissioned(sheet, [[{ seconds: 0, bank: 900, volts: [300, 341, 259] }]], choices);
    if (!found.ok) throw new Error();
    expect(found.value.verdict).toBe("stop");
    expect(found.value.actions[0]).toMatch(/Stop charging/);
    expect(found.value.next === null || found.value.next.action === "with the bank dead").toBe(true);
  });
});
