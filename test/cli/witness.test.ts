import { describe, expect, test } from "vitest";
import { checkedBank } from "../../src/cli/checked.ts";
import { readWitness, unwitnessed, witnessOf } from "../../src/cli/witness.ts";
import { fakePorts } from "../support/fakePorts.ts";

const CATALOG = "part,capacitance [uF],voltage [V],tolerance [%],polarised,leakage [mA]\nu,3300,500,20,yes,0.2\n";
const FLAGS = {
  catalog: ["c.csv"],
  energy: "4 kJ",
  voltage: "1600 V",
  ripple: "100 %",
  part: "u",
  series: "4",
  parallel: "2",
  ties: "cross-tied",
  basis: "statistical",
};
function checked(more: Record<string, unknown> = {}, catalog = CATALOG) {
  const read = checkedBank(undefined, { ...FLAGS, ...more }, fakePorts({ "c.csv": catalog }));
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
}

describe("readWitness(flags)", () => {
  test("nothing asked, nothing run; digits or a power of ten; seed 1 when none is given", () => {
    expect(readWitness({})).toEqual({ ok: true, value: null });
    expect(readWitness({ witness: "1e6", workers: "2" })).toEqual({
      ok: true,
      value: { banks: 1e6, seed: 1, workers: 2 },
    });
    expect(readWitness({ witness: "5000", seed: "9", workers: "1" })).toMatchObject({
      value: { banks: 5000, seed: 9 },
    });
  });

  test("refuses too few, no number, a fraction, and a seed alone, each with its flag", () => {
    for (const witness of ["10", "many", "-1000", "1e99", "1000.5"])
      expect(readWitness({ witness })).toMatchObject({
        refusals: [{ code: "bad-count", place: { field: "--witness" } }],
      });
    expect(readWitness({ witness: "1e4", seed: "x", workers: "0" })).toMatchObject({ refusals: [{}, {}] });
    expect(readWitness({ seed: "3" })).toMatchObject({ refusals: [{ code: "missing-option" }] });
  });
});

describe("unwitnessed(checked)", () => {
  test("the reasons, and none", () => {
    expect(unwitnessed(checked())).toBeNull();
    expect(unwitnessed(checked({ basis: "nominal" }))).toMatch(/statistical/);
    expect(unwitnessed(checked({ series: "1", voltage: "400 V", energy: "500 J" }))).toMatch(/one in series/);
    expect(unwitnessed(checked({}, CATALOG.replace(",20,", ",,")))).toMatch(/tolerance/);
  });
});

describe("witnessOf(checked, ask, ports)", () => {
  test("agrees with the reckoned chance where it can be seen; silent without a terminal", async () => {
    const bank = checked();
    const ports = fakePorts();
    const witness = await witnessOf(bank, { banks: 2e5, seed: 3, workers: 2 }, ports);
    expect(bank.result.risk?.exceed).toBeGreaterThan(1e-3);
    expect(witness).toMatchObject({ banks: 2e5, seed: 3, agrees: true });
    expect(witness?.counted).toBe(Math.round((witness?.exceed as number) * 2e5));
    expect(ports.told()).toBe("");
  });

  test("a chance that is wrong by a third is not agreed with", async () => {
    const bank = checked();
    const risk = { exceed: (bank.result.risk?.exceed as number) * 1.33, error: 0 };
    const witness = await witnessOf(
      { ...bank, result: { ...bank.result, risk } },
      { banks: 4e5, seed: 3, workers: 1 },
      fakePorts(),
    );
    expect(witness?.agrees).toBe(false);
  });

  test("on a terminal the progress is shown and wiped; an interrupt ends it with nothing, and lets go of the signal", async () => {
    let held = 0;
    let stop: () => void = () => {};
    const background = {
      entry: new URL("file:///nowhere/worker.js"),
      terminal: true,
      onInterrupt: (call: () => void) => {
        held++;
        stop = call;
        return () => void held--;
      },
    };
    const ports = { ...fakePorts(), background };
    let text = "";
    const err = (piece: string): void => {
      text += piece;
      if (/ 3 % of/.test(text.replace(/\r/g, " "))) stop();
    };
    expect(await witnessOf(checked(), { banks: 1e7, seed: 1, workers: 1 }, { ...ports, err })).toBeNull();
    expect(held).toBe(0);
    expect(text).toMatch(/% of 10000000 banks drawn/);
    expect(text).toMatch(/\r +\r$/);
  });
});
