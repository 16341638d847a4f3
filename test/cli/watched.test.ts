import { describe, expect, test } from "vitest";
import { readSheet } from "../../src/cli/bankSheet.ts";
import { readCommissionFlags } from "../../src/cli/commissionFlags.ts";
import { latestOf, readLog, watched } from "../../src/cli/watched.ts";
import { fakePorts } from "../support/fakePorts.ts";
import { smallBank } from "../support/placeCli.ts";

async function watchedOf(log: string, more: Record<string, string> = {}) {
  const { out } = await smallBank();
  const { files } = fakePorts({ "bank.json": out, "log.csv": log });
  const rows = readLog("log.csv", files);
  if (!rows.ok) return rows;
  const { choices } = readCommissionFlags({ history: "log.csv", ...more });
  const sheet = readSheet("bank.json", { latest: latestOf(rows.value) }, files);
  if (!sheet.ok) throw new Error();
  return { ok: true, sheet: sheet.value, value: watched(rows.value, sheet.value, choices) } as const;
}

describe("watched(rows, sheet, choices)", () => {
  test("the sheet's reading is the first, before any shot, and is not counted twice when the log repeats it", async () => {
    const found = await watchedOf(
      "date,fired,serial,capacitance [uF]\n2026-01-01,,u0,470\n2026-02-01,900,u0,440\n2026-02-01,,u1,460\n",
    );
    if (!found.ok) throw new Error();
    expect(found.value.shots).toBe(900);
    const of = (serial: string) => found.value.units.find((one) => one.serial === serial && one.kind === "capacitance");
    expect(of("u0")).toMatchObject({ readings: 2, change: expect.closeTo(-30 / 470, 9) });
    expect(of("u1")).toMatchObject({ readings: 2, first: expect.closeTo(472e-6, 12) });
  });

  test("the prediction is made with the units as last measured", async () => {
    const before = await watchedOf("date,fired\n2026-01-01,1\n");
    const after = await watchedOf("date,serial,capacitance [uF]\n2026-01-01,u1,235\n");
    if (!before.ok || !after.ok) throw new Error();
    const sum = (sheet: typeof before.sheet) =>
      sheet.chains.flat().reduce((total, { capacitance }) => total + capacitance, 0);
    expect(sum(before.sheet) - sum(after.sheet)).toBeCloseTo(237e-6, 12);
    expect(after.value.findings.find(({ id }) => id === "history.charging-stress")).toMatchObject({
      verdict: "fail",
      limit: 360,
    });
  });

  test("strangers, unmeasured units and a log without shots are told of", async () => {
    const found = await watchedOf("date,serial,capacitance [uF]\n2026-01-01,x9,470\n");
    expect(found.ok && found.value.notes.join("\n")).toMatch(
      /Not among the units of the sheet: x9[\s\S]*6 fitted units were not[\s\S]*counts no shots/,
    );
  });

  test("a row that cannot be read refuses the whole; so does a log without rows", async () => {
    expect(await watchedOf("date,serial,capacitance [uF]\n2026-01-32,u0,470\n")).toMatchObject({ ok: false });
    expect(await watchedOf("date,serial\n")).toMatchObject({
      ok: false,
      refusals: [{ code: "no-rows" }, { code: "no-rows" }],
    });
  });
});
