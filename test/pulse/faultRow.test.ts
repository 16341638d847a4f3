// faultRow: how volts and joules are judged.
import { describe, expect, test } from "vitest";
import { row } from "../../src/pulse/faultRow.ts";
import { tied } from "./faultBanks.ts";

const parts = { id: "unit-short", joules: 0, stops: "", note: "" } as const;
const verdict = (volts: number | null, own = 0, unit = {}, spread?: number) =>
  row(
    { ...tied, unit: { ...tied.unit, ...unit } },
    { ...parts, volts, own, ...(spread === undefined ? {} : { spread }) },
  ).verdict;

describe("row(bank, parts)", () => {
  test("unknown volts are not assessed, also when the joules would pass", () => {
    expect(verdict(null)).toBe("not assessed");
    expect(verdict(null, 10, { ruptureEnergy: 100 })).toBe("not assessed");
  });

  test("rated passes, surge warns, above fails; without a surge rating above rated fails", () => {
    expect(verdict(450)).toBe("pass");
    expect(verdict(480)).toBe("fail");
    expect(verdict(480, 0, { surgeVoltage: 500 })).toBe("warn");
    expect(verdict(520, 0, { surgeVoltage: 500 })).toBe("fail");
  });

  test("the corner of the tolerance is what is judged", () => expect(verdict(440, 0, {}, 470)).toBe("fail"));

  test("joules in a shorted unit want a known case: unknown is not assessed, but a failure of volts stays one", () => {
    expect(verdict(400, 1000)).toBe("not assessed");
    expect(verdict(400, 1000, { ruptureEnergy: 2000 })).toBe("pass");
    expect(verdict(400, 1000, { ruptureEnergy: 500 })).toBe("fail");
    expect(verdict(480, 1000)).toBe("fail");
  });
});
