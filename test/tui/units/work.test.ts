import { describe, expect, test } from "vitest";
import { finish } from "../../../src/place/charging.ts";
import { answerFor } from "../../../src/tui/engine.ts";
import { unitsOn } from "../../../src/tui/units/work.ts";
import { fakePorts } from "../../support/fakePorts.ts";
import { lotCsv } from "../../support/placeCli.ts";
import { engine, stateWith } from "../../support/stock.ts";

const chosen = { part: "flash-a", series: 8, parallel: 3, ties: "cross-tied" } as const;
const answer = answerFor(stateWith({ chosen }), engine, true);
if (answer.kind !== "planned" || answer.chosen === null) throw new Error("no bank");
const bank = answer.chosen;
const lot = lotCsv(Array.from({ length: 26 }, (_, i) => 460 + ((i * 7) % 23)));
const ports = fakePorts({ "l.csv": lot, "few.csv": lotCsv([470, 471]) });
const port = unitsOn([], ports.files);
const read = port.read("l.csv", "flash-a");
if (!read.ok) throw new Error("lot");

describe("unitsOn(parts, files)", () => {
  test("a lot is read, or refused with its file", () => {
    expect(read.value).toMatchObject({ path: "l.csv", faults: [] });
    expect(read.value.units).toHaveLength(26);
    expect(port.read("none.csv", "flash-a")).toMatchObject({ ok: false, refusals: [{ place: { file: "none.csv" } }] });
  });

  test("placed is never worse than as listed, and the list that is saved holds every unit", () => {
    const before = port.listed(read.value, bank);
    const { steps } = port.begin(read.value, bank, () => true);
    const placed = finish(steps);
    if (before === null || !placed.ok) throw new Error();
    expect(before.groups.map((group) => group.length)).toEqual(Array(8).fill(3));
    expect(placed.value.charging.gap).toBeLessThan(before.gap);
    const made = { bank: chosen, placing: placed.value, stopped: false };
    expect(port.save(read.value, made, bank, { path: "o.csv", replace: false })).toEqual({
      kind: "saved",
      path: "o.csv",
    });
    expect(ports.written.get("o.csv")?.trim().split("\r\n")).toHaveLength(27);
  });

  test("too few units: nothing to compare with, and the search says how many are needed", () => {
    const few = port.read("few.csv", "flash-a");
    if (!few.ok) throw new Error();
    expect(port.listed(few.value, bank)).toBeNull();
    expect(finish(port.begin(few.value, bank, () => true).steps)).toMatchObject({
      ok: false,
      refusals: [{ code: "place.too-few" }],
    });
  });
});
