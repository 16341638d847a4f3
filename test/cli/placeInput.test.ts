import { describe, expect, test } from "vitest";
import { MOVES, readPlaceInput } from "../../src/cli/placeInput.ts";
import { at, fakePorts } from "../support/fakePorts.ts";
import { lotCsv } from "../support/placeCli.ts";

const lot = lotCsv([330, 331, 332, 333], "uF", { "leakage [uA]": [90, 91, 92, 93] });
const FLAGS = { series: "2", parallel: "2", ties: "cross-tied", measured: "m.csv" };
const read = (flags = {}, brief?: string) => {
  const found = readPlaceInput(brief, { ...FLAGS, ...flags }, fakePorts({ "m.csv": lot }));
  if (!found.ok) throw new Error(found.refusals.map((r) => r.read).join());
  return found.value;
};

describe("readPlaceInput(brief, flags, ports)", () => {
  test("a plain shape knows nothing of voltage, limit or resistor, and tries for a proof", () => {
    expect(read().bank).toMatchObject({
      part: null,
      voltage: null,
      limit: null,
      resistance: null,
      leakageVoltage: null,
    });
    expect(read().request).toMatchObject({ moves: MOVES, stopAtFloor: false, goal: "charging" });
    expect(read({ stopAtFloor: true }).request.stopAtFloor).toBe(true);
  });

  test("voltage alone: leakage is supposed to be read at the even share, and said", () => {
    const { bank, notes } = read({ voltage: "700 V", overshoot: "2 %" });
    expect(bank.voltage).toBeCloseTo(714, 9);
    expect(bank.leakageVoltage).toBeCloseTo(357, 9);
    expect(notes.join()).toMatch(/even share of a unit, assumed/);
  });

  test("part and catalogue: derated limit, polarity, the resistor that check would choose, the worst case", () => {
    const flags = {
      catalog: [at("catalogs/drawer.csv")],
      part: "drawer-pf-330-360",
      voltage: "600 V",
      derating: "0.8",
    };
    const { bank, assessed } = read(flags);
    expect(bank).toMatchObject({ limit: 288, polarised: true, leakageVoltage: 360 });
    expect(bank.resistance).toBe(assessed?.balance?.resistance ?? null);
    expect(assessed?.share.charging).toBeGreaterThan(300);
    expect(read({ ...flags, balance: "none" }).bank.resistance).toBe(null);
    expect(read({ ...flags, balance: "47 kohm" }).request.balanceConductance).toBeCloseTo(1 / 47e3, 12);
  });

  test("ties are kept as asked, also for one unit a stage", () => {
    expect(read({ series: "4", parallel: "1" }).request.ties).toBe("cross-tied");
  });
});
