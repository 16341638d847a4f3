import { describe, expect, test } from "vitest";
import { readSheet } from "../../src/cli/bankSheet.ts";
import { watchedFindings } from "../../src/cli/watchedFindings.ts";
import { lotDrift } from "../../src/place/index.ts";
import { fakePorts } from "../support/fakePorts.ts";
import { smallBank } from "../support/placeCli.ts";

const unit = (serial: string, last: number) => ({
  serial,
  readings: {
    capacitance: [1, last].map((value, shots) => ({ value, uncertainty: 0.003, shots })),
    esr: [],
    leakage: [],
  },
});

async function findings(lost: number | undefined) {
  const { out } = await smallBank();
  const sheet = readSheet("b", {}, fakePorts({ b: out }).files);
  if (!sheet.ok) throw new Error();
  const life = lost === undefined ? {} : { capacitance: lost };
  return watchedFindings(lotDrift([unit("a", 0.94), unit("b", 0.903), unit("c", 0.8)], life), sheet.value, life);
}

describe("watchedFindings(lot, sheet, life)", () => {
  test("due units are named, those within doubt apart from them", async () => {
    const [lost, stress] = await findings(0.1);
    expect(lost).toMatchObject({
      id: "history.capacitance-lost",
      verdict: "fail",
      value: expect.closeTo(0.2, 12),
      limit: 0.1,
    });
    expect(lost?.note).toMatch(/^Due: c\. .*Within the meter's doubt of it: b\.$/);
    expect(stress).toMatchObject({ id: "history.charging-stress", verdict: "pass" });
  });

  test("no end of life given is not assessed, never a pass", async () => {
    const [lost] = await findings(undefined);
    expect(lost).toMatchObject({
      verdict: "not assessed",
      limit: null,
      note: expect.stringMatching(/c has changed most/),
    });
  });
});
